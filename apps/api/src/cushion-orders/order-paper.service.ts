import {
  describedClothName,
  type OrderCover,
  orderModel,
  pictureFromAbove,
  plainCover,
  planOf,
} from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { InjectSettings, type Settings } from '../config/settings';
import type { SpecPackData } from '../paper/spec-pack';
import { SpecPress } from '../paper/spec-press';
import { ProductionsService } from '../productions/productions.service';
import { WorkshopsService } from '../workshops/workshops.service';
import { dayInWords, momentInWords } from './day-in-words';
import type { CushionOrder } from './entities/cushion-order.entity';
import { IssuedSets } from './issued-sets.service';
import { changesOnPaper } from './changes-on-paper';
import { orderChanges, type Sending } from './life/order-changes';
import { markedSections } from './marked-sections';
import { coversOf, type OrderContent, sameContent, toleranceOf } from './order-content';
import type { PackQuery } from './dto/pack-query.dto';
import { packStyle } from './pack-style';
import { SentCushions } from './sent-cushions.service';
import { bagLabels, specCushions } from './spec-cushions';

/** Room for a mark that moves off its cushion. */
const PLAN_MARGIN_MM = 60;

/** The paper of an order, made anew each time from the revision it cites. */
@Injectable()
export class OrderPaper {
  constructor(
    private readonly issued: IssuedSets,
    private readonly productions: ProductionsService,
    private readonly workshops: WorkshopsService,
    private readonly sentCushions: SentCushions,
    private readonly press: SpecPress,
    @InjectSettings() private readonly config: Settings,
  ) {}

  async pack(order: CushionOrder, content: OrderContent, wanted: PackQuery = {}): Promise<Buffer> {
    return this.press.draw(await this.data(order, content, wanted));
  }

  /** All that paper, list and cutting file show of an order. */
  async data(order: CushionOrder, content: OrderContent, wanted: PackQuery = {}): Promise<SpecPackData> {
    const { workshopId, productionId, setId } = order;
    const member = { workshopId, userId: order.createdById, role: 'designer' as const };
    const [issued, production, workshop] = await Promise.all([
      this.issued.read({ member, productionId, setId, letter: content.revisionLetter }),
      this.productions.forReading(member, productionId),
      this.workshops.get(workshopId),
    ]);
    const cushions = this.issued.select(issued, content.cushionMarks);
    const said = coversOf(content);
    const covers = said.length > 0 ? said : assumedCovers(content);
    const assumedCloths = said.length > 0 ? [] : covers.map(({ name }) => name);
    const model = orderModel({ cushions, covers, rules: issued.cushionRules });
    const style = packStyle(order, production, workshop, wanted);
    return {
      ...style,
      production: production.name,
      set: order.set?.name ?? '',
      workshop: { name: workshop.name, telephone: workshop.telephone },
      order: {
        number: order.number,
        title: content.title,
        neededBy: content.neededBy === null ? null : dayInWords(content.neededBy),
        upholsterer: order.upholsterer?.name ?? null,
        pageUrl: `${this.config.publicUrl}/w/${workshopId}/p/${productionId}/orders/${order.id}`,
      },
      revision: {
        letter: issued.letter,
        issuedAt: issued.issuedAt,
        issuedOn: momentInWords(issued.issuedAt, workshop.timeZone),
        issuedBy: issued.issuedByName,
        note: issued.note,
      },
      since: await this.since(order, { content, cushions }, style.units),
      words: content.spec,
      toleranceMm: toleranceOf(content),
      model,
      assumedCloths,
      cushions: specCushions(model, assumedCloths),
      labels: bagLabels(cushions),
      plan: planOf(issued.document, { marks: 'cushions', marginMm: PLAN_MARGIN_MM }),
      picture: pictureFromAbove(issued.document, new Set(cushions.map(({ benchId }) => benchId))),
      sections: markedSections(issued.document, cushions),
    };
  }

  /** Beside what its upholsterer was sent before; an order that was changed since stands beside what was sent last. */
  private async since(
    order: CushionOrder,
    now: Sending,
    units: SpecPackData['units'],
  ): Promise<SpecPackData['since']> {
    const { sent, sentBefore } = order;
    const earlier = sent && !sameContent(sent, now.content) ? sent : sentBefore;
    if (earlier === null) return null;
    const before = { content: earlier, cushions: await this.sentCushions.of(order, earlier) };
    return { letter: earlier.revisionLetter, changes: changesOnPaper(orderChanges(before, now), units) };
  }
}

/** Until the workshop says its cloths: a plain one of the usual width, so that there is a length to talk about. */
function assumedCovers({ spec }: OrderContent): OrderCover[] {
  return [plainCover(describedClothName(spec.cover))];
}

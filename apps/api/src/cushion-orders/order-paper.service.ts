import { planOf } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { specPdf } from '../paper/spec-pdf';
import { ProductionsService } from '../productions/productions.service';
import { WorkshopsService } from '../workshops/workshops.service';
import { dayInWords, momentInWords } from './day-in-words';
import type { CushionOrder } from './entities/cushion-order.entity';
import { IssuedSets } from './issued-sets.service';
import { markedSections } from './marked-sections';
import type { OrderContent } from './order-content';
import { specCushions } from './spec-cushions';

/** Room for a mark that moves off its cushion. */
const PLAN_MARGIN_MM = 60;

/** The drawing pack of an order, made anew each time from the revision it cites. */
@Injectable()
export class OrderPaper {
  constructor(
    private readonly issued: IssuedSets,
    private readonly productions: ProductionsService,
    private readonly workshops: WorkshopsService,
  ) {}

  async pack(order: CushionOrder, content: OrderContent): Promise<Buffer> {
    const { workshopId, productionId, setId } = order;
    const member = { workshopId, userId: order.createdById, role: 'designer' as const };
    const [issued, production, workshop] = await Promise.all([
      this.issued.read({ member, productionId, setId, letter: content.revisionLetter }),
      this.productions.forReading(member, productionId),
      this.workshops.get(workshopId),
    ]);
    const cushions = this.issued.select(issued, content.cushionMarks);
    return specPdf({
      paper: workshop.paper,
      units: { system: production.units, roundTo: production.roundTo },
      production: production.name,
      set: order.set?.name ?? '',
      workshop: { name: workshop.name, telephone: workshop.telephone },
      order: {
        number: order.number,
        title: content.title,
        neededBy: content.neededBy === null ? null : dayInWords(content.neededBy),
        upholsterer: order.upholsterer?.name ?? null,
      },
      revision: {
        letter: issued.letter,
        issuedAt: issued.issuedAt,
        issuedOn: momentInWords(issued.issuedAt, workshop.timeZone),
        issuedBy: issued.issuedByName,
        note: issued.note,
      },
      words: content.spec,
      cushions: specCushions(cushions),
      plan: planOf(issued.document, { marks: 'cushions', marginMm: PLAN_MARGIN_MM }),
      sections: markedSections(issued.document, cushions),
    });
  }
}

import {
  type CushionSpec,
  type Drawing,
  type DrawShape,
  type PagePoint,
  planOf,
  sectionOf,
  type SetDocument,
} from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { specPdf } from '../paper/spec-pdf';
import { ProductionsService } from '../productions/productions.service';
import { WorkshopsService } from '../workshops/workshops.service';
import { dayInWords, momentInWords } from './day-in-words';
import type { CushionOrder } from './entities/cushion-order.entity';
import { IssuedSets } from './issued-sets.service';
import type { OrderContent } from './order-content';
import { specCushions } from './spec-cushions';

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
      sections: sectionsOf(issued.document, cushions),
    });
  }
}

/** A cut through the first bench that the order asks cushions for, with their marks and no sizes. */
function sectionsOf(
  document: SetDocument,
  cushions: readonly CushionSpec[],
): { bench: string; drawing: Drawing }[] {
  const [first] = cushions;
  if (!first) return [];
  const drawing = sectionOf(document, first.benchId, PLAN_MARGIN_MM);
  const lines = drawing.shapes.filter(({ kind }) => kind !== 'dimension');
  return [
    { bench: first.benchMark, drawing: { ...drawing, shapes: [...lines, ...marksIn(lines, cushions)] } },
  ];
}

function marksIn(shapes: readonly DrawShape[], cushions: readonly CushionSpec[]): DrawShape[] {
  const pieces = new Set(cushions.map(({ benchId }) => benchId));
  return [...pieces].flatMap((pieceId) => {
    const cut = shapes
      .flatMap((shape) =>
        shape.kind === 'polygon' && shape.pieceId === pieceId && shape.fill === 'cloth'
          ? [middle(shape.points)]
          : [],
      )
      // y runs down the page: the seat is the lower of the two.
      .sort((a, b) => b[1] - a[1]);
    return (['seat', 'back'] as const).flatMap((kind): DrawShape[] => {
      const marks = cushions
        .filter((cushion) => cushion.benchId === pieceId && cushion.kind === kind)
        .map(({ mark }) => mark);
      const at = kind === 'seat' ? cut[0] : cut[1];
      return at && marks.length > 0
        ? [{ kind: 'text', at, text: rangeOf(marks), anchor: 'middle', pieceId }]
        : [];
    });
  });
}

function rangeOf(marks: readonly string[]): string {
  return marks.length > 1 ? `${marks[0]}–${marks.at(-1)}` : (marks[0] ?? '');
}

function middle(points: readonly PagePoint[]): PagePoint {
  const [x, y] = points.reduce(([sx, sy], [px, py]) => [sx + px, sy + py], [0, 0]);
  return [x / points.length, y / points.length];
}

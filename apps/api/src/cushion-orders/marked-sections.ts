import {
  type CushionSpec,
  type Drawing,
  type DrawShape,
  type PagePoint,
  sectionOf,
  type SetDocument,
} from '@settlewright/geometry';

const MARGIN_MM = 60;

/** A cut through the first bench that the order asks cushions for, with all marks it meets and no sizes. */
export function markedSections(
  document: SetDocument,
  cushions: readonly CushionSpec[],
): { benches: string[]; drawing: Drawing }[] {
  const [first] = cushions;
  if (!first) return [];
  const drawing = sectionOf(document, first.benchId, MARGIN_MM);
  const lines = drawing.shapes.filter(({ kind }) => kind !== 'dimension');
  const marks = marksIn(lines, cushions);
  const met = new Set(marks.map(({ pieceId }) => pieceId));
  const benches = new Set([
    first.benchMark,
    ...cushions.filter(({ benchId }) => met.has(benchId)).map(({ benchMark }) => benchMark),
  ]);
  return [{ benches: [...benches], drawing: { ...drawing, shapes: [...lines, ...marks] } }];
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

import type { CushionGroup, CushionSpec } from './cushion-spec.ts';

/** Lengths are compared on a grid of 1/64 in: fractions of an inch lie on it, so noise of the last digit never parts two. */
const GRID_MM = 25.4 / 64;

type Hand = CushionSpec['hand'];

const OTHER: Record<Hand, Hand> = { left: 'right', right: 'left', either: 'either' };

/** All that a drawing shows of a cushion, or of its mirror image. */
function likeness(spec: CushionSpec, mirrored: boolean): string {
  const { kind, hand, edges, finishedMm, cut, zipEdge, foam, curve, buttons, boardLinesMm, datum } = spec;
  const { wallMark: _, side, ...datumLike } = datum;
  const shown = {
    kind,
    hand: mirrored ? OTHER[hand] : hand,
    edges: mirrored ? { ...edges, left: edges.right, right: edges.left } : edges,
    datumSide: mirrored ? OTHER[side] : side,
    datumLike,
    finishedMm,
    cut,
    zipEdge,
    foam,
    curve,
    buttons,
    boardLinesMm,
  };
  return JSON.stringify(shown, (_key, value: unknown) =>
    typeof value === 'number' ? Math.round(value / GRID_MM) : value,
  );
}

/**
 * Puts cushions that are made alike together and names those that are their mirror image.
 *
 * @param specs - from `deriveCushions`
 * @returns groups in the order of their first mark
 */
export function groupCushions(specs: readonly CushionSpec[]): CushionGroup[] {
  const groups = new Map<string, CushionGroup>();
  for (const spec of specs) {
    const key = likeness(spec, false);
    const group = groups.get(key);
    if (group) group.marks.push(spec.mark);
    else groups.set(key, { marks: [spec.mark], spec, hand: spec.hand, mirroredMarks: [] });
  }
  for (const [key, group] of groups) {
    const mirrorKey = likeness(group.spec, true);
    if (mirrorKey !== key) group.mirroredMarks = groups.get(mirrorKey)?.marks.slice() ?? [];
  }
  return [...groups.values()];
}

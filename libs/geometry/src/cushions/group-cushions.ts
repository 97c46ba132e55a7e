import { outlineBox, type OutlineCorner } from '../outlines/outline.ts';
import type { Foam } from '../room/document.ts';
import type { CushionEdge } from './cushion-choice.ts';
import type { CushionGroup, CushionSpec } from './cushion-spec.ts';
import { buttonSpots } from './cushion-warnings.ts';
import { mirroredOutline, otherEdge } from './mirrored-shape.ts';
import { mirroredWear, type WearArea } from './wear.ts';

/** Lengths are compared on a grid of 1/64 in: fractions of an inch lie on it, so noise of the last digit never parts two. */
const GRID_MM = 25.4 / 64;

/** All that a drawing shows of a cushion, or of its mirror image; what follows from it alone is left out. */
function likeness(spec: CushionSpec, mirrored: boolean): string {
  const { kind, hand, edges, finishedMm, make, foam, curve, buttons, boardLinesMm, datum } = spec;
  const { wallMark: _, side, ...datumLike } = datum;
  const edge = (one: CushionEdge) => (mirrored ? otherEdge(one) : one);
  const shown = {
    kind,
    hand: mirrored ? otherEdge(hand) : hand,
    edges: mirrored ? { ...edges, left: edges.right, right: edges.left } : edges,
    datumSide: mirrored ? otherEdge(side) : side,
    datumLike,
    finishedMm,
    make: { ...make, closureEdge: edge(make.closureEdge) },
    outline: fromLowest(mirrored ? mirroredOutline(spec.outline) : spec.outline),
    faults: spec.faults,
    foam: foamName(foam),
    curve,
    tufting: spec.tufting,
    buttons,
    boardLinesMm,
    cameraSides: spec.cameraSides.map(edge).sort(),
    holdDown: spec.holdDown,
    wear: spec.wear?.map((area) => wearLikeness(mirrored ? mirroredWear(area) : area)),
    notes: spec.notes,
  };
  return onGrid(shown);
}

/** What is said of a marked area, whatever the order it was written in. */
const wearLikeness = ({ place, look, note, areaMm }: WearArea) => [
  place,
  look,
  note,
  areaMm && [areaMm.fromEnd, areaMm.fromSideMm, areaMm.fromFrontMm, areaMm.widthMm, areaMm.depthMm],
];

const onGrid = (shown: unknown): string =>
  JSON.stringify(shown, (_key, value: unknown) =>
    typeof value === 'number' ? Math.round(value / GRID_MM) : value,
  );

/**
 * Whether a cushion and its mirror image are the same: in plan, closure, buttons and marked wear. What it lies against does
 * not count.
 *
 * @param spec - from `deriveCushions`
 */
export function isMirrorOfItself(spec: CushionSpec): boolean {
  const { outline, make, wear } = spec;
  const { x0, x1 } = outlineBox(outline);
  const spots = buttonSpots(spec);
  const places = (list: readonly (readonly [number, number])[]) =>
    list.map(([x, y]) => `${Math.round(x / GRID_MM)} ${Math.round(y / GRID_MM)}`).sort();
  const made = {
    outline: fromLowest(outline),
    edge: make.closureEdge,
    spots: places(spots),
    wear: wear?.map((area) => onGrid(wearLikeness(area))).sort(),
  };
  const mirrored = {
    outline: fromLowest(mirroredOutline(outline)),
    edge: otherEdge(make.closureEdge),
    spots: places(spots.map(([x, y]) => [x0 + x1 - x, y] as const)),
    wear: wear?.map((area) => onGrid(wearLikeness(mirroredWear(area)))).sort(),
  };
  return onGrid(made) === onGrid(mirrored);
}

/** Shares and factors are no lengths: foams of another build-up, or another drop, are apart however near they lie. */
const foamName = (foam: Foam): string =>
  JSON.stringify(foam, (_key, value: unknown) =>
    typeof value === 'number' ? Number(value.toPrecision(9)) : value,
  );

/** The same outline from its lowest corner on, the leftmost of those. */
function fromLowest(corners: readonly OutlineCorner[]): OutlineCorner[] {
  const rank = ({ at: [x, y] }: OutlineCorner) => [Math.round(y / GRID_MM), Math.round(x / GRID_MM)] as const;
  let first = 0;
  corners.forEach((corner, i) => {
    const [a, b] = [rank(corner), rank(corners[first]!)];
    if (a[0] < b[0] || (a[0] === b[0] && a[1] < b[1])) first = i;
  });
  return [...corners.slice(first), ...corners.slice(0, first)];
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

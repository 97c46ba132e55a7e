import { z } from 'zod';
import { outlineFault, type OutlineCorner, type Point2 } from '../outlines/outline.ts';

const length = (min: number, max: number) => z.number().min(min).max(max);

/** What is cut out of an edge: a column, a sill, the short leg of an L. */
const notchSchema = z.strictObject({
  edge: z.enum(['back', 'front', 'left', 'right']),
  /** Along back and front from one end, along the sides from the back. */
  fromMm: length(0, 12000),
  /** The end of the back or front it is measured from, as the sitter sees it; the left one when absent. */
  fromEnd: z.enum(['left', 'right']).optional(),
  widthMm: length(5, 12000),
  depthMm: length(5, 2000),
});

const radius = length(0, 1000);

/** Plan of a cushion where it is not the plain rectangle of its finished size. Left and right as the sitter sees them. */
export const cushionShapeSchema = z.strictObject({
  /** How far the ends of the front edge stand in from those of the back edge, for a taper or a mitre; negative: out. */
  frontInMm: z.strictObject({ left: length(-2000, 2000), right: length(-2000, 2000) }).optional(),
  notches: z.array(notchSchema).max(8).optional(),
  cornerRadiusMm: z
    .strictObject({ backLeft: radius, backRight: radius, frontLeft: radius, frontRight: radius })
    .optional(),
  /** Drawn freely instead: corners seen from above, back edge up, anticlockwise, from the lower left of the page. */
  drawn: z
    .array(
      z.strictObject({
        xMm: length(-100, 12000),
        yMm: length(-100, 2500),
        radiusMm: radius,
        /** Edge that starts here. */
        edge: z.enum(['back', 'front', 'left', 'right']),
      }),
    )
    .min(3)
    .max(60)
    .optional(),
});

export type CushionShape = z.infer<typeof cushionShapeSchema>;
type Notch = z.infer<typeof notchSchema>;
type EdgeName = Notch['edge'];

interface SizeInPlan {
  widthMm: number;
  depthMm: number;
}

/** Outline of a cushion's plan, or what is wrong with it. */
export type ShapedOutline = { ok: true; corners: OutlineCorner[] } | { ok: false; fault: string };

/**
 * The plan outline of a cushion, seam to seam.
 *
 * Seen from above with the back edge up the page: the sitter's left is at the right. Edges are named `front`, `left`,
 * `back`, `right`; those of a notch `notch`.
 *
 * @param size - finished width and depth
 * @param shape - what differs from their rectangle
 * @returns corners anticlockwise from the front edge's end at the sitter's right
 */
export function shapedOutline(size: SizeInPlan, shape: CushionShape = {}): ShapedOutline {
  const corners = shape.drawn
    ? shape.drawn.map(({ xMm, yMm, radiusMm, edge }): OutlineCorner => ({ at: [xMm, yMm], radiusMm, edge }))
    : notched(fourCorners(size, shape), shape.notches ?? []);
  if (typeof corners === 'string') return { ok: false, fault: corners };
  const fault = outlineFault(corners);
  return fault ? { ok: false, fault } : { ok: true, corners };
}

function fourCorners({ widthMm, depthMm }: SizeInPlan, shape: CushionShape): OutlineCorner[] {
  const inset = shape.frontInMm ?? { left: 0, right: 0 };
  const round = shape.cornerRadiusMm ?? { backLeft: 0, backRight: 0, frontLeft: 0, frontRight: 0 };
  return [
    { at: [inset.right, 0], radiusMm: round.frontRight, edge: 'front' },
    { at: [widthMm - inset.left, 0], radiusMm: round.frontLeft, edge: 'left' },
    { at: [widthMm, depthMm], radiusMm: round.backLeft, edge: 'back' },
    { at: [0, depthMm], radiusMm: round.backRight, edge: 'right' },
  ];
}

/** Whether a notch is measured from the end of its edge, which runs anticlockwise, and not from its start. */
function isFromEnd({ edge, fromEnd = 'left' }: Notch): boolean {
  if (edge === 'left' || edge === 'right') return edge === 'left';
  return (edge === 'front') === (fromEnd === 'left');
}

function notched(corners: OutlineCorner[], notches: readonly Notch[]): OutlineCorner[] | string {
  let cut: OutlineCorner[] | string = corners;
  for (const name of ['front', 'left', 'back', 'right'] as const) {
    const asked = notches.filter(({ edge }) => edge === name);
    if (asked.length === 0) continue;
    if (!cut.some(({ edge }) => edge === name)) return `nothing is left of the ${name} edge for a notch`;
    const wholeMm = edgeLength(cut, name);
    const here = asked.map((notch) => {
      const startsAt = isFromEnd(notch) ? wholeMm - notch.fromMm - notch.widthMm : notch.fromMm;
      return { notch, startsAt };
    });
    // Cut from the far end of the edge on, so that the earlier stretch keeps its place.
    for (const { notch, startsAt } of here.sort((a, b) => b.startsAt - a.startsAt)) {
      cut = cutNotch(cut, notch, startsAt);
      if (typeof cut === 'string') return cut;
    }
  }
  return cut;
}

function cutNotch(corners: OutlineCorner[], notch: Notch, startsAt: number): OutlineCorner[] | string {
  const i = corners.findIndex(({ edge }) => edge === notch.edge);
  const from = corners[i]!;
  const nextIndex = (i + 1) % corners.length;
  const to = corners[nextIndex]!;
  const lengthMm = Math.hypot(to.at[0] - from.at[0], to.at[1] - from.at[1]);
  const endsAt = startsAt + notch.widthMm;
  if (startsAt < -1e-6 || endsAt > lengthMm + 1e-6) {
    return `a notch does not lie on the ${notch.edge} edge, or lies over another`;
  }
  const way: Point2 = [(to.at[0] - from.at[0]) / lengthMm, (to.at[1] - from.at[1]) / lengthMm];
  const inward: Point2 = [-way[1], way[0]];
  const on = (along: number, deep: number): Point2 => [
    from.at[0] + way[0] * along + inward[0] * deep,
    from.at[1] + way[1] * along + inward[1] * deep,
  ];
  const depth = notch.depthMm;
  const atStart = startsAt < 1e-6;
  const atEnd = endsAt > lengthMm - 1e-6;
  const before = corners[(i + corners.length - 1) % corners.length]!;
  const after = corners[(nextIndex + 1) % corners.length]!;
  const first: OutlineCorner[] = atStart
    ? [{ at: deepOn(from.at, before.at, inward, depth), radiusMm: 0, edge: 'notch' }]
    : [
        from,
        { at: on(startsAt, 0), radiusMm: 0, edge: 'notch' },
        { at: on(startsAt, depth), radiusMm: 0, edge: 'notch' },
      ];
  const last: OutlineCorner[] = atEnd
    ? [{ at: deepOn(to.at, after.at, inward, depth), radiusMm: 0, edge: to.edge }]
    : [
        { at: on(endsAt, depth), radiusMm: 0, edge: 'notch' },
        { at: on(endsAt, 0), radiusMm: 0, edge: notch.edge },
        to,
      ];
  const replaced = [...first, ...last];
  if (nextIndex === 0)
    return [last[last.length - 1]!, ...corners.slice(1, i), ...first, ...last.slice(0, -1)];
  return [...corners.slice(0, i), ...replaced, ...corners.slice(i + 2)];
}

/** Length of an edge before anything is cut out of it. */
function edgeLength(corners: readonly OutlineCorner[], name: EdgeName): number {
  const start = corners.findIndex(({ edge }) => edge === name);
  let end = start;
  corners.forEach(({ edge }, i) => {
    if (edge === name) end = i;
  });
  const [a, b] = [corners[start]!.at, corners[(end + 1) % corners.length]!.at];
  return Math.hypot(b[0] - a[0], b[1] - a[1]);
}

/** The point so deep within an edge where its neighbour, from corner to far end, comes by. */
function deepOn(corner: Point2, farEnd: Point2, inward: Point2, depth: number): Point2 {
  const way: Point2 = [farEnd[0] - corner[0], farEnd[1] - corner[1]];
  const gained = way[0] * inward[0] + way[1] * inward[1];
  return [corner[0] + (way[0] * depth) / gained, corner[1] + (way[1] * depth) / gained];
}

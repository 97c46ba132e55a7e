/** A point of a plan, x to the right and y up the page, millimetres. */
export type Point2 = readonly [number, number];

/** A corner of a closed outline; corners run anticlockwise. */
export interface OutlineCorner {
  at: Point2;
  /** Radius that rounds it; 0 leaves it sharp. */
  radiusMm: number;
  /** Name of the edge that starts here. */
  edge: string;
}

/** One stretch of an outline: straight, or an arc about a centre. */
export type OutlineStretch =
  | { kind: 'line'; from: Point2; to: Point2; edge: string }
  | {
      kind: 'arc';
      from: Point2;
      to: Point2;
      centre: Point2;
      radiusMm: number;
      /** Anticlockwise positive: a corner that points outwards; negative at an inside corner. */
      sweepRad: number;
    };

const EPSILON_MM = 1e-6;

const cross = (a: Point2, b: Point2): number => a[0] * b[1] - a[1] * b[0];
const minus = (a: Point2, b: Point2): Point2 => [a[0] - b[0], a[1] - b[1]];
const along = (a: Point2, b: Point2, length: number): Point2 => [a[0] + b[0] * length, a[1] + b[1] * length];

function direction(from: Point2, to: Point2): Point2 {
  const [x, y] = minus(to, from);
  const length = Math.hypot(x, y);
  return [x / length, y / length];
}

/** Length that rounding takes from both edges of a corner. */
function tangentMm(corners: readonly OutlineCorner[], i: number): number {
  const { before, after } = around(corners, i);
  const turn = Math.atan2(cross(before, after), before[0] * after[0] + before[1] * after[1]);
  return corners[i]!.radiusMm * Math.tan(Math.abs(turn) / 2);
}

function around(corners: readonly OutlineCorner[], i: number): { before: Point2; after: Point2 } {
  const count = corners.length;
  const here = corners[i]!.at;
  return {
    before: direction(corners[(i + count - 1) % count]!.at, here),
    after: direction(here, corners[(i + 1) % count]!.at),
  };
}

/**
 * What is wrong with an outline, in words.
 *
 * @param corners - anticlockwise, three at least
 * @returns the first fault found, `undefined` when it can be cut
 */
export function outlineFault(corners: readonly OutlineCorner[]): string | undefined {
  if (corners.length < 3) return 'an outline needs three corners at least';
  for (const [i, { at, edge }] of corners.entries()) {
    const next = corners[(i + 1) % corners.length]!.at;
    if (Math.hypot(...minus(next, at)) < EPSILON_MM) return `the ${edge} edge has no length`;
  }
  if (polygonArea(corners.map(({ at }) => at)) <= EPSILON_MM) return 'the outline is turned inside out';
  for (const [i, { at, edge }] of corners.entries()) {
    const next = (i + 1) % corners.length;
    const length = Math.hypot(...minus(corners[next]!.at, at));
    if (tangentMm(corners, i) + tangentMm(corners, next) > length + EPSILON_MM) {
      return `the corners of the ${edge} edge are rounded by more than it is long`;
    }
  }
  return crossing(corners);
}

function crossing(corners: readonly OutlineCorner[]): string | undefined {
  const count = corners.length;
  for (let i = 0; i < count; i += 1) {
    for (let j = i + 2; j < count; j += 1) {
      if (i === 0 && j === count - 1) continue;
      const [a, b] = [corners[i]!.at, corners[(i + 1) % count]!.at];
      const [c, d] = [corners[j]!.at, corners[(j + 1) % count]!.at];
      const sides = [
        cross(minus(b, a), minus(c, a)) * cross(minus(b, a), minus(d, a)),
        cross(minus(d, c), minus(a, c)) * cross(minus(d, c), minus(b, c)),
      ];
      if (sides.every((side) => side < 0)) {
        return `the ${corners[i]!.edge} edge crosses the ${corners[j]!.edge} edge`;
      }
    }
  }
  return undefined;
}

/**
 * The stretches of a closed outline with its corners rounded.
 *
 * @param corners - anticlockwise, without fault
 * @returns lines and arcs end to end; stretches of no length left out
 */
export function outlineStretches(corners: readonly OutlineCorner[]): OutlineStretch[] {
  const count = corners.length;
  const cuts = corners.map((corner, i) => {
    const { before, after } = around(corners, i);
    const back = tangentMm(corners, i);
    return { enter: along(corner.at, before, -back), leave: along(corner.at, after, back), before, after };
  });
  return corners.flatMap((corner, i): OutlineStretch[] => {
    const { enter, leave, before, after } = cuts[i]!;
    const turn = Math.atan2(cross(before, after), before[0] * after[0] + before[1] * after[1]);
    const inward: Point2 = turn > 0 ? [-before[1], before[0]] : [before[1], -before[0]];
    const arc: OutlineStretch[] =
      corner.radiusMm > EPSILON_MM && Math.abs(turn) > EPSILON_MM
        ? [
            {
              kind: 'arc',
              from: enter,
              to: leave,
              centre: along(enter, inward, corner.radiusMm),
              radiusMm: corner.radiusMm,
              sweepRad: turn,
            },
          ]
        : [];
    const to = cuts[(i + 1) % count]!.enter;
    const line: OutlineStretch[] =
      Math.hypot(...minus(to, leave)) > EPSILON_MM
        ? [{ kind: 'line', from: leave, to, edge: corner.edge }]
        : [];
    return [...arc, ...line];
  });
}

/** Length of one stretch. */
export function stretchLength(stretch: OutlineStretch): number {
  return stretch.kind === 'line'
    ? Math.hypot(...minus(stretch.to, stretch.from))
    : stretch.radiusMm * Math.abs(stretch.sweepRad);
}

/** Length all round an outline. */
export function outlinePerimeter(corners: readonly OutlineCorner[]): number {
  return outlineStretches(corners).reduce((sum, stretch) => sum + stretchLength(stretch), 0);
}

function polygonArea(points: readonly Point2[]): number {
  return points.reduce((sum, point, i) => sum + cross(point, points[(i + 1) % points.length]!), 0) / 2;
}

/** Area within an outline, square millimetres. */
export function outlineArea(corners: readonly OutlineCorner[]): number {
  const stretches = outlineStretches(corners);
  const chords = polygonArea(stretches.map(({ from }) => from));
  const segments = stretches.reduce((sum, stretch) => {
    if (stretch.kind === 'line') return sum;
    const { radiusMm, sweepRad } = stretch;
    return sum + (radiusMm ** 2 * (sweepRad - Math.sin(sweepRad))) / 2;
  }, 0);
  return chords + segments;
}

/** What an outline stands in: across the page and up the page, millimetres. */
export interface OutlineBox {
  x0: number;
  x1: number;
  y0: number;
  y1: number;
}

/** The box round the corners of an outline. */
export function outlineBox(corners: readonly Pick<OutlineCorner, 'at'>[]): OutlineBox {
  const [xs, ys] = [corners.map(({ at }) => at[0]), corners.map(({ at }) => at[1])];
  return { x0: Math.min(...xs), x1: Math.max(...xs), y0: Math.min(...ys), y1: Math.max(...ys) };
}

/** Width across the page and depth up the page of the corners of an outline. */
export function outlineExtent(corners: readonly OutlineCorner[]): { widthMm: number; depthMm: number } {
  const { x0, x1, y0, y1 } = outlineBox(corners);
  return { widthMm: x1 - x0, depthMm: y1 - y0 };
}

/**
 * An outline with an allowance all round it.
 *
 * Sharp corners stay sharp; a rounded corner that points outwards grows by the allowance, an inside one shrinks.
 *
 * @param corners - anticlockwise, without fault
 * @param byMm - how far outwards, negative inwards
 * @returns the corners moved; see `offsetFault`, since a notch may close up
 */
export function offsetOutline(corners: readonly OutlineCorner[], byMm: number): OutlineCorner[] {
  return corners.map((corner, i) => {
    const { before, after } = around(corners, i);
    const turn = cross(before, after);
    const at: Point2 =
      Math.abs(turn) < 1e-9
        ? along(corner.at, [before[1], -before[0]], byMm)
        : [
            corner.at[0] + (byMm * (after[0] - before[0])) / -turn,
            corner.at[1] + (byMm * (after[1] - before[1])) / -turn,
          ];
    const grown = corner.radiusMm + (turn > 0 ? byMm : -byMm);
    return { ...corner, at, radiusMm: corner.radiusMm > 0 ? Math.max(0, grown) : 0 };
  });
}

/**
 * What an allowance did to an outline that it must not do.
 *
 * @param plain - the outline
 * @param grown - the same from `offsetOutline`
 * @returns the first edge that closed up or the first fault of the grown outline; `undefined` when it can be cut
 */
export function offsetFault(
  plain: readonly OutlineCorner[],
  grown: readonly OutlineCorner[],
): string | undefined {
  for (const [i, { at, edge }] of plain.entries()) {
    const next = (i + 1) % plain.length;
    const [was, is] = [minus(plain[next]!.at, at), minus(grown[next]!.at, grown[i]!.at)];
    if (was[0] * is[0] + was[1] * is[1] <= 0) return `the ${edge} edge is too narrow for its allowance`;
  }
  return outlineFault(grown);
}

/**
 * An outline as points, arcs replaced by chords.
 *
 * @param corners - anticlockwise, without fault
 * @param sagMm - greatest distance of a chord from its arc, > 0
 * @param turnRad - greatest angle between two chords of an arc, > 0; any when absent
 * @returns points anticlockwise, the first not repeated
 */
export function outlinePoints(
  corners: readonly OutlineCorner[],
  sagMm: number,
  turnRad = Infinity,
): Point2[] {
  return outlineStretches(corners).flatMap((stretch): Point2[] => {
    if (stretch.kind === 'line') return [stretch.from];
    const { from, centre, radiusMm, sweepRad } = stretch;
    const step = Math.min(turnRad, 2 * Math.acos(Math.max(0, 1 - Math.min(sagMm, radiusMm) / radiusMm)));
    const chords = Math.max(1, Math.ceil(Math.abs(sweepRad) / step));
    const start = Math.atan2(from[1] - centre[1], from[0] - centre[0]);
    return Array.from({ length: chords }, (_, n): Point2 => {
      const angle = start + (sweepRad * n) / chords;
      return [centre[0] + radiusMm * Math.cos(angle), centre[1] + radiusMm * Math.sin(angle)];
    });
  });
}

/**
 * Whether an outline is a rectangle that lies square to the page.
 *
 * @param corners - anticlockwise
 * @param withinMm - a side may be so much off square
 */
export function isRectangle(corners: readonly OutlineCorner[], withinMm = EPSILON_MM): boolean {
  if (corners.length !== 4 || corners.some(({ radiusMm }) => radiusMm > 0)) return false;
  return corners.every(({ at }, i) => {
    const [dx, dy] = minus(corners[(i + 1) % 4]!.at, at);
    return Math.abs(dx) < withinMm || Math.abs(dy) < withinMm;
  });
}

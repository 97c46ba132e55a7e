import type { Part, Solid, Vec3 } from '@settlewright/geometry';
import { add, dot, partAxes, scale, subtract } from './vectors.ts';

/** A cushion as it is drawn: a box with a panel that may be hollow. */
export interface SoftPart {
  kind: 'seat' | 'back';
  centre: Vec3;
  across: Vec3;
  /** The way the panel looks. */
  outward: Vec3;
  /** From the middle towards the front edge of a seat, towards the lower edge of a back. */
  down: Vec3;
  widthMm: number;
  /** Along `down`. */
  lengthMm: number;
  thickMm: number;
  /** How far the panel lies within the box, so far down from the middle, mm; absent for a flat one. */
  hollowAt?: (down: number) => number;
  /** Corners of a panel that is no rectangle, across and down from the middle, clockwise as one looks at it, mm. */
  outlineMm?: readonly (readonly [number, number])[];
}

type Prism = Extract<Solid, { shape: 'prism' }>;

function boxed(part: Part, [width, height, depth]: Vec3): SoftPart {
  const [across, y, z] = partAxes(part.rotationRad);
  const isSeat = part.role === 'seat-cushion';
  return {
    kind: isSeat ? 'seat' : 'back',
    centre: part.positionMm,
    across,
    outward: isSeat ? y : z,
    down: isSeat ? z : scale(y, -1),
    widthMm: width,
    lengthMm: isSeat ? depth : height,
    thickMm: isSeat ? height : depth,
  };
}

/** A pad whose face follows the curve of a back: lower rear, the face from below upwards, upper front, upper rear. */
function curved(part: Part, { outlineMm, depthMm }: Prism): SoftPart | undefined {
  const [first, ...rest] = outlineMm;
  const last = rest.pop();
  const top = rest.at(-1);
  if (!first || !last || !top) return undefined;
  const [x, y, z] = partAxes(part.rotationRad);
  const inRoom = ([forward, height]: readonly [number, number]): Vec3 =>
    add(part.positionMm, add(scale(x, forward), scale(y, height)));
  const [lowRear, highRear] = [inRoom(first), inRoom(last)];
  const [rear, edge] = [subtract(lowRear, highRear), subtract(inRoom(top), highRear)];
  const [lengthMm, thickMm] = [Math.hypot(...rear), Math.hypot(...edge)];
  if (lengthMm === 0 || thickMm === 0) return undefined;
  const [down, outward] = [scale(rear, 1 / lengthMm), scale(edge, 1 / thickMm)];
  const centre = add(scale(add(lowRear, highRear), 0.5), scale(outward, thickMm / 2));
  const face = rest
    .map((point) => subtract(inRoom(point), centre))
    .map((from) => ({ at: dot(from, down), hollow: thickMm / 2 - dot(from, outward) }))
    .reverse();
  return {
    kind: 'back',
    centre,
    // The panel of a pad lies the other way round than the outline it is cut to.
    across: scale(z, -1),
    outward,
    down,
    widthMm: depthMm,
    lengthMm,
    thickMm,
    hollowAt: (at) => {
      const next = face.findIndex((point) => point.at >= at);
      const [low, high] = [face[Math.max(0, next - 1)], face.at(next)];
      if (!low || !high) return 0;
      const run = high.at - low.at;
      const t = run > 0 ? Math.min(1, Math.max(0, (at - low.at) / run)) : 0;
      return low.hollow + (high.hollow - low.hollow) * t;
    },
  };
}

/** A cushion cut to a plan of its own. */
function outlined(part: Part, { outlineMm, depthMm }: Prism): SoftPart {
  const [across, y, outward] = partAxes(part.rotationRad);
  const range = (axis: 0 | 1) => {
    const values = outlineMm.map((point) => point[axis]);
    return Math.max(...values) - Math.min(...values);
  };
  return {
    kind: part.role === 'seat-cushion' ? 'seat' : 'back',
    centre: part.positionMm,
    across,
    outward,
    down: scale(y, -1),
    widthMm: range(0),
    lengthMm: range(1),
    thickMm: depthMm,
    outlineMm: outlineMm.map(([u, v]) => [u, -v] as const).reverse(),
  };
}

/** How a cushion is drawn; undefined for what is not soft. */
export function softPart(part: Part): SoftPart | undefined {
  if (part.role !== 'seat-cushion' && part.role !== 'back-cushion') return undefined;
  const { solid } = part;
  if (solid.shape === 'box') return boxed(part, solid.sizeMm);
  if (solid.shape !== 'prism') return undefined;
  return solid.isPanel ? outlined(part, solid) : curved(part, solid);
}

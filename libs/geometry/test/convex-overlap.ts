import type { Part, Vec3 } from '../src/parts/part.ts';

type Vector = [number, number, number];

const dot = (a: Vec3, b: Vec3) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const cross = (a: Vec3, b: Vec3): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

/** Turns a point of a part's own frame into the room: three.js order YXZ, with no turn about z in use. */
function placed(part: Part, [x, y, z]: Vec3): Vector {
  const [rx, ry] = part.rotationRad;
  const y1 = y * Math.cos(rx) - z * Math.sin(rx);
  const z1 = y * Math.sin(rx) + z * Math.cos(rx);
  const [px, py, pz] = part.positionMm;
  return [px + x * Math.cos(ry) + z1 * Math.sin(ry), py + y1, pz - x * Math.sin(ry) + z1 * Math.cos(ry)];
}

function outline(part: Part): {
  points: readonly (readonly [number, number])[];
  axis: 'y' | 'z';
  half: number;
} {
  const { solid } = part;
  if (solid.shape === 'prism') return { points: solid.outlineMm, axis: 'z', half: solid.depthMm / 2 };
  if (solid.shape === 'cylinder') {
    const points = Array.from({ length: 24 }, (_, i) => {
      const a = (i * Math.PI) / 12;
      return [solid.radiusMm * Math.cos(a), solid.radiusMm * Math.sin(a)] as const;
    });
    return { points, axis: 'y', half: solid.heightMm / 2 };
  }
  const [w, h, d] = solid.sizeMm;
  const points = [
    [-w / 2, -h / 2],
    [w / 2, -h / 2],
    [w / 2, h / 2],
    [-w / 2, h / 2],
  ] as const;
  return { points, axis: 'z', half: d / 2 };
}

/** Corners of a part in the room; its outline must be convex. */
export function cornersOf(part: Part): Vector[] {
  const { points, axis, half } = outline(part);
  return points.flatMap(([a, b]) =>
    [-half, half].map((c) => placed(part, axis === 'z' ? [a, b, c] : [a, c, b])),
  );
}

/** Directions of a part's edges in the room: along its extrusion and along each side of its outline. */
function edgesOf(part: Part): Vector[] {
  const { points, axis } = outline(part);
  const origin = placed(part, [0, 0, 0]);
  const direction = (local: Vec3): Vector => {
    const [x, y, z] = placed(part, local);
    return [x - origin[0], y - origin[1], z - origin[2]];
  };
  const sides = points.map(([a, b], i) => {
    const [c, d] = points[(i + 1) % points.length] ?? [a, b];
    return direction(axis === 'z' ? [c - a, d - b, 0] : [c - a, 0, d - b]);
  });
  return [direction(axis === 'z' ? [0, 0, 1] : [0, 1, 0]), ...sides];
}

/**
 * How deep two convex parts reach into each other, by separating axes; zero or less when they do not.
 */
export function overlapDepth(one: Part, other: Part): number {
  const [a, b] = [cornersOf(one), cornersOf(other)];
  const [ea, eb] = [edgesOf(one), edgesOf(other)];
  const normals = (edges: Vector[]) => edges.slice(1).map((side) => cross(side, edges[0] as Vector));
  const axes = [
    ...normals(ea),
    ...normals(eb),
    ea[0],
    eb[0],
    ...ea.flatMap((x) => eb.map((y) => cross(x, y))),
  ];
  let least = Infinity;
  for (const axis of axes) {
    if (axis === undefined) continue;
    const length = Math.hypot(...axis);
    if (length < 1e-6) continue;
    const span = (corners: Vector[]) => {
      const values = corners.map((corner) => dot(corner, axis) / length);
      return [Math.min(...values), Math.max(...values)] as const;
    };
    const [a0, a1] = span(a);
    const [b0, b1] = span(b);
    least = Math.min(least, Math.min(a1, b1) - Math.max(a0, b0));
    if (least <= 0) return least;
  }
  return least;
}

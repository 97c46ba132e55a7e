import type { Vec3 } from '../parts/part.ts';
import { add, along, cross, dot, length, scale, sub, unit } from '../mannequin/vector.ts';
import type { Shape } from './shape.ts';

/** How far two shapes reach into each other. */
export interface Depth {
  depthMm: number;
  /** Direction in which the other must move to part them the shortest way. */
  direction: Vec3;
  /** Place of the one that is deepest in the other, and the reverse. */
  from: Vec3;
  to: Vec3;
}

interface Corner {
  w: Vec3;
  a: Vec3;
  b: Vec3;
}

interface Face {
  corners: readonly [number, number, number];
  normal: Vec3;
  /** Distance of its plane from the origin, outwards. */
  at: number;
}

const MOST_CORNERS = 600;
const CLOSE_ENOUGH_MM = 0.05;
const scratch = new Float64Array(3);

/** Point of a whole shape, its margin with it, furthest along a unit vector. */
function reach(shape: Shape, d: Vec3): Vec3 {
  shape.support(d[0], d[1], d[2], scratch);
  return along([scratch[0]!, scratch[1]!, scratch[2]!], d, shape.marginMm);
}

/**
 * How far two shapes that meet reach into each other: the shortest way that would part them. A solid inside their
 * difference grows where it is nearest to the origin, until it touches the skin of the difference there.
 *
 * @param one - a shape
 * @param other - a shape it meets
 * @returns millimetres; at most 0.05 too much, 0.5 where both are round and one lies in the middle of the other
 * @source expanding polytope: van den Bergen 2001, by support points
 */
export function depthOf(one: Shape, other: Shape): Depth {
  const corners: Corner[] = [];
  const towards = (d: Vec3): Corner => {
    const [a, b] = [reach(one, d), reach(other, scale(d, -1))];
    return { w: sub(a, b), a, b };
  };
  const faces = firstFaces(corners, towards);
  const nearest = (): Face => faces.reduce((low, face) => (face.at < low.at ? face : low));
  let face = nearest();
  let least: { depthMm: number; direction: Vec3 } | undefined;
  while (corners.length < MOST_CORNERS) {
    const found = towards(face.normal);
    const at = dot(found.w, face.normal);
    if (!least || at < least.depthMm) least = { depthMm: at, direction: face.normal };
    if (least.depthMm - face.at < CLOSE_ENOUGH_MM || !grow(faces, corners, found)) break;
    face = nearest();
  }
  const shares = sharesOf(face, corners);
  const mixed = (of: 'a' | 'b'): Vec3 => {
    const sum = (i: 0 | 1 | 2): number =>
      face.corners.reduce((so, c, n) => so + shares[n]! * corners[c]![of][i], 0);
    return [sum(0), sum(1), sum(2)];
  };
  const { depthMm, direction } = least!;
  return { depthMm: Math.max(0, depthMm), direction, from: mixed('a'), to: mixed('b') };
}

/** A tetrahedron of support points. */
function firstFaces(corners: Corner[], towards: (d: Vec3) => Corner): Face[] {
  const further = (d: Vec3, from: Vec3): Corner => {
    const [ahead, behind] = [towards(d), towards(scale(d, -1))];
    return Math.abs(dot(sub(ahead.w, from), d)) >= Math.abs(dot(sub(behind.w, from), d)) ? ahead : behind;
  };
  const first = towards([1, 0, 0]);
  const second = towards([-1, 0, 0]);
  const line = unit(sub(second.w, first.w), [1, 0, 0]);
  const aside = unit(cross(line, Math.abs(line[1]) < 0.9 ? [0, 1, 0] : [0, 0, 1]));
  const third = further(aside, first.w);
  const square = unit(cross(line, sub(third.w, first.w)), cross(line, aside));
  corners.push(first, second, third, further(square, first.w));
  const inside = scale(
    corners.reduce<Vec3>((sum, { w }) => add(sum, w), [0, 0, 0]),
    0.25,
  );
  return (
    [
      [0, 1, 2],
      [0, 3, 1],
      [0, 2, 3],
      [1, 3, 2],
    ] as const
  ).map((three) => {
    const face = faceOf(three, corners);
    const outwards = dot(sub(corners[three[0]]!.w, inside), face.normal) >= 0;
    return outwards ? face : faceOf([three[0], three[2], three[1]], corners);
  });
}

function faceOf(three: readonly [number, number, number], corners: readonly Corner[]): Face {
  const [a, b, c] = [corners[three[0]]!.w, corners[three[1]]!.w, corners[three[2]]!.w];
  const normal = unit(cross(sub(b, a), sub(c, a)));
  return { corners: three, normal, at: dot(normal, a) };
}

/** Takes a point into the solid; false when it changes nothing. */
function grow(faces: Face[], corners: Corner[], found: Corner): boolean {
  const seen = faces.filter(({ normal, at }) => dot(normal, found.w) - at > 1e-7);
  if (seen.length === 0) return false;
  const rim = new Map<string, [number, number]>();
  for (const { corners: three } of seen) {
    three.forEach((from, i) => {
      const to = three[(i + 1) % 3]!;
      if (!rim.delete(`${to} ${from}`)) rim.set(`${from} ${to}`, [from, to]);
    });
  }
  const kept = faces.filter((face) => !seen.includes(face));
  const apex = corners.push(found) - 1;
  const thin = (from: number, to: number): boolean =>
    length(cross(sub(corners[to]!.w, corners[from]!.w), sub(found.w, corners[from]!.w))) < 1e-9;
  faces.length = 0;
  faces.push(
    ...kept,
    ...[...rim.values()]
      .filter(([from, to]) => !thin(from, to))
      .map(([from, to]) => faceOf([from, to, apex], corners)),
  );
  return true;
}

/** Shares of a face's corners in the foot of the origin on its plane. */
function sharesOf(face: Face, corners: readonly Corner[]): [number, number, number] {
  const [a, b, c] = face.corners.map((i) => corners[i]!.w) as [Vec3, Vec3, Vec3];
  const foot = scale(face.normal, face.at);
  const area = dot(face.normal, cross(sub(b, a), sub(c, a))) || 1;
  const second = dot(face.normal, cross(sub(foot, a), sub(c, a))) / area;
  const third = dot(face.normal, cross(sub(b, a), sub(foot, a))) / area;
  return [1 - second - third, second, third];
}

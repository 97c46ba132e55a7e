import { nearStretches, type MannequinMesh } from '../mannequin/mesh.ts';
import { STRETCH_NAMES } from '../mannequin/stretches.ts';
import type { Vec3 } from '../parts/part.ts';
import { boundsAround, hull, triangle, type Bounds, type Shape } from './shape.ts';
import type { Run, Surface } from './surface.ts';

/** The skin of one stretch of a body. */
export interface SkinPatch extends Surface {
  name: string;
}

type Skin = Pick<MannequinMesh, 'positions' | 'indices'>;

/** Triangles that are looked at together: neighbours stand next to each other in a mesh. */
const RUN = 32;
const patches = new WeakMap<object, SkinPatch[]>();

/**
 * A body's skin in stretches, such as `left forearm`.
 *
 * @param mesh - a near mesh, room frame; must not be changed afterwards
 * @returns one surface a stretch; together they are the whole skin
 */
export function skinPatches(mesh: Skin): SkinPatch[] {
  const known = patches.get(mesh);
  if (known) return known;
  const of = nearStretches();
  const runs = STRETCH_NAMES.map((): Run[] => []);
  for (let from = 0; from < of.length;) {
    let to = from + 1;
    while (to < of.length && to < from + RUN && of[to] === of[from]) to++;
    runs[of[from]!]!.push(runOf(mesh, from, to));
    from = to;
  }
  const made = STRETCH_NAMES.map((name, stretch): SkinPatch => {
    const own = runs[stretch]!;
    let whole: Shape | undefined;
    const around = (): Shape => (whole ??= hull(cornersOf(mesh, (t) => of[t] === stretch)));
    return { ...boundsAround(own), name, runs: own, around, convex: false };
  });
  patches.set(mesh, made);
  return made;
}

const corner = ({ positions }: Skin, v: number): Vec3 => [
  positions[v * 3]!,
  positions[v * 3 + 1]!,
  positions[v * 3 + 2]!,
];

function runOf(mesh: Skin, from: number, to: number): Run {
  let known: Shape[] | undefined;
  const make = (): Shape[] =>
    Array.from({ length: to - from }, (_, i) => {
      const [a, b, c] = mesh.indices.subarray((from + i) * 3, (from + i + 1) * 3);
      return triangle(corner(mesh, a!), corner(mesh, b!), corner(mesh, c!));
    });
  return { ...boundsOf(mesh, from * 3, to * 3), shapes: () => (known ??= make()) };
}

function boundsOf({ positions, indices }: Skin, from: number, to: number): Bounds {
  const low = [Infinity, Infinity, Infinity];
  const high = [-Infinity, -Infinity, -Infinity];
  for (let i = from; i < to; i++) {
    for (let n = 0; n < 3; n++) {
      const x = positions[indices[i]! * 3 + n]!;
      if (x < low[n]!) low[n] = x;
      if (x > high[n]!) high[n] = x;
    }
  }
  return { minMm: low as unknown as Vec3, maxMm: high as unknown as Vec3 };
}

function cornersOf(mesh: Skin, isOurs: (triangle: number) => boolean): Vec3[] {
  const used = new Set<number>();
  mesh.indices.forEach((v, i) => {
    if (isOurs(Math.floor(i / 3))) used.add(v);
  });
  return [...used].map((v) => corner(mesh, v));
}

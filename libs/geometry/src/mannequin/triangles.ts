import type { Cage, CageFace } from './cage.ts';
import type { Level } from './subdivision.ts';

/** Strips so straight that every second row can be left out. */
const STRAIGHT: Record<CageFace['part'], readonly number[]> = {
  trunk: [8, 12],
  arm: [1, 2, 5, 6],
  leg: [7, 9, 10, 11],
  cap: [],
};

/** Whether each base face must be walked the other way round to look outwards. */
export function outwardFlips(cage: Cage): boolean[] {
  const byEdge = new Map<string, { face: number; forward: boolean }[]>();
  const key = (a: number, b: number): string => (a < b ? `${a},${b}` : `${b},${a}`);
  cage.faces.forEach(({ corners }, face) => {
    corners.forEach((a, i) => {
      const b = corners[(i + 1) % 4]!;
      const list = byEdge.get(key(a, b)) ?? [];
      list.push({ face, forward: a < b });
      byEdge.set(key(a, b), list);
    });
  });
  const flips: (boolean | undefined)[] = cage.faces.map(() => undefined);
  flips[0] = false;
  const queue = [0];
  for (let at = queue.shift(); at !== undefined; at = queue.shift()) {
    const { corners } = cage.faces[at]!;
    corners.forEach((a, i) => {
      const pair = byEdge.get(key(a, corners[(i + 1) % 4]!))!;
      const own = pair.find((side) => side.face === at)!;
      const other = pair.find((side) => side.face !== at)!;
      if (flips[other.face] !== undefined) return;
      flips[other.face] = own.forward === other.forward ? !flips[at]! : flips[at]!;
      queue.push(other.face);
    });
  }
  return flips.map((flip) => flip ?? false);
}

/** Points of a level laid out on each base face: `grid[face][v * (size + 1) + u]`. */
export function gridsOf(level: Level, faceCount: number, size: number): Uint32Array[] {
  const grids = Array.from({ length: faceCount }, () => new Uint32Array((size + 1) * (size + 1)));
  level.quads.forEach((quad, q) => {
    const { face, uv } = level.home[q]!;
    quad.forEach((id, i) => {
      const [u, v] = uv[i]!;
      grids[face]![v * (size + 1) + u] = id;
    });
  });
  return grids;
}

/** Triangles of one base face, looking outwards. */
export function faceTriangles(face: CageFace, grid: Uint32Array, size: number, flip: boolean): number[] {
  const step = size === 4 && STRAIGHT[face.part].includes(face.strip) ? 2 : 1;
  const rows = Array.from({ length: size / step + 1 }, (_, i) => i * step);
  const out: number[] = [];
  for (let i = 0; i + 1 < rows.length; i++) {
    for (let u = 0; u < size; u++) {
      const a = grid[rows[i]! * (size + 1) + u]!;
      const b = grid[rows[i]! * (size + 1) + u + 1]!;
      const c = grid[rows[i + 1]! * (size + 1) + u + 1]!;
      const d = grid[rows[i + 1]! * (size + 1) + u]!;
      out.push(...(flip ? [a, c, b, a, d, c] : [a, b, c, a, c, d]));
    }
  }
  return out;
}

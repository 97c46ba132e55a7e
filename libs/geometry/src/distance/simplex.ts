/** Up to four points as distances gather them: `w = a - b`, and the points of both solids behind it. */
export interface Simplex {
  count: number;
  w: Float64Array;
  a: Float64Array;
  b: Float64Array;
  /** Share of each point in the point nearest to the origin. */
  share: Float64Array;
}

export const emptySimplex = (): Simplex => ({
  count: 0,
  w: new Float64Array(12),
  a: new Float64Array(12),
  b: new Float64Array(12),
  share: new Float64Array(4),
});

interface Nearest {
  kept: readonly number[];
  shares: readonly number[];
  /** Square of the distance from the origin. */
  square: number;
}

const least = (best: Nearest, other: Nearest): Nearest => (other.square < best.square ? other : best);

function nearestOnLine(w: Float64Array, i: number, j: number): Nearest {
  const [a, b] = [i * 3, j * 3];
  const [x, y, z] = [w[a]!, w[a + 1]!, w[a + 2]!];
  const [ex, ey, ez] = [w[b]! - x, w[b + 1]! - y, w[b + 2]! - z];
  const length2 = ex * ex + ey * ey + ez * ez;
  const t = length2 > 0 ? -(x * ex + y * ey + z * ez) / length2 : 0;
  if (t <= 0) return { kept: [i], shares: [1], square: x * x + y * y + z * z };
  if (t >= 1) return { kept: [j], shares: [1], square: w[b]! ** 2 + w[b + 1]! ** 2 + w[b + 2]! ** 2 };
  return {
    kept: [i, j],
    shares: [1 - t, t],
    square: (x + t * ex) ** 2 + (y + t * ey) ** 2 + (z + t * ez) ** 2,
  };
}

function nearestOnTriangle(w: Float64Array, i: number, j: number, k: number): Nearest {
  const [a, b, c] = [i * 3, j * 3, k * 3];
  const [x, y, z] = [w[a]!, w[a + 1]!, w[a + 2]!];
  const [ex, ey, ez] = [w[b]! - x, w[b + 1]! - y, w[b + 2]! - z];
  const [fx, fy, fz] = [w[c]! - x, w[c + 1]! - y, w[c + 2]! - z];
  const ee = ex * ex + ey * ey + ez * ez;
  const ef = ex * fx + ey * fy + ez * fz;
  const ff = fx * fx + fy * fy + fz * fz;
  const det = ee * ff - ef * ef;
  if (det > 1e-12 * ee * ff) {
    const [d, g] = [-(x * ex + y * ey + z * ez), -(x * fx + y * fy + z * fz)];
    const s = (d * ff - g * ef) / det;
    const t = (g * ee - d * ef) / det;
    if (s > 0 && t > 0 && s + t < 1) {
      const square = (x + s * ex + t * fx) ** 2 + (y + s * ey + t * fy) ** 2 + (z + s * ez + t * fz) ** 2;
      return { kept: [i, j, k], shares: [1 - s - t, s, t], square };
    }
  }
  return least(nearestOnLine(w, i, j), least(nearestOnLine(w, i, k), nearestOnLine(w, j, k)));
}

const FACES = [
  [0, 1, 2, 3],
  [0, 1, 3, 2],
  [0, 2, 3, 1],
  [1, 2, 3, 0],
] as const;

function nearestOnTetrahedron(w: Float64Array): Nearest {
  let best: Nearest | undefined;
  for (const [i, j, k, opposite] of FACES) {
    const [a, b, c, d] = [i * 3, j * 3, k * 3, opposite * 3];
    const [ex, ey, ez] = [w[b]! - w[a]!, w[b + 1]! - w[a + 1]!, w[b + 2]! - w[a + 2]!];
    const [fx, fy, fz] = [w[c]! - w[a]!, w[c + 1]! - w[a + 1]!, w[c + 2]! - w[a + 2]!];
    const [nx, ny, nz] = [ey * fz - ez * fy, ez * fx - ex * fz, ex * fy - ey * fx];
    const origin = -(w[a]! * nx + w[a + 1]! * ny + w[a + 2]! * nz);
    const inner = (w[d]! - w[a]!) * nx + (w[d + 1]! - w[a + 1]!) * ny + (w[d + 2]! - w[a + 2]!) * nz;
    if (origin * inner > 0) continue;
    const nearest = nearestOnTriangle(w, i, j, k);
    best = best ? least(best, nearest) : nearest;
  }
  return best ?? { kept: [0, 1, 2, 3], shares: [0.25, 0.25, 0.25, 0.25], square: 0 };
}

/**
 * Finds the point of a simplex nearest to the origin, writes the shares of its corners and drops the corners it does not
 * need.
 *
 * @param s - changed in place; four points are left only when the origin lies inside
 * @returns the square of the distance
 * @source geometry of points, lines, triangles and tetrahedra
 */
export function reduceToNearest(s: Simplex): number {
  const { w } = s;
  const nearest =
    s.count === 1
      ? { kept: [0], shares: [1], square: w[0]! ** 2 + w[1]! ** 2 + w[2]! ** 2 }
      : s.count === 2
        ? nearestOnLine(w, 0, 1)
        : s.count === 3
          ? nearestOnTriangle(w, 0, 1, 2)
          : nearestOnTetrahedron(w);
  const { kept, shares } = nearest;
  for (let to = 0; to < kept.length; to++) {
    const from = kept[to]!;
    s.share[to] = shares[to]!;
    if (from === to) continue;
    for (let i = 0; i < 3; i++) {
      s.w[to * 3 + i] = s.w[from * 3 + i]!;
      s.a[to * 3 + i] = s.a[from * 3 + i]!;
      s.b[to * 3 + i] = s.b[from * 3 + i]!;
    }
  }
  s.count = kept.length;
  return nearest.square;
}

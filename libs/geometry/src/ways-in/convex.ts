import type { PlanOutline } from '../situation/plan.ts';

/** A convex outline made ready for many distances. */
export interface Convex {
  xs: Float64Array;
  zs: Float64Array;
  /** Outward unit normal of the side from each corner to the next. */
  nx: Float64Array;
  nz: Float64Array;
  /** Circle around it: x, z, radius. */
  circle: readonly [number, number, number];
}

/**
 * Makes a convex outline ready for many distances.
 *
 * @param outline - convex, either way round, in the room's x and z
 * @returns corners, outward normals and a circle around it, millimetres
 */
export function convexOf(outline: PlanOutline): Convex {
  let [cx, cz] = [0, 0];
  for (const [x, z] of outline) {
    cx += x / outline.length;
    cz += z / outline.length;
  }
  const xs = Float64Array.from(outline, ([x]) => x);
  const zs = Float64Array.from(outline, ([, z]) => z);
  const nx = new Float64Array(outline.length);
  const nz = new Float64Array(outline.length);
  let radius = 0;
  outline.forEach(([x, z], i) => {
    const [tx, tz] = outline[(i + 1) % outline.length] ?? [x, z];
    const length = Math.hypot(tx - x, tz - z) || 1;
    const [a, b] = [(tz - z) / length, (x - tx) / length];
    const sign = a * (x - cx) + b * (z - cz) < 0 ? -1 : 1;
    nx[i] = sign * a;
    nz[i] = sign * b;
    radius = Math.max(radius, Math.hypot(x - cx, z - cz));
  });
  return { xs, zs, nx, nz, circle: [cx, cz, radius] };
}

/**
 * Distance from a line between two points to a convex outline.
 *
 * @param shape - the outline
 * @param ax - x of one end
 * @param az - z of one end
 * @param bx - x of the other end
 * @param bz - z of the other end
 * @param atMost - larger distances are of no matter: any value no less than this may come back for them
 * @returns millimetres, exact; negative where they meet: the least way that would part them
 * @source plane geometry: separating axes of two convex figures
 */
export function lineDistance(
  shape: Convex,
  ax: number,
  az: number,
  bx: number,
  bz: number,
  atMost: number,
): number {
  const { xs, zs, nx, nz } = shape;
  const count = xs.length;
  let apart = -Infinity;
  for (let i = 0; i < count; i += 1) {
    const x = xs[i] ?? 0;
    const z = zs[i] ?? 0;
    const a = nx[i] ?? 0;
    const b = nz[i] ?? 0;
    apart = Math.max(apart, Math.min(a * (ax - x) + b * (az - z), a * (bx - x) + b * (bz - z)));
  }
  if (apart >= atMost) return apart;
  const dx = bx - ax;
  const dz = bz - az;
  const length2 = dx * dx + dz * dz;
  if (length2 > 0) {
    const length = Math.sqrt(length2);
    let [low, high] = [Infinity, -Infinity];
    for (let i = 0; i < count; i += 1) {
      const across = (dz * ((xs[i] ?? 0) - ax) - dx * ((zs[i] ?? 0) - az)) / length;
      if (across < low) low = across;
      if (across > high) high = across;
    }
    apart = Math.max(apart, low, -high);
    if (apart >= atMost) return apart;
  }
  if (apart <= 0) return apart;
  let least = Infinity;
  for (let i = 0; i < count; i += 1) {
    const x = xs[i] ?? 0;
    const z = zs[i] ?? 0;
    const n = i + 1 === count ? 0 : i + 1;
    const ex = (xs[n] ?? 0) - x;
    const ez = (zs[n] ?? 0) - z;
    least = Math.min(
      least,
      squareTo(x, z, ax, az, dx, dz, length2),
      squareTo(ax, az, x, z, ex, ez, ex * ex + ez * ez),
      squareTo(bx, bz, x, z, ex, ez, ex * ex + ez * ez),
    );
  }
  return Math.sqrt(least);
}

/** Square of the distance from a point to a line that starts somewhere and runs by a vector. */
function squareTo(
  px: number,
  pz: number,
  x: number,
  z: number,
  dx: number,
  dz: number,
  length2: number,
): number {
  const along = length2 === 0 ? 0 : ((px - x) * dx + (pz - z) * dz) / length2;
  const t = along < 0 ? 0 : along > 1 ? 1 : along;
  const ox = px - x - t * dx;
  const oz = pz - z - t * dz;
  return ox * ox + oz * oz;
}

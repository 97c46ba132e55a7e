/** A triangle mesh as rays and slices see it: no names, no parts. */
export interface Soup {
  positions: Float32Array | Float64Array;
  indices: Uint32Array;
}

type Axis = 0 | 1 | 2;
/** A stretch of a line inside the body. */
export interface Inside {
  from: number;
  to: number;
}

const CELL_MM = 24;

/** Casts lines along one axis; the triangles are sorted into cells of the two others once. */
export class LineCaster {
  private readonly cells = new Map<number, number[]>();
  private readonly across: readonly [Axis, Axis];

  constructor(
    private readonly soup: Soup,
    private readonly axis: Axis,
  ) {
    this.across = axis === 0 ? [1, 2] : axis === 1 ? [2, 0] : [0, 1];
    const { positions: p, indices } = soup;
    for (let t = 0; t < indices.length; t += 3) {
      const range = this.across.map((a) => {
        const values = [0, 1, 2].map((i) => p[indices[t + i]! * 3 + a]!);
        return [Math.floor(Math.min(...values) / CELL_MM), Math.floor(Math.max(...values) / CELL_MM)];
      });
      for (let i = range[0]![0]!; i <= range[0]![1]!; i++) {
        for (let j = range[1]![0]!; j <= range[1]![1]!; j++) {
          const list = this.cells.get(i * 4096 + j);
          if (list) list.push(t);
          else this.cells.set(i * 4096 + j, [t]);
        }
      }
    }
  }

  /**
   * Stretches inside the body along the line through a point, in rising order. A body pushed into itself
   * counts once: stretches that overlap are one.
   *
   * @param x - @param y - @param z - a point of the line; its own coordinate along the axis is not read
   */
  inside(x: number, y: number, z: number): Inside[] {
    const at = [x, y, z];
    // A hair beside the grid of symmetric vertices, so that no line runs along an edge.
    const u = at[this.across[0]]! + 0.00137;
    const v = at[this.across[1]]! + 0.00071;
    const { positions: p, indices } = this.soup;
    const hits: { at: number; enters: number }[] = [];
    for (const t of this.cells.get(Math.floor(u / CELL_MM) * 4096 + Math.floor(v / CELL_MM)) ?? []) {
      const corner = (i: number): readonly [number, number, number] => {
        const k = indices[t + i]! * 3;
        return [p[k + this.across[0]]!, p[k + this.across[1]]!, p[k + this.axis]!];
      };
      const [a, b, c] = [corner(0), corner(1), corner(2)];
      const area = (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);
      if (Math.abs(area) < 1e-12) continue;
      const wb = ((u - a[0]) * (c[1] - a[1]) - (v - a[1]) * (c[0] - a[0])) / area;
      const wc = ((b[0] - a[0]) * (v - a[1]) - (b[1] - a[1]) * (u - a[0])) / area;
      if (wb < 0 || wc < 0 || wb + wc > 1) continue;
      hits.push({ at: a[2] + wb * (b[2] - a[2]) + wc * (c[2] - a[2]), enters: area < 0 ? 1 : -1 });
    }
    hits.sort((first, second) => first.at - second.at);
    const out: Inside[] = [];
    let depth = 0;
    let from = 0;
    for (const hit of hits) {
      if (depth === 0 && hit.enters === 1) from = hit.at;
      depth += hit.enters;
      if (depth === 0 && hit.enters === -1) out.push({ from, to: hit.at });
    }
    return out;
  }
}

/**
 * Greatest value of one axis over the part of the surface within a slab of another axis; triangles are cut
 * at the slab's faces.
 *
 * @param keep - leaves out what is not meant, from the point itself
 */
export function furthest(
  { positions: p, indices }: Soup,
  axis: Axis,
  sign: 1 | -1,
  slab: { axis: Axis; from: number; to: number },
  keep: (x: number, y: number, z: number) => boolean = () => true,
): number {
  let best = -Infinity;
  const look = (x: number, y: number, z: number): void => {
    if (!keep(x, y, z)) return;
    best = Math.max(best, sign * [x, y, z][axis]!);
  };
  const lookAt = (k: number): void => look(p[k]!, p[k + 1]!, p[k + 2]!);
  for (let t = 0; t < indices.length; t++) {
    const a = indices[t]! * 3;
    const b = indices[t % 3 === 2 ? t - 2 : t + 1]! * 3;
    const [ya, yb] = [p[a + slab.axis]!, p[b + slab.axis]!];
    if (ya >= slab.from && ya <= slab.to) lookAt(a);
    for (const face of [slab.from, slab.to]) {
      if (ya < face === yb < face) continue;
      const s = (face - ya) / (yb - ya);
      look(
        p[a]! + s * (p[b]! - p[a]!),
        p[a + 1]! + s * (p[b + 1]! - p[a + 1]!),
        p[a + 2]! + s * (p[b + 2]! - p[a + 2]!),
      );
    }
  }
  return sign * best;
}

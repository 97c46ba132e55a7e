import type { Soup } from './mesh-rays.ts';

type Point = [number, number, number];
/** Where two triangles of one mesh cut each other. */
export interface Crossing {
  at: Point;
  triangles: readonly [number, number];
}

const minus = (a: Point, b: Point): Point => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
const dot = (a: Point, b: Point): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const cross = (a: Point, b: Point): Point => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

/** Where a stretch from `from` along `along` (up to once its length) meets a triangle; 0 to 1, or -1. */
function meets(from: Point, along: Point, [a, b, c]: readonly Point[]): number {
  const [u, v] = [minus(b!, a!), minus(c!, a!)];
  const p = cross(along, v);
  const det = dot(u, p);
  if (Math.abs(det) < 1e-12) return -1;
  const s = minus(from, a!);
  const bu = dot(s, p) / det;
  const q = cross(s, u);
  const bv = dot(along, q) / det;
  if (bu < 0 || bv < 0 || bu + bv > 1) return -1;
  const t = dot(v, q) / det;
  return t >= 0 && t <= 1 ? t : -1;
}

/** A mesh ready for questions about itself: corners by triangle, and points that are one however often they are listed. */
function corners({ positions: p, indices }: Soup): { triangle: Point[][]; ids: number[][] } {
  const names = new Map<string, number>();
  const idOf = Array.from({ length: p.length / 3 }, (_, v) => {
    const name = `${p[v * 3]!.toFixed(3)} ${p[v * 3 + 1]!.toFixed(3)} ${p[v * 3 + 2]!.toFixed(3)}`;
    if (!names.has(name)) names.set(name, names.size);
    return names.get(name)!;
  });
  const triangle: Point[][] = [];
  const ids: number[][] = [];
  for (let t = 0; t < indices.length; t += 3) {
    const vs = [indices[t]!, indices[t + 1]!, indices[t + 2]!];
    triangle.push(vs.map((v): Point => [p[v * 3]!, p[v * 3 + 1]!, p[v * 3 + 2]!]));
    ids.push(vs.map((v) => idOf[v]!));
  }
  return { triangle, ids };
}

const CELL_MM = 20;

/**
 * Every place where a mesh cuts itself; triangles that share a corner are neighbours and not compared.
 *
 * @param soup - closed mesh, millimetres
 * @returns one point for every pair of triangles
 */
export function selfCrossings(soup: Soup): Crossing[] {
  const { triangle, ids } = corners(soup);
  const cells = new Map<number, number[]>();
  const low = triangle.map((abc) => [0, 1, 2].map((i) => Math.min(...abc.map((q) => q[i]!))));
  const high = triangle.map((abc) => [0, 1, 2].map((i) => Math.max(...abc.map((q) => q[i]!))));
  triangle.forEach((_, t) => {
    const [a, b] = [low[t]!, high[t]!].map((at) => at.map((x) => Math.floor(x / CELL_MM)));
    for (let i = a![0]!; i <= b![0]!; i++)
      for (let j = a![1]!; j <= b![1]!; j++)
        for (let k = a![2]!; k <= b![2]!; k++) {
          const key = (i * 1024 + j) * 1024 + k;
          const list = cells.get(key);
          if (list) list.push(t);
          else cells.set(key, [t]);
        }
  });
  const found = new Map<number, Crossing>();
  const cut = (a: number, b: number): Point | undefined => {
    for (const [of, through] of [
      [a, b],
      [b, a],
    ] as const) {
      for (let i = 0; i < 3; i++) {
        const from = triangle[of]![i]!;
        const along = minus(triangle[of]![(i + 1) % 3]!, from);
        const t = meets(from, along, triangle[through]!);
        if (t >= 0) return [from[0] + t * along[0], from[1] + t * along[1], from[2] + t * along[2]];
      }
    }
    return undefined;
  };
  for (const list of cells.values()) {
    for (let i = 0; i < list.length; i++) {
      for (let j = i + 1; j < list.length; j++) {
        const [a, b] = [list[i]!, list[j]!];
        const key = a * triangle.length + b;
        if (found.has(key) || [0, 1, 2].some((x) => low[a]![x]! > high[b]![x]! || low[b]![x]! > high[a]![x]!))
          continue;
        if (ids[a]!.some((id) => ids[b]!.includes(id))) continue;
        const at = cut(a, b);
        if (at) found.set(key, { at, triangles: [a, b] });
      }
    }
  }
  return [...found.values()];
}

const VIEWPOINTS = 128;
const VIEW_FROM_MM = 3000;
/** A look starts this far off the skin, so that it is not stopped by the cut itself. */
const CLEAR_OF_SKIN_MM = 1;
const CHUNK = 32;
const SAME_PLACE_MM = 6;

/**
 * Crossings that somebody could see. A crossing is visible when at least one of 128 viewpoints, evenly spread
 * over a sphere 3 m around the body, sees the point 1 mm before it with nothing of the body between.
 */
export function visibleCrossings(soup: Soup, crossings: readonly Crossing[]): Crossing[] {
  const { triangle } = corners(soup);
  const chunks: { centre: Point; radius: number; from: number; to: number }[] = [];
  for (let from = 0; from < triangle.length; from += CHUNK) {
    const to = Math.min(triangle.length, from + CHUNK);
    const points = triangle.slice(from, to).flat();
    const centre = [0, 1, 2].map((i) => points.reduce((sum, q) => sum + q[i]!, 0) / points.length) as Point;
    chunks.push({
      centre,
      radius: Math.max(...points.map((q) => Math.hypot(...minus(q, centre)))),
      from,
      to,
    });
  }
  const middle = [0, 1, 2].map(
    (i) => chunks.reduce((sum, { centre }) => sum + centre[i]!, 0) / chunks.length,
  ) as Point;
  const viewpoints = Array.from({ length: VIEWPOINTS }, (_, i): Point => {
    const y = 1 - (2 * (i + 0.5)) / VIEWPOINTS;
    const turn = i * Math.PI * (3 - Math.sqrt(5));
    const r = Math.sqrt(1 - y * y);
    return [
      middle[0] + VIEW_FROM_MM * r * Math.cos(turn),
      middle[1] + VIEW_FROM_MM * y,
      middle[2] + VIEW_FROM_MM * r * Math.sin(turn),
    ];
  });
  const blocked = (from: Point, along: Point): boolean => {
    const length2 = dot(along, along);
    return chunks.some(({ centre, radius, from: first, to }) => {
      const rel = minus(centre, from);
      const t = Math.min(1, Math.max(0, dot(rel, along) / length2));
      const off: Point = [rel[0] - t * along[0], rel[1] - t * along[1], rel[2] - t * along[2]];
      if (dot(off, off) > radius * radius) return false;
      for (let k = first; k < to; k++) if (meets(from, along, triangle[k]!) >= 0) return true;
      return false;
    });
  };
  const seen = new Map<string, boolean>();
  return crossings.filter(({ at }) => {
    const place = at.map((x) => Math.round(x / SAME_PLACE_MM)).join(' ');
    const known = seen.get(place);
    if (known !== undefined) return known;
    const visible = viewpoints.some((eye) => {
      const along = minus(eye, at);
      const step = CLEAR_OF_SKIN_MM / Math.hypot(...along);
      const from: Point = [at[0] + along[0] * step, at[1] + along[1] * step, at[2] + along[2] * step];
      return !blocked(from, minus(eye, from));
    });
    seen.set(place, visible);
    return visible;
  });
}

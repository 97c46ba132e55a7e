/**
 * Catmull-Clark subdivision of a closed quad mesh, done once on symbols: every point of a finer level,
 * moved to where the endless subdivision would bring it, is a fixed mixture of the cage points.
 *
 * @source E. Catmull, J. Clark, "Recursively generated B-spline surfaces", 1978; limit positions after
 * M. Halstead, M. Kass, T. DeRose, 1993: (n²v + 4Σedge + Σface) / (n(n+5))
 */

/** A sparse matrix by rows: row i holds the entries from `start[i]` to `start[i + 1]`. */
export interface SparseRows {
  start: Uint32Array;
  column: Uint32Array;
  weight: Float64Array;
}

type Quad = readonly [number, number, number, number];
type Corner = readonly [u: number, v: number];

/** One level of subdivision; `home` tells a quad's base face and where its corners lie on it, 0 to 2^level. */
export interface Level {
  pointCount: number;
  quads: Quad[];
  home: { face: number; uv: readonly Corner[] }[];
}

interface Neighbours {
  edges: number[][];
  faces: number[][];
  diagonals: number[][];
}

const edgeKey = (a: number, b: number): number => (a < b ? a * 65536 + b : b * 65536 + a);

function neighbours(level: Level): Neighbours {
  const edges: number[][] = Array.from({ length: level.pointCount }, () => []);
  const faces: number[][] = Array.from({ length: level.pointCount }, () => []);
  const diagonals: number[][] = Array.from({ length: level.pointCount }, () => []);
  level.quads.forEach((quad, f) => {
    for (let i = 0; i < 4; i++) {
      const v = quad[i]!;
      faces[v]!.push(f);
      diagonals[v]!.push(quad[(i + 2) % 4]!);
      for (const w of [quad[(i + 1) % 4]!, quad[(i + 3) % 4]!]) if (!edges[v]!.includes(w)) edges[v]!.push(w);
    }
  });
  return { edges, faces, diagonals };
}

/** Collects sparse rows one after the other. */
class RowBuilder {
  private readonly start: number[] = [0];
  private readonly column: number[] = [];
  private readonly weight: number[] = [];
  private readonly dense: Float64Array;
  private readonly touched: number[] = [];

  constructor(columns: number) {
    this.dense = new Float64Array(columns);
  }

  /** Adds `factor` times a row of another matrix to the row being built. */
  addRow(source: SparseRows, row: number, factor: number): void {
    for (let i = source.start[row]!; i < source.start[row + 1]!; i++)
      this.add(source.column[i]!, source.weight[i]! * factor);
  }

  add(column: number, weight: number): void {
    if (this.dense[column] === 0) this.touched.push(column);
    this.dense[column]! += weight;
  }

  endRow(): void {
    for (const c of this.touched) {
      if (this.dense[c] === 0) continue;
      this.column.push(c);
      this.weight.push(this.dense[c]!);
      this.dense[c] = 0;
    }
    this.touched.length = 0;
    this.start.push(this.column.length);
  }

  finish(): SparseRows {
    return {
      start: Uint32Array.from(this.start),
      column: Uint32Array.from(this.column),
      weight: Float64Array.from(this.weight),
    };
  }
}

/** The cage itself as level 0. */
export function baseLevel(pointCount: number, quads: Quad[]): Level {
  return {
    pointCount,
    quads,
    home: quads.map((_, face) => ({
      face,
      uv: [
        [0, 0],
        [1, 0],
        [1, 1],
        [0, 1],
      ] as const,
    })),
  };
}

/** Rows that leave every point where it is. */
export function identityRows(count: number): SparseRows {
  const rows = new RowBuilder(count);
  for (let i = 0; i < count; i++) {
    rows.add(i, 1);
    rows.endRow();
  }
  return rows.finish();
}

/** One Catmull-Clark step: the finer level, and its points as mixtures of the same columns as `rows`. */
export function refine(level: Level, rows: SparseRows, columns: number): { level: Level; rows: SparseRows } {
  const near = neighbours(level);
  const built = new RowBuilder(columns);
  const V = level.pointCount;
  for (let v = 0; v < V; v++) {
    const n = near.edges[v]!.length;
    built.addRow(rows, v, (n - 2) / n);
    for (const w of near.edges[v]!) built.addRow(rows, w, 1 / (n * n));
    for (const f of near.faces[v]!) for (const w of level.quads[f]!) built.addRow(rows, w, 1 / (4 * n * n));
    built.endRow();
  }
  const facePoint = (f: number): number => V + f;
  for (const quad of level.quads) {
    for (const w of quad) built.addRow(rows, w, 0.25);
    built.endRow();
  }
  const edgeFaces = new Map<number, number[]>();
  level.quads.forEach((quad, f) => {
    for (let i = 0; i < 4; i++) {
      const key = edgeKey(quad[i]!, quad[(i + 1) % 4]!);
      const list = edgeFaces.get(key);
      if (list) list.push(f);
      else edgeFaces.set(key, [f]);
    }
  });
  const edgePoint = new Map<number, number>();
  let next = V + level.quads.length;
  for (const [key, faces] of edgeFaces) {
    edgePoint.set(key, next++);
    built.addRow(rows, Math.floor(key / 65536), 0.25);
    built.addRow(rows, key % 65536, 0.25);
    for (const f of faces) for (const w of level.quads[f]!) built.addRow(rows, w, 1 / 16);
    built.endRow();
  }
  const quads: Quad[] = [];
  const home: Level['home'] = [];
  level.quads.forEach((quad, f) => {
    const { face, uv } = level.home[f]!;
    const doubled = uv.map(([u, v]): Corner => [u * 2, v * 2]);
    const between = (a: Corner, b: Corner): Corner => [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2];
    const middle = between(doubled[0]!, doubled[2]!);
    for (let i = 0; i < 4; i++) {
      const after = (i + 1) % 4;
      const before = (i + 3) % 4;
      quads.push([
        quad[i]!,
        edgePoint.get(edgeKey(quad[i]!, quad[after]!))!,
        facePoint(f),
        edgePoint.get(edgeKey(quad[before]!, quad[i]!))!,
      ]);
      home.push({
        face,
        uv: [
          doubled[i]!,
          between(doubled[i]!, doubled[after]!),
          middle,
          between(doubled[before]!, doubled[i]!),
        ],
      });
    }
  });
  return { level: { pointCount: next, quads, home }, rows: built.finish() };
}

/** The same points moved to the limit surface. */
export function toLimit(level: Level, rows: SparseRows, columns: number): SparseRows {
  const near = neighbours(level);
  const built = new RowBuilder(columns);
  for (let v = 0; v < level.pointCount; v++) {
    const n = near.edges[v]!.length;
    const share = 1 / (n * (n + 5));
    built.addRow(rows, v, n * n * share);
    for (const w of near.edges[v]!) built.addRow(rows, w, 4 * share);
    for (const w of near.diagonals[v]!) built.addRow(rows, w, share);
    built.endRow();
  }
  return built.finish();
}

/** Rows times points (x, y, z one after the other). */
export function applyRows(rows: SparseRows, points: Float64Array, out: Float64Array): void {
  const count = rows.start.length - 1;
  for (let i = 0; i < count; i++) {
    let x = 0;
    let y = 0;
    let z = 0;
    const end = rows.start[i + 1]!;
    for (let e = rows.start[i]!; e < end; e++) {
      const w = rows.weight[e]!;
      const c = rows.column[e]! * 3;
      x += w * points[c]!;
      y += w * points[c + 1]!;
      z += w * points[c + 2]!;
    }
    out[i * 3] = x;
    out[i * 3 + 1] = y;
    out[i * 3 + 2] = z;
  }
}

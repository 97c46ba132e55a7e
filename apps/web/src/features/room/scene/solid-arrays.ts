import { Floats, Indices } from './floats.ts';

/** What solids are written into: points, the triangles on them and their inked edges. */
export interface SolidSink {
  positions: Floats;
  normals: Floats;
  materials: Floats;
  /** Where each point lies in its board, four numbers; see `addGrains`. */
  grains: Floats;
  /** Three points a triangle. */
  indices: Indices;
  /** Those of round parts again, for an outline that no straight edge can give. */
  roundIndices: Indices;
  /** Ends of straight edges, six numbers a segment. */
  edges: Floats;
  edgeWeights: Floats;
}

/** The same as it goes to the card. */
export type PackedSolids = { [List in keyof SolidSink]: SolidSink[List]['memory'] };

export const createSink = (): SolidSink => ({
  positions: new Floats(),
  normals: new Floats(),
  materials: new Floats(),
  grains: new Floats(),
  indices: new Indices(),
  roundIndices: new Indices(),
  edges: new Floats(),
  edgeWeights: new Floats(),
});

export const listsOf = (sink: SolidSink) => Object.values<Floats | Indices>({ ...sink });

/** A copy of what was written; the sink may be used again. */
export const packSink = (sink: SolidSink): PackedSolids => ({
  positions: sink.positions.packed(),
  normals: sink.normals.packed(),
  materials: sink.materials.packed(),
  grains: sink.grains.packed(),
  indices: sink.indices.packed(),
  roundIndices: sink.roundIndices.packed(),
  edges: sink.edges.packed(),
  edgeWeights: sink.edgeWeights.packed(),
});

/** Writes a point; gives its number. */
export function addPoint(out: SolidSink, at: ArrayLike<number>, normal: ArrayLike<number>, material: number) {
  out.positions.push3(at[0]!, at[1]!, at[2]!);
  out.normals.push3(normal[0]!, normal[1]!, normal[2]!);
  out.materials.push(material);
  return out.materials.length - 1;
}

export function addEdge(out: SolidSink, a: ArrayLike<number>, b: ArrayLike<number>, weight: number) {
  out.edges.push3(a[0]!, a[1]!, a[2]!);
  out.edges.push3(b[0]!, b[1]!, b[2]!);
  out.edgeWeights.push(weight);
}

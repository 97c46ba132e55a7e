export interface SolidArrays {
  positions: number[];
  normals: number[];
  materials: number[];
  /** Where each point lies in its board, four numbers; see `grainsOf`. */
  grains: number[];
  /** Ends of straight edges, six numbers a segment. */
  edges: number[];
  edgeWeights: number[];
  /** Triangles of round parts again, for an outline that no straight edge can give. */
  roundPositions: number[];
  roundNormals: number[];
}

/** Numbers that are written one after another: a plain list, or memory that is used again. */
export interface NumberList {
  readonly length: number;
  push: (...values: number[]) => unknown;
  slice: (start: number) => ArrayLike<number>;
}

/** Triangles and edges of parts; `List` says what they are kept in. */
export interface SolidArrays<List extends NumberList = number[]> {
  positions: List;
  normals: List;
  materials: List;
  /** Where each point lies in its board, four numbers; see `grainsOf`. */
  grains: List;
  /** Ends of straight edges, six numbers a segment. */
  edges: List;
  edgeWeights: List;
  /** Triangles of round parts again, for an outline that no straight edge can give. */
  roundPositions: List;
  roundNormals: List;
}

/** What solids are written into. */
export type SolidSink = SolidArrays<NumberList>;

export const SOLID_LISTS = [
  'positions',
  'normals',
  'materials',
  'grains',
  'edges',
  'edgeWeights',
  'roundPositions',
  'roundNormals',
] as const satisfies readonly (keyof SolidArrays)[];

/** Each of the lists as `of` has it. */
export const eachSolidList = <List extends NumberList>(
  of: (list: keyof SolidArrays) => List,
): SolidArrays<List> =>
  Object.fromEntries(SOLID_LISTS.map((list) => [list, of(list)])) as unknown as SolidArrays<List>;

import { z } from 'zod';

/** How a cushion is made up. */
export const CONSTRUCTIONS = [
  'boxed',
  'tight-boxed',
  'knife-edge',
  'waterfall',
  'bullnose',
  'plywood-backed',
] as const;

export type Construction = (typeof CONSTRUCTIONS)[number];

/** What the workshop chooses of one cushion's make; all else follows from its finished size and shape. */
export const cushionMakeSchema = z.strictObject({
  construction: z.enum(CONSTRUCTIONS),
  closure: z.enum(['zip', 'hook-and-loop', 'hand-sewn', 'stapled']),
  /** Edge with the closure; left and right as the sitter sees them. */
  closureEdge: z.enum(['back', 'front', 'left', 'right']),
  welt: z.enum(['none', 'straight', 'bias']),
});

export type CushionMake = z.infer<typeof cushionMakeSchema>;

/** The make of a cushion of which nothing was chosen. */
export const PLAIN_MAKE: CushionMake = {
  construction: 'boxed',
  closure: 'zip',
  closureEdge: 'back',
  welt: 'straight',
};

/** The same in the words of the sheet. */
export const CONSTRUCTION_WORDS: Record<Construction, string> = {
  boxed: 'boxed',
  'tight-boxed': 'tight boxed',
  'knife-edge': 'knife edge',
  waterfall: 'waterfall front',
  bullnose: 'bullnose front',
  'plywood-backed': 'on plywood, pulled and stapled',
};

/** What the view from the front says of each make. */
export const FRONT_EDGE_WORDS: Record<Construction, string> = {
  boxed: 'boxing between seams, crown over it',
  'tight-boxed': 'boxing lower than the foam, tight over it',
  'knife-edge': 'knife edge: one seam at half the height',
  waterfall: 'front in one piece with top and bottom',
  bullnose: 'half-round front in one piece',
  'plywood-backed': 'cover pulled round the board',
};

/** Closures in the words of the sheet. */
export const CLOSURE_WORDS: Record<CushionMake['closure'], string> = {
  zip: 'zip',
  'hook-and-loop': 'hook-and-loop',
  'hand-sewn': 'sewn shut by hand',
  stapled: 'stapled under the board',
};

/** Welt in the words of the sheet. */
export const WELT_WORDS: Record<CushionMake['welt'], string> = {
  none: 'no welt',
  straight: 'welt cut straight',
  bias: 'welt cut on the bias',
};

import type { CushionEdge } from './cushion-choice.ts';

/** Something that can be made, and that somebody should look at first. */
export type CushionWarning =
  | { code: 'off-joint'; columns: number; furthestMm: number }
  | { code: 'buttons-outside'; count: number }
  /** A drawn outline goes further than the size that fits its place. */
  | { code: 'beyond-place'; edges: CushionEdge[]; furthestMm: number }
  | { code: 'closure-on-camera-side'; edge: CushionEdge };

import type { CushionEdge } from './cushion-choice.ts';

/** Something that can be made, and that somebody should look at first. */
export type CushionWarning =
  | { code: 'off-joint'; columns: number; furthestMm: number }
  | { code: 'buttons-outside'; count: number }
  | { code: 'closure-on-camera-side'; edge: CushionEdge };

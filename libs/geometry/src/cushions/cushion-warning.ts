import type { CushionEdge } from './cushion-choice.ts';

/** Something that can be made, and that somebody should look at first. */
export type CushionWarning =
  | { code: 'off-joint'; columns: number; furthestMm: number }
  | { code: 'buttons-outside'; count: number }
  /** A drawn outline goes further than the size that fits its place. */
  | { code: 'beyond-place'; edges: CushionEdge[]; furthestMm: number }
  /** A board stands under the foam, or behind that of a back, over the thickness that the room counts with. */
  | { code: 'board-beyond'; kind: 'seat' | 'back'; boardMm: number }
  | { code: 'closure-on-camera-side'; edge: CushionEdge };

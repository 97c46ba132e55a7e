import type { Verdict } from '@settlewright/anthropometry';
import type { Vec3 } from '../parts/part.ts';

/** A measured line in the scene. */
export interface TapeLine {
  /** Stable while what it measures is there. */
  id: string;
  /** A dimension that can be edited, a gap between a body and a piece, or a dimension that is fixed. */
  kind: 'dimension' | 'gap' | 'fixed';
  fromMm: Vec3;
  toMm: Vec3;
  /** Short name on the flag: "seat", "under heel". */
  name: string;
  valueMm: number;
  /** Key of `parametersOf`, for a dimension that can be edited. */
  parameterKey?: string;
  pieceId?: string;
  /** Cell of the fit sheet that a gap belongs to. */
  cellId?: string;
  verdict?: Verdict;
  /** From where to where, in full. */
  describes: string;
}

import type { FoamSituation } from '@settlewright/anthropometry';
import type { Foam } from '../room/document.ts';

/** A cushion with its foam, as in the set document. */
export interface FoamCushion {
  thicknessMm: number;
  foam: Foam;
}

/** A hair, so that a thickness that went through inches and back is the same. */
const SAME = 1e-6;

/**
 * What test sits say of a cushion, if it is still the one that was sat on.
 *
 * @param cushion - thickness in millimetres and foam
 * @returns what was found, or nothing where firmness or thickness are others by now
 */
export function testedOf({ thicknessMm, foam }: FoamCushion): Foam['tested'] {
  const { tested } = foam;
  if (!tested) return undefined;
  const { of } = tested;
  const same =
    Math.abs(of.thicknessMm - thicknessMm) < SAME &&
    Math.abs(of.ifd25N - foam.ifd25N) < SAME &&
    Math.abs(of.supportFactor - foam.supportFactor) < SAME;
  return same ? tested : undefined;
}

/**
 * A seat cushion as the checks read it.
 *
 * @param cushion - thickness in millimetres and foam
 * @returns thickness in millimetres, 25 % IFD in newtons, with what test sits say; `undefined` for a hard seat
 */
export function foamSituation(cushion: FoamCushion): FoamSituation | undefined {
  const { thicknessMm, foam } = cushion;
  if (thicknessMm <= 0) return undefined;
  const { ifd25N, supportFactor } = foam;
  const tested = testedOf(cushion);
  if (!tested) return { thicknessMm, ifd25N, supportFactor };
  const { factor, error, sits } = tested;
  return { thicknessMm, ifd25N, supportFactor, tested: { factor, error, sits } };
}

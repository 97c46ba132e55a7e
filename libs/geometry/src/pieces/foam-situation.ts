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
  // A sit is kept for a plain foam alone.
  if (foam.layers || foam.wrap) return undefined;
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
 * @returns thickness in millimetres, 25 % IFD in newtons, layers and wrap as shares, with what test sits say; `undefined` for a hard seat
 */
export function foamSituation(cushion: FoamCushion): FoamSituation | undefined {
  const { thicknessMm, foam } = cushion;
  if (thicknessMm <= 0) return undefined;
  const { ifd25N, supportFactor, layers, wrap } = foam;
  const tested = testedOf(cushion);
  const situation: FoamSituation = { thicknessMm, ifd25N, supportFactor };
  if (layers) {
    const whole = layers.reduce((sum, { share }) => sum + share, 0);
    situation.layers = layers.map(({ share, times }) => ({ share: share / whole, ifd25N: times * ifd25N }));
  }
  if (wrap) {
    const share = Math.min(1, wrap.thicknessMm / thicknessMm);
    situation.wrap = { share, lost: Math.min(1, wrap.lostMm / wrap.thicknessMm) };
  }
  if (tested) {
    const { factor, error, sits } = tested;
    situation.tested = { factor, error, sits };
  }
  return situation;
}

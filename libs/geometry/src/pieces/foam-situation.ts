import type { FoamSituation } from '@settlewright/anthropometry';
import type { Foam } from '../room/document.ts';

/** A cushion with its foam, as in the set document. */
export interface FoamCushion {
  thicknessMm: number;
  foam: Foam;
}

/**
 * How high a cushion stands in its middle before anybody sits or leans on it. Its thickness is that of the boxing, with
 * foam cut as thick; a wrap stands over it as crown.
 *
 * @param cushion - thickness in millimetres and foam
 * @returns millimetres; 0 for a hard seat
 * @source foam as thick as its boxing is high, a wrap adds the crown: a cushion maker's pages (read in the source)
 */
export const cushionHeightMm = ({ thicknessMm, foam }: FoamCushion): number =>
  builtHeightMm(foamBuild({ thicknessMm, foam }));

const builtHeightMm = ({ thicknessMm, wrap }: FoamBuild): number =>
  thicknessMm > 0 ? thicknessMm + (wrap?.thicknessMm ?? 0) : 0;

/** What a cushion goes down by: how thick, how firm, of which layers and in which wrap. */
export type FoamBuild = Pick<FoamCushion, 'thicknessMm'> &
  Pick<Foam, 'ifd25N' | 'supportFactor' | 'layers' | 'wrap'>;

/**
 * What a cushion goes down by, without its name or what was found of it.
 *
 * @param cushion - thickness in millimetres and foam
 */
export function foamBuild({ thicknessMm, foam }: FoamCushion): FoamBuild {
  const { ifd25N, supportFactor, layers, wrap } = foam;
  return { thicknessMm, ifd25N, supportFactor, ...(layers && { layers }), ...(wrap && { wrap }) };
}

/** A hair, so that a thickness that went through inches and back is the same. */
const SAME = 1e-6;
const near = (a: number, b: number): boolean => Math.abs(a - b) < SAME;

/**
 * Whether two cushions are built up alike: thickness, firmness, every layer from the top down, and wrap. What a wrap is
 * held to lose is no part of it.
 *
 * @param a - one
 * @param b - the other
 */
export function isBuiltAlike(a: FoamBuild, b: FoamBuild): boolean {
  const [layers, others] = [a.layers ?? [], b.layers ?? []];
  return (
    near(a.thicknessMm, b.thicknessMm) &&
    near(a.ifd25N, b.ifd25N) &&
    near(a.supportFactor, b.supportFactor) &&
    near(a.wrap?.thicknessMm ?? 0, b.wrap?.thicknessMm ?? 0) &&
    layers.length === others.length &&
    layers.every(({ share, times }, n) => near(share, others[n]!.share) && near(times, others[n]!.times))
  );
}

/**
 * What test sits say of a cushion, if it is still the one that was sat on.
 *
 * @param cushion - thickness in millimetres and foam
 * @returns what was found, or nothing where thickness, firmness or build-up are others by now, or where a wrap is held
 *   to lose another part: the factor then belongs to another estimate
 */
export function testedOf(cushion: FoamCushion): Foam['tested'] {
  const { tested, wrap } = cushion.foam;
  if (!tested || !isBuiltAlike(tested.of, foamBuild(cushion))) return undefined;
  return near(tested.of.wrap?.lostMm ?? 0, wrap?.lostMm ?? 0) ? tested : undefined;
}

/**
 * A build-up as the estimate of its drop reads it, as if nobody had tried it.
 *
 * @param build - thickness in millimetres, firmness, layers and wrap
 * @returns thickness in millimetres with the wrap, 25 % IFD in newtons, layers and wrap as shares; `undefined` for a hard
 *   seat
 */
export function untestedSituation(build: FoamBuild): FoamSituation | undefined {
  const { ifd25N, supportFactor, layers, wrap } = build;
  const thicknessMm = builtHeightMm(build);
  if (thicknessMm === 0) return undefined;
  const situation: FoamSituation = { thicknessMm, ifd25N, supportFactor };
  if (layers) {
    const whole = layers.reduce((sum, { share }) => sum + share, 0);
    situation.layers = layers.map(({ share, times }) => ({ share: share / whole, ifd25N: times * ifd25N }));
  }
  if (wrap) {
    situation.wrap = {
      share: wrap.thicknessMm / thicknessMm,
      lost: Math.min(1, wrap.lostMm / wrap.thicknessMm),
    };
  }
  return situation;
}

/**
 * A seat cushion as the checks read it.
 *
 * @param cushion - thickness in millimetres and foam
 * @returns as `untestedSituation`, with what test sits say of it; `undefined` for a hard seat
 */
export function foamSituation(cushion: FoamCushion): FoamSituation | undefined {
  const situation = untestedSituation(foamBuild(cushion));
  const tested = testedOf(cushion);
  if (situation && tested) {
    const { factor, error, sits } = tested;
    situation.tested = { factor, error, sits };
  }
  return situation;
}

import { calibrateSink } from '@settlewright/anthropometry';
import {
  foamBuild,
  isBuiltAlike,
  untestedSituation,
  type FoamBuild,
  type FoamCushion,
} from '../pieces/foam-situation.ts';
import type { Foam } from '../room/document.ts';

/** A test sit as far as a foam is judged by it. */
export interface KeptSit extends FoamBuild {
  /** Calendar day, `2026-11-03`. */
  satOn: string;
  grade: string;
  weightKg: number;
  measuredMm: number;
}

/**
 * Sits on just such a cushion: grade, thickness, firmness, layers and wrap.
 *
 * @param cushion - thickness in millimetres and foam
 * @param sits - any; millimetres, newtons, kilograms
 * @returns those that say something of it
 */
export function sitsOn<Sit extends KeptSit>(cushion: FoamCushion, sits: readonly Sit[]): Sit[] {
  const build = foamBuild(cushion);
  return sits.filter((sit) => sit.grade === cushion.foam.grade && isBuiltAlike(sit, build));
}

/**
 * What test sits say of a cushion, without anybody's weight.
 *
 * @param cushion - thickness in millimetres and foam
 * @param sits - any; those on another foam or thickness do not count
 * @returns what the set document holds; nothing without a sit
 * @source `calibrateSink`
 */
export function testedBySits(cushion: FoamCushion, sits: readonly KeptSit[]): Foam['tested'] {
  const own = sitsOn(cushion, sits);
  const on = own
    .map(({ satOn }) => satOn)
    .sort()
    .at(-1);
  if (on === undefined) return undefined;
  const of = foamBuild(cushion);
  const foam = untestedSituation(of);
  if (!foam) return undefined;
  const found = calibrateSink(own.map(({ weightKg, measuredMm }) => ({ foam, weightKg, measuredMm })));
  return { ...found, on, of };
}

/**
 * A cushion with what was found of it, or without; what does not belong to it is left out.
 *
 * @param foam - foam with or without an older finding
 * @param tested - what was found
 * @returns the foam with exactly that
 */
export function withTested({ tested: _old, ...foam }: Foam, tested: Foam['tested']): Foam {
  return tested ? { ...foam, tested } : foam;
}

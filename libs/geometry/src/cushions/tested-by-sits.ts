import { calibrateSink } from '@settlewright/anthropometry';
import type { FoamCushion } from '../pieces/foam-situation.ts';
import type { Foam } from '../room/document.ts';

/** A test sit as far as a foam is judged by it. */
export interface KeptSit {
  /** Calendar day, `2026-11-03`. */
  satOn: string;
  grade: string;
  thicknessMm: number;
  ifd25N: number;
  supportFactor: number;
  weightKg: number;
  measuredMm: number;
}

const SAME = 1e-6;

/**
 * Sits on just such a cushion: grade, firmness and thickness. A sit is kept for a plain foam, without layers or wrap.
 *
 * @param cushion - thickness in millimetres and foam
 * @param sits - any; millimetres, newtons, kilograms
 * @returns those that say something of it
 */
export const sitsOn = <Sit extends KeptSit>(
  { thicknessMm, foam }: FoamCushion,
  sits: readonly Sit[],
): Sit[] =>
  sits.filter(
    (sit) =>
      !foam.layers &&
      !foam.wrap &&
      sit.grade === foam.grade &&
      Math.abs(sit.thicknessMm - thicknessMm) < SAME &&
      Math.abs(sit.ifd25N - foam.ifd25N) < SAME &&
      Math.abs(sit.supportFactor - foam.supportFactor) < SAME,
  );

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
  const { thicknessMm, foam } = cushion;
  const of = { thicknessMm, ifd25N: foam.ifd25N, supportFactor: foam.supportFactor };
  const found = calibrateSink(own.map(({ weightKg, measuredMm }) => ({ foam: of, weightKg, measuredMm })));
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

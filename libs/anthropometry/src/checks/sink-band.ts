import { Z90 } from '../people/normal.ts';
import type { CushionDrop, SinkBand, SourceMark } from './fit-sheet.ts';
import { seatSinkMm } from './seat-sink.ts';
import type { FoamSituation, SinkCalibration } from './situation.ts';

/**
 * Half the 90 % range of the estimator, of its value, from the grade, the patch under the seat bones and the share of the
 * weight together; how the number was read is shown beside it.
 */
export const SINK_ERROR: { share: number; mark: SourceMark } = { share: 0.3, mark: 'FROM MEMORY' };
/** What two pieces of one grade differ by: plus or minus 10 %, Joint Industry Foam Standards, 1994. */
const GRADE_ERROR = 0.1;

/** Somebody sat on a piece of the foam, and the drop was measured. */
export interface TestSit {
  foam: FoamSituation;
  weightKg: number;
  /** How far the seat went down, millimetres; > 0. */
  measuredMm: number;
}

/** The estimator as it is without any sit. */
export const UNCALIBRATED: SinkCalibration = { factor: 1, error: SINK_ERROR.share, sits: 0 };

/**
 * Calibrates the estimator by test sits on a grade.
 *
 * Each sit tells a ratio of measured to predicted drop. Their logarithms are weighed against what is believed before any
 * sit, a ratio of 1 give or take 30 %, each sit counting with the grade's own spread of 10 %.
 *
 * @param sits - on foam of the grade
 * @returns the factor and what is left of the doubt; never less than the grade's own spread
 * @throws RangeError naming a sit without a drop
 * @source normal prior and normal errors of the logarithm (conjugate), any textbook of statistics; spreads as above
 */
export function calibrateSink(sits: readonly TestSit[]): SinkCalibration {
  const prior = (SINK_ERROR.share / Z90) ** -2;
  const each = (GRADE_ERROR / Z90) ** -2;
  let sum = 0;
  for (const [n, { foam, weightKg, measuredMm }] of sits.entries()) {
    const { sinkMm } = seatSinkMm(untested(foam), weightKg);
    if (!(measuredMm > 0) || !(sinkMm > 0)) throw new RangeError(`Test sit ${n + 1} has no drop.`);
    sum += Math.log(measuredMm / sinkMm);
  }
  const weight = prior + sits.length * each;
  const spread = Math.sqrt(1 / weight + (sits.length > 0 ? 1 / each : 0));
  return {
    factor: Math.exp((sum * each) / weight),
    error: sits.length === 0 ? SINK_ERROR.share : Z90 * spread,
    sits: sits.length,
  };
}

/** A foam as if nobody had tried it. */
const untested = (foam: FoamSituation): FoamSituation => ({ ...foam, tested: undefined });

/**
 * How far a seat goes down under somebody, with its doubt.
 *
 * @param foam - thickness in millimetres, 25 % IFD in newtons, support factor; all > 0; with what test sits say of it
 * @param weightKg - body weight; finite, >= 0
 * @returns millimetres; never more than the foam's 65 %
 * @source as `seatSinkMm` and `calibrateSink`
 */
export function sinkBand(foam: FoamSituation, weightKg: number): SinkBand {
  const { factor, error } = foam.tested ?? UNCALIBRATED;
  const { sinkMm } = seatSinkMm(untested(foam), weightKg);
  const most = seatSinkMm(foam, Number.MAX_VALUE).sinkMm;
  const best = sinkMm * factor;
  const held = (mm: number) => Math.min(most, mm);
  const [low, high] = [best * (1 - error), best * (1 + error)];
  const reaches = (mm: number) => mm >= most - 1e-9;
  return {
    lowMm: held(low),
    bestMm: held(best),
    highMm: held(high),
    bottomsOut: reaches(low) ? 'yes' : reaches(high) ? 'perhaps' : 'no',
  };
}

/**
 * The band of a drop with what it rests on.
 *
 * @param foam - as for `sinkBand`
 * @param weightKg - body weight; finite, >= 0
 * @returns millimetres
 * @source as `sinkBand`
 */
export function cushionDrop(foam: FoamSituation, weightKg: number): CushionDrop {
  const { error, sits } = foam.tested ?? UNCALIBRATED;
  return { ...sinkBand(foam, weightKg), error, sits };
}

/**
 * Standard deviation of a drop about its best estimate.
 *
 * @param foam - as for `sinkBand`
 * @param bestMm - best estimate, millimetres
 * @returns millimetres
 * @source the error is half a 90 % range, of a normal
 */
export const sinkSpreadMm = ({ tested }: FoamSituation, bestMm: number): number =>
  ((tested ?? UNCALIBRATED).error * bestMm) / Z90;

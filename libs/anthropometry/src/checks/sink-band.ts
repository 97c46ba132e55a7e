import { seatSinkMm } from './seat-sink.ts';
import type { FoamSituation } from './situation.ts';

/** Half the 90 % range of the estimator, of its value: trade sources, from IFD, patch area and seat share together. */
const ESTIMATE_ERROR = 0.3;
/** What two pieces of one grade differ by: plus or minus 10 %, Joint Industry Foam Standards, 1994. */
const GRADE_ERROR = 0.1;
/** Standard deviations from the middle to the ends of a 90 % range. */
const Z90 = 1.6449;

/** Somebody sat on a piece of the foam, and the drop was measured. */
export interface TestSit {
  foam: FoamSituation;
  weightKg: number;
  /** How far the seat went down, millimetres; > 0. */
  measuredMm: number;
}

/** What test sits say of the estimator for a grade of foam. */
export interface SinkCalibration {
  /** By what the estimate is multiplied. */
  factor: number;
  /** Half the 90 % range of the outcome, of its value. */
  error: number;
  /** How many sits it rests on. */
  sits: number;
}

/** Best estimate of a drop, and the range it lies in with 90 in 100. */
export interface SinkBand {
  lowMm: number;
  bestMm: number;
  highMm: number;
  /** Whether the foam bottoms out over the range: nowhere, in part of it, or all over. */
  bottomsOut: 'no' | 'perhaps' | 'yes';
}

/** The estimator as it is without any sit. */
export const UNCALIBRATED: SinkCalibration = { factor: 1, error: ESTIMATE_ERROR, sits: 0 };

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
  const prior = (ESTIMATE_ERROR / Z90) ** -2;
  const each = (GRADE_ERROR / Z90) ** -2;
  let sum = 0;
  for (const [n, { foam, weightKg, measuredMm }] of sits.entries()) {
    const { sinkMm } = seatSinkMm(foam, weightKg);
    if (!(measuredMm > 0) || !(sinkMm > 0)) throw new RangeError(`Test sit ${n + 1} has no drop.`);
    sum += Math.log(measuredMm / sinkMm);
  }
  const weight = prior + sits.length * each;
  const spread = Math.sqrt(1 / weight + (sits.length > 0 ? 1 / each : 0));
  return {
    factor: Math.exp((sum * each) / weight),
    error: sits.length === 0 ? ESTIMATE_ERROR : Z90 * spread,
    sits: sits.length,
  };
}

/**
 * How far a seat goes down under somebody, with its doubt.
 *
 * @param foam - thickness in millimetres, 25 % IFD in newtons, support factor; all > 0
 * @param weightKg - body weight; finite, >= 0
 * @param calibration - from test sits on the grade
 * @returns millimetres; never more than the foam's 65 %
 * @source as `seatSinkMm` and `calibrateSink`
 */
export function sinkBand(
  foam: FoamSituation,
  weightKg: number,
  { factor, error }: SinkCalibration = UNCALIBRATED,
): SinkBand {
  const { sinkMm } = seatSinkMm(foam, weightKg);
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

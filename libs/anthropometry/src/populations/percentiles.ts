import type { MeasureKey } from '../measures/measures.ts';
import { normalCdf, normalQuantile } from '../people/normal.ts';
import type { BodyData } from '../people/person.ts';
import type { Survey, SurveyGroup } from './survey.ts';

/**
 * Percentile of one measure in a surveyed group. At the tabulated percentiles it is the survey's own head count;
 * between them the values run straight in standard deviations, and beyond them with the group's spread.
 *
 * @param survey - statistics of the population
 * @param bodyData - group; `mixed` is a crowd of as many women as men
 * @param key - body measure
 * @param p - strictly between 0 and 100
 * @returns millimetres (kilograms for weight); never falls as p rises
 * @throws RangeError when p is not strictly between 0 and 100
 */
export function surveyPercentile(survey: Survey, bodyData: BodyData, key: MeasureKey, p: number): number {
  if (!(p > 0 && p < 100)) {
    throw new RangeError(`percentile is ${p}; accepted: strictly between 0 and 100`);
  }
  if (bodyData !== 'mixed') return valueAt(survey, bodyData, key, normalQuantile(p / 100));
  const z = normalQuantile(p / 100);
  const ends = [valueAt(survey, 'women', key, z), valueAt(survey, 'men', key, z)];
  let low = Math.min(...ends);
  let high = Math.max(...ends);
  for (let step = 0; step < 50; step += 1) {
    const middle = (low + high) / 2;
    const share = (shareBelow(survey, 'women', key, middle) + shareBelow(survey, 'men', key, middle)) / 2;
    if (share < p / 100) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

interface Knots {
  z: number[];
  values: readonly number[];
  sd: number;
}

function knotsOf(survey: Survey, group: SurveyGroup, key: MeasureKey): Knots {
  const { percentiles, sd } = survey.stats[group][key];
  return { z: survey.percentileKeys.map((p) => normalQuantile(p / 100)), values: percentiles, sd };
}

function valueAt(survey: Survey, group: SurveyGroup, key: MeasureKey, z: number): number {
  const knots = knotsOf(survey, group, key);
  return runThrough(knots.z, knots.values, z, knots.sd);
}

function shareBelow(survey: Survey, group: SurveyGroup, key: MeasureKey, value: number): number {
  const knots = knotsOf(survey, group, key);
  return normalCdf(runThrough(knots.values, knots.z, value, 1 / knots.sd));
}

/** Straight lines through the knots, with the given slope beyond both ends. */
function runThrough(xs: readonly number[], ys: readonly number[], x: number, slope: number): number {
  const last = xs.length - 1;
  const [x0, y0, xn, yn] = [xs[0] as number, ys[0] as number, xs[last] as number, ys[last] as number];
  if (x <= x0) return y0 + (x - x0) * slope;
  if (x >= xn) return yn + (x - xn) * slope;
  const right = xs.findIndex((knot) => knot >= x);
  const [xa, ya, xb, yb] = [
    xs[right - 1] as number,
    ys[right - 1] as number,
    xs[right] as number,
    ys[right] as number,
  ];
  return xb === xa ? yb : ya + ((x - xa) / (xb - xa)) * (yb - ya);
}

import { range90, type Body, type MeasureKey } from '@settlewright/anthropometry';
import { FIGURE_KEYS, type FigureMeans } from './figure.ts';
import { poseMannequin, type MannequinPose } from './pose.ts';

/** How small and how large the uncertain measures of one person may be. */
export interface BodyRange {
  /** Every uncertain measure at the 5th of 100 such people, by itself; known ones as they are. */
  smaller: FigureMeans;
  /** The same at the 95th. */
  larger: FigureMeans;
  /** Measures that are not known, in the order of the figure. */
  uncertain: MeasureKey[];
}

/**
 * The band within which each measure of a body lies for 90 of 100 such people.
 *
 * The two ends are outlines to show what is not known, not people: nobody is at the 95th in everything.
 *
 * @param body - belief about a person, from the body model
 * @returns measures in millimetres, weight in kilograms
 */
export function bodyRange(body: Body): BodyRange {
  const smaller: FigureMeans = {};
  const larger: FigureMeans = {};
  const uncertain: MeasureKey[] = [];
  for (const key of FIGURE_KEYS) {
    if (body.isMeasured(key)) {
      smaller[key] = larger[key] = body.mean(key);
      continue;
    }
    const { low, high } = range90(body.estimate(key));
    smaller[key] = low;
    larger[key] = high;
    if (high - low > 0) uncertain.push(key);
  }
  return { smaller, larger, uncertain };
}

type At = Omit<Parameters<typeof poseMannequin>[0], 'means'>;

/**
 * The smaller and the larger body as they would sit at a place, for a ghosted outline around the drawn one.
 *
 * @param range - from `bodyRange`
 * @param at - what `poseMannequin` needs beside the measures
 * @returns poses whose skins are for looking at, not to be measured on; `undefined` when every measure is known
 */
export function ghostPoses(
  range: BodyRange,
  at: At,
): { smaller: MannequinPose; larger: MannequinPose } | undefined {
  if (range.uncertain.length === 0) return undefined;
  const pose = (means: FigureMeans): MannequinPose => poseMannequin({ ...at, means });
  return { smaller: pose(range.smaller), larger: pose(range.larger) };
}

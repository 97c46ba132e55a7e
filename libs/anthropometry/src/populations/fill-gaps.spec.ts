import { describe, expect, it } from 'vitest';
import { ansur2 } from '../../test/seed.ts';
import { fillGaps } from './fill-gaps.ts';
import { readSurvey } from './survey.ts';
import type { Worked } from './worked.ts';

const reference = readSurvey(ansur2).worked.women;

/** The first measures of the reference, as another survey might hold them. */
function firstOf(count: number): Worked {
  const size = reference.keys.length;
  return {
    keys: reference.keys.slice(0, count),
    mean: reference.mean.slice(0, count),
    covariance: Float64Array.from(
      { length: count * count },
      (_, at) => reference.covariance[Math.floor(at / count) * size + (at % count)] as number,
    ),
  };
}

describe('filling gaps', () => {
  it.each([2, 12, 30, 39])(
    'gives the reference back when its first %i measures are the known ones',
    (count) => {
      const { worked, estimated } = fillGaps(reference, firstOf(count));
      expect(estimated).toEqual(reference.keys.slice(count));
      worked.mean.forEach((mean, i) => expect(mean).toBeCloseTo(reference.mean[i] as number, 9));
      worked.covariance.forEach((value, i) =>
        expect(value).toBeCloseTo(reference.covariance[i] as number, 9),
      );
    },
  );
});

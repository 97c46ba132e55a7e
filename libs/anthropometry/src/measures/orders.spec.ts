import { describe, expect, it } from 'vitest';
import { model } from '../../test/seed.ts';
import { TAPE_MEASURE_KEYS } from './measures.ts';
import { contradictions } from './orders.ts';

describe('measures that contradict each other', () => {
  it('finds an eye above the crown and a knee below its crook, and nothing in a body without', () => {
    expect(contradictions({ sitting_height: 508, eye_height_sitting: 1016 })).toEqual([
      { shorter: 'eye_height_sitting', longer: 'sitting_height' },
    ]);
    expect(contradictions({ popliteal_height: 430, knee_height_sitting: 430 })).toHaveLength(1);
    expect(contradictions({ eye_height_sitting: 1016 })).toEqual([]);
  });

  it.each(['women', 'men'] as const)('finds none in %s of any height of the survey', (bodyData) => {
    for (const percentile of [0.5, 5, 50, 95, 99.5]) {
      const { means } = model.predict(model.mannequin({ bodyData, measure: 'stature', percentile }));
      const all = means();
      expect(contradictions(Object.fromEntries(TAPE_MEASURE_KEYS.map((key) => [key, all[key]])))).toEqual([]);
    }
  });
});

import type { MeasureKey } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import { measureBody, type MeasureInitials } from '../../test/measure-body.ts';
import { drawnPeople, percentilePeople } from '../../test/survey-like-people.ts';
import { measuringMesh } from './mesh.ts';

const KEY_OF: Record<MeasureInitials, MeasureKey> = {
  SH: 'sitting_height',
  EH: 'eye_height_sitting',
  AH: 'acromial_height_sitting',
  ER: 'elbow_rest_height',
  PH: 'popliteal_height',
  HB: 'hip_breadth_sitting',
  FF: 'forearm_forearm_breadth',
  TC: 'thigh_clearance',
  FL: 'foot_length',
  FB: 'foot_breadth',
  HL: 'head_length',
  HBr: 'head_breadth',
  BA: 'biacromial_breadth',
  KH: 'knee_height_sitting',
  BPL: 'buttock_popliteal_length',
  BKL: 'buttock_knee_length',
  AD: 'abdominal_extension_depth_sitting',
  CD: 'chest_depth',
  BD: 'bideltoid_breadth',
};

/** A tape held to a person is not read closer than this either. */
const WITHIN_MM = 3;

/** Measures read off the surface that are further than the tolerance from the person's own. */
function strays(means: Record<MeasureKey, number>): string[] {
  const read = measureBody(measuringMesh(means));
  return (Object.entries(KEY_OF) as [MeasureInitials, MeasureKey][])
    .filter(([short, key]) => !(Math.abs(read[short] - means[key]) < WITHIN_MM))
    .map(
      ([short, key]) => `${short}: on the skin ${read[short].toFixed(1)}, wanted ${means[key].toFixed(1)}`,
    );
}

describe('a body measured on its own skin by rays and slices', () => {
  // The measures: ANSUR II percentiles of stature and conditional means (NATICK/TR-15/007, public data).
  it.each(percentilePeople([1, 5, 50, 95, 99]))('has the 19 measures of %s', (_, means) => {
    expect(strays(means)).toEqual([]);
  });

  // The same survey's model with every measure varying: means, spreads and correlations of ANSUR II.
  it.each(drawnPeople(40, 7))('has the 19 measures of %s', (_, means) => {
    expect(strays(means)).toEqual([]);
  });

  it('would notice a seat that is 4 mm too high', () => {
    const [, means] = percentilePeople([50])[0]!;
    expect(strays({ ...means })).toEqual([]);
    const mesh = measuringMesh(means);
    const raised = { ...mesh, positions: mesh.positions.map((x, i) => (i % 3 === 1 ? x + 4 : x)) };
    expect(Math.abs(measureBody(raised).SH - means.sitting_height)).toBeGreaterThan(WITHIN_MM);
  });
});

// People nothing is known of, and a seat at a table, for the figures about bodies.
import { createRequire } from 'node:module';
import { createBodyModel, MEASURE_KEYS } from '@settlewright/anthropometry';

const load = createRequire(import.meta.url);

/** Measures of people drawn from the survey. */
export function strangers(count, seed) {
  const model = createBodyModel(load('@settlewright/seed-data/populations/ansur2.json'));
  const anybody = model.predict({ bodyData: 'mixed', measured: {}, shoeMm: 25, clothing: 'light' });
  const { columns } = anybody.sample(count, seed);
  return Array.from({ length: count }, (_, row) =>
    Object.fromEntries(MEASURE_KEYS.map((key) => [key, columns[key][row]])),
  );
}

/** What `poseMannequin` needs beside the measures. */
export const atTable = {
  shoeMm: 25,
  frame: { hipMm: [0, 450, 135], facingRad: 0 },
  situation: {
    effectiveDepthMm: 430,
    seatTiltRad: 0.03,
    backLeanRad: 0.12,
    backTopMm: 1000,
    table: { topMm: 740, overlapMm: 50 },
  },
  sinkMm: 10,
};

import { createRequire } from 'node:module';
import { createBodyModel } from '@settlewright/anthropometry';
import { findWaysIn } from '@settlewright/geometry';
import { roomOfTwelve } from './lib/room-of-twelve.mjs';
import { middleTime } from './lib/times.mjs';

const load = createRequire(import.meta.url);
const WARM_UP = 3;
const RUNS = 15;
/** What is stepped over and what is leaned under, as in rule EGRESS-08. */
const HEIGHTS = [200, 1200];

/** Time to find the ways in to twelve places, their tightest spots and the order of sitting: the median of some runs. */
export async function run() {
  const model = createBodyModel(load('@settlewright/seed-data/populations/ansur2.json'));
  const document = roomOfTwelve();
  const comers = document.seating.map(({ pieceId, place, sitter }) => {
    const { shoeMm, clothing } = model.mannequin(sitter);
    const measures = model.predict(model.mannequin(sitter)).means();
    return { placeId: `${pieceId}:${place}`, measures, shoeMm, clothing };
  });
  const find = () => findWaysIn(document, comers, HEIGHTS);
  middleTime(WARM_UP, find);
  return [{ name: 'ways-12', value: middleTime(RUNS, find), unit: 'ms', aim: 300, reference: null }];
}

import { createBodyModel, type KnownPerson } from '@settlewright/anthropometry';
import { FIGURE_KEYS, poseMannequin } from '@settlewright/geometry';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { expect, it } from 'vitest';
import { doubtLines, sayCertain } from '../posture/doubt-lines.ts';
import { doubted, doubtOf, ghostsOf, sayDoubt } from './doubt.ts';

const model = createBodyModel(summary);
const METRIC = { system: 'millimetres', roundTo: 8 } as const;
const told: KnownPerson = {
  bodyData: 'women',
  stature: { mm: 1640, source: 'measured' },
  measured: { elbow_rest_height: 240 },
  shoeMm: 25,
  clothing: 'light',
};
function seated(person: KnownPerson, name = 'Hetty') {
  const belief = model.predict(person);
  const at = {
    shoeMm: person.shoeMm,
    frame: { hipMm: [0, 430, 135] as const, facingRad: 0 },
    situation: { effectiveDepthMm: 400, seatTiltRad: 0, backLeanRad: 0.1, backTopMm: 900 },
    sinkMm: 0,
  };
  return { name, placeId: `b:${name}`, belief, at, pose: poseMannequin({ ...at, means: belief.means() }) };
}
const mannequin = seated(model.mannequin({ bodyData: 'women', measure: 'stature', percentile: 50 }));

it('lists what was not taken with its range, the widest first and the weight last, and nothing that was taken', () => {
  const lines = doubtLines(doubtOf(seated(told))!, METRIC);
  const keys = lines.map(({ key }) => key);
  expect(keys).not.toContain('stature');
  expect(keys).not.toContain('elbow_rest_height');
  expect(keys).toHaveLength(FIGURE_KEYS.length - 2);
  expect(keys.at(-1)).toBe('weight_kg');
  const widths = lines
    .slice(0, -1)
    .map(({ words }) => words.match(/(\d+)\D+to (\d+)/)!)
    .map(([, low, high]) => Number(high) - Number(low));
  expect(widths[0]).toBeGreaterThan(60);
  // Both ends are shown rounded.
  widths.slice(1).forEach((width, n) => expect(width).toBeLessThanOrEqual(widths[n]! + 1));
});

it('has two ghosts of the uncertain, made once, and none of a mannequin or of whom no measures may be seen', () => {
  const body = seated(told);
  const ghosts = ghostsOf(body)!;
  expect(ghosts.larger.headTopMm).toBeGreaterThan(body.pose.headTopMm + 20);
  expect(ghosts.smaller.headTopMm).toBeLessThan(body.pose.headTopMm - 20);
  expect(ghostsOf(body)).toBe(ghosts);
  expect(ghostsOf(mannequin)).toBeUndefined();
  expect(ghostsOf({ pose: seated(told).pose, at: body.at })).toBeUndefined();
});

it('draws the chosen one, else everybody while they are few', () => {
  const people = ['a', 'b', 'c', 'd', 'e'].map((name) => ({ placeId: name }));
  expect(doubted(people, 'c')).toEqual([{ placeId: 'c' }]);
  expect(doubted(people.slice(0, 4), undefined)).toHaveLength(4);
  expect(doubted(people, 'gone')).toEqual([{ placeId: 'a' }]);
});

it('says whose outlines are shown, and that nothing is in doubt of the certain', () => {
  expect(sayDoubt([seated(told), mannequin])).toBe(
    'Dashed outlines show how small and how large Hetty may be.',
  );
  expect(sayDoubt([mannequin])).toBe('Nothing in doubt of those drawn.');
  expect(sayCertain(mannequin.belief)).toBe('A mannequin of one size, nothing in doubt.');
  const measured = Object.fromEntries(
    FIGURE_KEYS.filter((key) => key !== 'stature' && key !== 'weight_kg').map((key) => [
      key,
      model.predict(told).mean(key),
    ]),
  );
  const exact = seated({ ...told, weightKg: 62, measured });
  expect(doubtOf(exact)!.uncertain).toEqual([]);
  expect(sayCertain(exact.belief)).toBe('Measured, nothing in doubt.');
});

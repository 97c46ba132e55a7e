import { ARRANGEMENTS, carriedPieces, type SetDocument } from '@settlewright/geometry';
import { afterEach, expect, it } from 'vitest';
import { clipNow, keepClip, readClip, wipeClip } from './clip.ts';

const window_ = ARRANGEMENTS.find(({ id }) => id === 'bench-window')?.build() as SetDocument;
const clip = {
  workshopId: 'w',
  productionId: 'p',
  setName: 'Dining car',
  carried: carriedPieces(window_, ['b1', 't1']),
};

afterEach(wipeClip);

it('keeps what was copied until it is wiped', () => {
  keepClip(clip);
  expect(clipNow()).toEqual(clip);
  expect(sessionStorage.length).toBe(1);
  wipeClip();
  expect(clipNow()).toBeUndefined();
  expect(sessionStorage.length).toBe(0);
});

it('believes nothing that a set could not hold', () => {
  const spoilt = {
    ...clip,
    carried: { ...clip.carried, pieces: [{ ...clip.carried.pieces[0], lengthMm: 1e9 }] },
  };
  for (const text of [
    '',
    '{',
    'null',
    '[]',
    JSON.stringify(spoilt),
    JSON.stringify({ ...clip, setName: 3 }),
  ]) {
    expect(readClip(text), text).toBeUndefined();
  }
  expect(readClip(JSON.stringify(clip))).toEqual(clip);
});

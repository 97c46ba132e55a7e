import type { WayIn } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { sayChildren, sayHelp, sayWay } from './way-words.ts';

const naming = { length: (mm: number) => `${mm} mm`, name: (id: string) => (id === 'b1:1' ? 'Ada' : 'Ben') };
const pose = { xMm: 0, zMm: 0, headingRad: 0 };
const tight: NonNullable<WayIn['tightest']> = {
  band: 'trunk',
  move: 'slide',
  at: pose,
  clearMm: 20,
  widthMm: 300,
  depthMm: 260,
  between: [
    { pieceId: 'b1', mark: 'B1', at: [0, 0] },
    { pieceId: 't1', mark: 'T1', at: [0, 300] },
  ],
};
const way: WayIn = {
  placeId: 'b1:1',
  from: 'open-floor',
  steps: [{ move: 'walk', poses: [pose] }],
  tightest: tight,
  passes: true,
  chairs: [],
  leaves: [],
  past: [],
};

describe('a way in', () => {
  it('says where it is tightest and what is to spare', () => {
    expect(sayWay(way, naming)).toBe(
      'Ada gets in. Tightest between B1 and T1, at the trunk, sliding along the seat: 300 mm wide for a body 260 mm deep, 20 mm to spare on each side.',
    );
  });

  it('says who is stuck, and who would not be', () => {
    const tightest = { ...tight, clearMm: -10, widthMm: 240 };
    expect(sayWay({ ...way, tightest, passes: false }, naming)).toContain('Ada is stuck between B1 and T1');
    expect(sayWay({ ...way, tightest, passes: false }, naming)).toContain('who passes is 240 mm.');
    expect(sayWay({ ...way, steps: [], passes: false }, naming)).toContain('No way leads');
  });

  it('says what others do for it', () => {
    const past = [{ placeId: 'b1:2', how: 'sits-later' as const }];
    expect(sayHelp({ ...way, past, chairs: [{ pieceId: 'l1', mark: 'L1' }] }, naming)).toEqual([
      'Goes in before Ben.',
      'Take L1 out of the way.',
    ]);
  });

  it('says which leaf to drop, and which narrower way leads past nobody', () => {
    const leaves = [{ pieceId: 't1', mark: 'T1', edge: 'left' as const, down: true }];
    const freer = { steps: way.steps, tightest: tight, past: [], insteadOf: ['b1:2'] };
    expect(sayHelp({ ...way, leaves, freer }, naming)).toEqual([
      'Drop the left leaf of T1.',
      'The widest way leads past Ben once seated. Or past nobody, 300 mm at the tightest.',
    ]);
  });
});

it('says why nothing is said of children', () => {
  expect(sayChildren(['Child, mark 3'])).toBe(
    'Not known: how Child, mark 3 gets in, and whether others get past. Of a child only height, weight and lower leg are known; how broad and deep it is drawn is for scale.',
  );
});

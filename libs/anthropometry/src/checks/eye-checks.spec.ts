import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  check,
  found,
  person,
  personCell,
  pieceCell,
  place,
  set,
  sill,
  sitter,
  verdictOf,
} from '../../test/example-set.ts';
import { ruleBook } from '../../test/seed.ts';
import { nearestStack, stackWords } from './apple-boxes.ts';
import { sightAngleDeg } from './eye-checks.ts';

const IN = 25.4;
const EYE = ruleBook.rule('HEAD-04');
const ONE_OF_EACH = { full: 1, half: 1, quarter: 1, pancake: 1 };

describe('apple boxes', () => {
  it('one of each makes every inch from 1 to 15', () => {
    for (let inches = 0; inches <= 15; inches += 1) {
      expect(nearestStack(EYE, ONE_OF_EACH, inches * IN).heightMm).toBeCloseTo(inches * IN, 9);
    }
    expect(stackWords(nearestStack(EYE, ONE_OF_EACH, 7 * IN))).toBe('half apple, quarter apple and pancake');
    expect(stackWords(nearestStack(EYE, ONE_OF_EACH, 8))).toBe('no box');
  });

  it('leave half an inch at most where the set is full, and never come further than any other stack', () => {
    fc.assert(
      fc.property(
        fc.record({
          full: fc.nat(2),
          half: fc.nat(2),
          quarter: fc.nat(2),
          pancake: fc.nat(2),
        }),
        fc.double({ min: 0, max: 500, noNaN: true }),
        (atHand, wanted) => {
          const stack = nearestStack(EYE, atHand, wanted);
          for (let full = 0; full <= atHand.full; full += 1)
            for (let half = 0; half <= atHand.half; half += 1)
              for (let quarter = 0; quarter <= atHand.quarter; quarter += 1)
                for (let pancake = 0; pancake <= atHand.pancake; pancake += 1) {
                  const height = (8 * full + 4 * half + 2 * quarter + pancake) * IN;
                  expect(Math.abs(stack.heightMm - wanted)).toBeLessThanOrEqual(
                    Math.abs(height - wanted) + 1e-6,
                  );
                }
        },
      ),
    );
  });
});

describe('eye lines of two who face each other', () => {
  const ends = ['b1', 'b2'].map((pieceId) => place({ pieceId, placeId: `${pieceId}:1` }));
  const facing = {
    pieceIds: ['b1', 'b2'] as [string, string],
    marks: ['B1', 'B2'] as [string, string],
    gapMm: 457,
    pairs: [['b1:1', 'b2:1']] as [string, string][],
  };
  const two = (first: number, second: number) => [
    sitter(person({ measured: { eye_height_sitting: first } }), 'b1:1', 'Ada'),
    sitter(person({ measured: { eye_height_sitting: second } }), 'b2:1', 'Bo'),
  ];
  const at = (first: number, second: number, appleBoxes = ONE_OF_EACH) =>
    verdictOf(
      pieceCell('HEAD-04', set({ places: ends, facing: [facing] }), two(first, second), { appleBoxes }),
    );

  it('lift the lower eye, whoever it is, and say with what', () => {
    expect(at(700, 802).setLedger.at(-2)?.label).toBe('half apple under Ada');
    expect(at(802, 700)).toMatchObject({ verdict: 'fits' });
    expect(at(802, 700).value).toBeCloseTo(0.4, 6);
    // A full apple alone is 203; 102 stay without it.
    expect(at(802, 700, { full: 1, half: 0, quarter: 0, pancake: 0 }).verdict).toBe('wontFit');
    expect(at(720, 700, { full: 1, half: 0, quarter: 0, pancake: 0 }).verdict).toBe('tight');
  });

  it('of two known by height only are not known', () => {
    const who = (mm: number) => person({ stature: { mm, source: 'measured' } });
    const outcome = verdictOf(
      pieceCell(
        'HEAD-04',
        set({ places: ends, facing: [facing] }),
        [sitter(who(1750), 'b1:1'), sitter(who(1600), 'b2:1')],
        { appleBoxes: ONE_OF_EACH },
      ),
    );
    expect(outcome.verdict).toBe('notKnown');
    expect(outcome.settleWith).toContain('eye_height_sitting');
  });

  it('are not asked without boxes, and do not apply to one alone', () => {
    const situation = set({ places: ends, facing: [facing] });
    expect(pieceCell('HEAD-04', situation, two(700, 800)).outcome.kind).toBe('notAsked');
    const alone = pieceCell('HEAD-04', situation, two(700, 800).slice(1), { appleBoxes: ONE_OF_EACH });
    expect(alone.outcome.kind).toBe('doesNotApply');
  });
});

describe('where a sitter looks', () => {
  const who = person({ measured: { eye_height_sitting: 748 } });

  it('SILL-06: the angle and the height it takes say the same', () => {
    expect(sightAngleDeg(303, 400)).toBeCloseTo(37.1, 1);
    fc.assert(
      fc.property(
        fc.double({ min: 600, max: 1200, noNaN: true }),
        fc.double({ min: 50, max: 400, noNaN: true }),
        (topMm, away) => {
          const sills = [sill({ topMm, centreToEdgeMm: away, usableDepthMm: 90 })];
          const outcome = verdictOf(personCell('SILL-06', place({ sills }), who));
          const angle = sightAngleDeg(407 + 748 - 40 - topMm, away + 90);
          if (Math.abs(angle - 15) < 0.1 || Math.abs(angle - 5) < 0.1) return;
          expect(outcome.verdict).toBe(angle > 15 ? 'fits' : angle > 5 ? 'tight' : 'wontFit');
        },
      ),
    );
  });

  it('HEAD-05: a lens too high or too low by more than 150 is a choice that is told; none is not asked', () => {
    const at = (lensHeightMm: number | undefined) =>
      found(
        check(set({ places: [place()] }), [sitter(who)], { lensHeightMm }).rows[0]?.cells ?? [],
        'HEAD-05',
      );
    expect([900, 1000, 1080, 1115, 1200, 1300].map((lens) => verdictOf(at(lens)).verdict)).toEqual([
      'wontFit',
      'tight',
      'fits',
      'fits',
      'tight',
      'wontFit',
    ]);
    expect(at(undefined).outcome).toEqual({
      kind: 'notAsked',
      reason: 'the height of the lens is not given',
    });
  });

  it('HEAD-03: a person needs stature, shoe and 25; one line, so never tight', () => {
    const tall = person({ stature: { mm: 1870, source: 'measured' } });
    const at = (undersideMm: number) =>
      verdictOf(
        personCell('HEAD-03', place({ overheadAhead: { pieceId: 'o1', mark: 'O1', undersideMm } }), tall),
      );
    expect(at(1920)).toMatchObject({ verdict: 'fits', pass: { lower: 1920 }, fail: { lower: 1920 } });
    expect(at(1919).verdict).toBe('wontFit');
  });
});

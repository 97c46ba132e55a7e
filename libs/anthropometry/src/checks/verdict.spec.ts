import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { person } from '../../test/example-set.ts';
import { model } from '../../test/seed.ts';
import { normalCdf } from '../people/normal.ts';
import { fixed, moved, ofBody } from './amount.ts';
import { fixedSide, question, type Side } from './question.ts';
import { judge, verdictFor } from './verdict.ts';

const JUDGEMENT = { confidence: 0.9, tolerance: 0.1 };
const asked = (value: number, sides: { lower?: Side; upper?: Side }) =>
  judge(question({ value: fixed(value), setLedger: () => [], ...sides }), JUDGEMENT);

describe('verdictFor', () => {
  it.each([
    [0.9, 0.95, 'fits'],
    [0.899, 0.9, 'tight'],
    [0.5, 0.89, 'notKnown'],
    [0, 0.1, 'wontFit'],
    [0, 0.11, 'notKnown'],
  ] as const)('inside pass %f, inside fail %f: %s', (pass, insideFail, verdict) => {
    expect(verdictFor({ pass, insideFail }, 0.9)).toBe(verdict);
  });

  it('asks for what the workshop has set', () => {
    expect(verdictFor({ pass: 0.85, insideFail: 0.9 }, 0.8)).toBe('fits');
    expect(verdictFor({ pass: 0.94, insideFail: 0.96 }, 0.95)).toBe('tight');
  });
});

describe('a measured value', () => {
  it('belongs to the better side of a boundary, within a tenth of a millimetre', () => {
    const sides = { lower: fixedSide(232, 207) };
    expect(asked(232, sides).verdict).toBe('fits');
    expect(asked(231.9, sides).verdict).toBe('fits');
    expect(asked(231.89, sides).verdict).toBe('tight');
    expect(asked(206.9, sides).verdict).toBe('tight');
    expect(asked(206.89, sides).verdict).toBe('wontFit');
  });

  it('has probabilities of 0 or 1 and never is not known', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 500, noNaN: true }), (value) => {
        const { probability, verdict, estimated, marginRange } = asked(value, {
          lower: fixedSide(200, 150),
          upper: fixedSide(300, 350),
        });
        expect([0, 1]).toContain(probability.pass);
        expect([0, 1]).toContain(probability.insideFail);
        expect(verdict).not.toBe('notKnown');
        expect(estimated).toBe(false);
        expect(marginRange).toBeUndefined();
      }),
    );
  });

  it('has its margin to the nearest fail line', () => {
    const sides = { lower: fixedSide(200, 150), upper: fixedSide(300, 350) };
    expect(asked(340, sides).margin).toBe(10);
    expect(asked(160, sides).margin).toBe(10);
    expect(asked(360, sides).margin).toBe(-10);
  });
});

describe('a predicted value', () => {
  const body = model.predict(person({ weightKg: 60, stature: { mm: 1600, source: 'measured' } }));
  const [elbow] = body.estimate('elbow_rest_height').components;
  if (!elbow) throw new Error('no component');
  const band = (value: number, pass: number, fail: number) => {
    const line = (by: number) => moved(ofBody(body, 'elbow_rest_height'), by);
    return judge(
      {
        value: fixed(value),
        pass: { lower: line(-pass), upper: line(pass) },
        fail: { lower: line(-fail), upper: line(fail) },
        bodyLedger: () => [],
        setLedger: () => [],
      },
      { confidence: 0.9, tolerance: 0 },
    );
  };

  it('counts both sides of a band', () => {
    const { probability } = band(elbow.mean, 25, 50);
    expect(probability.pass).toBeCloseTo(2 * normalCdf(25 / elbow.sd) - 1, 9);
    expect(probability.insideFail).toBeCloseTo(2 * normalCdf(50 / elbow.sd) - 1, 9);
  });

  it('gives a margin range that holds 90 in 100', () => {
    fc.assert(
      fc.property(fc.double({ min: -60, max: 60, noNaN: true }), (off) => {
        const { marginRange } = band(elbow.mean + off, 25, 50);
        // Share of elbows whose distance from the sill is at least 50 - m.
        const below = (m: number) =>
          1 - (normalCdf((off + 50 - m) / elbow.sd) - normalCdf((off - 50 + m) / elbow.sd));
        expect(below(marginRange?.low ?? NaN)).toBeCloseTo(0.05, 2);
        expect(below(marginRange?.high ?? NaN)).toBeCloseTo(0.95, 2);
      }),
    );
  });

  it('that leaves the answer open is not known, and the tape that would settle it is named', () => {
    const outcome = band(elbow.mean + 50, 25, 50);
    expect(outcome.verdict).toBe('notKnown');
    expect(outcome.settleWith).toEqual(['elbow_rest_height']);
  });

  it('that is plain needs no tape', () => {
    expect(band(elbow.mean + 200, 25, 50)).toMatchObject({ verdict: 'wontFit', settleWith: [] });
  });
});

import { describe, expect, it } from 'vitest';
import { lapTable, person, personCell, place, sill, verdictOf } from '../../test/example-set.ts';
import { model, ruleBook } from '../../test/seed.ts';
import type { Body } from '../people/body.ts';
import { fixed, ofBody } from './amount.ts';
import { PERSON_CHECKS } from './person-checks.ts';
import { failLines } from './fail-lines.ts';

const never = () => {
  throw new Error('a check looked at the body before it was judged');
};

/** Stands for any body: whoever looks at its measures is found out. */
const STAND_IN = {
  person: person(),
  get weightKg(): number {
    return never();
  },
  estimate: never,
  joint: never,
  mean: never,
  means: never,
  isMeasured: never,
  sample: never,
} as Body;

describe('the rules of a person', () => {
  const everything = place({
    table: lapTable({ kneeDepthMm: 450, footDepthMm: 500 }),
    sills: [sill(), sill({ side: 'right' })],
    overhead: { pieceId: 'o1', mark: 'O1', undersideMm: 1500 },
    backTopMm: 900,
    wallMm: { left: 330, right: 400 },
  });
  const behind = place({ sills: [sill({ side: 'behind' })] });

  it.each(PERSON_CHECKS.map((check) => [check.id, check] as const))(
    '%s asks the same of every body',
    (_, check) => {
      const sink = { amount: ofBody(STAND_IN, 'weight_kg', 0.3), bottomsOut: false };
      for (const at of [everything, behind, place()]) {
        const asked = { rule: ruleBook.rule(check.id), place: at, name: 'Ada', body: STAND_IN, sink, model };
        expect(() => check.ask(asked)).not.toThrow();
      }
    },
  );

  it('BACK-03: the fail line of a small sitter is the pass line', () => {
    const at = (backTopMm: number) =>
      verdictOf(
        personCell(
          'BACK-03',
          place({ backTopMm: 407 + backTopMm }),
          person({ measured: { acromial_height_sitting: 480 } }),
        ),
      );
    // 0.6 x 480 = 288, under the 300 that the rule asks of everybody.
    expect(at(290)).toMatchObject({ verdict: 'fits', pass: { lower: 288 }, fail: { lower: 288 } });
    expect(at(287).verdict).toBe('wontFit');
    expect(at(290).bodyLedger.at(-1)).toMatchObject({ label: 'pass and fail line', value: 288 });
  });

  it('a fail line is never stricter than its pass line, on either side', () => {
    const band = (lower: number, upper: number) => ({ lower: fixed(lower), upper: fixed(upper) });
    const lines = failLines({ pass: band(10, 20), fail: band(12, 25) });
    expect([lines.lower?.constant, lines.upper?.constant]).toEqual([10, 25]);
    const other = failLines({ pass: band(10, 20), fail: band(8, 19) });
    expect([other.lower?.constant, other.upper?.constant]).toEqual([8, 20]);
  });
});

import { loadRuleBook, type RuleBook } from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import { describe, expect, it } from 'vitest';
import { newPiece } from '../room/edit-pieces.ts';
import { emptySetDocument } from '../room/read-document.ts';
import { limitsOf } from './limits.ts';
import { measureSet } from './measure-set.ts';

const ruleBook = loadRuleBook(rules);
const IN = 25.4;

/** The book with one number of a rule changed. */
function changed(id: string, name: string, value: number): Pick<RuleBook, 'rule'> {
  return {
    rule: (asked) => {
      const rule = ruleBook.rule(asked);
      return asked === id ? { ...rule, numbers: { ...rule.numbers, [name]: value } } : rule;
    },
  };
}

describe('the limits of the rules', () => {
  it('are those of the clauses: 80 in of headroom, 30 by 48 in of floor, a T in 60 in, knees from 9 to 27 in', () => {
    const limits = limitsOf(ruleBook);
    expect(limits.overHeadsMm).toBeCloseTo(80 * IN, 9);
    expect(limits.floorMm.map((mm) => mm / IN)).toEqual([expect.closeTo(30, 9), expect.closeTo(48, 9)]);
    expect(limits.teeSquareMm).toBeCloseTo(60 * IN, 9);
    const { heightsMm, deepestMm, shallowestMm, widthMm } = limits.kneeSpace;
    expect(heightsMm.map((mm) => Math.round(mm / IN))).toEqual([9, 12, 15, 18, 21, 24, 27]);
    expect([deepestMm / IN, shallowestMm / IN, widthMm / IN].map((inches) => Math.round(inches))).toEqual([
      25, 8, 30,
    ]);
  });

  it('decide what is measured: a way out 400 wide is none where the rule asks for 450', () => {
    const bench = newPiece('bench', 'b1', 'B1', { xMm: 0, zMm: 0, turnDeg: 0 });
    const half = bench.lengthMm / 2;
    const wall = (id: string, xMm: number, turnDeg: number) => ({
      ...newPiece('bulkhead', id, id.toUpperCase(), { xMm, zMm: 400, turnDeg }),
      lengthMm: 3000,
    });
    const table = (id: string, from: number, to: number) => ({
      ...newPiece('table', id, id.toUpperCase(), { xMm: (from + to) / 2, zMm: 900, turnDeg: 0 }),
      lengthMm: to - from,
      widthMm: 800,
    });
    const pieces = [
      bench,
      wall('w1', -half, 90),
      wall('w2', half, -90),
      table('t1', -half, -200),
      table('t2', 200, half),
    ];
    const set = { ...emptySetDocument(), pieces };
    const slidePast = (book: Pick<RuleBook, 'rule'>) => measureSet(set, book).benches[0]?.slidePast;
    expect(slidePast(ruleBook)).toBeTypeOf('number');
    expect(slidePast(changed('EGRESS-08', 'narrowestMm', 450))).toBeUndefined();
  });

  it('refuse a book that lacks one', () => {
    const book: Pick<RuleBook, 'rule'> = { rule: (id) => ({ ...ruleBook.rule(id), numbers: {} }) };
    expect(() => limitsOf(book)).toThrow(RangeError);
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { place } from '../../test/example-set.ts';
import { ruleBook } from '../../test/seed.ts';
import type { PersonCheck } from '../checks/person-check.ts';
import {
  countOf,
  countOfBoth,
  everyone,
  flip,
  inAll,
  inEither,
  NOBODY,
  OPEN,
  sumOver,
  sumsOf,
  withinWindow,
  without,
  wordsFor,
  type Bits,
} from './bits.ts';
import { rankOf, sortNeed } from './sort-need.ts';
import { askSymbols, createSymbols } from './symbols.ts';

const needs = fc.array(fc.integer({ min: -2000, max: 2000 }), { maxLength: 150 });
const end = fc.integer({ min: -2100, max: 2100 });

const columnOf = (values: readonly number[]): Int32Array => {
  const column = new Int32Array(wordsFor(values.length) * 32).fill(NOBODY);
  column.set(values);
  return column;
};
const membersOf = (bits: Bits): number[] =>
  [...bits].flatMap((word, at) =>
    Array.from({ length: 32 }, (_, bit) => 32 * at + bit).filter((n) => (word >>> (n % 32)) & 1),
  );
const indexes = (values: readonly number[], holds: (value: number) => boolean): number[] =>
  values.flatMap((value, at) => (holds(value) ? [at] : []));

describe('sets of people', () => {
  it('hold those inside a window, and only them', () => {
    fc.assert(
      fc.property(needs, end, end, (values, low, high) => {
        const bits = withinWindow(columnOf(values), low, high);
        expect(membersOf(bits)).toEqual(indexes(values, (value) => value >= low && value <= high));
        expect(countOf(bits)).toBe(membersOf(bits).length);
        const open = withinWindow(columnOf(values), -OPEN, OPEN);
        expect(open).toEqual(everyone(values.length));
      }),
    );
  });

  it('are put together like sets', () => {
    fc.assert(
      fc.property(needs, fc.array(fc.tuple(end, end), { minLength: 2, maxLength: 7 }), (values, windows) => {
        const sets = windows.map(([low, high]) => withinWindow(columnOf(values), low, high));
        const inside = (value: number, [low, high]: readonly [number, number]) =>
          value >= low && value <= high;
        const [a, b] = sets as [Bits, Bits];
        const [first, second] = windows as [[number, number], [number, number]];
        expect(membersOf(inAll(sets))).toEqual(
          indexes(values, (value) => windows.every((window) => inside(value, window))),
        );
        expect(membersOf(inEither(a, b))).toEqual(
          indexes(values, (value) => inside(value, first) || inside(value, second)),
        );
        expect(membersOf(without(a, b))).toEqual(
          indexes(values, (value) => inside(value, first) && !inside(value, second)),
        );
        expect(countOfBoth(a, b)).toBe(countOf(inAll([a, b])));
      }),
    );
  });

  it('move with a window by turning over those in between', () => {
    fc.assert(
      fc.property(needs, end, end, (values, before, after) => {
        const column = columnOf(values);
        const { order, values: sorted } = sortNeed(column, values.length);
        expect([...sorted]).toEqual(values.toSorted((a, b) => a - b));
        const bits = withinWindow(column, -OPEN, before);
        const ranks = [rankOf(sorted, before + 1), rankOf(sorted, after + 1)];
        flip(bits, order, Math.min(...ranks), Math.max(...ranks));
        expect(bits).toEqual(withinWindow(column, -OPEN, after));
      }),
    );
  });

  it('sum whole tenths', () => {
    const values = Float32Array.from([1.04, 2.06, 3, 100.25]);
    expect(sumOver(Uint32Array.of(0b1011), values)).toBe(10 + 21 + 1003);
    expect(sumsOf(values)).toEqual({
      sum: 10 + 21 + 30 + 1003,
      squares: 10 ** 2 + 21 ** 2 + 30 ** 2 + 1003 ** 2,
    });
  });
});

describe('a rule that decides by a value of the body', () => {
  it('is refused, because it cannot be asked once for all', () => {
    const check: PersonCheck = {
      id: 'SEAT-05',
      ask: ({ body }) => (body.mean('hip_breadth_sitting') > 400 ? [] : { reason: 'small' }),
    };
    const symbols = createSymbols({ shoeMm: 25, clothing: 'medium' });
    const asked = { rule: ruleBook.rule('SEAT-05'), place: place(), symbols };
    expect(() => askSymbols(check, asked)).toThrow('reads values of a body');
  });
});

import type { LengthStyle } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { inOtherUnits, readNumber, sayNumber, showNumber, type NumberParameter } from './numbers.ts';

const EIGHTHS: LengthStyle = { system: 'feet-inches', roundTo: 8 };
const METRIC: LengthStyle = { system: 'millimetres', roundTo: 8 };
const inches = (size: number) => size * 25.4;
const tableTop: NumberParameter = {
  key: 'heightMm',
  label: 'Top height',
  kind: 'length',
  unit: 'mm',
  min: inches(16),
  max: inches(45),
  value: inches(28 + 7 / 16),
};

describe('a number that was typed finer than lengths are shown', () => {
  it('is shown and said in its own fraction, and equals what it is in the other units', () => {
    expect(showNumber(tableTop, EIGHTHS)).toBe('28⁷⁄₁₆″');
    expect(sayNumber(tableTop, EIGHTHS)).toBe('twenty-eight and seven sixteenths inches');
    expect(inOtherUnits(tableTop, EIGHTHS)).toBe('722.3\u202fmm');
    expect(showNumber(tableTop, METRIC)).toBe('722.3\u202fmm');
    expect(inOtherUnits(tableTop, METRIC)).toBe('28⁷⁄₁₆″');
  });

  it('says that it is rounded where no fraction holds it, and is kept when it is left as it stands', () => {
    const odd = { ...tableTop, value: 722 };
    expect(showNumber(odd, EIGHTHS)).toBe('≈28⅜″');
    expect(readNumber(odd, '≈28⅜″', EIGHTHS)).toEqual({ kind: 'value', value: 722 });
    expect(readNumber(odd, '≈28 3/8″', EIGHTHS)).toEqual({ kind: 'value', value: 722 });
    expect(readNumber(odd, '≈28 1/2″', EIGHTHS)).toEqual({ kind: 'value', value: inches(28.5) });
  });
});

describe('text with two readings', () => {
  const length = { ...tableTop, key: 'lengthMm', min: inches(24), max: inches(96), value: inches(48) };
  const seat = { ...tableTop, key: 'pressedSeatHeight', min: inches(10), max: inches(30), value: inches(18) };

  it('offers both where both are possible, and drops the one that is not', () => {
    expect(readNumber(length, '6 3', EIGHTHS)).toMatchObject({
      kind: 'ambiguous',
      readings: [inches(75), expect.closeTo(inches(63), 6)],
    });
    expect(readNumber({ ...length, max: inches(70) }, '6 3', EIGHTHS)).toMatchObject({
      kind: 'ambiguous',
      readings: [expect.closeTo(inches(63), 6)],
    });
  });

  it('is refused in words where neither is possible', () => {
    expect(readNumber(seat, '6 3', EIGHTHS)).toEqual({
      kind: 'unreadable',
      message: '“6 3” can be read in more than one way, and none is possible here. Type 10″ to 30″.',
    });
  });
});

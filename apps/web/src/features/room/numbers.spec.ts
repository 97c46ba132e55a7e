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

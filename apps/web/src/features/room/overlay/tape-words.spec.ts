import type { LengthStyle, TapeLine } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { sayTape, showTape } from './tape-words.ts';

const STYLE: LengthStyle = { system: 'feet-inches', roundTo: 8 };
const tape: TapeLine = {
  id: 'gap',
  kind: 'gap',
  fromMm: [0, 0, 0],
  toMm: [0, 38.1, 0],
  name: 'under heel',
  valueMm: 38.1,
  verdict: 'wontFit',
  describes: 'from the floor to the heel',
};

describe('a tape between a body and a piece', () => {
  it('has its number for those who see measures', () => {
    expect(showTape(tape, STYLE, 'full')).toBe('1½″');
    expect(sayTape(tape, STYLE, 'full')).toContain('one and one half inches');
  });

  it('has the verdict alone for those who see verdicts alone', () => {
    expect(showTape(tape, STYLE, 'verdicts')).toBe('won’t fit');
    expect(sayTape(tape, STYLE, 'verdicts')).toBe('under heel, from the floor to the heel, won’t fit');
  });

  it('keeps the sizes of pieces for both', () => {
    const size: TapeLine = { ...tape, kind: 'dimension', valueMm: 457.2 };
    expect(showTape(size, STYLE, 'verdicts')).toBe('18″');
  });
});

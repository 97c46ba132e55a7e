import { describe, expect, it } from '@jest/globals';
import { readFileSync } from 'node:fs';
import { formatLength } from '@settlewright/geometry';
import { printable } from './printable';
import { hasGlyph, readCodePoints } from './work-sans';

const sixteenths = Array.from({ length: 15 }, (_, i) =>
  formatLength(((i + 1) * 25.4) / 16, { system: 'feet-inches', roundTo: 16 }),
);

describe('text on paper', () => {
  it('draws every sixteenth of an inch with characters of the face', () => {
    for (const character of sixteenths.join(''))
      expect([character, hasGlyph(character.codePointAt(0)!)]).toEqual([character, true]);
  });

  it('has the primes, signs and dashes that dimensions need', () => {
    for (const character of '0123456789′″×±−–—·…’“”³°≤≥½')
      expect([character, hasGlyph(character.codePointAt(0)!)]).toEqual([character, true]);
  });

  it('keeps a number with its unit', () => {
    expect(printable('457 mm')).toBe('457\u00a0mm');
    expect(printable('3′ 8½″')).toBe('3′\u00a08½″');
  });

  it('never leaves a character without a glyph', () => {
    const awkward = 'Zoë ﬁne \u{1F600} 水 a\u0000b\u200b \u2028 tab\there Å ①';
    for (const character of printable(awkward))
      expect([character, hasGlyph(character.codePointAt(0)!)]).toEqual([character, true]);
    expect(printable('水')).toBe('?');
    expect(printable('①')).toBe('1');
  });

  it('reads the character map of a face as the outline tables list it', () => {
    const file = require.resolve('@expo-google-fonts/work-sans/400Regular/WorkSans_400Regular.ttf');
    const codes = readCodePoints(readFileSync(file));
    // fc-query of Debian's fontconfig lists 2150-215f for this file as: 2153-2154, 215b-215e.
    expect([...codes].filter((code) => code >= 0x2150 && code <= 0x215f).sort((a, b) => a - b)).toEqual([
      0x2153, 0x2154, 0x215b, 0x215c, 0x215d, 0x215e,
    ]);
  });
});

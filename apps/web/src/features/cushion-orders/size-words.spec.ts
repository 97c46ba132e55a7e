import type { LengthStyle } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { foamText, otherSystem, runText, sizeTexts, toleranceText } from './size-words.ts';

const MM: LengthStyle = { system: 'millimetres', roundTo: 8 };
const INCHES: LengthStyle = { system: 'feet-inches', roundTo: 8 };
const plain = (text: string) => text.replaceAll('\u202f', ' ');
const FOAM = { grade: 'HR', densityKgM3: 40, ifd25N: 160, supportFactor: 2.6 };

describe('what an upholsterer reads beside a size', () => {
  it('follows the units of the page', () => {
    expect(plain(toleranceText(6.35, MM))).toBe('± 6 mm');
    expect(toleranceText(6.35, INCHES)).toBe('± ¼″');
    expect(toleranceText(3.175, INCHES)).toBe('± ⅛″');
    expect(plain(foamText(FOAM, MM))).toBe('HR, 40 kg/m³, firmness 160 N (25 % IFD)');
    expect(plain(foamText(FOAM, INCHES))).toBe('HR, 2.5 lb/ft³, firmness 36 lb (25 % IFD)');
  });

  it('gives the size in the other system as well', () => {
    const size = { widthMm: 457.2, depthMm: 508, thicknessMm: 101.6 };
    expect(sizeTexts(size, MM).map(plain)).toEqual(['457', '508', '102 mm']);
    expect(sizeTexts(size, otherSystem(MM))).toEqual(['18', '20', '4″']);
    expect(sizeTexts(size, otherSystem(INCHES)).map(plain)).toEqual(['457', '508', '102 mm']);
  });

  it('rounds what is bought by length up', () => {
    expect(plain(runText(914.4 * 7, INCHES))).toBe('7.0 yd');
    expect(plain(runText(914.4 * 7.01, INCHES))).toBe('7.1 yd');
    expect(plain(runText(6301, MM))).toBe('6.4 m');
  });
});

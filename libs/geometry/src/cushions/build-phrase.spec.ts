import { describe, expect, it } from 'vitest';
import type { Foam } from '../room/document.ts';
import { phraseText } from '../units/phrase.ts';
import { buildPhrase } from './build-phrase.ts';

const LBF_N = 4.4482216152605;
const PLAIN: Foam = { grade: 'seat', densityKgM3: 42, ifd25N: 50 * LBF_N, supportFactor: 2 };
const INCHES = { system: 'feet-inches', roundTo: 16 } as const;
const words = (foam: Foam) => phraseText(buildPhrase(foam, 101.6), INCHES).replace(/\s/g, ' ');

describe('what a foam is built up of', () => {
  it('is said with each layer from the top and with its wrap', () => {
    const layers = [
      { share: 0.25, times: 0.5 },
      { share: 0.75, times: 1.2 },
    ];
    expect(words({ ...PLAIN, layers, wrap: { thicknessMm: 12.7, lostMm: 6.35 } })).toBe(
      'from the top 1″ of 25 lb on 3″ of 60 lb; ½″ of wrap over it, both faces together',
    );
    expect(words({ ...PLAIN, wrap: { thicknessMm: 25.4, lostMm: 12.7 } })).toBe(
      '1″ of wrap over it, both faces together',
    );
  });

  it('is nothing of a plain foam', () => expect(words(PLAIN)).toBe(''));
});

import { describe, expect, it } from '@jest/globals';
import { marginWords, valueWords } from './margin-words';

const inches = { system: 'feet-inches', roundTo: 8 } as const;
const metric = { system: 'millimetres', roundTo: 16 } as const;
const plain = (text: string) => text.replace(/[\u00a0\u202f]/g, ' ');

describe('margins in words', () => {
  it('signs what is left and what is missing, with a true minus', () => {
    expect(marginWords({ margin: 25.4 }, 'mm', inches)).toBe('+1″');
    expect(marginWords({ margin: -22.225 }, 'mm', inches)).toBe('−⅞″');
    expect(plain(marginWords({ margin: -22.4 }, 'mm', metric))).toBe('−22 mm');
    expect(marginWords({ margin: 6 }, 'deg', inches)).toBe('+6°');
  });

  it('puts no sign before nothing, and never says nothing where something is missing', () => {
    expect(marginWords({ margin: 0.4 }, 'mm', inches)).toBe('0″');
    expect(marginWords({ margin: -0.06 }, 'mm', inches)).toBe('0″');
    expect(marginWords({ margin: -0.4 }, 'mm', inches)).toBe('just short');
    expect(marginWords({ margin: -0.4 }, 'mm', metric)).toBe('just short');
  });

  it('says half the range once, without its unit', () => {
    const range = { low: 12.7, high: 25.4 };
    expect(marginWords({ margin: 19.05, marginRange: range }, 'mm', inches)).toBe('+¾″ ± ¼');
    expect(plain(marginWords({ margin: 19, marginRange: range }, 'mm', metric))).toBe('+19 mm ± 6');
  });

  it('rounds to what is known: half inches or centimetres where the range is wide', () => {
    const range = { low: 10, high: 70 };
    expect(marginWords({ margin: 41, marginRange: range }, 'mm', inches)).toBe('+1½″ ± 1');
    expect(plain(marginWords({ margin: 41, marginRange: range }, 'mm', metric))).toBe('+40 mm ± 30');
  });

  it('has no words for a number that was erased', () => {
    expect(marginWords({ margin: null }, 'mm', inches)).toBe('');
  });

  it('writes values and limits plainly', () => {
    expect(valueWords(-2, 'deg', inches)).toBe('−2°');
    expect(valueWords(-0.2, 'mm', inches)).toBe('0″');
    expect(plain(valueWords(-0.2, 'mm', metric))).toBe('0 mm');
    expect(valueWords(609.6, 'mm', inches)).toBe('24″');
  });
});

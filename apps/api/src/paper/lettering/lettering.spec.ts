import { describe, expect, it } from '@jest/globals';
import { readFileSync } from 'node:fs';
import { formatLength } from '@settlewright/geometry';
import { joinArabic } from './arabic-forms';
import { clusters } from './clusters';
import { faceOf, holdsAll } from './faces';
import { printable, ROMANISED } from './printable';
import { textRuns } from './text-runs';
import { readAdvances } from './true-type';

const sixteenths = Array.from({ length: 15 }, (_, i) =>
  formatLength(((i + 1) * 25.4) / 16, { system: 'feet-inches', roundTo: 16 }),
);

describe('the faces', () => {
  it('draw every sixteenth of an inch, and the primes, signs and dashes of dimensions, in Work Sans', () => {
    for (const character of `${sixteenths.join('')}0123456789′″×±−–—·…’“”³°≤≥½`)
      expect([character, faceOf(character)]).toEqual([character, 'Work Sans']);
  });

  it('are read as their outline tables list them', () => {
    const file = require.resolve('@expo-google-fonts/work-sans/400Regular/WorkSans_400Regular.ttf');
    const advances = readAdvances(readFileSync(file));
    // fc-query of Debian's fontconfig lists 2150-215f for this file as: 2153-2154, 215b-215e.
    const listed = [...advances.keys()].filter((code) => code >= 0x2150 && code <= 0x215f);
    expect(listed.sort((a, b) => a - b)).toEqual([0x2153, 0x2154, 0x215b, 0x215c, 0x215d, 0x215e]);
  });
});

describe('text on paper', () => {
  it('keeps a number with its unit', () => {
    expect(printable('457 mm')).toBe('457\u00a0mm');
    expect(printable('3′ 8½″')).toBe('3′\u00a08½″');
  });

  const asTyped = [
    'Nguyễn Thị Phương',
    'Дарья Ёлкина, Їжак',
    'Ελένη Παπαδοπούλου',
    'Անահիտ Գևորգյան',
    'ნინო ბერიძე',
    'דנה כהן',
    'محمد رضا کیانی',
    'Ọláńrewájú, ẹ̀kọ́',
    '① → ★',
  ];
  it.each(asTyped)('keeps %s as it was typed', (name) => {
    expect(printable(name)).toBe(name.normalize('NFC'));
  });

  it('romanises what no face draws and marks it, once for words that belong together', () => {
    expect(printable('王伟')).toBe(`WangWei${ROMANISED}`);
    expect(printable('Anna 김 철수, camera')).toBe(`Anna Gim CheolSu${ROMANISED}, camera`);
    expect(printable('王伟、李娜。')).toBe(`WangWei${ROMANISED},LiNa${ROMANISED}.`);
    expect(printable('ไทย')).toBe(`thaiy${ROMANISED}`);
    expect(printable('\u{1F600}')).toBe(`:grinning:${ROMANISED}`);
    expect(printable('\uf123 \u{10FFFF}')).toBe(`U+F123 U+10FFFF${ROMANISED}`);
    expect(printable(printable('王伟 Wang'))).toBe(printable('王伟 Wang'));
  });

  it('takes a plainer letter before it romanises, and drops what is not seen', () => {
    expect(printable('Ｚｏë ﷺ a\u0000b\u200b\u2028c\td')).toBe('Zoë صلى الله عليه وسلم ab c d');
    expect(printable('שָׁלוֹם')).toBe('שלום');
  });

  it('never leaves a character without a glyph', () => {
    const one = (code: number) => printable(String.fromCodePoint(code));
    // Every character of the smaller scripts, and some of each larger block.
    for (let code = 0x20; code < 0x20000; code += code < 0x3000 ? 1 : 13) {
      if (code >= 0xd800 && code < 0xe000) continue;
      const text = one(code).replaceAll(ROMANISED, '').replaceAll('\u200c', '');
      if (clusters(joinArabic(text)).some((cluster) => faceOf(cluster) === undefined)) {
        throw new Error(`U+${code.toString(16)} leaves ${text}`);
      }
      if (text.includes('?') && /\p{L}/u.test(String.fromCodePoint(code)))
        throw new Error(`U+${code.toString(16)} is a letter and became ${text}`);
    }
  });
});

describe('runs of text', () => {
  it('take Work Sans wherever it has the letter', () => {
    expect(textRuns('Anna Дарья 4')).toEqual([
      { text: 'Anna ', face: 'Work Sans' },
      { text: 'Дарья', face: 'DejaVu Sans' },
      { text: ' 4', face: 'Work Sans' },
    ]);
  });

  it('set a letter and its mark in one face', () => {
    expect(textRuns('kẹ̀')).toEqual([
      { text: 'k', face: 'Work Sans' },
      { text: 'ẹ̀', face: 'DejaVu Sans' },
    ]);
    expect(holdsAll('Work Sans', 'ẹ̀')).toBe(false);
  });

  const drawn = (text: string, direction?: 'ltr' | 'rtl') =>
    textRuns(text, direction)
      .map((run) => run.text)
      .join('');

  it('turn Hebrew, leave its numbers, and mirror its brackets', () => {
    expect(drawn('B1 for דנה, left')).toBe('B1 for הנד, left');
    expect(drawn('כיסא (12) אדום.')).toBe('.םודא (12) אסיכ');
    expect(drawn('כיסא אדום.', 'ltr')).toBe('םודא אסיכ.');
  });

  it('join Arabic: each letter by its neighbours, lam and alef as one, Persian letters too', () => {
    // Meem initial, hah medial, meem medial, dal final.
    expect(joinArabic('محمد')).toBe('\ufee3\ufea4\ufee4\ufeaa');
    expect(joinArabic('سلام')).toBe('\ufeb3\ufefc\ufee1');
    expect(joinArabic('لا')).toBe('\ufefb');
    expect(joinArabic('کیان')).toBe('\ufb90\ufbff\ufe8e\ufee5');
    expect(joinArabic('می\u200cخواهم')).toBe('\ufee3\ufbfd\ufea7\ufeee\ufe8d\ufeeb\ufee2');
    expect(drawn('محمد')).toBe('\ufeaa\ufee4\ufea4\ufee3');
  });
});

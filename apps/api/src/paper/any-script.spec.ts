import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { Pack } from './pack';
import { breakLines, paragraph } from './paragraph';
import type { TextStyle } from './sheet';

const newPack = () =>
  new Pack({
    paper: 'a4',
    title: 'Ελλάδα',
    author: 'Ж',
    subject: '',
    issuedAt: new Date('2027-01-28T10:00:00Z'),
  });

const WORDS = [
  'Anna',
  'Дарья',
  'Достопримечательность',
  'Παπαδοπούλου',
  'Nguyễn',
  'Ọláńrewájú',
  'Գևորգյան',
  'ბერიძე',
  'שלום',
  'محمد',
  '北京大学',
  'สวัสดี',
  '\u{1F600}',
  '457 mm',
];

describe('text of several scripts', () => {
  const sheet = newPack().addSheet();
  const styles: TextStyle[] = [{}, { weight: 600 }, { size: 22, weight: 300 }];

  it('stays inside its column, wherever it breaks', () => {
    fc.assert(
      fc.property(
        fc.array(fc.constantFrom(...WORDS), { minLength: 1, maxLength: 30 }),
        fc.constantFrom(' ', '', ', '),
        fc.integer({ min: 15, max: 80 }),
        fc.constantFrom(...styles),
        (words, between, width, style) => {
          for (const line of breakLines(sheet, words.join(between), width, style)) {
            const text = line.map((word, n) => (word.spaceBefore && n > 0 ? ' ' : '') + word.text).join('');
            expect(sheet.textWidth(text, style)).toBeLessThanOrEqual(width + 1e-6);
          }
        },
      ),
    );
  });

  it('loses nothing where it breaks', () => {
    const text = WORDS.slice(0, 8).join(' ');
    const broken = breakLines(sheet, text, 18).flat();
    expect(broken.map(({ text: word }) => word).join('')).toBe(text.replaceAll(' ', ''));
  });

  it('is measured in the face that draws it', () => {
    // DejaVu Sans' zhe is 2206 of 2048 units wide, drawn at 0.905 of the size.
    expect(sheet.textWidth('Ж', { size: 100 })).toBeCloseTo(((0.905 * 2206) / 2048) * 100 * (25.4 / 72), 3);
    expect(sheet.textWidth('AЖ')).toBeCloseTo(sheet.textWidth('A') + sheet.textWidth('Ж'), 9);
  });

  it('brings the second face into the file only where it is drawn, and draws the same each time', () => {
    const file = (words: string) => {
      const pack = newPack();
      paragraph(pack.addSheet(), words, 20, 20, 60);
      return pack.bytes();
    };
    expect(file('Anna').includes('DejaVu')).toBe(false);
    expect(file('Дарья').includes('DejaVu')).toBe(true);
    expect(file(WORDS.join(' ')).equals(file(WORDS.join(' ')))).toBe(true);
  });
});

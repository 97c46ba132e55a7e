import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatAngle, parseAngle } from './angle.ts';
import { formatExactLength, formatLength } from './format-length.ts';
import { lengthStep, type LengthStyle } from './length-style.ts';
import { formatMass, parseMass } from './mass.ts';
import { parseLength } from './parse-length.ts';
import { parseStature } from './parse-stature.ts';
import { spokenExactLength, spokenLength } from './spoken-length.ts';

const FEET: LengthStyle = { system: 'feet-inches', roundTo: 16, feet: true };
const INCHES: LengthStyle = { system: 'feet-inches', roundTo: 16 };
const EIGHTHS: LengthStyle = { system: 'feet-inches', roundTo: 8 };
const DECIMAL: LengthStyle = { system: 'decimal-inches', roundTo: 16 };
const METRIC: LengthStyle = { system: 'millimetres', roundTo: 16 };
const STYLES = [
  FEET,
  INCHES,
  EIGHTHS,
  { ...EIGHTHS, feet: true },
  DECIMAL,
  { ...DECIMAL, roundTo: 8 as const },
  METRIC,
];

const lengthOf = (text: string, unit: 'in' | 'mm' = 'in') => {
  const read = parseLength(text, unit);
  return read.ok ? read.value : read.error.code;
};
const readingsOf = (text: string, unit: 'in' | 'mm' = 'in') => {
  const read = parseLength(text, unit);
  return read.ok ? undefined : read.error.readings;
};

describe('parseLength', () => {
  // By hand with 1 ft = 304.8 mm and 1 in = 25.4 mm.
  it.each([
    ["6'", 1828.8],
    ['6’', 1828.8],
    ['6 ft', 1828.8],
    ['6\' 0 1/2"', 1841.5],
    ['6′ 0½″', 1841.5],
    ["6' 0-1/2", 1841.5],
    ['6ft 1/2in', 1841.5],
    ["6'3", 1905],
    ["5' 11 15/16''", 1827.2125],
    ['72.5', 1841.5],
    ['72,5', 1841.5],
    ['72 1/2in', 1841.5],
    ['72-1/2"', 1841.5],
    ['17½', 444.5],
    ['⅞″', 22.225],
    ['³⁄₁₆″', 4.7625],
    ['3/4', 19.05],
    ['.5"', 12.7],
    ['1842mm', 1842],
    ['1842 mm', 1842],
    ['184 cm', 1840],
    ['1.842 m', 1842],
    ['  18  ', 457.2],
    ['0', 0],
  ])('reads %s', (text, mm) => expect(lengthOf(text)).toBe(mm));

  it('takes a bare number in the display unit', () => {
    expect(lengthOf('18', 'in')).toBe(457.2);
    expect(lengthOf('18', 'mm')).toBe(18);
  });

  it.each([
    ['6 3', [1905, 1600.2]],
    ['3/0', [914.4, 762]],
    ['6/8', [2032, 19.05]],
    ['6/10', [2082.8, 15.24]],
    ['6-3', [1905, 1600.2]],
    ['1,842mm', [1842, 1.842]],
  ])('refuses %s and offers both readings', (text, readings) => {
    expect(lengthOf(text)).toBe('ambiguous');
    expect(readingsOf(text)).toEqual(readings);
  });

  it.each([
    ['', 'empty'],
    ['   ', 'empty'],
    ['NaN', 'unreadable'],
    ['Infinity', 'unreadable'],
    ['seat', 'unreadable'],
    ['1e9', 'unreadable'],
    ["6' 6'", 'unreadable'],
    ['6" 3\'', 'unreadable'],
    ['1/0"', 'unreadable'],
    ['-4', 'negative'],
    ['−4″', 'negative'],
    ['400 m', 'too-large'],
    ['9'.repeat(400), 'too-large'],
  ])('refuses “%s” as %s', (text, code) => {
    const read = parseLength(text, 'in');
    expect(read).toMatchObject({ ok: false, error: { code, read: text } });
    if (!read.ok) expect(read.error.message.length).toBeGreaterThan(10);
  });

  it('takes a negative position where one is allowed', () => {
    expect(parseLength('−4″', 'in', { negative: true })).toEqual({ ok: true, value: -101.6 });
  });

  it('never throws and never returns what is not a finite number', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.stringMatching(/^[0-9 '"/.,½⅛-]{0,9}$/)), (text) => {
        const read = parseLength(text, 'in');
        if (read.ok) expect(Number.isFinite(read.value) && read.value >= 0).toBe(true);
        else expect(read.error.message).not.toBe('');
      }),
      { numRuns: 1000 },
    );
  });
});

describe('parseStature', () => {
  const range = { minMm: 1000, maxMm: 2300 };
  const heightOf = (text: string, unit: 'in' | 'mm') => {
    const read = parseStature(text, unit, range);
    return read.ok ? read.value : read.error.code;
  };

  // By hand: 71 in × 25.4, 71.5 in × 25.4, 72 in × 25.4.
  it.each([
    ["5'11", 1803.4],
    ['5′ 11″', 1803.4],
    ["5'11''", 1803.4],
    ['5 ft 11 1/2', 1816.1],
    ['5ft 11½', 1816.1],
    ['5 foot 11', 1803.4],
    ['180', 1800],
    ['1.80 m', 1800],
    ['1,80', 1800],
    ['1.8', 1800],
    ['1m80', 1800],
    ['1 m 80', 1800],
    ['180cm', 1800],
    ['1800', 1800],
    ['1800 mm', 1800],
  ])('reads %s in either unit', (text, mm) => {
    expect(heightOf(text, 'in')).toBe(mm);
    expect(heightOf(text, 'mm')).toBe(mm);
  });

  it('takes no inches where millimetres rule, and no feet without a sign', () => {
    expect(heightOf('72', 'in')).toBe(1828.8);
    expect(heightOf('72', 'mm')).toBe(72);
    expect(heightOf('5.11', 'in')).toBeCloseTo(129.794, 6);
  });

  it.each([
    ['tall', 'unreadable'],
    ['5 11', 'ambiguous'],
    ['', 'empty'],
    ["5'11 cm", 'unreadable'],
    ['-180', 'negative'],
  ])('refuses “%s” as %s', (text, code) => expect(heightOf(text, 'in')).toBe(code));
});

describe('formatLength', () => {
  it.each([
    [1117.6, FEET, '3′\u00a08″'],
    [1828.8, FEET, '6′\u00a00″'],
    [444.5, INCHES, '17½″'],
    [914.4, INCHES, '36″'],
    [22.225, INCHES, '⅞″'],
    [4.7625, INCHES, '³⁄₁₆″'],
    [17.9375 * 25.4, INCHES, '17¹⁵⁄₁₆″'],
    [17.9375 * 25.4, EIGHTHS, '18″'],
    [11.99 * 25.4, FEET, '1′\u00a00″'],
    [-22.225, INCHES, '−⅞″'],
    [-0.1, INCHES, '0″'],
    [444.5, DECIMAL, '17.50″'],
    [456.6, METRIC, '457\u202fmm'],
    [-3, METRIC, '−3\u202fmm'],
  ])('%d mm', (mm, style, text) => expect(formatLength(mm, style)).toBe(text));

  it('is read back within half a rounding step', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 99_000, noNaN: true }),
        fc.constantFrom(...STYLES),
        (mm, style) => {
          const unit = style.system === 'millimetres' ? 'mm' : 'in';
          const read = parseLength(formatLength(mm, style), unit);
          expect(read.ok).toBe(true);
          if (read.ok) expect(Math.abs(read.value - mm)).toBeLessThanOrEqual(lengthStep(style) / 2 + 1e-5);
        },
      ),
      { numRuns: 1000 },
    );
  });
});

describe('spokenLength', () => {
  it.each([
    [444.5, INCHES, 'seventeen and one half inches'],
    [457.2, INCHES, 'eighteen inches'],
    [25.4, INCHES, 'one inch'],
    [-22.225, INCHES, 'minus seven eighths of an inch'],
    [1117.6, FEET, 'three feet eight inches'],
    [1828.8, FEET, 'six feet'],
    [4.7625, INCHES, 'three sixteenths of an inch'],
    [81.5 * 25.4, INCHES, 'eighty-one and one half inches'],
    [457, METRIC, '457 millimetres'],
  ])('%d mm', (mm, style, words) => expect(spokenLength(mm, style)).toBe(words));
});

describe('a length that somebody chose', () => {
  const inches = (size: number) => size * 25.4;
  it.each([
    [inches(28.5), EIGHTHS, '28½″', 'twenty-eight and one half inches'],
    [inches(28 + 7 / 16), EIGHTHS, '28⁷⁄₁₆″', 'twenty-eight and seven sixteenths inches'],
    [inches(28 + 7 / 16) + 0.04, EIGHTHS, '28⁷⁄₁₆″', 'twenty-eight and seven sixteenths inches'],
    [inches(17 + 3 / 32), INCHES, '17³⁄₃₂″', 'seventeen and three thirty-seconds inches'],
    [inches(17 + 1 / 64), INCHES, '17¹⁄₆₄″', 'seventeen and one sixty-fourth inches'],
    [
      inches(43 + 7 / 16),
      { ...EIGHTHS, feet: true },
      '3′\u00a07⁷⁄₁₆″',
      'three feet seven and seven sixteenths inches',
    ],
    [457, EIGHTHS, '≈18″', 'about eighteen inches'],
    [-457, EIGHTHS, '≈−18″', 'about minus eighteen inches'],
    [457.2, METRIC, '457.2\u202fmm', '457.2 millimetres'],
    [457.03, METRIC, '457\u202fmm', '457 millimetres'],
    [inches(28 + 7 / 16), DECIMAL, '28.438″', '28.438 inches'],
    [inches(28.41), DECIMAL, '28.41″', '28.41 inches'],
    [inches(28.4), { ...DECIMAL, roundTo: 8 } as const, '28.4″', '28.4 inches'],
    [0, EIGHTHS, '0″', 'zero inches'],
  ])('%d mm', (mm, style, text, words) => {
    expect(formatExactLength(mm, style)).toBe(text);
    expect(spokenExactLength(mm, style)).toBe(words);
  });

  it('never shows one length as another without saying so', () => {
    for (let mm = 300; mm < 900; mm += 0.37) {
      for (const [style, unit] of [
        [EIGHTHS, 'in'],
        [DECIMAL, 'in'],
        [METRIC, 'mm'],
      ] as const) {
        const shown = formatExactLength(mm, style);
        if (shown.startsWith('≈')) continue;
        const read = parseLength(shown, unit);
        expect(read.ok && Math.abs(read.value - mm)).toBeLessThan(0.0501);
      }
    }
  });
});

describe('angles and masses', () => {
  it('reads and writes angles', () => {
    for (const text of ['8', '8°', '8 deg', '8 degrees'])
      expect(parseAngle(text)).toEqual({ ok: true, value: 8 });
    expect(parseAngle('−2,5°')).toEqual({ ok: true, value: -2.5 });
    expect(parseAngle('').ok || parseAngle('steep').ok || parseAngle('400').ok).toBe(false);
    expect([formatAngle(8), formatAngle(-2), formatAngle(7.46), formatAngle(-0.01)]).toEqual([
      '8°',
      '−2°',
      '7.5°',
      '0°',
    ]);
  });

  it('reads and writes masses in the system of the lengths', () => {
    expect(parseMass('77 kg', 'lb')).toEqual({ ok: true, value: 77 });
    const pounds = parseMass('170', 'lb');
    // 170 × 0.45359237.
    expect(pounds.ok && pounds.value).toBeCloseTo(77.1107, 4);
    expect(parseMass('-3', 'kg').ok || parseMass('heavy', 'kg').ok || parseMass('', 'kg').ok).toBe(false);
    expect(formatMass(77, METRIC)).toBe('77\u202fkg');
    expect(formatMass(77, INCHES)).toBe('170\u202flb');
    expect(formatMass(2.6 * 0.45359237, INCHES)).toBe('2.6\u202flb');
  });

  // By hand: 11 st 4 lb is 158 lb, 71.66759446 kg; 11 st is 154 lb, 69.85322498 kg; 11.5 st is 161 lb.
  it.each([
    ['11 st 4', 71.66759446],
    ['11 st 4 lb', 71.66759446],
    ['11st 4lb', 71.66759446],
    ['11st4lb', 71.66759446],
    ['11 stone 4', 71.66759446],
    ['11 stones 4 pounds', 71.66759446],
    ['11 St. 4 lbs.', 71.66759446],
    ['11 st, 4 lb', 71.66759446],
    ['11 st', 69.85322498],
    ['11 stone', 69.85322498],
    ['11.5 st', 161 * 0.45359237],
    ['11 st 4.5', 158.5 * 0.45359237],
    ['158 lbs', 71.66759446],
    ['158lb.', 71.66759446],
    ['72 kg', 72],
    ['72,5kg', 72.5],
    ['72 kilos', 72],
  ])('reads a weight of %s', (text, kg) => {
    for (const unit of ['lb', 'kg'] as const) {
      const read = parseMass(text, unit);
      expect(read.ok && read.value).toBeCloseTo(kg, 8);
    }
  });

  it.each([
    ['11 st 14', /fewer than 14 pounds/],
    ['11.5 st 4', /whole stones/],
    ['11 4', /is not a weight/],
    ['11 st 4 kg', /is not a weight/],
    ['st 4', /is not a weight/],
    ['9 stoned', /is not a weight/],
  ])('refuses “%s” and says why', (text, why) => {
    const read = parseMass(text, 'lb');
    expect(read).toMatchObject({ ok: false, error: { code: 'unreadable', read: text } });
    expect(!read.ok && read.error.message).toMatch(why);
    expect(!read.ok && read.error.message).toContain('12 st 2 lb');
  });
});

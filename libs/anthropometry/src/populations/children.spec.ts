import { describe, expect, it } from 'vitest';
import { children as file } from '../../test/seed.ts';
import { percentileOf } from '../../test/shares.ts';
import { childSizeMarks, readChildren } from './children-file.ts';
import { childrenOfMark } from './children.ts';

const children = readChildren(file);

describe('size marks', () => {
  it.each([
    [900, []],
    [1040, [1]],
    [1100, [1, 2]],
    [1200, [2, 3]],
    [1420, [3, 4]],
    [1600, [5, 6]],
    [1880, [6]],
    [1881, []],
  ])('a child of %d', (statureMm, marks) => {
    expect(childSizeMarks(children, statureMm).map(({ mark }) => mark)).toEqual(marks);
  });

  it('have seats and tables that rise with them', () => {
    const [mark] = childSizeMarks(children, 1250);
    expect(mark).toMatchObject({ mark: 3, seatHeightMm: 350, tableHeightMm: 590 });
    const seats = children.marks.map(({ seatHeightMm }) => seatHeightMm);
    expect(seats).toEqual([...seats].sort((a, b) => a - b));
  });

  it('have seats that a child with shoes on reaches the floor from', () => {
    for (const { mark, seatHeightMm } of children.marks) {
      const longest = childrenOfMark(children, mark).draw(2000, 1).columns.popliteal_height ?? [];
      expect(Math.max(...longest) + children.shoeWithinMm).toBeGreaterThan(seatHeightMm);
    }
  });

  it('refuse a stature that is none, and a mark that is none', () => {
    expect(() => childSizeMarks(children, 0)).toThrow('statureMm is 0; accepted: a number above 0');
    expect(() => childrenOfMark(children, 7)).toThrow('mark is 7; accepted: 1, 2, 3, 4, 5, 6');
  });
});

describe.each(children.marks)('children of mark $mark', ({ mark, statureMm, poplitealWithShoesMm }) => {
  const population = childrenOfMark(children, mark);
  const draws = population.draw(20_000, 3);
  const column = (key: 'stature' | 'popliteal_height' | 'weight_kg') =>
    draws.columns[key] ?? new Float32Array();

  it('know stature, weight and lower leg, and nothing else', () => {
    expect(Object.keys(draws.columns).sort()).toEqual(['popliteal_height', 'stature', 'weight_kg']);
    expect(population.cautions).toContain(children.warning);
  });

  it('lie within the ranges of the mark, and fill them', () => {
    const stature = [...column('stature')];
    expect(Math.min(...stature)).toBeGreaterThanOrEqual(statureMm[0] - 0.1);
    expect(Math.max(...stature)).toBeLessThanOrEqual(statureMm[1] + 0.1);
    const leg = column('popliteal_height').map((value) => value + children.shoeWithinMm);
    expect(Math.min(...leg)).toBeGreaterThanOrEqual(poplitealWithShoesMm[0] - 0.1);
    expect(Math.max(...leg)).toBeLessThanOrEqual(poplitealWithShoesMm[1] + 0.1);
    expect(percentileOf(leg, 99) - percentileOf(leg, 1)).toBeGreaterThan(
      0.8 * (poplitealWithShoesMm[1] - poplitealWithShoesMm[0]),
    );
  });

  it('gain weight with height', () => {
    const tall = percentileOf(column('stature'), 50);
    const mean = (of: (mm: number) => boolean) => {
      const kept = [...column('weight_kg')].filter((_, row) => of(column('stature')[row] as number));
      return kept.reduce((sum, kg) => sum + kg, 0) / kept.length;
    };
    expect(mean((mm) => mm > tall)).toBeGreaterThan(mean((mm) => mm <= tall));
  });
});

describe('children beside the survey', () => {
  it.each([
    // Mean stature and weight of boys of 4, 8, 10 and 13.
    [1, 1073, 18.9],
    [3, 1319, 31.4],
    [4, 1432, 41.4],
    [5, 1610, 57.1],
  ])('mark %d at %d', (mark, statureMm, kg) => {
    const draws = childrenOfMark(children, mark).draw(60_000, 3);
    const weights = [...(draws.columns.weight_kg ?? [])].filter(
      (_, row) => draws.isWoman[row] === 0 && Math.abs((draws.columns.stature?.[row] ?? 0) - statureMm) < 15,
    );
    const mean = weights.reduce((sum, each) => sum + each, 0) / weights.length;
    expect(Math.abs(mean / kg - 1)).toBeLessThan(0.08);
  });
});

it('a file that does not hold together is refused', () => {
  expect(() => readChildren({ ...file, marks: [] })).toThrow('Children: marks');
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { tuftColumns } from './tufts-on-lines.ts';

const boards = (count: number, pitch: number, from = 0) =>
  Array.from({ length: count }, (_, i) => from + i * pitch);

describe('columns of tufts on board lines', () => {
  it('take the number of boards that is nearest to the wanted width, and share the margins', () => {
    // Boards of 100 on a face of 1000: biscuits of about 210 stand on every other joint, from 100 to 900.
    const columns = tuftColumns({
      ...{ linesMm: boards(9, 100, 100), lowMm: 0, highMm: 1000, borderMm: 60, widthMm: 210, steps: 1 },
    });
    expect(columns).toEqual([100, 300, 500, 700, 900]);
  });

  it('leave whole diamonds: an odd number of columns, each half a diamond from the next', () => {
    const columns = tuftColumns({
      ...{ linesMm: boards(8, 100, 100), lowMm: 0, highMm: 900, borderMm: 60, widthMm: 190, steps: 2 },
    });
    expect(columns).toHaveLength(7);
    expect(new Set(columns.slice(1).map((x, i) => x - columns[i]!))).toEqual(new Set([100]));
  });

  it('pass by a board at the end that was cut narrower', () => {
    const linesMm = [60, ...boards(6, 100, 130), 690];
    const columns = tuftColumns({ linesMm, lowMm: 0, highMm: 750, borderMm: 30, widthMm: 100, steps: 1 });
    expect(columns).toEqual(boards(6, 100, 130));
  });

  it('are none where the border leaves no room for one', () => {
    const field = { linesMm: boards(9, 100), lowMm: 0, highMm: 800, widthMm: 100, steps: 2 } as const;
    expect(tuftColumns({ ...field, borderMm: 350 })).toEqual([]);
    expect(tuftColumns({ ...field, linesMm: [], borderMm: 0 })).toEqual([]);
  });

  it('stand on lines, within the border, evenly, in whole tufts, whatever the boards', () => {
    fc.assert(
      fc.property(
        fc.record({
          pitch: fc.double({ min: 40, max: 220, noNaN: true }),
          count: fc.integer({ min: 0, max: 30 }),
          from: fc.double({ min: -300, max: 300, noNaN: true }),
          borderMm: fc.double({ min: 0, max: 300, noNaN: true }),
          widthMm: fc.double({ min: 20, max: 600, noNaN: true }),
          steps: fc.constantFrom(1 as const, 2 as const),
        }),
        ({ pitch, count, from, ...field }) => {
          const linesMm = boards(count, pitch, from);
          const columns = tuftColumns({ ...field, linesMm, lowMm: 0, highMm: 1500 });
          expect(columns.every((x) => linesMm.includes(x))).toBe(true);
          expect(columns.every((x) => x >= field.borderMm - 1e-6 && x <= 1500 - field.borderMm + 1e-6)).toBe(
            true,
          );
          if (columns.length > 0) expect((columns.length - 1) % field.steps).toBe(0);
          const gaps = columns.slice(1).map((x, i) => x - columns[i]!);
          for (const gap of gaps) expect(gap).toBeCloseTo(gaps[0]!, 6);
        },
      ),
    );
  });
});

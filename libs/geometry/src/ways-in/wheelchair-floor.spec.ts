import { loadRuleBook } from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import { describe, expect, it } from 'vitest';
import type { Piece, SetDocument } from '../room/document.ts';
import { emptySetDocument } from '../room/read-document.ts';
import { area, extent } from '../situation/plan.ts';
import { piece } from '../../test/measured.ts';
import { wheelchairFloor } from './wheelchair-floor.ts';

const IN = 25.4;
const ruleBook = loadRuleBook(rules);
const floorOf = (pieces: Piece[], asked: Partial<SetDocument['asked']> = {}) => {
  const empty = emptySetDocument();
  return wheelchairFloor({ ...empty, pieces, asked: { ...empty.asked, ...asked } }, ruleBook);
};
const table = (more: object = {}) =>
  piece('table', 'T1', [0, 0, 0], {
    accessible: true,
    lengthMm: 1500,
    widthMm: 1300,
    heightMm: 760,
    base: { kind: 'columns', count: 1, diameterMm: 90, footLengthMm: 300, footHeightMm: 30 },
    ...more,
  });

describe('floor for a wheelchair', () => {
  it('at a table has the published sizes, each with its clause', () => {
    const shapes = floorOf([table()]);
    expect(shapes.map(({ kind, widthMm, lengthMm, clause }) => [kind, widthMm, lengthMm, clause])).toEqual([
      ['floor', 30 * IN, 48 * IN, '305.3 and 903.2'],
      ['approach', 36 * IN, 48 * IN, '403.5.1'],
      ['knee-space', 30 * IN, expect.closeTo(11 * IN, 6), '306.2 and 306.3'],
      ['toe-space', 30 * IN, 17 * IN, '306.2 and 306.3'],
    ]);
    expect(shapes.every(({ blockedBy }) => blockedBy.length === 0)).toBe(true);
    // Seventeen of the 48 inches lie under the top.
    expect(area(shapes[0]?.outline ?? [])).toBeCloseTo(30 * IN * 31 * IN, 3);
    expect(extent(shapes[3]?.outline ?? [], 1)[1]).toBeCloseTo(650, 6);
  });

  it('is taken at another edge where something stands in the way, and says what where all are taken', () => {
    const wall = (mark: string, x: number, z: number, turn: number) =>
      piece('bulkhead', mark, [x, z, turn], { lengthMm: 3000, heightMm: 2000 });
    const before = wall('W1', 0, 900, 0);
    expect(floorOf([table(), before])[0]?.blockedBy).toEqual([]);
    const around = [before, wall('W2', 0, -900, 0), wall('W3', 1000, 0, 90), wall('W4', -1000, 0, 90)];
    expect(floorOf([table(), ...around])[0]?.blockedBy.length).toBeGreaterThan(0);
  });

  it('has no knee space where an apron hangs', () => {
    const shapes = floorOf([table({ apron: { heightMm: 200, insetMm: 100 } })]);
    expect(shapes.find(({ kind }) => kind === 'knee-space')?.blockedBy).toEqual(['T1']);
    expect(shapes.find(({ kind }) => kind === 'toe-space')?.blockedBy).toEqual([]);
  });

  it('lets an apron hang in the knee space where the clause lets it be less deep', () => {
    // Its underside, 665 mm up, asks for 11 in less a sixth of what it is over 9 in: 206.7 mm.
    const kneesAt = (insetMm: number) =>
      floorOf([table({ topThicknessMm: 40, apron: { heightMm: 55, insetMm } })]).find(
        ({ kind }) => kind === 'knee-space',
      )?.blockedBy;
    expect(kneesAt(220)).toEqual([]);
    expect(kneesAt(200)).toEqual(['T1']);
  });

  it('lies at the end of an accessible bench, and is not asked of others', () => {
    const bench = piece('bench', 'B1', [0, 0, 0], { accessible: true, lengthMm: 1200 });
    const wall = piece('bulkhead', 'W1', [800, 0, -90], { lengthMm: 3000, heightMm: 2000 });
    const [spot, ...rest] = floorOf([bench, wall]);
    expect(rest).toEqual([]);
    expect(extent(spot?.outline ?? [], 0)).toEqual([-600 - 30 * IN, -600]);
    expect(spot?.blockedBy).toEqual([]);
    expect(floorOf([{ ...bench, accessible: false }])).toEqual([]);
  });

  it('for turning round is a circle and a T about the spot', () => {
    const shapes = floorOf([table({ accessible: false })], { turningAt: { xMm: 2000, zMm: 0 } });
    expect(shapes.map(({ kind }) => kind)).toEqual(['turning-circle', 'turning-tee', 'turning-tee']);
    expect(shapes[0]).toMatchObject({ widthMm: 60 * IN, clause: '304.3', blockedBy: [] });
    const near = floorOf([table({ accessible: false })], { turningAt: { xMm: 1400, zMm: 0 } });
    expect(near[0]?.blockedBy).toEqual(['T1']);
  });
});

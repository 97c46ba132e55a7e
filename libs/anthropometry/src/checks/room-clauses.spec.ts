import { describe, expect, it } from 'vitest';
import { bench, pieceCell, set, table } from '../../test/example-set.ts';
import { ruleBook } from '../../test/seed.ts';
import type { CheckSettings } from './piece-check.ts';
import { accessiblePlacesNeeded, wheelchairSpacesNeeded } from './room-clauses.ts';
import type { SetSituation } from './situation.ts';
import { rowNeedMm } from './way-clauses.ts';

const IN = 25.4;
const given = (id: string) => ruleBook.rule(id).worked.given as Record<string, number>;

function clause(id: string, situation: Partial<SetSituation>, settings: Partial<CheckSettings> = {}) {
  const { outcome } = pieceCell(id, set(situation), [], settings);
  if (outcome.kind !== 'clause') throw new Error(`${outcome.kind}: ${JSON.stringify(outcome)}`);
  return outcome;
}
const silence = (id: string, situation: Partial<SetSituation> = {}, settings: Partial<CheckSettings> = {}) =>
  pieceCell(id, set(situation), [], settings).outcome;

describe('ways that a code measures', () => {
  const route = (...stretches: [widthMm: number, lengthMm: number][]) => ({
    route: stretches.map(([widthMm, lengthMm]) => ({ widthMm, lengthMm })),
  });

  it('EGRESS-03: a short narrowing is inside, a long, a narrow or a second one too near is not', () => {
    const { widthMm = 0, runMm = 0 } = given('EGRESS-03');
    const whole = clause('EGRESS-03', route([2000, 3000], [widthMm, runMm], [2000, 3000]));
    expect(whole).toMatchObject({ inside: true, clause: '403.5.1', value: 864 });
    expect(clause('EGRESS-03', route([36 * IN, 4000]))).toMatchObject({ inside: true, value: 36 * IN });
    expect(clause('EGRESS-03', route([2000, 900], [864, 620])).inside).toBe(false);
    expect(clause('EGRESS-03', route([2000, 900], [812, 300])).inside).toBe(false);
    const twice = (apart: number) => clause('EGRESS-03', route([864, 500], [1000, apart], [864, 500]));
    expect([twice(48 * IN).inside, twice(1200).inside]).toEqual([true, false]);
    // Two widths in a row are one narrowing.
    expect(clause('EGRESS-03', route([2000, 900], [864, 400], [850, 400])).inside).toBe(false);
  });

  it('EGRESS-04: 1220 between tables back to back is 50 short', () => {
    const apart = (widthMm: number) =>
      clause('EGRESS-04', {
        ways: [{ kind: 'chairs-both-sides', pieceIds: ['t1', 't2'], marks: ['T1', 'T2'], widthMm }],
      });
    const short = apart(given('EGRESS-04').apartMm ?? 0);
    expect(short.inside).toBe(false);
    expect((short.limits.lower ?? 0) - short.value).toBeCloseTo(50, 9);
    expect(apart(1270).inside).toBe(true);
  });

  it('EGRESS-05: 20 seats between two aisles need 13.8 in', () => {
    const rule = ruleBook.rule('EGRESS-05');
    expect(rowNeedMm(rule, 20, 2) / IN).toBeCloseTo(13.8, 9);
    expect(rowNeedMm(rule, 14, 2) / IN).toBeCloseTo(12, 9);
    // One aisle: 12 + 0.6 x (10 - 7); never more than 22.
    expect(rowNeedMm(rule, 10, 1) / IN).toBeCloseTo(13.8, 9);
    expect([rowNeedMm(rule, 60, 2) / IN, rowNeedMm(rule, 60, 1) / IN]).toEqual([22, 22]);
    const row = (openEnds: 0 | 1 | 2, clearMm: number) => ({
      rows: [
        {
          pieceIds: ['b2', 'b1'] as [string, string],
          marks: ['B2', 'B1'] as [string, string],
          clearMm,
          seats: 20,
          openEnds,
        },
      ],
    });
    expect(clause('EGRESS-05', row(2, 13 * IN)).inside).toBe(false);
    expect(clause('EGRESS-05', row(2, 13.8 * IN)).inside).toBe(true);
    expect(silence('EGRESS-05', row(0, 900)).kind).toBe('notAsked');
  });
});

describe('rooms for people who use a wheelchair', () => {
  it('ACC-04: 30 by 48 in beside the end; the printed 760 is 2 short of the inch value', () => {
    const { widthMm = 0, lengthMm = 0 } = given('ACC-04');
    const at = (endSpace: { widthMm: number; lengthMm: number } | undefined) =>
      clause('ACC-04', { benches: [bench({ accessible: true, endSpace })] });
    expect(at({ widthMm, lengthMm })).toMatchObject({ inside: true, clause: '305.3 and 903.2' });
    expect(at({ widthMm: 760, lengthMm }).inside).toBe(false);
    expect(at(undefined).inside).toBe(false);
    expect(silence('ACC-04', { benches: [bench()] })).toMatchObject({ kind: 'notAsked' });
  });

  it('ACC-07: 2 of 44 places are one too few', () => {
    const rule = ruleBook.rule('ACC-07');
    expect(accessiblePlacesNeeded(rule, given('ACC-07').seats ?? 0)).toBe(3);
    expect([0, 1, 20, 21, 40].map((places) => accessiblePlacesNeeded(rule, places))).toEqual([1, 1, 1, 2, 2]);
    const diners = Array.from({ length: 42 }, (_, n) => `b1:${n + 1}`);
    const edges = [{ name: 'front' as const, lengthMm: 20000, placeIds: diners, clearBetweenLegsMm: 19000 }];
    const kneeSpace = (widthMm: number) => ({ clearHeightMm: 700, widthMm, depthAt: [], toeDepthMm: 500 });
    const tables = (widthMm: number) => [
      table({ edges }),
      table({ pieceId: 't2', mark: 'T2', accessible: true, kneeSpace: kneeSpace(widthMm) }),
    ];
    expect(clause('ACC-07', { tables: tables(1600) })).toMatchObject({
      inside: false,
      value: 2,
      limits: { lower: 3 },
    });
    expect(clause('ACC-07', { tables: tables(3 * 762) }).inside).toBe(true);
    expect(silence('ACC-07', { tables: [table()] })).toMatchObject({ kind: 'notAsked' });
  });

  it('ACC-08: a circle of 1500 is 24 short, unless a T is clear', () => {
    const { circleMm = 0 } = given('ACC-08');
    const short = clause('ACC-08', { turning: { circleMm, teeArmMm: 0 } });
    expect(short).toMatchObject({ inside: false, value: 1500 });
    expect((short.limits.lower ?? 0) - short.value).toBeCloseTo(24, 9);
    expect(clause('ACC-08', { turning: { circleMm: 60 * IN, teeArmMm: 0 } }).inside).toBe(true);
    expect(clause('ACC-08', { turning: { circleMm, teeArmMm: 36 * IN } })).toMatchObject({
      inside: true,
      value: 36 * IN,
    });
    expect(silence('ACC-08')).toMatchObject({ kind: 'notAsked' });
  });

  it('ACC-09: 813 lies inside; a deep opening asks for 36 in', () => {
    const { clearWidthMm = 0, depthMm = 0 } = given('ACC-09');
    const door = (width: number, depth: number) =>
      clause('ACC-09', {}, { door: { clearWidthMm: width, depthMm: depth } });
    expect(door(clearWidthMm, depthMm)).toMatchObject({ inside: true, clause: '404.2.3', value: 813 });
    expect(door(812, depthMm).inside).toBe(false);
    expect([door(900, 610).inside, door(36 * IN, 610).inside]).toEqual([false, true]);
    expect(silence('ACC-09', {}, {})).toMatchObject({ kind: 'notAsked' });
  });

  it('ACC-10: the table of the clause', () => {
    const rule = ruleBook.rule('ACC-10');
    expect(wheelchairSpacesNeeded(rule, given('ACC-10').seats ?? 0)).toBe(7);
    expect(
      [4, 25, 26, 50, 51, 150, 151, 300, 301, 500, 501, 650, 651, 5000, 5001, 5200, 5201].map((seats) =>
        wheelchairSpacesNeeded(rule, seats),
      ),
    ).toEqual([1, 1, 2, 2, 4, 4, 5, 5, 6, 6, 7, 7, 8, 36, 37, 37, 38]);
    const placeIds = Array.from({ length: 30 }, (_, n) => `b1:${n + 1}`);
    const kept = (wheelchairSpaces: number | undefined) => ({ wheelchairSpaces });
    expect(clause('ACC-10', { benches: [bench({ placeIds })] }, kept(1)).inside).toBe(false);
    expect(clause('ACC-10', { benches: [bench({ placeIds })] }, kept(2)).inside).toBe(true);
    expect(silence('ACC-10', { benches: [bench({ placeIds })] }, kept(undefined)).kind).toBe('notAsked');
    expect(silence('ACC-10', { benches: [bench()] }, kept(0)).kind).toBe('doesNotApply');
  });
});

import { describe, expect, it } from 'vitest';
import { benchLayout } from '../pieces/bench-layout.ts';
import type { Piece, SetDocument } from '../room/document.ts';
import { newPiece } from '../room/edit-pieces.ts';
import { emptySetDocument, readSetDocument } from '../room/read-document.ts';
import { setParameter } from '../pieces/parameters.ts';
import { measureSet, piece } from '../../test/measured.ts';

const IN = 25.4;

const setOf = (pieces: Piece[], asked: Partial<SetDocument['asked']> = {}): SetDocument => {
  const empty = emptySetDocument();
  return { ...empty, pieces, asked: { ...empty.asked, ...asked } };
};

const FOUR = { lengthMm: 2400, places: { by: 'count' as const, count: 4 } };
const bench = piece('bench', 'B1', [0, 0, 0], FOUR);
const front = benchLayout(bench).frontZMm;
/** A wall whose face stands at a height of the first axis, along the bench's depth. */
const wallAt = (xMm: number, mark: string) =>
  piece('bulkhead', mark, [xMm, front, xMm < 0 ? 90 : -90], { lengthMm: 3000, heightMm: 2400 });
const tableBefore = (lengthMm: number, xMm = 0, mark = 'T1') =>
  piece('table', mark, [xMm, front + 350, 0], { lengthMm, widthMm: 700 });
const slidePast = (...others: Piece[]) => measureSet(setOf([bench, ...others])).benches[0]?.slidePast;

describe('people to slide past', () => {
  it('nobody, where one stands up and walks away', () => {
    expect(slidePast()).toBe(0);
  });

  it('a table before all places: out at the ends, past those between', () => {
    // Places 1 2 3 4: with both ends open 2 passes 1; with one end open the last passes three.
    expect(slidePast(tableBefore(2400))).toBe(1);
    expect(slidePast(tableBefore(2400), wallAt(-1200, 'W1'))).toBe(3);
  });

  it('a gap between two tables is a way out, unless nobody gets through', () => {
    const two = (gap: number) => {
      const length = (2400 - gap) / 2;
      const at = (gap + length) / 2;
      return [tableBefore(length, -at, 'T1'), tableBefore(length, at, 'T2')];
    };
    const walls = [wallAt(-1200, 'W1'), wallAt(1200, 'W2')];
    expect(slidePast(...two(400), ...walls)).toBe(1);
    expect(slidePast(...two(200), ...walls)).toBeUndefined();
  });
});

describe('rows of seats', () => {
  const behind = (clear: number, turnDeg = 0) =>
    piece('bench', 'B2', [0, -clear - front, turnDeg], { ...FOUR });

  it('are measured from the seat front to the back of the row ahead, with the ends that lead out', () => {
    const { rows } = measureSet(setOf([bench, behind(330)]));
    expect(rows).toHaveLength(1);
    expect(rows?.[0]).toMatchObject({ marks: ['B2', 'B1'], seats: 4, openEnds: 2 });
    expect(rows?.[0]?.clearMm).toBeCloseTo(330, 6);
    const walled = measureSet(setOf([bench, behind(330), wallAt(-1250, 'W1')])).rows;
    expect(walled?.[0]?.openEnds).toBe(1);
  });

  it('are none where the benches face each other or a table stands between', () => {
    const facing = piece('bench', 'B2', [0, 2 * front + 600, 180], { ...FOUR });
    expect(measureSet(setOf([bench, facing])).rows).toEqual([]);
    expect(measureSet(setOf([bench, behind(1500), tableBefore(2000, 0)])).rows).toHaveLength(1);
    const table = piece('table', 'T1', [0, -700, 0], { lengthMm: 2000, widthMm: 600 });
    expect(measureSet(setOf([bench, behind(1500), table])).rows).toEqual([]);
  });
});

describe('tables back to back', () => {
  it('are measured edge to edge where chairs stand between them', () => {
    const t1 = piece('table', 'T1', [0, 0, 0], { lengthMm: 1000, widthMm: 700 });
    const t2 = piece('table', 'T2', [0, 700 + 1220, 0], { lengthMm: 1000, widthMm: 700 });
    // Chairs with their rear towards each other: one looks at T1 (along −z), the other at T2.
    const depth = newPiece('loose-seat', 'l', 'L9', { xMm: 0, zMm: 0, turnDeg: 0 }).seatDepthMm;
    const l1 = piece('loose-seat', 'L1', [0, 350 + depth, 180]);
    const l2 = piece('loose-seat', 'L2', [0, 350 + 1220 - depth, 0]);
    const ways = (...pieces: Piece[]) =>
      measureSet(setOf(pieces)).ways.filter(({ kind }) => kind === 'chairs-both-sides');
    expect(ways(t1, t2, l1, l2)).toMatchObject([{ marks: ['T1', 'T2'] }]);
    expect(ways(t1, t2, l1, l2)[0]?.widthMm).toBeCloseTo(1220, 6);
    expect(ways(t1, t2, l1)).toEqual([]);
  });
});

describe('clear floor', () => {
  const marked = (pieces: Piece[], asked: Partial<SetDocument['asked']>) => measureSet(setOf(pieces, asked));

  it('for turning: a circle to the nearest thing, a T where the circle is cut', () => {
    const at = { turningAt: { xMm: 0, zMm: 0 } };
    const wall = piece('bulkhead', 'W1', [0, -750, 0], { lengthMm: 4000 });
    expect(marked([wall], at).turning?.circleMm).toBeCloseTo(1500, 3);
    // A wall along one side of the square leaves no T of 60 in.
    expect(marked([wall], at).turning?.teeArmMm).toBe(0);
    // A post in a corner cuts the circle but leaves the base of a T 2 x 550 wide beside it.
    const post = piece('bulkhead', 'W1', [650, 450, 0], { lengthMm: 200, thicknessMm: 20 });
    const cut = marked([post], at).turning;
    expect(cut?.circleMm).toBeLessThan(60 * IN);
    expect(cut?.teeArmMm).toBeGreaterThanOrEqual(36 * IN);
    expect(marked([piece('table', 'T1', [0, 0, 0])], at).turning).toMatchObject({ circleMm: 0, teeArmMm: 0 });
    expect(marked([post], {}).turning).toBeUndefined();
  });

  it('along a route: its width and the length of the narrow part', () => {
    const route = [
      { xMm: 0, zMm: -2000 },
      { xMm: 0, zMm: 2000 },
    ];
    const table = (xMm: number, mark: string) =>
      piece('table', mark, [xMm, 0, 0], {
        lengthMm: 600,
        widthMm: 500,
        base: { kind: 'legs', sizeMm: 60, insetMm: 40 },
      });
    const stretches = marked([table(-732, 'T1'), table(732, 'T2')], { route }).route ?? [];
    expect(stretches.map(({ widthMm }) => Math.round(widthMm))).toEqual([3000, 864, 3000]);
    // Widths are taken every 25 mm, so a run is known that well.
    expect(Math.abs((stretches[1]?.lengthMm ?? 0) - 500)).toBeLessThanOrEqual(50);
    expect(stretches.reduce((sum, { lengthMm }) => sum + lengthMm, 0)).toBeCloseTo(4000, 6);
    const onTheLine = marked([table(0, 'T1')], { route }).route ?? [];
    expect(Math.min(...onTheLine.map(({ widthMm }) => widthMm))).toBe(0);
  });

  it('along a route between things that stand one after the other: the way slantwise between them', () => {
    const route = [
      { xMm: 0, zMm: -2000 },
      { xMm: 0, zMm: 2000 },
    ];
    const table = (xMm: number, zMm: number, mark: string) =>
      piece('table', mark, [xMm, zMm, 0], { lengthMm: 600, widthMm: 500 });
    // The tops are 600 apart across and 500 along; their legs, further in, are further apart.
    const stretches = marked([table(-600, -500, 'T1'), table(600, 500, 'T2')], { route }).route ?? [];
    const narrow = stretches.filter(({ widthMm }) => widthMm < 800);
    expect(narrow.map(({ widthMm }) => widthMm)).toEqual([expect.closeTo(Math.hypot(600, 500), 6)]);
    expect(narrow[0]?.lengthMm).toBeCloseTo(500, 6);
    expect(stretches.reduce((sum, { lengthMm }) => sum + lengthMm, 0)).toBeCloseTo(4000, 6);
  });

  it('through a turn of a route: a post in its outer corner and one at its inner corner narrow it', () => {
    const route = [
      { xMm: 0, zMm: -2000 },
      { xMm: 0, zMm: 0 },
      { xMm: 2000, zMm: 0 },
    ];
    const post = (xMm: number, zMm: number, mark: string) =>
      piece('bulkhead', mark, [xMm, zMm, 0], { lengthMm: 100, thicknessMm: 100 });
    const least = (...posts: Piece[]) =>
      Math.min(...(marked(posts, { route }).route ?? []).map(({ widthMm }) => widthMm));
    expect(least()).toBe(3000);
    // 300 square to either side of the corner, less the post's half: it lies beside neither leg.
    const outer = least(post(-300, 300, 'W1'));
    expect(outer).toBeGreaterThan(1500 + 300);
    expect(outer).toBeLessThan(1500 + Math.hypot(300, 300));
    const both = least(post(-300, 300, 'W1'), post(300, -300, 'W2'));
    expect(both).toBeCloseTo(2 * Math.hypot(250, 250), 6);
  });

  it('at the end of a bench kept accessible, at the better end', () => {
    const kept = { ...bench, accessible: true };
    const space = (...others: Piece[]) => measureSet(setOf([kept, ...others])).benches[0]?.endSpace;
    expect(space()?.lengthMm).toBeGreaterThan(1220);
    expect(space(wallAt(-1200, 'W1'), wallAt(1900, 'W2'))?.widthMm).toBeCloseTo(700, 0);
    expect(measureSet(setOf([bench])).benches[0]?.endSpace).toBeUndefined();
  });
});

describe('what a set may say', () => {
  it('leaves sets from before as they were', () => {
    const before = JSON.parse(JSON.stringify(setOf([bench]))) as SetDocument;
    expect(readSetDocument(before)).toEqual({ ok: true, value: before });
    expect(measureSet(before).benches[0]?.lumbar).toEqual({ apexMm: 0, recessMm: 0 });
  });

  it('takes the curve of a back as one', () => {
    const changed = setParameter(setOf([bench]), 'b1', 'lumbar.apexMm', 200);
    expect(changed.ok && measureSet(changed.value).benches[0]?.lumbar).toEqual({ apexMm: 200, recessMm: 0 });
    expect(changed.ok && readSetDocument(changed.value).ok).toBe(true);
    const beyond = setParameter(setOf([bench]), 'b1', 'lumbar.apexMm', 500);
    expect(!beyond.ok && beyond.error.max).toBe(400);
  });

  it('measures a beam over the floor before the seat', () => {
    const beam = (zMm: number) =>
      piece('overhead', 'O1', [0, zMm, 0], { lengthMm: 4000, depthMm: 100, undersideMm: 1950 });
    const ahead = (zMm: number) =>
      measureSet(setOf([bench, beam(zMm)])).places[0]?.overheadAhead?.undersideMm;
    expect(ahead(front + 200)).toBe(1950);
    expect(ahead(front + 400)).toBeUndefined();
    expect(ahead(front - 200)).toBeUndefined();
  });
});

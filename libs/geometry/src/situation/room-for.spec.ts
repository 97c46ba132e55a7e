import corridor from '@settlewright/seed-data/demo/corridor.json' with { type: 'json' };
import diningCar from '@settlewright/seed-data/demo/dining-car.json' with { type: 'json' };
import waitingRoom from '@settlewright/seed-data/demo/waiting-room.json' with { type: 'json' };
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyPiece } from '../../test/arbitrary-pieces.ts';
import { overlapDepth } from '../../test/convex-overlap.ts';
import { piece } from '../../test/measured.ts';
import { derivePieceParts } from '../pieces/kinds.ts';
import { parametersOf, setParameter } from '../pieces/parameters.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { Piece, SetDocument } from '../room/document.ts';
import { emptySetDocument, readSetDocument } from '../room/read-document.ts';
import { roomFor } from './room-for.ts';

const AT_MOST_TOUCHES_MM = 0.02;
const OVERLAPS_MM = 0.009;

function demo(json: unknown): SetDocument {
  const read = readSetDocument(json);
  if (!read.ok) throw new Error(read.error.code);
  return read.value;
}
const SETS: [string, SetDocument][] = [
  ...ARRANGEMENTS.map(({ id, build }): [string, SetDocument] => [id, build()]),
  ['dining car', demo(diningCar)],
  ['corridor', demo(corridor)],
  ['waiting room', demo(waitingRoom)],
];

const setOf = (...pieces: Piece[]): SetDocument => ({ ...emptySetDocument(), pieces });

/** How deep two pieces of a set reach into each other, by the tests' own measure. */
function depthBetween(document: SetDocument, one: string, other: string): number {
  const partsOf = (id: string) =>
    document.pieces.filter((each) => each.id === id).flatMap((each) => derivePieceParts(each, document));
  const theirs = partsOf(other);
  return Math.max(-Infinity, ...partsOf(one).flatMap((a) => theirs.map((b) => overlapDepth(a, b))));
}

function withValue(document: SetDocument, id: string, key: string, value: number): SetDocument {
  const set = setParameter(document, id, key, value);
  if (!set.ok) throw new Error(set.error.message);
  return set.value;
}

const lengthsOf = (one: Piece) =>
  parametersOf(one).filter(({ kind, key }) => kind === 'length' && !key.startsWith('at.'));

/** At the limit the two pieces touch; a millimetre beyond, they share something. */
function expectToTouchAt(document: SetDocument, id: string, key: string): number {
  let seen = 0;
  const parameter = lengthsOf(document.pieces.find((one) => one.id === id)!).find((one) => one.key === key)!;
  const limits = roomFor(document, id, key);
  for (const [limit, sign] of [
    [limits.most, 1],
    [limits.least, -1],
  ] as const) {
    if (limit?.beyond !== 'meets') continue;
    seen += 1;
    const words = `${id} ${key} ${limit.valueMm} at ${limit.mark}`;
    const at = withValue(document, id, key, limit.valueMm);
    expect(depthBetween(at, id, limit.pieceId), words).toBeLessThanOrEqual(AT_MOST_TOUCHES_MM);
    const further = limit.valueMm + sign;
    if (further > parameter.max || further < parameter.min) continue;
    const beyond = withValue(document, id, key, further);
    expect(depthBetween(beyond, id, limit.pieceId), words).toBeGreaterThan(OVERLAPS_MM);
  }
  return seen;
}

describe('the room a number has', () => {
  it.each(SETS)('ends where pieces touch, for every length of every piece: %s', (_, document) => {
    const seen = document.pieces.flatMap((one) =>
      lengthsOf(one).map(({ key }) => expectToTouchAt(document, one.id, key)),
    );
    if (document.pieces.length > 4) expect(seen.reduce((sum, n) => sum + n, 0)).toBeGreaterThan(5);
  });

  it('ends where pieces touch, for pieces of any size that stand near each other', () => {
    const quarter = fc.integer({ min: 0, max: 23 }).map((n) => n * 15);
    const mm = fc.integer({ min: -1500, max: 1500 });
    let seen = 0;
    fc.assert(
      fc.property(
        anyPiece,
        anyPiece,
        fc.tuple(mm, mm, quarter, quarter),
        fc.nat(),
        (a, b, [x, z, t, u], n) => {
          const one: Piece = { ...a, id: 'one', mark: 'B1', at: { xMm: 0, zMm: 0, turnDeg: t } };
          const other: Piece = { ...b, id: 'other', mark: 'B2', at: { xMm: x, zMm: z, turnDeg: u } };
          const document = setOf(one, other);
          fc.pre(depthBetween(document, 'one', 'other') < 0);
          const main = lengthsOf(one).filter(({ group }) => group === 'main');
          seen += expectToTouchAt(document, 'one', main[n % main.length]!.key);
        },
      ),
      { numRuns: 150 },
    );
    expect(seen).toBeGreaterThan(10);
  }, 60_000);

  it('is twice the gap for a bench that grows about its middle between two others', () => {
    // 1219.2 long, a gap of 300 on the right and 400 on the left: 1219.2 + 2 × 300.
    const document = setOf(
      piece('bench', 'B1', [0, 0, 0]),
      piece('bench', 'B2', [1519.2, 0, 0]),
      piece('bench', 'B3', [-1619.2, 0, 0]),
    );
    const { most, least } = roomFor(document, 'b1', 'lengthMm');
    expect(most).toEqual({ valueMm: expect.closeTo(1819.2, 1), pieceId: 'b2', mark: 'B2', beyond: 'meets' });
    expect(least).toBeUndefined();
  });

  it('is the gap alone where the other end stays at its wall', () => {
    const document = setOf(
      piece('bench', 'B1', [609.6, 0, 0]),
      piece('bench', 'B2', [2428.8, 0, 0]),
      piece('bulkhead', 'W1', [0, 400, 90]),
    );
    // From the wall at 0 to the left end of B2 at 2428.8 − 609.6.
    expect(roomFor(document, 'b1', 'lengthMm').most?.valueMm).toBeCloseTo(1819.2, 1);
  });

  it('is nothing where nothing stands in the way', () => {
    const document = setOf(piece('bench', 'B1', [0, 0, 0]), piece('table', 'T1', [0, 4000, 0]));
    expect(roomFor(document, 'b1', 'lengthMm')).toEqual({});
    expect(roomFor(document, 'b1', 'at.xMm')).toEqual({});
    expect(roomFor(document, 'b1', 'backLeanDeg')).toEqual({});
    expect(roomFor(document, 'zz', 'lengthMm')).toEqual({});
  });

  it('lies below a number that is too large already', () => {
    const document = setOf(piece('bench', 'B1', [0, 0, 0]), piece('bulkhead', 'W1', [500, 400, -90]));
    // The wall's face looks towards the bench 500 from its middle; the bench reaches 609.6.
    expect(roomFor(document, 'b1', 'lengthMm').most).toMatchObject({
      valueMm: expect.closeTo(1000, 1),
      mark: 'W1',
    });
  });

  it('stops a table at the soffit above it and at the seat below it', () => {
    const bench = piece('bench', 'B1', [0, 0, 0], { backHeightMm: 0, seatTiltDeg: 0 });
    const seatTop = bench.deckHeightMm + bench.seatCushion.thicknessMm;
    const table = piece('table', 'T1', [0, 700, 0], { heightMm: 736.6 });
    const soffit = piece('overhead', 'O1', [0, 700, 0], { undersideMm: 900 });
    const { most, least } = roomFor(setOf(bench, table, soffit), 't1', 'heightMm');
    expect(most).toMatchObject({ valueMm: expect.closeTo(900, 1), mark: 'O1' });
    expect(least).toMatchObject({ valueMm: expect.closeTo(seatTop + table.topThicknessMm, 1), mark: 'B1' });
    expect(roomFor(setOf(bench, table, soffit), 'o1', 'undersideMm').least).toMatchObject({
      valueMm: expect.closeTo(736.6, 1),
      mark: 'T1',
    });
  });

  it('does not overlook a thin sill that a table top would pass through', () => {
    const table = piece('table', 'T1', [0, 0, 0], { heightMm: 500, topThicknessMm: 6 });
    const opening = { widthMm: 0, heightMm: 0, frameMm: 0 };
    const sill = piece('sill', 'S1', [0, 0, 0], { heightMm: 803, thicknessMm: 6, opening });
    expect(roomFor(setOf(table, sill), 't1', 'heightMm').most).toMatchObject({
      valueMm: expect.closeTo(797, 1),
      mark: 'S1',
    });
  });

  it('keeps a window inside its wall, and the wall around its window', () => {
    const wall = piece('bulkhead', 'W1', [0, 0, 0], { lengthMm: 2400, heightMm: 2000 });
    const opening = { widthMm: 900, heightMm: 700, frameMm: 50 };
    const sill = piece('sill', 'S1', [200, 0, 0], { heightMm: 700, opening });
    const document = setOf(wall, sill);
    // 1200 − 200 to the right end, the frame of 50 off it: half the width is 950.
    const leaves = (valueMm: number, mark: string) => ({
      valueMm: expect.closeTo(valueMm, 1),
      mark,
      beyond: 'leaves',
    });
    expect(roomFor(document, 's1', 'opening.widthMm').most).toMatchObject(leaves(1900, 'W1'));
    expect(roomFor(document, 's1', 'opening.heightMm').most).toMatchObject(leaves(1200, 'W1'));
    expect(roomFor(document, 's1', 'heightMm').most).toMatchObject(leaves(1200, 'W1'));
    expect(roomFor(document, 'w1', 'lengthMm').least).toMatchObject(leaves(1400, 'S1'));
    expect(roomFor(document, 'w1', 'heightMm').least).toMatchObject(leaves(1500, 'S1'));
  });

  it('is the same wherever the set stands', () => {
    const [, car] = SETS.find(([id]) => id === 'dining car')!;
    const moved = {
      ...car,
      pieces: car.pieces.map((one) => ({
        ...one,
        at: { ...one.at, xMm: one.at.xMm + 911, zMm: one.at.zMm - 77 },
      })),
    };
    for (const [id, key] of [
      ['t1', 'lengthMm'],
      ['t1', 'widthMm'],
      ['s1', 'lengthMm'],
    ] as const) {
      const id0 = car.pieces.find(({ mark }) => mark.toLowerCase() === id)!.id;
      const [here, there] = [roomFor(car, id0, key).most, roomFor(moved, id0, key).most];
      expect(there).toMatchObject({ mark: here?.mark, valueMm: expect.closeTo(here?.valueMm ?? NaN, 1) });
    }
  });
});

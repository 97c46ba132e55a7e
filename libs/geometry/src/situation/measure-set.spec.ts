import type { SetSituation } from '@settlewright/anthropometry';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { setParameter } from '../pieces/parameters.ts';
import type { Piece, PieceKind, SetDocument } from '../room/document.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { addPiece } from '../room/edit-pieces.ts';
import { emptySetDocument } from '../room/read-document.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { measureSet, piece } from '../../test/measured.ts';

const INCH = 25.4;

const setOf = (...pieces: Piece[]): SetDocument => ({ ...emptySetDocument(), pieces });

const set = (document: SetDocument, id: string, key: string, value: number | string): SetDocument => {
  const changed = setParameter(document, id, key, value);
  if (!changed.ok) throw new Error(changed.error.message);
  return changed.value;
};

const placeOf = (situation: SetSituation, placeId: string) => {
  const place = situation.places.find((one) => one.placeId === placeId);
  if (place === undefined) throw new Error(`no place ${placeId}`);
  return place;
};

/** The same set carried somewhere else and turned as a whole. */
function carried(document: SetDocument, byX: number, byZ: number, turnDeg: number): SetDocument {
  const [c, s] = [Math.cos((turnDeg * Math.PI) / 180), Math.sin((turnDeg * Math.PI) / 180)];
  const pieces = document.pieces.map((one) => {
    const { xMm, zMm, turnDeg: own } = one.at;
    return {
      ...one,
      at: {
        xMm: xMm * c + zMm * s + byX,
        zMm: -xMm * s + zMm * c + byZ,
        turnDeg: ((own + turnDeg + 540) % 360) - 180,
      },
    };
  });
  return { ...document, pieces };
}

/** Numbers of two situations side by side; the rest must be equal. */
function expectSame(one: unknown, other: unknown, path = ''): void {
  if (typeof one === 'number' && typeof other === 'number') {
    if (Math.abs(one - other) > 1e-6) throw new Error(`${path}: ${one} became ${other}`);
    return;
  }
  if (typeof one === 'object' && one !== null && typeof other === 'object' && other !== null) {
    expect(Object.keys(other), path).toEqual(Object.keys(one));
    for (const [key, value] of Object.entries(one)) {
      expectSame(value, (other as Record<string, unknown>)[key], `${path}.${key}`);
    }
    return;
  }
  expect(other, path).toEqual(one);
}

/** Two facing benches across a table at a window, to the sizes of the demonstration set. */
function diningBay(): SetDocument {
  const start = piece('bench', 'B1', [0, 22 * INCH, 90], {
    lengthMm: 44 * INCH,
    deckHeightMm: 15 * INCH,
    seatDepthMm: 17.5 * INCH,
    backHeightMm: 30 * INCH,
    lipMm: INCH,
    kick: { depthMm: 1.5 * INCH, heightMm: 4 * INCH },
  });
  const front = benchLayout(start).frontZMm;
  const far = 2 * front + 22 * INCH;
  return setOf(
    start,
    { ...start, id: 'b2', mark: 'B2', at: { xMm: far, zMm: 22 * INCH, turnDeg: -90 } },
    piece('table', 'T1', [far / 2, 20 * INCH, 90], {
      lengthMm: 40 * INCH,
      widthMm: 28 * INCH,
      heightMm: 29.5 * INCH,
      topThicknessMm: 1.25 * INCH,
    }),
    piece('sill', 'S1', [far / 2, 0, 0], {
      lengthMm: far - 2 * benchLayout(start).faceZMm,
      heightMm: 27.5 * INCH,
      depthMm: 4 * INCH,
    }),
    piece('bulkhead', 'W1', [far / 2, 0, 0], { lengthMm: far }),
  );
}

describe('a bay of the demonstration dining car', () => {
  const situation = measureSet(diningBay());
  const place = placeOf(situation, 'b1:2');

  it('measures the seat', () => {
    expect(place.seatTopFrontMm).toBeCloseTo(18.75 * INCH, 6);
    // 12.19 in behind the front edge (17.5 in less 135 mm) at 2° it is 0.426 in lower.
    expect(place.seatTopHipMm / INCH).toBeCloseTo(18.75 - (17.5 - 135 / INCH) * Math.tan(Math.PI / 90), 6);
    expect(place.effectiveDepthMm).toBeCloseTo(17.5 * INCH, 6);
    expect(place.widthMm).toBeCloseTo(22 * INCH, 6);
    expect(place.heelRoomMm).toBeCloseTo(2.5 * INCH, 6);
  });

  it('measures the table over the lap', () => {
    expect(place.table).toMatchObject({ mark: 'T1', topMm: 29.5 * INCH, topThicknessMm: 1.25 * INCH });
    expect(place.table?.undersideMm).toBeCloseTo(28.25 * INCH, 6);
    expect(place.table?.overlapMm).toBeCloseTo(3 * INCH, 6);
    // 22 in between the seat fronts and 3 in of overlap; 2 1/2 in more to the kick at the floor.
    expect(placeOf(situation, 'b1:1').table?.footDepthMm).toBeCloseTo(27.5 * INCH, 6);
    expect(situation.tables[0]?.edges.map(({ name, placeIds }) => [name, placeIds.length])).toEqual([
      ['front', 2],
      ['back', 2],
    ]);
  });

  it('finds the sill beside the window places only, on the right hand', () => {
    // Centre 11 in from the wall, sill 4 in deep.
    expect(place.sills).toMatchObject([{ mark: 'S1', side: 'left', topMm: 27.5 * INCH }]);
    expect(place.sills[0]?.centreToEdgeMm).toBeCloseTo(7 * INCH, 6);
    expect(placeOf(situation, 'b2:1').sills).toMatchObject([{ side: 'right' }]);
    expect(placeOf(situation, 'b1:1').sills).toEqual([]);
    expect(place.wallMm.left).toBeCloseTo(11 * INCH, 6);
  });

  it('finds the benches that face each other', () => {
    expect(situation.facing).toHaveLength(1);
    expect(situation.tables[0]?.betweenFacingMm).toBeCloseTo(28 * INCH, 6);
    expect(situation.facing[0]?.gapMm).toBeCloseTo(22 * INCH, 6);
    expect(situation.facing[0]?.pairs).toEqual([
      ['b1:1', 'b2:2'],
      ['b1:2', 'b2:1'],
    ]);
  });
});

describe('measuring', () => {
  const sets = [...ARRANGEMENTS.map(({ build }) => build()), diningBay()];

  it('does not change when the whole set is moved and turned', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...sets),
        fc.double({ min: -9000, max: 9000, noNaN: true }),
        fc.double({ min: -9000, max: 9000, noNaN: true }),
        fc.double({ min: -180, max: 180, noNaN: true }),
        (document, byX, byZ, turn) =>
          expectSame(measureSet(document), measureSet(carried(document, byX, byZ, turn))),
      ),
      { numRuns: 60 },
    );
  }, 30_000);

  it('lowers the table over the seat by what the seat is raised', () => {
    fc.assert(
      fc.property(fc.double({ min: -80, max: 80, noNaN: true }), (by) => {
        const before = diningBay();
        const after = set(before, 'b1', 'pressedSeatHeight', 457.2 + by);
        const from = set(before, 'b1', 'pressedSeatHeight', 457.2);
        const room = (document: SetDocument) => {
          const place = placeOf(measureSet(document), 'b1:1');
          return (place.table?.undersideMm ?? 0) - place.seatTopHipMm;
        };
        expect(room(from) - room(after)).toBeCloseTo(by, 6);
      }),
      { numRuns: 40 },
    );
  }, 30_000);

  it('does not notice a piece far away', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...sets),
        fc.constantFrom<PieceKind>('table', 'sill', 'bulkhead', 'overhead'),
        fc.double({ min: 0, max: 2 * Math.PI, noNaN: true }),
        (document, kind, angle) => {
          const at = { xMm: 20000 * Math.cos(angle), zMm: 20000 * Math.sin(angle), turnDeg: 30 };
          const before = measureSet(document);
          const after = measureSet(addPiece(document, kind, at, 'far').document);
          expectSame(before, { ...after, tables: after.tables.filter(({ pieceId }) => pieceId !== 'far') });
        },
      ),
      { numRuns: 40 },
    );
  }, 30_000);
});

describe('the table of a place', () => {
  const bench = piece('bench', 'B1', [0, 0, 0], { lengthMm: 700, places: { by: 'count', count: 1 } });
  const front = benchLayout(bench).frontZMm;

  it('is the one that covers most of the strip over the lap', () => {
    // The strip runs 260 mm to either hand; T2 reaches 200 mm into it, T1 the other 320 mm.
    const left = piece('table', 'T1', [-440, front + 350, 0], { lengthMm: 1000 });
    const right = piece('table', 'T2', [560, front + 350, 0], { lengthMm: 1000 });
    const place = placeOf(measureSet(setOf(bench, right, left)), 'b1:1');
    expect(place.table?.mark).toBe('T1');
  });

  it('counts an apron only where it hangs over the lap', () => {
    const table = piece('table', 'T1', [0, front + 350, 0], {
      widthMm: 760,
      heightMm: 750,
      topThicknessMm: 30,
      apron: { heightMm: 80, insetMm: 50 },
    });
    expect(placeOf(measureSet(setOf(bench, table)), 'b1:1').table?.undersideMm).toBeCloseTo(640, 6);
    const farApron = { ...table, apron: { heightMm: 80, insetMm: 350 } };
    expect(placeOf(measureSet(setOf(bench, farApron)), 'b1:1').table?.undersideMm).toBeCloseTo(720, 6);
  });

  it('measures knees and feet to the nearest thing in the strip', () => {
    const table = piece('table', 'T1', [0, front + 400, 0], {
      widthMm: 800,
      base: { kind: 'columns', count: 1, diameterMm: 100, footLengthMm: 400, footHeightMm: 50 },
    });
    // Edge in line with the seat front: column face 400 − 50, tip of the foot 400 − 200.
    const place = placeOf(measureSet(setOf(bench, table)), 'b1:1');
    expect(place.table?.overlapMm).toBeCloseTo(0, 6);
    expect(place.table?.kneeDepthMm).toBeCloseTo(350, 1);
    expect(place.table?.footDepthMm).toBeCloseTo(200, 6);
    const onEnds = {
      ...table,
      lengthMm: 1600,
      base: { kind: 'trestles' as const, insetMm: 100, thicknessMm: 50 },
    };
    const free = placeOf(measureSet(setOf(bench, onEnds)), 'b1:1').table;
    expect(free?.kneeDepthMm).toBeUndefined();
    expect(free?.footDepthMm).toBeUndefined();
  });

  it('reports a gap as a negative overlap', () => {
    const table = piece('table', 'T1', [0, front + 381 + 50, 0], { widthMm: 762 });
    expect(placeOf(measureSet(setOf(bench, table)), 'b1:1').table?.overlapMm).toBeCloseTo(-50, 6);
  });
});

describe('corners of an L', () => {
  const plain = {
    ends: {
      left: { kind: 'open', thicknessMm: 0, heightMm: 0 },
      right: { kind: 'open', thicknessMm: 0, heightMm: 0 },
    },
  } as const;
  const through = piece('bench', 'B1', [0, 0, 0], {
    lengthMm: 2400,
    places: { by: 'width', widthMm: 600 },
    ...plain,
  });
  const front = benchLayout(through).frontZMm;
  // Stands at the left end of B1, looks along it, and butts against its front.
  const butting = piece('bench', 'B2', [-1200, front + 700, 90], {
    lengthMm: 1400,
    places: { by: 'width', widthMm: 600 },
    ...plain,
  });
  const situation = measureSet(setOf(through, butting));

  it('seats nobody in the square of the corner', () => {
    const free = 2400 - front;
    expect(situation.places.filter(({ pieceId }) => pieceId === 'b1')).toHaveLength(Math.floor(free / 600));
    expect(situation.places.filter(({ pieceId }) => pieceId === 'b2')).toHaveLength(2);
  });

  it('leaves the spare length to the knees beyond the corner, on both legs', () => {
    const spare = (2400 - front) % 600;
    const [first, second] = situation.corners;
    expect(first).toMatchObject({ pieceIds: ['b1', 'b2'], placeId: 'b1:1', widthMm: 600 });
    expect(first?.centreFromFrontMm).toBeCloseTo(spare + 300, 6);
    expect(second).toMatchObject({ pieceIds: ['b2', 'b1'], placeId: 'b2:2' });
    expect(second?.centreFromFrontMm).toBeCloseTo(200 + 300, 6);
  });

  it('makes no corner of benches back to back', () => {
    const away = { ...butting, at: { ...butting.at, turnDeg: -90 } };
    expect(measureSet(setOf(through, away)).corners).toEqual([]);
  });
});

describe('ways and what is round a place', () => {
  const bench = piece('bench', 'B1', [0, 0, 0], { lengthMm: 3000, places: { by: 'count', count: 5 } });
  const front = benchLayout(bench).frontZMm;

  it('measures the way between the tables of a bench once', () => {
    const tables = [-900, 900].map((x, i) =>
      piece('table', `T${i + 1}`, [x, front + 350, 0], { lengthMm: 1200 }),
    );
    // Middles 1800 apart, tops 1200 long.
    expect(measureSet(setOf(bench, ...tables)).ways).toEqual([
      {
        kind: 'between-tables',
        pieceIds: ['t1', 't2'],
        marks: ['T1', 'T2'],
        widthMm: expect.closeTo(600, 6),
      },
    ]);
  });

  it('measures behind a loose seat from the table edge to the wall', () => {
    const table = piece('table', 'T1', [0, 0, 0], { lengthMm: 1000, widthMm: 700 });
    const seat = piece('loose-seat', 'L1', [0, 350 + 400, 180], { seatDepthMm: 400 });
    const wall = piece('bulkhead', 'W1', [0, 350 + 950, 180]);
    const { ways, tables } = measureSet(setOf(table, seat, wall));
    expect(ways).toMatchObject([
      { kind: 'behind-seat', marks: ['L1', 'T1'], widthMm: expect.closeTo(950, 6) },
    ]);
    expect(tables[0]?.edges).toMatchObject([{ name: 'front', placeIds: ['l1:1'] }]);
  });

  it('finds the lowest beam over the head and no other', () => {
    const [low, high] = [1400, 2000].map((undersideMm, i) =>
      piece('overhead', `O${i + 1}`, [0, front - 300, 0], { undersideMm, lengthMm: 400 }),
    ) as [Piece, Piece];
    const situation = measureSet(setOf(bench, low, high));
    expect(placeOf(situation, 'b1:3').overhead).toMatchObject({
      mark: 'O1',
      undersideMm: expect.closeTo(1400, 6),
    });
    expect(placeOf(situation, 'b1:1').overhead).toBeUndefined();
  });

  it('measures to an end wall but not to an arm', () => {
    const walled = {
      ...bench,
      ends: {
        left: { kind: 'wall', thicknessMm: 50, heightMm: 900 },
        right: { kind: 'arm', thicknessMm: 50, heightMm: 250 },
      },
    } as const;
    const { places } = measureSet(setOf(walled));
    // 2900 between the ends, five places of 580.
    expect(places[0]?.wallMm).toEqual({ right: expect.closeTo(290, 6) });
    expect(places[4]?.wallMm.left).toBeUndefined();
  });

  it('says whether a bench stands at a wall', () => {
    const wall = piece('bulkhead', 'W1', [0, -10, 0], { lengthMm: 4000 });
    expect(measureSet(setOf(bench, wall)).benches[0]?.back?.fixedToWall).toBe(true);
    expect(measureSet(setOf(bench)).benches[0]?.back?.fixedToWall).toBe(false);
    const backless = { ...bench, backHeightMm: 0 };
    expect(measureSet(setOf(backless)).benches[0]?.back).toBeUndefined();
    expect(measureSet(setOf(backless, wall)).benches[0]?.back).toMatchObject({
      fixedToWall: true,
      gapToSeatMm: 10,
    });
  });

  it('faces the side benches of a U across its rear bench', () => {
    const booth = ARRANGEMENTS.find(({ id }) => id === 'u-booth')?.build() ?? setOf();
    const { facing, corners } = measureSet(booth);
    // One place of 24 in and twice 9 in for the knees beyond the corners.
    expect(facing).toMatchObject([{ marks: ['B2', 'B3'], gapMm: expect.closeTo(609.6 + 457.2, 6) }]);
    expect(facing[0]?.pairs).toEqual([
      ['b2:1', 'b3:2'],
      ['b2:2', 'b3:1'],
    ]);
    expect(corners).toHaveLength(4);
    for (const { centreFromFrontMm } of corners) expect(centreFromFrontMm).toBeGreaterThan(304.8 + 224);
  });

  it('faces benches within 15 degrees and not through a third', () => {
    const opposite = (turnDeg: number) =>
      piece('bench', 'B2', [0, 2 * front + 600, turnDeg], { lengthMm: 1200 });
    const gap = (turn: number) =>
      measureSet(setOf({ ...bench, lengthMm: 1200 }, opposite(turn))).facing[0]?.gapMm;
    expect(gap(180)).toBeCloseTo(600, 6);
    expect(gap(170)).toBeLessThan(600);
    expect(gap(160)).toBeUndefined();
    const wall = piece('bulkhead', 'W1', [0, front + 300, 0], { lengthMm: 1200 });
    expect(measureSet(setOf({ ...bench, lengthMm: 1200 }, opposite(180), wall)).facing).toEqual([]);
  });
});

describe('knee space under a table (ADA 306.3)', () => {
  const table = piece('table', 'T1', [0, 0, 0], {
    lengthMm: 1200,
    widthMm: 900,
    heightMm: 760,
    topThicknessMm: 30,
    accessible: true,
    base: { kind: 'legs', sizeMm: 60, insetMm: 40 },
  });

  it('is free to 25 in between legs', () => {
    const { kneeSpace } = measureSet(setOf(table)).tables[0] ?? {};
    // Legs 60 wide, set in 40 at both ends: 1200 − 2 × 100.
    expect(kneeSpace?.widthMm).toBeCloseTo(1000, 6);
    expect(kneeSpace?.clearHeightMm).toBeCloseTo(730, 6);
    expect(kneeSpace?.depthAt.map(({ depthMm }) => depthMm)).toEqual(Array(7).fill(635));
    expect(kneeSpace?.toeDepthMm).toBe(635);
  });

  it('ends at an apron that hangs below 27 in, and at a wall', () => {
    const apron = { ...table, apron: { heightMm: 60, insetMm: 100 } };
    const wall = piece('bulkhead', 'W1', [0, 50, 0]);
    const under = measureSet(setOf(apron, wall)).tables[0]?.kneeSpace;
    // Apron from 670 to 730: in the way at 685.8 (27 in) only; boards of the wall stand 400 mm in from the front edge.
    expect(under?.clearHeightMm).toBeCloseTo(670, 6);
    expect(under?.depthAt.at(-1)?.depthMm).toBeCloseTo(100, 6);
    expect(under?.depthAt[0]?.depthMm).toBeCloseTo(400, 6);
    expect(under?.toeDepthMm).toBeCloseTo(400, 6);
  });
});

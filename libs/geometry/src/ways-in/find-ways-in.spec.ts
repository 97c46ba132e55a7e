import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { benchLayout } from '../pieces/bench-layout.ts';
import { placeFramesOf } from '../pieces/place-frames.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { Piece, SetDocument } from '../room/document.ts';
import { emptySetDocument } from '../room/read-document.ts';
import { piece } from '../../test/measured.ts';
import { wallsAlong } from '../../test/walled.ts';
import { findWaysIn, type Comer } from './find-ways-in.ts';
import type { WalkerMeasures } from './walker.ts';

const IN = 25.4;
/** Trunk 510 by 255 in light clothes, thighs 180 deep. */
const MEASURES: WalkerMeasures = {
  stature: 1756,
  hip_breadth: 340,
  bideltoid_breadth: 500,
  waist_breadth: 320,
  thigh_clearance: 180,
  buttock_depth: 248,
  chest_depth: 250,
  abdominal_extension_depth_sitting: 255,
  buttock_popliteal_length: 500,
  buttock_knee_length: 615,
  acromial_height_sitting: 590,
  hip_breadth_sitting: 380,
};

const setOf = (pieces: Piece[], asked: Partial<SetDocument['asked']> = {}): SetDocument => {
  const empty = emptySetDocument();
  return { ...empty, pieces, asked: { ...empty.asked, ...asked } };
};
const everyone = (document: SetDocument, measures = MEASURES): Comer[] =>
  placeFramesOf(document).map(({ placeId }) => ({ placeId, measures, shoeMm: 25, clothing: 'light' }));
const waysIn = (document: SetDocument, measures = MEASURES) =>
  findWaysIn(document, everyone(document, measures), [200, 1200]);
const way = (document: SetDocument, placeId: string, measures = MEASURES) => {
  const [found] = findWaysIn(
    document,
    everyone(document, measures).filter((comer) => comer.placeId === placeId),
    [200, 1200],
  ).ways;
  if (!found) throw new Error(`no place ${placeId}`);
  return found;
};
const arrangement = (id: string): SetDocument => {
  const build = ARRANGEMENTS.find((one) => one.id === id)?.build;
  if (!build) throw new Error(id);
  return build();
};

/** A closed room with a stool in it and one gap in its front wall. */
const roomWithGap = (gapMm: number, atX = 130): SetDocument =>
  setOf([
    piece('loose-seat', 'L1', [0, 0, 0], { backHeightMm: 0 }),
    ...wallsAlong([
      [atX - gapMm / 2, 1200],
      [-1300, 1200],
      [-1300, -1100],
      [1300, -1100],
      [1300, 1200],
      [atX + gapMm / 2, 1200],
    ]),
  ]);

describe('a gap between two walls', () => {
  it.each([
    [330, 37.5],
    [300, 22.5],
    [280, 12.5],
    [240, -7.5],
  ])('of %s leaves %s on each side of a body 255 deep', (gapMm, clearMm) => {
    const found = way(roomWithGap(gapMm), 'l1:1');
    expect(found.tightest?.clearMm).toBeCloseTo(clearMm, 1);
    expect(found.tightest?.widthMm).toBeCloseTo(gapMm, 0);
    expect(found.tightest?.band).toBe('trunk');
    expect(found.passes).toBe(clearMm >= 0);
    expect(found.tightest?.between.map(({ mark }) => mark).sort()).toEqual(['W1', 'W5']);
  });

  it('lets a deeper body through as far as it is wide', () => {
    const deep = (mm: number) => ({ ...MEASURES, abdominal_extension_depth_sitting: mm });
    expect(way(roomWithGap(300), 'l1:1', deep(299)).passes).toBe(true);
    expect(way(roomWithGap(300), 'l1:1', deep(301)).passes).toBe(false);
  });

  it('never narrows what is tightest when it grows', { timeout: 60_000 }, () => {
    const clear = (mm: number) => way(roomWithGap(mm), 'l1:1').tightest?.clearMm ?? 150;
    fc.assert(
      fc.property(fc.integer({ min: 200, max: 520 }), fc.integer({ min: 1, max: 60 }), (gap, more) => {
        expect(clear(gap + more)).toBeGreaterThanOrEqual(clear(gap) - 0.1);
      }),
      { numRuns: 4 },
    );
  });

  it('is no way in where there is none', () => {
    const closed = way(roomWithGap(60), 'l1:1');
    expect(closed).toMatchObject({ passes: false, steps: [], past: [] });
    expect(closed.tightest).toBeUndefined();
  });
});

describe('a right-angled corner', () => {
  /** Least over the angle of what a line may be long that keeps a distance from walls and corner. */
  const longest = (a: number, b: number, off: number) =>
    Math.min(
      ...Array.from({ length: 999 }, (_, n) => {
        const t = ((n + 1) / 1000) * (Math.PI / 2);
        return (a - off) / Math.sin(t) + (b - off) / Math.cos(t) - off / (Math.sin(t) * Math.cos(t));
      }),
    );
  const corridors = (a: number, b: number): SetDocument =>
    setOf(
      [
        // Out of a chamber along z, a wide, then along x, b wide; the inner corner at (a, 0).
        piece('loose-seat', 'L1', [a / 2, 2200, 180], { backHeightMm: 0 }),
        ...wallsAlong([
          [2600, 0],
          [a, 0],
          [a, 1000],
          [a + 500, 1000],
          [a + 500, 2800],
          [-500, 2800],
          [-500, 1000],
          [0, 1000],
          [0, -b],
          [2600, -b],
        ]),
      ],
      {
        route: [
          { xMm: 2500, zMm: -b / 2 },
          { xMm: 1500, zMm: -b / 2 },
        ],
      },
    );

  it.each([
    [400, 400],
    [380, 430],
  ])('of corridors %s and %s passes a body by the published formula', (a, b) => {
    let [low, high] = [-100, Math.min(a, b) / 2 - 127.5];
    for (let n = 0; n < 40; n += 1) {
      const clear = (low + high) / 2;
      if (longest(a, b, 127.5 + clear) >= 255) low = clear;
      else high = clear;
    }
    const found = way(corridors(a, b), 'l1:1').tightest;
    expect(found?.clearMm).toBeGreaterThan(low - 3);
    expect(found?.clearMm).toBeLessThan(low + 0.5);
  });
});

describe('height bands', () => {
  const row = (gapMm: number, heightMm: number, seatDepthMm?: number): SetDocument => {
    const b1 = piece('bench', 'B1', [0, 0, 0], {
      lengthMm: 1800,
      places: { by: 'count', count: 3 },
      // Ends as high as the back: nobody slides in from the side.
      ends: {
        left: { kind: 'wall', thicknessMm: 25, heightMm: 800 },
        right: { kind: 'wall', thicknessMm: 25, heightMm: 800 },
      },
      ...(seatDepthMm ? { seatDepthMm } : {}),
    });
    const front = benchLayout(b1).frontZMm;
    const table = piece('table', 'T1', [0, front + gapMm + 350, 0], {
      lengthMm: 1800,
      widthMm: 700,
      heightMm,
    });
    const walls = wallsAlong([
      [-900, front + gapMm + 700],
      [-900, 0],
    ]);
    return setOf([
      b1,
      table,
      ...walls,
      piece('bulkhead', 'W9', [0, front + gapMm + 700, 180], { lengthMm: 1800 }),
    ]);
  };

  it('let the trunk lean over a table that the thighs go past', () => {
    const low = way(row(240, 720), 'b1:1');
    expect(low.passes).toBe(true);
    // A counter as high as the belly holds the trunk itself.
    const high = way(row(240, 1100), 'b1:1');
    expect(high.tightest?.clearMm ?? 150).toBeLessThan(low.tightest?.clearMm ?? 150);
  });

  it('tell who stands up, who sits later and whom one passes', () => {
    // Knees 615 - 350 = 265 before the seat: 380 leaves 115, too little; standing legs of 180 leave 200.
    const up = waysIn(row(380, 720, 350)).ways;
    expect(up[0]?.past).toEqual([
      { placeId: 'b1:2', how: 'stands-up' },
      { placeId: 'b1:3', how: 'stands-up' },
    ]);
    const apart = waysIn(row(900, 720, 350)).ways;
    expect(apart.map(({ past }) => past)).toEqual([[], [], []]);
  });
});

describe('a way past fewer people', () => {
  it('is offered beside the widest one', () => {
    // Two gaps lead to the stool: the wide one past somebody's knees, the narrow one past nobody.
    const set = setOf([
      piece('loose-seat', 'L1', [0, 0, 0], { backHeightMm: 0 }),
      piece('loose-seat', 'L2', [1250, 950, -90], { backHeightMm: 0 }),
      ...wallsAlong([
        [400, 1200],
        [-800, 1200],
      ]),
      ...wallsAlong(
        [
          [-1150, 1200],
          [-1300, 1200],
          [-1300, -1100],
          [1300, -1100],
          [1300, 1200],
          [1000, 1200],
        ],
        'V',
      ),
    ]);
    const { ways } = waysIn(set);
    const stool = ways.find(({ placeId }) => placeId === 'l1:1');
    expect(stool?.past).toEqual([]);
    expect(stool?.freer).toMatchObject({ past: [], insteadOf: ['l2:1'] });
    expect(stool?.freer?.tightest?.clearMm).toBeLessThan(stool?.tightest?.clearMm ?? 150);
    expect(stool?.freer?.tightest?.clearMm).toBeCloseTo((350 - 255) / 2, 0);
  });
});

describe('the order in which to sit', () => {
  it('is innermost first where one slides', () => {
    const { ways, order } = waysIn(arrangement('facing-benches'));
    expect(ways.find(({ placeId }) => placeId === 'b1:2')?.past).toEqual([
      { placeId: 'b1:1', how: 'sits-later' },
    ]);
    expect(order.placeIds.indexOf('b1:2')).toBeLessThan(order.placeIds.indexOf('b1:1'));
    expect(order.placeIds.indexOf('b2:1')).toBeLessThan(order.placeIds.indexOf('b2:2'));
    expect(order.knotted).toEqual([]);
  });

  it('begins in the middle of a U, round its corner', () => {
    const { ways, order } = waysIn(arrangement('u-booth'));
    expect(order.placeIds[0]).toBe('b1:1');
    expect(ways.every(({ passes }) => passes)).toBe(true);
    expect(ways[0]?.steps.map(({ move }) => move)).toContain('slide');
  });
});

describe('tables and chairs', () => {
  it('tables 12 in apart let somebody of 180 at the thighs through', () => {
    const banquette = (gapMm: number): SetDocument => {
      const b1 = piece('bench', 'B1', [0, 0, 0], { lengthMm: 2400, places: { by: 'count', count: 3 } });
      const front = benchLayout(b1).frontZMm;
      const at = gapMm / 2 + 600;
      const walls = wallsAlong([
        [-1200, 1600],
        [-1200, 0],
      ]).concat(
        wallsAlong(
          [
            [1200, 0],
            [1200, 1600],
          ],
          'V',
        ),
      );
      return setOf([
        b1,
        ...[-at, at].map((x, i) =>
          piece('table', `T${i + 1}`, [x, front + 340, 0], { lengthMm: 1200, widthMm: 700, heightMm: 740 }),
        ),
        ...walls,
      ]);
    };
    const found = way(banquette(12 * IN), 'b1:2');
    expect(found.passes).toBe(true);
    expect(found.tightest?.widthMm).toBeLessThanOrEqual(12 * IN + 0.5);
    expect(way(banquette(170), 'b1:2').passes).toBe(false);
  });

  it('takes out a chair that bars the only way', () => {
    const open = roomWithGap(400, 0);
    const bar = piece('loose-seat', 'L2', [0, 1000, 0], { widthMm: 700, seatDepthMm: 420 });
    const found = way({ ...open, pieces: [...open.pieces, bar] }, 'l1:1');
    expect(found.chairs).toEqual([{ pieceId: 'l2', mark: 'L2' }]);
    expect(found.passes).toBe(true);
  });

  it('drops the leaf that bars the only way, unless nothing may be moved', () => {
    const open = roomWithGap(600, 0);
    // The leaf reaches across the gap; hanging, it leaves 600 - 60 - 30 of it.
    const table = piece('table', 'T1', [-340, 1300, 0], {
      lengthMm: 200,
      widthMm: 300,
      heightMm: 740,
      topThicknessMm: 30,
      leaves: { right: { widthMm: 480, down: false } },
    });
    const set = {
      ...open,
      pieces: [
        ...open.pieces,
        table,
        ...wallsAlong(
          [
            [-240, 1500],
            [-240, 1200],
          ],
          'V',
        ),
        ...wallsAlong(
          [
            [300, 1200],
            [300, 1500],
          ],
          'U',
        ),
      ],
    };
    const found = way(set, 'l1:1');
    expect(found).toMatchObject({
      passes: true,
      leaves: [{ pieceId: 't1', mark: 'T1', edge: 'right', down: true }],
      chairs: [],
    });
    const kept = findWaysIn(set, everyone(set).slice(0, 1), [200, 1200], { chairs: false, leaves: false });
    expect(kept.ways[0]).toMatchObject({ passes: false, leaves: [] });
  });

  it('starts at the entrance where the set has one, whatever the route', () => {
    const set = roomWithGap(400);
    const asked = {
      ...set.asked,
      entrance: { xMm: -2200, zMm: 2200 },
      route: [
        { xMm: 2200, zMm: 2200 },
        { xMm: 0, zMm: 1500 },
      ],
    };
    const found = way({ ...set, asked }, 'l1:1');
    const [first] = found.steps[0]?.poses ?? [];
    expect(found.from).toBe('entrance');
    expect(Math.hypot((first?.xMm ?? 0) + 2200, (first?.zMm ?? 0) - 2200)).toBeLessThan(80);
  });

  it('starts at the start of the route where the set keeps one', () => {
    const set = roomWithGap(400);
    const route = [
      { xMm: 2200, zMm: 2200 },
      { xMm: 0, zMm: 1500 },
    ];
    const found = way({ ...set, asked: { ...set.asked, route } }, 'l1:1');
    const [first] = found.steps[0]?.poses ?? [];
    expect(found.from).toBe('route');
    expect(Math.hypot((first?.xMm ?? 0) - 2200, (first?.zMm ?? 0) - 2200)).toBeLessThan(80);
  });
});

describe('the answer', () => {
  const clears = (document: SetDocument) =>
    waysIn(document).ways.map(({ placeId, tightest, passes }) => ({
      placeId,
      passes,
      mm: tightest?.clearMm ?? 150,
    }));

  it('is mirrored with the set', () => {
    const set = arrangement('bench-window');
    const mirrored: SetDocument = {
      ...set,
      pieces: set.pieces.map((one) => ({
        ...one,
        at: { xMm: -one.at.xMm, zMm: one.at.zMm, turnDeg: -one.at.turnDeg },
      })),
    };
    const [there, here] = [clears(mirrored), clears(set)];
    // The left place is then the right one.
    expect(there.map(({ mm }) => mm).reverse()).toEqual(
      here.map(({ mm }) => expect.closeTo(mm, 0) as number),
    );
  });

  it('stays the same when the set is moved and turned', () => {
    const set = roomWithGap(300);
    const turn = (one: Piece): Piece => ({
      ...one,
      at: { xMm: 700 + one.at.zMm, zMm: -300 - one.at.xMm, turnDeg: one.at.turnDeg + 90 },
    });
    const [there] = clears({ ...set, pieces: set.pieces.map(turn) });
    expect(there?.mm).toBeCloseTo(clears(set)[0]?.mm ?? 0, 1);
  });

  it('begins each step where the last one ends, and ends at the seat', () => {
    for (const { steps, placeId } of waysIn(arrangement('banquette')).ways) {
      expect(steps.at(-1)?.poses.length, placeId).toBeGreaterThan(0);
      steps.slice(1).forEach((step, i) => {
        expect(step.poses[0], placeId).toEqual(steps[i]?.poses.at(-1));
      });
    }
  });
});

import { describe, expect, it } from 'vitest';
import { askedShapes } from '../drawing/asked.ts';
import type { Piece, PieceKind } from '../room/document.ts';
import { newPiece } from '../room/edit-pieces.ts';
import { footprint } from '../room/footprint.ts';
import { emptySetDocument } from '../room/read-document.ts';
import { measureSet } from '../../test/measured.ts';
import { cornerIndex, routeBetween, routeThrough } from './route-starts.ts';

const piece = (kind: PieceKind, mark: string, xMm: number, zMm: number, sizes: object = {}): Piece => ({
  ...newPiece(kind, mark.toLowerCase(), mark, { xMm, zMm, turnDeg: 0 }),
  ...sizes,
});

const table = (mark: string, xMm: number, zMm: number) =>
  piece('table', mark, xMm, zMm, { lengthMm: 1000, widthMm: 600 });
const spots = (...list: [number, number][]) => list.map(([xMm, zMm]) => ({ xMm, zMm }));

describe('a route to begin with', () => {
  it('runs midway between two pieces, over the length of both, whichever is named first', () => {
    const [a, b] = [table('T1', 0, 0), table('T2', 200, 1600)];
    // z: 300 to 1300, so 800; x: -500 to 700.
    expect(routeBetween(a, b)).toEqual(spots([-500, 800], [700, 800]));
    expect(routeBetween(b, a)).toEqual(routeBetween(a, b));
    expect(routeBetween(a, table('T3', 2000, 100))).toEqual(spots([1000, -300], [1000, 400]));
  });

  it('is as wide as the gap that it runs through', () => {
    const pieces = [table('T1', 0, 0), table('T2', 0, 1600)];
    const [one, other] = pieces as [Piece, Piece];
    const empty = emptySetDocument();
    const asked = { ...empty.asked, route: routeBetween(one, other) };
    const widths = measureSet({ ...empty, pieces, asked }).route!.map(({ widthMm }) => Math.round(widthMm));
    expect(widths).toEqual([1000]);
  });

  it('runs through the middle of the plan the long way', () => {
    const pieces = [table('T1', 0, 0), table('T2', 0, 3000)];
    expect(routeThrough(pieces)).toEqual(spots([0, -300], [0, 3300]));
    expect(routeThrough([])).toBeUndefined();
    const turned = { ...table('T1', 0, 0), at: { xMm: 0, zMm: 0, turnDeg: 90 } };
    const depth = Math.max(...footprint(turned).corners.map(([, z]) => z));
    expect(routeThrough([turned])?.[1]?.zMm).toBeCloseTo(depth, 6);
  });
});

describe('a new corner', () => {
  const route = spots([0, 0], [1000, 0], [1000, 1000]);

  it.each([
    [[-200, 0], 0],
    [[500, 40], 1],
    [[1030, 500], 2],
    [[1000, 1400], 3],
  ] as const)('at %j goes in at %i', ([xMm, zMm], index) => {
    expect(cornerIndex(route, { xMm, zMm })).toBe(index);
  });
});

describe('what is asked, on the plan', () => {
  it('is a dashed line and a circle of the asked size, and nothing where nothing is asked', () => {
    expect(askedShapes({}, 1524)).toEqual([]);
    const [turningAt] = spots([300, 400]);
    expect(askedShapes({ route: spots([0, 0], [900, 0]), turningAt: turningAt! }, 1524)).toMatchObject([
      { kind: 'circle', centre: [300, 400], radiusMm: 762 },
      {
        kind: 'polyline',
        points: [
          [0, 0],
          [900, 0],
        ],
        dashed: true,
      },
    ]);
  });
});

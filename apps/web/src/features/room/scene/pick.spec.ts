import type { Part } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { firstUnder, pieceUnder, type Ray } from './pick.ts';
import type { Cut } from './views.ts';

const box = (pieceId: string, zMm: number): Part =>
  ({
    pieceId,
    positionMm: [0, 500, zMm],
    rotationRad: [0, 0, 0],
    solid: { shape: 'box', sizeMm: [400, 400, 400] },
  }) as unknown as Part;
const parts = [box('near', 1000), box('far', -1000)];
/** From in front, into the room. */
const ray: Ray = { origin: [0, 500, 5000], direction: [0, 0, -1] };
const cutAt = (zMm: number): Cut => ({ pointMm: [0, 0, zMm], toward: [0, 0, 1] });

describe('what a press on the drawing meets', () => {
  it('is the nearest piece without a cut', () => {
    expect(firstUnder(parts, ray)).toEqual({ pieceId: 'near', distanceMm: 3800 });
  });

  it('is no piece that the cut took away', () => {
    expect(firstUnder(parts, ray, cutAt(500))).toEqual({ pieceId: 'far', distanceMm: 5800 });
  });

  it('is a piece that the cut goes through, at its cut face', () => {
    expect(firstUnder(parts, ray, cutAt(1000))).toEqual({ pieceId: 'near', distanceMm: 4000 });
  });

  it('is nothing where the ray runs in the part that is cut away', () => {
    const along: Ray = { origin: [-5000, 500, 1000], direction: [1, 0, 0] };
    expect(pieceUnder(parts, along, cutAt(500))).toBeUndefined();
    expect(pieceUnder(parts, along, cutAt(1500))).toBe('near');
  });
});

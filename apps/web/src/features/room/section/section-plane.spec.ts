import type { NamedView } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { isBehind } from '../scene/views.ts';
import { keyMovesCut } from './section-keys.ts';
import { cutOf, planeOfView, type SectionPlane } from './section-plane.ts';

const viewOf = (letter: 'A' | 'C', plane: SectionPlane): NamedView => {
  const { pointMm, toward } = cutOf(plane);
  return {
    id: 'v',
    name: 'Cut',
    camera: { kind: 'letter', letter, zoom: 1, panMm: [0, 0], azimuthDeg: 0, elevationDeg: 0 },
    shown: { bodies: true, tapes: true, clientView: false },
    section: { pointMm: [...pointMm], toward: [...toward] },
  };
};

describe('a cut that can be moved', () => {
  it.each<[SectionPlane, [number, number, number], [number, number, number]]>([
    [{ direction: 'above', atMm: 700 }, [0, 200, 0], [0, 1200, 0]],
    [{ direction: 'front', atMm: 100 }, [0, 0, -500], [0, 0, 500]],
    [{ direction: 'rear', atMm: 100 }, [0, 0, 500], [0, 0, -500]],
    [{ direction: 'left', atMm: -50 }, [500, 0, 0], [-500, 0, 0]],
    [{ direction: 'right', atMm: -50 }, [-500, 0, 0], [500, 0, 0]],
  ])('takes away what stands nearer: %o', (plane, kept, taken) => {
    expect(isBehind(kept, cutOf(plane))).toBe(true);
    expect(isBehind(taken, cutOf(plane))).toBe(false);
  });

  it('comes back from a named view, but not from one through the bench', () => {
    const plane: SectionPlane = { direction: 'left', atMm: 320 };
    expect(planeOfView(viewOf('A', plane))).toEqual(plane);
    expect(planeOfView(viewOf('C', plane))).toBeUndefined();
  });

  it.each([
    ['ArrowRight', 103],
    ['ArrowDown', 97],
    ['PageUp', 404.8],
    ['PageDown', -200],
    ['Home', -200],
    ['End', 900],
    ['a', undefined],
  ])('goes by the key %s to %s', (key, expected) => {
    expect(keyMovesCut(key, 100, { min: -200, max: 900, step: 3 })).toBe(expected);
  });
});

import { describe, expect, it } from 'vitest';
import { FRONT_FRAME } from '../test/front-frame.ts';
import { placeNames, placeNamesAtHeads } from './place-names.ts';

const viewport = { width: 800, height: 400 };

describe('names at the heads', () => {
  it('stand below them, the next a row lower where heads are nearer than names are wide', () => {
    const heads = [-250, -100, 400].map((x, n) => ({
      id: `p${n}`,
      headMm: [x, 0, 0] as const,
      width: 70,
      height: 16,
    }));
    const [one, next, far] = placeNamesAtHeads(FRONT_FRAME, viewport, heads);
    expect(next!.x - one!.x).toBeLessThan(70);
    expect(next!.y - one!.y).toBeGreaterThanOrEqual(17);
    expect(far!.y).toBe(one!.y);
  });
});

describe('names above the heads', () => {
  it('stand in one row in the order of the heads, apart from each other', () => {
    const heads = [300, -250, -200, 320].map((x, n) => ({
      id: `p${n}`,
      headMm: [x, 300 - n * 40, 0] as const,
      width: 70,
      height: 16,
    }));
    const placed = placeNames(FRONT_FRAME, viewport, heads);
    expect(placed.map((name) => name.id)).toEqual(['p1', 'p2', 'p0', 'p3']);
    expect(new Set(placed.map((name) => name.y)).size).toBe(1);
    placed
      .slice(1)
      .forEach((name, n) => expect(name.x - (placed[n]?.x ?? 0)).toBeGreaterThanOrEqual(88 - 1e-6));
  });

  it('stay on the sheet when the heads crowd at its edge', () => {
    const heads = [1800, 1810, 1820, 1830].map((x, n) => ({
      id: `p${n}`,
      headMm: [x, 0, 0] as const,
      width: 90,
      height: 16,
    }));
    for (const name of placeNames(FRONT_FRAME, viewport, heads))
      expect(name.x + 45).toBeLessThanOrEqual(794 + 1e-6);
  });

  it('take further rows where one is too short, and stay on the sheet', () => {
    const heads = Array.from({ length: 14 }, (_, n) => ({
      id: `p${n}`,
      headMm: [n * 120 - 800, 300, 0] as const,
      width: 110,
      height: 16,
    }));
    const placed = placeNames(FRONT_FRAME, viewport, heads);
    expect(new Set(placed.map((name) => name.id)).size).toBe(14);
    for (const name of placed) {
      expect(name.x - 55).toBeGreaterThanOrEqual(6 - 1e-6);
      expect(name.x + 55).toBeLessThanOrEqual(794 + 1e-6);
      for (const other of placed)
        expect(other === name || other.y !== name.y || Math.abs(other.x - name.x) >= 128 - 1e-6).toBe(true);
    }
  });
});

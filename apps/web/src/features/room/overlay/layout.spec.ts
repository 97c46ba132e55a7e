import { describe, expect, it } from 'vitest';
import type { ViewFrame } from '../scene/view-frame.ts';
import { isEndOn, placeFlags, placeNames, placeNamesAtHeads, tapePath } from './layout.ts';

const frame: ViewFrame = {
  target: [0, 0, 0],
  orientation: [0, 0, 0, 1],
  perspective: 0,
  eyeMm: [0, 0],
  centreMm: [0, 0],
  halfHeightMm: 1000,
  depthMm: [3000, -3000],
};
const viewport = { width: 800, height: 400 };

describe('names at the heads', () => {
  it('stand below them, the next a row lower where heads are nearer than names are wide', () => {
    const heads = [-250, -100, 400].map((x, n) => ({
      id: `p${n}`,
      headMm: [x, 0, 0] as const,
      width: 70,
      height: 16,
    }));
    const [one, next, far] = placeNamesAtHeads(frame, viewport, heads);
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
    const placed = placeNames(frame, viewport, heads);
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
    for (const name of placeNames(frame, viewport, heads))
      expect(name.x + 45).toBeLessThanOrEqual(794 + 1e-6);
  });

  it('take further rows where one is too short, and stay on the sheet', () => {
    const heads = Array.from({ length: 14 }, (_, n) => ({
      id: `p${n}`,
      headMm: [n * 120 - 800, 300, 0] as const,
      width: 110,
      height: 16,
    }));
    const placed = placeNames(frame, viewport, heads);
    expect(new Set(placed.map((name) => name.id)).size).toBe(14);
    for (const name of placed) {
      expect(name.x - 55).toBeGreaterThanOrEqual(6 - 1e-6);
      expect(name.x + 55).toBeLessThanOrEqual(794 + 1e-6);
      for (const other of placed)
        expect(other === name || other.y !== name.y || Math.abs(other.x - name.x) >= 128 - 1e-6).toBe(true);
    }
  });
});

describe('tape flags', () => {
  const flag = (id: string) => ({
    id,
    fromMm: [0, -400, 0] as const,
    toMm: [0, 400, 0] as const,
    width: 80,
    height: 24,
  });

  it('keep clear of each other although their lines coincide', () => {
    const placed = placeFlags(frame, viewport, [flag('a'), flag('b'), flag('c')], [], []);
    placed.forEach((a, n) =>
      placed.slice(n + 1).forEach((b) => {
        expect(Math.abs(a.x - b.x) >= 80 || Math.abs(a.y - b.y) >= 24).toBe(true);
      }),
    );
  });

  it('find a place off the cross line of a short gap where that is full', () => {
    // A long tape lies on either side of the gap, its flag at the height of the gap.
    const beside = (id: string, x: number) => ({
      ...flag(id),
      fromMm: [x, -30, 0] as const,
      toMm: [x, 30, 0] as const,
    });
    const crowd = [-180, -90, 90, 180, 270].map((x) => beside(`at ${x}`, x));
    const gap = { ...flag('gap'), fromMm: [0, 0, 0] as const, toMm: [0, 40, 0] as const };
    const placed = placeFlags(frame, viewport, [...crowd, gap], [], []);
    const last = placed.at(-1);
    placed.slice(0, -1).forEach((other) => {
      expect(Math.abs(other.x - last!.x) >= 80 || Math.abs(other.y - last!.y) >= 24).toBe(true);
    });
  });

  it('are not for a line that runs towards the eye', () => {
    expect(isEndOn(frame, viewport, [0, 0, -500], [0, 0, 500])).toBe(true);
    expect(isEndOn(frame, viewport, [0, 0, -500], [400, 0, 500])).toBe(false);
    expect(isEndOn(frame, viewport, [0, 0, 0], [0, 3, 0])).toBe(false);
  });

  it('leave a head free', () => {
    const [placed] = placeFlags(frame, viewport, [flag('a')], [[0, 120, 0]], []);
    expect(Math.abs((placed?.y ?? 0) - 200) > 12 || Math.abs((placed?.x ?? 0) - 400) > 40).toBe(true);
  });

  it('stand off a line that they would hide, with a leader to it', () => {
    const short = { ...flag('gap'), fromMm: [0, 0, 0] as const, toMm: [0, 40, 0] as const };
    const [placed] = placeFlags(frame, viewport, [short], [], []);
    expect(placed?.leader).toEqual({ x: 400, y: 196 });
  });
});

describe('the tape itself', () => {
  it('has one tick an inch', () => {
    const [placed] = placeFlags(
      frame,
      viewport,
      [{ id: 'a', fromMm: [0, 0, 0], toMm: [0, 254, 0], width: 60, height: 20 }],
      [],
      [],
    );
    // Line, two ends and nine inner ticks of a ten inch tape.
    expect(placed && tapePath(placed, 254, 25.4).split('M').length - 1).toBe(12);
  });

  it('draws nothing for a tape that the view cannot place', () => {
    const nowhere = { x: NaN, y: NaN, depth: 0 };
    const placed = { id: 't', x: 0, y: 0, from: nowhere, to: nowhere };
    expect(tapePath(placed, 254, 25.4)).toBe('');
  });
});

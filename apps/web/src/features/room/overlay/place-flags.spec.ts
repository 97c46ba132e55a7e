import { describe, expect, it } from 'vitest';
import { FRONT_FRAME } from '../test/front-frame.ts';
import { isEndOn, placeFlags, tapePath } from './place-flags.ts';

const viewport = { width: 800, height: 400 };

describe('tape flags', () => {
  const flag = (id: string) => ({
    id,
    fromMm: [0, -400, 0] as const,
    toMm: [0, 400, 0] as const,
    width: 80,
    height: 24,
  });

  it('keep clear of each other although their lines coincide', () => {
    const placed = placeFlags(FRONT_FRAME, viewport, [flag('a'), flag('b'), flag('c')], [], []);
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
    const placed = placeFlags(FRONT_FRAME, viewport, [...crowd, gap], [], []);
    const last = placed.at(-1);
    placed.slice(0, -1).forEach((other) => {
      expect(Math.abs(other.x - last!.x) >= 80 || Math.abs(other.y - last!.y) >= 24).toBe(true);
    });
  });

  it('are not for a line that runs towards the eye', () => {
    expect(isEndOn(FRONT_FRAME, viewport, [0, 0, -500], [0, 0, 500])).toBe(true);
    expect(isEndOn(FRONT_FRAME, viewport, [0, 0, -500], [400, 0, 500])).toBe(false);
    expect(isEndOn(FRONT_FRAME, viewport, [0, 0, 0], [0, 3, 0])).toBe(false);
  });

  it('leave a head free', () => {
    const [placed] = placeFlags(FRONT_FRAME, viewport, [flag('a')], [[0, 120, 0]], []);
    expect(Math.abs((placed?.y ?? 0) - 200) > 12 || Math.abs((placed?.x ?? 0) - 400) > 40).toBe(true);
  });

  it('leave names of any length free where these stand in several rows', () => {
    const long = { id: 'p', x: 400, y: 200, width: 190, height: 20, head: { x: 400, y: 120 } };
    const other = { ...long, id: 'q', y: 20 };
    const beside = { ...flag('a'), fromMm: [425, -400, 0] as const, toMm: [425, 400, 0] as const };
    const [placed] = placeFlags(FRONT_FRAME, viewport, [{ ...beside, width: 40 }], [], [long, other]);
    expect(Math.abs(placed!.x - long.x) >= 115 || Math.abs(placed!.y - long.y) >= 22).toBe(true);
  });

  it('stand off a line that they would hide, with a leader to it', () => {
    const short = { ...flag('gap'), fromMm: [0, 0, 0] as const, toMm: [0, 40, 0] as const };
    const [placed] = placeFlags(FRONT_FRAME, viewport, [short], [], []);
    expect(placed?.leader).toEqual({ x: 400, y: 196 });
  });
});

describe('the tape itself', () => {
  it('has one tick an inch', () => {
    const [placed] = placeFlags(
      FRONT_FRAME,
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
    expect(tapePath({ from: nowhere, to: nowhere }, 254, 25.4)).toBe('');
  });
});

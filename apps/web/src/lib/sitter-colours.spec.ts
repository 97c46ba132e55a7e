import type { SetDocument } from '@settlewright/geometry';
import { SITTER_COLOURS } from '@settlewright/geometry';
import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { describe, expect, it } from 'vitest';
import { sitterColours } from './sitter-colours.ts';

type Seat = SetDocument['seating'][number];
const person = (n: number): Seat => ({ pieceId: 'b1', place: n, sitter: { kind: 'cast', castId: `p${n}` } });
const woman = (n: number): Seat => ({
  pieceId: 'b2',
  place: n,
  sitter: { kind: 'mannequin', bodyData: 'women', measure: 'stature', percentile: 5 },
});

describe('the colours in a set', () => {
  it('are the people’s own where no two are alike', () => {
    const colours = sitterColours([person(1), person(2)], (id) => (id === 'p1' ? 5 : 2));
    expect([...colours]).toEqual([
      ['b1:1', 5],
      ['b1:2', 2],
    ]);
  });

  it('are all different for twelve sitters, whatever was stored', () => {
    const eight = [1, 2, 3, 4, 5, 6, 7, 8].map(person);
    const colours = sitterColours([...[1, 2, 3, 4].map(woman), ...eight], () => 1);
    expect(new Set(colours.values()).size).toBe(12);
    expect(colours.get('b1:1')).toBe(1);
  });

  it('leave a person the colour that a mannequin would have had', () => {
    const colours = sitterColours([woman(1), person(1)], () => 4);
    expect(colours.get('b1:1')).toBe(4);
    expect(colours.get('b2:1')).not.toBe(4);
  });
});

/** Linear light of a colour such as #cf9a7b. */
const linear = (hex: string): [number, number, number] => {
  const channel = (at: number) => {
    const value = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  };
  return [channel(1), channel(3), channel(5)];
};
/** WCAG 2.2 contrast ratio. */
function contrast(a: string, b: string): number {
  const [low = 0, high = 0] = [a, b]
    .map((hex) => {
      const [r, g, blue] = linear(hex);
      return 0.2126 * r + 0.7152 * g + 0.0722 * blue;
    })
    .sort((x, y) => x - y);
  return (high + 0.05) / (low + 0.05);
}
/** Distance in OKLab (Ottosson 2020); about 0.02 is just seen side by side. */
function apart(a: string, b: string): number {
  const [p, q] = [a, b].map((hex) => {
    const [r, g, blue] = linear(hex);
    const l = Math.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * blue);
    const m = Math.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * blue);
    const s = Math.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * blue);
    return [
      0.2104542553 * l + 0.793617785 * m - 0.0040720468 * s,
      1.9779984951 * l - 2.428592205 * m + 0.4505937099 * s,
      0.0259040371 * l + 0.7827717662 * m - 0.808675766 * s,
    ] as const;
  }) as [readonly [number, number, number], readonly [number, number, number]];
  return Math.hypot(p[0] - q[0], p[1] - q[1], p[2] - q[2]);
}

const css = readFileSync(resolve(import.meta.dirname, '../styles/theme.css'), 'utf8');
const [light = '', dark = ''] = css.split("[data-theme='dark'] {");

describe.each([
  ['light', light],
  ['dark', dark],
])('the colours of sitters, %s', (theme, tokens) => {
  const token = (name: string) => new RegExp(`--color-${name}: (#[0-9a-f]{6});`).exec(tokens)?.[1] ?? '';
  const sitters = SITTER_COLOURS.map((n) => token(`sitter-${n}`));
  // Above the ground that a dot lies on stands its edge by day, its filling under stage light.
  const onGround = theme === 'light' ? [token('pen')] : sitters;

  it('can be told apart, and from the cloth behind them', () => {
    for (const [n, one] of sitters.entries()) {
      for (const other of sitters.slice(n + 1)) expect(apart(one, other)).toBeGreaterThan(0.05);
      expect(apart(one, token('cloth-2'))).toBeGreaterThan(0.05);
    }
  });

  it('carry initials that can be read, and stand out from every ground', () => {
    for (const one of sitters) expect(contrast(one, token('pen'))).toBeGreaterThanOrEqual(4.5);
    for (const ground of ['paper', 'sheet', 'sunk'].map(token)) {
      for (const one of onGround) expect(contrast(one, ground)).toBeGreaterThanOrEqual(3);
    }
  });
});

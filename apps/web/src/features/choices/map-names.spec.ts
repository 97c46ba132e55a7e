import type { MapRegion } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { mapNames, outlineOf } from './map-names.ts';

const region = (name: string, rooms: number[][]): MapRegion => ({
  sitterId: name,
  placeId: name,
  name,
  rooms,
  states: [],
});

const FRAME = { left: 0, right: 300, top: 0, bottom: 200 };
const placeOf = (across: number, up: number): [number, number] => [across * 100, 200 - up * 100];
const left = region('Hetty', [
  [5, -5, -5, -5],
  [5, -5, -5, -5],
  [5, -5, -5, -5],
]);
const right = region('Marcus', [
  [-5, -5, -5, 5],
  [-5, -5, -5, 5],
  [-5, -5, -5, 5],
]);

describe('a region of the map', () => {
  it('is outlined along the edges of the map, too', () => {
    const onEdge = outlineOf(left).filter(([[a], [b]]) => a < 0.01 && b < 0.01);
    expect(onEdge.length).toBeGreaterThan(0);
    const whole = outlineOf(
      region('All', [
        [1, 1],
        [1, 1],
      ]),
    );
    expect(whole.flat().every(([a, b]) => [a, b].some((at) => at < 0.01 || at > 0.99))).toBe(true);
    expect(whole.length).toBeGreaterThan(3);
  });

  it('has its name on its own outline, inside the map', () => {
    const [hetty, marcus] = mapNames([left, right], placeOf, FRAME);
    expect(hetty?.name).toBe('Hetty');
    expect(marcus?.name).toBe('Marcus');
    expect(hetty?.at[0]).toBeLessThan(100);
    expect(marcus?.at[0]).toBeGreaterThan(200);
    for (const { at } of [hetty, marcus].flatMap((name) => name ?? [])) {
      expect(at[0]).toBeGreaterThan(20);
      expect(at[0]).toBeLessThan(280);
      expect(at[1]).toBeGreaterThan(8);
    }
  });

  it('is named apart from another one with the same outline', () => {
    const [one, two] = mapNames([left, { ...left, placeId: 'two', name: 'Ottilie' }], placeOf, FRAME);
    expect(Math.abs((one?.at[1] ?? 0) - (two?.at[1] ?? 0))).toBeGreaterThan(16);
  });
});

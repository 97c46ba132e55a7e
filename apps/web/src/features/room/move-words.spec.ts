import type { LengthStyle } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { nameMove, nameMoves, readOutMove } from './move-words.ts';

const STYLE: LengthStyle = { system: 'feet-inches', roundTo: 8 };
const from = { xMm: 100, zMm: 100, turnDeg: 0 };

describe('a piece that is dragged', () => {
  it('reads out how far it went either way and what it met', () => {
    const to = { xMm: 100 + 88.9, zMm: 100 - 50.8, turnDeg: 0 };
    expect(readOutMove(from, to, undefined, STYLE)).toBe('x 3½″, z −2″');
    expect(readOutMove(from, to, 'end of B2', STYLE)).toBe('x 3½″, z −2″, end of B2');
    expect(readOutMove(from, to, undefined, { system: 'millimetres', roundTo: 8 })).toBe(
      'x 89\u202fmm, z −51\u202fmm',
    );
  });

  it('names the step by the way it went, and makes none where it stands as before', () => {
    expect(nameMove('T1', from, { ...from, xMm: 188.9 }, STYLE)).toBe('T1 moved 3½″');
    expect(nameMove('T1', from, { ...from, turnDeg: 90 }, STYLE)).toBe('T1 turned');
    expect(nameMove('T1', from, { ...from, xMm: 100.5 }, STYLE)).toBe('T1 moved');
    expect(nameMove('T1', from, from, STYLE)).toBeUndefined();
  });

  it('counts the pieces that go together', () => {
    expect(nameMoves(3, from, { ...from, xMm: 188.9 }, STYLE)).toBe('Move 3 pieces 3½″');
    expect(nameMoves(3, from, { ...from, xMm: 100.5 }, STYLE)).toBe('Move 3 pieces');
    expect(nameMoves(3, from, from, STYLE)).toBeUndefined();
  });
});

import { addPiece, emptySetDocument, type LengthStyle, type RoomLimit } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import type { NumberParameter } from './numbers.ts';
import { beyondRoom, limitWord, roomOf, sayLimit } from './room-limits.ts';

const EIGHTHS: LengthStyle = { system: 'feet-inches', roundTo: 8 };
const METRIC: LengthStyle = { system: 'millimetres', roundTo: 8 };
const inches = (size: number) => size * 25.4;
const length: NumberParameter = {
  key: 'lengthMm',
  label: 'Length',
  kind: 'length',
  unit: 'mm',
  min: inches(24),
  max: inches(240),
  value: inches(44),
};
const stop = (valueMm: number): RoomLimit => ({ valueMm, pieceId: 'b2', mark: 'B2', beyond: 'meets' });

describe('a number that goes further than its room', () => {
  it('is offered the last number on the shown steps that has room', () => {
    const room = { most: stop(inches(46.25) + 2) };
    const beyond = beyondRoom(length, inches(50), room, EIGHTHS);
    expect(beyond).toMatchObject({ side: 'most', offer: expect.closeTo(inches(46.25), 6) });
    expect(beyondRoom(length, inches(50), room, METRIC)?.offer).toBe(1176);
    expect(beyond && sayLimit(length, beyond, { kind: 'bench' }, EIGHTHS)).toBe(
      'Longest here is 3′\u00a010¼″ (then it meets B2)',
    );
  });

  it('is offered the touching number itself where that stands on a step, however it was worked out', () => {
    expect(beyondRoom(length, inches(50), { most: stop(inches(48) - 0.02) }, EIGHTHS)?.offer).toBeCloseTo(
      inches(48),
      6,
    );
  });

  it('has room up to the touching number, and where nothing stops it', () => {
    expect(beyondRoom(length, inches(48), { most: stop(inches(48) - 0.02) }, EIGHTHS)).toBeUndefined();
    expect(beyondRoom(length, inches(200), {}, EIGHTHS)).toBeUndefined();
  });

  it('is rounded upwards where it must not be lower', () => {
    const height = { ...length, key: 'heightMm', label: 'Table height' };
    const beyond = beyondRoom(height, inches(18), { least: stop(inches(20) + 1) }, EIGHTHS);
    expect(beyond?.offer).toBeCloseTo(inches(20.125), 6);
    expect(beyond && sayLimit(height, beyond, { kind: 'table' }, EIGHTHS)).toBe(
      'Lowest here is 20⅛″ (then it meets B2)',
    );
  });

  it('says of a window that it reaches the edge of its wall', () => {
    const limit: RoomLimit = { valueMm: 1000, pieceId: 'w1', mark: 'W1', beyond: 'leaves' };
    const beyond = { side: 'most', limit, offer: 1000 } as const;
    const width = { ...length, key: 'opening.widthMm', label: 'Window width' };
    expect(sayLimit(width, beyond, { kind: 'sill' }, METRIC)).toBe(
      'Widest here is 1000\u202fmm (then its window reaches the edge of W1)',
    );
    const wall = { side: 'least', limit: { ...limit, mark: 'S1' }, offer: 1000 } as const;
    expect(sayLimit(length, wall, { kind: 'bulkhead' }, METRIC)).toBe(
      'Shortest here is 1000\u202fmm (then the window of S1 reaches its edge)',
    );
  });
});

describe('the word for the end of a number', () => {
  it.each([
    ['Length', 'Longest', 'Shortest'],
    ['Foot length', 'Longest', 'Shortest'],
    ['Seat depth', 'Deepest', 'Shallowest'],
    ['Width of a place', 'Widest', 'Narrowest'],
    ['Back thickness', 'Thickest', 'Thinnest'],
    ['Underside', 'Highest', 'Lowest'],
    ['Left end height', 'Highest', 'Lowest'],
    ['Lip', 'Most', 'Least'],
  ])('%s', (label, most, least) => {
    expect([limitWord({ label }, 'most'), limitWord({ label }, 'least')]).toEqual([most, least]);
  });
});

describe('the room of a document', () => {
  it('is worked out once', () => {
    const first = addPiece(emptySetDocument(), 'bench');
    const { document } = addPiece(first.document, 'bench');
    const room = roomOf(document, first.pieceId, 'lengthMm');
    expect(room.most?.mark).toBe('B2');
    expect(roomOf(document, first.pieceId, 'lengthMm')).toBe(room);
    expect(roomOf({ ...document }, first.pieceId, 'lengthMm')).not.toBe(room);
  });
});

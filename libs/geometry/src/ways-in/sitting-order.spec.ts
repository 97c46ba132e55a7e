import { describe, expect, it } from 'vitest';
import { sittingOrder } from './sitting-order.ts';

const passing = (placeId: string, ...over: string[]) => ({
  placeId,
  past: over.map((other) => ({ placeId: other, how: 'sits-later' as const })),
});

describe('an order of sitting down', () => {
  it('has everybody before those they pass, and else the order of the places', () => {
    const ways = [passing('a'), passing('b', 'a'), passing('c', 'b', 'a'), passing('d')];
    expect(sittingOrder(ways)).toEqual({ placeIds: ['c', 'b', 'a', 'd'], knotted: [] });
  });

  it('names who makes room again where two pass each other', () => {
    const { placeIds, knotted } = sittingOrder([passing('a', 'b'), passing('b', 'a')]);
    expect(placeIds).toEqual(['a', 'b']);
    expect(knotted).toEqual(['b']);
  });
});

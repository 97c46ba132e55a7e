import { describe, expect, it } from 'vitest';
import { foamNumber, foamText, fromFoamNumber } from './foam-units.ts';

const INCHES = { system: 'feet-inches' } as const;
const METRIC = { system: 'millimetres' } as const;

describe('density and firmness of foam', () => {
  it('follow the system', () => {
    expect(foamText('density', 41.6, INCHES)).toBe('2.6\u202flb/ft³');
    expect(foamText('density', 41.6, METRIC)).toBe('42\u202fkg/m³');
    expect(foamText('firmness', 222.41108, INCHES)).toBe('50\u202flb');
    expect(foamText('firmness', 222.4, METRIC)).toBe('222\u202fN');
  });

  it('come back as they were', () => {
    for (const style of [INCHES, METRIC]) {
      for (const what of ['density', 'firmness'] as const) {
        expect(fromFoamNumber(what, foamNumber(what, 123.4, style), style)).toBeCloseTo(123.4, 9);
      }
    }
  });
});

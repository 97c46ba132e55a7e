import { describe, expect, it } from 'vitest';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { SetDocument } from '../room/document.ts';
import { dimensionsOf } from './dimensions.ts';
import { clashOf } from './free-dimensions.ts';

const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const dimensions = dimensionsOf(bay);

describe('free dimensions', () => {
  it('never move one number by two choices', () => {
    const free = ['seat-height', 'seat-depth', 'table-height'];
    const clashes = dimensions.filter((one) => clashOf(one, free, dimensions)).map(({ id }) => id);
    expect(clashes).toContain('seat-and-tables');
    expect(clashes).toContain('seat-height|b1');
    expect(clashes).not.toContain('back-lean');
    expect(clashes).not.toContain('seat-height');
  });
});

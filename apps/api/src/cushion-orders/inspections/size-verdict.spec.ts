import { describe, expect, it } from '@jest/globals';
import type { InspectedCushion } from './order-inspection.entity';
import { judgeCushion, judgeSizes } from './size-verdict';

const cushion = (measured: Partial<InspectedCushion['measured']>): InspectedCushion => ({
  mark: 'C1',
  asked: { widthMm: 1000, depthMm: 400, thicknessMm: 95 },
  measured: { widthMm: 1000, depthMm: 400, thicknessMm: 95, ...measured },
  note: '',
});
const judged = (measured: Partial<InspectedCushion['measured']>, toleranceMm = 6.35) => {
  const sizes = judgeSizes(cushion(measured), toleranceMm);
  return [sizes.map(({ verdict }) => verdict), judgeCushion(sizes)];
};

describe('a measured cushion', () => {
  it('is within up to the tolerance on either side, and out beyond', () => {
    expect(judged({ widthMm: 1006.35, depthMm: 393.65 })).toEqual([['within', 'within', 'within'], 'within']);
    expect(judged({ widthMm: 1006.5 })).toEqual([['out', 'within', 'within'], 'out']);
    expect(judged({ depthMm: 393.5 })).toEqual([['within', 'out', 'within'], 'out']);
    expect(judged({ widthMm: 1006.35 }, 3)[1]).toBe('out');
  });

  it('is never within for want of a measure', () => {
    expect(judged({ thicknessMm: null })).toEqual([['within', 'within', 'not-measured'], 'not-measured']);
    expect(judged({ thicknessMm: null, widthMm: 900 })[1]).toBe('out');
  });
});

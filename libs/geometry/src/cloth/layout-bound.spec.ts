import { describe, expect, it } from 'vitest';
import { readyPanels } from './lay-in-order.ts';
import { layoutBoundMm } from './layout-bound.ts';

const roll = { usableWidthMm: 100, repeatMm: { acrossMm: 0, alongMm: 0 } };
const bound = (sizes: [number, number][], lies: 'up-roll' | 'either' = 'up-roll') =>
  layoutBoundMm(
    readyPanels(
      sizes.map(([widthMm, lengthMm], i) => ({ id: `${i}`, widthMm, lengthMm, lies })),
      roll,
    ),
    roll,
  );

describe('the length no layout goes below', () => {
  it('is the area over the width where panels fill it', () => {
    expect(
      bound([
        [50, 80],
        [50, 80],
      ]),
    ).toBeCloseTo(80, 6);
  });

  it('is the longest panel where one stands out', () => {
    expect(
      bound([
        [10, 300],
        [50, 20],
      ]),
    ).toBeCloseTo(300, 6);
  });

  it('is the sum of those too wide to lie side by side', () => {
    // Area over width gives 53 a piece; no two of them lie abreast, so the truth is 100 a piece.
    const wide = bound([
      [53, 100],
      [53, 100],
      [53, 100],
    ]);
    expect(wide).toBeGreaterThan(299);
    expect(wide).toBeLessThanOrEqual(300 + 1e-6);
  });

  it('sees that three do not lie abreast though two and a half would by area', () => {
    // Two abreast at most: six of 36 x 100 need three rows.
    const rows = bound(Array.from({ length: 6 }, (): [number, number] => [36, 100]));
    expect(rows).toBeGreaterThan(299);
    expect(rows).toBeLessThanOrEqual(300 + 1e-6);
  });

  it('lets a panel that may be turned count its cheaper way', () => {
    expect(
      bound(
        [
          [53, 20],
          [53, 20],
        ],
        'either',
      ),
    ).toBeLessThanOrEqual(40 + 1e-6);
    expect(bound([[90, 10]], 'either')).toBeCloseTo(10, 6);
  });
});

import type { OutlineCorner } from '../../outlines/outline.ts';
import type { CushionSize } from '../cushion-sizes.ts';
import { rectangleOutline, rectanglePanel, type CutPanel } from './cut-panels.ts';

/**
 * The wrapping piece and both sides of a cushion whose cover goes over the front in one piece.
 *
 * A waterfall has a flat front as high as it is thick; a bullnose a half circle of that diameter.
 *
 * @param size - finished
 * @param front - which of both
 * @param seamMm - seam allowance
 * @returns top, front and bottom in one, and the side, of which two are cut, with the front at its left
 * @source back edge to back edge plus 1 in, width plus 1 in; side panels plus 1 in; bullnose sides end in a true half
 * circle: published upholstery course
 */
export function wrappedFront(
  { widthMm, depthMm, thicknessMm }: CushionSize,
  front: 'waterfall' | 'bullnose',
  seamMm: number,
): { wrap: CutPanel; side: CutPanel } {
  const radius = front === 'bullnose' ? thicknessMm / 2 : 0;
  const round = front === 'bullnose' ? Math.PI * radius : thicknessMm;
  const flat = depthMm - radius;
  const wrap = rectanglePanel(
    'top, front and bottom',
    { widthMm, heightMm: 2 * flat + round },
    seamMm,
    1,
    // Up its sides: where the bottom ends, the middle of the front, where the top begins.
    front === 'bullnose' ? [flat, flat + round / 2, flat + round] : [flat, flat + round],
  );
  const side = (extra: number): OutlineCorner[] =>
    rectangleOutline(depthMm, thicknessMm, extra).map((corner) => ({
      ...corner,
      radiusMm: corner.at[0] < depthMm / 2 && radius > 0 ? radius + extra : 0,
    }));
  return { wrap, side: { name: 'side', count: 2, finished: side(0), cut: side(seamMm), marksMm: [] } };
}

import type { Verdict } from '@settlewright/anthropometry';
import { PEN, type Sheet } from '../../paper/sheet';

export const GAP_MARK_MM = 6.4;
const HEIGHT_MM = 3.3;
const BLOCK_MM = { width: 2.2, height: 1.4 };

/**
 * The check in small: two uprights are the gap, the block is the body. The four differ in shape, so that they
 * survive a copier. `y` is the baseline of the text beside it.
 */
export function drawGapMark(
  sheet: Sheet,
  verdict: Verdict,
  x: number,
  y: number,
  { estimated = false }: { estimated?: boolean } = {},
): void {
  const top = y - HEIGHT_MM + 0.55;
  const foot = top + HEIGHT_MM;
  const middle = (top + foot) / 2;
  const left = x + 0.3;
  const right = x + GAP_MARK_MM - 1.5;
  const dash = estimated ? [0.75, 0.5] : [];
  const upright = (at: number, from: number, to: number) =>
    sheet.line(at, from, at, to, { pen: PEN.edge, dash });
  upright(left, top, foot);
  if (verdict === 'wontFit') {
    sheet.line(right, top, right, middle - BLOCK_MM.height / 2 - 0.3, { pen: PEN.edge });
    sheet.line(right, middle + BLOCK_MM.height / 2 + 0.3, right, foot, { pen: PEN.edge });
  } else upright(right, top, foot);
  if (verdict === 'notKnown') {
    for (const n of [-1, 0, 1]) {
      sheet.circle((left + right) / 2 + n * 1.15, middle, 0.24, { fill: 0, bare: true });
    }
    return;
  }
  const from = {
    fits: (left + right) / 2 - BLOCK_MM.width / 2,
    tight: right - BLOCK_MM.width,
    wontFit: right - BLOCK_MM.width / 2,
  }[verdict];
  sheet.rect(from, middle - BLOCK_MM.height / 2, BLOCK_MM.width, BLOCK_MM.height, { fill: 0, bare: true });
}

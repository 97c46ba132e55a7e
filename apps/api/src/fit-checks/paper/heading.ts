import type { Verdict } from '@settlewright/anthropometry';
import { paragraph } from '../../paper/paragraph';
import { leading } from '../../paper/sheet';
import { VERDICT_WORDS } from '../shown-sheet';
import type { FitSheetPaper } from './fit-sheet-paper';
import type { Flow } from './flow';
import { drawGapMark, GAP_MARK_MM } from './gap-mark';

const ORDER: Verdict[] = ['fits', 'tight', 'wontFit', 'notKnown'];
const KEY =
  '+ room left to the fail line, − short of it; est.: predicted or told, with the range that holds 90 in 100';
const STANCE = 'cushions pressed, shoes on, backs against the rest';

export function drawHeading(flow: Flow, { sheet: fit, confidence }: FitSheetPaper): void {
  const { sheet } = flow;
  const baseline = flow.y + 7;
  sheet.text('Fit sheet', flow.left, baseline, { size: 22, weight: 300 });
  let x = flow.right;
  for (const verdict of [...ORDER].reverse()) {
    const words = `${fit.counts[verdict]} ${verdict === 'fits' && fit.counts.fits !== 1 ? 'fit' : VERDICT_WORDS[verdict]}`;
    const style = { size: 12, weight: 400 } as const;
    x -= sheet.textWidth(words, style);
    sheet.text(words, x, baseline, style);
    x -= GAP_MARK_MM + 1;
    drawGapMark(sheet, verdict, x, baseline - 0.3);
    x -= 7;
  }
  sheet.text(KEY, flow.left, baseline + 6.4);
  sheet.text(STANCE, flow.right, baseline + 6.4, { align: 'right' });
  const after = paragraph(sheet, confidence, flow.left, baseline + 11, flow.right - flow.left);
  flow.y = after - leading(9) + 3.2;
}

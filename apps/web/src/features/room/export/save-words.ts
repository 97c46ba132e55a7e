import { freeSpace, type PaperKey } from './sheet-frame.ts';

/** A page that makes more stands still for too long, and nobody joins as many. */
export const MOST_SHEETS = 100;

/** How many sheets a drawing takes at its scale. */
export function sheetWords(sheets: number, paper: PaperKey): string {
  const { widthMm, heightMm } = freeSpace(paper);
  const name = paper === 'a4' ? 'A4' : 'Letter';
  if (sheets === 1) return `One sheet of ${name}.`;
  if (sheets > MOST_SHEETS) {
    return `${sheets} sheets of ${name} are too many to print; at most ${MOST_SHEETS}. Choose a smaller scale.`;
  }
  return `${sheets} sheets of ${name}, each showing ${Math.round(widthMm)} by ${Math.round(heightMm)} mm of paper. The scale is kept; they overlap for joining.`;
}

/** How many sheets named views take. */
export const viewSheetWords = (sheets: number, paper: PaperKey): string =>
  `${sheets === 1 ? 'One sheet' : `${sheets} sheets`} of ${paper === 'a4' ? 'A4' : 'Letter'}, a view on each; not to scale.`;

/** How large a picture of a view becomes. */
export const pixelWords = ({ width, height }: { width: number; height: number }): string =>
  `${width} × ${height} pixels, the exact frame of the view; no tapes, no names.`;

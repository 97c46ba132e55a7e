import { breakLines } from './paragraph';
import { leading, PEN, type Sheet } from './sheet';

const MARGIN_MM = 9;
const TITLE_BLOCK_MM = 18;
const ROMANISED_NOTE =
  '* romanised: this paper has no letters of that script, the screen shows it as it was typed';

export interface TitleCell {
  label: string;
  lines: readonly string[];
  /** Millimetres; the one cell without a width takes what is left. */
  widthMm?: number;
  /** Set large and light, for the letter of the revision. */
  large?: boolean;
}

export interface Frame {
  left: number;
  top: number;
  right: number;
  /** Where the title block begins. */
  bottom: number;
}

export function frameOf(sheet: Pick<Sheet, 'widthMm' | 'heightMm'>): Frame {
  return {
    left: MARGIN_MM,
    top: MARGIN_MM,
    right: sheet.widthMm - MARGIN_MM,
    bottom: sheet.heightMm - MARGIN_MM - TITLE_BLOCK_MM,
  };
}

/** Draws the frame and the cells along its foot. */
export function drawFrame(sheet: Sheet, cells: readonly TitleCell[]): void {
  const { left, top, right, bottom } = frameOf(sheet);
  sheet.rect(left, top, right - left, bottom + TITLE_BLOCK_MM - top, { pen: PEN.frame });
  sheet.line(left, bottom, right, bottom, { pen: PEN.frame });
  const named = cells.reduce((sum, cell) => sum + (cell.widthMm ?? 0), 0);
  const open = cells.filter((cell) => cell.widthMm === undefined).length;
  let x = left;
  cells.forEach((cell, index) => {
    const width = cell.widthMm ?? (right - left - named) / Math.max(1, open);
    if (index > 0) sheet.line(x, bottom, x, bottom + TITLE_BLOCK_MM, { pen: PEN.fine });
    drawCell(sheet, cell, x + 2.2, bottom, width - 4);
    x += width;
  });
  if (sheet.hasRomanised) sheet.text(ROMANISED_NOTE, left, bottom + TITLE_BLOCK_MM + 3.4, { size: 7.5 });
}

function drawCell(sheet: Sheet, cell: TitleCell, x: number, top: number, width: number): void {
  const step = leading(9) - 0.1;
  sheet.text(cell.label, x, top + 4.2, { size: 9 });
  if (cell.large) {
    sheet.text(cell.lines.join(' '), x, top + 12, { size: 18, weight: 300 });
    return;
  }
  const style = { size: 9, weight: 600 } as const;
  const all = cell.lines.flatMap((line) => breakLines(sheet, line, width, style));
  const shown = all
    .slice(0, 3)
    .map((words) => words.map((word, i) => (i > 0 && word.spaceBefore ? ' ' : '') + word.text).join(''));
  if (all.length > 3) shown[2] = shorten(sheet, shown[2] ?? '', width);
  shown.forEach((line, index) => sheet.text(line, x, top + 4.2 + step * (index + 1), style));
}

function shorten(sheet: Sheet, line: string, width: number): string {
  let kept = line;
  while (kept !== '' && sheet.textWidth(`${kept}…`, { size: 9, weight: 600 }) > width)
    kept = kept.slice(0, -1);
  return `${kept.trimEnd()}…`;
}

import type { Stretch } from '@settlewright/geometry';
import { PEN, type Sheet } from '../../paper/sheet';
import type { ShownRow } from '../shown-stick';
import type { Across } from './stick-paper';

export const BAR_MM = 3.4;
const LEAST_MM = 1.2;
const HATCH_MM = 1.3;
const DOT_MM = 2.2;
const DASH = [1.1, 0.8] as const;
const SOLID_GREY = 70;
const GUESS_GREY = 205;

interface Box {
  left: number;
  right: number;
  y: number;
}

/**
 * Where a sitter fits: solid where they fit, hatched where they are tight, dots where nobody can tell, nothing where
 * they won't fit. A best guess is paler, with a dashed edge and a line as far as it may reach.
 */
export function drawBar(sheet: Sheet, at: Across, y: number, row: ShownRow, values: readonly number[]): void {
  const guess = row.estimated && row.perhapsTight !== undefined;
  const dash = guess ? DASH : [];
  const box = ({ from, to }: Stretch): Box => {
    const [left, right] = [at.x(from), at.x(to)];
    const more = Math.max(0, LEAST_MM - (right - left)) / 2;
    return { left: left - more, right: right + more, y };
  };
  for (const stretch of notKnown(row, values)) drawDots(sheet, box(stretch));
  for (const stretch of row.perhapsTight ?? []) if (guess) drawReach(sheet, box(stretch));
  for (const stretch of row.tight) drawHatched(sheet, box(stretch), dash);
  for (const stretch of row.fits)
    drawSolid(sheet, box(stretch), { dash, grey: guess ? GUESS_GREY : SOLID_GREY });
}

export function drawSolid(
  sheet: Sheet,
  { left, right, y }: Box,
  look: { dash: readonly number[]; grey: number },
): void {
  sheet.rect(left, y - BAR_MM / 2, right - left, BAR_MM, { fill: look.grey, pen: PEN.edge, dash: look.dash });
}

export function drawHatched(sheet: Sheet, { left, right, y }: Box, dash: readonly number[]): void {
  const [top, foot] = [y - BAR_MM / 2, y + BAR_MM / 2];
  sheet.rect(left, top, right - left, BAR_MM, { fill: 255, bare: true });
  for (let x = left - BAR_MM + HATCH_MM; x < right; x += HATCH_MM) {
    const [from, to] = [Math.max(x, left), Math.min(x + BAR_MM, right)];
    if (to > from) sheet.line(from, foot - (from - x), to, foot - (to - x), { pen: PEN.fine });
  }
  sheet.rect(left, top, right - left, BAR_MM, { pen: PEN.edge, dash });
}

export function drawReach(sheet: Sheet, { left, right, y }: Box): void {
  sheet.line(left, y, right, y, { pen: PEN.edge, dash: DASH });
  for (const x of [left, right]) sheet.line(x, y - 1, x, y + 1, { pen: PEN.edge });
}

export function drawDots(sheet: Sheet, { left, right, y }: Box): void {
  for (let x = left + DOT_MM / 2; x < right; x += DOT_MM) sheet.circle(x, y, 0.26, { fill: 0, bare: true });
}

/** Runs of tried values whose verdict is not known and that no bar stands over. */
function notKnown({ states, tight }: ShownRow, values: readonly number[]): Stretch[] {
  const found: Stretch[] = [];
  let last = -2;
  states.forEach((state, n) => {
    const value = values[n] as number;
    if (state !== 'notKnown' || tight.some(({ from, to }) => from <= value && value <= to)) return;
    const open = found.at(-1);
    if (open && last === n - 1) open.to = value;
    else found.push({ from: value, to: value });
    last = n;
  });
  return found;
}

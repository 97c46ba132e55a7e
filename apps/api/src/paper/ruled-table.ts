import { linesNeeded, paragraph, type Prose } from './paragraph';
import { leading, PEN, type Sheet, type TextStyle } from './sheet';

export interface Fact {
  label: string;
  value: Prose;
}

const PAD_TOP = 3.6;
const PAD_BOTTOM = 1.3;

/** Height that one fact takes. */
export function factHeight(
  sheet: Sheet,
  { label, value }: Fact,
  box: { width: number; labelWidth: number },
): number {
  const lines = Math.max(
    linesNeeded(sheet, value, box.width - box.labelWidth),
    linesNeeded(sheet, label, box.labelWidth - 1.5),
  );
  return PAD_TOP + PAD_BOTTOM + (Math.max(1, lines) - 1) * leading(9);
}

/** Two columns of words, each row closed by a hairline. Returns y under the last rule. */
export function drawFacts(
  sheet: Sheet,
  facts: readonly Fact[],
  box: { x: number; y: number; width: number; labelWidth: number },
): number {
  let y = box.y;
  const valueWidth = box.width - box.labelWidth;
  for (const { label, value } of facts) {
    paragraph(sheet, label, box.x, y + PAD_TOP, box.labelWidth - 1.5);
    paragraph(sheet, value, box.x + box.labelWidth, y + PAD_TOP, valueWidth);
    y += factHeight(sheet, { label, value }, box);
    sheet.line(box.x, y, box.x + box.width, y, { pen: PEN.hair });
  }
  return y;
}

export interface Column {
  head: string;
  widthMm: number;
  align?: 'left' | 'right';
}

/** Height a row of a grid will take. */
export function rowHeight(sheet: Sheet, columns: readonly Column[], cells: readonly string[]): number {
  const lines = columns.map((column, i) => linesNeeded(sheet, cells[i] ?? '', column.widthMm - 2));
  return PAD_TOP + PAD_BOTTOM + (Math.max(1, ...lines) - 1) * leading(9);
}

/** One row of a grid; returns y under its rule. */
export function drawRow(
  sheet: Sheet,
  columns: readonly Column[],
  cells: readonly string[],
  at: { x: number; y: number },
  style: TextStyle & { pen?: number } = {},
): number {
  const height = rowHeight(sheet, columns, cells);
  let x = at.x;
  columns.forEach((column, i) => {
    const cell = cells[i] ?? '';
    if (column.align === 'right') {
      sheet.text(cell, x + column.widthMm - 2, at.y + PAD_TOP, { ...style, align: 'right' });
    } else paragraph(sheet, cell, x, at.y + PAD_TOP, column.widthMm - 2, style);
    x += column.widthMm;
  });
  const foot = at.y + height;
  sheet.line(at.x, foot, x, foot, { pen: style.pen ?? PEN.hair });
  return foot;
}

export function drawHead(sheet: Sheet, columns: readonly Column[], at: { x: number; y: number }): number {
  return drawRow(
    sheet,
    columns,
    columns.map((column) => column.head),
    at,
    { pen: PEN.edge },
  );
}

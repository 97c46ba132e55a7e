import { PEN, type Sheet } from './sheet';

export const CHECK_BAR_MM = 76.2;

/** A bar of true three inches: whoever holds the print can see whether the printer kept the scale. */
export function drawCheckBar(sheet: Sheet, x: number, y: number): void {
  sheet.text('this bar is 3″ (76.2 mm) long on paper', x + CHECK_BAR_MM / 2, y - 2.4, { align: 'center' });
  sheet.line(x, y, x + CHECK_BAR_MM, y, { pen: PEN.edge });
  const inch = CHECK_BAR_MM / 3;
  for (const n of [0, 2]) sheet.rect(x + n * inch, y - 0.45, inch, 0.9, { fill: 0, bare: true });
  for (const n of [0, 1, 2, 3]) sheet.line(x + n * inch, y - 1.5, x + n * inch, y + 1.5, { pen: PEN.fine });
}

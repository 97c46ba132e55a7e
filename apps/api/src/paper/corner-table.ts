import { type LengthStyle, lengthStep, outlineBox, type OutlineCorner } from '@settlewright/geometry';
import { type OrderPage, type OrderPages, PAD } from './order-pages';
import { type Column, drawHead, drawRow } from './ruled-table';
import { bareLength } from './spec-words';

const ROW_MM = 4.9;
const COLUMNS: readonly Column[] = [
  { head: 'Corner', widthMm: 16 },
  { head: 'right', widthMm: 20, align: 'right' },
  { head: 'up', widthMm: 20, align: 'right' },
  { head: 'radius', widthMm: 18, align: 'right' },
  { head: '', widthMm: 4 },
];
const TABLE_MM = 86;

/**
 * Every corner of an outline, counted anticlockwise from the front edge's end at the left of the page, from the lower left
 * corner of the box round it; tables side by side, on as many sheets as they take.
 */
export function drawCornerTables(
  pages: OrderPages,
  first: OrderPage,
  topic: readonly string[],
  outline: readonly OutlineCorner[],
  units: LengthStyle,
): void {
  const { x0, y0 } = outlineBox(outline);
  const step = lengthStep(units);
  const show = (mm: number) => bareLength(Math.round(mm / step) * step, units);
  const rows = outline.map(({ at, radiusMm }, i) => [
    String(i + 1),
    show(at[0] - x0),
    show(at[1] - y0),
    radiusMm > 0 ? show(radiusMm) : 'sharp',
  ]);
  let page = first;
  let rest = rows;
  while (rest.length > 0) {
    const { sheet, frame } = page;
    const words = 'Corners before they are rounded, from the lower left of the outline, anticlockwise';
    sheet.text(words, frame.left + PAD, page.y + 4.4, { weight: 600 });
    const top = page.y + 6.4;
    const most = Math.max(1, Math.floor((frame.bottom - top - 2) / ROW_MM) - 1);
    for (let column = 0; column < 3 && rest.length > 0; column += 1) {
      const x = frame.left + PAD + column * TABLE_MM;
      let y = drawHead(sheet, COLUMNS, { x, y: top });
      for (const cells of rest.slice(0, most)) y = drawRow(sheet, COLUMNS, cells, { x, y }, { weight: 600 });
      rest = rest.slice(most);
    }
    if (rest.length > 0) page = pages.page(topic, 'Corners of the outline, continued');
  }
}

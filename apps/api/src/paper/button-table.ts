import { lengthStep } from '@settlewright/geometry';
import { paragraph } from './paragraph';
import { type Column, drawHead, drawRow } from './ruled-table';
import type { Sheet } from './sheet';
import type { SpecCushion, SpecPack } from './spec-pack';
import { bareLength } from './spec-words';

const LABEL_MM = 27;
const BLOCK_MM = 3 * 4.9;

/**
 * Distances of every button column from the cushion's own seam and from the wall, and of every row from
 * the back seam. Returns y under the table; columns that find no room above the floor are counted in words.
 */
export function drawButtonTable(
  sheet: Sheet,
  cushion: SpecCushion,
  { units }: SpecPack,
  box: { x: number; y: number; width: number; floor: number },
): number {
  const { columnsMm, rowsMm, datum, seamName } = cushion.buttons;
  if (columnsMm.length === 0 || rowsMm.length === 0) return box.y;
  const step = lengthStep(units);
  const show = (mm: number) => bareLength(Math.round(mm / step) * step, units);
  sheet.text(`Buttons, from the ${seamName} seam`, box.x, box.y + 4.4, { size: 10, weight: 600 });
  let y = box.y + 5.8;
  const perBlock = Math.max(1, Math.floor((box.width - LABEL_MM) / 11.5));
  let shown = 0;
  while (shown < columnsMm.length && y + BLOCK_MM <= box.floor) {
    const some = columnsMm.slice(shown, shown + perBlock);
    const grid: Column[] = [
      { head: 'Column', widthMm: LABEL_MM },
      ...some.map((_, i) => ({
        head: String(shown + i + 1),
        widthMm: (box.width - LABEL_MM) / perBlock,
        align: 'right' as const,
      })),
    ];
    y = drawHead(sheet, grid, { x: box.x, y });
    y = drawRow(sheet, grid, ['from own seam', ...some.map(show)], { x: box.x, y }, { weight: 600 });
    const fromDatum = datum.columnsMm.slice(shown, shown + perBlock).map(show);
    y = drawRow(sheet, grid, [`from ${datum.name}`, ...fromDatum], { x: box.x, y });
    shown += some.length;
  }
  if (shown < columnsMm.length) {
    const last = columnsMm.at(-1) ?? 0;
    const words = `… and so on to column ${columnsMm.length} at ${show(last)}: see the chain on the drawing.`;
    y = paragraph(sheet, words, box.x, y + 4, box.width) - 2.6;
  }
  const rows = `Rows from the ${cushion.kind === 'seat' ? 'back' : 'top'} seam: ${rowsMm.map(show).join(', ')}`;
  return paragraph(sheet, [{ text: rows, weight: 600 }], box.x, y + 4, box.width) - 3.2;
}

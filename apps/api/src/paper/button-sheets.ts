import {
  type ButtonSheet,
  formatLength,
  lengthStep,
  type LengthStyle,
  marksWords,
  OFF_JOINT_MM,
  rowsWords,
} from '@settlewright/geometry';
import { type OrderPage, type OrderPages, PAD } from './order-pages';
import { paragraph } from './paragraph';
import { type Column, drawHead, drawRow } from './ruled-table';
import { PEN, type Sheet } from './sheet';
import type { SpecPack } from './spec-pack';
import { bareLength } from './spec-words';

const ROW_MM = 4.9;
const HEAD_MM = 16;
const TABLES = { columns: 132, between: 8 };

const COLUMNS: readonly Column[] = [
  { head: 'Column', widthMm: 18 },
  { head: 'from the datum', widthMm: 30, align: 'right' },
  { head: 'from own seam', widthMm: 30, align: 'right' },
  { head: 'off the nearest joint', widthMm: 54, align: 'right' },
];
const rowColumns = (kind: 'seat' | 'back'): readonly Column[] => [
  { head: 'Row', widthMm: 18 },
  { head: `from the ${kind === 'seat' ? 'back' : 'top'} seam`, widthMm: 36, align: 'right' },
  ...(kind === 'back' ? [{ head: 'over the pressed seat', widthMm: 44, align: 'right' as const }] : []),
];

/** Every button of the order by column and row, as many cushions to a sheet as find room. */
export function drawButtonSheets(pages: OrderPages, pack: SpecPack): void {
  const { buttons } = pack.model;
  if (buttons.length === 0) return;
  const topic = [
    'Buttons',
    buttons.length === 1 ? marksWords(buttons[0]!.marks) : 'all cushions with buttons',
  ];
  const start = () =>
    pages.page(
      topic,
      'Buttons',
      `measured from one datum along each bench; a column more than ${lengthOf(OFF_JOINT_MM, pack.units)} off its joint is marked`,
    );
  let page = start();
  for (const one of buttons) {
    const most = Math.floor((page.frame.bottom - page.frame.top - 9 - HEAD_MM - 14) / ROW_MM);
    for (let from = 0; from < Math.max(one.columns.length, one.rows.length); from += most) {
      const part = {
        ...one,
        columns: one.columns.slice(from, from + most),
        rows: one.rows.slice(from, from + most),
      };
      const height = HEAD_MM + (1 + Math.max(part.columns.length, part.rows.length)) * ROW_MM + 6;
      if (page.y + height > page.frame.bottom) page = start();
      page.y = drawOne(page, part, from, pack);
    }
  }
}

function drawOne({ sheet, frame, y }: OrderPage, one: ButtonSheet, from: number, pack: SpecPack): number {
  const { units } = pack;
  const x = frame.left + PAD;
  const cushion = pack.cushions.find(({ marks }) => marks[0] === one.marks[0]);
  const kind = cushion?.kind ?? 'seat';
  const datum = cushion?.buttons.datum;
  const further = from > 0 ? ', continued' : '';
  const pattern =
    one.pattern === 'staggered' ? ', staggered: odd rows carry odd columns, even rows even ones' : '';
  sheet.text(`${marksWords(one.marks)}, ${kind}${further}`, x, y + 6.4, { size: 10.5, weight: 600 });
  sheet.text(`${one.count} buttons${pattern}`, frame.right - PAD, y + 6.4, { align: 'right' });
  const seam = cushion?.buttons.seamName ?? '';
  const words =
    `Datum: ${datum?.name ?? 'bench end'}; ${lengthOf(datum?.toSeamMm ?? 0, units)} from it to the ${seam} seam. ` +
    `Rows from the ${kind === 'seat' ? 'back' : 'top'} seam. ${rowsWords(one, units) ?? ''}`;
  const top = paragraph(sheet, words, x, y + 11.4, frame.right - frame.left - 2 * PAD) - 2.2;
  const right = x + TABLES.columns + TABLES.between;
  const columns = drawColumns(sheet, one, from, units, { x, y: top });
  const rows = drawRows(sheet, one, from, units, { x: right, y: top, kind });
  const foot = Math.max(columns, rows) + 3;
  sheet.line(frame.left, foot, frame.right, foot, { pen: PEN.fine });
  return foot;
}

function drawColumns(
  sheet: Sheet,
  one: ButtonSheet,
  from: number,
  units: LengthStyle,
  at: { x: number; y: number },
): number {
  let y = drawHead(sheet, COLUMNS, at);
  one.columns.forEach(({ fromDatumMm, fromSeamMm, offJointMm, beyond }, i) => {
    const cells = [
      String(from + i + 1),
      rounded(fromDatumMm, units),
      rounded(fromSeamMm, units),
      offWords(one, offJointMm, beyond, units),
    ];
    y = drawRow(sheet, COLUMNS, cells, { x: at.x, y }, { weight: 600 });
  });
  return y;
}

function drawRows(
  sheet: Sheet,
  one: ButtonSheet,
  from: number,
  units: LengthStyle,
  at: { x: number; y: number; kind: 'seat' | 'back' },
): number {
  const columns = rowColumns(at.kind);
  let y = drawHead(sheet, columns, at);
  one.rows.forEach(({ fromSeamMm, overSeatMm }, i) => {
    const over = overSeatMm === undefined ? 'no seat below' : rounded(overSeatMm, units);
    const cells = [String(from + i + 1), rounded(fromSeamMm, units), over];
    y = drawRow(sheet, columns, cells, { x: at.x, y }, { weight: 600 });
  });
  return y;
}

/** "on it", "⅛ towards the datum", or the same with a warning. */
function offWords({ alignedTo }: ButtonSheet, offMm: number, beyond: boolean, units: LengthStyle): string {
  if (alignedTo === 'board-centres') return 'on a board’s middle';
  const step = lengthStep(units);
  const off = Math.abs(offMm);
  if (Math.round(off / step) === 0) return 'on it';
  const way = offMm < 0 ? 'towards the datum' : 'away from it';
  if (!beyond) return `${bareLength(off, units)} ${way}`;
  // Rounded to the limit itself, it would seem to keep to it.
  const over = Math.round(off / step) * step <= OFF_JOINT_MM + 1e-6 ? 'over ' : '';
  return `CHECK ${over}${bareLength(off, units)} ${way}`;
}

const rounded = (mm: number, units: LengthStyle): string => {
  const step = lengthStep(units);
  return bareLength(Math.round(mm / step) * step, units);
};

const lengthOf = (mm: number, units: LengthStyle): string => formatLength(mm, { ...units, feet: false });

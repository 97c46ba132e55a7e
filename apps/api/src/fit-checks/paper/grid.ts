import { breakLines, paragraph } from '../../paper/paragraph';
import { leading, PEN, type Sheet } from '../../paper/sheet';
import { checkName, ruleOf, type ShownCell, VERDICT_WORDS } from '../shown-sheet';
import type { FitSheetPaper } from './fit-sheet-paper';
import type { Flow } from './flow';
import { drawGapMark, GAP_MARK_MM } from './gap-mark';
import { marginWords } from './margin-words';

const SITTER_MM = 40;
const NARROWEST_MM = 29;
const PAD_TOP = 1.6;
const PAD_BOTTOM = 1.5;
const LINE = leading(9);

interface GridRow {
  name: string;
  below: string;
  cells: readonly ShownCell[];
  /** Words under each cell, for the public. */
  readAs?: (cell: ShownCell) => string;
}

interface GridColumn {
  name: string;
  /** Where the column stands in every row. */
  index: number;
}

/** Sitters against checks, the public last. Too many checks for one width go on in a second band. */
export function drawGrid(flow: Flow, input: FitSheetPaper): void {
  const rows = gridRows(input);
  const columns = columnsToShow(input, rows);
  if (input.sheet.rows.length === 0) {
    flow.y += LINE + 1;
    flow.sheet.text('Nobody sits in this set yet.', flow.left, flow.y);
    flow.y += 3;
  }
  if (columns.length === 0) return;
  const most = Math.floor((flow.width - SITTER_MM) / NARROWEST_MM);
  const bands = Math.ceil(columns.length / most);
  const perBand = Math.ceil(columns.length / bands);
  for (let from = 0; from < columns.length; from += perBand) {
    drawBand(flow, input, rows, columns.slice(from, from + perBand), perBand);
    flow.y += 4;
  }
}

function gridRows({ sheet }: FitSheetPaper): GridRow[] {
  const sitters = sheet.rows.map(({ name, mark, place, cells }): GridRow => ({
    name,
    below: mark ? `${mark}, place ${place}` : '',
    cells,
  }));
  const readAs = new Map(sheet.publicRow.cells.map((cell) => [cell.id, cell.readAs]));
  return [
    ...sitters,
    {
      name: 'The public',
      below: '5th or 95th in 100',
      cells: sheet.publicRow.cells,
      readAs: ({ id }) => readAs.get(id) ?? '',
    },
  ];
}

const says = ({ outcome }: ShownCell) => outcome.kind === 'verdict' || outcome.kind === 'information';

/** Columns in which at least one row says something. */
function columnsToShow({ ruleBook }: FitSheetPaper, rows: GridRow[]): GridColumn[] {
  const [first] = rows;
  if (!first) return [];
  return first.cells
    .map((cell, index) => ({ name: checkName(ruleBook, cell), index }))
    .filter(({ index }) => rows.some(({ cells }) => cells[index] && says(cells[index])));
}

function drawBand(
  flow: Flow,
  input: FitSheetPaper,
  rows: GridRow[],
  columns: GridColumn[],
  perBand: number,
): void {
  const columnMm = (flow.width - SITTER_MM) / perBand;
  const first = rows[0];
  flow.need(
    headHeight(flow.sheet, columns, columnMm) +
      (first ? rowHeight(flow.sheet, input, first, columns, columnMm) : 0),
  );
  drawHead(flow, columns, columnMm);
  for (const row of rows) {
    const height = rowHeight(flow.sheet, input, row, columns, columnMm);
    if (flow.need(height)) drawHead(flow, columns, columnMm);
    drawRow(flow, input, row, columns, columnMm, height);
  }
}

function headHeight(sheet: Sheet, columns: GridColumn[], columnMm: number): number {
  const lines = columns.map(({ name }) => breakLines(sheet, name, columnMm - 2, { weight: 600 }).length);
  return Math.max(1, ...lines) * LINE + 2;
}

function drawHead(flow: Flow, columns: GridColumn[], columnMm: number): void {
  const { sheet, left } = flow;
  const foot = flow.y + headHeight(sheet, columns, columnMm);
  const last = foot - 1.8;
  sheet.text('Sitter', left, last, { weight: 600 });
  columns.forEach(({ name }, n) => {
    const lines = breakLines(sheet, name, columnMm - 2, { weight: 600 }).length;
    const x = left + SITTER_MM + n * columnMm;
    paragraph(sheet, name, x, last - (lines - 1) * LINE, columnMm - 2, { weight: 600 });
  });
  sheet.line(left, foot, left + SITTER_MM + columns.length * columnMm, foot, { pen: PEN.edge });
  flow.y = foot;
}

function cellLines(
  sheet: Sheet,
  input: FitSheetPaper,
  row: GridRow,
  cell: ShownCell,
  width: number,
): string[] {
  const { outcome } = cell;
  const wrap = (text: string, room: number) =>
    breakLines(sheet, text, room).map((words) =>
      words.map(({ text: word, spaceBefore }, n) => (spaceBefore && n > 0 ? ' ' : '') + word).join(''),
    );
  const beside = width - GAP_MARK_MM - 1;
  if (outcome.kind === 'verdict') {
    const unit = ruleOf(input.ruleBook, cell)?.unit ?? 'mm';
    const words = VERDICT_WORDS[outcome.verdict] + (outcome.estimated ? ', est.' : '');
    const side = cell.side ? `${cell.side} hand` : '';
    const more = [side, row.readAs?.(cell) ?? ''].filter((text) => text !== '');
    return [
      marginWords(outcome, unit, input.style) || 'no longer kept',
      ...wrap(words, beside),
      ...more.flatMap((text) => wrap(text, beside)),
    ];
  }
  if (outcome.kind === 'information') return wrap(outcome.words, width);
  if (outcome.kind === 'clause')
    return wrap(`${outcome.inside ? 'inside' : 'outside'} clause ${outcome.clause}`, width);
  return wrap(outcome.reason, width);
}

function rowHeight(
  sheet: Sheet,
  input: FitSheetPaper,
  row: GridRow,
  columns: GridColumn[],
  columnMm: number,
): number {
  const lines = columns.map(({ index }) => {
    const cell = row.cells[index];
    return cell ? cellLines(sheet, input, row, cell, columnMm - 2).length : 0;
  });
  const named = breakLines(sheet, row.name, SITTER_MM - 3, { weight: 600 }).length + (row.below ? 1 : 0);
  return Math.max(2, named, ...lines) * LINE + PAD_TOP + PAD_BOTTOM;
}

function drawRow(
  flow: Flow,
  input: FitSheetPaper,
  row: GridRow,
  columns: GridColumn[],
  columnMm: number,
  height: number,
): void {
  const { sheet, left } = flow;
  const top = flow.y + PAD_TOP + LINE * 0.78;
  const after = paragraph(sheet, row.name, left, top, SITTER_MM - 3, { weight: 600 });
  sheet.text(row.below, left, after);
  columns.forEach(({ index }, n) => {
    const cell = row.cells[index];
    if (!cell) return;
    const x = left + SITTER_MM + n * columnMm;
    const { outcome } = cell;
    const marked = outcome.kind === 'verdict';
    if (marked) drawGapMark(sheet, outcome.verdict, x, top, { estimated: outcome.estimated });
    cellLines(sheet, input, row, cell, columnMm - 2).forEach((line, nth) => {
      const bold = marked && nth === 0 && !outcome.estimated;
      sheet.text(line, marked ? x + GAP_MARK_MM + 1 : x, top + nth * LINE, { weight: bold ? 600 : 400 });
    });
  });
  flow.y += height;
  sheet.line(left, flow.y, left + SITTER_MM + columns.length * columnMm, flow.y, { pen: PEN.hair });
}

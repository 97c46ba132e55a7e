import type { Verdict } from '@settlewright/anthropometry';
import { type CellState, exactValue } from '@settlewright/geometry';
import type { Flow } from '../../fit-checks/paper/flow';
import { drawGapMark, GAP_MARK_MM } from '../../fit-checks/paper/gap-mark';
import { VERDICT_WORDS } from '../../fit-checks/shown-sheet';
import { linesNeeded, paragraph } from '../../paper/paragraph';
import { leading, PEN, type Sheet } from '../../paper/sheet';
import type { ShownRow } from '../shown-stick';
import { drawBar } from './stick-bar';
import { CURVE_MM, drawCurve } from './stick-curve';
import { type Across, across, isTried, type StickPaper } from './stick-paper';
import { drawRuler, RULER_MM } from './stick-ruler';

const LINE = leading(9);
const LABELS_MM = 9;
const ROW_PAD_MM = 1.9;
const BAND_TICK_MM = 1.3;

/** Curve, bars, ranges and ruler, over as many sheets as the rows take; each sheet has its own ruler. */
export function drawBoard(flow: Flow, input: StickPaper): void {
  const { stick } = input;
  let rows = [...stick.rows];
  let first = true;
  do {
    const at = across(flow, stick);
    const curve = first && stick.shares ? CURVE_MM + 3 : 0;
    const below = bandsHeight(flow.sheet, at, input) + RULER_MM;
    let room = flow.room - LABELS_MM - curve - below - 2;
    let count = 0;
    for (const row of rows) {
      room -= rowHeight(flow.sheet, at, row);
      if (room < 0 && count > 0) break;
      count += 1;
    }
    drawPart(flow, input, at, { rows: rows.slice(0, count), curve: curve > 0 });
    rows = rows.slice(count);
    first = false;
    if (rows.length > 0) flow.nextSheet();
  } while (rows.length > 0);
}

const rowHeight = (sheet: Sheet, { left, namesRight }: Across, row: ShownRow): number =>
  linesNeeded(sheet, row.name, namesRight - left, { weight: 600 }) * LINE + ROW_PAD_MM;

const bandHeight = (sheet: Sheet, { left, namesRight }: Across, name: string): number =>
  linesNeeded(sheet, name, namesRight - left) * LINE + 1;

const bandsHeight = (sheet: Sheet, at: Across, { stick: { bands } }: StickPaper): number =>
  bands.reduce((sum, { name }) => sum + bandHeight(sheet, at, name), 0) + 2;

function drawPart(
  flow: Flow,
  input: StickPaper,
  at: Across,
  { rows, curve }: { rows: readonly ShownRow[]; curve: boolean },
): void {
  const { sheet } = flow;
  const { stick, style } = input;
  const top = flow.y;
  flow.y += LABELS_MM;
  if (curve && stick.shares) {
    flow.y += CURVE_MM + 1;
    drawCurve(sheet, at, flow.y, stick.shares);
    flow.y += 2;
  }
  const rowsTop = flow.y;
  sheet.line(at.left, rowsTop, at.right, rowsTop, { pen: PEN.edge });
  for (const row of rows) drawRow(flow, at, row, input);
  flow.y += 1;
  for (const { name, stretches } of stick.bands) {
    const height = bandHeight(sheet, at, name);
    paragraph(sheet, name, at.left, flow.y + LINE * 0.8, at.namesRight - at.left);
    const y = flow.y + height / 2;
    for (const { from, to } of stretches) {
      sheet.line(at.x(from), y, at.x(to), y, { pen: PEN.edge });
      for (const end of [from, to]) {
        sheet.line(at.x(end), y - BAND_TICK_MM, at.x(end), y + BAND_TICK_MM, { pen: PEN.edge });
      }
    }
    flow.y += height;
  }
  flow.y += 1;
  drawRuler(sheet, at, flow.y, stick.dimension, style);
  drawLines(sheet, at, input, { top, foot: flow.y });
  flow.y += RULER_MM;
}

function drawRow(flow: Flow, at: Across, row: ShownRow, { stick }: StickPaper): void {
  const { sheet } = flow;
  const height = rowHeight(sheet, at, row);
  const middle = flow.y + height / 2;
  const baseline = flow.y + ROW_PAD_MM / 2 + LINE * 0.78;
  paragraph(sheet, row.name, at.left, baseline, at.namesRight - at.left, { weight: 600 });
  drawBar(sheet, at, middle, row, stick.values);
  const there = stick.atValue.find(({ placeId }) => placeId === row.placeId)?.state ?? 'gone';
  const now = isTried(stick) ? stateNow(row, stick) : there;
  const states = isTried(stick) ? [now, there] : [now];
  states.forEach((state, n) => {
    const x = at.verdicts[n];
    if (x !== undefined) drawState(sheet, state, x, middle + 1.1, row.estimated);
  });
  flow.y += height;
  sheet.line(at.left, flow.y, at.right, flow.y, { pen: PEN.hair });
}

/** The present value is among those that were tried. */
function stateNow({ states }: ShownRow, { values, dimension }: StickPaper['stick']): CellState {
  return states[values.findIndex((value) => Math.abs(value - dimension.value) < 1e-6)] ?? 'gone';
}

function drawState(sheet: Sheet, state: CellState, x: number, baseline: number, estimated: boolean): void {
  if (!isVerdict(state)) {
    sheet.text('no longer asked', x, baseline, { size: 8 });
    return;
  }
  drawGapMark(sheet, state, x, baseline, { estimated });
  sheet.text(
    VERDICT_WORDS[state] + (estimated && state !== 'notKnown' ? ', est.' : ''),
    x + GAP_MARK_MM + 1,
    baseline,
  );
}

const isVerdict = (state: CellState): state is Verdict => state in VERDICT_WORDS;

/** The present value, and the tried one dashed, each with its words on a line of its own. */
function drawLines(
  sheet: Sheet,
  at: Across,
  { stick, style }: StickPaper,
  { top, foot }: { top: number; foot: number },
): void {
  const { dimension, value } = stick;
  const show = (one: number) => exactValue(one, dimension.unit, style);
  const marks = [
    ...(isTried(stick)
      ? [{ one: value, words: `tried ${show(value)}`, baseline: top + 7.2, dash: [1.6, 1] }]
      : []),
    { one: dimension.value, words: `now ${show(dimension.value)}`, baseline: top + 3.2, dash: [] },
  ];
  for (const { one, baseline, dash } of marks) {
    sheet.line(at.x(one), baseline + 1, at.x(one), foot + 1.6, { pen: PEN.frame, dash });
  }
  for (const { one, words, baseline } of marks) {
    const half = sheet.textWidth(words, { weight: 600 }) / 2;
    const middle = Math.min(Math.max(at.x(one), at.from + half), at.to - half);
    sheet.flag(words, middle, baseline, { weight: 600, align: 'center' });
  }
  at.verdicts.forEach((x, n) => {
    sheet.text(n === 0 ? 'now' : 'tried', x, top + 3.2, { weight: 600 });
  });
}

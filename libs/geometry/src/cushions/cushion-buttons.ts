import { referenceSinkMm } from '../pieces/seat-sink.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import type { PieceOf } from '../room/document.ts';
import type { BoardLines } from './board-lines.ts';
import { buttonColumns, buttonRows } from './button-grid.ts';
import type { HoldDown } from './cushion-choice.ts';
import type { CushionRun } from './cushion-runs.ts';
import type { CushionSettings } from './cushion-settings.ts';
import type { ButtonTable, CushionTufting, RowsOverSeat } from './cushion-spec.ts';
import type { TuftingChoice, TuftLinesOf } from './tufting-choice.ts';
import { borderedField } from './tufting.ts';
import { tuftColumns } from './tufts-on-lines.ts';

/** A cushion on its bench, in the bench's own x. */
export interface OnBench {
  seams: { low: number; high: number };
  /** Seam on the datum side. */
  seamX: number;
  lines: BoardLines | undefined;
  finishedMm: { widthMm: number; depthMm: number; thicknessMm: number };
  fromDatum: (x: number) => number;
}

interface Buttoned {
  tufting: CushionTufting;
  buttons: ButtonTable;
}

const linesFor = (which: TuftLinesOf, { lines }: OnBench): readonly number[] =>
  (which === 'joints' ? lines?.jointsMm : lines?.centresMm) ?? [];

const table = (alignedTo: ButtonTable['alignedTo']): ButtonTable => ({
  columns: [],
  rowsMm: [],
  count: 0,
  pattern: 'grid',
  alignedTo,
});

/**
 * Tufting and buttons of one cushion: on the lines of the bench's boards unless a field of tufts was chosen.
 *
 * @param run - the cushion
 * @param choice - what was chosen of its tufting; otherwise as the bench says
 * @param on - where it lies
 * @param settings - allowances of the workshop
 */
export function buttonsOf(
  run: CushionRun,
  choice: TuftingChoice | undefined,
  on: OnBench,
  settings: CushionSettings,
): Buttoned {
  const wanted = run.piece.kind === 'bench' ? run.piece.upholstery.buttons : undefined;
  const alignedTo = wanted?.alignTo ?? 'joints';
  if (choice?.kind === 'biscuit' || choice?.kind === 'diamond') return fieldOf(choice, on);
  const asked = wanted && wanted.rows > 0 && (wanted.on === 'both' || wanted.on === run.kind);
  if (!wanted || !on.lines || choice?.kind === 'none' || (!asked && !choice)) {
    return { tufting: { kind: 'none', pullMm: 0 }, buttons: table(alignedTo) };
  }
  const edgeMm = settings.buttonToEdge.valueMm;
  const linesMm = linesFor(alignedTo, on);
  const xs = buttonColumns(on.seams.low, on.seams.high, { linesMm, every: wanted.everyBoards, edgeMm });
  // Chosen of a cushion whose bench asks for none there: two rows, as a new bench has.
  const rowsMm = xs.length === 0 ? [] : buttonRows(on.finishedMm.depthMm, asked ? wanted.rows : 2, edgeMm);
  const columns = rowsMm.length === 0 ? [] : columnsAt(xs, on);
  const pullMm = (choice?.kind === 'pull-in' ? choice.pullMm : undefined) ?? settings.buttonPull.valueMm;
  return {
    tufting: columns.length === 0 ? { kind: 'none', pullMm: 0 } : { kind: 'pull-in', pullMm },
    buttons: { ...table(alignedTo), columns, rowsMm, count: columns.length * rowsMm.length },
  };
}

function columnsAt(xs: readonly number[], on: OnBench): ButtonTable['columns'] {
  return xs
    .map((x) => ({
      fromSeamMm: Math.abs(x - on.seamX),
      fromDatumMm: on.fromDatum(x),
      offJointMm: offJoint(x, on),
    }))
    .sort((a, b) => a.fromSeamMm - b.fromSeamMm);
}

function offJoint(x: number, { lines, fromDatum }: OnBench): number {
  const nearest = (lines?.jointsMm ?? []).reduce(
    (best, joint) => (Math.abs(joint - x) < Math.abs(best - x) ? joint : best),
    Infinity,
  );
  return Number.isFinite(nearest) ? fromDatum(x) - fromDatum(nearest) : 0;
}

/** Tufts that fill the face within its border, or stand on the lines of the boards behind. */
function fieldOf(choice: Extract<TuftingChoice, { kind: 'biscuit' | 'diamond' }>, on: OnBench): Buttoned {
  const { kind, borderMm, tuftMm, fullness, columnsOn } = choice;
  const { widthMm, depthMm, thicknessMm } = on.finishedMm;
  const filled = borderedField({ widthMm, heightMm: depthMm }, borderMm, tuftMm);
  const { high, diamond } = filled;
  const steps = kind === 'diamond' ? 2 : 1;
  const along = (count: number, one: number): number[] =>
    Array.from({ length: steps * count + 1 }, (_, i) => borderMm + (i * one) / steps);
  const xs = columnsOn
    ? tuftColumns({
        linesMm: linesFor(columnsOn, on),
        lowMm: on.seams.low,
        highMm: on.seams.high,
        ...{ borderMm, widthMm: tuftMm.widthMm, steps },
      })
    : along(filled.across, diamond.widthMm).map((mm) => on.seams.low + mm);
  const across = Math.max(0, (xs.length - 1) / steps);
  const tufting: CushionTufting = {
    kind,
    pullMm: choice.pullMm ?? thicknessMm,
    field: {
      across,
      high,
      widthMm: across > 0 ? (xs.at(-1)! - xs[0]!) / across : 0,
      ...{ heightMm: diamond.heightMm, borderMm },
      ...(columnsOn && { columnsOn }),
    },
    fullness,
  };
  const alignedTo = columnsOn ?? 'field';
  if (across === 0 || high === 0) return { tufting, buttons: table(alignedTo) };
  const rowsMm = along(high, diamond.heightMm);
  const columns = columnsAt(xs, on);
  const all = columns.length * rowsMm.length;
  return {
    tufting,
    buttons: {
      columns,
      rowsMm,
      // Both counts are odd: of a chessboard so large one more than half is of one colour.
      count: kind === 'diamond' ? (all + 1) / 2 : all,
      pattern: kind === 'diamond' ? 'staggered' : 'grid',
      alignedTo,
    },
  };
}

/** Hold-downs that carry a back cushion; what is only laid or stuck below lets it go down with the seat. */
const CARRIES: ReadonlySet<HoldDown> = new Set([
  'hook-and-loop',
  'snaps',
  'turn-buttons',
  'french-cleat',
  'keyhole-plates',
]);

/**
 * Rows of a back cushion over the seat once the reference sitter has pressed it.
 *
 * A back that stands on the seat goes down with it, so its rows keep their height over the seat; one that is held stays
 * where it is, and the seat goes down from it.
 *
 * @param bench - the bench
 * @param rowsMm - from the top seam
 * @param heightMm - of the cushion, seam to seam
 * @param at - gap below it, and what holds it
 * @source trade practice, from memory: rows are set after the seat cushion compresses when the back stands on it
 */
export function rowsOverSeat(
  bench: PieceOf<'bench'>,
  rowsMm: readonly number[],
  heightMm: number,
  at: { gapMm: number; holdDown: HoldDown | undefined },
): RowsOverSeat {
  const sinkMm = referenceSinkMm(bench);
  const goesDown = at.holdDown === undefined || !CARRIES.has(at.holdDown);
  const below = goesDown ? 0 : at.gapMm + sinkMm / Math.cos(benchLayout(bench).leanRad);
  return { overMm: rowsMm.map((row) => heightMm - row + below), sinkMm, goesDown };
}

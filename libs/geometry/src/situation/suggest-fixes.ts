import type { FitCell, FitSheet } from '@settlewright/anthropometry';
import {
  cellsOf,
  isGain,
  isLoss,
  sheetChanges,
  STATE_RANK,
  stateOf,
  type CellChange,
  type CellState,
} from '../choices/sheet-changes.ts';
import type { SetDocument } from '../room/document.ts';
import { MM_PER_INCH } from '../units/length-style.ts';
import { leversFor, type Lever } from './fix-levers.ts';

/** A change of one number that helps a cell, with all it does elsewhere. */
export interface Fix {
  pieceId: string;
  mark: string;
  key: string;
  label: string;
  unit: 'mm' | 'deg' | '';
  fromValue: number;
  toValue: number;
  /** What the cell says afterwards. */
  reaches: CellState;
  document: SetDocument;
  /** Cells that get better, the asked one included. */
  gains: CellChange[];
  /** Cells that get worse. */
  losses: CellChange[];
}

const MOST_FIXES = 5;
const COARSE_STEPS = 12;
const EIGHTH_MM = MM_PER_INCH / 8;

interface Candidate {
  document: SetDocument;
  sheet: FitSheet;
  state: CellState;
  margin: number;
}

/**
 * Looks for single changes that bring a cell to "fits", or else to "tight", by trying them on the real check.
 *
 * @param input - the set, the cell of its fit sheet, the check to try with, and the rounding step of lengths
 *   (1/8 in unless given)
 * @returns at most five, those that worsen fewest other cells first, then the smallest change
 */
export function suggestFixes(input: {
  document: SetDocument;
  cell: FitCell;
  check: (document: SetDocument) => FitSheet;
  stepMm?: number;
}): Fix[] {
  const { document, cell, check } = input;
  const now = stateOf(cell);
  if (now === undefined || STATE_RANK[now] === STATE_RANK.fits) return [];
  const before = check(document);
  const fixes = leversFor(document, cell, input.stepMm ?? EIGHTH_MM).flatMap((lever) => {
    const found = nearestHelp(lever, cell, now, check);
    if (found === undefined) return [];
    const changes = sheetChanges(before, found.candidate.sheet);
    const { pieceId, mark, key, label, unit, fromValue } = lever;
    const fix: Fix = {
      ...{ pieceId, mark, key, label, unit, fromValue, toValue: found.value },
      reaches: found.candidate.state,
      document: found.candidate.document,
      gains: changes.filter(isGain),
      losses: changes.filter(isLoss),
    };
    return [{ fix, share: Math.abs(found.value - fromValue) / lever.reach }];
  });
  return fixes
    .sort(
      (a, b) =>
        STATE_RANK[b.fix.reaches] - STATE_RANK[a.fix.reaches] ||
        a.fix.losses.length - b.fix.losses.length ||
        a.share - b.share,
    )
    .slice(0, MOST_FIXES)
    .map(({ fix }) => fix);
}

/** The value nearest to the present one at which the cell fits, or else is better than now. */
function nearestHelp(
  lever: Lever,
  cell: FitCell,
  now: CellState,
  check: (document: SetDocument) => FitSheet,
): { value: number; candidate: Candidate } | undefined {
  const start = marginOf(cell);
  const found = [1, -1].flatMap((sign) => {
    const tried = new Map<number, Candidate | undefined>();
    const valueAt = (steps: number) => onGrid(lever, sign, steps);
    const attempt = (steps: number) => {
      if (!tried.has(steps)) tried.set(steps, tryValue(lever, valueAt(steps), cell, check));
      return tried.get(steps);
    };
    const line = scan(lever, attempt, start);
    for (const wanted of [STATE_RANK.fits, STATE_RANK.tight]) {
      if (wanted <= STATE_RANK[now]) continue;
      const steps = firstReaching(line, attempt, wanted);
      const candidate = steps === undefined ? undefined : attempt(steps);
      if (steps !== undefined && candidate !== undefined) return [{ value: valueAt(steps), candidate }];
    }
    return [];
  });
  const better = (a: (typeof found)[number], b: (typeof found)[number]) =>
    STATE_RANK[b.candidate.state] - STATE_RANK[a.candidate.state] ||
    Math.abs(a.value - lever.fromValue) - Math.abs(b.value - lever.fromValue);
  return found.sort(better)[0];
}

/** Coarse steps in one direction, until the number cannot move on or plainly makes it worse. */
function scan(lever: Lever, attempt: (steps: number) => Candidate | undefined, start: number): number[] {
  const most = Math.max(1, Math.floor(lever.reach / lever.stepSize));
  const coarse = Math.max(1, Math.ceil(most / COARSE_STEPS));
  const line: number[] = [];
  for (let steps = coarse; steps <= most; steps += coarse) {
    const candidate = attempt(steps);
    if (candidate === undefined) {
      // The limit may lie between two coarse steps.
      if (steps > 1 && attempt(steps - coarse + 1) !== undefined) line.push(steps - coarse + 1);
      break;
    }
    line.push(steps);
    if (STATE_RANK[candidate.state] === STATE_RANK.fits) break;
    if (line.length === 3 && candidate.margin < start && candidate.state !== 'tight') break;
  }
  return line;
}

/** Fewest steps that reach a rank, narrowed down between the last coarse step that does not and the first that does. */
function firstReaching(
  line: number[],
  attempt: (steps: number) => Candidate | undefined,
  wanted: number,
): number | undefined {
  const reaches = (steps: number) => STATE_RANK[attempt(steps)?.state ?? 'gone'] >= wanted;
  const index = line.findIndex(reaches);
  let high = line[index];
  if (high === undefined) return undefined;
  let low = line[index - 1] ?? 0;
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (reaches(middle)) high = middle;
    else low = middle;
  }
  return high;
}

/** The n-th value of the rounding grid above or below the present value. */
function onGrid(lever: Lever, sign: number, steps: number): number {
  const units = lever.fromValue / lever.stepSize;
  const base = sign > 0 ? Math.floor(units + 1e-6) : Math.ceil(units - 1e-6);
  return (base + sign * steps) * lever.stepSize;
}

function tryValue(
  lever: Lever,
  value: number,
  cell: FitCell,
  check: (document: SetDocument) => FitSheet,
): Candidate | undefined {
  const document = lever.at(value);
  if (document === undefined) return undefined;
  const sheet = check(document);
  const after = cellsOf(sheet).find(({ id }) => id === cell.id);
  const state = (after && stateOf(after)) ?? 'gone';
  return { document, sheet, state, margin: after === undefined ? -Infinity : marginOf(after) };
}

function marginOf(cell: FitCell): number {
  return cell.outcome.kind === 'verdict' ? cell.outcome.margin : 0;
}

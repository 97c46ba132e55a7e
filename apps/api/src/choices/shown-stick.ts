import type { FitSheet } from '@settlewright/anthropometry';
import {
  type CellState,
  orderedRows,
  type StickBand,
  type StickRow,
  type StoryStick,
  whereAll,
} from '@settlewright/geometry';
import type { CrowdTold, ValueShare } from './crowd-shares.service';

/** A row of a stick, without the ends and ranges of a body where its reader sees no measures. */
export type ShownRow = Omit<StickRow, 'surelyTight' | 'perhapsTight'> &
  Partial<Pick<StickRow, 'surelyTight' | 'perhapsTight'>>;

/** A story stick as far as its reader may see it. */
export interface ShownStick extends Pick<
  StoryStick,
  'dimension' | 'values' | 'ruleIds' | 'clauses' | 'allFit' | 'allTight'
> {
  detail: 'full' | 'verdicts';
  step: number;
  /** Rule whose stretches are shown, or `all`. */
  shownRule: string;
  rows: ShownRow[];
  bands: StickBand[];
  value: number;
  /** Worst verdict of each row at the value. */
  atValue: { placeId: string; state: CellState }[];
  shares?: { told: CrowdTold; points: ValueShare[]; joint: ValueShare[] };
}

type Answers = Pick<ShownStick, 'values' | 'rows' | 'allFit' | 'allTight'>;

/** What a stick says of its sitters, rows as they are read. */
export const fullAnswers = ({ values, rows, allFit, allTight }: StoryStick): Answers => ({
  values,
  rows: orderedRows(rows),
  allFit,
  allTight,
});

/** The same by verdicts at some of the values alone: a stretch runs from one of them to another. */
export function coarseAnswers(stick: StoryStick, seen: readonly number[]): Answers {
  const at = stick.values.flatMap((value, n) => (seen.includes(value) ? [n] : []));
  const values = at.map((n) => stick.values[n] as number);
  const rows = stick.rows.map(({ sitterId, placeId, name, estimated, states: all }) => {
    const states = at.map((n) => all[n] ?? 'gone');
    const where = (good: CellState[]) => whereAll(values, [{ states }], good);
    const tight = where(['fits', 'tight']);
    return { sitterId, placeId, name, estimated, fits: where(['fits']), tight, states };
  });
  return {
    values,
    rows: orderedRows(rows),
    allFit: whereAll(values, rows, ['fits']),
    allTight: whereAll(values, rows, ['fits', 'tight']),
  };
}

const WORST_FIRST: readonly CellState[] = ['gone', 'wontFit', 'notKnown', 'tight', 'fits'];

/** The worst of the shown verdicts of a place; gone where none is given. */
export function stateAt(sheet: FitSheet, placeId: string, shown: ReadonlySet<string>): CellState {
  const cells = sheet.rows.find((row) => row.placeId === placeId)?.cells ?? [];
  const said = cells.flatMap(({ ruleId, outcome }) =>
    shown.has(ruleId) && outcome.kind === 'verdict' ? [outcome.verdict] : [],
  );
  return WORST_FIRST.find((state) => (said as CellState[]).includes(state)) ?? 'gone';
}

import type { FitCell, FitSheet, RuleBook, SitterRow } from '@settlewright/anthropometry';
import {
  compareSheets,
  documentAt,
  type CellState,
  type ComparedCell,
  type Dimension,
  type FreeDimension,
  type SetDocument,
  type Tried,
} from '@settlewright/geometry';
import { verdictWord } from '@/components/verdict.tsx';

/** One dimension in an answer. */
export interface Move {
  dimension: Dimension;
  from: number;
  to: number;
}

/** What happens to one person, in words by check: "seat height fits". */
export interface PersonEffect {
  sitterId: string;
  name: string;
  checks: string[];
}

/** Everything that an answer does. */
export interface Effects {
  document: SetDocument;
  sheet: FitSheet;
  /** Dimensions that change, then those that stay. */
  moves: Move[];
  stays: Move[];
  better: PersonEffect[];
  worse: PersonEffect[];
  /** Checks that are still not met, not known or no longer asked. */
  short: PersonEffect[];
  /** Of those to serve: who has a place and every check at least tight, none of them gone; then, and as it is now. */
  served: number;
  servedNow: number;
  of: number;
  tight: number;
  /** Pieces and ways that turn better or worse. */
  piecesBetter: string[];
  piecesWorse: string[];
}

/** A move smaller than this is none, in any unit. */
const SAME = 1e-3;

export const checkWords = (ruleBook: RuleBook, ruleId: string): string =>
  ruleBook.rule(ruleId).columnName.toLowerCase();

const STATE_WORDS: Record<'inside' | 'outside' | 'gone', string> = {
  inside: 'inside the clause',
  outside: 'outside the clause',
  gone: 'no longer asked',
};

const stateWords = (state: CellState): string =>
  state === 'inside' || state === 'outside' || state === 'gone' ? STATE_WORDS[state] : verdictWord(state);

const isShort = ({ outcome }: FitCell): boolean =>
  outcome.kind === 'verdict' && (outcome.verdict === 'wontFit' || outcome.verdict === 'notKnown');

/** Cells of a row that are not at least tight. */
export const shortCells = (row: SitterRow): FitCell[] => row.cells.filter(isShort);

const isTight = ({ outcome }: FitCell): boolean => outcome.kind === 'verdict' && outcome.verdict === 'tight';

/** How many are served at every place they have; what is not known serves nobody. */
function servedIn(
  { rows }: FitSheet,
  toServe: ReadonlySet<string>,
  also: (row: SitterRow) => boolean = () => true,
): number {
  const own = (sitterId: string) => rows.filter((row) => row.sitterId === sitterId);
  const isServed = (row: SitterRow) => isAnswered(row) && shortCells(row).length === 0 && also(row);
  return [...toServe].filter((id) => own(id).length > 0 && own(id).every(isServed)).length;
}

/** Somebody without a place keeps a row in which nothing is answered. */
const isAnswered = (row: SitterRow): boolean => row.cells.some(({ outcome }) => outcome.kind === 'verdict');

const NO_PLACE = 'no place';

interface Ground {
  document: SetDocument;
  dimensions: readonly Dimension[];
  free: readonly FreeDimension[];
  check: (document: SetDocument) => FitSheet;
  ruleBook: RuleBook;
  /** Everybody with a body; a place without one is neither better nor worse. */
  people: ReadonlySet<string>;
  /** Those of them who are to be served. */
  toServe: ReadonlySet<string>;
}

/** A sheet of those alone whose body is known. */
const ofPeople = (sheet: FitSheet, people: ReadonlySet<string>): FitSheet => ({
  ...sheet,
  rows: sheet.rows.filter(({ sitterId }) => people.has(sitterId)),
});

/** What an answer does to everybody; nothing where a piece cannot be so. */
export function effectsOf(tried: Pick<Tried, 'values'>, ground: Ground): Effects | undefined {
  const { document, dimensions, free, check, ruleBook, people, toServe } = ground;
  const next = documentAt(ground, tried.values);
  if (!next) return undefined;
  const sheet = ofPeople(check(next), people);
  const before = ofPeople(check(document), people);
  const compared = compareSheets(before, sheet);
  const placed = new Set(sheet.rows.filter(isAnswered).map(({ sitterId }) => sitterId));
  const unplaced = [...new Map([...before.rows, ...sheet.rows].map((row) => [row.sitterId, row])).values()]
    .filter(({ sitterId }) => !placed.has(sitterId))
    .map(({ sitterId, name }): PersonEffect => ({ sitterId, name, checks: [NO_PLACE] }));
  const wasPlaced = new Set(before.rows.filter(isAnswered).map(({ sitterId }) => sitterId));
  const isUnplaced = ({ sitterId }: Pick<PersonEffect, 'sitterId'>) => !placed.has(sitterId);
  const goneOf = (sitterId: string) =>
    compared.sitters.find((one) => one.sitterId === sitterId)?.losses.filter(({ to }) => to === 'gone') ?? [];
  const all = free.flatMap(({ dimensionId }, i): Move[] => {
    const dimension = dimensions.find(({ id }) => id === dimensionId);
    return dimension ? [{ dimension, from: dimension.value, to: tried.values[i] as number }] : [];
  });
  const isMove = ({ from, to }: Move) => Math.abs(to - from) > SAME;
  const told = (pick: (one: (typeof compared.sitters)[number]) => ComparedCell[]): PersonEffect[] =>
    compared.sitters.flatMap((one) => {
      const checks = pick(one).map(({ ruleId, to }) => `${checkWords(ruleBook, ruleId)} ${stateWords(to)}`);
      return checks.length > 0 ? [{ sitterId: one.sitterId, name: one.name, checks }] : [];
    });
  const piece = ({ ruleId, marks, to }: ComparedCell) =>
    `${[checkWords(ruleBook, ruleId), marks.join(' and ')].filter(Boolean).join(', ')}: ${stateWords(to)}`;
  return {
    document: next,
    sheet,
    moves: all.filter(isMove),
    stays: all.filter((move) => !isMove(move)),
    better: told(({ gains }) => gains),
    worse: [
      ...told(({ losses }) => losses).filter((one) => !isUnplaced(one)),
      ...unplaced.filter(({ sitterId }) => wasPlaced.has(sitterId)),
    ],
    short: [
      ...sheet.rows
        .filter((row) => !isUnplaced(row))
        .flatMap((row) => {
          const checks = [
            ...shortCells(row).map((cell) => checkWords(ruleBook, cell.ruleId)),
            ...goneOf(row.sitterId).map(
              ({ ruleId }) => `${checkWords(ruleBook, ruleId)} ${STATE_WORDS.gone}`,
            ),
          ];
          return checks.length > 0 ? [{ sitterId: row.sitterId, name: row.name, checks }] : [];
        }),
      ...unplaced,
    ],
    served: servedIn(sheet, toServe, ({ sitterId }) => goneOf(sitterId).length === 0),
    servedNow: servedIn(before, toServe),
    of: toServe.size,
    tight: sheet.rows.flatMap(({ cells }) => cells).filter(isTight).length,
    piecesBetter: compared.pieces.gains.map(piece),
    piecesWorse: compared.pieces.losses.map(piece),
  };
}

import type { FitSheet, SitterRow } from '@settlewright/anthropometry';
import type { SetDocument } from '../room/document.ts';
import type { Dimension } from './dimension.ts';
import { stateOf } from './sheet-changes.ts';

/** A dimension that may be chosen, and how far. */
export interface FreeDimension {
  dimensionId: string;
  /** In the dimension's unit; what the look demands is written as a narrow range, or left out of the list. */
  min: number;
  max: number;
  /** Rounding step. */
  step: number;
}

/** A cast member's check that is not at least tight. */
export interface Miss {
  sitterId: string;
  /** Absent where the sitter's place is gone altogether. */
  ruleId?: string;
  /** Millimetres (or the rule's unit) missing to the fail line; 0 for what is not known or no longer asked. */
  byMm: number;
  /** The present set answers it and this one does not: it counts as the worst miss, never as a gain. */
  gone?: true;
}

/** A choice of all free dimensions that was tried. Plain JSON, so that a search can go on from what is known. */
export interface Tried {
  /** One value for each free dimension, in their order. */
  values: number[];
  misses: Miss[];
  /** Checks that are tight. */
  tight: number;
  /** Checks about pieces and ways, and clauses, that turn worse against the present set. */
  worse: number;
  /** Joint share of the population, 0 to 1; absent without a population. */
  share?: number;
  /** Sum of the moves, each against its range: 0 for the present values. */
  distance: number;
}

/** What a search looks at. */
export interface SuggestInput {
  document: SetDocument;
  dimensions: readonly Dimension[];
  free: readonly FreeDimension[];
  /** Fit sheet of a set with everyone who must be served. */
  check: (document: SetDocument) => FitSheet;
  /** Joint share of the population in a set, 0 to 1. */
  share?: (document: SetDocument) => number;
  /** Results of an earlier run of the same search. */
  known?: readonly Tried[];
  /** Most choices to try. */
  most?: number;
  /** Hears of each choice that was tried anew, to be `known` to a later run. */
  onTried?: (tried: Tried) => void;
}

/**
 * The set with all free dimensions at their values.
 *
 * @param input - the set and its dimensions
 * @param values - one value for each free dimension
 * @returns the set; `undefined` where a piece cannot be so
 */
export function documentAt(
  { document, dimensions, free }: Pick<SuggestInput, 'document' | 'dimensions' | 'free'>,
  values: readonly number[],
): SetDocument | undefined {
  return free.reduce<SetDocument | undefined>((on, { dimensionId }, i) => {
    const dimension = dimensions.find(({ id }) => id === dimensionId);
    return on && dimension?.at(values[i] as number, on);
  }, document);
}

/** Tries choices and remembers them. */
export interface Trials {
  /** Moves a choice onto its rounding steps and into its ranges. */
  onGrid(values: readonly number[]): number[];
  /** The trial of a choice; `undefined` where a piece cannot be so. */
  at(values: readonly number[]): Tried | undefined;
  all(): Tried[];
  /** The present values, as far as the ranges hold them. */
  present: number[];
}

/**
 * Prepares the trying of choices.
 *
 * @param input - what the search looks at
 * @returns trials with the present set as their measure
 */
export function createTrials(input: SuggestInput): Trials {
  const { free, dimensions, check, share } = input;
  const before = check(input.document);
  const now = free.map(({ dimensionId }) => dimensions.find(({ id }) => id === dimensionId)?.value ?? 0);
  const found = new Map<string, Tried | undefined>(
    (input.known ?? []).map((one) => [keyOf(one.values), one]),
  );

  const onGrid = (values: readonly number[]) =>
    values.map((value, i) => {
      const { min, max, step } = free[i] as FreeDimension;
      const rounded =
        Math.abs(value - (now[i] as number)) < step / 2
          ? (now[i] as number)
          : Math.round(value / step) * step;
      return Math.min(max, Math.max(min, rounded));
    });

  function attempt(values: readonly number[]): Tried | undefined {
    const document = documentAt(input, values);
    if (document === undefined) return undefined;
    const sheet = check(document);
    return {
      values: [...values],
      ...answersOf(before, sheet),
      worse: worseOf(before, sheet),
      ...(share ? { share: share(document) } : {}),
      distance: values.reduce((sum, value, i) => {
        const { min, max, step } = free[i] as FreeDimension;
        return sum + Math.abs(value - (now[i] as number)) / Math.max(max - min, step);
      }, 0),
    };
  }

  return {
    onGrid,
    at(values) {
      const key = keyOf(values);
      if (found.has(key)) return found.get(key);
      const tried = attempt(values);
      found.set(key, tried);
      if (tried) input.onTried?.(tried);
      return tried;
    },
    all: () => [...found.values()].filter((one) => one !== undefined),
    present: onGrid(now),
  };
}

const keyOf = (values: readonly number[]): string => values.map((value) => value.toFixed(3)).join(' ');

/**
 * What a sheet answers to the sitters, against the present one.
 *
 * @param before - sheet of the present set
 * @param after - sheet of the set that is tried
 * @returns misses, among them every verdict of the present sheet that is gone and every sitter without a place; and the
 *   tight checks
 */
export function answersOf(before: FitSheet, after: FitSheet): Pick<Tried, 'misses' | 'tight'> {
  const verdicts = after.rows.flatMap(({ sitterId, cells }) =>
    cells.flatMap(({ ruleId, outcome }) =>
      outcome.kind === 'verdict' ? [{ sitterId, ruleId, ...outcome }] : [],
    ),
  );
  const failed = verdicts.flatMap(({ sitterId, ruleId, verdict, margin }): Miss[] => {
    if (verdict === 'wontFit') return [{ sitterId, ruleId, byMm: Math.max(0, -margin) }];
    return verdict === 'notKnown' ? [{ sitterId, ruleId, byMm: 0 }] : [];
  });
  return {
    misses: [...failed, ...goneIn(before, after)],
    tight: verdicts.filter(({ verdict }) => verdict === 'tight').length,
  };
}

function goneIn(before: FitSheet, after: FitSheet): Miss[] {
  const earlier = new Map(before.rows.map((row) => [row.sitterId, verdictRules(row)]));
  const later = new Map(after.rows.map((row) => [row.sitterId, verdictRules(row)]));
  const sitters = new Set([...earlier.keys(), ...later.keys()]);
  return [...sitters].flatMap((sitterId): Miss[] => {
    const now = later.get(sitterId) ?? [];
    const left = [...now];
    const gone = (earlier.get(sitterId) ?? []).filter((ruleId) => {
      const at = left.indexOf(ruleId);
      if (at >= 0) left.splice(at, 1);
      return at < 0;
    });
    return [
      // Somebody without a place keeps a row in which nothing is answered.
      ...(now.length > 0 ? [] : [{ sitterId, byMm: 0, gone: true as const }]),
      ...gone.map((ruleId) => ({ sitterId, ruleId, byMm: 0, gone: true as const })),
    ];
  });
}

const verdictRules = ({ cells }: SitterRow): string[] =>
  cells.flatMap(({ ruleId, outcome }) => (outcome.kind === 'verdict' ? [ruleId] : []));

const isGood = (state: ReturnType<typeof stateOf>): boolean =>
  state === 'fits' || state === 'tight' || state === 'inside';

/**
 * Answers about pieces and ways that were good and are not.
 *
 * @param before - sheet of the present set
 * @param after - sheet of the set that is tried
 * @returns how many; a good answer that is gone is one of them
 */
export function worseOf(before: FitSheet, after: FitSheet): number {
  const later = new Map(after.piecesAndWays.map((cell) => [cell.id, stateOf(cell)]));
  return before.piecesAndWays.filter((cell) => isGood(stateOf(cell)) && !isGood(later.get(cell.id))).length;
}

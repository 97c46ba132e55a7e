import { TAPE_MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import type { BodyModel } from '../people/body-model.ts';
import { quantile } from '../people/estimate.ts';
import type { KnownPerson } from '../people/person.ts';
import type { FitCell, SitterRow } from './fit-sheet.ts';
import { isUncertain } from './verdict.ts';

/** What a tape can take of a person who is not yet known by it: the seated measures, stature and weight. */
export type NextMeasureKey = (typeof TAPE_MEASURE_KEYS)[number] | 'stature' | 'weight_kg';

/** One measurement and what it would settle. */
export interface NextMeasure {
  key: NextMeasureKey;
  /** How many of the uncertain verdicts it settles on average, of `uncertain`. */
  settles: number;
  /** Rules whose verdict it settles more often than not. */
  ruleIds: string[];
}

/** The measurements to take next, worked out by trying them. */
export interface NextMeasures {
  /** Rules whose verdict is not as sure as asked. */
  uncertain: string[];
  /** The best one, then the best one after it; empty when nothing is uncertain or no tape helps. */
  order: NextMeasure[];
}

/** Slices of equal probability that stand for what a tape may find. */
const SLICES = 7;
/** Fewer for the second measurement: it is tried once for each finding of the first. */
const SECOND_SLICES = 5;
/** A measurement that settles less than this on average is not worth a visit. */
const WORTH_TAKING = 0.15;

/**
 * True when none of the three plain answers of a verdict is as sure as asked.
 *
 * @param cell - cell of a fit sheet
 * @param confidence - probability a verdict asks for
 */
export function isUncertainCell({ outcome }: FitCell, confidence: number): boolean {
  return outcome.kind === 'verdict' && isUncertain(outcome.probability, confidence);
}

/**
 * Which one or two measurements would settle most of a person's uncertain verdicts. Each candidate is tried: for
 * values it may have, given all that is known, the person's checks are made again and the verdicts that became sure
 * are counted.
 *
 * @param input - the person; the body model; the person's row of the fit sheet for whatever is known of them, which
 *   may leave out other rules than those named; and the probability a verdict asks for
 * @returns the uncertain rules, and at most two measurements in the order to take them
 */
export function nextMeasures(input: {
  person: KnownPerson;
  model: BodyModel;
  rowFor: (person: KnownPerson, ruleIds?: readonly string[]) => SitterRow;
  confidence: number;
}): NextMeasures {
  const { person, confidence, rowFor } = input;
  const open = rowFor(person).cells.filter((cell) => isUncertainCell(cell, confidence));
  const uncertain = open.map(({ ruleId }) => ruleId);
  const candidates = candidatesFor(open, person);
  const first = bestOf(candidates.map((key) => tried(input, uncertain, person, key, SLICES)));
  if (!first) return { uncertain, order: [] };
  const left = uncertain.length - first.settles;
  const rest = candidates.filter((key) => key !== first.key);
  if (left < WORTH_TAKING) return { uncertain, order: [first] };
  const second = bestOf(rest.map((key) => afterFirst(input, uncertain, first, key)));
  return { uncertain, order: second ? [first, second] : [first] };
}

/** Measures that the uncertain verdicts name, and stature or weight where they are not measured. */
function candidatesFor(open: readonly FitCell[], person: KnownPerson): NextMeasureKey[] {
  const named = new Set<MeasureKey>(
    open.flatMap(({ outcome }) => (outcome.kind === 'verdict' ? outcome.settleWith : [])),
  );
  if (open.length > 0 && person.stature?.source !== 'measured') named.add('stature');
  if (open.length > 0) named.add('weight_kg');
  const takeable: readonly NextMeasureKey[] = ['stature', 'weight_kg', ...TAPE_MEASURE_KEYS];
  return takeable.filter((key) => named.has(key) && !isTaken(person, key));
}

const isTaken = (person: KnownPerson, key: NextMeasureKey): boolean =>
  person.measured[key] !== undefined ||
  (key === 'stature' && person.stature?.source === 'measured') ||
  (key === 'weight_kg' && person.weightKg !== undefined);

/** A person as known after one more measurement. */
function withMeasure(person: KnownPerson, key: NextMeasureKey, value: number): KnownPerson {
  if (key === 'stature') return { ...person, stature: { mm: value, source: 'measured' } };
  if (key === 'weight_kg') return { ...person, weightKg: value };
  return { ...person, measured: { ...person.measured, [key]: value } };
}

function findings(model: BodyModel, person: KnownPerson, key: NextMeasureKey, slices: number): KnownPerson[] {
  const belief = model.predict(person).estimate(key);
  return Array.from({ length: slices }, (_, i) =>
    withMeasure(person, key, quantile(belief, (i + 0.5) / slices)),
  );
}

type Input = Parameters<typeof nextMeasures>[0];

/** Share of findings after which each rule of a list is settled. */
function settledShares(input: Input, people: readonly KnownPerson[], ruleIds: readonly string[]): number[] {
  const counts = ruleIds.map(() => 0);
  for (const person of people) {
    const cells = new Map(input.rowFor(person, ruleIds).cells.map((cell) => [cell.ruleId, cell]));
    for (const [i, ruleId] of ruleIds.entries()) {
      const cell = cells.get(ruleId);
      if (cell && !isUncertainCell(cell, input.confidence)) counts[i] = (counts[i] as number) + 1;
    }
  }
  return counts.map((count) => count / people.length);
}

function tried(
  input: Input,
  ruleIds: readonly string[],
  person: KnownPerson,
  key: NextMeasureKey,
  slices: number,
): NextMeasure {
  return measured(key, ruleIds, settledShares(input, findings(input.model, person, key, slices), ruleIds));
}

const measured = (
  key: NextMeasureKey,
  ruleIds: readonly string[],
  shares: readonly number[],
): NextMeasure => ({
  key,
  settles: shares.reduce((sum, share) => sum + share, 0),
  ruleIds: ruleIds.filter((_, i) => (shares[i] as number) > 0.5),
});

/** What a second measurement settles beyond the first, whatever the first found. */
function afterFirst(
  input: Input,
  ruleIds: readonly string[],
  first: NextMeasure,
  key: NextMeasureKey,
): NextMeasure {
  const people = findings(input.model, input.person, first.key, SECOND_SLICES).flatMap((person) =>
    findings(input.model, person, key, SECOND_SLICES),
  );
  const both = measured(key, ruleIds, settledShares(input, people, ruleIds));
  return {
    key,
    settles: both.settles - first.settles,
    ruleIds: both.ruleIds.filter((ruleId) => !first.ruleIds.includes(ruleId)),
  };
}

function bestOf(measures: readonly NextMeasure[]): NextMeasure | undefined {
  return measures
    .filter(({ settles }) => settles >= WORTH_TAKING)
    .reduce<NextMeasure | undefined>(
      (best, one) => (best && best.settles >= one.settles ? best : one),
      undefined,
    );
}

import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import { foamLoads, strainUnder } from '../checks/seat-sink.ts';
import type { FoamSituation } from '../checks/situation.ts';
import type { Draws } from '../populations/population.ts';
import { NOBODY, OPEN, STEPS_PER_MM, wordsFor, type NeedColumn } from './bits.ts';

/** The foam of a seat without its thickness. */
export type Firmness = Omit<FoamSituation, 'thicknessMm'>;

/**
 * What bodies need of a set by one line of a rule: a linear combination of measures, and the share of its thickness
 * that a cushion goes down under each person's own weight. The largest factor is 1, so that rules which ask for the
 * same thing share one column.
 */
export interface Need {
  id: string;
  parts: readonly (readonly [key: MeasureKey, factor: number])[];
  /** Foam under the person and the millimetres that a strain of 1 counts. */
  sink?: { foam: Firmness; factor: number };
}

/** People whose need lies between two ends, in steps of a need column. */
export interface Window {
  need: Need;
  low: number;
  high: number;
  /** The same for windows that the same people lie in. */
  key: string;
}

export const windowFrom = (need: Need, low: number, high: number): Window => ({
  need,
  low,
  high,
  key: `${need.id}:${low}:${high}`,
});

/** `sum of factors times measures + constant >= 0`, as a rule's line comes out of the symbols. */
export interface Room {
  constant: number;
  factors: ReadonlyMap<MeasureKey, number>;
  sink?: { foam: Firmness; factor: number };
}

const DIGITS = 12;
const NOTHING = 1e-12;

/** The same for foams under which people sink alike. */
export function foamName({ ifd25N, supportFactor, layers, wrap, tested }: Firmness): string {
  const whole = layers ? layers.map(({ share, ifd25N: own }) => `${share}x${own}`).join('+') : ifd25N;
  const soft = wrap ? `,${wrap.share}x${wrap.lost}` : '';
  return `${whole}/${supportFactor}${soft}${tested ? `*${tested.factor}` : ''}`;
}

/**
 * Splits a line into what bodies need and what the set offers.
 *
 * @param room - what is left to the line, millimetres; the line is kept while this is at least 0
 * @returns the window of the need, or plain yes or no when no body enters
 */
export function windowOf({ constant, factors, sink }: Room): Window | boolean {
  const parts = [...factors].filter(([, factor]) => Math.abs(factor) > NOTHING);
  if (parts.length > 1) parts.sort(([a], [b]) => orderOf(a) - orderOf(b));
  const sinks = sink !== undefined && Math.abs(sink.factor) > NOTHING;
  const lead = largest(parts) ?? (sinks ? Math.sign(sink.factor) : 0);
  if (lead === 0) return constant >= 0;
  const need = needOf(
    parts.map(([key, factor]) => [key, factor / lead]),
    sinks ? { foam: sink.foam, factor: sink.factor / lead } : undefined,
  );
  const end = steps(-constant / lead);
  return lead > 0 ? windowFrom(need, end, OPEN) : windowFrom(need, -OPEN, end);
}

const orderOf = (key: MeasureKey): number => MEASURE_KEYS.indexOf(key);

/** Of factors alike in size the first. */
const largest = (parts: Need['parts']): number | undefined =>
  parts.reduce<number | undefined>(
    (most, [, factor]) => (Math.abs(factor) > Math.abs(most ?? 0) ? factor : most),
    undefined,
  );

function needOf(parts: Need['parts'], sink: Need['sink']): Need {
  const names: string[] = parts.map(([key, factor]) =>
    factor === 1 ? key : `${factor.toPrecision(DIGITS)}*${key}`,
  );
  if (sink) names.push(`${sink.factor.toPrecision(DIGITS)}*sink ${foamName(sink.foam)}`);
  return { id: names.join('+'), parts, ...(sink ? { sink } : {}) };
}

const steps = (mm: number): number => Math.max(-OPEN, Math.min(OPEN, Math.floor(mm * STEPS_PER_MM)));

/** Columns of some people; a measure that is not there is not known of them. */
export type MeasureColumns = Draws['columns'];

/** True when every measure of a need is known of these people. */
export function isKnown({ parts, sink }: Need, columns: MeasureColumns): boolean {
  const keys: MeasureKey[] = parts.map(([key]) => key);
  if (sink) keys.push('weight_kg');
  return keys.every((key) => Number.isFinite(columns[key]?.[0]));
}

/** Measures of some people, one after another. */
export interface Measured {
  /** Millimetres, kilograms for the weight. */
  measure(key: MeasureKey): Float32Array;
  /** Share of its thickness that a foam goes down under each of them. */
  strain(foam: Firmness): Float32Array;
}

/**
 * What each of some people needs.
 *
 * @param need - all its measures known
 * @param measured - the people
 * @param scratch - one number a person, to be written over
 * @returns the need in steps
 */
export function needColumn({ parts, sink }: Need, measured: Measured, scratch: Float64Array): NeedColumn {
  const terms: Term[] = parts.map(([key, factor]) => [measured.measure(key), factor]);
  if (sink) terms.push([measured.strain(sink.foam), sink.factor]);
  const people = scratch.length;
  const column = new Int32Array(wordsFor(people) * 32).fill(NOBODY, people);
  const [one, other, ...more] = terms;
  if (!one) return column.fill(0, 0, people);
  if (!other) fillByOne(column, people, one);
  else if (more.length === 0) fillByTwo(column, people, one, other);
  else {
    scratch.fill(0);
    for (const term of more) addTimes(scratch, term);
    addTimes(scratch, one);
    fillByTwo(column, people, [scratch, 1], other);
  }
  return column;
}

type Term = readonly [values: Float32Array | Float64Array, factor: number];

function fillByOne(column: NeedColumn, people: number, [values, factor]: Term): void {
  const by = factor * STEPS_PER_MM;
  for (let i = 0; i < people; i += 1) column[i] = by * (values[i] as number);
}

function fillByTwo(column: NeedColumn, people: number, [first, factor]: Term, [second, other]: Term): void {
  const [by, and] = [factor * STEPS_PER_MM, other * STEPS_PER_MM];
  for (let i = 0; i < people; i += 1) column[i] = by * (first[i] as number) + and * (second[i] as number);
}

function addTimes(sum: Float64Array, [values, factor]: Term): void {
  for (let i = 0; i < sum.length; i += 1) sum[i] = (sum[i] as number) + factor * (values[i] as number);
}

/**
 * Share of its thickness that a foam goes down under each of some people.
 *
 * @param weights - kilograms
 * @source `strainUnder`
 */
export function strainsUnder(foam: Firmness, weights: Float32Array): Float32Array {
  const loads = foamLoads(foam);
  const strains = new Float32Array(weights.length);
  for (let i = 0; i < weights.length; i += 1) strains[i] = strainUnder(loads, weights[i] as number);
  return strains;
}

import type { MeasureKey } from '../measures/measures.ts';
import type { Body } from '../people/body.ts';
import { saysSomething } from '../people/child-body.ts';
import { best, collectPredicted, minus, type Amount, type PredictedMeasure } from './amount.ts';
import type { LedgerLine, LimitLines, Verdict, VerdictOutcome } from './fit-sheet.ts';
import { probabilityOfRoom, roomMoved, roomQuantile, roomWithin, type Band } from './room.ts';

/** What a rule asks: a value, and the lines it should keep between. */
export interface Question {
  value: Amount;
  pass: Band;
  fail: Band;
  /** The sum that leads to the lines of the side that is nearest. */
  bodyLedger: (side: 'lower' | 'upper') => LedgerLine[];
  setLedger: () => LedgerLine[];
}

/** How sure a verdict must be, and how far past a line still counts as on it. */
export interface Judgement {
  confidence: number;
  tolerance: number;
}

/** Share of the margin's variance from which measuring is worth while. */
const WORTH_MEASURING = 0.05;
const MOST_MEASURES = 3;
const ROUNDING = 1e-9;

/** A verdict before its sums are written out. */
interface Finding extends Pick<
  VerdictOutcome,
  'verdict' | 'value' | 'pass' | 'fail' | 'margin' | 'probability'
> {
  marginRange: VerdictOutcome['marginRange'];
  /** The side of the nearest fail line. */
  side: 'lower' | 'upper';
  /** What was not taken from the sitter. */
  predicted: PredictedMeasure[];
}

/**
 * The fail lines that count: a fail line is never stricter than its pass line. A small sitter's own pass line may lie
 * beyond a fail line that is a plain number; then the two are one.
 *
 * @param question - lines in the rule's unit
 * @returns the fail lines, each side the rule's or the pass line
 */
export function failLines({ pass, fail }: Pick<Question, 'pass' | 'fail'>): Band {
  const band: Band = {};
  if (fail.lower) band.lower = pass.lower && best(fail.lower) > best(pass.lower) ? pass.lower : fail.lower;
  if (fail.upper) band.upper = pass.upper && best(fail.upper) < best(pass.upper) ? pass.upper : fail.upper;
  return band;
}

/**
 * Judges one question: the value against its lines, for all that is not known of the sitter.
 *
 * Fits when the value keeps within the pass lines with at least the asked probability; won't fit when it lies beyond
 * a fail line with that probability; else tight when it keeps within the fail lines with it; else not known.
 *
 * @param question - value and lines in the rule's unit
 * @param judgement - probability asked for, and the tolerance in the rule's unit; a boundary belongs to the better side
 * @returns the finding, to be written out by `writeOut`
 */
export function find(question: Question, judgement: Judgement): Finding {
  const predicted = predictedIn(question);
  const failBand = failLines(question);
  const pass = linesOf(question.pass);
  const fail = linesOf(failBand);
  const value = best(question.value);
  const toLower = fail.lower === undefined ? Infinity : value - fail.lower;
  const toUpper = fail.upper === undefined ? Infinity : fail.upper - value;

  let probability: VerdictOutcome['probability'];
  let marginRange: VerdictOutcome['marginRange'];
  if (predicted.length === 0) {
    const insidePass = isWithin(value, pass, judgement.tolerance) ? 1 : 0;
    const insideFail = isWithin(value, fail, judgement.tolerance) ? 1 : insidePass;
    probability = { pass: insidePass, insideFail };
  } else {
    const passRooms = roomWithin(question.value, question.pass);
    const failRooms = roomMoved(passRooms, question.pass, failBand) ?? roomWithin(question.value, failBand);
    const insidePass = probabilityOfRoom(passRooms, -judgement.tolerance);
    const insideFail = Math.max(insidePass, probabilityOfRoom(failRooms, -judgement.tolerance));
    probability = { pass: insidePass, insideFail };
    marginRange = { low: roomQuantile(failRooms, 0.05), high: roomQuantile(failRooms, 0.95) };
  }
  return {
    verdict: verdictFor(probability, judgement.confidence),
    value,
    pass,
    fail,
    margin: Math.min(toLower, toUpper),
    probability,
    marginRange,
    side: toLower <= toUpper ? 'lower' : 'upper',
    predicted,
  };
}

const isWithin = (value: number, { lower, upper }: LimitLines, tolerance: number): boolean =>
  (lower === undefined || value >= lower - tolerance) && (upper === undefined || value <= upper + tolerance);

/**
 * Adds to a finding both sums, and for an uncertain one the measures that would settle it.
 *
 * @param question - the question that was judged
 * @param finding - what `find` said of it
 * @param judgement - as given to `find`
 * @returns the verdict as the sheet holds it
 */
export function writeOut(question: Question, finding: Finding, judgement: Judgement): VerdictOutcome {
  const { verdict, value, pass, fail, margin, probability, marginRange, side, predicted } = finding;
  const uncertain = predicted.length > 0 && isUncertain(probability, judgement.confidence);
  const outcome: VerdictOutcome = {
    kind: 'verdict',
    verdict,
    value,
    pass,
    fail,
    margin,
    estimated: predicted.length > 0,
    probability,
    settleWith: uncertain ? mostUseful(question, side, predicted) : [],
    bodyLedger: question.bodyLedger(side),
    setLedger: question.setLedger(),
  };
  if (marginRange) outcome.marginRange = marginRange;
  return outcome;
}

/** Judges one question and writes it out: see `find` and `writeOut`. */
export const judge = (question: Question, judgement: Judgement): VerdictOutcome =>
  writeOut(question, find(question, judgement), judgement);

/**
 * The verdict that two probabilities give.
 *
 * @param probability - of keeping within the pass lines, and within the fail lines; the second at least the first
 * @param confidence - probability asked for
 * @returns one of the four verdicts
 */
export function verdictFor({ pass, insideFail }: VerdictOutcome['probability'], confidence: number): Verdict {
  const asked = confidence - ROUNDING;
  if (pass >= asked) return 'fits';
  if (1 - insideFail >= asked) return 'wontFit';
  return insideFail >= asked ? 'tight' : 'notKnown';
}

/** True when none of the three plain answers is as sure as asked. */
export function isUncertain(
  { pass, insideFail }: VerdictOutcome['probability'],
  confidence: number,
): boolean {
  return Math.max(pass, insideFail - pass, 1 - insideFail) < confidence - ROUNDING;
}

function linesOf({ lower, upper }: Band): LimitLines {
  const lines: LimitLines = {};
  if (lower) lines.lower = best(lower);
  if (upper) lines.upper = best(upper);
  return lines;
}

/** Value and lines that hang on a body. */
const amountsIn = ({ value, pass, fail }: Question): Amount[] =>
  [value, pass.lower, pass.upper, fail.lower, fail.upper].filter(
    (amount) => amount !== undefined && amount.terms.length > 0,
  ) as Amount[];

/** Bodies that a question reads. */
export const bodiesIn = (question: Question): Body[] =>
  amountsIn(question).flatMap(({ terms }) => terms.map(({ body }) => body));

/** Whether an amount has a measure in it that says nothing of its body, as most of a child's do. */
export const hasBorrowed = ({ terms }: Amount): boolean =>
  terms.some(({ body, parts }) => parts.some(([key, factor]) => factor !== 0 && !saysSomething(body, key)));

/** The same of a question. */
export const readsBorrowed = (question: Question): boolean => amountsIn(question).some(hasBorrowed);

function predictedIn(question: Question): PredictedMeasure[] {
  const found: PredictedMeasure[] = [];
  for (const amount of amountsIn(question)) collectPredicted(amount, found);
  return found;
}

/** Measures ordered by how much of the margin's variance goes once they are known. */
function mostUseful(
  question: Question,
  side: 'lower' | 'upper',
  predicted: readonly PredictedMeasure[],
): MeasureKey[] {
  const line = failLines(question)[side] ?? question.pass[side];
  if (!line) return [];
  const margin = minus(question.value, line);
  const shares = new Map<MeasureKey, number>();
  for (const { body, key } of predicted) {
    const parts = margin.terms.find((term) => term.body === body)?.parts ?? [];
    let removed = 0;
    let total = 0;
    for (const { weight, covariances } of body.joint([parts, [[key, 1]]])) {
      const [[variance = 0, together = 0] = [], [, own = 0] = []] = covariances;
      total += weight * variance;
      removed += own > 0 ? (weight * together * together) / own : 0;
    }
    if (total > 0) shares.set(key, Math.max(shares.get(key) ?? 0, removed / total));
  }
  return [...shares]
    .filter(([, share]) => share >= WORTH_MEASURING)
    .sort(([, a], [, b]) => b - a)
    .slice(0, MOST_MEASURES)
    .map(([key]) => key);
}

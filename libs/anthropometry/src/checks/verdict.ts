import type { Body } from '../people/body.ts';
import { saysSomething } from '../people/child-body.ts';
import { best, collectPredicted, type Amount, type PredictedMeasure } from './amount.ts';
import { dropsIn } from './cushion-drops.ts';
import { spreadOf } from './doubt.ts';
import type { LedgerLine, LimitLines, Verdict, VerdictOutcome } from './fit-sheet.ts';
import { failLines, type Lines } from './fail-lines.ts';
import { isLineDoubtful, oddsOf, oddsOfValue } from './odds.ts';
import type { Band } from './room.ts';
import { NOTHING_SETTLES, settlingOf } from './settling.ts';

/** What a rule asks: a value, and the lines it should keep between. */
export interface Question extends Lines {
  value: Amount;
  /** The sum that leads to the lines of the side that is nearest. */
  bodyLedger: (side: 'lower' | 'upper') => LedgerLine[];
  setLedger: () => LedgerLine[];
}

/** How sure a verdict must be, and how far past a line still counts as on it. */
export interface Judgement {
  confidence: number;
  tolerance: number;
}

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

  const { probability, marginRange } =
    predicted.length > 0 || isLineDoubtful(question)
      ? oddsOf(question, failBand, judgement.tolerance)
      : oddsOfValue(
          { best: value, sd: spreadOf(question.value.doubts) },
          { pass, fail },
          judgement.tolerance,
        );
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
  const uncertain = isUncertain(probability, judgement.confidence);
  const settling = uncertain ? settlingOf(question, side, predicted) : NOTHING_SETTLES;
  const drops = dropsIn(question.value);
  const outcome: VerdictOutcome = {
    kind: 'verdict',
    verdict,
    value,
    pass,
    fail,
    margin,
    estimated: predicted.length > 0 || (drops.length > 0 && !isPlain(probability)),
    probability,
    settleWith: settling.measures,
    bodyLedger: question.bodyLedger(side),
    setLedger: question.setLedger(),
  };
  if (marginRange) outcome.marginRange = marginRange;
  if (drops.length > 0) outcome.drops = drops;
  if (settling.bySit) outcome.settleBySit = true;
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

/** From here on a probability counts as plain yes or no: the drop of a cushion decides nothing. */
const PLAIN = 1e-3;
const isPlain = ({ pass, insideFail }: VerdictOutcome['probability']): boolean =>
  [pass, insideFail].every((p) => p < PLAIN || p > 1 - PLAIN);

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

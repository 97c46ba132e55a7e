import type { MeasureKey } from '../measures/measures.ts';
import { best, minus, predictedMeasures, type Amount } from './amount.ts';
import type { LedgerLine, LimitLines, Verdict, VerdictOutcome } from './fit-sheet.ts';
import { probabilityOfRoom, roomQuantile, roomWithin, type Band } from './room.ts';

/** What a rule asks: a value, and the lines it should keep between. */
export interface Question {
  value: Amount;
  pass: Band;
  fail: Band;
  /** The sum that leads to the lines of the side that is nearest. */
  bodyLedger: (side: 'lower' | 'upper') => LedgerLine[];
  setLedger: LedgerLine[];
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

/**
 * Judges one question: the value against its lines, for all that is not known of the sitter.
 *
 * Fits when the value keeps within the pass lines with at least the asked probability; won't fit when it lies beyond
 * a fail line with that probability; else tight when it keeps within the fail lines with it; else not known.
 *
 * @param question - value and lines in the rule's unit
 * @param judgement - probability asked for, and the tolerance in the rule's unit; a boundary belongs to the better side
 * @returns the verdict with value, lines, margin to the nearest fail line and both sums
 */
export function judge(question: Question, judgement: Judgement): VerdictOutcome {
  const { value, pass, fail } = question;
  const predicted = predictedIn(question);
  const estimated = predicted.length > 0;

  const failRooms = roomWithin(value, fail);
  const insideFailAlone = probabilityOfRoom(failRooms, -judgement.tolerance);
  const insidePass = probabilityOfRoom(roomWithin(value, pass), -judgement.tolerance);
  const insideFail = Math.max(insideFailAlone, insidePass);
  const verdict = verdictOf(insidePass, insideFail, judgement.confidence);

  const limits = linesOf(fail);
  const at = best(value);
  const toLower = limits.lower === undefined ? Infinity : at - limits.lower;
  const toUpper = limits.upper === undefined ? Infinity : limits.upper - at;
  const side = toLower <= toUpper ? 'lower' : 'upper';

  return {
    kind: 'verdict',
    verdict,
    value: at,
    pass: linesOf(pass),
    fail: limits,
    margin: Math.min(toLower, toUpper),
    ...(estimated
      ? { marginRange: { low: roomQuantile(failRooms, 0.05), high: roomQuantile(failRooms, 0.95) } }
      : {}),
    estimated,
    probability: { pass: insidePass, insideFail },
    settleWith:
      estimated && isUncertain(insidePass, insideFail, judgement.confidence)
        ? mostUseful(question, side, predicted)
        : [],
    bodyLedger: question.bodyLedger(side),
    setLedger: question.setLedger,
  };
}

/**
 * The verdict that two probabilities give.
 *
 * @param insidePass - probability of keeping within the pass lines
 * @param insideFail - probability of keeping within the fail lines; >= insidePass
 * @param confidence - probability asked for
 * @returns one of the four verdicts
 */
export function verdictOf(insidePass: number, insideFail: number, confidence: number): Verdict {
  const asked = confidence - ROUNDING;
  if (insidePass >= asked) return 'fits';
  if (1 - insideFail >= asked) return 'wontFit';
  return insideFail >= asked ? 'tight' : 'notKnown';
}

/** True when none of the three plain answers is as sure as asked. */
function isUncertain(insidePass: number, insideFail: number, confidence: number): boolean {
  return Math.max(insidePass, insideFail - insidePass, 1 - insideFail) < confidence - ROUNDING;
}

function linesOf({ lower, upper }: Band): LimitLines {
  return {
    ...(lower ? { lower: best(lower) } : {}),
    ...(upper ? { upper: best(upper) } : {}),
  };
}

type Predicted = ReturnType<typeof predictedMeasures>;

function predictedIn({ value, pass, fail }: Question): Predicted {
  const seen = new Map<string, Predicted[number]>();
  const bodies: unknown[] = [];
  for (const amount of [value, pass.lower, pass.upper, fail.lower, fail.upper]) {
    if (!amount || amount.terms.length === 0) continue;
    for (const entry of predictedMeasures(amount)) {
      if (!bodies.includes(entry.body)) bodies.push(entry.body);
      seen.set(`${bodies.indexOf(entry.body)}|${entry.key}`, entry);
    }
  }
  return [...seen.values()];
}

/** Measures ordered by how much of the margin's variance goes once they are known. */
function mostUseful(question: Question, side: 'lower' | 'upper', predicted: Predicted): MeasureKey[] {
  const line = question.fail[side] ?? question.pass[side];
  if (!line) return [];
  const margin = minus(question.value, line);
  const shares = new Map<MeasureKey, number>();
  for (const { body, key } of predicted) {
    const weights = margin.terms.find((term) => term.body === body)?.weights ?? {};
    let removed = 0;
    let total = 0;
    for (const { weight, covariances } of body.joint([
      { constant: 0, weights },
      { constant: 0, weights: { [key]: 1 } },
    ])) {
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

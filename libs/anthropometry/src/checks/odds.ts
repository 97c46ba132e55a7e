import type { Amount } from './amount.ts';
import type { Lines } from './fail-lines.ts';
import type { LimitLines, VerdictOutcome } from './fit-sheet.ts';
import { probabilityWithin, rangeOfRoom, type NormalValue } from './normal-room.ts';
import { probabilityOfRoom, roomMoved, roomQuantile, roomWithin, type Band } from './room.ts';

type Odds = Pick<VerdictOutcome, 'probability' | 'marginRange'>;

/**
 * How likely a question's value keeps within its lines, and the 90 % range of its margin.
 *
 * @param question - value and pass lines in the rule's unit
 * @param failBand - the fail lines that count
 * @param tolerance - how far past a line still counts as on it
 * @returns probabilities 0 to 1, the range in the rule's unit
 */
export function oddsOf(question: { value: Amount; pass: Band }, failBand: Band, tolerance: number): Odds {
  const passRooms = roomWithin(question.value, question.pass);
  const failRooms = roomMoved(passRooms, question.pass, failBand) ?? roomWithin(question.value, failBand);
  const pass = probabilityOfRoom(passRooms, -tolerance);
  return {
    probability: { pass, insideFail: Math.max(pass, probabilityOfRoom(failRooms, -tolerance)) },
    marginRange: { low: roomQuantile(failRooms, 0.05), high: roomQuantile(failRooms, 0.95) },
  };
}

/**
 * The same where the body was measured: at most the drop of a cushion is open, and every line is a plain number.
 *
 * @param value - best value, and the spread that cushions give it, 0 where there is none; rule's unit
 * @param lines - plain lines, same unit
 * @param tolerance - how far past a line still counts as on it
 * @returns as `oddsOf`; exactly 0 or 1 and without a range where nothing is open
 */
export function oddsOfValue(
  value: NormalValue,
  { pass, fail }: { pass: LimitLines; fail: LimitLines },
  tolerance: number,
): Odds {
  if (value.sd === 0) {
    const insidePass = isWithin(value.best, pass, tolerance) ? 1 : 0;
    const insideFail = isWithin(value.best, fail, tolerance) ? 1 : insidePass;
    return { probability: { pass: insidePass, insideFail } };
  }
  const insidePass = probabilityWithin(value, pass, tolerance);
  const insideFail = Math.max(insidePass, probabilityWithin(value, fail, tolerance));
  return { probability: { pass: insidePass, insideFail }, marginRange: rangeOfRoom(value, fail) };
}

const isWithin = (value: number, { lower, upper }: LimitLines, tolerance: number): boolean =>
  (lower === undefined || value >= lower - tolerance) && (upper === undefined || value <= upper + tolerance);

/** Whether a line hangs on how far a cushion goes down. */
export const isLineDoubtful = ({ pass, fail }: Lines): boolean =>
  [pass.lower, pass.upper, fail.lower, fail.upper].some((line) => line && line.doubts.length > 0);

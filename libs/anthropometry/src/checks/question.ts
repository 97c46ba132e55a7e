import { best, fixed, plus, type Amount } from './amount.ts';
import type { LedgerLine } from './fit-sheet.ts';
import { failLines } from './fail-lines.ts';
import type { Question } from './verdict.ts';

/** One named part of a sum. */
export type Entry = readonly [label: string, amount: Amount];

/** How a pass line and a fail line come about on one side. */
export interface Side {
  pass: readonly Entry[];
  /** What is added to the pass line to get the fail line; nothing where they are one. */
  further?: readonly Entry[];
  /** The fail line's own sum, where it does not start from the pass line. */
  fail?: readonly Entry[];
}

/** Adds the parts of a sum. */
export const sumOf = (entries: readonly Entry[]): Amount =>
  entries.reduce((sum, [, amount]) => plus(sum, amount), fixed(0));

const ALLOWANCE = 'allowance for tight';
const SET_BY_RULE = 'set by the rule';

/** A side whose lines are plain numbers. */
export const fixedSide = (pass: number, fail: number): Side => ({
  pass: [[SET_BY_RULE, fixed(pass)]],
  ...(fail === pass ? {} : { further: [[ALLOWANCE, fixed(fail - pass)]] }),
});

/** The allowance between the pass line and the fail line. */
export const allowance = (by: number): readonly Entry[] => [[ALLOWANCE, fixed(by)]];

/** Lines of a sum, closed by its total. */
export function ledgerOf(entries: readonly Entry[], total: string): LedgerLine[] {
  return [...terms(entries), { label: total, value: best(sumOf(entries)), kind: 'total' }];
}

const terms = (entries: readonly Entry[]): LedgerLine[] =>
  entries.map(([label, amount]) => ({ label, value: best(amount), kind: 'term' }));

/**
 * Puts a question together so that the lines that are compared and the sums that are shown are the same numbers.
 *
 * @param asked - value with its sum, and the lines on one or both sides, in the rule's unit
 * @returns the question
 */
export function question(asked: {
  value: Amount;
  setLedger: () => LedgerLine[];
  lower?: Side | undefined;
  upper?: Side | undefined;
}): Question {
  const { value, setLedger, lower, upper } = asked;
  const question: Question = {
    value,
    pass: {},
    fail: {},
    setLedger,
    bodyLedger: (side) => {
      const lines = side === 'lower' ? lower : upper;
      return lines ? sideLedger(lines, failLines(question)[side] !== question.pass[side]) : [];
    },
  };
  if (lower) {
    question.pass.lower = sumOf(lower.pass);
    question.fail.lower = failOf(lower, question.pass.lower);
  }
  if (upper) {
    question.pass.upper = sumOf(upper.pass);
    question.fail.upper = failOf(upper, question.pass.upper);
  }
  return question;
}

const failOf = ({ further, fail }: Side, pass: Amount): Amount =>
  fail ? sumOf(fail) : further ? plus(pass, sumOf(further)) : pass;

function sideLedger(side: Side, ownFailLine: boolean): LedgerLine[] {
  if (!ownFailLine) return ledgerOf(side.pass, 'pass and fail line');
  return [
    ...ledgerOf(side.pass, 'pass line'),
    ...terms(side.fail ?? side.further ?? []),
    { label: 'fail line', value: best(failOf(side, sumOf(side.pass))), kind: 'total' },
  ];
}

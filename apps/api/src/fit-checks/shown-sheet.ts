import type { FitSheet, Rule, RuleBook, Verdict } from '@settlewright/anthropometry';
import type { OpenCell, VerdictSheet } from './verdicts-only';

/** A fit sheet to print or export, with or without the numbers behind the verdicts. */
export type ShownSheet = FitSheet | VerdictSheet;
export type ShownCell = FitSheet['piecesAndWays'][number] | OpenCell;

export const VERDICT_WORDS: Record<Verdict, string> = {
  fits: 'fits',
  tight: 'tight',
  wontFit: 'won’t fit',
  notKnown: 'not known',
};

export const CAUTION =
  'Guidance, not certification. Local codes and the authority having jurisdiction decide. ' +
  'Body data describe surveyed groups, not a person: try the seat.';

/** The rule of a cell; a revision of long ago may name one that the rule book no longer has. */
export function ruleOf(ruleBook: RuleBook, { ruleId }: { ruleId: string }): Rule | undefined {
  return ruleBook.rules.find(({ id }) => id === ruleId);
}

export function checkName(ruleBook: RuleBook, cell: { ruleId: string }): string {
  return ruleOf(ruleBook, cell)?.columnName ?? cell.ruleId;
}

import {
  confidenceWords,
  type FitSheet,
  type Rule,
  type RuleBook,
  type Verdict,
} from '@settlewright/anthropometry';
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

/** Stands with a sheet for readers who see no measures. */
export const ROUGH =
  'Bodies are personal, so margins of sitters are rough here: at least so much is left, at most so much is short.';

/** When the probability that a sheet's verdicts ask for came into force, as far as anybody set it. */
export interface ConfidenceSince {
  kind: 'set' | 'issued';
  at: Date;
}

/** What a sheet says of the probability that its verdicts ask for. */
export function confidenceSentence(
  { confidence }: Pick<ShownSheet, 'confidence'>,
  ruleBook: RuleBook,
  since: ConfidenceSince | null,
  timeZone: string,
): string {
  if (since === null) return confidenceWords(confidence, ruleBook);
  const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone }).format(since.at);
  const happened = since.kind === 'issued' ? 'as in force when issued' : 'set by the workshop';
  return confidenceWords(confidence, ruleBook, `${happened} on ${day}`);
}

/** The rule of a cell; a revision of long ago may name one that the rule book no longer has. */
export function ruleOf(ruleBook: RuleBook, { ruleId }: { ruleId: string }): Rule | undefined {
  return ruleBook.rules.find(({ id }) => id === ruleId);
}

export function checkName(ruleBook: RuleBook, cell: { ruleId: string }): string {
  return ruleOf(ruleBook, cell)?.columnName ?? cell.ruleId;
}

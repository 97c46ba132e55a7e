import type { FitSheet, RuleBook, VerdictOutcome } from '@settlewright/anthropometry';
import type { LengthStyle } from '@settlewright/geometry';
import { verdictWord } from '@/components/verdict.tsx';
import { amountText, isJustShort, JUST_SHORT, marginText } from '@/lib/margins.ts';

/** The worst verdict of one sitter over the rules that are shown. */
export interface Answer {
  ruleId: string;
  outcome: VerdictOutcome;
}

const SEVERITY = { wontFit: 0, notKnown: 1, tight: 2, fits: 3 } as const;

/** The worst answer of a place; of equals the one with the least room. */
export function answerAt(
  sheet: FitSheet | undefined,
  placeId: string,
  ruleIds: ReadonlySet<string>,
): Answer | undefined {
  let worst: Answer | undefined;
  for (const { ruleId, outcome } of sheet?.rows.find((row) => row.placeId === placeId)?.cells ?? []) {
    if (outcome.kind !== 'verdict' || !ruleIds.has(ruleId)) continue;
    const by = worst ? SEVERITY[outcome.verdict] - SEVERITY[worst.outcome.verdict] : -1;
    if (by < 0 || (by === 0 && worst && outcome.margin < worst.outcome.margin)) worst = { ruleId, outcome };
  }
  return worst;
}

/** "+1½″" and "± 1" of an answer. */
export const marginOf = ({ ruleId, outcome }: Answer, ruleBook: RuleBook, style: LengthStyle) =>
  marginText(outcome, ruleBook.rule(ruleId).unit, style);

/** "⅞″ short", "just short". */
export function shortBy({ ruleId, outcome }: Answer, ruleBook: RuleBook, style: LengthStyle): string {
  const { unit } = ruleBook.rule(ruleId);
  if (isJustShort(outcome.margin, unit, style)) return JUST_SHORT;
  return `${amountText(Math.max(0, -outcome.margin), unit, style)} short`;
}

/** "+1½″ ± 1 tight", as it stands over a lath. */
export function verdictLine(answer: Answer, ruleBook: RuleBook, style: LengthStyle): string {
  const { margin, range } = marginOf(answer, ruleBook, style);
  return `${margin}${range ? ` ${range}` : ''} ${verdictWord(answer.outcome.verdict)}`;
}

/** "+1½″ ± 1, tight, est." for lists and tables. */
export function answerWords(answer: Answer | undefined, ruleBook: RuleBook, style: LengthStyle): string {
  if (!answer) return 'does not apply';
  const { margin, range } = marginOf(answer, ruleBook, style);
  const { verdict, estimated } = answer.outcome;
  return `${margin}${range ? ` ${range}` : ''}, ${verdictWord(verdict)}${estimated ? ', est.' : ''}`;
}

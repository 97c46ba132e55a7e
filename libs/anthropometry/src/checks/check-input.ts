import type { BodyModel } from '../people/body-model.ts';
import type { Sitter } from './fit-sheet.ts';
import type { CheckSettings } from './piece-check.ts';
import type { Rule, RuleBook } from './rule-book.ts';
import type { SetSituation } from './situation.ts';
import type { Judgement } from './verdict.ts';

/** Everything a fit sheet is made from. */
export interface CheckInput {
  situation: SetSituation;
  sitters: readonly Sitter[];
  ruleBook: RuleBook;
  model: BodyModel;
  settings: CheckSettings;
  /** Leaves the row of the public empty, where many sets are tried for the same sitters. */
  sittersOnly?: boolean;
}

/** The probability that a sheet asks of a verdict. */
export const confidenceOf = ({ ruleBook, settings }: Pick<CheckInput, 'ruleBook' | 'settings'>): number =>
  settings.confidence ?? ruleBook.confidence;

/** How sure the verdicts of a rule must be here. */
export const judgementOf = (input: Pick<CheckInput, 'ruleBook' | 'settings'>, rule: Rule): Judgement => ({
  confidence: confidenceOf(input),
  tolerance: input.ruleBook.boundaryTolerance[rule.unit],
});

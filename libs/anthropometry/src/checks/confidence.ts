import { type RuleBook, SOURCE_MARK_WORDS } from './rule-book.ts';

/**
 * What is shown of the probability that a verdict asks for.
 *
 * @param confidence - probability, between 0 and 1
 * @returns two decimals, as in 0.90
 */
export const confidenceText = (confidence: number): string => confidence.toFixed(2);

/**
 * The sentence under a fit sheet about the probability that its verdicts ask for.
 *
 * @param confidence - probability the verdicts of the sheet were given at
 * @param ruleBook - where the default and the mark of its source stand
 * @param since - words such as "set by the workshop on 3 March 2026"; left out when nobody set it
 * @returns one plain sentence
 */
export function confidenceWords(
  confidence: number,
  ruleBook: Pick<RuleBook, 'confidence' | 'confidenceSource'>,
  since?: string,
): string {
  const usual =
    confidence === ruleBook.confidence
      ? 'that is the default'
      : `the default is ${confidenceText(ruleBook.confidence)}`;
  const when = since ? `, ${since}` : '';
  const mark = SOURCE_MARK_WORDS[ruleBook.confidenceSource.mark];
  return `A verdict is given at a probability of ${confidenceText(confidence)} or more${when}; ${usual} (${mark}).`;
}

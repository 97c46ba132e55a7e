import {
  checkSitter,
  loadRuleBook,
  nextMeasures,
  type BodyModel,
  type CheckSettings,
  type NextMeasures,
  type RuleBook,
  type SetSituation,
  type Sitter,
} from '@settlewright/anthropometry';

/** One sitter at one place, as plain data that can be handed to a worker. */
export interface NextQuestion {
  situation: SetSituation;
  sitter: Sitter;
  settings: CheckSettings;
  confidence: number;
  rules: Omit<RuleBook, 'rule'>;
}

/**
 * Works out which measurements settle most for a sitter; some tenths of a second.
 *
 * @param question - sitter, place and rules
 * @param model - body model
 */
export function answerNext(question: NextQuestion, model: BodyModel): NextMeasures {
  const { situation, sitter, settings, confidence, rules } = question;
  const ruleBook = loadRuleBook(rules);
  return nextMeasures({
    person: sitter.person,
    model,
    rowFor: (person, ruleIds) =>
      checkSitter({ situation, ruleBook, model, settings }, { ...sitter, person }, ruleIds),
    confidence,
  });
}

import { createBodyModel, loadRuleBook, type BodyModel, type RuleBook } from '@settlewright/anthropometry';

/** Body statistics and rules: data with their sources, fetched once when a room is opened. */
export interface FitEngine {
  model: BodyModel;
  ruleBook: RuleBook;
}

export async function loadFitEngine(): Promise<FitEngine> {
  const [summary, rules] = await Promise.all([
    import('@settlewright/seed-data/populations/ansur2.json'),
    import('@settlewright/seed-data/fit-rules.json'),
  ]);
  return { model: createBodyModel(summary.default), ruleBook: loadRuleBook(rules.default) };
}

import { createBodyModel, type BodyModel, type RuleBook } from '@settlewright/anthropometry';
import { fetchRuleBook } from '@/lib/rule-book.ts';

/** Body statistics and rules: data with their sources, fetched once when a room is opened. */
export interface FitEngine {
  model: BodyModel;
  ruleBook: RuleBook;
}

export async function loadFitEngine(): Promise<FitEngine> {
  const [summary, children, ruleBook] = await Promise.all([
    import('@settlewright/seed-data/populations/ansur2.json'),
    import('@settlewright/seed-data/populations/children.json'),
    fetchRuleBook(),
  ]);
  return { model: createBodyModel(summary.default, children.default), ruleBook };
}

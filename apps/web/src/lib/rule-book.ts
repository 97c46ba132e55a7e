import { loadRuleBook, type RuleBook } from '@settlewright/anthropometry';
import { useQuery } from '@tanstack/react-query';

/** The rules with their numbers and sources, fetched when a page first needs them. */
export async function fetchRuleBook(): Promise<RuleBook> {
  const rules = await import('@settlewright/seed-data/fit-rules.json');
  return loadRuleBook(rules.default);
}

export const useRuleBook = () =>
  useQuery({ queryKey: ['rule-book'], queryFn: fetchRuleBook, staleTime: Infinity });

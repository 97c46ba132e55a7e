import { type RuleBook, SOURCE_MARK_WORDS } from '@settlewright/anthropometry';

/** A rule that decided something, with where it comes from. */
export interface ShownRule {
  id: string;
  name: string;
  why: string;
  sourceWord: string;
  sources: { cite: string; read: string }[];
}

/** Rules in the order of the book. */
export function shownRules(ruleBook: RuleBook, ids: Iterable<string>): ShownRule[] {
  const wanted = new Set(ids);
  return ruleBook.rules
    .filter(({ id }) => wanted.has(id))
    .map(({ id, columnName, why, sourceWord, sources }) => ({
      id,
      name: columnName,
      why: why.replaceAll('{sitter}', 'the sitter'),
      sourceWord,
      sources: sources.map(({ cite, mark }) => ({ cite, read: SOURCE_MARK_WORDS[mark] })),
    }));
}

import { SOURCE_MARK_WORDS, type RuleBook } from '@settlewright/anthropometry';
import type { FloorKind, FloorShape } from '@settlewright/geometry';
import { joinWords } from '../choosing-words.ts';

/** How each space is called. */
export const FLOOR_WORDS: Record<FloorKind, string> = {
  floor: 'Clear floor',
  approach: 'Approach',
  'knee-space': 'Knee space',
  'toe-space': 'Toe space',
  'turning-circle': 'Turning circle',
  'turning-tee': 'Turning T',
};

/** One space of a wheelchair place: its size, the clause that gives it, and what stands in it. */
export function sayFloor(
  { kind, mark, widthMm, lengthMm, heightsMm, clause, blockedBy }: FloorShape,
  length: (mm: number) => string,
): string {
  const at = mark ? ` at ${mark}` : '';
  const clear = blockedBy.length > 0 ? `${joinWords(blockedBy)} in it` : 'nothing in it';
  const [from, to] = heightsMm;
  const high =
    kind === 'knee-space'
      ? `, from ${length(from)} to ${length(to)} high`
      : kind === 'toe-space'
        ? `, up to ${length(to)} high`
        : '';
  return `${FLOOR_WORDS[kind]}${at}, ${length(widthMm)} by ${length(lengthMm)}${high} (clause ${clause}): ${clear}.`;
}

/** Where the sizes come from: "2010 ADA Standards 903.2 (read in the source)". */
export function sayFloorSources(shapes: readonly FloorShape[], ruleBook: RuleBook): string[] {
  const rules = [...new Set(shapes.map(({ ruleId }) => ruleId))].map((id) => ruleBook.rule(id));
  const said = rules.flatMap(({ sources }) =>
    sources.map(({ cite, mark }) => `${cite} (${SOURCE_MARK_WORDS[mark]})`),
  );
  return [...new Set(said)];
}

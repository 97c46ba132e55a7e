import type { FloorKind, FloorShape } from '@settlewright/geometry';
import { joinWords } from '../choosing-words.ts';

const KINDS: Record<FloorKind, string> = {
  floor: 'Clear floor',
  approach: 'Approach',
  'knee-space': 'Knee space',
  'toe-space': 'Toe space',
  'turning-circle': 'Turning circle',
  'turning-tee': 'Turning T',
};

/** One space of a wheelchair place: its size, the clause that gives it, and what stands in it. */
export function sayFloor(
  { kind, mark, widthMm, lengthMm, clause, blockedBy }: FloorShape,
  length: (mm: number) => string,
): string {
  const at = mark ? ` at ${mark}` : '';
  const clear = blockedBy.length > 0 ? `${joinWords(blockedBy)} in it` : 'nothing in it';
  return `${KINDS[kind]}${at}, ${length(widthMm)} by ${length(lengthMm)} (clause ${clause}): ${clear}.`;
}

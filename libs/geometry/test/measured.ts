import { loadRuleBook } from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import type { PieceKind, PieceOf, SetDocument } from '../src/room/document.ts';
import { newPiece } from '../src/room/edit-pieces.ts';
import { measureSet as measured } from '../src/situation/measure-set.ts';

const ruleBook = loadRuleBook(rules);

/** A set measured by the rules as they are shipped. */
export const measureSet = (document: SetDocument) => measured(document, ruleBook);

/** A piece somewhere, its id the mark in small letters. */
export function piece<K extends PieceKind>(
  kind: K,
  mark: string,
  [xMm, zMm, turnDeg]: [number, number, number],
  sizes: Partial<PieceOf<K>> = {},
): PieceOf<K> {
  return { ...newPiece(kind, mark.toLowerCase(), mark, { xMm, zMm, turnDeg }), ...sizes };
}

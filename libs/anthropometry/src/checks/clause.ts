import type { ClauseOutcome, LimitLines } from './fit-sheet.ts';
import { notAsked, type PieceAnswer, type PieceAsked } from './piece-check.ts';
import type { Rule } from './rule-book.ts';

/** One part of a clause: a number inside its limits or outside them. */
export type ClausePart = ClauseOutcome['parts'][number];

/** Makes one part of a clause. */
export type PartMaker = (label: string, value: number, limits: LimitLines) => ClausePart;

/**
 * Makes parts that lie inside when within the tolerance of their limits.
 *
 * @param tolerance - in the rule's unit
 * @returns the maker
 */
export const partMaker =
  (tolerance: number): PartMaker =>
  (label, value, limits) => ({
    label,
    value,
    limits,
    inside:
      value >= (limits.lower ?? -Infinity) - tolerance && value <= (limits.upper ?? Infinity) + tolerance,
  });

/**
 * A clause from its parts: inside when all are; the first part outside, or else the first, is its value.
 *
 * @param rule - a rule of tier `code`
 * @param parts - at least one
 * @returns the outcome
 */
export function clauseOf(rule: Rule, parts: ClausePart[]): ClauseOutcome {
  const shown = parts.find(({ inside }) => !inside) ?? parts[0];
  return {
    kind: 'clause',
    inside: parts.every(({ inside }) => inside),
    clause: rule.clause ?? rule.id,
    value: shown?.value ?? 0,
    limits: shown?.limits ?? {},
    parts,
  };
}

/** Asks the pieces marked accessible; the first part of a clause is its value. */
export const accessibleOnly =
  <T extends { pieceId: string; mark: string; accessible: boolean }>(
    word: string,
    pieces: (asked: PieceAsked) => T[],
    partsOf: (piece: T, rule: Rule, part: PartMaker) => ClausePart[],
  ) =>
  (asked: PieceAsked): PieceAnswer[] => {
    const found = pieces(asked).filter(({ accessible }) => accessible);
    if (found.length === 0) return notAsked(`no ${word} is marked accessible`);
    const part = partMaker(asked.tolerance);
    return found.map((piece) => ({
      pieceIds: [piece.pieceId],
      marks: [piece.mark],
      said: clauseOf(asked.rule, partsOf(piece, asked.rule, part)),
    }));
  };

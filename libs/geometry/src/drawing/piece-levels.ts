import type { PartRole } from '../parts/part.ts';
import type { PieceParts } from './drawn.ts';
import { bottomOf, topOf } from './piece-extents.ts';

/** A height above the floor that a drawing writes out. */
export interface Level {
  heightMm: number;
  words: string;
}

const SEAT: readonly PartRole[] = ['seat-cushion'];
const DECK: readonly PartRole[] = ['deck', 'seat'];
const BACK: readonly PartRole[] = ['back-board', 'back-cushion', 'back-frame'];

const SAME_MM = 0.5;

function own({ piece, parts }: PieceParts): [number, string][] {
  const having = (roles: readonly PartRole[]) => parts.filter(({ role }) => roles.includes(role));
  switch (piece.kind) {
    case 'bench':
    case 'loose-seat': {
      const seat = [having(SEAT), having(DECK)].find((found) => found.length > 0);
      const back = having(BACK);
      return [
        ...(seat ? [[topOf(seat), 'seat, not pressed'] as [number, string]] : []),
        ...(back.length > 0 ? [[topOf(back), 'back'] as [number, string]] : []),
      ];
    }
    case 'table':
      return [[topOf(parts), 'table']];
    case 'sill': {
      const board = having(['sill-board']);
      return board.length > 0 ? [[topOf(board), 'sill']] : [];
    }
    case 'bulkhead':
      return [[topOf(parts), 'wall']];
    case 'overhead':
      return [[bottomOf(parts), 'under']];
  }
}

/**
 * The heights of a set that a shop works by: highest point of each unpressed seat, backs, tables, sills, walls.
 *
 * @param pieces - with the parts that a view shows
 * @returns rising; equal heights share their words
 */
export function pieceLevels(pieces: readonly PieceParts[]): Level[] {
  const found: { heightMm: number; kinds: Map<string, string[]> }[] = [];
  for (const one of pieces) {
    for (const [heightMm, kind] of own(one)) {
      const same = found.find((other) => Math.abs(other.heightMm - heightMm) < SAME_MM);
      const level = same ?? { heightMm, kinds: new Map<string, string[]>() };
      if (!same) found.push(level);
      level.kinds.set(kind, [...(level.kinds.get(kind) ?? []), one.piece.mark]);
    }
  }
  return found
    .sort((a, b) => a.heightMm - b.heightMm)
    .map(({ heightMm, kinds }) => ({
      heightMm,
      words: [...kinds].map(([kind, marks]) => `${kind} ${markWords(marks)}`).join('; '),
    }));
}

const MOST_MARKS = 3;

function markWords(marks: readonly string[]): string {
  if (marks.length <= MOST_MARKS) return marks.join(', ');
  return `${marks.slice(0, MOST_MARKS - 1).join(', ')} and ${marks.length - MOST_MARKS + 1} more`;
}

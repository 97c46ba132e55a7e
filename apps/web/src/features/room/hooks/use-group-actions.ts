import {
  alignPieces,
  duplicatePieces,
  formatLength,
  lengthStep,
  movePieces,
  removePieces,
  shownPiece,
  spacePieces,
  turnPieces,
  type AlignEdge,
  type Piece,
  type RoomAxis,
  type SetDocument,
} from '@settlewright/geometry';
import { useMemo } from 'react';
import { toast } from 'sonner';
import { joinWords } from '../choosing-words.ts';
import { useSurroundings } from '../room-context.tsx';
import { useRoomStore } from '../store.ts';
import { useTakeMovingStep, useTakeStep, type TakeStep } from './use-take-step.ts';

const EDGE_WORDS: Record<AlignEdge, string> = {
  left: 'on the left',
  right: 'on the right',
  back: 'at the back',
  front: 'at the front',
  'middle-across': 'on their middles, left to right',
  'middle-along': 'on their middles, back to front',
};

export const AXIS_WORDS: Record<RoomAxis, string> = {
  across: 'left to right',
  along: 'back to front',
};

export interface GroupActions {
  /** Moves by whole steps of the shown unit, in the room's axes. */
  nudge: (pieces: readonly Piece[], stepsX: number, stepsZ: number) => void;
  turn: (pieces: readonly Piece[], byDeg: number) => void;
  copy: (pieces: readonly Piece[]) => void;
  remove: (pieces: readonly Piece[]) => void;
  /** Hides, shows, locks or unlocks. */
  mark: (pieces: readonly Piece[], flag: PieceFlag, on: boolean) => void;
  /** The first piece stays. */
  lineUp: (pieces: readonly Piece[], edge: AlignEdge) => void;
  /** The first piece stays. */
  space: (pieces: readonly Piece[], axis: RoomAxis) => void;
}

const FLAG_WORDS = {
  hidden: ['shown', 'hidden, still measured'],
  locked: ['unlocked', 'locked'],
  accessible: ['no longer accessible', 'marked accessible'],
} as const;

export type PieceFlag = keyof typeof FLAG_WORDS;

/** A piece with a flag set; what is not hidden carries no mark of it. */
export function withFlag(piece: Piece, flag: PieceFlag, on: boolean): Piece {
  return flag === 'hidden' && !on ? shownPiece(piece) : { ...piece, [flag]: on };
}

/** "T1 locked", "3 pieces hidden, still measured". */
export const sayFlag = (what: string, flag: PieceFlag, on: boolean): string =>
  `${what} ${FLAG_WORDS[flag][on ? 1 : 0]}`;

const idsOf = (pieces: readonly Piece[]) => pieces.map(({ id }) => id);

/** "B2 is locked and stays": what a step left out. */
export function sayLocked(pieces: readonly Piece[]): string | undefined {
  const marks = pieces.filter(({ locked }) => locked).map(({ mark }) => mark);
  if (marks.length === 0) return undefined;
  return marks.length === 1 ? `${marks[0]} is locked and stays` : `${joinWords(marks)} are locked and stay`;
}

/** Why nothing moved: "Already in line on the left.", or what may not move. */
function sayStanding(already: string, [, ...others]: readonly Piece[]): string {
  return others.every(({ locked }) => locked) ? `${sayLocked(others)}.` : `${already}.`;
}

/** What can be done to several pieces at once, each as one named step. */
export function useGroupActions(choose: (ids: readonly string[]) => void): GroupActions {
  const store = useRoomStore();
  const { style } = useSurroundings();
  const take = useTakeStep();
  const takeMoving = useTakeMovingStep();

  return useMemo(() => {
    const now = () => store.getState().document;
    // What changes nothing is no step; it is said where it can be seen, and read out from there.
    const arrangeBy =
      (taking: TakeStep) => (next: SetDocument, step: string, already: string, aside?: string) =>
        next.pieces.every((piece, n) => piece === now().pieces[n])
          ? toast(already)
          : taking(next, step, aside);
    const arrange = arrangeBy(take);
    const carry = arrangeBy(takeMoving);
    return {
      nudge: (pieces, stepsX, stepsZ) => {
        const step = lengthStep(style);
        const next = movePieces(now(), idsOf(pieces), { xMm: stepsX * step, zMm: stepsZ * step });
        const by = formatLength(Math.hypot(stepsX, stepsZ) * step, style);
        const locked = sayLocked(pieces);
        carry(next, `Move ${pieces.length} pieces ${by}`, `${locked}.`, locked);
      },
      turn: (pieces, byDeg) =>
        carry(
          turnPieces(now(), idsOf(pieces), byDeg),
          `Turn ${pieces.length} pieces ${Math.abs(byDeg)}° ${byDeg > 0 ? 'left' : 'right'}`,
          `${sayLocked(pieces)}.`,
          sayLocked(pieces),
        ),
      copy: (pieces) => {
        const { document, pieceIds } = duplicatePieces(now(), idsOf(pieces));
        take(document, `Copy ${pieces.length} pieces`);
        choose(pieceIds);
      },
      remove: (pieces) => {
        const locked = sayLocked(pieces);
        const free = pieces.filter((piece) => !piece.locked);
        const next = removePieces(now(), idsOf(pieces));
        if (free.length === 0) toast(`${locked}.`);
        else take(next, `Remove ${free.length === 1 ? free[0]?.mark : `${free.length} pieces`}`, locked);
        choose(idsOf(pieces.filter((piece) => piece.locked)));
      },
      mark: (pieces, flag, on) => {
        const ids = new Set(idsOf(pieces));
        const next = now().pieces.map((piece) => (ids.has(piece.id) ? withFlag(piece, flag, on) : piece));
        const [first] = pieces;
        const what = pieces.length === 1 && first ? first.mark : `${pieces.length} pieces`;
        take({ ...now(), pieces: next }, sayFlag(what, flag, on));
      },
      lineUp: (pieces, edge) =>
        arrange(
          alignPieces(now(), idsOf(pieces), edge),
          `Line up ${pieces.length} pieces ${EDGE_WORDS[edge]}`,
          sayStanding(`Already in line ${EDGE_WORDS[edge]}`, pieces),
          sayLocked(pieces.slice(1)),
        ),
      space: (pieces, axis) =>
        arrange(
          spacePieces(now(), idsOf(pieces), axis),
          `Space ${pieces.length} pieces evenly, ${AXIS_WORDS[axis]}`,
          sayStanding(`Already spaced evenly, ${AXIS_WORDS[axis]}`, pieces),
          sayLocked(pieces.slice(1)),
        ),
    };
  }, [store, style, take, takeMoving, choose]);
}

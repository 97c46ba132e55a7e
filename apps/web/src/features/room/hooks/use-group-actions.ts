import {
  alignPieces,
  duplicatePieces,
  formatLength,
  lengthStep,
  movePieces,
  removePieces,
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
import { useTakeStep } from './use-take-step.ts';

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
  /** The first piece stays. */
  lineUp: (pieces: readonly Piece[], edge: AlignEdge) => void;
  /** The first piece stays. */
  space: (pieces: readonly Piece[], axis: RoomAxis) => void;
}

const idsOf = (pieces: readonly Piece[]) => pieces.map(({ id }) => id);

/** "B2 is locked and stays": what a step left out. */
function sayLocked(pieces: readonly Piece[]): string | undefined {
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

  return useMemo(() => {
    const now = () => store.getState().document;
    // What changes nothing is no step; it is said where it can be seen, and read out from there.
    const arrange = (next: SetDocument, step: string, already: string, aside?: string) =>
      next.pieces.every((piece, n) => piece === now().pieces[n]) ? toast(already) : take(next, step, aside);
    return {
      nudge: (pieces, stepsX, stepsZ) => {
        const step = lengthStep(style);
        const next = movePieces(now(), idsOf(pieces), { xMm: stepsX * step, zMm: stepsZ * step });
        const by = formatLength(Math.hypot(stepsX, stepsZ) * step, style);
        const locked = sayLocked(pieces);
        arrange(next, `Move ${pieces.length} pieces ${by}`, `${locked}.`, locked);
      },
      turn: (pieces, byDeg) =>
        arrange(
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
        take(removePieces(now(), idsOf(pieces)), `Remove ${pieces.length} pieces`);
        choose([]);
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
  }, [store, style, take, choose]);
}

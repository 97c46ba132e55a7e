import {
  addPiece,
  duplicatePiece,
  formatLength,
  lengthStep,
  movePiece,
  movePieces,
  removePiece,
  seatSitter,
  type Piece,
  type PieceKind,
  type SetDocument,
  type SitterRef,
} from '@settlewright/geometry';
import { useMemo } from 'react';
import { toast } from 'sonner';
import { useSurroundings } from '../room-context.tsx';
import { sitterName } from '../sitters.ts';
import { useRoomStore } from '../store.ts';
import { sayFlag, withFlag, type PieceFlag } from './use-group-actions.ts';
import { useTakeMovingStep, useTakeStep } from './use-take-step.ts';
import { shortName } from '@/lib/short-name.ts';

export const KIND_WORDS: Record<PieceKind, string> = {
  bench: 'bench',
  table: 'table',
  'loose-seat': 'loose seat',
  sill: 'window sill',
  bulkhead: 'bulkhead',
  overhead: 'beam or soffit',
};

export interface PieceActions {
  add: (kind: PieceKind) => void;
  remove: (piece: Piece) => void;
  duplicate: (piece: Piece) => void;
  /** Moves by whole steps of the shown unit, in the room's axes. */
  nudge: (piece: Piece, stepsX: number, stepsZ: number) => void;
  turn: (piece: Piece, byDeg: number) => void;
  place: (piece: Piece, at: Partial<Piece['at']>) => void;
  setFlag: (piece: Piece, flag: PieceFlag, on: boolean) => void;
  rename: (piece: Piece, name: string) => void;
  seat: (piece: Piece, place: number, sitter: SitterRef | null) => void;
  replace: (document: SetDocument, step: string) => void;
}

/** Everything that can be done to a piece, each as one named step. */
export function usePieceActions(select: (pieceId: string | undefined) => void): PieceActions {
  const store = useRoomStore();
  const { style, cast } = useSurroundings();
  const take = useTakeStep();
  const takeMoving = useTakeMovingStep();

  return useMemo(() => {
    const now = () => store.getState().document;
    const change = (piece: Piece, changed: (old: Piece) => Piece): SetDocument => ({
      ...now(),
      pieces: now().pieces.map((old) => (old.id === piece.id ? changed(old) : old)),
    });
    const mayChange = ({ id, mark }: Piece): boolean => {
      const { locked } = now().pieces.find((one) => one.id === id) ?? { locked: false };
      if (locked) toast(`${mark} is locked; unlock it to change it.`);
      return !locked;
    };

    return {
      add: (kind) => {
        const added = addPiece(now(), kind);
        const mark = added.document.pieces.find((piece) => piece.id === added.pieceId)?.mark ?? '';
        take(added.document, `Added ${mark}, a ${KIND_WORDS[kind]}`);
        select(added.pieceId);
      },
      remove: (piece) => {
        if (!mayChange(piece)) return;
        take(removePiece(now(), piece.id), `Removed ${piece.mark}`);
        select(undefined);
      },
      duplicate: (piece) => {
        const copied = duplicatePiece(now(), piece.id);
        take(copied.document, `Copied ${piece.mark}`);
        select(copied.pieceId);
      },
      nudge: (piece, stepsX, stepsZ) => {
        if (!mayChange(piece)) return;
        const step = lengthStep(style);
        const way = { xMm: stepsX * step, zMm: stepsZ * step };
        const by = formatLength(Math.hypot(stepsX, stepsZ) * step, style);
        takeMoving(movePieces(now(), [piece.id], way), `${piece.mark} moved ${by}`);
      },
      turn: (piece, byDeg) => {
        if (!mayChange(piece)) return;
        const { at } = now().pieces.find(({ id }) => id === piece.id) ?? piece;
        takeMoving(
          movePiece(now(), piece.id, { turnDeg: at.turnDeg + byDeg }),
          `${piece.mark} turned ${byDeg}°`,
        );
      },
      place: (piece, at) => {
        if (mayChange(piece)) take(movePiece(now(), piece.id, { ...piece.at, ...at }), `${piece.mark} moved`);
      },
      setFlag: (piece, flag, on) =>
        take(
          change(piece, (old) => withFlag(old, flag, on)),
          sayFlag(piece.mark, flag, on),
        ),
      rename: (piece, name) => {
        if (name.trim() !== piece.name)
          take(
            change(piece, (old) => ({ ...old, name: name.trim() })),
            `${piece.mark} renamed`,
          );
      },
      seat: (piece, place, sitter) => {
        const who = sitter ? shortName(sitterName(sitter, cast)) : 'Nobody';
        take(seatSitter(now(), piece.id, place, sitter), `${who} at ${piece.mark}, place ${place}`);
      },
      replace: take,
    };
  }, [store, style, cast, take, takeMoving, select]);
}

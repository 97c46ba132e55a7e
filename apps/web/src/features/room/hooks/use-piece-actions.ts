import {
  addPiece,
  duplicatePiece,
  formatLength,
  lengthStep,
  movePiece,
  removePiece,
  seatSitter,
  type Piece,
  type PieceKind,
  type SetDocument,
  type SitterRef,
} from '@settlewright/geometry';
import { useMemo } from 'react';
import { useSurroundings } from '../room-context.tsx';
import { sitterName } from '../sitters.ts';
import { useRoomStore } from '../store.ts';
import { useTakeStep } from './use-take-step.ts';
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
  setFlag: (piece: Piece, flag: 'locked' | 'accessible', on: boolean) => void;
  rename: (piece: Piece, name: string) => void;
  seat: (piece: Piece, place: number, sitter: SitterRef | null) => void;
  replace: (document: SetDocument, step: string) => void;
}

/** Everything that can be done to a piece, each as one named step. */
export function usePieceActions(select: (pieceId: string | undefined) => void): PieceActions {
  const store = useRoomStore();
  const { style, cast } = useSurroundings();
  const take = useTakeStep();

  return useMemo(() => {
    const now = () => store.getState().document;
    const change = (piece: Piece, patch: Partial<Piece>): SetDocument => ({
      ...now(),
      pieces: now().pieces.map((old) => (old.id === piece.id ? ({ ...old, ...patch } as Piece) : old)),
    });

    return {
      add: (kind) => {
        const added = addPiece(now(), kind);
        const mark = added.document.pieces.find((piece) => piece.id === added.pieceId)?.mark ?? '';
        take(added.document, `Added ${mark}, a ${KIND_WORDS[kind]}`);
        select(added.pieceId);
      },
      remove: (piece) => {
        take(removePiece(now(), piece.id), `Removed ${piece.mark}`);
        select(undefined);
      },
      duplicate: (piece) => {
        const copied = duplicatePiece(now(), piece.id);
        take(copied.document, `Copied ${piece.mark}`);
        select(copied.pieceId);
      },
      nudge: (piece, stepsX, stepsZ) => {
        const step = lengthStep(style);
        const to = { xMm: piece.at.xMm + stepsX * step, zMm: piece.at.zMm + stepsZ * step };
        const by = formatLength(Math.hypot(stepsX, stepsZ) * step, style);
        take(movePiece(now(), piece.id, { ...piece.at, ...to }), `${piece.mark} moved ${by}`);
      },
      turn: (piece, byDeg) => {
        const turnDeg = piece.at.turnDeg + byDeg;
        take(movePiece(now(), piece.id, { ...piece.at, turnDeg }), `${piece.mark} turned ${byDeg}°`);
      },
      place: (piece, at) => take(movePiece(now(), piece.id, { ...piece.at, ...at }), `${piece.mark} moved`),
      setFlag: (piece, flag, on) => {
        const words = {
          locked: ['unlocked', 'locked'],
          accessible: ['no longer accessible', 'marked accessible'],
        };
        take(change(piece, { [flag]: on }), `${piece.mark} ${words[flag][on ? 1 : 0]}`);
      },
      rename: (piece, name) => {
        if (name.trim() !== piece.name) take(change(piece, { name: name.trim() }), `${piece.mark} renamed`);
      },
      seat: (piece, place, sitter) => {
        const who = sitter ? shortName(sitterName(sitter, cast)) : 'Nobody';
        take(seatSitter(now(), piece.id, place, sitter), `${who} at ${piece.mark}, place ${place}`);
      },
      replace: take,
    };
  }, [store, style, cast, take, select]);
}

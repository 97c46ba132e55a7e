import {
  parametersOf,
  pullHandle,
  setParameter,
  type Handle,
  type Piece,
  type RoomFor,
  type SetDocument,
} from '@settlewright/geometry';
import { useCallback } from 'react';
import { announce } from '@/lib/announce.ts';
import { sayNumber, showNumber, type NumberParameter } from '../numbers.ts';
import { useSurroundings } from '../room-context.tsx';
import { beyondRoom, roomOf, sayLimit } from '../room-limits.ts';
import { useRoomStore } from '../store.ts';
import { changedVerdicts } from '../verdict-words.ts';

export interface ChangeNumber {
  /** Shows the set with another value, without a step. */
  preview: (value: number | null) => void;
  /** Draws the set with another value while it is dragged; it is counted when the hand rests. */
  drag: (value: number) => void;
  /** Takes the value as one named step; returns the reason when it cannot be. */
  commit: (value: number) => string | undefined;
  /** The same where steps come fast, as of a key held down: they are counted when they rest. */
  step: (value: number) => string | undefined;
  /** How far the value may go before the piece meets another. */
  room: () => RoomFor;
}

/**
 * Changes one number of one piece, by whatever control it is typed in. Pulled by a handle, the piece grows on that
 * side alone.
 */
export function useChangeNumber(pieceId: string, parameter: NumberParameter, handle?: Handle): ChangeNumber {
  const store = useRoomStore();
  const { maker, engine, style } = useSurroundings();
  const { key } = parameter;
  const changed = useCallback(
    (document: SetDocument, value: number) =>
      handle ? pullHandle(document, handle, value) : setParameter(document, pieceId, key, value),
    [pieceId, key, handle],
  );

  const preview = useCallback(
    (value: number | null) => {
      const { document, showPreview } = store.getState();
      if (value === null) {
        showPreview(null);
        return;
      }
      const next = changed(document, value);
      if (next.ok) showPreview(next.value);
    },
    [store, changed],
  );

  const drag = useCallback(
    (value: number) => {
      const { document, showMoving } = store.getState();
      const next = changed(document, value);
      if (next.ok) showMoving(next.value);
    },
    [store, changed],
  );

  const take = useCallback(
    (value: number, fast: boolean) => {
      const { document, showPreview } = store.getState();
      const piece = document.pieces.find((candidate) => candidate.id === pieceId);
      const before = piece && parametersOf(piece).find((candidate) => candidate.key === key);
      if (!piece || !before || typeof before.value !== 'number') return undefined;
      if (Math.abs(before.value - value) < 1e-9) {
        showPreview(null);
        return undefined;
      }
      const next = changed(document, value);
      if (!next.ok) return next.error.message;
      takeStep(document, next.value, { ...before, value: before.value }, piece);
      return undefined;

      function takeStep(old: SetDocument, next: SetDocument, was: NumberParameter, piece: Piece) {
        const label = was.label.charAt(0).toLowerCase() + was.label.slice(1);
        const [from, to] = [showNumber(was, style), showNumber(was, style, value)];
        const step = `${piece.mark} ${label} ${from} to ${to}`;
        const said = `${was.label} ${sayNumber(was, style, value)}`;
        const follows = (before: SetDocument) => {
          const verdicts = changedVerdicts(maker.check(before), maker.check(next), engine.ruleBook);
          const beyond = beyondRoom(was, value, roomOf(before, pieceId, key, handle), style);
          return [...(beyond ? [sayLimit(was, beyond, piece, style)] : []), ...verdicts];
        };
        const sayAll = (more: readonly string[]) => announce(`${[said, ...more].join('. ')}.`);
        if (!fast) {
          store.getState().commit(next, step);
          sayAll(follows(old));
          return;
        }
        store.getState().commitMoving(next, step, (before) => {
          const more = follows(before);
          if (more.length > 0) sayAll(more);
        });
        sayAll([]);
      }
    },
    [store, pieceId, key, handle, changed, maker, engine, style],
  );

  const room = useCallback(
    () => roomOf(store.getState().document, pieceId, key, handle),
    [store, pieceId, key, handle],
  );

  const commit = useCallback((value: number) => take(value, false), [take]);
  const step = useCallback((value: number) => take(value, true), [take]);
  return { preview, drag, commit, step, room };
}

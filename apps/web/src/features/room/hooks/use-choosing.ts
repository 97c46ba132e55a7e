import type { Piece, SetDocument } from '@settlewright/geometry';
import { useMemo, useState } from 'react';
import { announce } from '@/lib/announce.ts';
import { sayChosen } from '../choosing-words.ts';
import type { RoomAddress } from './use-address.ts';

/** The pieces that are chosen together, and how more are added. */
export interface Choosing {
  /** In the order in which they were chosen: the first one stays when the others line up. */
  pieces: readonly Piece[];
  /** On: every press adds a piece or takes it out, for hands without a Shift key. */
  several: boolean;
  setSeveral: (on: boolean) => void;
  /** Adds a piece to those chosen, or takes it out. */
  toggle: (pieceId: string) => void;
  choose: (pieceIds: readonly string[]) => void;
  chooseAll: () => void;
}

/** Whether a press or a key with these modifiers adds to what is chosen. */
export const adds = (event: { shiftKey: boolean; ctrlKey: boolean; metaKey: boolean }): boolean =>
  event.shiftKey || event.ctrlKey || event.metaKey;

export function useChoosing(document: SetDocument, address: RoomAddress): Choosing {
  const [several, setSeveral] = useState(false);
  const { chosenIds, choose: put } = address;
  const { pieces } = document;
  return useMemo(() => {
    const find = (ids: readonly string[]) =>
      ids.flatMap((id) => pieces.find((piece) => piece.id === id) ?? []);
    const chosen = find(chosenIds);
    function choose(ids: readonly string[]) {
      put(ids);
      announce(sayChosen(find(ids).map(({ mark }) => mark)));
    }
    return {
      pieces: chosen,
      several,
      setSeveral: (on) => {
        setSeveral(on);
        if (!on && chosen.length > 1) choose([]);
      },
      toggle: (pieceId) => {
        const ids = chosen.map(({ id }) => id);
        choose(ids.includes(pieceId) ? ids.filter((id) => id !== pieceId) : [...ids, pieceId]);
      },
      choose,
      chooseAll: () => {
        const first = chosen.slice(0, 1).map(({ id }) => id);
        choose([...first, ...pieces.map(({ id }) => id).filter((id) => !first.includes(id))]);
      },
    };
  }, [pieces, chosenIds, put, several]);
}

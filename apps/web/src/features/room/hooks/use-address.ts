import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { VIEW_LETTERS, type ViewLetter } from '../scene/views.ts';

export interface RoomAddress {
  pieceId: string | undefined;
  /** Every chosen piece in the order it was chosen; the first is the selected one. */
  chosenIds: readonly string[];
  view: ViewLetter;
  fitOpen: boolean;
  /** For showing to a client: no verdicts, no tapes. */
  clientView: boolean;
  select: (pieceId: string | undefined) => void;
  choose: (pieceIds: readonly string[]) => void;
  show: (view: ViewLetter) => void;
  openFit: (open: boolean) => void;
  setClientView: (on: boolean) => void;
}

/** What others may want to see the same way stands in the address of the page. */
export function useRoomAddress(): RoomAddress {
  const [params, setParams] = useSearchParams();
  return useMemo(() => {
    const change = (key: string, value: string | undefined) =>
      setParams(
        (before) => {
          const next = new URLSearchParams(before);
          if (value === undefined) next.delete(key);
          else next.set(key, value);
          return next;
        },
        { replace: true, preventScrollReset: true },
      );
    const choose = (ids: readonly string[]) =>
      setParams(
        (before) => {
          const next = new URLSearchParams(before);
          next.delete('piece');
          next.delete('also');
          ids.forEach((id, n) => next.append(n === 0 ? 'piece' : 'also', id));
          return next;
        },
        { replace: true, preventScrollReset: true },
      );
    const view = VIEW_LETTERS.find((letter) => letter === params.get('view')) ?? 'A';
    return {
      pieceId: params.get('piece') ?? undefined,
      chosenIds: [...new Set([...params.getAll('piece').slice(0, 1), ...params.getAll('also')])],
      view,
      fitOpen: params.get('fit') === 'open',
      clientView: params.get('client') === 'yes',
      select: (pieceId) => choose(pieceId === undefined ? [] : [pieceId]),
      choose,
      show: (letter) => change('view', letter === 'A' ? undefined : letter),
      openFit: (open) => change('fit', open ? 'open' : undefined),
      setClientView: (on) => change('client', on ? 'yes' : undefined),
    };
  }, [params, setParams]);
}

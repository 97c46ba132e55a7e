import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { VIEW_LETTERS, type ViewLetter } from '../scene/views.ts';

export interface RoomAddress {
  pieceId: string | undefined;
  /** Every chosen piece in the order it was chosen; the first is the selected one. */
  chosenIds: readonly string[];
  /** The lettered view, where no named one is looked through. */
  view: ViewLetter;
  /** The named view that is chosen in the list. */
  namedId: string | undefined;
  /** Whether the scene is seen through it; else it is only worked on, as a lens on the plan is. */
  throughNamed: boolean;
  fitOpen: boolean;
  /** For showing to a client: no verdicts, no tapes. */
  clientView: boolean;
  select: (pieceId: string | undefined) => void;
  choose: (pieceIds: readonly string[]) => void;
  show: (view: ViewLetter) => void;
  /** Looks through a named view and shows what it shows; without one, lets go of it. */
  showNamed: (named: { id: string; clientView: boolean } | undefined) => void;
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
      // Beside a named view every letter is said: none of them stands for looking through it.
      show: (letter) => change('view', letter === 'A' && !params.has('named') ? undefined : letter),
      namedId: params.get('named') ?? undefined,
      throughNamed: params.has('named') && !params.has('view'),
      showNamed: (named) =>
        setParams(
          (before) => {
            const next = new URLSearchParams(before);
            if (named === undefined) next.delete('named');
            else {
              next.set('named', named.id);
              next.delete('view');
              if (named.clientView) next.set('client', 'yes');
              else next.delete('client');
            }
            return next;
          },
          { replace: true, preventScrollReset: true },
        ),
      openFit: (open) => change('fit', open ? 'open' : undefined),
      setClientView: (on) => change('client', on ? 'yes' : undefined),
    };
  }, [params, setParams]);
}

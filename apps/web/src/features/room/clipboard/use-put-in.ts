import { MAX_PIECES, pastePieces, type Pasted, type SetDocument } from '@settlewright/geometry';
import { useCallback } from 'react';
import { toast } from 'sonner';
import { joinWords } from '../choosing-words.ts';
import { useTakeStep } from '../hooks/use-take-step.ts';
import { useRoomStore } from '../store.ts';

/** What putting pieces in did besides: new marks, and who stayed behind. */
function asideOf({ remarked, seated, unseated }: Pasted): string[] {
  const people = (count: number) => (count === 1 ? '1 person' : `${count} people`);
  return [
    ...(remarked.length > 0 ? [joinWords(remarked.map(({ from, to }) => `${from} is ${to} here`))] : []),
    ...(seated > 0 ? [`${people(seated)} came along`] : []),
    ...(unseated > 0 ? [`${people(unseated)} did not come along`] : []),
  ];
}

/** Puts pieces that stood elsewhere into the set at hand, as one named step, and chooses them. */
export function usePutIn(choose: (ids: readonly string[]) => void) {
  const store = useRoomStore();
  const take = useTakeStep();
  return useCallback(
    (carried: SetDocument, { step, withPeople }: { step: string; withPeople: boolean }): boolean => {
      const { document } = store.getState();
      if (document.pieces.length + carried.pieces.length > MAX_PIECES) {
        toast(`A set holds at most ${MAX_PIECES} pieces; nothing was put in.`);
        return false;
      }
      const pasted = pastePieces(document, carried, withPeople);
      const aside = asideOf(pasted);
      take(pasted.document, step, aside.length > 0 ? aside.join('. ') : undefined);
      if (aside.length > 0) toast(`${aside.join('. ')}.`);
      choose(pasted.pieceIds);
      return true;
    },
    [store, take, choose],
  );
}

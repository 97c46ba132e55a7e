import { carriedPieces, MAX_PIECES, pastePieces, type Pasted, type Piece } from '@settlewright/geometry';
import { useMemo } from 'react';
import { toast } from 'sonner';
import { joinWords } from '../choosing-words.ts';
import { useTakeStep } from '../hooks/use-take-step.ts';
import { useSurroundings } from '../room-context.tsx';
import { useRoomStore } from '../store.ts';
import { clipNow, keepClip, readClip, useClipKept, type Clip } from './clip.ts';

export interface Clipboard {
  /** "Paste B1 and T1 from Dining car"; undefined while there is nothing to paste here. */
  words: string | undefined;
  copy: (pieces: readonly Piece[]) => void;
  paste: () => void;
}

const marksOf = ({ carried }: Clip) => {
  const marks = carried.pieces.map(({ mark }) => mark);
  return marks.length > 4 ? `${marks.length} pieces` : joinWords(marks);
};

/** What pasting did besides: new marks, and who stayed behind. */
function asideOf({ remarked, seated, unseated }: Pasted): string[] {
  const people = (count: number) => (count === 1 ? '1 person' : `${count} people`);
  return [
    ...(remarked.length > 0 ? [joinWords(remarked.map(({ from, to }) => `${from} is ${to} here`))] : []),
    ...(seated > 0 ? [`${people(seated)} came along`] : []),
    ...(unseated > 0 ? [`${people(unseated)} did not come along`] : []),
  ];
}

/** Copies pieces with whoever sits on them, and puts them into this set or another of the workshop. */
export function useClipboard(choose: (ids: readonly string[]) => void): Clipboard {
  const store = useRoomStore();
  const { path, setName } = useSurroundings();
  const take = useTakeStep();
  const text = useClipKept();
  const { workshopId, productionId } = path;

  return useMemo(() => {
    const kept = readClip(text);
    const here = kept?.workshopId === workshopId ? kept : undefined;
    return {
      words: here && `Paste ${marksOf(here)} from ${here.setName}`,
      copy: (pieces) => {
        if (pieces.length === 0) return;
        const ids = pieces.map(({ id }) => id);
        const clip = {
          workshopId,
          productionId,
          setName,
          carried: carriedPieces(store.getState().document, ids),
        };
        keepClip(clip);
        toast(`${marksOf(clip)} copied. Paste here or in another set.`);
      },
      paste: () => {
        const clip = clipNow();
        const { document } = store.getState();
        if (clip?.workshopId !== workshopId) {
          toast('Nothing was copied that can be pasted here.');
          return;
        }
        if (document.pieces.length + clip.carried.pieces.length > MAX_PIECES) {
          toast(`A set holds at most ${MAX_PIECES} pieces; nothing was pasted.`);
          return;
        }
        const pasted = pastePieces(document, clip.carried, clip.productionId === productionId);
        const aside = asideOf(pasted);
        take(pasted.document, `Paste ${marksOf(clip)}`, aside.length > 0 ? aside.join('. ') : undefined);
        if (aside.length > 0) toast(`${aside.join('. ')}.`);
        choose(pasted.pieceIds);
      },
    };
  }, [store, workshopId, productionId, setName, text, take, choose]);
}

import { carriedPieces, type Piece } from '@settlewright/geometry';
import { useMemo } from 'react';
import { toast } from 'sonner';
import { joinWords } from '../choosing-words.ts';
import { useSurroundings } from '../room-context.tsx';
import { useRoomStore } from '../store.ts';
import { clipNow, keepClip, readClip, useClipKept, type Clip } from './clip.ts';
import { usePutIn } from './use-put-in.ts';

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

/** Copies pieces with whoever sits on them, and puts them into this set or another of the workshop. */
export function useClipboard(choose: (ids: readonly string[]) => void): Clipboard {
  const store = useRoomStore();
  const { path, setName } = useSurroundings();
  const putIn = usePutIn(choose);
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
        if (clip?.workshopId !== workshopId) {
          toast('Nothing was copied that can be pasted here.');
          return;
        }
        const withPeople = clip.productionId === productionId;
        putIn(clip.carried, { step: `Paste ${marksOf(clip)}`, withPeople });
      },
    };
  }, [store, workshopId, productionId, setName, text, putIn]);
}

import { useCallback } from 'react';
import { download } from '@/lib/download';
import { Problem } from '@/lib/problem';
import { setAddress } from '../api.ts';
import { useAutosave, useSurroundings } from '../room-context.tsx';
import { DraftNotSaved, savedDraft } from '../save/saved-draft.ts';

/** Makes a paper of the draft on the server, with all that this device holds saved first. */
export type DraftPaper = (paper: string, asked: Readonly<Record<string, unknown>>) => Promise<void>;

export function useDraftPaper(): DraftPaper {
  const autosave = useAutosave();
  const { path } = useSurroundings();
  return useCallback(
    async (paper, asked) => {
      const draftNumber = await savedDraft(autosave);
      try {
        await download(`${setAddress(path)}/draft/${paper}`, undefined, { ...asked, draftNumber });
      } catch (error) {
        if (error instanceof Problem && error.code === 'draft-moved-on') {
          throw new DraftNotSaved(
            'Somebody saved a newer draft meanwhile. Load the page again to see it, then ask for the PDF.',
          );
        }
        throw error;
      }
    },
    [autosave, path],
  );
}

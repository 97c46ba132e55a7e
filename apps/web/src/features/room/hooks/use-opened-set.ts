import { useEffect, useState } from 'react';
import { Unreachable } from '@/lib/api-client.ts';
import { putDraft, useDraft, type SetPath } from '../api.ts';
import { createAutosave, type Autosave } from '../save/autosave.ts';
import { openSet } from '../save/opening.ts';
import { createOutbox } from '../save/outbox.ts';
import { createRoomStore, type RoomStore } from '../store.ts';

export type OpenedSet =
  | { kind: 'opening' }
  | { kind: 'failed'; error: unknown }
  | { kind: 'open'; store: RoomStore; autosave: Autosave };

/** Opens a set from the server and from what this device still holds of it. */
export function useOpenedSet(path: SetPath, userId: string, canEdit: boolean): OpenedSet {
  const draft = useDraft(path);
  const [opened, setOpened] = useState<OpenedSet>({ kind: 'opening' });
  const { data, error } = draft;
  const { workshopId, productionId, setId } = path;

  useEffect(() => {
    if (data === undefined && error === null) return undefined;
    let left = false;
    let autosave: Autosave | undefined;
    const outbox = createOutbox(userId, setId);

    async function open() {
      const unsent = canEdit ? await outbox.read().catch(() => undefined) : undefined;
      if (left) return;
      if (data === undefined && !(error instanceof Unreachable && unsent)) {
        setOpened({ kind: 'failed', error });
        return;
      }
      const opening = openSet(data, unsent);
      if (opening.kind === 'unreachable') return;
      // What the server has is not unsent any more.
      if (opening.kind === 'fresh' && unsent) await outbox.clear();
      if (left) return;
      const store = createRoomStore(opening.document);
      autosave = createAutosave({
        store,
        outbox,
        put: putDraft({ workshopId, productionId, setId }),
        base: opening.base,
      });
      if (opening.kind === 'conflict') {
        autosave.state.setState({ save: { kind: 'conflict', conflict: opening.conflict } });
      } else autosave.open({ ...opening.base, savedAt: opening.savedAt });
      setOpened({ kind: 'open', store, autosave });
    }
    void open();
    return () => {
      left = true;
      void autosave?.flush();
      autosave?.stop();
    };
  }, [data, error, userId, workshopId, productionId, setId, canEdit]);

  return opened;
}

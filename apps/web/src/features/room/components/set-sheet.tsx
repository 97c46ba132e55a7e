import { useMemo, type ReactNode } from 'react';
import { useStore } from 'zustand';
import { useSetInfo, type SetPath } from '../api.ts';
import { useRoomCells } from '../hooks/use-room-cells.ts';
import { useSavedCell } from '../hooks/use-saved-cell.ts';
import { useUndoKeys } from '../hooks/use-shortcuts.ts';
import { useAutosave, useSurroundings } from '../room-context.tsx';
import { useUndo } from '../store.ts';
import { Conflict } from './conflict.tsx';
import { DraftRefused } from './draft-refused.tsx';
import { OpenRoom } from './open-room.tsx';

interface Props {
  path: SetPath;
  children: ReactNode;
}

function Frame({ path, children }: Props) {
  const info = useSetInfo(path);
  const autosave = useAutosave();
  const { save } = useStore(autosave.state);
  const { canEdit } = useSurroundings();
  useRoomCells(info.data?.lastRevision, canEdit);
  useSavedCell(autosave);
  const { undoStep, redoStep } = useUndo();
  useUndoKeys(
    useMemo(
      () => ({ undo: () => canEdit && undoStep(), redo: () => canEdit && redoStep() }),
      // The undo steps act on the store, whatever render made them.
      // eslint-disable-next-line react-hooks/exhaustive-deps
      [canEdit],
    ),
  );
  if (save.kind === 'conflict') return <Conflict conflict={save.conflict} />;
  return (
    <>
      {save.kind === 'refused' && (
        <div className="page pb-0!">
          <DraftRefused message={save.message} />
        </div>
      )}
      {children}
    </>
  );
}

/** Another page of an open set: same title block, same saving, same keys of undo, same conflict screen. */
export function SetSheet({ path, children }: Props) {
  return (
    <OpenRoom path={path}>
      <Frame path={path}>{children}</Frame>
    </OpenRoom>
  );
}

import type { ReactNode } from 'react';
import { useStore } from 'zustand';
import { useSetInfo, type SetPath } from '../api.ts';
import { useRoomCells } from '../hooks/use-room-cells.ts';
import { useSavedCell } from '../hooks/use-saved-cell.ts';
import { useAutosave, useSurroundings } from '../room-context.tsx';
import { ConflictScreen } from './conflict-screen.tsx';
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
  return save.kind === 'conflict' ? <ConflictScreen conflict={save.conflict} /> : children;
}

/** Another page of an open set: same title block, same saving, same conflict screen. */
export function SetSheet({ path, children }: Props) {
  return (
    <OpenRoom path={path}>
      <Frame path={path}>{children}</Frame>
    </OpenRoom>
  );
}

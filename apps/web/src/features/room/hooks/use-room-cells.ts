import { useMemo } from 'react';
import { useStore } from 'zustand';
import { useTitleCells, type TitleCell } from '@/lib/title-cells.ts';
import { useAutosave, useSurroundings } from '../room-context.tsx';
import { useUndo } from '../store.ts';

interface Issued {
  letter: string;
  number: number;
}

export function sayDraft(number: number, last: Issued | null | undefined): string {
  if (!last) return `${number}, nothing issued`;
  return number === last.number
    ? `${number}, as issued in ${last.letter}`
    : `${number}, after revision ${last.letter}`;
}

/** The room's cells of the title block: set, draft, undo and redo by name. */
export function useRoomCells(lastRevision: Issued | null | undefined, canEdit: boolean): void {
  const { path, setName } = useSurroundings();
  const autosave = useAutosave();
  const number = useStore(autosave.state, (state) => state.base.number);
  const { undo, redo, undoStep, redoStep } = useUndo();
  const home = `/w/${path.workshopId}/p/${path.productionId}/sets/${path.setId}`;

  const cells = useMemo<TitleCell[]>(() => {
    const where: TitleCell[] = [
      {
        id: 'set',
        side: 'left',
        order: 30,
        label: 'Set',
        value: setName,
        shortens: true,
        menu: [
          { id: 'room', words: 'The room', to: home },
          { id: 'fit', words: 'Fit sheet', to: `${home}/fit` },
          { id: 'stick', words: 'Story stick', to: `${home}/stick` },
          { id: 'crowd', words: 'Who fits', to: `${home}/crowd` },
          ...(canEdit ? [{ id: 'suggest', words: 'Suggest dimensions', to: `${home}/suggest` }] : []),
          { id: 'revisions', words: 'Revisions', to: `${home}/revisions` },
        ],
        name: `Set: ${setName}, menu`,
      },
      {
        id: 'draft',
        side: 'left',
        order: 40,
        label: 'Draft',
        value: sayDraft(number, lastRevision),
        to: `${home}/revisions`,
        yields: 30,
      },
    ];
    if (!canEdit) return where;
    return [
      ...where,
      {
        id: 'undo',
        side: 'right',
        order: 10,
        label: 'Undo',
        value: undo ?? 'nothing',
        name: `Undo ${undo ?? 'nothing'}`,
        disabled: undo === undefined,
        onPress: undoStep,
        shortens: true,
      },
      {
        id: 'redo',
        side: 'right',
        order: 20,
        label: 'Redo',
        value: redo ?? 'nothing',
        name: `Redo ${redo ?? 'nothing'}`,
        disabled: redo === undefined,
        onPress: redoStep,
        shortens: true,
        yields: 40,
      },
    ];
    // The two steps act on the store, whatever render made them.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [setName, home, number, lastRevision, canEdit, undo, redo]);
  useTitleCells(cells);
}

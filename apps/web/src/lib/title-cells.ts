import { useEffect, useId, useLayoutEffect } from 'react';
import { create } from 'zustand';

/** One cell of the title block. */
export interface TitleCell {
  id: string;
  /** Left cells run from the brand on (workshop 10, production 20, set 30, draft 40); right ones end at "signed in". */
  side: 'left' | 'right';
  order: number;
  label: string;
  value: string;
  /** A link. */
  to?: string;
  /** A button, for example undo. */
  onPress?: () => void;
  disabled?: boolean;
  /** A menu under the cell: plain entries, each a link or an action. */
  menu?: TitleMenuEntry[];
  /** Name for a screen reader where label and value do not say it. */
  name?: string;
  /** A name or a step: cut short with an ellipsis before any cell leaves. */
  shortens?: boolean;
  /** Where room is short the highest goes into the menu first; without it the cell always stands. */
  yields?: number;
}

export interface TitleMenuEntry {
  id: string;
  words: string;
  detail?: string;
  to?: string;
  onPress?: () => void;
  chosen?: boolean;
}

interface TitleCells {
  groups: Record<string, TitleCell[]>;
}

const useCells = create<TitleCells>(() => ({ groups: {} }));

/** Puts cells into the title block while the calling page is mounted. */
export function useTitleCells(cells: TitleCell[]): void {
  const key = useId();
  useLayoutEffect(() => {
    useCells.setState((state) => ({ groups: { ...state.groups, [key]: cells } }));
  }, [key, cells]);
  useEffect(
    () => () => {
      useCells.setState((state) => {
        const groups = { ...state.groups };
        delete groups[key];
        return { groups };
      });
    },
    [key],
  );
}

/** All cells in their order; for the title block itself. */
export function useAllTitleCells(): TitleCell[] {
  const groups = useCells((state) => state.groups);
  return Object.values(groups)
    .flat()
    .sort((a, b) => a.order - b.order);
}

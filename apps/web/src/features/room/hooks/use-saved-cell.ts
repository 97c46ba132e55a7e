import { useEffect } from 'react';
import { useStore } from 'zustand';
import { setSavedState, type SavedState } from '@/lib/saved-state.ts';
import type { Autosave, SaveState } from '../save/autosave.ts';

function cellOf(save: SaveState): SavedState {
  switch (save.kind) {
    case 'saved':
      return save.at === '' ? { kind: 'nothing' } : { kind: 'saved', at: Date.parse(save.at) };
    case 'waiting':
    case 'saving':
      return { kind: 'saving' };
    case 'kept':
      return { kind: 'kept-here' };
    case 'refused':
    case 'conflict':
      return { kind: 'not-saved' };
  }
}

/** Keeps the "Saved" cell true and asks before a page with unsent work is closed. */
export function useSavedCell(autosave: Autosave): void {
  const save = useStore(autosave.state, (state) => state.save);
  useEffect(() => setSavedState(cellOf(save)), [save]);
  useEffect(() => () => setSavedState({ kind: 'nothing' }), []);
  useEffect(() => {
    const ask = (event: BeforeUnloadEvent) => {
      const { kind } = autosave.state.getState().save;
      if (kind === 'refused' || kind === 'conflict') event.preventDefault();
      void autosave.flush();
    };
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, [autosave]);
}

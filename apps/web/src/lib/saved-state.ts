import { create } from 'zustand';

/** What the "Saved" cell says; a page that saves by itself keeps it up to date. */
export type SavedState =
  | { kind: 'nothing' }
  | { kind: 'saving' }
  | { kind: 'saved'; at: number }
  | { kind: 'kept-here' }
  | { kind: 'not-saved' };

export const useSavedState = create<{ saved: SavedState }>(() => ({ saved: { kind: 'nothing' } }));

export function setSavedState(saved: SavedState): void {
  useSavedState.setState({ saved });
}

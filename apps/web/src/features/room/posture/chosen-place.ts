import { create } from 'zustand';

interface Looking {
  /** The place whose sitter is being looked at. */
  placeId: string | undefined;
  /** Whether the list of how people sit is open. */
  open: boolean;
}

export const useChosenPlace = create<Looking>(() => ({ placeId: undefined, open: false }));

/** Whoever presses a body, or picks somebody, wants to read about them: the list opens. */
export const choosePlace = (placeId: string): void => useChosenPlace.setState({ placeId, open: true });
export const openSitting = (open: boolean): void => useChosenPlace.setState({ open });

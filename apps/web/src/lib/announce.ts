import { create } from 'zustand';

interface Announcement {
  text: string;
  /** Raised each time, so that the same words are read again. */
  count: number;
}

/** What the live region reads; set through `announce`. */
export const useAnnouncement = create<Announcement>(() => ({ text: '', count: 0 }));

/** Says something to a screen reader without moving the focus. */
export function announce(text: string): void {
  useAnnouncement.setState((state) => ({ text, count: state.count + 1 }));
}

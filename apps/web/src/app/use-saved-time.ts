import { useEffect, useState } from 'react';
import { useConnection } from '@/lib/connection.ts';
import { type SavedState, useSavedState } from '@/lib/saved-state.ts';
import type { TitleCell } from '@/lib/title-cells.ts';

function ago(at: number, now: number): string {
  const minutes = Math.floor((now - at) / 60_000);
  if (minutes < 1) return 'just now';
  if (minutes < 60) return `${minutes} min ago`;
  return `${Math.floor(minutes / 60)} h ago`;
}

function savedWords(saved: SavedState, now: number): string {
  switch (saved.kind) {
    case 'saving':
      return 'saving';
    case 'saved':
      return ago(saved.at, now);
    case 'kept-here':
      return 'kept on this computer';
    case 'not-saved':
      return 'not yet';
    case 'nothing':
      return '';
  }
}

function useMinuteClock(): number {
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    const timer = setInterval(() => setNow(Date.now()), 20_000);
    return () => clearInterval(timer);
  }, []);
  return now;
}

/** When the page was last saved; absent on pages that save with a button. */
export function useSavedTime(): TitleCell | undefined {
  const saved = useSavedState((state) => state.saved);
  const reachable = useConnection((state) => state.reachable);
  const now = useMinuteClock();
  if (saved.kind === 'nothing') return undefined;
  const shown: SavedState = !reachable && saved.kind === 'not-saved' ? { kind: 'kept-here' } : saved;
  return {
    id: 'saved',
    side: 'right',
    order: 40,
    label: 'Saved',
    value: savedWords(shown, Math.max(now, saved.kind === 'saved' ? saved.at : 0)),
    shortens: true,
  };
}

import type { Tried } from '@settlewright/geometry';
import type { SearchForm } from './search-form.ts';

/** A search as it is kept in this tab, so that it goes on after a reload. */
export interface KeptSearch {
  form: SearchForm;
  /** Names everything that was asked: an answer to another question is not kept. */
  question: string;
  tried: Tried[];
  state: 'running' | 'stopped' | 'done';
}

const keyOf = (userId: string, setId: string): string => `settlewright:suggest:${userId}:${setId}`;

export function readSearch(userId: string, setId: string): KeptSearch | undefined {
  try {
    const text = sessionStorage.getItem(keyOf(userId, setId));
    return text === null ? undefined : (JSON.parse(text) as KeptSearch);
  } catch {
    return undefined;
  }
}

export function keepSearch(userId: string, setId: string, kept: KeptSearch): void {
  try {
    sessionStorage.setItem(keyOf(userId, setId), JSON.stringify(kept));
  } catch {
    // Without room the search starts anew after a reload, which is right as well.
  }
}

/** Removes every search of a person from this tab. */
export function wipeSearches(userId: string): void {
  try {
    const own = Object.keys(sessionStorage).filter((key) => key.startsWith(keyOf(userId, '')));
    for (const key of own) sessionStorage.removeItem(key);
  } catch {
    // Nothing was kept either.
  }
}

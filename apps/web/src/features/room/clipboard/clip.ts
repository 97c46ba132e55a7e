import { readSetDocument, type SetDocument } from '@settlewright/geometry';
import { create } from 'zustand';

/** Pieces that were copied in one set, to be put into another. */
export interface Clip {
  workshopId: string;
  productionId: string;
  setName: string;
  /** Checked as any document is. */
  carried: SetDocument;
}

const KEY = 'settlewright:clip';

function stored(): string | null {
  try {
    return sessionStorage.getItem(KEY);
  } catch {
    return null;
  }
}

/** What was copied, as text: it is read anew each time it is asked for, and never believed. */
const useClipText = create<{ text: string | null }>(() => ({ text: stored() }));

/** Keeps pieces for pasting, in this page and over a reload of this tab. */
export function keepClip(clip: Clip): void {
  const text = JSON.stringify(clip);
  try {
    sessionStorage.setItem(KEY, text);
  } catch {
    // Without room there it lasts as long as the page.
  }
  useClipText.setState({ text });
}

/** Forgets what was copied. */
export function wipeClip(): void {
  try {
    sessionStorage.removeItem(KEY);
  } catch {
    // Nothing was kept there either.
  }
  useClipText.setState({ text: null });
}

/** Reads what was copied; undefined where it is nothing that a set could hold. */
export function readClip(text: string | null): Clip | undefined {
  if (text === null) return undefined;
  try {
    const { workshopId, productionId, setName, carried } = JSON.parse(text) as Record<string, unknown>;
    if (typeof workshopId !== 'string' || typeof productionId !== 'string' || typeof setName !== 'string') {
      return undefined;
    }
    const read = readSetDocument(carried);
    return read.ok && read.value.pieces.length > 0
      ? { workshopId, productionId, setName, carried: read.value }
      : undefined;
  } catch {
    return undefined;
  }
}

export const clipNow = (): Clip | undefined => readClip(useClipText.getState().text);

export const useClipKept = (): string | null => useClipText(({ text }) => text);

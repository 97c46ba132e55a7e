import type { SetDocument } from '@settlewright/geometry';
import { del, get, keys, set } from 'idb-keyval';

/** Work that the server has not got yet, kept on this device for one person and set. */
export interface Unsent {
  document: SetDocument;
  /** The draft it was made from. */
  base: { number: number; document: SetDocument };
  changedAt: string;
}

export interface Outbox {
  read: () => Promise<Unsent | undefined>;
  write: (unsent: Unsent) => Promise<void>;
  clear: () => Promise<void>;
}

const prefix = (userId: string): string => `settlewright:unsent:${userId}:`;

export function createOutbox(userId: string, setId: string): Outbox {
  const key = prefix(userId) + setId;
  return {
    read: () => get<Unsent>(key),
    write: (unsent) => set(key, unsent),
    clear: () => del(key),
  };
}

/** A note that was begun and not sent, for one person and set. */
export function createNoteDraft(userId: string, setId: string) {
  const key = `settlewright:note:${userId}:${setId}`;
  return {
    read: () => get<string>(key),
    write: (text: string) => (text === '' ? del(key) : set(key, text)),
  };
}

/** How many sets hold unsent work of this person on this device. */
export async function countUnsent(userId: string): Promise<number> {
  return (await unsentKeys(userId)).length;
}

/** Removes everything unsent of a person: only after they were warned. */
export async function wipeUnsent(userId: string): Promise<void> {
  const notes = (await keys()).filter(
    (key) => typeof key === 'string' && key.startsWith(`settlewright:note:${userId}:`),
  );
  await Promise.all([...(await unsentKeys(userId)), ...notes].map((key) => del(key)));
}

async function unsentKeys(userId: string): Promise<IDBValidKey[]> {
  return (await keys()).filter((key) => typeof key === 'string' && key.startsWith(prefix(userId)));
}

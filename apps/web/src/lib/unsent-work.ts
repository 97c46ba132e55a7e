/** Something a feature holds that the server does not have yet. */
export interface UnsentWork {
  /** Whether anything waits just now. */
  pending: () => boolean | Promise<boolean>;
  /** "3 changes to Dining car": completes the sentence "Not sent yet: …". */
  describe: () => string | Promise<string>;
  /** Removes it from this device. */
  wipe: () => void | Promise<void>;
}

const sources = new Set<UnsentWork>();

/** Registers a keeper of unsent work; returns the way out. */
export function registerUnsentWork(source: UnsentWork): () => void {
  sources.add(source);
  return () => {
    sources.delete(source);
  };
}

/** One line for each thing that would be lost by signing out. */
export async function listUnsentWork(): Promise<string[]> {
  const lines: string[] = [];
  for (const source of sources) {
    if (await source.pending()) lines.push(await source.describe());
  }
  return lines;
}

/** Removes all unsent work from this device. */
export async function wipeUnsentWork(): Promise<void> {
  for (const source of sources) await source.wipe();
}

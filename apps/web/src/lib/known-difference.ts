import type { SetDocument } from '@settlewright/geometry';

/** What is kept knowingly, and why. */
interface Kept {
  text: string;
  reason: string;
  /** Who says so; nobody is named when it is not known. */
  by: string | undefined;
}

/** The set with a choice written into its known differences, under today's date. */
export function withKnownDifference(document: SetDocument, { text, reason, by }: Kept): SetDocument {
  const added = {
    id: crypto.randomUUID(),
    text,
    ...(reason ? { reason } : {}),
    ...(by ? { by } : {}),
    on: new Date().toISOString().slice(0, 10),
  };
  return { ...document, knownDifferences: [...document.knownDifferences, added] };
}

import { diffDocuments, type SetDocument } from '@settlewright/geometry';
import type { Draft } from '@/lib/contract.ts';
import type { DraftConflict } from './autosave.ts';
import type { Unsent } from './outbox.ts';

/** How a set opens, from what the server and this device each hold. */
export type Opening =
  | { kind: 'fresh'; document: SetDocument; base: Base; savedAt: string }
  /** Unsent work of an earlier visit goes on from the draft it was made from. */
  | { kind: 'resumed'; document: SetDocument; base: Base; savedAt: string }
  /** Unsent work, and somebody saved meanwhile. */
  | { kind: 'conflict'; document: SetDocument; base: Base; conflict: DraftConflict }
  | { kind: 'unreachable' };

interface Base {
  number: number;
  document: SetDocument;
}

export function openSet(draft: Draft | undefined, unsent: Unsent | undefined): Opening {
  if (!draft) {
    return unsent
      ? { kind: 'resumed', document: unsent.document, base: unsent.base, savedAt: unsent.changedAt }
      : { kind: 'unreachable' };
  }
  if (!unsent) return { kind: 'fresh', document: draft.document, base: draft, savedAt: draft.savedAt };
  if (unsent.base.number === draft.number) {
    return { kind: 'resumed', document: unsent.document, base: draft, savedAt: draft.savedAt };
  }
  // The newer draft may be this very work, saved while the page was left: then nobody changed anything else.
  const differences = diffDocuments(unsent.base.document, unsent.document, draft.document);
  if (differences.length === 0) {
    return { kind: 'fresh', document: draft.document, base: draft, savedAt: draft.savedAt };
  }
  if (differences.every(({ changedBy }) => changedBy === 'mine')) {
    return { kind: 'resumed', document: unsent.document, base: draft, savedAt: draft.savedAt };
  }
  return {
    kind: 'conflict',
    document: unsent.document,
    base: unsent.base,
    conflict: { current: draft, base: unsent.base },
  };
}

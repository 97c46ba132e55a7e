import type { SetDocument } from '@settlewright/geometry';
import { expect, it } from 'vitest';
import { Unreachable } from '@/lib/problem.ts';
import { createRoomStore } from '../store.ts';
import { createAutosave, type PutOutcome } from './autosave.ts';
import { DraftNotSaved, savedDraft } from './saved-draft.ts';

const set = (text: string): SetDocument => ({
  schemaVersion: 1,
  pieces: [],
  seating: [],
  asked: { backPosture: 'dining', trafficBehind: 'none' },
  knownDifferences: [{ id: 'd1', text }],
});
const outbox = {
  read: () => Promise.resolve(undefined),
  write: () => Promise.resolve(),
  clear: () => Promise.resolve(),
};

/** A draft with one change that the server answers so. */
function changed(outcome: PutOutcome) {
  const store = createRoomStore(set('before'));
  const base = { number: 40, document: store.getState().document };
  const autosave = createAutosave({ store, outbox, put: () => Promise.resolve(outcome), base });
  store.getState().commit(set('after'), 'A change');
  return autosave;
}

it('sends what waits first and answers with the number that holds it', async () => {
  const autosave = changed({ kind: 'saved', number: 41, savedAt: '2027-01-30T10:50:00Z' });
  await expect(savedDraft(autosave)).resolves.toBe(41);
  autosave.stop();
});

it('says that the server cannot be reached', async () => {
  const autosave = changed({ kind: 'unreachable' });
  await expect(savedDraft(autosave)).rejects.toThrow(Unreachable);
  autosave.stop();
});

it('says that a conflict is settled first, and what was refused', async () => {
  const current = {
    number: 41,
    document: set('theirs'),
    savedAt: '2027-01-30T10:42:00Z',
    savedBy: { id: 'u2', name: 'Joss Verity' },
  };
  const conflict = changed({ kind: 'conflict', conflict: { current, base: null } });
  await expect(savedDraft(conflict)).rejects.toThrow(/Settle that first/);
  const refused = changed({ kind: 'refused', message: 'Too many pieces.' });
  await expect(savedDraft(refused)).rejects.toThrow(DraftNotSaved);
  await expect(savedDraft(refused)).rejects.toThrow(/Too many pieces/);
  conflict.stop();
  refused.stop();
});

import { diffDocuments, type SetDocument } from '@settlewright/geometry';
import { createStore, type StoreApi } from 'zustand';
import type { Draft } from '@/lib/contract';
import type { RoomStore } from '../store';
import type { Outbox } from './outbox';

/** Somebody saved after this page read the draft. */
export interface DraftConflict {
  current: Draft;
  base: { number: number; document: SetDocument } | null;
}

export type PutOutcome =
  | { kind: 'saved'; number: number; savedAt: string }
  | { kind: 'conflict'; conflict: DraftConflict }
  /** No line, or the server is down: try again later. */
  | { kind: 'unreachable' }
  /** The server read it and said no: trying again would not help. */
  | { kind: 'refused'; message: string };

export type PutDraft = (baseNumber: number, document: SetDocument) => Promise<PutOutcome>;

export type SaveState =
  | { kind: 'saved'; at: string }
  | { kind: 'waiting' }
  | { kind: 'saving' }
  | { kind: 'kept' }
  | { kind: 'refused'; message: string }
  | { kind: 'conflict'; conflict: DraftConflict };

export interface AutosaveState {
  save: SaveState;
  base: { number: number; document: SetDocument };
}

export interface Autosave {
  state: StoreApi<AutosaveState>;
  /** Takes up a draft: the server's, or unsent work of this device with its base. */
  open: (base: { number: number; document: SetDocument; savedAt: string }) => void;
  /** Sends what is waiting now. */
  flush: () => Promise<void>;
  /** Goes on from the current draft of the server with the merged document. */
  resolve: (current: Draft, merged: SetDocument) => void;
  stop: () => void;
}

export const SAVE_DELAY_MS = 900;
const FIRST_RETRY_MS = 3000;
const LAST_RETRY_MS = 60_000;

export function createAutosave(options: {
  store: RoomStore;
  outbox: Outbox;
  put: PutDraft;
  base: { number: number; document: SetDocument };
}): Autosave {
  const { store, outbox, put } = options;
  const state = createStore<AutosaveState>(() => ({
    save: { kind: 'saved', at: '' },
    base: options.base,
  }));
  let timer: ReturnType<typeof setTimeout> | undefined;
  let retryMs = FIRST_RETRY_MS;
  let sending = false;
  let stopped = false;

  const show = (save: SaveState) => state.setState({ save });
  const isUnsent = () => store.getState().document !== state.getState().base.document;

  function schedule(ms: number) {
    clearTimeout(timer);
    timer = setTimeout(() => void send(), ms);
  }

  async function keep() {
    const { base } = state.getState();
    await outbox.write({ document: store.getState().document, base, changedAt: new Date().toISOString() });
  }

  async function send(): Promise<void> {
    clearTimeout(timer);
    if (sending || stopped || !isUnsent() || state.getState().save.kind === 'conflict') return;
    sending = true;
    const sent = store.getState().document;
    show({ kind: 'saving' });
    const outcome = await put(state.getState().base.number, sent);
    sending = false;
    await settle(outcome, sent);
  }

  async function settle(outcome: PutOutcome, sent: SetDocument) {
    switch (outcome.kind) {
      case 'saved': {
        retryMs = FIRST_RETRY_MS;
        state.setState({ base: { number: outcome.number, document: sent } });
        if (isUnsent()) {
          await keep();
          show({ kind: 'waiting' });
          schedule(SAVE_DELAY_MS);
        } else {
          await outbox.clear();
          show({ kind: 'saved', at: outcome.savedAt });
        }
        return;
      }
      case 'unreachable':
        show({ kind: 'kept' });
        if (!stopped) schedule(retryMs);
        retryMs = Math.min(retryMs * 2, LAST_RETRY_MS);
        return;
      case 'refused':
        show(outcome);
        return;
      case 'conflict':
        await meet(outcome.conflict, sent);
    }
  }

  /** A newer draft that changed nothing we lack, such as our own from another tab, is no conflict. */
  async function meet(conflict: DraftConflict, sent: SetDocument) {
    const { current } = conflict;
    const began = conflict.base?.document ?? state.getState().base.document;
    const differences = diffDocuments(began, sent, current.document);
    if (differences.length === 0) {
      await settle({ kind: 'saved', number: current.number, savedAt: current.savedAt }, sent);
    } else if (differences.every(({ changedBy }) => changedBy === 'mine')) {
      state.setState({ base: { number: current.number, document: current.document } });
      show({ kind: 'waiting' });
      await keep();
      schedule(0);
    } else show({ kind: 'conflict', conflict });
  }

  const unsubscribe = store.subscribe((now, before) => {
    if (now.document === before.document) return;
    if (!isUnsent()) {
      if (!sending) {
        clearTimeout(timer);
        void outbox.clear();
        show({ kind: 'saved', at: new Date().toISOString() });
      }
      return;
    }
    void keep();
    if (state.getState().save.kind === 'conflict') return;
    if (!sending) show({ kind: 'waiting' });
    schedule(SAVE_DELAY_MS);
  });

  const online = () => {
    retryMs = FIRST_RETRY_MS;
    if (isUnsent()) schedule(0);
  };
  window.addEventListener('online', online);

  return {
    state,
    open: ({ number, document, savedAt }) => {
      state.setState({ base: { number, document } });
      if (isUnsent()) {
        show({ kind: 'waiting' });
        schedule(0);
      } else show({ kind: 'saved', at: savedAt });
    },
    flush: send,
    resolve: (current, merged) => {
      state.setState({
        base: { number: current.number, document: current.document },
        save: { kind: 'waiting' },
      });
      store.getState().commit(merged, 'Choices between two versions');
      if (isUnsent()) schedule(0);
      else void settle({ kind: 'saved', number: current.number, savedAt: current.savedAt }, merged);
    },
    stop: () => {
      stopped = true;
      clearTimeout(timer);
      unsubscribe();
      window.removeEventListener('online', online);
    },
  };
}

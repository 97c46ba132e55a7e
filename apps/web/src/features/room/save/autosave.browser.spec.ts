import type { SetDocument } from '@settlewright/geometry';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { createRoomStore } from '../store.ts';
import { createAutosave, SAVE_DELAY_MS, type PutOutcome } from './autosave.ts';
import { openSet } from './opening.ts';
import type { Outbox, Unsent } from './outbox.ts';

const set = (note: string): SetDocument => ({
  schemaVersion: 1,
  pieces: [],
  seating: [],
  asked: { backPosture: 'dining', trafficBehind: 'none' },
  knownDifferences: [{ id: 'd1', text: note }],
});

function boxInMemory(): Outbox & { kept: () => Unsent | undefined } {
  let kept: Unsent | undefined;
  return {
    read: () => Promise.resolve(kept),
    write: (unsent) => {
      kept = structuredClone(unsent);
      return Promise.resolve();
    },
    clear: () => {
      kept = undefined;
      return Promise.resolve();
    },
    kept: () => kept,
  };
}

/** A server that holds one draft and answers as told. */
function serverWith(first: SetDocument) {
  let number = 40;
  let document = first;
  let reachable = true;
  const sent: number[] = [];
  return {
    sent,
    document: () => document,
    unplug: () => (reachable = false),
    plugIn: () => (reachable = true),
    saveElsewhere: (theirs: SetDocument) => {
      number += 1;
      document = theirs;
    },
    put: (baseNumber: number, mine: SetDocument): Promise<PutOutcome> => {
      if (!reachable) return Promise.resolve({ kind: 'unreachable' });
      if (baseNumber !== number) {
        const savedBy = { id: 'u2', name: 'Joss Verity' };
        const current = { number, document, savedAt: '2027-01-30T10:42:00Z', savedBy };
        return Promise.resolve({ kind: 'conflict', conflict: { current, base: null } });
      }
      number += 1;
      document = mine;
      sent.push(number);
      return Promise.resolve({ kind: 'saved', number, savedAt: '2027-01-30T10:43:00Z' });
    },
  };
}

function open() {
  const first = set('as opened');
  const server = serverWith(first);
  const store = createRoomStore(first);
  const outbox = boxInMemory();
  const autosave = createAutosave({ store, outbox, put: server.put, base: { number: 40, document: first } });
  const kind = () => autosave.state.getState().save.kind;
  return { server, store, outbox, autosave, kind };
}

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

describe('autosave', () => {
  it('waits for a pause, then sends the last document once', async () => {
    const { server, store, outbox, kind } = open();
    store.getState().commit(set('one'), 'one');
    await vi.advanceTimersByTimeAsync(SAVE_DELAY_MS - 1);
    store.getState().commit(set('two'), 'two');
    await vi.advanceTimersByTimeAsync(SAVE_DELAY_MS - 1);
    expect(server.sent).toEqual([]);
    expect(outbox.kept()?.document).toEqual(set('two'));
    await vi.advanceTimersByTimeAsync(1);
    expect(server.sent).toEqual([41]);
    expect(server.document()).toEqual(set('two'));
    expect(kind()).toBe('saved');
    expect(outbox.kept()).toBeUndefined();
  });

  it('keeps the work on this device while the server is away, and sends it when the line is back', async () => {
    const { server, store, outbox, kind } = open();
    server.unplug();
    store.getState().commit(set('offline'), 'offline');
    await vi.advanceTimersByTimeAsync(SAVE_DELAY_MS);
    expect(kind()).toBe('kept');
    expect(outbox.kept()).toMatchObject({ document: set('offline'), base: { number: 40 } });
    server.plugIn();
    window.dispatchEvent(new Event('online'));
    await vi.advanceTimersByTimeAsync(1);
    expect(kind()).toBe('saved');
    expect(server.document()).toEqual(set('offline'));
  });

  it('stops at a conflict, overwrites nobody, and goes on from what was chosen', async () => {
    const { server, store, autosave, kind, outbox } = open();
    server.saveElsewhere(set('theirs'));
    store.getState().commit(set('mine'), 'mine');
    await vi.advanceTimersByTimeAsync(SAVE_DELAY_MS);
    expect(kind()).toBe('conflict');
    expect(server.document()).toEqual(set('theirs'));
    expect(outbox.kept()?.document).toEqual(set('mine'));
    store.getState().commit(set('mine still'), 'more');
    await vi.advanceTimersByTimeAsync(SAVE_DELAY_MS * 4);
    expect(server.document()).toEqual(set('theirs'));

    const { save } = autosave.state.getState();
    if (save.kind !== 'conflict') throw new Error('a conflict was expected');
    autosave.resolve(save.conflict.current, set('merged'));
    await vi.advanceTimersByTimeAsync(1);
    expect(server.document()).toEqual(set('merged'));
    expect(kind()).toBe('saved');
  });

  it('takes a newer draft that holds the same document for its own', async () => {
    const { server, store, outbox, kind } = open();
    server.saveElsewhere(set('mine'));
    store.getState().commit(set('mine'), 'mine');
    await vi.advanceTimersByTimeAsync(SAVE_DELAY_MS);
    expect(kind()).toBe('saved');
    expect(server.sent).toEqual([]);
    expect(outbox.kept()).toBeUndefined();
  });

  it('has nothing to send when a change was undone before it went out', async () => {
    const { server, store, outbox, kind } = open();
    store.getState().commit(set('never mind'), 'never mind');
    store.temporal.getState().undo();
    await vi.advanceTimersByTimeAsync(SAVE_DELAY_MS * 2);
    expect(server.sent).toEqual([]);
    expect(outbox.kept()).toBeUndefined();
    expect(kind()).toBe('saved');
  });
});

describe('opening a set again', () => {
  const draft = {
    number: 41,
    document: set('server'),
    savedAt: '2027-01-30T10:42:00Z',
    savedBy: { id: 'u2', name: 'Joss Verity' },
  };
  const unsent = (number: number): Unsent => ({
    document: set('unsent'),
    base: { number, document: set('began from') },
    changedAt: '2027-01-30T10:40:00Z',
  });

  it('goes on with unsent work that began from the newest draft', () => {
    expect(openSet(draft, unsent(41))).toMatchObject({ kind: 'resumed', document: set('unsent') });
  });

  it('asks when somebody saved meanwhile, with the draft the work began from', () => {
    expect(openSet(draft, unsent(40))).toMatchObject({
      kind: 'conflict',
      document: set('unsent'),
      conflict: { current: { number: 41 }, base: { number: 40, document: set('began from') } },
    });
  });

  it('takes a newer draft that holds the unsent work for its own', () => {
    const own = { ...draft, document: set('unsent') };
    expect(openSet(own, unsent(40))).toMatchObject({ kind: 'fresh', base: { number: 41 } });
  });

  it('goes on with unsent work where the newer draft changed nothing', () => {
    const same = { ...draft, document: set('began from') };
    expect(openSet(same, unsent(40))).toMatchObject({
      kind: 'resumed',
      document: set('unsent'),
      base: { number: 41 },
    });
  });

  it('opens unsent work without the server, and says so when there is none', () => {
    expect(openSet(undefined, unsent(40))).toMatchObject({ kind: 'resumed', document: set('unsent') });
    expect(openSet(undefined, undefined)).toEqual({ kind: 'unreachable' });
  });
});

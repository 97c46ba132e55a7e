import type { SetDocument } from '@settlewright/geometry';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { createRoomStore, drawnDocument, settledDocument, shownDocument, undoNames } from './store';
import { REST_MS } from './rest';

const set = (note: string): SetDocument => ({
  schemaVersion: 1,
  pieces: [],
  seating: [],
  asked: { backPosture: 'dining', trafficBehind: 'none' },
  knownDifferences: [{ id: 'd1', text: note }],
});

describe('the undo list of a set', () => {
  it('names what undo takes back and what redo brings again', () => {
    const store = createRoomStore(set('first'));
    expect(undoNames(store)).toEqual({ undo: undefined, redo: undefined });
    store.getState().commit(set('second'), 'Table top 30″ to 29½″');
    store.getState().commit(set('third'), 'Seat 18″ to 17″');
    expect(undoNames(store)).toEqual({ undo: 'Seat 18″ to 17″', redo: undefined });
    store.temporal.getState().undo();
    expect(undoNames(store)).toEqual({ undo: 'Table top 30″ to 29½″', redo: 'Seat 18″ to 17″' });
    expect(store.getState().document).toEqual(set('second'));
  });

  it('gives back the same documents after undoing and redoing everything', () => {
    const store = createRoomStore(set('0'));
    const documents = ['1', '2', '3', '4'].map(set);
    documents.forEach((document, n) => store.getState().commit(document, `step ${n}`));
    store.temporal.getState().undo(4);
    expect(store.getState().document).toEqual(set('0'));
    store.temporal.getState().redo(4);
    expect(store.getState().document).toBe(documents[3]);
  });

  it('shows a preview without making a step of it', () => {
    const store = createRoomStore(set('kept'));
    store.getState().showPreview(set('typing'));
    expect(shownDocument(store.getState())).toEqual(set('typing'));
    expect(undoNames(store).undo).toBeUndefined();
    store.getState().showPreview(null);
    expect(shownDocument(store.getState())).toEqual(set('kept'));
  });

  it('forgets the steps when a document arrives from the server', () => {
    const store = createRoomStore(set('a'));
    store.getState().commit(set('b'), 'b');
    store.getState().load(set('theirs'));
    expect(undoNames(store)).toEqual({ undo: undefined, redo: undefined });
    store.temporal.getState().undo();
    expect(store.getState().document).toEqual(set('theirs'));
  });
});

describe('a hand that moves', () => {
  beforeEach(() => vi.useFakeTimers());
  afterEach(() => vi.useRealTimers());

  it('is drawn at once and counted when it rests', () => {
    const first = set('first');
    const store = createRoomStore(first);
    store.getState().showMoving(set('way'));
    vi.advanceTimersByTime(REST_MS);
    store.getState().showMoving(set('there'));
    vi.advanceTimersByTime(REST_MS);
    expect(drawnDocument(store.getState())).toEqual(set('there'));
    expect(shownDocument(store.getState())).toBe(first);
    vi.runAllTimers();
    expect(shownDocument(store.getState())).toEqual(set('there'));
    expect(store.getState().document).toBe(first);
    store.getState().showMoving(set('on'));
    expect(shownDocument(store.getState())).toEqual(set('there'));
    store.getState().showPreview(null);
    expect(drawnDocument(store.getState())).toBe(first);
    vi.runAllTimers();
    expect(shownDocument(store.getState())).toBe(first);
  });

  it('takes each of several quick steps, and counts all of them once', () => {
    const first = set('first');
    const store = createRoomStore(first);
    const counted = vi.fn();
    store.getState().commitMoving(set('one'), 'Moved', counted);
    store.getState().commitMoving(set('two'), 'Moved', counted);
    expect(store.getState().document).toEqual(set('two'));
    expect(settledDocument(store.getState())).toBe(first);
    expect(store.temporal.getState().pastStates).toHaveLength(2);
    vi.runAllTimers();
    expect(shownDocument(store.getState())).toEqual(set('two'));
    expect(store.getState().preview).toBeNull();
    expect(counted).toHaveBeenCalledExactlyOnceWith(first);
  });

  it('says nothing of steps that another change came after', () => {
    const store = createRoomStore(set('first'));
    const counted = vi.fn();
    store.getState().commitMoving(set('one'), 'Moved', counted);
    store.getState().commit(set('two'), 'Seat 18″ to 17″');
    vi.runAllTimers();
    expect(counted).not.toHaveBeenCalled();
    expect(shownDocument(store.getState())).toEqual(set('two'));
  });

  it('leaves nothing waiting once it is over', () => {
    const store = createRoomStore(set('first'));
    const { commit, commitMoving, showMoving, showPreview } = store.getState();
    for (const over of [() => showPreview(null), () => commit(set('there'), 'Moved')]) {
      showMoving(set('way'));
      commitMoving(set('way'), 'Moved', () => undefined);
      over();
      expect(vi.getTimerCount()).toBe(0);
    }
  });
});

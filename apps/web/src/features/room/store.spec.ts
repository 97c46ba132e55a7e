import type { SetDocument } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { createRoomStore, shownDocument, undoNames } from './store';

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

import type { SetDocument } from '@settlewright/geometry';
import { createContext, useContext } from 'react';
import { temporal, type TemporalState } from 'zundo';
import { createStore, useStore, type StoreApi } from 'zustand';

const UNDO_STEPS = 200;

interface UndoStep {
  document: SetDocument;
  /** What led to this document: "Table top 30″ to 29½″". */
  step: string;
}

export interface RoomState extends UndoStep {
  /** What the hand is doing right now: seen everywhere, kept nowhere until it is committed. */
  preview: SetDocument | null;
  /** Cell of the fit sheet whose gap is lit. */
  litCellId: string | null;
  /** Cell of the fit sheet whose slip is open. */
  openCellId: string | null;
  commit: (document: SetDocument, step: string) => void;
  showPreview: (document: SetDocument | null) => void;
  /** Takes a document from the server; forgets the steps, as they belong to another base. */
  load: (document: SetDocument) => void;
  light: (cellId: string | null) => void;
  openCell: (cellId: string | null) => void;
}

export type RoomStore = StoreApi<RoomState> & { temporal: StoreApi<TemporalState<UndoStep>> };

/** The one store of a set's page. Documents change by `commit` alone: one call, one undo step. */
export function createRoomStore(document: SetDocument): RoomStore {
  const store = createStore<RoomState>()(
    temporal(
      (set) => ({
        document,
        step: '',
        preview: null,
        litCellId: null,
        openCellId: null,
        commit: (next, step) => set({ document: next, step, preview: null }),
        showPreview: (preview) => set({ preview }),
        load: (next) => set({ document: next, step: '', preview: null }),
        light: (litCellId) => set({ litCellId }),
        openCell: (openCellId) => set({ openCellId }),
      }),
      {
        limit: UNDO_STEPS,
        partialize: (state): UndoStep => ({ document: state.document, step: state.step }),
        equality: (past, current) => past.document === current.document,
      },
    ),
  );
  const load = store.getState().load;
  store.setState({
    load: (next) => {
      load(next);
      store.temporal.getState().clear();
    },
  });
  store.temporal.getState().clear();
  return store;
}

export const RoomStoreContext = createContext<RoomStore | null>(null);

export function useRoomStore(): RoomStore {
  const store = useContext(RoomStoreContext);
  if (!store) throw new Error('The room store is missing: wrap this part of the page in RoomStoreContext.');
  return store;
}

export function useRoom<T>(select: (state: RoomState) => T): T {
  return useStore(useRoomStore(), select);
}

/** The document that is on the screen: the one being typed or dragged, else the committed one. */
export const shownDocument = (state: RoomState): SetDocument => state.preview ?? state.document;

export interface UndoNames {
  undo: string | undefined;
  redo: string | undefined;
}

/** What the next undo and redo would do, by name. */
export function undoNames(store: RoomStore): UndoNames {
  const { pastStates, futureStates } = store.temporal.getState();
  return {
    undo: pastStates.length > 0 ? store.getState().step : undefined,
    redo: futureStates.at(-1)?.step,
  };
}

export function useUndo(): UndoNames & { undoStep: () => void; redoStep: () => void } {
  const store = useRoomStore();
  useStore(store.temporal);
  useStore(store, (state) => state.step);
  return {
    ...undoNames(store),
    undoStep: () => {
      store.getState().showPreview(null);
      store.temporal.getState().undo();
    },
    redoStep: () => {
      store.getState().showPreview(null);
      store.temporal.getState().redo();
    },
  };
}

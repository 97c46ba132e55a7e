import type { SetDocument } from '@settlewright/geometry';
import { createContext, useContext } from 'react';
import { temporal, type TemporalState } from 'zundo';
import { createStore, useStore, type StoreApi } from 'zustand';
import { createRest } from './rest.ts';

const UNDO_STEPS = 200;

interface UndoStep {
  document: SetDocument;
  /** What led to this document: "Table top 30″ to 29½″". */
  step: string;
}

export interface RoomState extends UndoStep {
  /** What the hand is doing right now: seen everywhere, kept nowhere until it is committed. */
  preview: SetDocument | null;
  /** What the hand moves just now, frame by frame: it is drawn, and nothing is counted from it until the hand rests. */
  moving: SetDocument | null;
  /** What was counted last, while something moves: numbers are still those of this one. */
  counted: SetDocument | null;
  /** Cell of the fit sheet whose gap is lit. */
  litCellId: string | null;
  /** Cell of the fit sheet whose slip is open. */
  openCellId: string | null;
  commit: (document: SetDocument, step: string) => void;
  /**
   * The same for steps that come fast, as of a key held down: each is one to undo, all are counted when they rest. Then
   * `atRest` of the last one is told what the set was before the first.
   */
  commitMoving: (document: SetDocument, step: string, atRest: (before: SetDocument) => void) => void;
  showPreview: (document: SetDocument | null) => void;
  showMoving: (document: SetDocument) => void;
  /** What moves rests, and is counted. */
  rest: () => void;
  /** Takes a document from the server; forgets the steps, as they belong to another base. */
  load: (document: SetDocument) => void;
  light: (cellId: string | null) => void;
  openCell: (cellId: string | null) => void;
}

export type RoomStore = StoreApi<RoomState> & { temporal: StoreApi<TemporalState<UndoStep>> };

/** The one store of a set's page. Documents change by `commit` alone: one call, one undo step. */
export function createRoomStore(document: SetDocument): RoomStore {
  let began = document;
  let atRest: ((before: SetDocument) => void) | undefined;
  /** Says where a movement began, and that it goes on. */
  function move(state: RoomState, next: SetDocument): Pick<RoomState, 'moving' | 'counted'> {
    if (!state.moving) began = state.document;
    atRest = undefined;
    resting.go();
    return { moving: next, counted: shownDocument(state) };
  }
  const resting = createRest(() => store.getState().rest());
  /** A movement is over, and nothing comes after it. */
  function still(): Pick<RoomState, 'moving' | 'counted'> {
    resting.stop();
    return { moving: null, counted: null };
  }
  const store = createStore<RoomState>()(
    temporal(
      (set, get) => ({
        document,
        step: '',
        preview: null,
        moving: null,
        counted: null,
        litCellId: null,
        openCellId: null,
        commit: (next, step) => set({ document: next, step, preview: null, ...still() }),
        commitMoving: (next, step, then) => {
          set({ document: next, step, preview: null, ...move(get(), next) });
          atRest = then;
        },
        showPreview: (preview) => set({ preview, ...still() }),
        showMoving: (moving) => set(move(get(), moving)),
        rest: () => {
          const { moving } = get();
          if (!moving) return;
          set({ preview: moving === get().document ? null : moving, ...still() });
          atRest?.(began);
        },
        load: (next) => set({ document: next, step: '', preview: null, ...still() }),
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

/** The document that numbers are told of: the one being typed or dragged when it is counted, else the committed one. */
export const shownDocument = (state: RoomState): SetDocument =>
  state.counted ?? state.preview ?? state.document;

/** The document that is drawn: the one in the hand, though nothing has been counted from it yet. */
export const drawnDocument = (state: RoomState): SetDocument => state.moving ?? shownDocument(state);

/** The committed document, as far as it is counted. */
export const settledDocument = (state: RoomState): SetDocument =>
  state.moving === state.document ? shownDocument(state) : state.document;

/** True while something moves and what follows from it is not yet counted. */
export const useIsMoving = (): boolean => useRoom(({ moving }) => moving !== null);

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

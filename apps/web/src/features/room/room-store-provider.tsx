import { useEffect, type ReactNode } from 'react';
import { RoomStoreContext, type RoomStore } from './store.ts';

/** Hands the store of a room to its parts. Once they are gone nothing moves in it, and nothing is counted any more. */
export function RoomStoreProvider({ store, children }: { store: RoomStore; children: ReactNode }) {
  useEffect(() => () => store.getState().showPreview(null), [store]);
  return <RoomStoreContext value={store}>{children}</RoomStoreContext>;
}

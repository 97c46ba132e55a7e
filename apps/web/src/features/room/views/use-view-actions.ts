import {
  addView,
  changeView,
  freeViewName,
  MAX_VIEWS,
  removeView,
  type LensCamera,
  type NamedView,
} from '@settlewright/geometry';
import { useMemo } from 'react';
import { announce } from '@/lib/announce.ts';
import type { RoomAddress } from '../hooks/use-address.ts';
import { boundsOf } from '../scene/bounds.ts';
import type { RoomPicture } from '../picture.ts';
import { useRoomStore } from '../store.ts';
import { presentView } from './present-view.ts';

const EYE_MM = 1219.2;
const BACK_OFF_MM = 3000;

export interface ViewActions {
  keepPresent: () => void;
  addLens: (picture: RoomPicture) => void;
  rename: (view: NamedView, name: string) => void;
  keepOver: (view: NamedView) => void;
  changeLens: (view: NamedView, change: Partial<LensCamera>, words: string) => void;
  remove: (view: NamedView) => void;
}

/** What is done to named views: each one undo step, and said. */
export function useViewActions(address: RoomAddress): ViewActions {
  const store = useRoomStore();
  return useMemo(() => {
    const now = () => store.getState().document;
    const commit = (document: ReturnType<typeof now>, step: string) => {
      store.getState().commit(document, step);
      announce(step);
    };
    const add = (view: Omit<NamedView, 'id'>) => {
      const id = crypto.randomUUID().slice(0, 8);
      const named = { ...view, id, name: freeViewName(now(), view.name) };
      const document = addView(now(), named);
      if (document === now()) {
        announce(`A set keeps at most ${MAX_VIEWS} views. Delete one first.`);
        return;
      }
      commit(document, `View “${named.name}” kept`);
      address.showNamed({ id, clientView: view.shown.clientView });
    };
    return {
      keepPresent() {
        const view = presentView();
        if (view) add(view);
      },
      addLens({ parts }) {
        const { min, max } = boundsOf(parts) ?? { min: [0, 0, 0], max: [0, 0, 0] };
        const camera: LensCamera = {
          kind: 'lens',
          focalLengthMm: 35,
          backMm: { width: 24.892, height: 18.669 },
          aspect: 1.85,
          at: { xMm: Math.round((min[0] + max[0]) / 2), zMm: Math.round(max[2] + BACK_OFF_MM) },
          heightMm: EYE_MM,
          turnDeg: 0,
          tiltDeg: 0,
        };
        add({ name: 'Lens', camera, shown: { bodies: true, tapes: false, clientView: address.clientView } });
      },
      rename(view, name) {
        const wished = name.trim();
        if (wished === '' || wished === view.name) return;
        commit(changeView(now(), view.id, { name: wished }), `View “${view.name}” renamed “${wished}”`);
      },
      keepOver(view) {
        const present = presentView();
        if (!present) return;
        const { camera, shown, section } = present;
        commit(
          changeView(now(), view.id, { camera, shown, section }),
          `View “${view.name}” kept as seen now`,
        );
      },
      changeLens(view, change, words) {
        if (view.camera.kind !== 'lens') return;
        commit(
          changeView(now(), view.id, { camera: { ...view.camera, ...change } }),
          `${view.name}: ${words}`,
        );
      },
      remove(view) {
        commit(removeView(now(), view.id), `View “${view.name}” deleted`);
        if (address.namedId === view.id) address.showNamed(undefined);
      },
    };
  }, [store, address]);
}

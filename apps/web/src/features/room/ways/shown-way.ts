import type { FloorShape, WayIn } from '@settlewright/geometry';
import { create } from 'zustand';

/** The way, and floor for a wheelchair, that the drawing shows as well; nobody's while the list is closed. */
export const useShownWay = create<{ way: WayIn | undefined; floor: readonly FloorShape[] }>(() => ({
  way: undefined,
  floor: [],
}));

export const showWay = (way: WayIn | undefined, floor: readonly FloorShape[] = []): void =>
  useShownWay.setState({ way, floor });

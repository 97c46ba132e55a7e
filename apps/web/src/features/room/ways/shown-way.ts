import type { WayIn } from '@settlewright/geometry';
import { create } from 'zustand';

/** The way that the drawing shows as well; nobody's while the list is closed. */
export const useShownWay = create<{ way: WayIn | undefined }>(() => ({ way: undefined }));

export const showWay = (way: WayIn | undefined): void => useShownWay.setState({ way });

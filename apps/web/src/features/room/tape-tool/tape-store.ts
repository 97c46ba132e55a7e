import { endId, type MeasureEnd } from '@settlewright/geometry';
import { create } from 'zustand';

/** A tape that somebody laid; it lasts as long as the page. */
export interface LaidTape {
  id: string;
  ends: [MeasureEnd, MeasureEnd];
}

interface TapeTool {
  /** Presses in the drawing take points instead of pieces. */
  on: boolean;
  /** A press takes the whole part or body, and the shortest way between two is measured. */
  whole: boolean;
  first: MeasureEnd | undefined;
  /** Of every set that was looked at, by its id. */
  tapes: Readonly<Record<string, readonly LaidTape[]>>;
}

/** The tape in the hand, and those that were laid. */
export const useTapeTool = create<TapeTool>(() => ({ on: false, whole: false, first: undefined, tapes: {} }));

const NONE: readonly LaidTape[] = [];

export const useLaidTapes = (setId: string): readonly LaidTape[] =>
  useTapeTool((state) => state.tapes[setId] ?? NONE);

export const takeTape = (on: boolean): void => useTapeTool.setState({ on, first: undefined });

export const chooseWhole = (whole: boolean): void => useTapeTool.setState({ whole, first: undefined });

export const holdFirst = (first: MeasureEnd | undefined): void => useTapeTool.setState({ first });

/** Lays a tape; one between the same two ends is laid once. */
export function layTape(setId: string, ends: [MeasureEnd, MeasureEnd]): void {
  const id = ends.map(endId).join(' to ');
  useTapeTool.setState(({ tapes }) => {
    const laid = (tapes[setId] ?? NONE).filter((tape) => tape.id !== id);
    return { first: undefined, tapes: { ...tapes, [setId]: [...laid, { id, ends }] } };
  });
}

export function removeTape(setId: string, tapeId: string): void {
  useTapeTool.setState(({ tapes }) => ({
    tapes: { ...tapes, [setId]: (tapes[setId] ?? NONE).filter(({ id }) => id !== tapeId) },
  }));
}

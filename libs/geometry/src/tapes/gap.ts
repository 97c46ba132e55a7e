import type { FitCell, VerdictOutcome } from '@settlewright/anthropometry';
import type { Vec3 } from '../parts/part.ts';
import type { SeatView } from './seat-view.ts';

/** What a gap tape measures, before it becomes a line of its cell. */
export interface Gap {
  from: Vec3;
  to: Vec3;
  name: string;
  valueMm: number;
  describes: string;
}

/** Finds the gap of one cell; `undefined` where what it needs is not there. */
export type Measure = (view: SeatView, cell: FitCell, outcome: VerdictOutcome) => Gap | undefined;

/** The same place at another height. */
export const atHeight = ([x, , z]: Vec3, y: number): Vec3 => [x, y, z];

/** A level or upright gap that keeps its sign: negative when body and piece would meet. */
export const rise = (from: Vec3, toHeight: number, name: string, describes: string): Gap => ({
  from,
  to: atHeight(from, toHeight),
  name,
  valueMm: toHeight - from[1],
  describes,
});

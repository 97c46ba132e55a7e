import type { SetDocument } from '../room/document.ts';
import type { DimensionKind } from './dimension-kinds.ts';

/** Kind of the dimension that moves tables with the seats. */
export const SEAT_AND_TABLES = 'seat-and-tables';

/** The kind of number that a dimension is. */
export const kindOf = ({ id }: Pick<Dimension, 'id'>): string => id.split('|')[0] ?? id;

/** One number of a set that can be chosen, with every piece that moves along. */
export interface Dimension {
  /** Stable within a set: the kind of number, and the piece where it is one piece's alone. */
  id: string;
  label: string;
  unit: DimensionKind['unit'];
  /** The first of the pieces shows the value; the others keep their difference to it. */
  pieceIds: string[];
  marks: string[];
  /** Marks of tables that go up and down with the seats. */
  tableMarks: string[];
  /** The present value. */
  value: number;
  /** Values that make sense to look at, inside the limits of every piece that moves. */
  min: number;
  max: number;
  /** Rule whose bands are shown first. */
  ruleId: string;
  /**
   * The set with the number at a value; `undefined` where a piece cannot be so. With `on`, a set that grew from this
   * one by other dimensions.
   */
  at(value: number, on?: SetDocument): SetDocument | undefined;
}

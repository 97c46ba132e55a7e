import type { Foam } from '../room/document.ts';
import type { CushionCut, CushionSize } from './cushion-sizes.ts';

/** What an edge of a cushion meets. */
export type EdgeMeets =
  | 'wall'
  | 'end-wall'
  | 'arm'
  | 'neighbour'
  | 'corner-cushion'
  | 'free'
  | 'back-pad'
  | 'front'
  | 'seat-cushion'
  | 'top';

/** One column of buttons. */
export interface ButtonColumn {
  /** From the cushion's own seam on the datum side. */
  fromSeamMm: number;
  /** From the wall (or end) that the whole bench is measured from. */
  fromDatumMm: number;
  /** Signed distance to the nearest board joint, towards the datum negative; 0 on a joint. */
  offJointMm: number;
}

/** Buttons of one cushion as a table of columns and rows. */
export interface ButtonTable {
  columns: ButtonColumn[];
  /** From the back seam; of a back cushion from the top seam. */
  rowsMm: number[];
  count: number;
  alignedTo: 'joints' | 'board-centres';
}

/** What the columns of a whole bench are measured from. */
export interface CushionDatum {
  /** Which hand of the sitter it is at. On the sheet, back edge up, the sitter's left is at the right. */
  side: 'left' | 'right';
  /** What it is. */
  meets: 'wall' | 'end-wall' | 'arm' | 'bench-end';
  /** Mark of the wall, when it is a piece of its own. */
  wallMark?: string;
  /** From the datum to this cushion's own seam on that side. */
  toSeamMm: number;
}

/** One cushion to be made. */
export interface CushionSpec {
  /** C1, C2 …: all seats in the order of the pieces, then all backs. */
  mark: string;
  /** Stable while the piece keeps its division: `${pieceId}/${kind}-${n}`. */
  key: string;
  benchId: string;
  benchMark: string;
  kind: 'seat' | 'back';
  /** Which one of how many on the piece, from the left as seen from in front. */
  place: { number: number; of: number };
  /** Sitter's hand at which it meets a wall, end wall or arm when the other end does not; otherwise `either`. */
  hand: 'left' | 'right' | 'either';
  /** Left and right as the sitter sees them. Of a back cushion `back` is the top and `front` the bottom edge. */
  edges: { back: EdgeMeets; front: EdgeMeets; left: EdgeMeets; right: EdgeMeets };
  /** Wood to wood. */
  placeMm: CushionSize;
  /** Taken off the place at each edge. */
  gapsMm: { back: number; front: number; left: number; right: number };
  /** Seam to seam; the size that governs. */
  finishedMm: CushionSize;
  cut: CushionCut;
  /** Edge with the zip. */
  zipEdge: 'back' | 'bottom';
  foam: Foam;
  /** Of a back cushion on a curved back: apex over the pressed seat, and how far it gives way below. */
  curve?: { apexMm: number; recessMm: number };
  buttons: ButtonTable;
  /** Board joints under or behind the cushion, from the seam on the datum side, rising. */
  boardLinesMm: number[];
  datum: CushionDatum;
}

/** Cushions that are made alike. */
export interface CushionGroup {
  marks: string[];
  /** The first of them, to read sizes from. */
  spec: CushionSpec;
  hand: CushionSpec['hand'];
  /** Marks of the cushions that are their mirror image. */
  mirroredMarks: string[];
}

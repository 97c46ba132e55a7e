import type { OutlineCorner } from '../outlines/outline.ts';
import type { Foam } from '../room/document.ts';
import type { CushionEdge, HoldDown } from './cushion-choice.ts';
import type { CushionPlace, CushionSize } from './cushion-sizes.ts';
import type { CushionWarning } from './cushion-warning.ts';
import type { CushionMake } from './making/cushion-make.ts';
import type { CushionPanels } from './making/cut-panels.ts';
import type { TuftingKind, TuftLinesOf } from './tufting-choice.ts';
import type { FullnessRule } from './tufting.ts';
import type { WearArea } from './wear.ts';

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
  /** Signed distance to the nearest board joint, towards the datum negative; 0 on a joint and where there are no boards. */
  offJointMm: number;
}

/** Rows of a back cushion over the seat that the reference sitter of 77 kg has pressed. */
export interface RowsOverSeat {
  /** Of each row, in the order of `rowsMm`, along the face of the back. */
  overMm: number[];
  /** How far the seat goes down. */
  sinkMm: number;
  /** True: the cushion stands on the seat and goes down with it. False: something holds it to the back. */
  goesDown: boolean;
}

/** Buttons of one cushion as a table of columns and rows. */
export interface ButtonTable {
  columns: ButtonColumn[];
  /** From the back seam; of a back cushion from the top seam. */
  rowsMm: number[];
  count: number;
  /** Staggered: the first row and every second after it carry the first, third … column, the others those between. */
  pattern: 'grid' | 'staggered';
  /** Lines the columns stand on, or the field of tufts that gives them. */
  alignedTo: 'joints' | 'board-centres' | 'field';
  /** Of a back cushion that has a seat cushion below. */
  rowsOverSeat?: RowsOverSeat;
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

/** How the face of a cushion is tufted. */
export interface CushionTufting {
  kind: TuftingKind;
  /** How far the buttons go in; 0 without buttons. */
  pullMm: number;
  /** Of biscuits and diamonds: how many, the true size of one, and the border that is left. */
  field?: {
    across: number;
    high: number;
    widthMm: number;
    heightMm: number;
    /** Where columns stand on board lines: the least at the ends. */
    borderMm: number;
    columnsOn?: TuftLinesOf;
  };
  /** Rule by which the cloth of the face has its fullness. */
  fullness?: FullnessRule;
}

/** One cushion to be made. */
export interface CushionSpec extends CushionPlace {
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
  /** Seam to seam; the size that governs. Of a shape that is no rectangle: what it stands in. */
  finishedMm: CushionSize;
  make: CushionMake;
  /**
   * Plan seam to seam, from above with the back edge up, so the sitter's left is at the right; of a back cushion from the
   * front, top up. Corners anticlockwise from the front edge's end at the sitter's right. The plain rectangle where the shape
   * that was asked has a fault.
   */
  outline: OutlineCorner[];
  /** Panels, foam, board, closure and welt; absent where it cannot be made as asked, and then `faults` says why. */
  making?: CushionPanels;
  /** Why it cannot be made as asked, in words; empty where it can. */
  faults: string[];
  /** What somebody should look at before it is made. */
  warnings: CushionWarning[];
  foam: Foam;
  tufting: CushionTufting;
  /** Of a back cushion on a curved back: apex over the pressed seat, and how far it gives way below. */
  curve?: { apexMm: number; recessMm: number };
  buttons: ButtonTable;
  /** Board joints under or behind the cushion, from the seam on the datum side, rising. */
  boardLinesMm: number[];
  datum: CushionDatum;
  /** Edges that the camera sees. */
  cameraSides: CushionEdge[];
  holdDown?: HoldDown;
  /** Areas that are to look used. */
  wear?: WearArea[];
  notes?: string;
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

import type {
  ClothOfOrder,
  CushionEdge,
  Drawing,
  Handedness,
  LaidCloth,
  LengthStyle,
  OrderModel,
  ScheduleRow,
} from '@settlewright/geometry';
import type { Paper } from './pack';
import type { ClothWay } from './plan-place';

export interface Size {
  widthMm: number;
  depthMm: number;
  thicknessMm: number;
}

/** The line that button columns of a whole bench are measured from. */
export interface DatumLine {
  /** "wall W1", "end wall", "bench end". */
  name: string;
  /** The side of the page it stands on. */
  side: 'left' | 'right';
  toSeamMm: number;
  /** Of each column, rising from the datum. */
  columnsMm: readonly number[];
  /** A wall near enough to stand on the drawing. */
  drawn: boolean;
}

/** Where the buttons of a cushion stand. */
interface ButtonPlan {
  /** From the cushion's own seam on the datum's side, rising. */
  columnsMm: readonly number[];
  /** From the back seam (of a back cushion: the top seam), rising. */
  rowsMm: readonly number[];
  /** "wall-end": whose seam that is. */
  seamName: string;
  datum: DatumLine;
  /** Board joints behind or under the cushion, measured like the columns. */
  boardLinesMm: readonly number[];
}

/** Cushions that are made alike, as the sheets show them. */
export interface SpecCushion {
  /** As the order has them. */
  row: ScheduleRow;
  marks: readonly string[];
  /** Marks of the benches, in the order of the cushions. */
  benches: readonly string[];
  /** Marks of those that are the mirror image. */
  mirrorMarks: readonly string[];
  kind: 'seat' | 'back';
  /** As sat in. */
  hand: Handedness;
  finished: Size;
  /** Of a back cushion on a curved back: apex over the pressed seat, and how far it gives way below. */
  curve?: { apexMm: number; recessMm: number };
  /** Construction, closure and welt in words. */
  make: string;
  /** What is cut of the cover, every allowance included. */
  panels: readonly { name: string; count: number; widthMm: number; heightMm: number }[];
  board?: Size;
  /** Along one edge and round both its ends. */
  closure: { word: string; edge: CushionEdge; edgeMm: number; wrapMm: number };
  weltMm: number;
  perimeterMm: number;
  buttons: ButtonPlan;
  /** Words on the edges of the drawing, by the sides of the page. */
  edges: { back: string; front: string; left: string; right: string };
  /** What each edge meets, in one sentence. */
  meets: string;
  /** How the cloth of its faces lies; nothing when no cloth was said. */
  cloth: ClothWay | null;
  /** Why it cannot be made as asked; empty where it can. */
  faults: readonly string[];
}

/** The words of the order that stand on every pack. */
interface SpecWords {
  cover: string;
  foam: string;
  welt: string;
  closure: string;
  fixing: string;
  buttons: string;
  notes: string;
  flammability: string;
}

/** Words on the bag of one cushion. */
export interface BagLabel {
  mark: string;
  /** "B1, seat 1 of 2 from the left, seen from in front". */
  place: string;
  hand: string;
  number: number;
  count: number;
}

/** Everything on the sheets but for the layouts of its cloths. Holds nobody who sits, and no body. */
export interface SpecPackData {
  paper: Paper;
  units: LengthStyle;
  production: string;
  set: string;
  workshop: { name: string; telephone: string };
  order: {
    number: number;
    title: string;
    neededBy: string | null;
    upholsterer: string | null;
    /** For members; nothing secret is in it. */
    pageUrl: string;
  };
  revision: { letter: string; issuedAt: Date; issuedOn: string; issuedBy: string; note: string };
  /** What reads otherwise than in what its upholsterer had before. */
  since: { letter: string; changes: string } | null;
  words: SpecWords;
  /** How far a finished size may be off. */
  toleranceMm: number;
  model: OrderModel;
  /** Names of cloths of which nothing was said but the name. */
  assumedCloths: readonly string[];
  cushions: readonly SpecCushion[];
  labels: readonly BagLabel[];
  plan: Drawing;
  /** The benches of the order from above and one side. */
  picture: Drawing;
  sections: readonly { benches: readonly string[]; drawing: Drawing }[];
}

/** A cloth of the order and, where its panels could be laid, how they lie. */
export interface ClothOnPaper {
  cloth: ClothOfOrder;
  laid?: LaidCloth;
  /** Nothing was said of it but its name: laid as a plain cloth of the usual width. */
  assumed: boolean;
}

/** The same with its cloths laid. */
export interface SpecPack extends SpecPackData {
  cloths: readonly ClothOnPaper[];
}

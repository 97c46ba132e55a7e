import type { CushionEdge, Drawing, LengthStyle } from '@settlewright/geometry';
import type { Paper } from './pack';

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
  marks: readonly string[];
  /** Marks of the benches, in the order of the cushions. */
  benches: readonly string[];
  /** Marks of those that are the mirror image. */
  mirrorMarks: readonly string[];
  kind: 'seat' | 'back';
  /** As sat in. */
  hand: 'left' | 'right' | 'either';
  finished: Size;
  foam: Size;
  foamGrade: { name: string; densityKgM3: number; ifd25N: number; supportFactor: number };
  foamVolumeM3: number;
  foamMassKg: number;
  /** Of a back cushion on a curved back: apex over the pressed seat, and how far it gives way below. */
  curve?: { apexMm: number; recessMm: number };
  /** Construction, closure and welt in words. */
  make: string;
  /** What is cut of the cover, every allowance included. */
  panels: readonly { name: string; count: number; widthMm: number; heightMm: number }[];
  board?: { widthMm: number; depthMm: number };
  /** Along one edge and round both its ends. */
  closure: { word: string; edge: CushionEdge; edgeMm: number; wrapMm: number };
  weltMm: number;
  perimeterMm: number;
  buttons: ButtonPlan;
  /** Words on the edges of the drawing, by the sides of the page. */
  edges: { back: string; front: string; left: string; right: string };
  /** What each edge meets, in one sentence. */
  meets: string;
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

/** Everything on the sheets. Holds nobody who sits, and no body. */
export interface SpecPack {
  paper: Paper;
  units: LengthStyle;
  production: string;
  set: string;
  workshop: { name: string; telephone: string };
  order: { number: number; title: string; neededBy: string | null; upholsterer: string | null };
  revision: { letter: string; issuedAt: Date; issuedOn: string; issuedBy: string; note: string };
  words: SpecWords;
  cushions: readonly SpecCushion[];
  plan: Drawing;
  sections: readonly { bench: string; drawing: Drawing }[];
}

import type { Drawing, LengthStyle } from '@settlewright/geometry';
import type { Paper } from './pack';

export interface Size {
  widthMm: number;
  depthMm: number;
  thicknessMm: number;
}

/** Where the buttons of a cushion stand. */
export interface ButtonPlan {
  /** From the seam that is named below, rising. */
  columnsMm: readonly number[];
  /** From the back seam (of a back cushion: the top seam), rising. */
  rowsMm: readonly number[];
  /** The side of the page the columns are measured from. */
  datum: 'left' | 'right';
  /** "window-end": whose seam that is. */
  datumName: string;
  /** Board joints behind or under the cushion, measured like the columns. */
  boardLinesMm: readonly number[];
  /** The wall or end that the columns line up with; null when the run stands free. */
  wall: { side: 'left' | 'right'; gapMm: number; columnsMm: readonly number[]; name: string } | null;
}

/** Cushions that are made alike, as the sheets show them. */
export interface SpecCushion {
  marks: readonly string[];
  /** Marks of the benches, in the order of the cushions. */
  benches: readonly string[];
  kind: 'seat' | 'back';
  /** As sat in. */
  hand: 'left' | 'right' | 'either';
  finished: Size;
  foam: Size;
  foamGrade: { name: string; densityKgM3: number; ifd25N: number; supportFactor: number };
  foamVolumeM3: number;
  foamMassKg: number;
  plates: { widthMm: number; depthMm: number };
  boxing: { cutHeightMm: number; lengthMm: number };
  /** Along the edge and round each corner; null when the cover closes without one. */
  zip: { lengthMm: number; edgeMm: number; wrapMm: number } | null;
  weltMm: number;
  perimeterMm: number;
  buttons: ButtonPlan;
  /** What each edge meets, by the sides of the page. */
  edges: { back: string; front: string; left: string; right: string };
}

/** The words of the order that stand on every pack. */
export interface SpecWords {
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

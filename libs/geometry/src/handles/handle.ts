import type { Vec3 } from '../parts/part.ts';

/** Where one parameter of a piece is taken hold of, in the piece's own frame. */
export interface Grip {
  key: string;
  /** Which of several grips of one parameter: "left end". */
  side?: 'left' | 'right' | 'front' | 'back';
  pointMm: Vec3;
  /** Unit vector in which the point goes as the value grows. */
  along: Vec3;
  /** Millimetres of the value for one of the way; 1 unless the piece grows about a middle that stays. */
  perMm?: number;
  /** The piece is measured about its middle, and its far side stays where it is. */
  farStays?: true;
  /** For an angle: the line across the piece that the point turns about. */
  pivotMm?: Vec3;
}

/** A point of a piece that can be pulled to change one number. */
export interface Handle {
  /** Stable while the piece has the number: `b1/lengthMm/left`. */
  id: string;
  pieceId: string;
  /** Key of `parametersOf`. */
  key: string;
  side?: Grip['side'];
  /** Label of the parameter. */
  label: string;
  kind: 'length' | 'angle';
  /** True for the numbers of the first sentence. */
  main: boolean;
  value: number;
  min: number;
  max: number;
  /** The point, in the room. */
  atMm: Vec3;
  /** Unit vector in the room in which the point goes as the value grows. */
  along: Vec3;
  perMm: number;
  farStays: boolean;
  /** For an angle in degrees: the point turns about this point, and about an axis along x of the piece. */
  pivotMm?: Vec3;
}

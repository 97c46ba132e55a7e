import type { Part } from '../parts/part.ts';
import type { Piece } from '../room/document.ts';
import type { LengthStyle } from '../units/length-style.ts';
import type { PagePoint } from './drawing.ts';
import type { PageArc, PageLine } from './line-tracks.ts';
import type { Box } from './page-box.ts';
import type { LineKind } from './seen-lines.ts';
import type { SetView } from './set-view.ts';

/** What a mark of a drawing is for; each is a layer of its own in a file. */
export type Layer = LineKind | 'dimension' | 'mark' | 'title';

/** A line or arc of a drawing. */
export type DrawnLine = PageLine & { layer: Layer; pieceId?: string };
export type DrawnArc = PageArc & { layer: Layer; pieceId?: string };

/** Words on a drawing; they read level. */
export interface DrawnWords {
  at: PagePoint;
  text: string;
  /** Height of the letters, millimetres of the real thing: what is laid out divides by the scale. */
  heightMm: number;
  anchor: 'start' | 'middle' | 'end';
  layer: Layer;
  /** A length of the set in words, for whoever reads the file. */
  valueMm?: number;
}

/** A piece with those of its parts that a view shows. */
export interface PieceParts {
  piece: Piece;
  parts: readonly Part[];
}

/** What everything beside the set itself is laid out by. */
export interface SheetOf {
  view: SetView;
  style: LengthStyle;
  /** Height of letters, millimetres of the real thing. */
  letterMm: number;
  /** The set on the page. */
  box: Box;
}

/** What stands beside the set. */
export interface DrawnBeside {
  lines: DrawnLine[];
  words: DrawnWords[];
}

/** Letters stand at nine points on paper whatever the scale. */
export const LETTER_MM = 3.175;
/** Width of an average letter in parts of its height, as drawn here: on the wide side. */
export const LETTER_WIDTH = 0.6;

/**
 * Width of words on paper.
 *
 * @param text - as drawn
 * @param letterMm - height of the letters
 * @returns millimetres, an upper guess for digits and capitals alike
 */
export const wordsWidth = (text: string, letterMm: number): number => text.length * letterMm * LETTER_WIDTH;

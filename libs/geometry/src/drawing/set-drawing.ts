import type { MaterialKey, Part } from '../parts/part.ts';
import { deriveParts } from '../pieces/kinds.ts';
import type { SetDocument } from '../room/document.ts';
import type { LengthStyle } from '../units/length-style.ts';
import { barScale } from './bar-scale.ts';
import type { PagePoint } from './drawing.ts';
import {
  LETTER_MM,
  wordsWidth,
  type DrawnArc,
  type DrawnLine,
  type DrawnWords,
  type PieceParts,
} from './drawn.ts';
import { hiddenWords } from './hidden-words.ts';
import { boxAround, type Box } from './page-box.ts';
import type { PageArc } from './line-tracks.ts';
import { pinnedLines } from './pinned-lines.ts';
import { seenLines } from './seen-lines.ts';
import { setDimensions } from './set-dimensions.ts';
import { pieceMarks } from './set-marks.ts';
import type { SetView } from './set-view.ts';
import { viewWords } from './view-words.ts';

/** An area that a section cuts. */
export interface DrawnFace {
  points: PagePoint[];
  material: MaterialKey;
  pieceId: string;
}

/** A view of a set, ready to be written into a file of any kind. Millimetres of the real thing, y down. */
export interface SetDrawing {
  title: string;
  view: SetView;
  boundsMm: Box;
  /** The set alone, without dimensions and words. */
  setBoundsMm: Box;
  faces: DrawnFace[];
  lines: DrawnLine[];
  arcs: DrawnArc[];
  words: DrawnWords[];
}

function arcEnds({ centre: [x, y], radiusMm }: PageArc): PagePoint[] {
  return [
    [x - radiusMm, y - radiusMm],
    [x + radiusMm, y + radiusMm],
  ];
}

function wordsBox({ at: [x, y], text, heightMm, anchor }: DrawnWords): PagePoint[] {
  const width = wordsWidth(text, heightMm);
  const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2;
  return [
    [left, y - heightMm / 2],
    [left + width, y + heightMm / 2],
  ];
}

function byPiece(document: SetDocument, parts: readonly Part[]): PieceParts[] {
  return document.pieces.flatMap((piece) => {
    const own = parts.filter(({ pieceId }) => pieceId === piece.id);
    return own.length > 0 ? [{ piece, parts: own }] : [];
  });
}

/**
 * Draws a set square from one side or cut, with dimensions, marks, title and a bar scale. Pieces that are hidden are
 * left out, and the sheet says which.
 *
 * @param document - the set
 * @param view - from where, cut where, hidden lines, scale
 * @param style - how lengths are written
 * @returns the drawing; without pieces it holds title and bar alone
 */
export function setDrawing(document: SetDocument, view: SetView, style: LengthStyle): SetDrawing {
  const overhead = new Set(document.pieces.filter(({ kind }) => kind === 'overhead').map(({ id }) => id));
  const unseen = new Set(document.pieces.filter(({ hidden }) => hidden).map(({ id }) => id));
  const parts = deriveParts(document).filter(({ pieceId }) => !unseen.has(pieceId));
  const seen = seenLines(parts, view, (id) => overhead.has(id));
  const lines = seen.lines.map(({ from, to, what }): DrawnLine => ({
    from,
    to,
    layer: what.kind,
    pieceId: what.pieceId,
  }));
  const arcs = seen.arcs.map(({ what, ...arc }): DrawnArc => ({
    ...arc,
    layer: what.kind,
    pieceId: what.pieceId,
  }));
  const setBoundsMm = boxAround([...lines.flatMap(({ from, to }) => [from, to]), ...arcs.flatMap(arcEnds)]);
  const pieces = byPiece(document, seen.parts);
  const letterMm = LETTER_MM * view.scale;
  const sheet = { view, style, letterMm, box: setBoundsMm };
  const dimensions = setDimensions(pieces, sheet);
  const marks = pieceMarks(pieces, sheet);
  const pinned = pinnedLines(document, parts, sheet, [...dimensions.words, ...marks.words]);
  const title = viewWords(view, style);
  const low = Math.max(
    setBoundsMm.y + setBoundsMm.height,
    ...[...dimensions.words, ...marks.words, ...pinned.words].map(({ at }) => at[1] + letterMm),
    ...dimensions.lines.flatMap(({ from, to }) => [from[1], to[1]]),
  );
  const bar = barScale(title, [setBoundsMm.x, low + 2.5 * letterMm], sheet, hiddenWords(document));
  const all: Omit<SetDrawing, 'boundsMm'> = {
    title,
    view,
    setBoundsMm,
    faces: seen.faces.map(({ points, part }) => ({ points, material: part.material, pieceId: part.pieceId })),
    lines: [...lines, ...dimensions.lines, ...marks.lines, ...pinned.lines, ...bar.lines],
    arcs,
    words: [...dimensions.words, ...marks.words, ...pinned.words, ...bar.words],
  };
  const boundsMm = boxAround([
    ...all.lines.flatMap(({ from, to }) => [from, to]),
    ...all.arcs.flatMap(arcEnds),
    ...all.words.flatMap(wordsBox),
  ]);
  return { ...all, boundsMm };
}

import bidiFactory from 'bidi-js';
import { joinArabic } from './arabic-forms';
import { clusters } from './clusters';
import { advance, type Face, faceOf, holdsAll, type Weight } from './faces';
import { ROMANISED } from './printable';

export type Direction = 'ltr' | 'rtl';

/** A stretch of text in one face, as it stands from left to right. */
export interface TextRun {
  text: string;
  face: Face;
}

const RIGHT_TO_LEFT = /[\p{Script=Hebrew}\p{Script=Arabic}\u200c]/u;
const bidi = bidiFactory();

/** Reading direction of a text: that of its first letter. */
export function directionOf(text: string): Direction {
  return RIGHT_TO_LEFT.test(/\p{L}/u.exec(text)?.[0] ?? '') ? 'rtl' : 'ltr';
}

/** Printable text as it is drawn: right-to-left words turned, Arabic joined, cut where the face changes. */
export function textRuns(printed: string, direction: Direction = directionOf(printed)): TextRun[] {
  if (holdsAll('Work Sans', printed)) return [{ text: printed, face: 'Work Sans' }];
  const runs: TextRun[] = [];
  for (const cluster of clusters(inDrawingOrder(printed, direction))) {
    const face = faceOf(cluster) ?? 'DejaVu Sans';
    const last = runs.at(-1);
    if (last?.face === face) last.text += cluster;
    else runs.push({ text: cluster, face });
  }
  return runs;
}

/** Width of a run at a size of one point, in points. */
export function runWidth({ text, face }: TextRun, weight: Weight): number {
  let width = 0;
  for (const character of text) width += advance(face, weight, character.codePointAt(0) ?? 0);
  return width;
}

function inDrawingOrder(printed: string, direction: Direction): string {
  const marked = printed.replaceAll(ROMANISED, '*');
  if (!RIGHT_TO_LEFT.test(marked)) return marked;
  const joined = joinArabic(marked);
  return bidi.getReorderedString(joined, bidi.getEmbeddingLevels(joined, direction));
}

import { clusters } from './lettering/clusters';
import type { Weight } from './lettering/faces';
import { printable } from './lettering/printable';
import { directionOf } from './lettering/text-runs';
import { leading, type Sheet, type TextStyle } from './sheet';

/** A stretch of text in one weight. */
interface Run {
  text: string;
  weight?: Weight;
}

export type Prose = string | readonly Run[];

interface Word {
  text: string;
  weight: Weight;
  width: number;
  spaceBefore: boolean;
}

type Line = Word[];

/** Breaks text at plain spaces only; a word wider than the column is cut where the column ends. */
export function breakLines(sheet: Sheet, prose: Prose, width: number, style: TextStyle = {}): Line[] {
  const lines: Line[] = [];
  let line: Line = [];
  let used = 0;
  for (const word of wordsOf(sheet, prose, width, style)) {
    const space = word.spaceBefore && line.length > 0 ? sheet.measure(' ', { ...style, ...word }) : 0;
    const breaks = word.spaceBefore || used + word.width > width;
    if (line.length > 0 && breaks && used + space + word.width > width) {
      lines.push(line);
      line = [];
      used = 0;
    }
    used += (line.length > 0 ? space : 0) + word.width;
    line.push(word);
  }
  if (line.length > 0) lines.push(line);
  return lines;
}

/** Writes a paragraph whose first baseline is at y; returns the baseline that would follow the last line. */
export function paragraph(
  sheet: Sheet,
  prose: Prose,
  x: number,
  y: number,
  width: number,
  style: TextStyle = {},
): number {
  let baseline = y;
  const direction = directionOf(typeof prose === 'string' ? prose : prose.map(({ text }) => text).join(' '));
  for (const line of breakLines(sheet, prose, width, style)) {
    let at = x;
    for (const piece of joined(line)) {
      const pieceStyle = { ...style, direction, weight: piece.weight };
      sheet.text(piece.text, at, baseline, pieceStyle);
      at += sheet.measure(piece.text, pieceStyle);
    }
    baseline += leading(style.size ?? 9);
  }
  return baseline;
}

export function linesNeeded(sheet: Sheet, prose: Prose, width: number, style: TextStyle = {}): number {
  return breakLines(sheet, prose, width, style).length;
}

/** Words of one weight written in one go, so that a reader of the file finds whole phrases. */
function joined(line: Line): { text: string; weight: Weight }[] {
  const pieces: { text: string; weight: Weight }[] = [];
  line.forEach((word, index) => {
    const text = (word.spaceBefore && index > 0 ? ' ' : '') + word.text;
    const last = pieces.at(-1);
    if (last && last.weight === word.weight) last.text += text;
    else pieces.push({ text, weight: word.weight });
  });
  return pieces;
}

function* wordsOf(sheet: Sheet, prose: Prose, width: number, style: TextStyle): Generator<Word> {
  const runs: readonly Run[] = typeof prose === 'string' ? [{ text: prose }] : prose;
  let afterSpace = false;
  for (const run of runs) {
    const weight = run.weight ?? style.weight ?? 400;
    const parts = printable(run.text).split(/( +)/);
    for (const part of parts) {
      if (part === '') continue;
      if (/^ +$/.test(part)) {
        afterSpace = true;
        continue;
      }
      for (const bit of cut(sheet, part, width, { ...style, weight })) {
        yield {
          text: bit,
          weight,
          width: sheet.measure(bit, { ...style, weight }),
          spaceBefore: afterSpace,
        };
        afterSpace = false;
      }
    }
  }
}

function cut(sheet: Sheet, word: string, width: number, style: TextStyle): string[] {
  if (sheet.measure(word, style) <= width) return [word];
  const bits: string[] = [];
  let bit = '';
  for (const character of clusters(word)) {
    if (bit !== '' && sheet.measure(bit + character, style) > width) {
      bits.push(bit);
      bit = '';
    }
    bit += character;
  }
  return [...bits, bit];
}

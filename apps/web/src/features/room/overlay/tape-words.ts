import type { FitSheet } from '@settlewright/anthropometry';
import {
  formatExactLength,
  formatLength,
  spokenExactLength,
  spokenLength,
  type LengthStyle,
  type TapeLine,
} from '@settlewright/geometry';
import { verdictWord } from '@/components/verdict.tsx';
import { worstCell } from '../verdict-words.ts';

/** Heights first: they decide most and are seen best from the aisle. */
const FIRST = ['pressedSeatHeight', 'heightMm', 'backHeightMm', 'seatDepthMm'];
const rankOf = ({ parameterKey = '' }: TapeLine): number =>
  FIRST.includes(parameterKey) ? FIRST.indexOf(parameterKey) : FIRST.length;

/** Tapes that are drawn at rest: the selected piece's own, the worst gap, and the lit one. */
export function tapesAtRest(
  tapes: readonly TapeLine[],
  sheet: FitSheet,
  selectedPieceId: string | undefined,
  litCellId: string | null,
  most = 5,
): TapeLine[] {
  const worst = worstCell(sheet);
  const gaps = tapes.filter(
    (tape) => tape.kind === 'gap' && (tape.cellId === litCellId || tape.cellId === worst?.id),
  );
  const own = tapes
    .filter((tape) => tape.kind !== 'gap' && tape.pieceId === selectedPieceId)
    .sort((a, b) => rankOf(a) - rankOf(b));
  return [...own.slice(0, Math.max(1, most - gaps.length)), ...gaps];
}

const styleOf = (tape: TapeLine, style: LengthStyle): LengthStyle => ({
  ...style,
  feet: /length/i.test(tape.parameterKey ?? ''),
});

/** A number that was chosen reads as in the sentence; what follows from others is rounded. */
export const showTape = (tape: TapeLine, style: LengthStyle): string =>
  (tape.kind === 'dimension' ? formatExactLength : formatLength)(tape.valueMm, styleOf(tape, style));

/** Full name of a tape for a list or a screen reader. */
export function sayTape(tape: TapeLine, style: LengthStyle): string {
  const verdict = tape.verdict ? `, ${verdictWord(tape.verdict)}` : '';
  const say = tape.kind === 'dimension' ? spokenExactLength : spokenLength;
  return `${tape.name}, ${say(tape.valueMm, styleOf(tape, style))}, ${tape.describes}${verdict}`;
}

export function tapeTone(tape: TapeLine): 'chalk' | 'ink' | 'fits' | 'tight' | 'wont' | 'unknown' {
  if (tape.kind === 'fixed') return 'ink';
  if (tape.kind === 'dimension') return 'chalk';
  switch (tape.verdict) {
    case 'fits':
      return 'fits';
    case 'tight':
      return 'tight';
    case 'wontFit':
      return 'wont';
    default:
      return 'unknown';
  }
}

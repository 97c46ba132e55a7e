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
import type { RoomSurroundings } from '../room-context.tsx';
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

type Detail = RoomSurroundings['detail'];

const styleOf = (tape: TapeLine, style: LengthStyle): LengthStyle => ({
  ...style,
  feet: /length/i.test(tape.parameterKey ?? ''),
});

/**
 * A number that was chosen reads as in the sentence; what follows from others is rounded. Whoever sees
 * verdicts alone sees a body drawn in round sizes, so a gap to it has a verdict and no number.
 */
export function showTape(tape: TapeLine, style: LengthStyle, detail: Detail): string {
  if (tape.kind === 'gap' && detail === 'verdicts') return tape.verdict ? verdictWord(tape.verdict) : '';
  return (tape.kind === 'dimension' ? formatExactLength : formatLength)(tape.valueMm, styleOf(tape, style));
}

/** Full name of a tape for a list or a screen reader. */
export function sayTape(tape: TapeLine, style: LengthStyle, detail: Detail): string {
  const say = tape.kind === 'dimension' ? spokenExactLength : spokenLength;
  const size = tape.kind === 'gap' && detail === 'verdicts' ? [] : [say(tape.valueMm, styleOf(tape, style))];
  const verdict = tape.verdict ? [verdictWord(tape.verdict)] : [];
  return [tape.name, ...size, tape.describes, ...verdict].join(', ');
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

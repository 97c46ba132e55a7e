import {
  kindTitle,
  type Handle,
  type LengthStyle,
  type Piece,
  type SnappedPull,
} from '@settlewright/geometry';
import { inOtherUnits, sayNumber, showNumber, type NumberParameter } from '../numbers.ts';
import { limitWord, sayLimit, type BeyondRoom } from '../room-limits.ts';

const SIDES = { left: 'left end', right: 'right end', front: 'front', back: 'back' };

/** The number that a handle changes, as the fields and steps of numbers know it. */
export const numberOf = ({ key, label, kind, min, max, value }: Handle): NumberParameter => ({
  key,
  label,
  kind,
  unit: kind === 'angle' ? 'deg' : 'mm',
  min,
  max,
  value,
});

/** "Bench B1 length, left end, three feet eight inches, arrows change it". */
export function sayHandle(piece: Piece, handle: Handle, style: LengthStyle): string {
  const label = handle.label.charAt(0).toLowerCase() + handle.label.slice(1);
  return [
    `${kindTitle(piece.kind)} ${piece.mark} ${label}`,
    ...(handle.side ? [SIDES[handle.side]] : []),
    sayNumber(numberOf(handle), style),
    'arrows change it',
  ].join(', ');
}

/** What stands beside a handle while it is pulled: "Length 4′ 0″, 1219.2 mm, end of T1". */
export function readOutPull(
  number: NumberParameter,
  { value, snappedTo, limit }: SnappedPull,
  beyond: BeyondRoom | undefined,
  piece: Piece,
  style: LengthStyle,
): string {
  const other = inOtherUnits(number, style, value);
  return [
    `${number.label} ${showNumber(number, style, value)}`,
    ...(other ? [other] : []),
    ...(snappedTo === undefined ? [] : [snappedTo]),
    ...(limit === undefined ? [] : [`${limitWord(number, limit).toLowerCase()} possible`]),
    ...(beyond ? [sayLimit(number, beyond, piece, style)] : []),
  ].join(', ');
}

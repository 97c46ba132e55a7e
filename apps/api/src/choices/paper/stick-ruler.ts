import { type Dimension, dimensionValue, type LengthStyle, MM_PER_INCH } from '@settlewright/geometry';
import { PEN, type Sheet } from '../../paper/sheet';
import type { Across } from './stick-paper';

export const RULER_MM = 10;
const LABEL_GAP_MM = 3;
const TICK_MM = { long: 4, middle: 2.6, short: 1.6 };

/** Distance of labels and of the smallest ticks, the finest first. */
function divisions(unit: Dimension['unit'], { system }: LengthStyle): readonly (readonly [number, number])[] {
  if (unit === 'deg')
    return [
      [1, 2],
      [2, 4],
      [5, 5],
      [10, 10],
    ];
  if (unit === 'N')
    return [
      [10, 2],
      [20, 4],
      [50, 5],
      [100, 10],
    ];
  if (system === 'millimetres')
    return [
      [10, 10],
      [20, 4],
      [50, 10],
      [100, 10],
      [200, 4],
      [500, 10],
      [1000, 10],
    ];
  return [1, 2, 3, 6, 12, 24].map((inches) => [inches * MM_PER_INCH, inches < 3 ? 8 : inches] as const);
}

/** The ruler along the foot, in the units of the paper. */
export function drawRuler(
  sheet: Sheet,
  { from, to, x }: Across,
  y: number,
  { min, max, unit }: Pick<Dimension, 'min' | 'max' | 'unit'>,
  style: LengthStyle,
): void {
  sheet.line(from, y, to, y, { pen: PEN.frame });
  const label = (value: number) => dimensionValue(value, unit, style);
  const widest = Math.max(sheet.textWidth(label(min)), sheet.textWidth(label(max)));
  const perUnit = (to - from) / (max - min);
  const all = divisions(unit, style);
  const [step, parts] = all.find(([one]) => one * perUnit >= widest + LABEL_GAP_MM) ?? all.at(-1) ?? [1, 1];
  const small = step / parts;
  for (let n = Math.ceil(min / small - 1e-6); n * small <= max + 1e-6; n += 1) {
    const size = n % parts === 0 ? 'long' : parts % 2 === 0 && n % (parts / 2) === 0 ? 'middle' : 'short';
    const at = x(n * small);
    sheet.line(at, y, at, y + TICK_MM[size], { pen: size === 'long' ? PEN.edge : PEN.fine });
    if (size !== 'long') continue;
    const words = label(n * small);
    const half = sheet.textWidth(words) / 2;
    const middle = Math.min(Math.max(at, from + half), to - half);
    sheet.text(words, middle, y + TICK_MM.long + 3.6, { align: 'center' });
  }
}

import { formatLength } from '../units/format-length.ts';
import { MM_PER_FOOT, MM_PER_INCH } from '../units/length-style.ts';
import type { PagePoint } from './drawing.ts';
import { scaleWords } from './drawing-scale.ts';
import type { DrawnBeside, DrawnLine, DrawnWords, SheetOf } from './drawn.ts';

const INCH_STEPS = [1, 3, 6, 12, 24, 60, 120].map((inches) => inches * MM_PER_INCH);
const METRIC_STEPS = [25, 50, 100, 250, 500, 1000, 2000];
/** The bar is about as long on paper as a finger. */
const SHORTEST_ON_PAPER_MM = 50;
const STEPS = 4;

/**
 * Title, scale and a bar of true lengths.
 *
 * @param title - of the view
 * @param at - upper left corner, millimetres of the real thing
 * @param sheet - scale and units
 * @param leftOut - what the drawing does not show, where anything is left out
 * @returns lines and words for the foot of a drawing
 */
export function barScale(
  title: string,
  at: PagePoint,
  { view, style, letterMm }: SheetOf,
  leftOut?: string,
): DrawnBeside {
  const steps = style.system === 'millimetres' ? METRIC_STEPS : INCH_STEPS;
  const step =
    steps.find((mm) => (mm * STEPS) / view.scale >= SHORTEST_ON_PAPER_MM) ?? steps.at(-1) ?? MM_PER_FOOT;
  const [x, y] = at;
  const [barY, tick] = [y + 4.4 * letterMm, letterMm * 0.45];
  const line = (from: PagePoint, to: PagePoint): DrawnLine => ({ from, to, layer: 'title' });
  const words = (place: PagePoint, text: string, size: number, anchor: 'start' | 'middle'): DrawnWords => ({
    at: place,
    text,
    heightMm: size,
    anchor,
    layer: 'title',
  });
  const places = Array.from({ length: STEPS + 1 }, (_, n) => n * step);
  return {
    lines: [
      line([x, barY], [x + STEPS * step, barY]),
      // Every other step is a box: the bar reads without counting ticks.
      ...places
        .slice(0, -1)
        .flatMap((from, n) =>
          n % 2 === 0 ? [line([x + from, barY - tick], [x + from + step, barY - tick])] : [],
        ),
      ...places.map((mm) => line([x + mm, barY - tick], [x + mm, barY + tick])),
    ],
    words: [
      words([x, y], title, letterMm * 1.35, 'start'),
      words(
        [x, y + 1.9 * letterMm],
        `Scale ${scaleWords(style.system, view.scale)}. Sizes govern.${leftOut ? ` ${leftOut}.` : ''}`,
        letterMm,
        'start',
      ),
      ...places.map((mm) =>
        words(
          [x + mm, barY + 1.25 * letterMm],
          mm === 0 ? '0' : formatLength(mm, { ...style, feet: true }),
          letterMm * 0.9,
          'middle',
        ),
      ),
    ],
  };
}

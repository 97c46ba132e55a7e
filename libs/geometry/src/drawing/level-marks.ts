import { formatLength } from '../units/format-length.ts';
import type { DrawnBeside, DrawnLine, SheetOf } from './drawn.ts';
import type { PagePoint } from './drawing.ts';
import type { Level } from './piece-levels.ts';

const line = (from: PagePoint, to: PagePoint): DrawnLine => ({ from, to, layer: 'dimension' });

/** Heights moved apart until none is nearer another than a step, as little as that takes from below. */
function apart(heights: readonly number[], step: number): number[] {
  const placed: number[] = [];
  for (const height of heights) placed.push(Math.max(height, (placed.at(-1) ?? -Infinity) + step));
  return placed;
}

/**
 * Heights above the floor in a column beside an elevation, each with a line to its own height; the floor is the lowest.
 *
 * @param levels - rising
 * @param sheet - what they are laid out by
 * @returns lines and words that stand clear of each other
 */
export function levelMarks(levels: readonly Level[], { box, style, letterMm }: SheetOf): DrawnBeside {
  const all: Level[] = [{ heightMm: 0, words: 'floor' }, ...levels];
  const places = apart(
    all.map(({ heightMm }) => heightMm),
    letterMm * 1.45,
  );
  const right = box.x + box.width;
  const [start, bend, end] = [0.8, 2.2, 3.6].map((letters) => right + letters * letterMm);
  const drawn: DrawnBeside = { lines: [], words: [] };
  all.forEach(({ heightMm, words }, i) => {
    const [y, moved] = [-heightMm, -places[i]!];
    drawn.lines.push(line([start!, y], [bend!, y]));
    if (Math.abs(moved - y) > 1e-6) drawn.lines.push(line([bend!, y], [end!, moved]));
    else drawn.lines.push(line([bend!, y], [end!, y]));
    drawn.words.push({
      at: [end! + letterMm * 0.4, moved],
      text: heightMm === 0 ? words : `${formatLength(heightMm, { ...style, feet: false })} ${words}`,
      heightMm: letterMm,
      anchor: 'start',
      layer: 'dimension',
      valueMm: heightMm,
    });
  });
  drawn.lines.push(line([box.x - 2 * letterMm, 0], [bend!, 0]));
  return drawn;
}

import { formatLength } from '../units/format-length.ts';
import { labelLanes } from './dimension-chain.ts';
import { wordsWidth, type DrawnBeside, type DrawnLine, type PieceParts, type SheetOf } from './drawn.ts';
import type { PagePoint } from './drawing.ts';
import { levelMarks } from './level-marks.ts';
import { extentOf } from './piece-extents.ts';
import { pieceLevels } from './piece-levels.ts';
import { pageFrame } from './set-view.ts';

/** Ends nearer than this are one stop. */
const SAME_MM = 1;

const line = (from: PagePoint, to: PagePoint): DrawnLine => ({ from, to, layer: 'dimension' });

/** Rising places, those that lie together taken as one. */
function stopsOf(places: readonly number[]): number[] {
  const stops: number[] = [];
  for (const place of [...places].sort((a, b) => a - b)) {
    const last = stops.at(-1);
    if (last === undefined || place - last > SAME_MM) stops.push(place);
  }
  return stops;
}

/** A run of dimensions along one line. `at` is where the line stands, `outward` the side free for lifted numbers. */
interface Run {
  stops: readonly number[];
  at: number;
  outward: 1 | -1;
  direction: 'level' | 'upright';
}

function drawRun(
  { stops, at, outward, direction }: Run,
  { style, letterMm }: SheetOf,
): DrawnBeside & { reach: number } {
  const level = direction === 'level';
  const point = (along: number, across: number): PagePoint => (level ? [along, across] : [across, along]);
  const tick = letterMm * 0.45;
  const texts = stops.slice(1).map((to, i) => formatLength(to - stops[i]!, { ...style, feet: false }));
  const widest = Math.max(...texts.map((text) => wordsWidth(text, letterMm))) + letterMm * 0.6;
  const lanes = labelLanes(
    stops.slice(1).map((to, i) => [stops[i]!, to] as const),
    level ? widest : letterMm * 1.5,
  );
  // Numbers stand beside the line, not in it, so that nothing has to be broken.
  const beside = letterMm * (level ? 0.85 : 0.7);
  const laneStep = level ? letterMm * 1.3 : widest;
  const lines = [
    line(point(stops[0]!, at), point(stops.at(-1)!, at)),
    ...stops.map((stop) => line(point(stop - tick, at + tick), point(stop + tick, at - tick))),
  ];
  const [first, last] = [stops[0]! + letterMm * 0.9, stops.at(-1)! - letterMm * 0.9];
  const words = texts.map((text, i) => {
    const [from, to] = [stops[i]!, stops[i + 1]!];
    const middle = (from + to) / 2;
    const lane = lanes[i]!;
    const across = at + outward * (beside + lane * laneStep);
    // A lifted number keeps clear of the thin lines that lead to the ends of the next run.
    const place = lane > 0 ? Math.min(Math.max(middle, first), last) : middle;
    if (lane > 0)
      lines.push(line(point(middle, at), point(place, across - outward * letterMm * (level ? 0.6 : 0.25))));
    return {
      at: point(place, across),
      text,
      heightMm: letterMm,
      anchor: level ? ('middle' as const) : outward < 0 ? ('end' as const) : ('start' as const),
      layer: 'dimension' as const,
      valueMm: to - from,
    };
  });
  const reach = beside + Math.max(0, ...lanes) * laneStep + (level ? letterMm * 0.6 : widest);
  return { lines, words, reach };
}

/** Two runs, the nearer from piece to piece and the other over all, with thin lines out to them. */
function runsBeside(
  places: readonly number[],
  whole: readonly [number, number],
  edge: { at: number; outward: 1 | -1; direction: Run['direction'] },
  sheet: SheetOf,
): DrawnBeside {
  const { letterMm } = sheet;
  const inner = stopsOf(places);
  const outer = stopsOf(whole);
  const same = inner.length === 2 && inner.every((stop, i) => Math.abs(stop - outer[i]!) <= SAME_MM);
  const runs = [...(same ? [] : [inner]), outer].filter((stops) => stops.length > 1);
  const drawn: DrawnBeside = { lines: [], words: [] };
  let at = edge.at + edge.outward * letterMm * 2.4;
  const level = edge.direction === 'level';
  for (const stops of runs) {
    const run = drawRun({ stops, at, outward: edge.outward, direction: edge.direction }, sheet);
    const from = edge.at + edge.outward * letterMm * 0.7;
    const to = at + edge.outward * letterMm * 0.45;
    for (const stop of stops)
      drawn.lines.push(level ? line([stop, from], [stop, to]) : line([from, stop], [to, stop]));
    drawn.lines.push(...run.lines);
    drawn.words.push(...run.words);
    at += edge.outward * (run.reach + letterMm * 1.1);
  }
  return drawn;
}

/**
 * The dimensions of a view: from piece to piece and over all along the page, and in a plan up it; heights above the
 * floor beside an elevation. Loose seats stand where they are put and are not measured to; walls count for the whole.
 *
 * @param pieces - with the parts that the view shows
 * @param sheet - what they are laid out by
 * @returns lines and words, no number on another
 */
export function setDimensions(pieces: readonly PieceParts[], sheet: SheetOf): DrawnBeside {
  const { box, view } = sheet;
  if (pieces.length === 0) return { lines: [], words: [] };
  const frame = pageFrame(view.direction);
  const fixed = pieces.filter(({ piece }) => piece.kind === 'bench' || piece.kind === 'table');
  const extents = fixed.map(({ parts }) => extentOf(parts, frame));
  const plan = view.direction === 'above';
  const below = runsBeside(
    extents.flatMap(({ x, width }) => [x, x + width]),
    [box.x, box.x + box.width],
    { at: box.y + box.height + (plan ? 0 : sheet.letterMm * 2.2), outward: 1, direction: 'level' },
    sheet,
  );
  const aside = plan
    ? runsBeside(
        extents.flatMap(({ y, height }) => [y, y + height]),
        [box.y, box.y + box.height],
        { at: box.x, outward: -1, direction: 'upright' },
        sheet,
      )
    : levelMarks(pieceLevels(pieces), sheet);
  return { lines: [...below.lines, ...aside.lines], words: [...below.words, ...aside.words] };
}

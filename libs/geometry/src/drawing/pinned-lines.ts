import { measureEnds } from '../measuring/measure-ends.ts';
import { measuringScene } from '../measuring/measuring-scene.ts';
import type { Part } from '../parts/part.ts';
import type { SetDocument } from '../room/document.ts';
import { formatLength } from '../units/format-length.ts';
import { wordsWidth, type DrawnBeside, type DrawnLine, type DrawnWords, type SheetOf } from './drawn.ts';
import type { PagePoint } from './drawing.ts';
import { onPage, pageFrame, sectionDepth } from './set-view.ts';

/** A line that is shorter than this on the page is seen end on. */
const END_ON_MM = 1;
/** Ends may lie so much nearer than a section, since a cut runs through faces. */
const ON_THE_CUT_MM = 1;

const line = (from: PagePoint, to: PagePoint): DrawnLine => ({ from, to, layer: 'dimension' });

interface Area {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

function areaOf({ at: [x, y], text, heightMm, anchor }: DrawnWords): Area {
  const width = wordsWidth(text, heightMm);
  const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2;
  return { left, right: left + width, top: y - heightMm * 0.6, bottom: y + heightMm * 0.6 };
}

const meet = (a: Area, b: Area): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

/** Where a number may stand: along its line first, then farther off it; the last is as far as it takes. */
function* placesBeside(
  from: PagePoint,
  to: PagePoint,
  letterMm: number,
  width: number,
): Generator<PagePoint> {
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
  const size = Math.hypot(dx, dy);
  const across: PagePoint = [-dy / size, dx / size];
  // Words read level: beside an upright line they need their width, over a level one their height.
  const clear = letterMm * 0.85 + (Math.abs(across[0]) * width) / 2;
  for (let lane = 0; ; lane += 1) {
    for (const share of [0.5, 0.35, 0.65, 0.2, 0.8]) {
      for (const side of [-1, 1]) {
        const off = side * (clear + lane * letterMm * 1.4);
        yield [from[0] + dx * share + across[0] * off, from[1] + dy * share + across[1] * off];
      }
    }
  }
}

/**
 * The pinned dimension lines of a set as a view shows them. Lines to a body are left out: paper goes to people who
 * may not see anybody's measures. So are those seen end on, and those with an end that the section took away.
 *
 * @param document - the set
 * @param parts - derived from it
 * @param sheet - what they are laid out by
 * @param taken - words that stand there already
 * @returns lines with ticks, and a number each that stands clear of all other words; a line that runs towards the eye
 * is longer than it looks, and its number says "true"
 */
export function pinnedLines(
  document: SetDocument,
  parts: readonly Part[],
  { view, style, letterMm }: SheetOf,
  taken: readonly DrawnWords[],
): DrawnBeside {
  const drawn: DrawnBeside = { lines: [], words: [] };
  const ofPieces = document.dimensions?.filter(({ ends }) => ends.every(({ on }) => on !== 'body')) ?? [];
  if (ofPieces.length === 0) return drawn;
  const scene = measuringScene(document, parts);
  const frame = pageFrame(view.direction);
  const areas = taken.map(areaOf);
  const tick = letterMm * 0.45;
  for (const { ends } of ofPieces) {
    const measured = measureEnds(ends, scene);
    if (!measured) continue;
    const [a, b] = [onPage(frame, measured.fromMm), onPage(frame, measured.toMm)];
    const limit = sectionDepth(view) + ON_THE_CUT_MM;
    const [from, to]: [PagePoint, PagePoint] = [
      [a[0], a[1]],
      [b[0], b[1]],
    ];
    const size = Math.hypot(to[0] - from[0], to[1] - from[1]);
    if (size < END_ON_MM || a[2] > limit || b[2] > limit) continue;
    const isTrue = Math.abs(size - Math.abs(measured.distanceMm)) < 0.1;
    const length = formatLength(measured.distanceMm, { ...style, feet: false });
    const text = isTrue ? length : `${length} true`;
    const width = wordsWidth(text, letterMm);
    const words = { text, heightMm: letterMm, anchor: 'middle', layer: 'dimension' } as const;
    for (const at of placesBeside(from, to, letterMm, width)) {
      const area = areaOf({ ...words, at });
      if (areas.some((other) => meet(area, other))) continue;
      areas.push(area);
      drawn.words.push({ ...words, at, valueMm: measured.distanceMm });
      break;
    }
    drawn.lines.push(
      line(from, to),
      ...[from, to].map(([x, y]) => line([x - tick, y + tick], [x + tick, y - tick])),
    );
  }
  return drawn;
}

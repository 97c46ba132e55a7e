import { MEASURE_INFO, type NextMeasureKey } from '@settlewright/anthropometry';
import { paragraph } from '../../../paper/paragraph';
import { PEN, type Point, type Sheet } from '../../../paper/sheet';
import { drawLayFigure, type Place } from './lay-figure';
import { MEASURED_LINES } from './measured-lines';

export interface MeasureBox {
  key: NextMeasureKey;
  /** Why it comes before the others; absent for the rest. */
  why?: string;
  /** What was taken before, in words. */
  before?: string;
}

export const BOX_HEIGHT_MM = 46;
const DRAWING = { width: 31, foot: 3.4, scale: 0.0265 } as const;
const TICK_MM = 1.1;

/** Widest and highest of the figure, to stand it in the middle of its space. */
const MIDDLE_MM = { side: 330, 'side-arm': 330, front: 0, 'front-arms': 0, standing: 40 } as const;

/** One measure: the figure with its line, how it is taken, and where to write. */
export function drawMeasureBox(
  sheet: Sheet,
  box: MeasureBox,
  at: { x: number; y: number; width: number },
): void {
  const { x, y, width } = at;
  sheet.rect(x, y, width, BOX_HEIGHT_MM, { pen: box.why ? PEN.frame : PEN.hair });
  drawFigure(sheet, box.key, x + DRAWING.width / 2, y + BOX_HEIGHT_MM - DRAWING.foot);
  const left = x + DRAWING.width + 1.5;
  const room = width - DRAWING.width - 4;
  const { name, plain, howToTake } = MEASURE_INFO[box.key];
  const text = paragraph(sheet, capital(plain), left, y + 5, room, { size: 10, weight: 600 });
  const named = name.toLowerCase() === plain ? '' : `${name}. `;
  const runs = [named + withoutPosture(howToTake), box.before ?? ''];
  const prose = [{ text: `${box.why ?? ''} `, weight: 600 as const }, { text: runs.join(' ') }];
  paragraph(sheet, prose, left, text, room);
  drawWriteIn(sheet, box.key, left, y + BOX_HEIGHT_MM, room);
}

/** How everybody sits is said once on the sheet. */
const withoutPosture = (howToTake: string): string =>
  capital(howToTake.replace(/^Sitting upright on a hard seat, [^:]*: /, ''));

const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

function drawWriteIn(sheet: Sheet, key: NextMeasureKey, x: number, foot: number, width: number): void {
  const half = width / 2;
  const units = key === 'weight_kg' ? ['kg', 'lb'] : ['mm', 'in'];
  units.forEach((unit, n) => {
    const left = x + n * half;
    sheet.line(left, foot - 8.6, left + half - 8, foot - 8.6, { pen: PEN.fine });
    sheet.text(unit, left + half - 7, foot - 8.8);
  });
  ['by', 'on'].forEach((word, n) => {
    const left = x + n * half;
    sheet.text(word, left, foot - 2.4);
    sheet.line(left + 4.4, foot - 2.2, left + half - 2, foot - 2.2, { pen: PEN.hair });
  });
}

function drawFigure(sheet: Sheet, key: NextMeasureKey, middle: number, floor: number): void {
  const line = key === 'weight_kg' ? undefined : MEASURED_LINES[key];
  const view = line?.view ?? 'standing';
  const scale = view === 'standing' ? DRAWING.scale * 0.8 : DRAWING.scale;
  const place: Place = ([x, y]) => [middle + (x - MIDDLE_MM[view]) * scale, floor - y * scale];
  if (!line) {
    const [sx, sy] = place([-200, -45]);
    sheet.rect(sx, sy - 1.2, 400 * scale, 1.2, { pen: PEN.fine, fill: 205 });
  }
  drawLayFigure(sheet, view, place, scale);
  if (!line) return;
  const ends: Point[] = [line.from, line.to];
  const along = line.from[0] === line.to[0] ? [TICK_MM, 0] : [0, TICK_MM];
  ends.forEach((end, n) => {
    const [ex, ey] = place(end);
    const body = line.ends[n];
    if (body) sheet.line(...place(body), ex, ey, { pen: PEN.hair });
    sheet.line(ex - along[0]!, ey - along[1]!, ex + along[0]!, ey + along[1]!, { pen: PEN.edge });
  });
  sheet.line(...place(line.from), ...place(line.to), { pen: 0.5 });
}

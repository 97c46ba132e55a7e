import { drawChain } from './dimension-chain';
import { PEN, type Point, type Sheet } from './sheet';

const CROWN_MM = 6;

/** The cushion from the front, with its crown. */
export function drawCushionFront(
  sheet: Sheet,
  cushion: { widthMm: number; thicknessMm: number; words: string; thicknessWords: string },
  place: { x: number; y: number; factor: number },
): void {
  const { x, y, factor } = place;
  const width = cushion.widthMm * factor;
  const height = cushion.thicknessMm * factor;
  const bulge = Math.min(0.6, height / 8);
  sheet.path(curve([x, y], [x + width / 2, y - 2 * CROWN_MM * factor], [x + width, y]), { pen: PEN.fine });
  sheet.path(
    [
      [x, y],
      [x + width, y],
      ...curve([x + width, y], [x + width + bulge, y + height / 2], [x + width, y + height]),
      [x, y + height],
      ...curve([x, y + height], [x - bulge, y + height / 2], [x, y]),
    ],
    { pen: PEN.edge, closed: true },
  );
  if (sheet.textWidth(cushion.words) < width - 4 && height > 4) {
    sheet.text(cushion.words, x + width / 2, y + height / 2 + 1.15, { align: 'center' });
  } else sheet.text(cushion.words, x, y + height + 4.2);
  drawChain(sheet, {
    stops: [y, y + height],
    labels: [cushion.thicknessWords],
    at: x - 6.5,
    direction: 'upright',
    outwards: -1,
  });
}

export interface CushionCut {
  depthMm: number;
  thicknessMm: number;
  /** Distances of button rows from the back seam. */
  rowsMm: readonly number[];
  foamWords: string;
  /** What the cushion lies on: "deck", "back board". */
  groundWords: string;
}

/** The cushion cut through, front at the right, with what it lies on. */
export function drawCushionCut(
  sheet: Sheet,
  cut: CushionCut,
  place: { x: number; y: number; factor: number },
): void {
  const { x, factor } = place;
  const depth = cut.depthMm * factor;
  const height = Math.max(cut.thicknessMm * factor, 3);
  const y = place.y + 2 * CROWN_MM * factor;
  const foot = y + height;
  sheet.path(
    [
      ...curve([x, y], [x + depth / 2, y - 2 * CROWN_MM * factor], [x + depth, y]),
      [x + depth, foot],
      [x, foot],
    ],
    { pen: PEN.edge, fill: 255, closed: true },
  );
  sheet.rect(x + 0.8, y + 0.6, depth - 1.6, height - 1.2, { pen: PEN.fine, fill: 240 });
  for (const row of cut.rowsMm) {
    const at = x + row * factor;
    sheet.line(at, y - 0.6, at, foot, { pen: PEN.fine, dash: [0.8, 0.5] });
    sheet.line(at - 1.4, y - 0.6, at + 1.4, y - 0.6, { pen: 0.6 });
  }
  for (const corner of [x, x + depth]) {
    sheet.circle(corner, y, 0.55, { fill: 0 });
    sheet.circle(corner, foot, 0.55, { fill: 0 });
  }
  sheet.rect(x - 2.5, foot, depth + 3.5, 2.2, { pen: PEN.cut / 2 });
  pointOut(sheet, cut.foamWords, [x + depth - 2, y + height * 0.4], x + depth + 5, y + height * 0.4);
  pointOut(
    sheet,
    cut.groundWords,
    [x + depth, foot + 1.4],
    x + depth + 5,
    Math.max(foot + 2.4, y + height * 0.4 + 4),
  );
}

function pointOut(sheet: Sheet, words: string, from: Point, x: number, y: number): void {
  sheet.path([from, [x - 1.6, y], [x - 0.5, y]], { pen: PEN.hair, grey: 60 });
  sheet.text(words, x, y + 1.15);
}

/** A quadratic curve as short lines: three points, the middle one pulling. */
function curve(from: Point, pull: Point, to: Point): Point[] {
  return Array.from({ length: 17 }, (_, i) => {
    const t = i / 16;
    const blend = (k: 0 | 1) => (1 - t) ** 2 * from[k] + 2 * t * (1 - t) * pull[k] + t ** 2 * to[k];
    return [blend(0), blend(1)] as const;
  });
}

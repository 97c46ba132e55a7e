import { scaleWords, type LengthStyle } from '@settlewright/geometry';
import {
  LAYER_PENS,
  LAYERS,
  TILE_OVERLAP_MM,
  tilesOf,
  type SetDrawing,
  type Tile,
} from '@settlewright/geometry/export';
import { jsPDF } from 'jspdf';

/** Landscape sheets, millimetres. */
export const PAPERS = { a4: [297, 210], letter: [279.4, 215.9] } as const;
export type PaperKey = keyof typeof PAPERS;

const MARGIN_MM = 9;
const FOOT_MM = 17;
const MM_PER_POINT = 25.4 / 72;
/** Three inches, as on the other papers: whoever holds the print can see whether the printer kept the scale. */
const CHECK_BAR_MM = 76.2;
const FACE_GREYS: Partial<Record<SetDrawing['faces'][number]['material'], number>> = {
  wall: 205,
  cloth: 236,
  walnut: 240,
};
const WHITE = 255;

/** What the sheets carry beside the drawing. */
export interface SheetWords {
  setName: string;
  /** "Draft of 2 December 2026". */
  version: string;
  style: LengthStyle;
}

export interface SheetFonts {
  regular: string;
  semibold: string;
}

/** What is free on a sheet for the drawing. */
export function freeSpace(paper: PaperKey): { widthMm: number; heightMm: number } {
  const [width, height] = PAPERS[paper];
  return { widthMm: width - 2 * MARGIN_MM - 4, heightMm: height - 2 * MARGIN_MM - FOOT_MM - 4 };
}

/** The sheets a drawing takes at its own scale. */
export function sheetsOf(drawing: SetDrawing, paper: PaperKey): Tile[] {
  return tilesOf(drawing.boundsMm, drawing.view.scale, freeSpace(paper));
}

/** Work Sans has no narrow space; letters of other scripts are left to the screen. */
export function printable(text: string): string {
  return text
    .replaceAll('\u202f', '\u00a0')
    .replace(/[^\u0020-\u024f\u2010-\u2033\u2044\u2070-\u208e\u2153-\u215e\u2190-\u2199\u2212]/gu, '·');
}

function addFonts(doc: jsPDF, fonts: SheetFonts): void {
  doc.addFileToVFS('regular.ttf', fonts.regular);
  doc.addFont('regular.ttf', 'Work Sans', 'normal');
  doc.addFileToVFS('semibold.ttf', fonts.semibold);
  doc.addFont('semibold.ttf', 'Work Sans', 'bold');
}

function write(
  doc: jsPDF,
  text: string,
  at: readonly [number, number],
  {
    sizeMm,
    bold = false,
    align = 'left',
    flag = false,
  }: { sizeMm: number; bold?: boolean; align?: 'left' | 'center' | 'right'; flag?: boolean },
): void {
  doc.setFont('Work Sans', bold ? 'bold' : 'normal');
  doc.setFontSize(sizeMm / MM_PER_POINT);
  const words = printable(text);
  if (flag) {
    const width = doc.getTextWidth(words);
    const left = align === 'left' ? at[0] : align === 'right' ? at[0] - width : at[0] - width / 2;
    doc.setFillColor(WHITE, WHITE, WHITE);
    doc.rect(left - 0.3, at[1] - sizeMm * 0.42, width + 0.6, sizeMm * 0.84, 'F');
  }
  doc.text(words, at[0], at[1] + sizeMm * 0.34, { align });
}

function drawTile(doc: jsPDF, drawing: SetDrawing, tile: Tile, paper: PaperKey): void {
  const { scale } = drawing.view;
  const { widthMm, heightMm } = freeSpace(paper);
  const [left, top] = [MARGIN_MM + 2, MARGIN_MM + 2];
  const place = ([x, y]: readonly [number, number]): [number, number] => [
    left + (x - tile.xMm) / scale,
    top + (y - tile.yMm) / scale,
  ];
  const path = (points: readonly (readonly [number, number])[]) => {
    points.map(place).forEach(([x, y], n) => (n === 0 ? doc.moveTo(x, y) : doc.lineTo(x, y)));
  };
  doc.saveGraphicsState();
  doc.rect(left, top, widthMm, heightMm, null).clip().discardPath();
  for (const { points, material } of drawing.faces) {
    const grey = FACE_GREYS[material] ?? WHITE;
    doc.setFillColor(grey, grey, grey);
    path(points);
    doc.close().fill();
  }
  doc.setDrawColor(0);
  doc.setLineCap('round');
  for (const layer of LAYERS) {
    const { widthMm: pen, dashMm } = LAYER_PENS[layer];
    doc.setLineWidth(pen);
    doc.setLineDashPattern(dashMm ? [...dashMm] : [], 0);
    for (const line of drawing.lines)
      if (line.layer === layer) doc.line(...place(line.from), ...place(line.to));
    for (const arc of drawing.arcs) {
      if (arc.layer !== layer) continue;
      const steps = Math.max(2, Math.ceil(((arc.toRad - arc.fromRad) / Math.PI) * 48));
      path(
        Array.from({ length: steps + 1 }, (_, n) => {
          const angle = arc.fromRad + ((arc.toRad - arc.fromRad) * n) / steps;
          return [
            arc.centre[0] + arc.radiusMm * Math.cos(angle),
            arc.centre[1] + arc.radiusMm * Math.sin(angle),
          ] as const;
        }),
      );
      doc.stroke();
    }
  }
  doc.setLineDashPattern([], 0);
  const align = { start: 'left', middle: 'center', end: 'right' } as const;
  for (const { at, text, heightMm: letters, anchor, layer } of drawing.words) {
    write(doc, text, place(at), {
      sizeMm: letters / scale,
      bold: layer === 'mark',
      align: align[anchor],
      flag: layer !== 'title',
    });
  }
  doc.restoreGraphicsState();
}

/** Ticks where the neighbouring sheets begin: cut one sheet there and lay it on the other. */
function drawJoins(doc: jsPDF, tile: Tile, tiles: readonly Tile[], paper: PaperKey): void {
  const { widthMm, heightMm } = freeSpace(paper);
  const [left, top] = [MARGIN_MM + 2, MARGIN_MM + 2];
  const beside = (columns: number, rows: number) =>
    tiles.some(({ column, row }) => column === tile.column + columns && row === tile.row + rows);
  doc.setLineWidth(0.18);
  for (const [side, x] of [
    [-1, left + TILE_OVERLAP_MM],
    [1, left + widthMm - TILE_OVERLAP_MM],
  ] as const) {
    if (!beside(side, 0)) continue;
    doc.line(x, top, x, top + 4);
    doc.line(x, top + heightMm - 4, x, top + heightMm);
  }
  for (const [side, y] of [
    [-1, top + TILE_OVERLAP_MM],
    [1, top + heightMm - TILE_OVERLAP_MM],
  ] as const) {
    if (!beside(0, side)) continue;
    doc.line(left, y, left + 4, y);
    doc.line(left + widthMm - 4, y, left + widthMm, y);
  }
}

function drawFrame(
  doc: jsPDF,
  drawing: SetDrawing,
  words: SheetWords,
  paper: PaperKey,
  sheet: [Tile, number, number],
) {
  const [width, height] = PAPERS[paper];
  const [tile, number, count] = sheet;
  const foot = height - MARGIN_MM - FOOT_MM;
  doc.setLineWidth(0.42);
  doc.rect(MARGIN_MM, MARGIN_MM, width - 2 * MARGIN_MM, height - 2 * MARGIN_MM);
  doc.line(MARGIN_MM, foot, width - MARGIN_MM, foot);
  const row = (n: number) => foot + 4.2 + n * 4.4;
  const [x, middle] = [MARGIN_MM + 3, MARGIN_MM + 92];
  write(doc, words.setName, [x, row(0)], { sizeMm: 3.6, bold: true });
  write(doc, drawing.title, [x, row(1)], { sizeMm: 3.2 });
  write(doc, words.version, [x, row(2)], { sizeMm: 3.2 });
  write(doc, `Scale ${scaleWords(words.style.system, drawing.view.scale)}. Sizes govern.`, [middle, row(0)], {
    sizeMm: 3.2,
  });
  const where =
    count === 1 ? '' : `, row ${tile.row + 1}, column ${tile.column + 1}; ticks mark where neighbours begin`;
  write(doc, `Sheet ${number} of ${count}${where}`, [middle, row(1)], { sizeMm: 3.2 });
  write(doc, 'Guidance for making, not certification.', [middle, row(2)], { sizeMm: 3.2 });
  const [end, bar] = [width - MARGIN_MM - 4, row(2) - 0.6];
  write(doc, 'this bar is 3″ (76.2 mm) long on paper', [end - CHECK_BAR_MM / 2, bar - 4], {
    sizeMm: 3.2,
    align: 'center',
  });
  doc.setLineWidth(0.36);
  doc.line(end - CHECK_BAR_MM, bar, end, bar);
  for (const n of [0, 1, 2, 3]) {
    doc.line(end - (n * CHECK_BAR_MM) / 3, bar - 1.5, end - (n * CHECK_BAR_MM) / 3, bar + 1.5);
  }
}

/** A drawing at its own scale on as many sheets as that takes; never fitted. */
export function pdfOf(
  drawing: SetDrawing,
  words: SheetWords,
  paper: PaperKey,
  fonts: SheetFonts,
): ArrayBuffer {
  const doc = new jsPDF({ unit: 'mm', format: [...PAPERS[paper]], orientation: 'landscape', compress: true });
  addFonts(doc, fonts);
  doc.setProperties({ title: printable(`${words.setName}, ${drawing.title}`), creator: 'Settlewright' });
  doc.viewerPreferences({ DisplayDocTitle: true, PrintScaling: 'None' });
  const tiles = sheetsOf(drawing, paper);
  tiles.forEach((tile, n) => {
    if (n > 0) doc.addPage([...PAPERS[paper]], 'landscape');
    drawTile(doc, drawing, tile, paper);
    drawJoins(doc, tile, tiles, paper);
    drawFrame(doc, drawing, words, paper, [tile, n + 1, tiles.length]);
  });
  return doc.output('arraybuffer');
}

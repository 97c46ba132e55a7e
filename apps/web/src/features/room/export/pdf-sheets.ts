import { scaleWords } from '@settlewright/geometry';
import {
  LAYER_PENS,
  LAYERS,
  TILE_OVERLAP_MM,
  tilesOf,
  type SetDrawing,
  type Tile,
} from '@settlewright/geometry/export';
import type { jsPDF } from 'jspdf';
import {
  drawFrame,
  freeSpace,
  GUIDANCE,
  MARGIN_MM,
  PAPERS,
  startSheets,
  write,
  type PaperKey,
  type SheetFonts,
  type SheetWords,
} from './sheet-frame.ts';

const FACE_GREYS: Partial<Record<SetDrawing['faces'][number]['material'], number>> = {
  wall: 205,
  cloth: 236,
  walnut: 240,
};
const WHITE = 255;

/** The sheets a drawing takes at its own scale. */
export function sheetsOf(drawing: SetDrawing, paper: PaperKey): Tile[] {
  return tilesOf(drawing.boundsMm, drawing.view.scale, freeSpace(paper));
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

/** A drawing at its own scale on as many sheets as that takes; never fitted. */
export function pdfOf(
  drawing: SetDrawing,
  words: SheetWords,
  paper: PaperKey,
  fonts: SheetFonts,
): ArrayBuffer {
  const doc = startSheets(`${words.setName}, ${drawing.title}`, paper, fonts);
  const tiles = sheetsOf(drawing, paper);
  tiles.forEach((tile, n) => {
    if (n > 0) doc.addPage([...PAPERS[paper]], 'landscape');
    drawTile(doc, drawing, tile, paper);
    drawJoins(doc, tile, tiles, paper);
    const where =
      tiles.length === 1
        ? ''
        : `, row ${tile.row + 1}, column ${tile.column + 1}; ticks mark where neighbours begin`;
    const left = [words.setName, drawing.title, words.version];
    const middle = [
      `Scale ${scaleWords(words.style.system, drawing.view.scale)}. Sizes govern.`,
      `Sheet ${n + 1} of ${tiles.length}${where}`,
      GUIDANCE,
    ];
    drawFrame(doc, paper, { left, middle }, true);
  });
  return doc.output('arraybuffer');
}

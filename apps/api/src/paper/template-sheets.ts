import {
  buttonSpots,
  HANDEDNESS_WORDS,
  marksWords,
  type OutlineCorner,
  type Point2,
} from '@settlewright/geometry';
import { TILE_OVERLAP_MM } from '@settlewright/geometry/export';
import { drawCornerTables } from './corner-table';
import { type OrderPages, PAD } from './order-pages';
import { paragraph } from './paragraph';
import { PEN, type Sheet } from './sheet';
import type { SpecCushion, SpecPack } from './spec-pack';
import {
  stretchesIn,
  type TemplateLines,
  templateLines,
  type TemplateTile,
  templateTiles,
} from './template-tiles';
import { TakenSpace } from './taken-space';
import { frameOf } from './title-block';

const CHECK_SQUARE_MM = 50.8;
const FOOT_MM = 8;

/** Free space of a sheet for a template: all within the frame but the words along its foot. */
export function tileSpace(sheet: { widthMm: number; heightMm: number }): {
  widthMm: number;
  heightMm: number;
} {
  const { left, top, right, bottom } = frameOf(sheet);
  return { widthMm: right - left, heightMm: bottom - FOOT_MM - top };
}

/** Full-size templates of every outline that is more than a rectangle: a key, then the sheets to join. */
export function drawTemplates(pages: OrderPages, pack: SpecPack): void {
  for (const cushion of pack.cushions) if (cushion.row.needsTemplate) drawTemplate(pages, pack, cushion);
}

function drawTemplate(pages: OrderPages, pack: SpecPack, cushion: SpecCushion): void {
  const { spec } = cushion.row;
  const lines = templateLines(spec.outline, cutLine(cushion), buttonSpots(spec));
  const marks = marksWords(cushion.marks);
  const topic = [
    `Template ${marks}`,
    `${cushion.kind}, ${HANDEDNESS_WORDS[cushion.hand]}, make ${cushion.marks.length}`,
  ];
  const page = pages.page(topic, `Template ${marks}, key`, 'print at 100 %, never “fit to page”');
  const space = tileSpace(page.sheet);
  const tiles = templateTiles(lines, space);
  const figure = drawKey(page.sheet, lines, tiles, space, {
    x: page.frame.left + PAD,
    y: page.y + 3,
    width: page.frame.right - page.frame.left - 2 * PAD - CHECK_SQUARE_MM - 16,
    height: 62,
  });
  drawCheckSquare(page.sheet, page.frame.right - PAD - CHECK_SQUARE_MM, page.y + 4);
  const used = tiles.filter((tile) => tile.used).length;
  const words =
    `${used} sheets, named by column and row as on this key. Neighbours show the same ${TILE_OVERLAP_MM} mm: lay the crosses over each other and tape. ` +
    `Solid line: FINISHED, seam to seam. Dashed line: where the plate is cut. ${spec.kind === 'seat' ? 'Back edge up, sitter’s left at the right.' : 'Top edge up, face to the reader.'} ` +
    (used < tiles.length ? 'Sheets that no line crosses are not printed.' : '');
  page.y =
    paragraph(
      page.sheet,
      words,
      page.frame.left + PAD,
      Math.max(figure, page.y + 62) + 6,
      page.frame.right - page.frame.left - 2 * PAD,
    ) - 1.5;
  drawCornerTables(pages, page, topic, spec.outline, pack.units);
  for (const tile of tiles)
    if (tile.used)
      drawTile(pages.add([...topic.slice(0, 1), `sheet ${tile.name}`]), {
        pack,
        cushion,
        lines,
        tile,
        tiles,
        space,
      });
}

/** The plate as it is cut; the seam line itself where there is none. */
function cutLine({ row }: SpecCushion): readonly OutlineCorner[] {
  const plate = row.spec.making?.panels.find(
    ({ name, finished }) => name === 'plate' && finished.length === row.spec.outline.length,
  );
  return plate?.cut ?? row.spec.outline;
}

function drawKey(
  sheet: Sheet,
  lines: TemplateLines,
  tiles: readonly TemplateTile[],
  space: { widthMm: number; heightMm: number },
  box: { x: number; y: number; width: number; height: number },
): number {
  const right = Math.max(...tiles.map(({ xMm }) => xMm + space.widthMm));
  const foot = Math.max(...tiles.map(({ yMm }) => yMm + space.heightMm));
  const [x0, y0] = [Math.min(...tiles.map(({ xMm }) => xMm)), Math.min(...tiles.map(({ yMm }) => yMm))];
  const factor = Math.min(box.width / (right - x0), box.height / (foot - y0));
  const at = ([x, y]: Point2): Point2 => [box.x + (x - x0) * factor, box.y + (y - y0) * factor];
  for (const tile of tiles) {
    const [x, y] = at([tile.xMm, tile.yMm]);
    sheet.rect(x, y, space.widthMm * factor, space.heightMm * factor, {
      pen: PEN.hair,
      dash: [1, 0.8],
      grey: 110,
    });
  }
  sheet.path(lines.cut.map(at), { pen: PEN.hair, dash: [1.3, 0.9], closed: true });
  sheet.path(lines.finished.map(at), { pen: PEN.edge, closed: true });
  for (const tile of tiles) {
    const [x, y] = at([tile.xMm + space.widthMm / 2, tile.yMm + space.heightMm / 2]);
    sheet.flag(tile.used ? tile.name : `(${tile.name})`, x, y + 1.2, {
      weight: tile.used ? 600 : 400,
      align: 'center',
    });
  }
  return box.y + (foot - y0) * factor;
}

/** A square whose sides are known: whoever holds the print sees whether the printer kept the scale, both ways. */
function drawCheckSquare(sheet: Sheet, x: number, y: number): void {
  sheet.rect(x, y, CHECK_SQUARE_MM, CHECK_SQUARE_MM, { pen: PEN.fine });
  for (let inch = 0.5; inch < 2; inch += 0.5) {
    const off = inch * 25.4;
    sheet.line(x + off, y, x + off, y + 1.6, { pen: PEN.hair });
    sheet.line(x, y + off, x + 1.6, y + off, { pen: PEN.hair });
  }
  sheet.text('2″ square', x + CHECK_SQUARE_MM / 2, y + 24, { align: 'center', weight: 600 });
  sheet.text('50.8 mm each way', x + CHECK_SQUARE_MM / 2, y + 28.4, { align: 'center' });
}

interface TileToDraw {
  pack: SpecPack;
  cushion: SpecCushion;
  lines: TemplateLines;
  tile: TemplateTile;
  tiles: readonly TemplateTile[];
  space: { widthMm: number; heightMm: number };
}

function drawTile(sheet: Sheet, { pack, cushion, lines, tile, tiles, space }: TileToDraw): void {
  const frame = frameOf(sheet);
  const box = { x: tile.xMm, y: tile.yMm, width: space.widthMm, height: space.heightMm };
  const at = ([x, y]: Point2): Point2 => [frame.left + x - tile.xMm, frame.top + y - tile.yMm];
  for (const [a, b] of stretchesIn(lines.cut, box))
    sheet.line(...at(a), ...at(b), { pen: PEN.fine, dash: [3, 2] });
  for (const [a, b] of stretchesIn(lines.finished, box)) sheet.line(...at(a), ...at(b), { pen: 0.5 });
  const taken = new TakenSpace();
  for (const spot of lines.buttons) {
    const [x, y] = at(spot);
    if (x < frame.left + 4 || x > frame.right - 4 || y < frame.top + 4 || y > frame.top + space.heightMm - 4)
      continue;
    sheet.circle(x, y, 4, { pen: PEN.fine });
    sheet.line(x - 6, y, x + 6, y, { pen: PEN.hair });
    sheet.line(x, y - 6, x, y + 6, { pen: PEN.hair });
    taken.take({ x: x - 6, y: y - 6, width: 12, height: 12 });
  }
  drawJoins(sheet, tile, tiles, { ...frame, bottom: frame.top + space.heightMm }, taken);
  drawTileSquare(sheet, lines, tile, { ...frame, bottom: frame.top + space.heightMm });
  const foot = frame.top + space.heightMm;
  sheet.line(frame.left, foot, frame.right, foot, { pen: PEN.fine });
  const words = `${marksWords(cushion.marks)}, revision ${pack.revision.letter}, ${HANDEDNESS_WORDS[cushion.hand]}. Solid: FINISHED, seam to seam. Dashed: cut line.`;
  sheet.text(tile.name, frame.left + PAD, foot + 6, { size: 15, weight: 600 });
  sheet.text(words, frame.left + PAD + 18, foot + 5.4);
  sheet.text('Check one square before cutting.', frame.right - PAD, foot + 5.4, { align: 'right' });
}

/** The square stands in the corner of the sheet that the fewest lines cross. */
function drawTileSquare(
  sheet: Sheet,
  lines: TemplateLines,
  tile: TemplateTile,
  frame: { left: number; top: number; right: number; bottom: number },
): void {
  const inset = TILE_OVERLAP_MM + 4;
  const size = CHECK_SQUARE_MM;
  const spots = [
    frame.left + inset,
    (frame.left + frame.right - size) / 2,
    frame.right - inset - size,
  ].flatMap((x) =>
    [frame.top + inset, (frame.top + frame.bottom - size) / 2, frame.bottom - inset - size].map((y) => ({
      x,
      y,
    })),
  );
  const crossed = ({ x, y }: { x: number; y: number }) => {
    const box = {
      x: x - frame.left + tile.xMm - 2,
      y: y - frame.top + tile.yMm - 2,
      width: size + 4,
      height: size + 4,
    };
    const near = lines.buttons.filter(
      ([bx, by]) =>
        bx > box.x - 6 && bx < box.x + box.width + 6 && by > box.y - 6 && by < box.y + box.height + 6,
    );
    return stretchesIn(lines.finished, box).length + stretchesIn(lines.cut, box).length + near.length;
  };
  const best = spots.reduce((a, b) => (crossed(b) < crossed(a) ? b : a));
  drawCheckSquare(sheet, best.x, best.y);
}

/** Where the name of a neighbour may stand when a button is marked in the middle of its edge. */
const BESIDE_MIDDLE = [0, 22, -22] as const;

/** Where neighbours begin, crosses that both show, and which sheet goes on. */
function drawJoins(
  sheet: Sheet,
  tile: TemplateTile,
  tiles: readonly TemplateTile[],
  frame: { left: number; top: number; right: number; bottom: number },
  taken: TakenSpace,
): void {
  const next = (column: number, row: number) =>
    tiles.find((one) => one.column === column && one.row === row && one.used);
  const style = { pen: PEN.hair, dash: [2, 1.2], grey: 110 };
  const half = TILE_OVERLAP_MM / 2;
  const [midX, midY] = [(frame.left + frame.right) / 2, (frame.top + frame.bottom) / 2];
  const cross = (x: number, y: number) => {
    sheet.line(x - 3.5, y, x + 3.5, y, { pen: PEN.fine });
    sheet.line(x, y - 3.5, x, y + 3.5, { pen: PEN.fine });
  };
  const upright = (x: number, inner: number, name: string | undefined) => {
    if (!name) return;
    sheet.line(inner, frame.top, inner, frame.bottom, style);
    for (const y of [frame.top + 30, frame.bottom - 30]) cross(x, y);
    const places = BESIDE_MIDDLE.map((off) => ({ x: x + 1.15, y: midY + off }));
    taken.write(sheet, `joins ${name}`, places, { angleDeg: 90, align: 'center', weight: 600 });
  };
  const level = (y: number, inner: number, name: string | undefined) => {
    if (!name) return;
    sheet.line(frame.left, inner, frame.right, inner, style);
    for (const x of [frame.left + 40, frame.right - 40]) cross(x, y);
    const places = BESIDE_MIDDLE.map((off) => ({ x: midX + off, y: y + 1.15 }));
    taken.write(sheet, `joins ${name}`, places, { align: 'center', weight: 600 });
  };
  upright(frame.left + half, frame.left + TILE_OVERLAP_MM, next(tile.column - 1, tile.row)?.name);
  upright(frame.right - half, frame.right - TILE_OVERLAP_MM, next(tile.column + 1, tile.row)?.name);
  level(frame.top + half, frame.top + TILE_OVERLAP_MM, next(tile.column, tile.row - 1)?.name);
  level(frame.bottom - half, frame.bottom - TILE_OVERLAP_MM, next(tile.column, tile.row + 1)?.name);
}

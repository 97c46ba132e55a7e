import {
  type DimensionShape,
  type Drawing,
  type DrawingScale,
  type DrawShape,
  type Fill,
  formatLength,
  type LengthStyle,
  type Pen,
  scaleFor,
} from '@settlewright/geometry';
import { PEN, type Point, type Sheet } from './sheet';

const PENS: Record<Pen, number> = {
  hair: PEN.hair,
  fine: PEN.fine,
  edge: PEN.edge,
  outline: 0.5,
  cut: 0.6,
};

/** Greys that survive a copy; timber stays white, so that lines carry the drawing. */
const GREYS: Partial<Record<Fill, number>> = {
  wall: 205,
  cloth: 236,
  ply: 248,
  oak: 255,
  walnut: 250,
  glass: 255,
  paper: 255,
};

/** Words stand at nine points whatever the scale. */
const WORD_SIZE = 9;
const WORD_HEIGHT_MM = 3.2;

interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

type Place = (point: Point) => Point;

/** Draws a drawing as large as the space and a shop's scales allow, in the middle of it. */
export function drawDrawing(sheet: Sheet, drawing: Drawing, units: LengthStyle, box: Box): DrawingScale {
  const { boundsMm: bounds } = drawing;
  const real = { widthMm: Math.max(1, bounds.width), heightMm: Math.max(1, bounds.height) };
  const scale = scaleFor(units.system, real, { widthMm: box.width, heightMm: box.height });
  const left = box.x + (box.width - bounds.width * scale.factor) / 2;
  const top = box.y + (box.height - bounds.height * scale.factor) / 2;
  const place: Place = ([x, y]) => [
    left + (x - bounds.x) * scale.factor,
    top + (y - bounds.y) * scale.factor,
  ];
  for (const shape of drawing.shapes) drawShape(sheet, shape, place, scale.factor, units);
  drawWords(sheet, drawing.shapes, place);
  return scale;
}

function drawShape(sheet: Sheet, shape: DrawShape, place: Place, factor: number, units: LengthStyle): void {
  switch (shape.kind) {
    case 'polyline':
      sheet.path(shape.points.map(place), { pen: PENS[shape.pen], dash: shape.dashed ? [1.3, 0.9] : [] });
      return;
    case 'polygon':
      sheet.path(shape.points.map(place), {
        pen: PENS[shape.pen],
        dash: shape.dashed ? [1.3, 0.9] : [],
        fill: GREYS[shape.fill],
        closed: true,
      });
      return;
    case 'circle': {
      const [x, y] = place(shape.centre);
      sheet.circle(x, y, shape.radiusMm * factor, { pen: PENS[shape.pen], fill: GREYS[shape.fill] });
      return;
    }
    case 'dimension':
      drawDimension(sheet, shape, place, factor, units);
      return;
    case 'text':
      return;
  }
}

function drawDimension(
  sheet: Sheet,
  shape: DimensionShape,
  place: Place,
  factor: number,
  units: LengthStyle,
): void {
  const [ax, ay] = place(shape.from);
  const [bx, by] = place(shape.to);
  const length = Math.hypot(bx - ax, by - ay) || 1;
  const [nx, ny] = [(by - ay) / length, -(bx - ax) / length];
  const off = shape.offsetMm * factor;
  const from: Point = [ax + nx * off, ay + ny * off];
  const to: Point = [bx + nx * off, by + ny * off];
  const pen = shape.quiet ? PEN.hair : PEN.fine;
  sheet.line(...from, ...to, { pen });
  for (const [x, y] of [from, to])
    sheet.line(x - nx * 1.3, y - ny * 1.3, x + nx * 1.3, y + ny * 1.3, { pen });
  const words = [formatLength(shape.valueMm, { ...units, feet: false }), shape.label]
    .filter(Boolean)
    .join(' ');
  const lift = shape.labelLane * 3.9;
  const [x, y] = [(from[0] + to[0]) / 2 + nx * lift, (from[1] + to[1]) / 2 + ny * lift];
  sheet.flag(words, x, y + 1.15, { weight: shape.quiet ? 400 : 600, align: 'center' });
}

/** Words last, each moved off its neighbours; one that was moved is tied to its place by a hairline. */
function drawWords(sheet: Sheet, shapes: readonly DrawShape[], place: Place): void {
  const taken: Box[] = [];
  for (const shape of shapes) {
    if (shape.kind !== 'text') continue;
    const [x, y] = place(shape.at);
    const width = sheet.textWidth(shape.text, { size: WORD_SIZE, weight: 600 }) + 1;
    const size = shape.upright ? { width: WORD_HEIGHT_MM, height: width } : { width, height: WORD_HEIGHT_MM };
    const left =
      shape.anchor === 'start' ? x : shape.anchor === 'middle' ? x - size.width / 2 : x - size.width;
    const home = { x: left, y: y - size.height / 2, ...size };
    const found = MOVES.map(([dx, dy]) => ({
      ...home,
      x: home.x + dx * (size.width + 1),
      y: home.y + dy * 3.8,
    })).find((candidate) => !taken.some((other) => overlap(candidate, other)));
    if (!found) continue;
    taken.push(found);
    const [cx, cy] = [found.x + found.width / 2, found.y + found.height / 2];
    if (found.x !== home.x || found.y !== home.y) {
      sheet.line(home.x + home.width / 2, home.y + home.height / 2, cx, cy, { pen: PEN.hair });
    }
    if (shape.upright) sheet.flag(shape.text, cx + 1.15, cy, { weight: 600, align: 'center', angleDeg: 90 });
    else sheet.flag(shape.text, cx, cy + 1.15, { weight: 600, align: 'center' });
  }
}

const MOVES: readonly Point[] = [
  [0, 0],
  [0, 1],
  [0, -1],
  [1, 0],
  [-1, 0],
  [0, 2],
  [0, -2],
  [1, 1],
  [-1, 1],
  [1, -1],
  [-1, -1],
  [0, 3],
  [0, -3],
  [2, 0],
  [-2, 0],
  [0, 4],
  [0, -4],
];

function overlap(a: Box, b: Box): boolean {
  return a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;
}

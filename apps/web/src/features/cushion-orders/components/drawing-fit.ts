import type { DimensionShape, Drawing, DrawShape } from '@settlewright/geometry';

/** Pixels on the page for points of the drawing. */
export interface At {
  x: (mm: number) => number;
  y: (mm: number) => number;
}

/** Size of words and numbers; they keep it whatever the scale. */
export const TEXT_PX = 13;
const LETTER_PX = 6.9;
const LINE_PX = 16;
const LANE_PX = 14;

export const textWidthPx = (text: string) => text.length * LETTER_PX;

type Point = readonly [number, number];

/** A dimension in pixels: both ends of its line, the direction across it and the middle of its number. */
export function dimensionLine(shape: DimensionShape, at: At) {
  const from = [at.x(shape.from[0]), at.y(shape.from[1])] as const;
  const to = [at.x(shape.to[0]), at.y(shape.to[1])] as const;
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]) || 1;
  const along = [(to[0] - from[0]) / length, (to[1] - from[1]) / length] as const;
  const aside: Point = [along[1], -along[0]];
  const scale = Math.abs(at.x(1) - at.x(0));
  const off = shape.offsetMm * scale;
  const point = (t: number, lift = 0): Point => [
    from[0] + along[0] * t + aside[0] * (off + lift),
    from[1] + along[1] * t + aside[1] * (off + lift),
  ];
  const atEnd = shape.labelAt === 'to';
  // A number at the end of a line stands over its tick, never on the line of a longer neighbour.
  const lanes = shape.labelLane + (atEnd ? 1 : 0);
  const middle = point(atEnd ? length : length / 2, lanes * LANE_PX * Math.sign(off || 1));
  return { a: point(0), b: point(length), aside, middle };
}

interface Box {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

function boxAround([x, y]: Point, width: number, height: number): Box {
  return { left: x - width / 2, right: x + width / 2, top: y - height / 2, bottom: y + height / 2 };
}

function boxesOf(shape: DrawShape, at: At, numberText: (shape: DimensionShape) => string): Box[] {
  switch (shape.kind) {
    case 'dimension': {
      const { a, b, middle } = dimensionLine(shape, at);
      return [
        boxAround(a, 2, 2),
        boxAround(b, 2, 2),
        boxAround(middle, textWidthPx(numberText(shape)), LINE_PX),
      ];
    }
    case 'text': {
      const [x, y] = [at.x(shape.at[0]), at.y(shape.at[1])];
      const width = textWidthPx(shape.text);
      if (shape.upright) return [boxAround([x, y], LINE_PX, width)];
      const middle = shape.anchor === 'middle' ? x : shape.anchor === 'start' ? x + width / 2 : x - width / 2;
      return [boxAround([middle, y], width, LINE_PX)];
    }
    case 'circle':
      return [boxAround([at.x(shape.centre[0]), at.y(shape.centre[1])], 6, 6)];
    default:
      return shape.points.map(([x, y]) => boxAround([at.x(x), at.y(y)], 4, 4));
  }
}

/** A drawing laid into a width: how points become pixels, and the box that holds its words as well. */
export function fitDrawing(
  drawing: Drawing,
  widthPx: number,
  numberText: (shape: DimensionShape) => string,
): { at: At; box: { x: number; y: number; width: number; height: number } } {
  let scale = (widthPx - 16) / drawing.boundsMm.width;
  for (let round = 0; ; round += 1) {
    const now = scale;
    const at: At = { x: (mm) => mm * now, y: (mm) => mm * now };
    const boxes = drawing.shapes.flatMap((shape) => boxesOf(shape, at, numberText));
    const left = Math.min(...boxes.map((box) => box.left)) - 2;
    const right = Math.max(...boxes.map((box) => box.right)) + 2;
    const top = Math.min(...boxes.map((box) => box.top)) - 2;
    const bottom = Math.max(...boxes.map((box) => box.bottom)) + 2;
    const width = right - left;
    // Words keep their size, so the rest has to give way; three rounds bring it within a pixel or two.
    if (round === 3 || Math.abs(width - widthPx) < 2) {
      return { at, box: { x: left, y: top, width, height: bottom - top } };
    }
    const words = width - drawing.boundsMm.width * scale;
    scale = Math.max(scale / 3, (widthPx - words) / drawing.boundsMm.width);
  }
}

type TextShape = DrawShape & { kind: 'text' };

const isText = (shape: DrawShape): shape is TextShape => shape.kind === 'text';

/** How far words are moved, in pixels. */
export interface Move {
  right: number;
  down: number;
}

/** Level words beside an upright one step aside; words one under the other move down until they do not touch. */
export function spreadWords(shapes: readonly DrawShape[], at: At): Map<DrawShape, Move> {
  const texts = shapes.filter(isText);
  const upright = texts
    .filter((text) => text.upright)
    .map((text) => boxAround([at.x(text.at[0]), at.y(text.at[1])], LINE_PX, textWidthPx(text.text)));
  const moves = new Map<DrawShape, Move>();
  const placed: { x: number; y: number }[] = [];
  const level = texts
    .filter((text) => !text.upright && text.anchor !== 'middle')
    .sort((a, b) => a.at[1] - b.at[1]);
  for (const text of level) {
    const start = text.anchor === 'start';
    const [x, y] = [at.x(text.at[0]), at.y(text.at[1])];
    const width = textWidthPx(text.text);
    const [left, right] = start ? [x, x + width] : [x - width, x];
    const inWay = upright.find(
      (box) =>
        box.left < right && box.right > left && box.top < y + LINE_PX / 2 && box.bottom > y - LINE_PX / 2,
    );
    const aside = inWay === undefined ? 0 : start ? inWay.right - left + 2 : inWay.left - right - 2;
    const last = placed.filter((other) => Math.abs(other.x - x) < LINE_PX).at(-1);
    const down = last === undefined ? 0 : Math.max(0, last.y + LINE_PX - y);
    placed.push({ x, y: y + down });
    moves.set(text, { right: aside, down });
  }
  return moves;
}

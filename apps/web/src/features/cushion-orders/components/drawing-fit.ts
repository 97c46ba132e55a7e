import type { DimensionShape, Drawing, DrawShape } from '@settlewright/geometry';

/** Pixels on the page for points of the drawing. */
export interface At {
  x: (mm: number) => number;
  y: (mm: number) => number;
}

/** Size of words and numbers; they keep it whatever the scale. */
export const TEXT_PX = 13;
const LETTER_PX = 8.1;
const NARROW_PX = 4.2;
const WIDE_PX = 12.2;
const NARROW = /[\s\u202fijlrtf.,’′″]/u;
const WIDE = /[mwMW×]/u;
/** Kept free between words and what they step aside from. */
const CLEAR_PX = 8;
const LINE_PX = 16;
const LANE_PX = 14;

/** Room for a text in the heavier weight; rather too much than a lost first stroke. */
export const textWidthPx = (text: string) =>
  [...text].reduce(
    (sum, letter) => sum + (NARROW.test(letter) ? NARROW_PX : WIDE.test(letter) ? WIDE_PX : LETTER_PX),
    0,
  );

export type TextShape = DrawShape & { kind: 'text' };

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

/** The words of a shape, or what is said where they find no room. */
export function shownText({ text, short }: TextShape, at: At): string {
  if (!short) return text;
  const scale = Math.abs(at.x(1) - at.x(0));
  const { alongMm = Infinity, acrossMm = Infinity } = short;
  return textWidthPx(text) > alongMm * scale || LINE_PX > acrossMm * scale ? short.text : text;
}

/** Where a word stands before it is moved. */
export function wordBox(shape: TextShape, at: At): Box {
  const [x, y] = [at.x(shape.at[0]), at.y(shape.at[1])];
  const width = textWidthPx(shownText(shape, at));
  if (shape.upright) return boxAround([x, y], LINE_PX, width);
  const middle = shape.anchor === 'middle' ? x : shape.anchor === 'start' ? x + width / 2 : x - width / 2;
  return boxAround([middle, y], width, LINE_PX);
}

const numberBox = (shape: DimensionShape, at: At, text: string): Box =>
  boxAround(dimensionLine(shape, at).middle, textWidthPx(text), LINE_PX);

function boxesOf(shape: DrawShape, at: At, numberText: (shape: DimensionShape) => string): Box[] {
  switch (shape.kind) {
    case 'dimension': {
      const { a, b } = dimensionLine(shape, at);
      return [boxAround(a, 2, 2), boxAround(b, 2, 2), numberBox(shape, at, numberText(shape))];
    }
    case 'text':
      return [wordBox(shape, at)];
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

const isText = (shape: DrawShape): shape is TextShape => shape.kind === 'text';

/** How far words are moved, in pixels. */
export interface Move {
  right: number;
  down: number;
}

const meet = (one: Box, other: Box, clear = 0) =>
  one.left < other.right + clear &&
  one.right > other.left - clear &&
  one.top < other.bottom + clear / 2 &&
  one.bottom > other.top - clear / 2;

/**
 * Upright words step aside from numbers, level words from upright ones; words one under the other move
 * down until they do not touch.
 */
export function spreadWords(
  shapes: readonly DrawShape[],
  at: At,
  numberText: (shape: DimensionShape) => string,
): Map<DrawShape, Move> {
  const texts = shapes.filter(isText);
  const numbers = shapes
    .filter((shape) => shape.kind === 'dimension')
    .map((shape) => numberBox(shape, at, numberText(shape)));
  const moves = new Map<DrawShape, Move>();
  const upright = texts
    .filter((text) => text.upright)
    .map((text) => {
      const box = wordBox(text, at);
      const inWay = numbers.find((number) => meet(box, number));
      if (inWay === undefined) return box;
      const toRight = box.left + box.right > inWay.left + inWay.right;
      const right = toRight ? inWay.right - box.left : inWay.left - box.right;
      moves.set(text, { right, down: 0 });
      return { ...box, left: box.left + right, right: box.right + right };
    });
  const placed: { x: number; y: number }[] = [];
  const level = texts
    .filter((text) => !text.upright && text.anchor !== 'middle')
    .sort((a, b) => a.at[1] - b.at[1]);
  for (const text of level) {
    const box = wordBox(text, at);
    const [x, y] = [at.x(text.at[0]), at.y(text.at[1])];
    const inWay = upright.find((other) => meet(box, other, CLEAR_PX));
    const aside =
      inWay === undefined
        ? 0
        : text.anchor === 'start'
          ? inWay.right + CLEAR_PX - box.left
          : inWay.left - CLEAR_PX - box.right;
    const last = placed.filter((other) => Math.abs(other.x - x) < LINE_PX).at(-1);
    const down = last === undefined ? 0 : Math.max(0, last.y + LINE_PX - y);
    placed.push({ x, y: y + down });
    moves.set(text, { right: aside, down });
  }
  return moves;
}

import type { MaterialKey } from '../parts/part.ts';
import { boxAround, type Box } from './page-box.ts';
import type { SitterColour } from './sitter-colours.ts';

/** A point on the page in millimetres of the real thing: x to the right, y **down**. */
export type PagePoint = readonly [number, number];

/** How strongly a line is drawn; the consumer gives each a width. */
export type Pen = 'hair' | 'fine' | 'edge' | 'outline' | 'cut';

/** What fills a closed shape: a material, the colour of a sitter, the paper itself or nothing. */
export type Fill = MaterialKey | `sitter-${SitterColour}` | 'paper' | 'none';

/** What a shape belongs to, for selection and for leaving things out. */
interface Owned {
  pieceId?: string;
  placeId?: string;
  /** Mark of the cushion a shape shows. */
  cushionMark?: string;
}

/** One line, area, word or measure of a drawing. */
export type DrawShape =
  | ({ kind: 'polyline'; points: readonly PagePoint[]; pen: Pen; dashed?: true } & Owned)
  | ({ kind: 'polygon'; points: readonly PagePoint[]; pen: Pen; fill: Fill; dashed?: true } & Owned)
  | ({ kind: 'circle'; centre: PagePoint; radiusMm: number; pen: Pen; fill: Fill } & Owned)
  | ({
      kind: 'text';
      at: PagePoint;
      text: string;
      anchor: 'start' | 'middle' | 'end';
      upright?: true;
      /** Said instead where the page has less room than this along the words, or across a line of them. */
      short?: { text: string; alongMm?: number; acrossMm?: number };
    } & Owned)
  | DimensionShape;

/** A measured line. The number is formatted by the consumer from `valueMm`. */
export interface DimensionShape extends Owned {
  kind: 'dimension';
  from: PagePoint;
  to: PagePoint;
  /** How far the line stands off, to the left of the direction from `from` to `to` as seen on the page. */
  offsetMm: number;
  valueMm: number;
  /** Words beside the number, such as "finished, seam to seam". */
  label?: string;
  /** A quieter line, for a second datum. */
  quiet?: true;
  /** 0 puts the number in the line; 1, 2 … lift it clear of its neighbours when the stretch is short. */
  labelLane: number;
  /** Where the number stands along the line; the middle unless said. */
  labelAt?: 'middle' | 'to';
}

/** A drawing as plain data; its shapes are painted in order. */
export interface Drawing {
  boundsMm: Box;
  shapes: DrawShape[];
}

function pointsOf(shape: DrawShape): readonly PagePoint[] {
  switch (shape.kind) {
    case 'polyline':
    case 'polygon':
      return shape.points;
    case 'circle': {
      const [x, y] = shape.centre;
      return [
        [x - shape.radiusMm, y - shape.radiusMm],
        [x + shape.radiusMm, y + shape.radiusMm],
      ];
    }
    case 'text':
      return [shape.at];
    case 'dimension': {
      const [dx, dy] = [shape.to[0] - shape.from[0], shape.to[1] - shape.from[1]];
      const length = Math.hypot(dx, dy) || 1;
      const [ox, oy] = [(dy / length) * shape.offsetMm, (-dx / length) * shape.offsetMm];
      return [
        shape.from,
        shape.to,
        [shape.from[0] + ox, shape.from[1] + oy],
        [shape.to[0] + ox, shape.to[1] + oy],
      ];
    }
  }
}

/**
 * A drawing with its bounds worked out.
 *
 * @param shapes - in painting order
 * @param marginMm - room left on every side
 * @returns the drawing; one without shapes has bounds of the margin alone
 */
export function drawingOf(shapes: DrawShape[], marginMm = 0): Drawing {
  const { x, y, width, height } = boxAround(shapes.flatMap((shape) => [...pointsOf(shape)]));
  return {
    boundsMm: {
      x: x - marginMm,
      y: y - marginMm,
      width: width + 2 * marginMm,
      height: height + 2 * marginMm,
    },
    shapes,
  };
}

import type { Construction } from '@settlewright/geometry';
import type { Point } from './sheet';

/** How one edge of a cushion is made, as a section shows it. */
export type EdgeKind = 'boxed' | 'tight-boxed' | 'knife-edge' | 'waterfall' | 'bullnose' | 'pulled';

/**
 * One edge cut through, in paper millimetres: the first number inwards from the edge, the second down from the top of
 * the foam.
 */
export interface EdgeProfile {
  /** The cloth, a line for each piece. */
  cloth: Point[][];
  /** The foam from its top, `reach` inwards, round the edge to its underside. */
  foam: Point[];
  /** Where pieces are sewn together; a welt sits there where there is one. */
  seams: { at: Point; inwards: Point }[];
  /** A point of the face near this edge, where a word may point. */
  top: Point;
  /** Middle of the strip between the seams, where a closure would be. */
  middle: Point;
  board?: { from: Point; to: Point };
  staples: Point[];
}

/** How the front and the back edge of each construction are made. */
export function edgeKinds(construction: Construction): { front: EdgeKind; back: EdgeKind } {
  switch (construction) {
    case 'waterfall':
    case 'bullnose':
      return { front: construction, back: 'boxed' };
    case 'plywood-backed':
      return { front: 'pulled', back: 'pulled' };
    case 'boxed':
    case 'tight-boxed':
    case 'knife-edge':
      return { front: construction, back: construction };
  }
}

/** Cloth stands off the foam by so much, so that both lines are seen. */
const OFF = 0.7;
const TAIL = 1.7;
const BOARD = 2.2;

/**
 * The profile of an edge.
 *
 * @param kind - of edge
 * @param size - paper millimetres: height of the foam, how far inwards the figure reaches, height of the strip between seams
 */
export function edgeProfile(
  kind: EdgeKind,
  { height: t, reach, strip }: { height: number; reach: number; strip: number },
): EdgeProfile {
  const top = (to: Point): Point[] => [[reach, -OFF], to];
  const foot = (to: Point): Point[] => [[reach, t + OFF], to];
  const seam = (x: number, y: number, inwards: Point) => ({ at: [x, y] as Point, inwards });
  switch (kind) {
    case 'boxed':
    case 'tight-boxed': {
      const bow = kind === 'boxed' ? 0 : Math.max(1.2, (t - strip) / 2);
      const [high, low] = [bow - OFF, t - bow + OFF];
      return {
        cloth: [
          [...top([3, -OFF]), [-OFF, high]],
          [
            [-OFF, high],
            [-OFF, low],
          ],
          [...foot([3, t + OFF]), [-OFF, low]],
        ],
        foam: [
          [reach, 0],
          [3, 0],
          [0, bow],
          [0, t - bow],
          [3, t],
          [reach, t],
        ],
        seams: [seam(-OFF, high, [TAIL, TAIL]), seam(-OFF, low, [TAIL, -TAIL])],
        top: [4.5, -OFF],
        middle: [-OFF, t / 2],
        staples: [],
      };
    }
    case 'knife-edge': {
      const half = (from: number, off: number) =>
        arc([t, t / 2], [t + off, t / 2 + off], from, Math.PI).map(([x, y]): Point => [x, y]);
      const [upper, lower] = [half(1.5 * Math.PI, OFF), half(0.5 * Math.PI, OFF)];
      return {
        cloth: [
          [[reach, -OFF], ...upper],
          [[reach, t + OFF], ...lower],
        ],
        foam: [[reach, 0], ...half(1.5 * Math.PI, 0), ...half(0.5 * Math.PI, 0).reverse(), [reach, t]],
        seams: [seam(-OFF, t / 2, [1.4 * TAIL, 0])],
        top: upper[3] ?? [t, -OFF],
        middle: [-OFF, t / 2],
        staples: [],
      };
    }
    case 'waterfall':
    case 'bullnose': {
      const r = kind === 'bullnose' ? t / 2 : Math.min(2, t / 4);
      const round = (off: number): Point[] => [
        ...arc([r, r], [r + off, r + off], 1.5 * Math.PI, Math.PI),
        ...arc([r, t - r], [r + off, r + off], Math.PI, 0.5 * Math.PI),
      ];
      return {
        cloth: [[[reach, -OFF], ...round(OFF), [reach, t + OFF]]],
        foam: [[reach, 0], ...round(0), [reach, t]],
        seams: [],
        top: [r, -OFF],
        middle: [-OFF, t / 2],
        staples: [],
      };
    }
    case 'pulled': {
      const r = Math.min(2, t / 4);
      const under = t + BOARD + OFF;
      return {
        cloth: [
          [
            [reach, -OFF],
            ...arc([r, r], [r + OFF, r + OFF], 1.5 * Math.PI, Math.PI),
            [-OFF, under],
            [8, under],
          ],
        ],
        foam: [[reach, 0], ...arc([r, r], [r, r], 1.5 * Math.PI, Math.PI), [0, t], [reach, t]],
        seams: [],
        top: [r, -OFF],
        middle: [-OFF, t / 2],
        board: { from: [0.8, t], to: [reach, t + BOARD] },
        staples: [3, 5.2, 7.4].map((x): Point => [x, under]),
      };
    }
  }
}

/** Points of an arc of an ellipse, from one angle to the other; angles rise from inwards to down. */
function arc([cx, cy]: Point, [rx, ry]: Point, from: number, to: number): Point[] {
  return Array.from({ length: 9 }, (_, n): Point => {
    const angle = from + ((to - from) * n) / 8;
    return [cx + rx * Math.cos(angle), cy + ry * Math.sin(angle)];
  });
}

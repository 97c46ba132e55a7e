import type { Part, Vec3 } from '../parts/part.ts';
import { deriveParts, pieceEnvelope } from '../pieces/kinds.ts';
import type { Piece, SetDocument } from '../room/document.ts';
import { drawingOf, type Drawing, type DrawShape, type Pen } from './drawing.ts';
import { seenLinesFrom, type LineKind } from './seen-lines.ts';
import { pagePoint, type PageFrame } from './set-view.ts';

/** How steeply a picture looks down, radians: seats and the fronts below them both show. */
const DOWN_RAD = Math.PI / 5;
/** Turns tried, the usual one first, radians; none looks along a wall of a square room. */
const TURNS_RAD = [0.55, -0.55, 0.55 + Math.PI, Math.PI - 0.55];

const PENS: Partial<Record<LineKind, Pen>> = { edge: 'fine', seam: 'hair' };

/**
 * The frame of a page that looks down on a room from one of its corners.
 *
 * @param turnRad - about the vertical, 0 from the front
 * @param downRad - below level
 * @returns unit vectors; lengths along an axis of the room keep their ratio
 */
export function slantedFrame(turnRad: number, downRad: number): PageFrame {
  const [st, ct, sd, cd] = [Math.sin(turnRad), Math.cos(turnRad), Math.sin(downRad), Math.cos(downRad)];
  return { right: [ct, 0, -st], down: [st * sd, -cd, ct * sd], toward: [st * cd, sd, ct * cd] };
}

/**
 * A picture of some pieces from above and one side, with hidden lines left out and every piece marked. It shows what a
 * thing is; nothing is measured from it.
 *
 * @param document - the set
 * @param pieceIds - of the pieces to show
 * @returns the picture, millimetres before the slant; empty where no piece is shown
 */
export function pictureFromAbove(document: SetDocument, pieceIds: ReadonlySet<string>): Drawing {
  const parts = deriveParts(document).filter(({ pieceId }) => pieceIds.has(pieceId));
  const pieces = document.pieces.filter(({ id }) => pieceIds.has(id));
  const frame = slantedFrame(bestTurn(pieces), DOWN_RAD);
  const { lines } = seenLinesFrom(parts, { frame, depth: Infinity, hidden: 'left-out', showsAbove: false });
  const shapes = lines.flatMap(({ from, to, what }): DrawShape[] => {
    const pen = PENS[what.kind];
    return pen ? [{ kind: 'polyline', points: [from, to], pen, pieceId: what.pieceId }] : [];
  });
  const marks = pieces.map((piece): DrawShape => {
    const own = parts.filter(({ pieceId }) => pieceId === piece.id);
    return { kind: 'text', at: pagePoint(frame, middleTop(own)), text: piece.mark, anchor: 'middle' };
  });
  return drawingOf([...shapes, ...marks], 40);
}

/** The turn that shows most of the fronts, the longest counting most. */
function bestTurn(pieces: SetDocument['pieces']): number {
  const shown = (turn: number) =>
    pieces
      .filter(({ at }) => Math.cos(turn - (at.turnDeg * Math.PI) / 180) > 0.2)
      .reduce((sum, piece) => sum + widthOf(piece), 0);
  return TURNS_RAD.reduce((best, turn) => (shown(turn) > shown(best) ? turn : best));
}

function widthOf(piece: Piece): number {
  const { minMm, maxMm } = pieceEnvelope(piece);
  return maxMm[0] - minMm[0];
}

function middleTop(parts: readonly Part[]): Vec3 {
  const ends = (axis: 0 | 1 | 2) => {
    const at = parts.map(({ positionMm }) => positionMm[axis]);
    return [Math.min(...at), Math.max(...at)] as const;
  };
  const middle = (axis: 0 | 1 | 2) => (ends(axis)[0] + ends(axis)[1]) / 2;
  return [middle(0), ends(1)[1], middle(2)];
}

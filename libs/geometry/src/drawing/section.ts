import type { Part } from '../parts/part.ts';
import { toRoom } from '../parts/placement.ts';
import { boardRun } from '../parts/boards.ts';
import { backCurve } from '../pieces/back-curve.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { deriveParts } from '../pieces/kinds.ts';
import { placeFrames } from '../pieces/place-frames.ts';
import type { Piece, PieceOf, SetDocument } from '../room/document.ts';
import { radians } from '../units/angle.ts';
import { drawingOf, type DimensionShape, type Drawing, type DrawShape, type PagePoint } from './drawing.ts';
import { cutOutlines, type CutPlane } from './cut-outlines.ts';
import { convexOutline, partEdges } from './solid-outline.ts';

/** How far before and behind the bench a section reaches. */
const AHEAD_MM = 1400;
const BEHIND_MM = 350;
const STAND_OFF_MM = 110;

/** Where the bench is cut: through the place nearest its middle, off the reveal between two boards. */
function cutX(bench: PieceOf<'bench'>, document: SetDocument): number {
  const turn = radians(bench.at.turnDeg);
  const own = placeFrames(bench, document).map(
    ({ hipMm }) => (hipMm[0] - bench.at.xMm) * Math.cos(turn) - (hipMm[2] - bench.at.zMm) * Math.sin(turn),
  );
  const x = own.sort((a, b) => Math.abs(a) - Math.abs(b))[0] ?? 0;
  const { innerLeftMm, innerRightMm } = benchLayout(bench);
  const middle = (innerLeftMm + innerRightMm) / 2;
  const onBoard = boardRun(innerRightMm - innerLeftMm, bench.boards).some(
    (board) => Math.abs(x - middle - board.centreMm) < board.widthMm / 2 - 1,
  );
  return onBoard ? x : x + bench.boards.faceMm / 2;
}

function planeThrough(piece: Piece, x: number): CutPlane {
  const turn = radians(piece.at.turnDeg);
  return { originMm: toRoom(piece.at, [x, 0, 0]), alongX: Math.sin(turn), alongZ: Math.cos(turn) };
}

/** Parts of the piece itself that stand behind the cut, as thin outlines. */
function beyond(part: Part, plane: CutPlane): PagePoint[] {
  const [ox, , oz] = plane.originMm;
  return convexOutline(
    partEdges(part).corners.map(([x, y, z]): PagePoint => [
      (x - ox) * plane.alongX + (z - oz) * plane.alongZ,
      -y,
    ]),
  );
}

const touches = (points: readonly PagePoint[], from: number, to: number): boolean =>
  points.some(([x]) => x > from && x < to);

function dimensionsOf(
  bench: PieceOf<'bench'>,
  document: SetDocument,
  cut: readonly { part: Part; outline: PagePoint[] }[],
): DimensionShape[] {
  const layout = benchLayout(bench);
  const measure = (from: PagePoint, to: PagePoint, offsetMm: number, label: string): DimensionShape => ({
    kind: 'dimension',
    from,
    to,
    offsetMm,
    valueMm: Math.hypot(to[0] - from[0], to[1] - from[1]),
    label,
    labelLane: 0,
    pieceId: bench.id,
  });
  const front = layout.frontZMm;
  const dimensions = [
    measure([front, 0], [front, -layout.seatTopFrontMm], -STAND_OFF_MM, 'seat, not pressed'),
    measure([layout.faceZMm, 0], [front, 0], -STAND_OFF_MM, 'depth'),
  ];
  if (layout.hasBack) {
    dimensions.push(
      measure([0, -layout.pressedTopMm], [0, -layout.backTopMm], STAND_OFF_MM, 'back over the pressed seat'),
    );
    dimensions.push(measure([0, 0], [0, -layout.pressedTopMm], STAND_OFF_MM, 'pressed seat'));
  }
  for (const kind of ['table', 'sill'] as const) {
    for (const piece of document.pieces) {
      if (piece.kind !== kind) continue;
      const outlines = cut.filter(({ part }) => part.pieceId === piece.id).map(({ outline }) => outline);
      const xs = outlines.flat().map(([x]) => x);
      if (xs.length === 0) continue;
      const at = Math.max(...xs);
      dimensions.push(measure([at, 0], [at, -piece.heightMm], -STAND_OFF_MM, `${kind} ${piece.mark}`));
    }
  }
  return dimensions;
}

/**
 * A cut through a bench or loose seat, looking along it; the sitter faces right.
 *
 * Whatever else the plane meets near the bench (table, sill, wall, the bench opposite) is cut too.
 *
 * @param document - the set
 * @param pieceId - the bench or loose seat to cut
 * @param marginMm - room left around
 * @returns page x runs forward from the rear of the piece, page y is minus the height above the floor;
 * an empty drawing when there is no such piece
 */
export function sectionOf(document: SetDocument, pieceId: string, marginMm = 0): Drawing {
  const piece = document.pieces.find(({ id }) => id === pieceId);
  if (piece === undefined) return drawingOf([], marginMm);
  const plane = planeThrough(piece, piece.kind === 'bench' ? cutX(piece, document) : 0);
  const parts = deriveParts(document);
  const front = piece.kind === 'bench' ? benchLayout(piece).frontZMm : 400;
  const cut = parts.flatMap((part) =>
    cutOutlines(part, plane)
      .filter((outline) => touches(outline, -BEHIND_MM, front + AHEAD_MM))
      .map((outline) => ({ part, outline })),
  );
  const cutIds = new Set(cut.map(({ part }) => part.id));
  const seen = parts.filter((part) => part.pieceId === pieceId && !cutIds.has(part.id));
  const shapes: DrawShape[] = [
    ...seen.map((part): DrawShape => ({
      kind: 'polygon',
      points: beyond(part, plane),
      pen: 'hair',
      fill: 'none',
      pieceId,
    })),
    ...cut.map(({ part, outline }): DrawShape => ({
      kind: 'polygon',
      points: outline,
      pen: 'cut',
      fill: part.material,
      pieceId: part.pieceId,
    })),
  ];
  const bounds = drawingOf(shapes, 0).boundsMm;
  shapes.push({
    kind: 'polyline',
    points: [
      [bounds.x - 80, 0],
      [bounds.x + bounds.width + 80, 0],
    ],
    pen: 'outline',
  });
  if (piece.kind === 'bench') {
    const curve = backCurve(piece).map(([forward, height]): PagePoint => [forward, -height]);
    if (curve.length > 0) shapes.push({ kind: 'polyline', points: curve, pen: 'edge', pieceId });
    shapes.push(...dimensionsOf(piece, document, cut));
  }
  return drawingOf(shapes, marginMm);
}

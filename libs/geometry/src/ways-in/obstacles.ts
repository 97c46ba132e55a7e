import type { PartRole } from '../parts/part.ts';
import type { Piece } from '../room/document.ts';
import { extent, inFrame, type PlanOutline, type PlanSolid } from '../situation/plan.ts';
import { planOfPiece, rectangleOf, type Survey } from '../situation/survey.ts';
import { convexOf, type Convex } from './convex.ts';

/** Something that stands in the way, as an upright prism. */
export interface Obstacle {
  pieceId: string;
  mark: string;
  /** Seat of a bench, back, top of a table or one part by itself. */
  group: string;
  /** Who sits there, where it is a body. */
  placeId?: string;
  bottomMm: number;
  topMm: number;
  outline: PlanOutline;
  shape: Convex;
}

/** Parts of a piece that together fill their rectangle. */
const GROUPS: Partial<Record<PartRole, string>> = {
  deck: 'seat',
  riser: 'seat',
  kick: 'seat',
  bearer: 'seat',
  lip: 'seat',
  seat: 'seat',
  'seat-cushion': 'seat',
  'back-board': 'back',
  'back-frame': 'back',
  'back-cushion': 'back',
  top: 'top',
  'edge-lip': 'top',
  apron: 'top',
  'wall-board': 'wall',
  'wall-panel': 'wall',
  frame: 'window',
  glass: 'window',
};

/**
 * Everything of a set that people walk round, a few prisms for each piece.
 *
 * @param found - the survey
 * @param belowMm - what begins higher is in nobody's way
 * @returns obstacles in the order of the pieces
 */
export function obstaclesOf(found: Survey, belowMm: number): Obstacle[] {
  return found.pieces.flatMap(({ piece, solids }) => {
    const groups = new Map<string, PlanSolid[]>();
    solids.forEach((solid, i) => {
      const group = groupOf(piece, solid.role) ?? `${solid.role} ${i}`;
      groups.set(group, [...(groups.get(group) ?? []), solid]);
    });
    return [...groups]
      .map(([group, parts]) => obstacle(piece, group, parts))
      .filter(({ bottomMm }) => bottomMm < belowMm);
  });
}

/** A chair is one thing down to the floor; legs of a table stand apart. */
const groupOf = (piece: Piece, role: PartRole): string | undefined =>
  piece.kind === 'loose-seat' && role === 'leg' ? 'seat' : GROUPS[role];

function obstacle(piece: Piece, group: string, parts: readonly PlanSolid[]): Obstacle {
  const [first] = parts;
  const outline = parts.length === 1 && first ? first.outline : rectangleAround(piece, parts);
  return {
    pieceId: piece.id,
    mark: piece.mark,
    group,
    bottomMm: Math.min(...parts.map(({ bottomMm }) => bottomMm)),
    topMm: Math.max(...parts.map(({ topMm }) => topMm)),
    outline,
    shape: convexOf(outline),
  };
}

function rectangleAround(piece: Piece, parts: readonly PlanSolid[]): PlanOutline {
  const points = inFrame(
    parts.flatMap(({ outline }) => [...outline]),
    planOfPiece(piece),
  );
  return rectangleOf(piece, extent(points, 0), extent(points, 1));
}

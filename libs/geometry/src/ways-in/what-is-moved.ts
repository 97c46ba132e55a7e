import { leavesOfTable, withLeaf } from '../pieces/table-leaves.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { survey, type SurveyedPlace } from '../situation/survey.ts';
import { obstaclesOf, type Obstacle } from './obstacles.ts';
import { OPEN_MM } from './room-around.ts';
import type { WalkedIn } from './walk-in.ts';
import type { BodyHeights } from './walker.ts';
import type { WayIn } from './way-in.ts';

/** What may be moved for somebody who is stuck otherwise. */
export interface MayMove {
  chairs: boolean;
  leaves: boolean;
}

/** The way of somebody, and what is moved for it. */
export interface Freed extends Pick<WayIn, 'chairs' | 'leaves'> {
  walked: WalkedIn | undefined;
}

type LeafMove = WayIn['leaves'][number];

/** Leaves tried one by one are those of the tables nearest by. */
const MOST_LEAVES = 4;

/**
 * Chairs and leaves stay as they are as long as one gets through; otherwise the least is moved that lets somebody in:
 * chairs are taken out, one leaf is lifted or dropped, all leaves are dropped, or chairs and leaves together.
 *
 * @param document - the set
 * @param place - where the way leads
 * @param around - what stands in the way
 * @param mayMove - what may be moved
 * @param heights - what is stepped over and what is leaned under
 * @param walk - looks for a way among obstacles
 * @returns the way, and what is moved for it
 */
export function freed(
  document: SetDocument,
  place: SurveyedPlace,
  around: readonly Obstacle[],
  mayMove: MayMove,
  heights: BodyHeights,
  walk: (obstacles: readonly Obstacle[]) => WalkedIn | undefined,
): Freed {
  const walked = walk(around);
  const asItStands: Freed = { walked, chairs: [], leaves: [] };
  if (passes(walked)) return asItStands;
  const out = mayMove.chairs ? withoutChairs(document, place, around, walked, walk) : undefined;
  if (out && passes(out.walked)) return out;
  const moves = mayMove.leaves ? leafMoves(document, place) : [];
  const allDown = moves.filter(({ down }) => down);
  const tried = [...moves.map((move) => [move]), ...(allDown.length > 1 ? [allDown] : [])];
  for (const leaves of tried) {
    const one = walk(withLeaves(document, around, leaves, heights));
    if (passes(one)) return { walked: one, chairs: [], leaves };
  }
  for (const leaves of mayMove.chairs ? tried : []) {
    const moved = withLeaves(document, around, leaves, heights);
    const both = withoutChairs(document, place, moved, walked, walk);
    if (both && passes(both.walked)) return { ...both, leaves };
  }
  return out ?? asItStands;
}

const passes = (walked: WalkedIn | undefined): boolean => (walked?.clearMm ?? -OPEN_MM) >= 0;

/** The way with all chairs out; of those only the ones that stood in it count. */
function withoutChairs(
  document: SetDocument,
  place: SurveyedPlace,
  around: readonly Obstacle[],
  walked: WalkedIn | undefined,
  walk: (obstacles: readonly Obstacle[]) => WalkedIn | undefined,
): Freed | undefined {
  const loose = new Set(document.pieces.flatMap(({ kind, id }) => (kind === 'loose-seat' ? [id] : [])));
  const fixed = around.filter(({ pieceId }) => !loose.has(pieceId));
  if (fixed.length === around.length) return undefined;
  const found = walk(fixed);
  if (!found || found.clearMm <= (walked?.clearMm ?? -Infinity)) return undefined;
  const inWay = around.filter((one) => loose.has(one.pieceId) && found.touches([one]));
  const chairs = new Map(inWay.map(({ pieceId, mark }) => [pieceId, { pieceId, mark }]));
  chairs.delete(place.piece.id);
  return { walked: found, chairs: [...chairs.values()], leaves: [] };
}

/** Each leaf near a place, the other way than it is; those to drop first. */
function leafMoves(document: SetDocument, { plan }: SurveyedPlace): LeafMove[] {
  const away = ({ at }: PieceOf<'table'>) => Math.hypot(at.xMm - plan.xMm, at.zMm - plan.zMm);
  return document.pieces
    .filter((piece): piece is PieceOf<'table'> => piece.kind === 'table' && !piece.locked)
    .sort((a, b) => away(a) - away(b))
    .flatMap((table) =>
      leavesOfTable(table).map(({ edge, down }): LeafMove => {
        return { pieceId: table.id, mark: table.mark, edge, down: !down };
      }),
    )
    .slice(0, MOST_LEAVES)
    .sort((a, b) => Number(b.down) - Number(a.down));
}

function withLeaves(
  document: SetDocument,
  around: readonly Obstacle[],
  leaves: readonly LeafMove[],
  heights: BodyHeights,
): Obstacle[] {
  const ids = new Set(leaves.map(({ pieceId }) => pieceId));
  const tables = document.pieces
    .filter((piece): piece is PieceOf<'table'> => piece.kind === 'table' && ids.has(piece.id))
    .map((table) =>
      leaves
        .filter(({ pieceId }) => pieceId === table.id)
        .reduce((one, { edge, down }) => withLeaf(one, edge, down), table),
    );
  const moved = obstaclesOf(survey({ ...document, pieces: tables, seating: [] }), heights[1]);
  return [
    ...around.filter(({ pieceId }) => !ids.has(pieceId)),
    ...moved.filter(({ topMm }) => topMm > heights[0]),
  ];
}

import type { PlaceTableSituation } from '@settlewright/anthropometry';
import { tableTop } from '../pieces/table-leaves.ts';
import type { PieceKind, PieceOf } from '../room/document.ts';
import { area, clipped, extent, inFrame, type PlanSolid } from './plan.ts';
import { rectangleOf, solidsNear, type Survey, type SurveyedPlace } from './survey.ts';

/** Width of the strip over the lap that belongs to one sitter, millimetres. */
const LAP_STRIP_MM = 520;
/** The strip ends this far before the seat front, a little beyond the longest knees. */
const LAP_AHEAD_MM = 300;
/** Obstructions further than this from the table edge are in nobody's way. */
const LEG_REACH_MM = 1500;
const FOOT_LEVEL_MM = 100;
const KNEE_BELOW_SEAT_MM = 50;
const SMALLEST_COVER_MM2 = 100;

/** Kinds that can stand in the way of legs; chairs move, and a sill lies beside the knees. */
const STANDING: readonly PieceKind[] = ['bench', 'table', 'bulkhead'];

const STRIP: readonly [number, number] = [-LAP_STRIP_MM / 2, LAP_STRIP_MM / 2];

/**
 * The table over a sitter's lap: the one that covers most of the strip.
 *
 * @param found - the survey
 * @param place - the place
 * @returns heights above the floor and depths from the table's edge, millimetres; undefined without a table
 */
export function lapTable(found: Survey, place: SurveyedPlace): PlaceTableSituation | undefined {
  const lap = { left: STRIP, ahead: [-place.effectiveDepthMm, LAP_AHEAD_MM] as const };
  let best: { table: PieceOf<'table'>; cover: number } | undefined;
  for (const { piece, circle } of found.pieces) {
    if (piece.kind !== 'table' || piece.heightMm <= place.frame.hipMm[1]) continue;
    const away = Math.hypot(circle[0] - place.plan.xMm, circle[1] - place.plan.zMm);
    if (away > circle[2] + place.effectiveDepthMm + LAP_STRIP_MM + LAP_AHEAD_MM) continue;
    const cover = area(clipped(inFrame(topOf(piece), place.plan), lap));
    if (cover > SMALLEST_COVER_MM2 && cover > (best?.cover ?? 0)) best = { table: piece, cover };
  }
  return best === undefined ? undefined : measured(found, place, best.table);
}

/** Outline of the top in the room, raised leaves with it. */
export function topOf(table: PieceOf<'table'>) {
  const { x0, x1, z0, z1 } = tableTop(table);
  return rectangleOf(table, [x0, x1], [z0, z1]);
}

function measured(found: Survey, place: SurveyedPlace, table: PieceOf<'table'>): PlaceTableSituation {
  const inStrip = clipped(inFrame(topOf(table), place.plan), { left: STRIP });
  const [edge] = extent(inStrip, 1);
  const lap = { left: STRIP, ahead: [-place.effectiveDepthMm, LAP_AHEAD_MM] as const };
  const near = solidsNear(
    found,
    place.plan,
    LEG_REACH_MM + place.effectiveDepthMm,
    (piece) => piece.id !== place.piece.id && STANDING.includes(piece.kind),
    (solid) => solid.bottomMm < table.heightMm,
  );
  const hanging = near.filter(
    (solid) => solid.pieceId === table.id && ['top', 'leaf', 'edge-lip', 'apron'].includes(solid.role),
  );
  const over = hanging.filter((solid) => area(clipped(solid.outline, lap)) > 0);
  const undersideMm = Math.min(table.heightMm - table.topThicknessMm, ...over.map((solid) => solid.bottomMm));
  const standing = near.filter((solid) => !hanging.includes(solid));
  const knee = [place.frame.frontMm[1] - KNEE_BELOW_SEAT_MM, undersideMm] as const;
  const kneeDepthMm = depthTo(standing, edge, knee);
  const footDepthMm = depthTo(standing, edge, [0, FOOT_LEVEL_MM]);
  return {
    pieceId: table.id,
    mark: table.mark,
    topMm: table.heightMm,
    undersideMm,
    overlapMm: -edge,
    ...(kneeDepthMm === undefined ? {} : { kneeDepthMm }),
    ...(footDepthMm === undefined ? {} : { footDepthMm }),
    topThicknessMm: table.topThicknessMm,
  };
}

/** From the table's edge to the nearest thing in the strip between two heights. */
function depthTo(
  solids: PlanSolid[],
  edge: number,
  [low, high]: readonly [number, number],
): number | undefined {
  let nearest = Infinity;
  for (const { bottomMm, topMm, outline } of solids) {
    if (bottomMm >= high - 1e-6 || topMm <= low + 1e-6) continue;
    const inTheWay = clipped(outline, { left: STRIP, ahead: [edge, edge + LEG_REACH_MM] });
    if (inTheWay.length === 0) continue;
    nearest = Math.min(nearest, extent(inTheWay, 1)[0] - edge);
  }
  return nearest === Infinity ? undefined : nearest;
}

import type { OverheadSituation, SillSituation } from '@settlewright/anthropometry';
import { clipped, extent, type PlanOutline } from './plan.ts';
import { solidsNear, type Survey, type SurveyedPlace } from './survey.ts';

/** Sills wholly further from the seat front than this belong to nobody here, millimetres. */
const SILL_REACH_LIMIT_MM = 3000;
/** Before the back, the stretch in which an elbow looks for a sill, millimetres. */
const ELBOW_STRETCH_MM = 330;
/** A sill this far behind the face of the back is still behind the sitter. */
const BEHIND_MM = 500;
const SHOULDER_HALF_MM = 260;
/** Walls further from the centreline than this are in nobody's way. */
const WALL_REACH_MM = 1000;
/** Height band above the seat in which elbows and shoulders meet a wall. */
const ELBOW_BAND_MM = [150, 600] as const;
const HEAD_HALF_MM = 150;
/** Before the seat front, the floor on which one stands up. */
const STAND_UP_MM = 300;

const WALL_ROLES = ['wall-board', 'wall-panel', 'end-wall', 'frame', 'glass'];

/**
 * Sills beside or behind a place.
 *
 * @param found - the survey
 * @param place - the place
 * @param reachMm - farthest near edge that still counts, from the seat's centreline
 * @returns sills, nearest first
 */
export function sillsBeside(found: Survey, place: SurveyedPlace, reachMm: number): SillSituation[] {
  const back = -place.effectiveDepthMm;
  const sills: SillSituation[] = [];
  for (const { piece } of found.pieces) {
    if (piece.kind !== 'sill') continue;
    const boards = solidsNear(
      found,
      place.plan,
      SILL_REACH_LIMIT_MM,
      (one) => one.id === piece.id,
      (solid) => solid.role === 'sill-board',
    );
    const named = {
      pieceId: piece.id,
      mark: piece.mark,
      topMm: piece.heightMm,
      usableDepthMm: piece.depthMm,
    };
    for (const { outline } of boards) {
      const near = sideOf(clipped(outline, { ahead: [back, back + ELBOW_STRETCH_MM] }));
      if (near !== undefined && near.distanceMm <= reachMm) {
        sills.push({ ...named, side: near.side, centreToEdgeMm: near.distanceMm });
        continue;
      }
      const behind = clipped(outline, {
        left: [-SHOULDER_HALF_MM, SHOULDER_HALF_MM],
        ahead: [back - BEHIND_MM, back],
      });
      if (behind.length > 0) sills.push({ ...named, side: 'behind', centreToEdgeMm: 0 });
    }
  }
  return sills.sort((a, b) => a.centreToEdgeMm - b.centreToEdgeMm);
}

/**
 * Walls and end walls on either hand of a place, at elbow and shoulder height.
 *
 * @param found - the survey
 * @param place - the place
 * @returns millimetres from the seat's centreline, per hand; left out where none is near
 */
export function wallsBeside(found: Survey, place: SurveyedPlace): { left?: number; right?: number } {
  const seat = place.frame.hipMm[1];
  const walls: { left?: number; right?: number } = {};
  const near = solidsNear(
    found,
    place.plan,
    WALL_REACH_MM + place.effectiveDepthMm,
    (piece) => piece.kind === 'bulkhead' || piece.kind === 'bench' || piece.kind === 'sill',
    ({ role, bottomMm, topMm }) =>
      WALL_ROLES.includes(role) && topMm > seat + ELBOW_BAND_MM[0] && bottomMm < seat + ELBOW_BAND_MM[1],
  );
  for (const { outline } of near) {
    const beside = sideOf(clipped(outline, { ahead: [-place.effectiveDepthMm, 0] }));
    if (beside === undefined || beside.distanceMm > WALL_REACH_MM) continue;
    walls[beside.side] = Math.min(walls[beside.side] ?? Infinity, beside.distanceMm);
  }
  return walls;
}

/**
 * The lowest beam over a sitter's head.
 *
 * @param found - the survey
 * @param place - the place
 * @returns its underside above the floor; undefined under an open ceiling
 */
export function overheadOf(found: Survey, place: SurveyedPlace): OverheadSituation | undefined {
  const hip = -place.hipBehindFrontMm;
  return lowestOver(found, place, [hip - HEAD_HALF_MM, hip + HEAD_HALF_MM]);
}

/**
 * The lowest beam over the floor just before the seat, where one stands up.
 *
 * @param found - the survey
 * @param place - the place
 * @returns its underside above the floor; undefined under an open ceiling
 * @source 300 mm ahead of the seat, as in rule HEAD-03
 */
export function overheadAheadOf(found: Survey, place: SurveyedPlace): OverheadSituation | undefined {
  return lowestOver(found, place, [0, STAND_UP_MM]);
}

function lowestOver(
  found: Survey,
  place: SurveyedPlace,
  ahead: readonly [number, number],
): OverheadSituation | undefined {
  let lowest: OverheadSituation | undefined;
  for (const solid of solidsNear(found, place.plan, 1500, (piece) => piece.kind === 'overhead')) {
    const above = clipped(solid.outline, { left: [-HEAD_HALF_MM, HEAD_HALF_MM], ahead });
    if (above.length === 0 || solid.bottomMm >= (lowest?.undersideMm ?? Infinity)) continue;
    const mark = found.pieces.find(({ piece }) => piece.id === solid.pieceId)?.piece.mark ?? '';
    lowest = { pieceId: solid.pieceId, mark, undersideMm: solid.bottomMm };
  }
  return lowest;
}

/** Which hand an outline lies on and how near; undefined when there is none or it crosses the centreline. */
function sideOf(outline: PlanOutline): { side: 'left' | 'right'; distanceMm: number } | undefined {
  if (outline.length === 0) return undefined;
  const [low, high] = extent(outline, 0);
  if (low > 0) return { side: 'left', distanceMm: low };
  if (high < 0) return { side: 'right', distanceMm: -high };
  return undefined;
}

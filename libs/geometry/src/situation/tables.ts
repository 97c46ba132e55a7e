import { MM_PER_INCH } from '../units/length-style.ts';
import type { PlaceSituation, TableSituation } from '@settlewright/anthropometry';
import type { PieceOf } from '../room/document.ts';
import { clipped, extent, inFrame, type PlanFrame, type PlanSolid } from './plan.ts';
import { planOfPiece, solidsNear, type Survey, type SurveyedPlace } from './survey.ts';

type Table = PieceOf<'table'>;
type EdgeName = TableSituation['edges'][number]['name'];

/** Legs deeper under the table than this are not between anybody's knees. */
const KNEE_ZONE_MM = 300;
/** Room outside the outermost leg narrower than this is of no use to a sitter. */
const USABLE_END_MM = 300;
/** Heights at which ADA 306.3 is asked: 9 to 27 in, every 3. */
const ADA_HEIGHTS_MM = [9, 12, 15, 18, 21, 24, 27].map((inches) => inches * MM_PER_INCH);
/** ADA 306: space deeper than 25 in below the edge does not count. */
const ADA_DEEPEST_MM = 25 * MM_PER_INCH;
/** ADA 306.3.5: knee clearance is 30 in wide. */
const ADA_WIDTH_MM = 30 * MM_PER_INCH;
/** ADA 306.2: toe clearance lies below 9 in. */
const TOE_TOP_MM = 9 * MM_PER_INCH;
/** ADA 306.3.3: the shallowest knee clearance, at 27 in. */
const ADA_SHALLOWEST_MM = 8 * MM_PER_INCH;

const HANGING = ['top', 'edge-lip', 'apron'];
const FRONT: { name: EdgeName; turnRad: number } = { name: 'front', turnRad: 0 };
const EDGES: readonly (typeof FRONT)[] = [
  FRONT,
  { name: 'back', turnRad: Math.PI },
  { name: 'left', turnRad: -Math.PI / 2 },
  { name: 'right', turnRad: Math.PI / 2 },
];

/** An edge of a table: origin at its middle, looking inwards under the top. */
interface Edge {
  name: EdgeName;
  lengthMm: number;
  plan: PlanFrame;
}

/**
 * Every table as a whole: who sits at which edge, the room between its legs, and its knee space.
 *
 * @param found - the survey
 * @param places - the measured places
 * @returns one entry a table
 */
export function tableSituations(found: Survey, places: PlaceSituation[]): TableSituation[] {
  const tables = found.document.pieces.filter((piece): piece is Table => piece.kind === 'table');
  return tables.map((table) => {
    const diners = found.places.filter((_, i) => places[i]?.table?.pieceId === table.id);
    const edges = EDGES.map((one) => edgeOf(table, one)).map((edge) => ({
      edge,
      placeIds: diners.filter((place) => sitsAt(place, edge)).map(({ frame }) => frame.placeId),
    }));
    // A wheelchair needs an edge nobody else sits at.
    const open = edges.find(({ placeIds }) => placeIds.length === 0)?.edge ?? edgeOf(table, FRONT);
    return {
      pieceId: table.id,
      mark: table.mark,
      topMm: table.heightMm,
      accessible: table.accessible,
      ...betweenFacing(table, (name) =>
        edges.some((one) => one.edge.name === name && one.placeIds.length > 0),
      ),
      edges: edges
        .filter(({ placeIds }) => placeIds.length > 0)
        .map(({ edge, placeIds }) => ({
          name: edge.name,
          lengthMm: edge.lengthMm,
          placeIds,
          clearBetweenLegsMm: clearBetweenLegs(found, table, edge),
        })),
      kneeSpace: kneeSpace(found, table, open),
    };
  });
}

/** Width of the top between diners who face each other across it. */
function betweenFacing(table: Table, isTaken: (name: EdgeName) => boolean): { betweenFacingMm?: number } {
  const widths: number[] = [];
  if (isTaken('front') && isTaken('back')) widths.push(table.widthMm);
  if (isTaken('left') && isTaken('right')) widths.push(table.lengthMm);
  return widths.length > 0 ? { betweenFacingMm: Math.min(...widths) } : {};
}

function edgeOf(table: Table, { name, turnRad }: typeof FRONT): Edge {
  const { xMm, zMm, facingRad } = planOfPiece(table);
  const outward = facingRad + turnRad;
  const across = name === 'front' || name === 'back';
  const toEdge = (across ? table.widthMm : table.lengthMm) / 2;
  return {
    name,
    lengthMm: across ? table.lengthMm : table.widthMm,
    plan: {
      xMm: xMm + Math.sin(outward) * toEdge,
      zMm: zMm + Math.cos(outward) * toEdge,
      facingRad: outward + Math.PI,
    },
  };
}

/** Whether a sitter looks in over an edge and sits in front of it. */
function sitsAt(place: SurveyedPlace, edge: Edge): boolean {
  if (Math.cos(place.plan.facingRad - edge.plan.facingRad) < Math.SQRT1_2 - 1e-9) return false;
  const [hip] = inFrame([[place.frame.hipMm[0], place.frame.hipMm[2]]], edge.plan);
  return hip !== undefined && Math.abs(hip[0]) <= edge.lengthMm / 2 + 1e-6;
}

/** Width along an edge that legs leave free, without useless ends outside the outermost legs. */
function clearBetweenLegs(found: Survey, table: Table, edge: Edge): number {
  const half = edge.lengthMm / 2;
  const blocked = solidsNear(found, edge.plan, Infinity, (piece) => piece.id === table.id)
    .filter(({ role }) => role === 'leg' || role === 'column')
    .map(({ outline }) => clipped(outline, { left: [-half, half], ahead: [0, KNEE_ZONE_MM] }))
    .filter((outline) => outline.length > 0)
    .map((outline) => extent(outline, 0));
  const free = freeStretches(-half, half, blocked);
  const clear = free.filter(
    ([from, to]) => (from > -half && to < half) || to - from >= USABLE_END_MM || blocked.length === 0,
  );
  return clear.reduce((sum, [from, to]) => sum + to - from, 0);
}

/** What intervals leave free between two ends. */
function freeStretches(from: number, to: number, blocked: (readonly [number, number])[]): [number, number][] {
  const free: [number, number][] = [];
  let low = from;
  for (const [b0, b1] of [...blocked].sort((a, b) => a[0] - b[0])) {
    if (b0 > low) free.push([low, b0]);
    low = Math.max(low, b1);
  }
  if (to > low) free.push([low, to]);
  return free;
}

/** Knee and toe space below one edge, in the widest free stretch of it. */
function kneeSpace(found: Survey, table: Table, edge: Edge): TableSituation['kneeSpace'] {
  const half = edge.lengthMm / 2;
  const near = solidsNear(found, edge.plan, half + ADA_DEEPEST_MM, (piece) => piece.kind !== 'overhead');
  const underEdge = near.filter(
    ({ outline }) => clipped(outline, { left: [-half, half], ahead: [0.01, ADA_DEEPEST_MM] }).length > 0,
  );
  const legs = underEdge
    .filter(({ pieceId, role }) => !(pieceId === table.id && HANGING.includes(role)))
    .map(({ outline }) => clipped(outline, { left: [-half, half], ahead: [0.01, ADA_SHALLOWEST_MM] }))
    .filter((outline) => outline.length > 0)
    .map((outline) => extent(outline, 0));
  const stretches = freeStretches(-half, half, legs);
  const [widest] = [...stretches].sort((a, b) => b[1] - b[0] - (a[1] - a[0]));
  if (widest === undefined) {
    const none = ADA_HEIGHTS_MM.map((heightMm) => ({ heightMm, depthMm: 0 }));
    return { clearHeightMm: 0, widthMm: 0, depthAt: none, toeDepthMm: 0 };
  }
  const widthMm = widest[1] - widest[0];
  const middle = (widest[0] + widest[1]) / 2;
  const strip = Math.min(widthMm, ADA_WIDTH_MM) / 2;
  const left = [middle - strip + 1e-6, middle + strip - 1e-6] as const;
  const inStrip = underEdge
    .map((solid) => ({ ...solid, outline: clipped(solid.outline, { left, ahead: [0.01, ADA_DEEPEST_MM] }) }))
    .filter(({ outline }) => outline.length > 0);
  const depth = (low: number, high: number) => nearest(inStrip, low, high);
  const roof = inStrip.filter(
    ({ pieceId, role, outline }) =>
      pieceId === table.id && HANGING.includes(role) && extent(outline, 1)[0] < ADA_SHALLOWEST_MM,
  );
  return {
    clearHeightMm: Math.min(table.heightMm - table.topThicknessMm, ...roof.map(({ bottomMm }) => bottomMm)),
    widthMm,
    depthAt: ADA_HEIGHTS_MM.map((heightMm) => ({ heightMm, depthMm: depth(heightMm, heightMm) })),
    toeDepthMm: depth(0, TOE_TOP_MM),
  };
}

/** From the edge to the nearest solid that reaches into a height range. */
function nearest(solids: PlanSolid[], low: number, high: number): number {
  const depths = solids
    .filter(({ bottomMm, topMm }) => topMm > low + 1e-6 && bottomMm < high - 1e-6)
    .map(({ outline }) => extent(outline, 1)[0]);
  const depth = Math.min(ADA_DEEPEST_MM, ...depths);
  return depth < 0.02 ? 0 : depth;
}

import type { PlaceSituation, TableSituation } from '@settlewright/anthropometry';
import { union, without, type Interval } from '../drawing/intervals.ts';
import { toRoom } from '../parts/placement.ts';
import { tableTop } from '../pieces/table-leaves.ts';
import type { PieceOf } from '../room/document.ts';
import type { Limits } from './limits.ts';
import { clipped, extent, inFrame, type PlanFrame, type PlanSolid } from './plan.ts';
import { planOfPiece, solidsNear, type Survey, type SurveyedPlace } from './survey.ts';

type Table = PieceOf<'table'>;
type EdgeName = TableSituation['edges'][number]['name'];

const HANGING = ['top', 'leaf', 'edge-lip', 'apron'];
const FRONT: { name: EdgeName; turnRad: number } = { name: 'front', turnRad: 0 };
const EDGES: readonly (typeof FRONT)[] = [
  FRONT,
  { name: 'back', turnRad: Math.PI },
  { name: 'left', turnRad: -Math.PI / 2 },
  { name: 'right', turnRad: Math.PI / 2 },
];

/** Who sits at a table. */
export interface TableDiners {
  pieceId: string;
  edges: Pick<TableSituation['edges'][number], 'name' | 'lengthMm' | 'placeIds'>[];
}

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
 * @param limits - of the rules
 * @returns one entry a table
 */
export function tableSituations(found: Survey, places: PlaceSituation[], limits: Limits): TableSituation[] {
  return tablesOf(found).map((table) => {
    const edges = dinersAt(found, places, table);
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
          clearBetweenLegsMm: clearBetweenLegs(found, table, edge, limits),
        })),
      kneeSpace: kneeSpace(found, table, open, limits),
    };
  });
}

/**
 * Every table with the edges that somebody sits at.
 *
 * @param found - the survey
 * @param places - the measured places
 * @returns one entry a table
 */
export function tableDiners(found: Survey, places: PlaceSituation[]): TableDiners[] {
  return tablesOf(found).map((table) => ({
    pieceId: table.id,
    edges: dinersAt(found, places, table)
      .filter(({ placeIds }) => placeIds.length > 0)
      .map(({ edge: { name, lengthMm }, placeIds }) => ({ name, lengthMm, placeIds })),
  }));
}

const tablesOf = (found: Survey): Table[] =>
  found.document.pieces.filter((piece): piece is Table => piece.kind === 'table');

/** All edges of a table with whoever sits at each. */
function dinersAt(
  found: Survey,
  places: PlaceSituation[],
  table: Table,
): { edge: Edge; placeIds: string[] }[] {
  const diners = found.places.filter((_, i) => places[i]?.table?.pieceId === table.id);
  return EDGES.map((one) => edgeOf(table, one)).map((edge) => ({
    edge,
    placeIds: diners.filter((place) => sitsAt(place, edge)).map(({ frame }) => frame.placeId),
  }));
}

/** Width of the top between diners who face each other across it. */
function betweenFacing(table: Table, isTaken: (name: EdgeName) => boolean): { betweenFacingMm?: number } {
  const widths: number[] = [];
  const { x0, x1, z0, z1 } = tableTop(table);
  if (isTaken('front') && isTaken('back')) widths.push(z1 - z0);
  if (isTaken('left') && isTaken('right')) widths.push(x1 - x0);
  return widths.length > 0 ? { betweenFacingMm: Math.min(...widths) } : {};
}

const edgeOf = (table: Table, { name, turnRad }: typeof FRONT): Edge => ({
  name,
  ...edgeAt(table, turnRad),
});

/**
 * An edge of a table.
 *
 * @param table - the table
 * @param turnRad - which way it lies from the middle: 0 for the front, quarter turns for the others
 * @returns its length, and the level frame at its middle that looks in under the top
 */
export function edgeAt(table: Table, turnRad: number): { lengthMm: number; plan: PlanFrame } {
  const outward = planOfPiece(table).facingRad + turnRad;
  const { x0, x1, z0, z1 } = tableTop(table);
  const isLong = Math.abs(Math.cos(turnRad)) > Math.SQRT1_2;
  const x = isLong ? (x0 + x1) / 2 : Math.sin(turnRad) > 0 ? x1 : x0;
  const z = isLong ? (Math.cos(turnRad) > 0 ? z1 : z0) : (z0 + z1) / 2;
  const [xMm, , zMm] = toRoom(table.at, [x, 0, z]);
  return {
    lengthMm: isLong ? x1 - x0 : z1 - z0,
    plan: { xMm, zMm, facingRad: outward + Math.PI },
  };
}

/** Whether a sitter looks in over an edge and sits in front of it. */
function sitsAt(place: SurveyedPlace, edge: Edge): boolean {
  if (Math.cos(place.plan.facingRad - edge.plan.facingRad) < Math.SQRT1_2 - 1e-9) return false;
  const [hip] = inFrame([[place.frame.hipMm[0], place.frame.hipMm[2]]], edge.plan);
  return hip !== undefined && Math.abs(hip[0]) <= edge.lengthMm / 2 + 1e-6;
}

/** Width along an edge that legs leave free, without useless ends outside the outermost legs. */
function clearBetweenLegs(found: Survey, table: Table, edge: Edge, { legs }: Limits): number {
  const half = edge.lengthMm / 2;
  const blocked = solidsNear(found, edge.plan, Infinity, (piece) => piece.id === table.id)
    .filter(({ role }) => role === 'leg' || role === 'column')
    .map(({ outline }) => clipped(outline, { left: [-half, half], ahead: [0, legs.kneeZoneMm] }))
    .filter((outline) => outline.length > 0)
    .map((outline) => extent(outline, 0));
  const free = freeStretches(-half, half, blocked);
  const clear = free.filter(
    ([from, to]) => (from > -half && to < half) || to - from >= legs.usableEndMm || blocked.length === 0,
  );
  return clear.reduce((sum, [from, to]) => sum + to - from, 0);
}

/** What intervals leave free between two ends. */
const freeStretches = (from: number, to: number, blocked: readonly Interval[]): Interval[] =>
  without([[from, to]], union(blocked, 0), 0);

/** Knee and toe space below one edge, in the widest free stretch of it. */
function kneeSpace(
  found: Survey,
  table: Table,
  edge: Edge,
  { kneeSpace: { heightsMm, deepestMm, shallowestMm, widthMm: neededMm } }: Limits,
): TableSituation['kneeSpace'] {
  const half = edge.lengthMm / 2;
  const near = solidsNear(found, edge.plan, half + deepestMm, (piece) => piece.kind !== 'overhead');
  const underEdge = near.filter(
    ({ outline }) => clipped(outline, { left: [-half, half], ahead: [0.01, deepestMm] }).length > 0,
  );
  const legs = underEdge
    .filter(({ pieceId, role }) => !(pieceId === table.id && HANGING.includes(role)))
    .map(({ outline }) => clipped(outline, { left: [-half, half], ahead: [0.01, shallowestMm] }))
    .filter((outline) => outline.length > 0)
    .map((outline) => extent(outline, 0));
  const stretches = freeStretches(-half, half, legs);
  const [widest] = [...stretches].sort((a, b) => b[1] - b[0] - (a[1] - a[0]));
  if (widest === undefined) {
    const none = heightsMm.map((heightMm) => ({ heightMm, depthMm: 0 }));
    return { clearHeightMm: 0, widthMm: 0, depthAt: none, toeDepthMm: 0 };
  }
  const widthMm = widest[1] - widest[0];
  const middle = (widest[0] + widest[1]) / 2;
  const strip = Math.min(widthMm, neededMm) / 2;
  const left = [middle - strip + 1e-6, middle + strip - 1e-6] as const;
  const inStrip = underEdge
    .map((solid) => ({ ...solid, outline: clipped(solid.outline, { left, ahead: [0.01, deepestMm] }) }))
    .filter(({ outline }) => outline.length > 0);
  const depth = (low: number, high: number) => nearest(inStrip, low, high, deepestMm);
  const roof = inStrip.filter(
    ({ pieceId, role, outline }) =>
      pieceId === table.id && HANGING.includes(role) && extent(outline, 1)[0] < shallowestMm,
  );
  return {
    clearHeightMm: Math.min(table.heightMm - table.topThicknessMm, ...roof.map(({ bottomMm }) => bottomMm)),
    widthMm,
    depthAt: heightsMm.map((heightMm) => ({ heightMm, depthMm: depth(heightMm, heightMm) })),
    toeDepthMm: depth(0, heightsMm[0] ?? 0),
  };
}

/** From the edge to the nearest solid that reaches into a height range. */
function nearest(solids: PlanSolid[], low: number, high: number, deepestMm: number): number {
  const depths = solids
    .filter(({ bottomMm, topMm }) => topMm > low + 1e-6 && bottomMm < high - 1e-6)
    .map(({ outline }) => extent(outline, 1)[0]);
  const depth = Math.min(deepestMm, ...depths);
  return depth < 0.02 ? 0 : depth;
}

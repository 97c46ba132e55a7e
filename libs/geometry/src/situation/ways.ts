import type { PlaceSituation, WaySituation } from '@settlewright/anthropometry';
import { benchLayout } from '../pieces/bench-layout.ts';
import type { PieceOf } from '../room/document.ts';
import { OVER_HEADS_MM } from './clear-floor.ts';
import { clipped, extent, inFrame } from './plan.ts';
import { planOfPiece, rectangleOf, solidsNear, type Survey, type SurveyedPlace } from './survey.ts';

type Bench = PieceOf<'bench'>;
type Table = PieceOf<'table'>;

/** Tables in this range of the seat front belong to a bench: over the seat, and before it. */
const SERVES_MM = [-300, 400] as const;
/** Tables nearer than this are pushed together and leave no way. */
const TOGETHER_MM = 25;
const WIDEST_WAY_MM = 2500;
/** Sitters this near to looking straight apart sit back to back: 15°. */
const OPPOSED_COSINE = Math.cos(Math.PI / 12);

/**
 * Ways people go through: between the tables of a bench, behind loose seats, and between tables whose diners sit back
 * to back on loose seats.
 *
 * @param found - the survey
 * @param places - the measured places
 * @returns ways with their clear width, millimetres
 */
export function waySituations(found: Survey, places: PlaceSituation[]): WaySituation[] {
  const behind = found.places.flatMap((place, i) => behindSeat(found, place, places[i]) ?? []);
  return [...betweenTables(found), ...behind, ...chairsBothSides(found, places)];
}

function betweenTables(found: Survey): WaySituation[] {
  const ways = new Map<string, WaySituation>();
  for (const bench of found.document.pieces) {
    if (bench.kind !== 'bench') continue;
    const along = tablesAlong(found, bench);
    along.forEach(({ table, to }, i) => {
      const next = along[i + 1];
      if (next === undefined) return;
      const widthMm = next.from - to;
      if (widthMm <= TOGETHER_MM || widthMm > WIDEST_WAY_MM) return;
      const pair = [table, next.table].sort((a, b) => (a.id < b.id ? -1 : 1));
      const key = pair.map(({ id }) => id).join(' ');
      const known = ways.get(key);
      if (known !== undefined && known.widthMm <= widthMm) return;
      const pieceIds = pair.map(({ id }) => id);
      ways.set(key, { kind: 'between-tables', pieceIds, marks: pair.map(({ mark }) => mark), widthMm });
    });
  }
  return [...ways.values()];
}

/** Tables that stand at a bench, from one end of it to the other. */
function tablesAlong(found: Survey, bench: Bench): { table: Table; from: number; to: number }[] {
  const front = benchLayout(bench).frontZMm;
  const half = bench.lengthMm / 2;
  return found.document.pieces
    .filter((piece): piece is Table => piece.kind === 'table')
    .flatMap((table) => {
      const [x, z] = [table.lengthMm / 2, table.widthMm / 2];
      const top = inFrame(rectangleOf(table, [-x, x], [-z, z]), planOfPiece(bench));
      const near = clipped(top, {
        left: [-half, half],
        ahead: [front + SERVES_MM[0], front + SERVES_MM[1]],
      });
      if (near.length === 0) return [];
      const [from, to] = extent(top, 0);
      return [{ table, from, to }];
    })
    .sort((a, b) => a.from - b.from);
}

/** From the table's edge back to whatever stands behind a loose seat. */
function behindSeat(
  found: Survey,
  place: SurveyedPlace,
  measured: PlaceSituation | undefined,
): WaySituation | undefined {
  const table = measured?.table;
  if (place.piece.kind !== 'loose-seat' || table === undefined) return undefined;
  const half = place.frame.widthMm / 2;
  const seatRear = -place.effectiveDepthMm;
  let nearest = -Infinity;
  const near = solidsNear(
    found,
    place.plan,
    WIDEST_WAY_MM + place.effectiveDepthMm,
    (piece) => piece.kind !== 'loose-seat' && piece.kind !== 'overhead' && piece.id !== table.pieceId,
  );
  for (const { bottomMm, outline } of near) {
    if (bottomMm >= OVER_HEADS_MM) continue;
    const behind = clipped(outline, {
      left: [-half, half],
      ahead: [-table.overlapMm - WIDEST_WAY_MM, seatRear],
    });
    if (behind.length > 0) nearest = Math.max(nearest, extent(behind, 1)[1]);
  }
  if (nearest === -Infinity) return undefined;
  return {
    kind: 'behind-seat',
    pieceIds: [place.piece.id, table.pieceId],
    marks: [place.piece.mark, table.mark],
    widthMm: -table.overlapMm - nearest,
  };
}

/** Table edge to table edge, once for each pair of tables, where it is least. */
function chairsBothSides(found: Survey, places: PlaceSituation[]): WaySituation[] {
  const seats = found.places.flatMap((place, i) => {
    const table = tableOf(found, places[i]?.table?.pieceId);
    const overlapMm = places[i]?.table?.overlapMm ?? 0;
    return place.piece.kind === 'loose-seat' && table ? [{ place, table, overlapMm }] : [];
  });
  const ways = new Map<string, WaySituation>();
  for (const { place, table, overlapMm } of seats) {
    const half = place.frame.widthMm / 2;
    for (const other of seats) {
      if (other.table.id === table.id || !isBackToBack(place, other.place)) continue;
      const [x, z] = [other.table.lengthMm / 2, other.table.widthMm / 2];
      const top = inFrame(rectangleOf(other.table, [-x, x], [-z, z]), place.plan);
      const behind = clipped(top, { left: [-half, half], ahead: [-WIDEST_WAY_MM, -place.effectiveDepthMm] });
      if (behind.length === 0) continue;
      const pair = [table, other.table].sort((a, b) => (a.id < b.id ? -1 : 1));
      const key = pair.map(({ id }) => id).join(' ');
      const widthMm = -overlapMm - extent(behind, 1)[1];
      if ((ways.get(key)?.widthMm ?? Infinity) <= widthMm) continue;
      const pieceIds = pair.map(({ id }) => id);
      ways.set(key, { kind: 'chairs-both-sides', pieceIds, marks: pair.map(({ mark }) => mark), widthMm });
    }
  }
  return [...ways.values()];
}

const tableOf = (found: Survey, id: string | undefined): Table | undefined =>
  found.document.pieces.find((piece): piece is Table => piece.kind === 'table' && piece.id === id);

/** Whether one sitter's back is turned to another's, with the other somewhere behind. */
function isBackToBack(one: SurveyedPlace, other: SurveyedPlace): boolean {
  if (Math.cos(one.plan.facingRad - other.plan.facingRad) > -OPPOSED_COSINE) return false;
  const [front] = inFrame([[other.plan.xMm, other.plan.zMm]], one.plan);
  return front !== undefined && front[1] < 0;
}

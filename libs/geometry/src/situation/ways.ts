import type { PlaceSituation, WaySituation } from '@settlewright/anthropometry';
import { benchLayout } from '../pieces/bench-layout.ts';
import type { PieceOf } from '../room/document.ts';
import { topOf } from './lap-table.ts';
import type { Limits } from './limits.ts';
import { clipped, extent, inFrame } from './plan.ts';
import { planOfPiece, solidsNear, type Survey, type SurveyedPlace } from './survey.ts';

type Bench = PieceOf<'bench'>;
type Table = PieceOf<'table'>;

const WIDEST_WAY_MM = 2500;

/**
 * Ways people go through: between the tables of a bench, behind loose seats, and between tables whose diners sit back
 * to back on loose seats.
 *
 * @param found - the survey
 * @param places - the measured places
 * @param limits - of the rules
 * @returns ways with their clear width, millimetres
 */
export function waySituations(found: Survey, places: PlaceSituation[], limits: Limits): WaySituation[] {
  const behind = found.places.flatMap((place, i) => behindSeat(found, place, places[i], limits) ?? []);
  return [...betweenTables(found, limits), ...behind, ...chairsBothSides(found, places, limits)];
}

function betweenTables(found: Survey, { tables: { togetherMm, servesMm } }: Limits): WaySituation[] {
  const ways = new Map<string, WaySituation>();
  for (const bench of found.document.pieces) {
    if (bench.kind !== 'bench') continue;
    const along = tablesAlong(found, bench, servesMm);
    along.forEach(({ table, to }, i) => {
      const next = along[i + 1];
      if (next === undefined) return;
      const widthMm = next.from - to;
      if (widthMm <= togetherMm || widthMm > WIDEST_WAY_MM) return;
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
function tablesAlong(
  found: Survey,
  bench: Bench,
  servesMm: readonly [number, number],
): { table: Table; from: number; to: number }[] {
  const front = benchLayout(bench).frontZMm;
  const half = bench.lengthMm / 2;
  return found.document.pieces
    .filter((piece): piece is Table => piece.kind === 'table')
    .flatMap((table) => {
      const top = inFrame(topOf(table), planOfPiece(bench));
      const near = clipped(top, {
        left: [-half, half],
        ahead: [front + servesMm[0], front + servesMm[1]],
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
  { overHeadsMm }: Limits,
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
    if (bottomMm >= overHeadsMm) continue;
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
function chairsBothSides(found: Survey, places: PlaceSituation[], { opposedRad }: Limits): WaySituation[] {
  const seats = found.places.flatMap((place, i) => {
    const table = tableOf(found, places[i]?.table?.pieceId);
    const overlapMm = places[i]?.table?.overlapMm ?? 0;
    return place.piece.kind === 'loose-seat' && table ? [{ place, table, overlapMm }] : [];
  });
  const ways = new Map<string, WaySituation>();
  for (const { place, table, overlapMm } of seats) {
    const half = place.frame.widthMm / 2;
    for (const other of seats) {
      if (other.table.id === table.id || !isBackToBack(place, other.place, opposedRad)) continue;
      const top = inFrame(topOf(other.table), place.plan);
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
function isBackToBack(one: SurveyedPlace, other: SurveyedPlace, opposedRad: number): boolean {
  if (Math.cos(one.plan.facingRad - other.plan.facingRad) > -Math.cos(opposedRad)) return false;
  const [front] = inFrame([[other.plan.xMm, other.plan.zMm]], one.plan);
  return front !== undefined && front[1] < 0;
}

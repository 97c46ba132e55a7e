import { setParameter } from '../pieces/parameters.ts';
import type { SetDocument } from '../room/document.ts';
import { movePiece } from '../room/edit-pieces.ts';
import { measureSet } from '../situation/measure-set.ts';
import { HAND_MM } from './dimension-kinds.ts';
import type { Dimension } from './dimension.ts';

const OVERLAP = 'table-overlap';

/**
 * How far each table stands over its seats: a table with diners on both sides grows, one with one side moves.
 *
 * @param document - the set
 * @returns one dimension for each table that somebody can sit at; millimetres
 */
export function tableOverlaps(document: SetDocument): Dimension[] {
  return document.pieces.flatMap((piece): Dimension[] => {
    const now = overlapOf(document, piece.id);
    if (piece.kind !== 'table' || now === undefined || piece.locked) return [];
    return [
      {
        id: `${OVERLAP}|${piece.id}`,
        label: 'Table over the seat front',
        unit: 'mm',
        pieceIds: [piece.id],
        marks: [piece.mark],
        tableMarks: [],
        value: now.overlapMm,
        min: now.overlapMm - HAND_MM,
        max: now.overlapMm + HAND_MM,
        ruleId: 'TABLE-06',
        at: (wanted, on = document) => withOverlap(on, piece.id, wanted),
      },
    ];
  });
}

interface Overlap {
  /** The least of its places. */
  overlapMm: number;
  bothSides: boolean;
  /** Way the nearest sitter looks. */
  turnDeg: number;
}

function overlapOf(document: SetDocument, tableId: string): Overlap | undefined {
  const { places, tables } = measureSet(document);
  const seated = places.filter(({ table }) => table?.pieceId === tableId);
  const edges = tables.find(({ pieceId }) => pieceId === tableId)?.edges ?? [];
  const seat = document.pieces.find(({ id }) => id === seated[0]?.pieceId);
  if (seat === undefined) return undefined;
  return {
    overlapMm: Math.min(...seated.map(({ table }) => table?.overlapMm ?? Infinity)),
    bothSides: edges.filter(({ placeIds }) => placeIds.length > 0).length > 1,
    turnDeg: seat.at.turnDeg,
  };
}

function withOverlap(document: SetDocument, tableId: string, wantedMm: number): SetDocument | undefined {
  const table = document.pieces.find(({ id }) => id === tableId);
  const now = overlapOf(document, tableId);
  if (table?.kind !== 'table' || now === undefined) return undefined;
  const by = wantedMm - now.overlapMm;
  if (now.bothSides) {
    const set = setParameter(document, tableId, 'widthMm', table.widthMm + 2 * by);
    return set.ok ? set.value : undefined;
  }
  const turn = (now.turnDeg * Math.PI) / 180;
  return movePiece(document, tableId, {
    xMm: table.at.xMm - Math.sin(turn) * by,
    zMm: table.at.zMm - Math.cos(turn) * by,
  });
}

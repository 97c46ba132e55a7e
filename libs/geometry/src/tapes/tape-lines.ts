import type { FitCell, FitSheet } from '@settlewright/anthropometry';
import type { MannequinPose } from '../mannequin/pose.ts';
import { placeFramesOf, type PlaceFrame } from '../pieces/place-frames.ts';
import { referenceSinkMm } from '../pieces/seat-sink.ts';
import type { SetDocument } from '../room/document.ts';
import { measureSet, type SeatSituation } from '../situation/measure-set.ts';
import { GAP_OF_RULE } from './gap-tapes.ts';
import { pieceTapes } from './piece-tapes.ts';
import { seatView } from './seat-view.ts';
import type { TapeLine } from './tape-line.ts';

/** A posed sitter, so that gaps run between true points of the body. */
export interface TapeBody {
  placeId: string;
  pose: MannequinPose;
}

/**
 * The tapes of a scene: dimensions of the selected piece, and for every verdict about a sitter the gap it
 * stands for.
 *
 * @param document - the set
 * @param sheet - its fit sheet
 * @param selectedPieceId - whose dimensions to show
 * @param bodies - posed sitters; a gap that needs a body nobody may see is left out or shown as the set's
 * own measure
 * @returns dimensions first, then gaps in the order of the sheet; gaps keep their sign, negative when body
 * and piece would meet
 */
export function tapeLines(
  document: SetDocument,
  sheet: FitSheet,
  selectedPieceId?: string,
  bodies: readonly TapeBody[] = [],
): TapeLine[] {
  const selected = document.pieces.find(({ id }) => id === selectedPieceId);
  const frames = new Map(placeFramesOf(document).map((frame) => [frame.placeId, frame]));
  const situation = measureSet(document);
  return [
    ...(selected ? pieceTapes(selected) : []),
    ...sheet.rows.flatMap((row) => rowTapes(document, row, frames.get(row.placeId), situation, bodies)),
    ...sheet.piecesAndWays.flatMap((cell) => facingTape(cell, situation, frames)),
  ];
}

function rowTapes(
  document: SetDocument,
  row: FitSheet['rows'][number],
  frame: PlaceFrame | undefined,
  { places }: SeatSituation,
  bodies: readonly TapeBody[],
): TapeLine[] {
  const place = places.find(({ placeId }) => placeId === row.placeId);
  const piece = document.pieces.find(({ id }) => id === frame?.pieceId);
  if (!frame || !place || !piece || (piece.kind !== 'bench' && piece.kind !== 'loose-seat')) return [];
  const pose = bodies.find(({ placeId }) => placeId === row.placeId)?.pose;
  const view = seatView(frame, place, row.name, pose, referenceSinkMm(piece));
  return row.cells.flatMap((cell): TapeLine[] => {
    if (cell.outcome.kind !== 'verdict') return [];
    const gap = GAP_OF_RULE[cell.ruleId]?.(view, cell, cell.outcome);
    // A sheet of verdicts alone holds no value to write on the tape.
    if (!gap || !Number.isFinite(gap.valueMm)) return [];
    return [gapTape(cell, gap, cell.pieceIds[0] ?? frame.pieceId)];
  });
}

function gapTape(
  cell: FitCell,
  gap: { from: TapeLine['fromMm']; to: TapeLine['toMm']; name: string; valueMm: number; describes: string },
  pieceId: string,
): TapeLine {
  return {
    id: `gap/${cell.id}${cell.side ? `/${cell.side}` : ''}`,
    kind: 'gap',
    fromMm: gap.from,
    toMm: gap.to,
    name: gap.name,
    valueMm: gap.valueMm,
    pieceId,
    cellId: cell.id,
    ...(cell.outcome.kind === 'verdict' ? { verdict: cell.outcome.verdict } : {}),
    describes: gap.describes,
  };
}

/** Knee space between two benches, from seat front to seat front. */
function facingTape(cell: FitCell, situation: SeatSituation, frames: Map<string, PlaceFrame>): TapeLine[] {
  if (cell.ruleId !== 'SIDE-04' || cell.outcome.kind !== 'verdict') return [];
  const facing = situation.facing.find(({ pieceIds }) => pieceIds.every((id) => cell.pieceIds.includes(id)));
  const pair =
    facing?.pairs.find(([a, b]) => cell.placeId === a || cell.placeId === b || cell.id.includes(a)) ??
    facing?.pairs[0];
  const from = pair && frames.get(pair[0]);
  if (!facing || !from) return [];
  const [x, y, z] = from.frontMm;
  return [
    gapTape(
      cell,
      {
        from: [x, y, z],
        to: [x + Math.sin(from.facingRad) * facing.gapMm, y, z + Math.cos(from.facingRad) * facing.gapMm],
        name: 'seat to seat',
        valueMm: facing.gapMm,
        describes: `seat front of ${facing.marks[0]} to the seat front of ${facing.marks[1]}`,
      },
      facing.pieceIds[0],
    ),
  ];
}

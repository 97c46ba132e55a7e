import { placer } from '../parts/placement.ts';
import { parametersOf, setParameter, type ParameterError } from '../pieces/parameters.ts';
import type { Piece, SetDocument } from '../room/document.ts';
import { roomFor, type RoomFor } from '../situation/room-for.ts';
import { ok, type Result } from '../units/result.ts';
import type { Handle } from './handle.ts';
import { gripsOf } from './piece-grips.ts';

/**
 * Every handle by which a piece is shaped; a locked piece has none.
 *
 * @param piece - the piece
 * @returns handles in the order of the spec sentence; points in the room, millimetres
 */
export function pieceHandles(piece: Piece): Handle[] {
  if (piece.locked) return [];
  const parameters = new Map(parametersOf(piece).map((parameter) => [parameter.key, parameter]));
  const place = placer(piece.at);
  const turn = placer({ ...piece.at, xMm: 0, zMm: 0 });
  return gripsOf(piece).flatMap((grip): Handle[] => {
    const parameter = parameters.get(grip.key);
    if (!parameter || typeof parameter.value !== 'number') return [];
    return [
      {
        id: [piece.id, grip.key, ...(grip.side ? [grip.side] : [])].join('/'),
        pieceId: piece.id,
        key: grip.key,
        ...(grip.side && { side: grip.side }),
        label: parameter.label,
        kind: parameter.kind === 'angle' ? 'angle' : 'length',
        main: parameter.group === 'main',
        value: parameter.value,
        min: parameter.min,
        max: parameter.max,
        atMm: place(grip.pointMm),
        along: turn(grip.along),
        perMm: grip.perMm ?? 1,
        farStays: grip.farStays ?? false,
        ...(grip.pivotMm && { pivotMm: place(grip.pivotMm) }),
      },
    ];
  });
}

/**
 * The set with a handle pulled until its number has a value.
 *
 * @param document - the set
 * @param handle - one of `pieceHandles` of a piece of the set
 * @param value - the number, in millimetres or degrees
 * @returns the set as `setParameter` makes it, with the far side of the piece where it was if the handle keeps it
 */
export function pullHandle(
  document: SetDocument,
  handle: Handle,
  value: number,
): Result<SetDocument, ParameterError> {
  const before = document.pieces.find(({ id }) => id === handle.pieceId);
  const changed = setParameter(document, handle.pieceId, handle.key, value);
  if (!changed.ok || !before || !handle.farStays) return changed;
  const was = parametersOf(before).find(({ key }) => key === handle.key);
  const by = (Math.min(handle.max, Math.max(handle.min, value)) - Number(was?.value)) / 2;
  const [x, , z] = handle.along;
  const at = { ...before.at, xMm: tidy(before.at.xMm + x * by), zMm: tidy(before.at.zMm + z * by) };
  const pieces = changed.value.pieces.map((one) => (one.id === handle.pieceId ? { ...one, at } : one));
  return ok({ ...changed.value, pieces });
}

/** Without the last digits that turning by a right angle adds. */
const tidy = (mm: number) => Math.round(mm * 1e6) / 1e6;

/**
 * How far a handle may be pulled before the piece meets another.
 *
 * @param document - the set
 * @param handle - one of `pieceHandles` of a piece of the set
 * @returns limits of its number, as `roomFor` gives them for a number that is typed
 */
export function roomForPull(document: SetDocument, handle: Handle): RoomFor {
  return roomFor(document, handle.pieceId, handle.key, (set, value) => pullHandle(set, handle, value));
}

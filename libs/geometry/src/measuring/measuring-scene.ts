import { toRoom } from '../parts/placement.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import type { Piece, SetDocument } from '../room/document.ts';
import type { MeasuredBody } from './body-points.ts';

/** What can be measured: the parts of a set and the bodies in it, found by what names them. */
export interface MeasuringScene {
  pieces: ReadonlyMap<string, Piece>;
  parts: ReadonlyMap<string, Part>;
  bodies: readonly MeasuredBody[];
  body: (pieceId: string, place: number) => MeasuredBody | undefined;
  /** Ids of the parts of the same role in the same piece, in their order. */
  alike: (part: Part) => readonly string[];
  /** A point of a piece's own frame in the room. */
  spot: (pieceId: string, atMm: Vec3) => Vec3 | undefined;
}

/**
 * Puts together what can be measured.
 *
 * @param document - the set
 * @param parts - derived from it
 * @param bodies - who sits there; none where bodies may not be measured
 */
export function measuringScene(
  document: SetDocument,
  parts: readonly Part[],
  bodies: readonly MeasuredBody[] = [],
): MeasuringScene {
  const pieces = new Map(document.pieces.map((piece) => [piece.id, piece]));
  const roles = new Map<string, string[]>();
  const roleOf = ({ pieceId, role }: Part): string => `${pieceId} ${role}`;
  for (const part of parts) roles.set(roleOf(part), [...(roles.get(roleOf(part)) ?? []), part.id]);
  return {
    pieces,
    parts: new Map(parts.map((part) => [part.id, part])),
    bodies,
    body: (pieceId, place) => bodies.find((body) => body.pieceId === pieceId && body.place === place),
    alike: (part) => roles.get(roleOf(part)) ?? [],
    spot: (pieceId, atMm) => {
      const piece = pieces.get(pieceId);
      return piece && toRoom(piece.at, atMm);
    },
  };
}

import { lensStand, type LensCamera, type Vec3 } from '@settlewright/geometry';
import type { RoomPicture } from '../picture.ts';
import { firstUnder } from '../scene/pick.ts';
import { dot, scale, subtract } from '../scene/vectors.ts';

/** What stands in the middle of a frame, and how far it is from the lens. */
export interface Subject {
  name: string;
  distanceMm: number;
}

/** The nearest board, cushion or body on the axis of a lens; a body counts from the middle of what is met of it. */
export function subjectOf(lens: LensCamera, { document, parts, bodies }: RoomPicture): Subject | undefined {
  const { eyeMm, toward } = lensStand(lens);
  const direction = scale(toward, -1);
  const hit = firstUnder(parts, { origin: eyeMm, direction });
  const piece = document.pieces.find(({ id }) => id === hit?.pieceId);
  const met: Subject[] = hit && piece ? [{ name: piece.mark, distanceMm: hit.distanceMm }] : [];
  for (const { name, pose } of bodies) {
    for (const segment of pose.segments) {
      if (segment.kind !== 'ellipsoid') continue;
      const way = subtract(segment.centreMm, eyeMm);
      const distanceMm = dot(way, direction);
      const beside = Math.hypot(...subtract(way, scale(direction, distanceMm)));
      if (distanceMm > 0 && beside < Math.max(...segment.radiiMm)) met.push({ name, distanceMm });
    }
  }
  return met.sort((a, b) => a.distanceMm - b.distanceMm)[0];
}

/** What a lens can be aimed at: heads first, then pieces. */
export function aims({ document, parts, bodies }: RoomPicture): { id: string; name: string; at: Vec3 }[] {
  const heads = bodies.flatMap(({ placeId, name, pose }) => {
    const head = pose.segments.find(({ tag, kind }) => tag === 'head' && kind === 'ellipsoid');
    return head?.kind === 'ellipsoid' ? [{ id: placeId, name: `${name}, head`, at: head.centreMm }] : [];
  });
  const pieces = document.pieces.flatMap((piece) => {
    const own = parts.filter(({ pieceId }) => pieceId === piece.id);
    const middle = (n: 0 | 1 | 2) => own.reduce((sum, { positionMm }) => sum + positionMm[n], 0) / own.length;
    return own.length > 0
      ? [{ id: piece.id, name: piece.mark, at: [middle(0), middle(1), middle(2)] as const }]
      : [];
  });
  return [...heads, ...pieces];
}

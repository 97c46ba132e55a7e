import type { Piece, Part, Vec3 } from '@settlewright/geometry';
import type { RoomPicture } from '../picture.ts';
import { boundsOf, boundsOfBody, union, type Bounds } from './bounds.ts';
import type { Cut } from './views.ts';

const BAY_MM = 2600;
const EMPTY_ROOM: Bounds = { min: [-1800, 0, -900], max: [1800, 1500, 900] };
/** Walls, windows and beams stand around what the view is about. */
const SURROUNDING = new Set<string>(['bulkhead', 'sill', 'overhead']);
const HEAD_ROOM_MM = 1400;

type Shown = Pick<RoomPicture, 'document' | 'parts'> & {
  bodies: readonly Pick<RoomPicture['bodies'][number], 'pieceId' | 'pose'>[];
};

/**
 * What a view has to show: the whole set with whoever sits in it, feet and all, or on a narrow sheet
 * the bay of the selected piece.
 */
export function boundsToShow(
  { document, parts, bodies }: Shown,
  selectedPieceId: string | undefined,
  narrow: boolean,
): Bounds {
  const kinds = new Map(document.pieces.map((piece) => [piece.id, piece.kind]));
  const furniture = parts.filter((part) => !SURROUNDING.has(kinds.get(part.pieceId) ?? ''));
  const shown = furniture.length > 0 ? furniture : parts;
  const seated = (pieces?: ReadonlySet<string>) =>
    bodies.filter(({ pieceId }) => pieces?.has(pieceId) ?? true).map(({ pose }) => boundsOfBody(pose));
  const all = seated().reduce(union, boundsOf(shown) ?? EMPTY_ROOM);
  const whole: Bounds = { min: all.min, max: [all.max[0], Math.max(all.max[1], HEAD_ROOM_MM), all.max[2]] };
  if (!narrow || whole.max[0] - whole.min[0] <= BAY_MM) return whole;
  const boxes = document.pieces.flatMap((piece) => {
    const box = boundsOf(shown.filter((part) => part.pieceId === piece.id));
    return box ? [{ id: piece.id, box, middle: (box.min[0] + box.max[0]) / 2 }] : [];
  });
  const start = boxes.find((entry) => entry.id === selectedPieceId) ?? boxes[0];
  if (!start) return whole;
  let bay = start.box;
  const inside = new Set<string>();
  for (const { id, box } of [...boxes].sort(
    (a, b) => Math.abs(a.middle - start.middle) - Math.abs(b.middle - start.middle),
  )) {
    const wider = union(bay, box);
    if (wider.max[0] - wider.min[0] > BAY_MM) continue;
    bay = wider;
    inside.add(id);
  }
  bay = seated(inside).reduce(union, bay);
  return {
    min: [bay.min[0], whole.min[1], bay.min[2]],
    max: [bay.max[0], Math.max(bay.max[1], HEAD_ROOM_MM), bay.max[2]],
  };
}

/** The section of view C: across the selected bench, seen so that its sitter looks to the right. */
export function cutThrough(piece: Piece | undefined, parts: readonly Part[]): Cut | undefined {
  const bounds = piece && boundsOf(parts.filter((part) => part.pieceId === piece.id));
  if (!piece || !bounds) return undefined;
  const turn = (piece.at.turnDeg * Math.PI) / 180;
  // The sitter's left hand lies along +x of the piece; from there the face looks to the right.
  const toward: Vec3 = [-Math.cos(turn), 0, Math.sin(turn)];
  const flip = toward[2] < -0.5 ? -1 : 1;
  return {
    pointMm: [
      (bounds.min[0] + bounds.max[0]) / 2,
      (bounds.min[1] + bounds.max[1]) / 2,
      (bounds.min[2] + bounds.max[2]) / 2,
    ],
    toward: [toward[0] * flip, 0, toward[2] * flip],
  };
}

import { REFERENCE_SITTER_KG, seatSinkMm } from '@settlewright/anthropometry';
import {
  footRailOf,
  placeFrames,
  poseMannequin,
  type MannequinPose,
  type PoseNote,
  type PostureChoice,
} from '@settlewright/geometry';
import type { RoomPicture, SeatedBody } from '../picture.ts';

/** What says that a choice cannot be had here. */
const REFUSALS: readonly PoseNote['kind'][] = [
  'table-out-of-reach',
  'sill-out-of-reach',
  'rail-out-of-reach',
];

/** The body of a place as it would sit; `undefined` where nobody can be drawn. */
function posed(picture: RoomPicture, body: SeatedBody, choice: PostureChoice): MannequinPose | undefined {
  const frame = picture.document.pieces
    .filter(({ id }) => id === body.pieceId)
    .flatMap((piece) => placeFrames(piece, picture.document))
    .find(({ placeId }) => placeId === body.placeId);
  const situation = picture.situation.places.find(({ placeId }) => placeId === body.placeId);
  if (!frame || !situation) return undefined;
  const { means, stance } = body.pose;
  const weightKg = means.weight_kg || REFERENCE_SITTER_KG;
  const sinkMm = situation.foam ? seatSinkMm(situation.foam, weightKg).sinkMm : 0;
  const around = { ...situation, footRail: footRailOf(picture.parts, frame) };
  return poseMannequin({ means, shoeMm: stance.shoeMm, frame, situation: around, sinkMm, choice });
}

/** Why a choice cannot be had at a place; `undefined` where it can. */
export function refusalOf(
  picture: RoomPicture,
  body: SeatedBody,
  choice: PostureChoice,
): PoseNote | undefined {
  return posed(picture, body, choice)?.notes.find(({ kind }) => REFUSALS.includes(kind));
}

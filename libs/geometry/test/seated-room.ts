import { createBodyModel } from '@settlewright/anthropometry';
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import { seatSinkMm } from '@settlewright/anthropometry';
import { poseMannequin, type MannequinPose } from '../src/mannequin/pose.ts';
import type { Part } from '../src/parts/part.ts';
import { deriveParts } from '../src/pieces/kinds.ts';
import { placeFramesOf } from '../src/pieces/place-frames.ts';
import { setParameter } from '../src/pieces/parameters.ts';
import { addPiece } from '../src/room/edit-pieces.ts';
import { emptySetDocument } from '../src/room/read-document.ts';
import type { PieceKind, SetDocument } from '../src/room/document.ts';
import { measureSet } from '../src/situation/measure-set.ts';

const model = createBodyModel(survey);

/** The best guess of somebody at a percentile of stature. */
export const personAt = (bodyData: 'women' | 'men', percentile: number) =>
  model.predict(model.mannequin({ bodyData, measure: 'stature', percentile })).means();

/** Adds pieces to an empty set: kind, place, parameters. */
export function setOf(
  pieces: readonly (readonly [
    PieceKind,
    { xMm: number; zMm: number; turnDeg: number },
    Record<string, number>?,
  ])[],
): { document: SetDocument; ids: string[] } {
  let document = emptySetDocument();
  const ids = pieces.map(([kind, at, parameters = {}]) => {
    const added = addPiece(document, kind, at);
    document = added.document;
    for (const [key, value] of Object.entries(parameters)) {
      const changed = setParameter(document, added.pieceId, key, value);
      if (!changed.ok) throw new Error(changed.error.message);
      document = changed.value;
    }
    return added.pieceId;
  });
  return { document, ids };
}

type Means = ReturnType<typeof personAt>;
export interface SeatedAt {
  placeId: string;
  pieceId: string;
  pose: MannequinPose;
}

/** Seats people at the first places of a set. */
export function seated(
  document: SetDocument,
  people: readonly Means[],
  over: Partial<Parameters<typeof poseMannequin>[0]> = {},
): { bodies: SeatedAt[]; parts: Part[] } {
  const frames = placeFramesOf(document);
  const { places } = measureSet(document);
  const bodies = people.map((means, i): SeatedAt => {
    const frame = frames[i]!;
    const situation = places.find(({ placeId }) => placeId === frame.placeId)!;
    const sinkMm = situation.foam ? seatSinkMm(situation.foam, means.weight_kg).sinkMm : 0;
    const pose = poseMannequin({ means, shoeMm: 25, frame, situation, sinkMm, ...over });
    return { placeId: frame.placeId, pieceId: frame.pieceId, pose };
  });
  return { bodies, parts: deriveParts(document) };
}

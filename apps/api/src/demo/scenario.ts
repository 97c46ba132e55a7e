import corridor from '@settlewright/seed-data/demo/corridor.json';
import diningCar from '@settlewright/seed-data/demo/dining-car.json';
import scenario from '@settlewright/seed-data/demo/scenario.json';
import waitingRoom from '@settlewright/seed-data/demo/waiting-room.json';
import {
  type Piece,
  readSetDocument,
  type SetDocument,
  setParameter,
  type SitterRef,
} from '@settlewright/geometry';

const DOCUMENTS: Record<string, unknown> = {
  'dining-car': diningCar,
  corridor,
  'waiting-room': waitingRoom,
};

type DemoSet = (typeof scenario.sets)[number];

/** The invented scenario every demonstration starts from. */
export const SCENARIO = scenario;

/** A set of the scenario with its people at their places. */
export function demoDocument(set: DemoSet, castIds: ReadonlyMap<string, string>): SetDocument {
  const read = readSetDocument(DOCUMENTS[set.document]);
  if (!read.ok) throw new Error(`Demo set ${set.name}: ${read.error.message}`);
  const idOf = (mark: string) => pieceWith(read.value, mark).id;
  const people = set.seating.map(({ piece, place, who }) => {
    const castId = castIds.get(who);
    if (castId === undefined) throw new Error(`Demo set ${set.name}: nobody is called ${who}.`);
    return { pieceId: idOf(piece), place, sitter: { kind: 'cast', castId } satisfies SitterRef };
  });
  const mannequins = (set.mannequins ?? []).map(({ piece, place, bodyData, percentile }) => ({
    pieceId: idOf(piece),
    place,
    sitter: {
      kind: 'mannequin',
      bodyData: bodyData === 'women' ? 'women' : 'men',
      measure: 'stature',
      percentile,
    } satisfies SitterRef,
  }));
  return { ...read.value, seating: [...people, ...mannequins] };
}

/** The document after one step of its history. */
export function afterChanges(
  document: SetDocument,
  changes: readonly { mark: string; key: string; value: number }[],
): SetDocument {
  return changes.reduce((current, { mark, key, value }) => {
    const changed = setParameter(current, pieceWith(current, mark).id, key, value);
    if (!changed.ok) throw new Error(`Demo change ${mark} ${key}: ${changed.error.message}`);
    return changed.value;
  }, document);
}

function pieceWith(document: SetDocument, mark: string): Piece {
  const piece = document.pieces.find((candidate) => candidate.mark === mark);
  if (!piece) throw new Error(`The demo set has no piece ${mark}.`);
  return piece;
}

import { parametersOf } from '../pieces/parameters.ts';
import type { Piece, SetDocument } from './document.ts';
import { cushionDifferences } from './diff-cushions.ts';
import { compared, type DocumentDifference, type Named } from './document-difference.ts';
import { isSame, leavesOf } from './leaves.ts';

const LABELS: Record<string, string> = {
  at: 'Position',
  mark: 'Mark',
  name: 'Name',
  note: 'Note',
  accessible: 'Accessible',
  locked: 'Locked',
  hidden: 'Hidden',
  leaves: 'Leaves',
  places: 'Places',
  base: 'Base',
  'seatCushion.foam': 'Seat foam',
  'backCushion.foam': 'Back foam',
  'upholstery.buttons': 'Buttons',
  'upholstery.joints': 'Joints of the cushions',
  lumbar: 'Back curve',
};

const ASKED_LABELS: Record<string, string> = {
  backPosture: 'Posture',
  trafficBehind: 'Who passes behind seats',
  lensHeightMm: 'Height of the lens',
  appleBoxes: 'Apple boxes at hand',
  entrance: 'Where people come in',
  route: 'Route kept clear',
  turningAt: 'Spot for turning round',
  door: 'Door on the way in',
  wheelchairSpaces: 'Wheelchair spaces kept',
};

/**
 * Compares two versions of a set that grew from one, value by value.
 *
 * @param base - the version both started from; null when it is lost, and then every difference is a conflict
 * @param mine - one version
 * @param theirs - the other version
 * @returns every point at which `mine` and `theirs` differ, pieces first; empty when they are the same
 */
export function diffDocuments(
  base: SetDocument | null,
  mine: SetDocument,
  theirs: SetDocument,
): DocumentDifference[] {
  const versions = { base, mine, theirs };
  return [
    ...pieceDifferences(base, mine, theirs),
    ...seatingDifferences(base, mine, theirs),
    ...askedDifferences(base, mine, theirs),
    ...listedDifferences(
      versions,
      ({ knownDifferences }) => knownDifferences,
      ({ id }) => ({ id: `note:${id}`, kind: 'known-difference', key: id, label: 'Known difference' }),
    ),
    ...listedDifferences(
      versions,
      ({ groups }) => groups,
      ({ id, name }) => ({ id: `group:${id}`, kind: 'group', key: id, label: `Group “${name}”` }),
    ),
    ...listedDifferences(
      versions,
      ({ views }) => views,
      ({ id, name }) => ({ id: `view:${id}`, kind: 'view', key: id, label: `View “${name}”` }),
    ),
    ...dimensionDifferences(base, mine, theirs),
    ...cushionDifferences(base, mine, theirs),
  ];
}

function pieceDifferences(
  base: SetDocument | null,
  mine: SetDocument,
  theirs: SetDocument,
): DocumentDifference[] {
  const find = (document: SetDocument | null, id: string) =>
    document?.pieces.find((piece) => piece.id === id);
  const ids = new Set([...theirs.pieces, ...mine.pieces].map((piece) => piece.id));
  return [...ids].flatMap((id) => {
    const values = { base: find(base, id), mine: find(mine, id), theirs: find(theirs, id) };
    const { mine: own, theirs: other } = values;
    const shown = own ?? other;
    if (shown === undefined) return [];
    const sameKind = own !== undefined && other !== undefined && own.kind === other.kind;
    // Two pieces that were added on both sides under one id are two pieces: both are kept.
    const bothAdded = base !== null && values.base === undefined && own !== undefined && other !== undefined;
    if (sameKind && !bothAdded) return parameterDifferences(values.base, own, other, base !== null);
    if (bothAdded && isSame(own, other)) return [];
    const named: Named = {
      id: `piece:${id}`,
      kind: 'piece',
      pieceId: id,
      mark: shown.mark,
      label: shown.mark,
    };
    if (bothAdded) return [{ ...named, ...values, changedBy: 'both', conflict: false }];
    // With the common version lost, a piece on one side only may be new or removed: somebody must say.
    return compared(named, values, base !== null);
  });
}

function parameterDifferences(
  base: Piece | undefined,
  mine: Piece,
  theirs: Piece,
  known: boolean,
): DocumentDifference[] {
  const [was, own, other] = [leavesOf(base), leavesOf(mine), leavesOf(theirs)];
  const labels = new Map(
    [...parametersOf(theirs), ...parametersOf(mine)].map(({ key, label }) => [key, label]),
  );
  return [...new Set([...own.keys(), ...other.keys()])].flatMap((key) =>
    compared(
      {
        id: `piece:${mine.id}:${key}`,
        kind: 'parameter',
        pieceId: mine.id,
        mark: mine.mark,
        key,
        label: LABELS[key] ?? labels.get(key) ?? key,
      },
      { base: was.get(key), mine: own.get(key), theirs: other.get(key) },
      known && base !== undefined,
    ),
  );
}

function seatingDifferences(
  base: SetDocument | null,
  mine: SetDocument,
  theirs: SetDocument,
): DocumentDifference[] {
  const byPlace = (document: SetDocument | null) =>
    new Map((document?.seating ?? []).map((seat) => [`${seat.pieceId}:${seat.place}`, seat]));
  const [was, own, other] = [byPlace(base), byPlace(mine), byPlace(theirs)];
  const markOf = (id: string) =>
    [...mine.pieces, ...theirs.pieces].find((piece) => piece.id === id)?.mark ?? id;
  return [...new Set([...other.keys(), ...own.keys()])].flatMap((where) => {
    const seat = own.get(where) ?? other.get(where);
    if (seat === undefined) return [];
    const mark = markOf(seat.pieceId);
    const named: Named = {
      id: `seat:${where}`,
      kind: 'seating',
      pieceId: seat.pieceId,
      mark,
      label: `Place ${seat.place} of ${mark}`,
    };
    const sitter = (seats: typeof own) => seats.get(where)?.sitter;
    const posture = (seats: typeof own) => seats.get(where)?.posture;
    return [
      ...compared(named, { base: sitter(was), mine: sitter(own), theirs: sitter(other) }, base !== null),
      ...compared(
        {
          ...named,
          id: `posture:${where}`,
          key: 'posture',
          label: `Posture at place ${seat.place} of ${mark}`,
        },
        { base: posture(was), mine: posture(own), theirs: posture(other) },
        base !== null,
      ),
    ];
  });
}

function askedDifferences(
  base: SetDocument | null,
  mine: SetDocument,
  theirs: SetDocument,
): DocumentDifference[] {
  const keys = new Set([theirs, mine].flatMap(({ asked }) => Object.keys(asked)));
  return ([...keys] as (keyof SetDocument['asked'])[]).flatMap((key) =>
    compared(
      { id: `asked:${key}`, kind: 'asked', key, label: ASKED_LABELS[key] ?? key },
      { base: base?.asked[key], mine: mine.asked[key], theirs: theirs.asked[key] },
      base !== null,
    ),
  );
}

/** Compares what a document lists under ids, one entry at a time. */
function listedDifferences<Entry extends { id: string }>(
  versions: { base: SetDocument | null; mine: SetDocument; theirs: SetDocument },
  listed: (document: SetDocument) => readonly Entry[] | undefined,
  named: (entry: Entry) => Named,
): DocumentDifference[] {
  const { base, mine, theirs } = versions;
  const find = (document: SetDocument | null, id: string) =>
    (document && listed(document))?.find((entry) => entry.id === id);
  const entries = [theirs, mine].flatMap((document) => listed(document) ?? []);
  return [...new Set(entries.map(({ id }) => id))].flatMap((id) => {
    const values = { base: find(base, id), mine: find(mine, id), theirs: find(theirs, id) };
    const shown = values.mine ?? values.theirs;
    return shown === undefined ? [] : compared(named(shown), values, base !== null);
  });
}

function dimensionDifferences(
  base: SetDocument | null,
  mine: SetDocument,
  theirs: SetDocument,
): DocumentDifference[] {
  const find = (document: SetDocument | null, id: string) =>
    document?.dimensions?.find((dimension) => dimension.id === id);
  const ids = new Set([theirs, mine].flatMap(({ dimensions = [] }) => dimensions.map(({ id }) => id)));
  return [...ids].flatMap((id) => {
    const values = { base: find(base, id), mine: find(mine, id), theirs: find(theirs, id) };
    const { mine: own, theirs: other } = values;
    const marks = (own ?? other)?.ends.map(
      ({ pieceId }) =>
        [...mine.pieces, ...theirs.pieces].find((piece) => piece.id === pieceId)?.mark ?? pieceId,
    );
    const named: Named = {
      id: `dimension:${id}`,
      kind: 'dimension',
      key: id,
      label: `Dimension line from ${marks?.[0]} to ${marks?.[1]}`,
    };
    // Two lines pinned on both sides under one id are two lines: both are kept.
    const bothAdded = base !== null && values.base === undefined && own !== undefined && other !== undefined;
    if (!bothAdded) return compared(named, values, base !== null);
    return isSame(own, other) ? [] : [{ ...named, ...values, changedBy: 'both', conflict: false }];
  });
}

import { fail, ok, type Result } from '../units/result.ts';
import type { PinnedDimension } from '../measuring/dimension.ts';
import { pinDimension, withDimensions } from '../measuring/edit-dimensions.ts';
import { chooseCushion, copyCushionChoices } from './cushion-choices.ts';
import { diffDocuments } from './diff-documents.ts';
import type { Piece, PieceGroup, SetDocument, SitterRef } from './document.ts';
import type { NamedView } from '../views/named-view.ts';
import type { DocumentDifference } from './document-difference.ts';
import { freeId, nextMark, withoutLostParts } from './edit-pieces.ts';
import { withPath } from './leaves.ts';
import { readSetDocument, type DocumentFieldError } from './read-document.ts';
import type { PostureChoice } from './posture-choice.ts';
import { choosePosture } from './seating.ts';

/** Somebody who has no place in a merged set. */
export interface Unseated {
  pieceId: string;
  place: number;
  sitter: SitterRef;
}

/** Two versions brought together, and what that did to people and marks. */
export interface Merge {
  document: SetDocument;
  /** Whose place is gone, or who would have sat at two places; to be shown, never dropped unseen. */
  unseated: Unseated[];
  /** Pieces added on both sides under one mark: mine got the next free one. */
  remarked: { pieceId: string; from: string; to: string }[];
}

/** Why two versions could not be brought together. */
export interface MergeError {
  code: 'undecided' | 'invalid';
  message: string;
  /** Ids of the differences that still need a choice. */
  undecided: string[];
  fields: DocumentFieldError[];
}

/**
 * Brings two versions of a set together: what one side changed is kept, what both changed is chosen.
 *
 * @param base - the version both started from; null when it is lost
 * @param mine - one version
 * @param theirs - the other version
 * @param choices - for each conflict of `diffDocuments` by id, whose value to take; may also overrule a change of one side
 * @returns the merged set, or the ids that still need a choice; nothing is chosen by itself
 */
export function mergeDocuments(
  base: SetDocument | null,
  mine: SetDocument,
  theirs: SetDocument,
  choices: Readonly<Record<string, 'mine' | 'theirs'>>,
): Result<Merge, MergeError> {
  const differences = diffDocuments(base, mine, theirs);
  const undecided = differences.filter(({ id, conflict }) => conflict && choices[id] === undefined);
  if (undecided.length > 0) {
    const words = undecided.map(({ mark, label }) => (mark === undefined ? label : `${mark}: ${label}`));
    return fail({
      code: 'undecided',
      message: `Both sides changed: ${words.join(', ')}. Choose one of each.`,
      undecided: undecided.map(({ id }) => id),
      fields: [],
    });
  }
  const taken = differences.filter(({ id, changedBy }) => (choices[id] ?? changedBy) !== 'theirs');
  const applied = taken.reduce((merged, difference) => withMine(merged, difference, mine), theirs);
  const { document, remarked } = withFreeMarks(applied, mine, theirs);
  const { document: seated, unseated } = withEveryoneOnce(document, mine);
  const read = readSetDocument(seated);
  if (!read.ok) {
    const { message, fields } = read.error;
    return fail({ code: 'invalid', message: `Together they do not go: ${message}`, undecided: [], fields });
  }
  return ok({ document: read.value, unseated, remarked });
}

/** Takes the value of my side at one difference. */
function withMine(merged: SetDocument, difference: DocumentDifference, own: SetDocument): SetDocument {
  const { id, kind, pieceId = '', key = '', mine } = difference;
  switch (kind) {
    case 'parameter': {
      const pieces = merged.pieces.map((piece) =>
        piece.id === pieceId ? withPath(piece, key, mine) : piece,
      );
      return { ...merged, pieces };
    }
    case 'piece':
      return withMyPiece(merged, pieceId, difference, own.cushions);
    case 'seating': {
      const place = Number(id.slice(id.lastIndexOf(':') + 1));
      return key === 'posture'
        ? choosePosture(merged, pieceId, place, (mine as PostureChoice | undefined) ?? null)
        : withMySitter(merged, pieceId, place, mine as SitterRef | undefined);
    }
    case 'asked':
      return { ...merged, asked: withPath(merged.asked, key, mine) };
    case 'known-difference': {
      const others = merged.knownDifferences.filter(({ id }) => id !== key);
      const written = mine as SetDocument['knownDifferences'][number] | undefined;
      return { ...merged, knownDifferences: written === undefined ? others : [...others, written] };
    }
    case 'group':
      return withMyGroup(merged, key, mine as PieceGroup | undefined);
    case 'view':
      return withMyView(merged, key, mine as NamedView | undefined);
    case 'dimension':
      return withMyDimension(merged, difference);
    case 'cushion':
      return chooseCushion(merged, id.slice(id.indexOf(':') + 1, id.lastIndexOf(':')), { [key]: mine });
  }
}

/** Two groups made on both sides under one id are one group here, whichever was chosen. */
function withMyGroup(
  { groups, ...merged }: SetDocument,
  id: string,
  mine: PieceGroup | undefined,
): SetDocument {
  const others = groups?.filter((group) => group.id !== id) ?? [];
  const all = mine === undefined ? others : [...others, mine];
  return all.length === 0 ? merged : { ...merged, groups: all };
}

/** A view keeps its place in the list where both sides have it. */
function withMyView(
  { views = [], ...merged }: SetDocument,
  id: string,
  mine: NamedView | undefined,
): SetDocument {
  const isThere = views.some((view) => view.id === id);
  const others = views.flatMap((view) => (view.id !== id ? [view] : mine === undefined ? [] : [mine]));
  const all = mine === undefined || isThere ? others : [...others, mine];
  return all.length === 0 ? merged : { ...merged, views: all };
}

/** A line pinned on both sides under one id is kept twice, mine under the next free one. */
function withMyDimension(
  merged: SetDocument,
  { key, mine, changedBy, conflict }: DocumentDifference,
): SetDocument {
  const own = mine as PinnedDimension | undefined;
  if (own && changedBy === 'both' && !conflict) return pinDimension(merged, own.ends).document;
  const others = merged.dimensions?.filter(({ id }) => id !== key) ?? [];
  return withDimensions(merged, own === undefined ? others : [...others, own]);
}

/** Whoever sits there now; how they sit stays unless that differs as well. */
function withMySitter(
  merged: SetDocument,
  pieceId: string,
  place: number,
  sitter: SitterRef | undefined,
): SetDocument {
  const isThere = (seat: SetDocument['seating'][number]) => seat.pieceId === pieceId && seat.place === place;
  const others = merged.seating.filter((seat) => !isThere(seat));
  const seat = { ...merged.seating.find(isThere), pieceId, place };
  return { ...merged, seating: sitter === undefined ? others : [...others, { ...seat, sitter }] };
}

function withMyPiece(
  merged: SetDocument,
  pieceId: string,
  difference: DocumentDifference,
  cushions: SetDocument['cushions'],
): SetDocument {
  const piece = difference.mine as Piece | undefined;
  const bothAdded = difference.changedBy === 'both' && !difference.conflict;
  if (bothAdded && piece !== undefined) {
    const copy = { ...piece, id: freeId(merged, piece.mark) };
    return copyCushionChoices({ ...merged, pieces: [...merged.pieces, copy] }, pieceId, copy.id, cushions);
  }
  const others = merged.pieces.filter(({ id }) => id !== pieceId);
  if (piece === undefined) return { ...merged, pieces: others };
  return copyCushionChoices({ ...merged, pieces: [...others, piece] }, pieceId, pieceId, cushions);
}

/** Gives the next free mark to pieces of mine whose mark the other side has given as well. */
function withFreeMarks(
  merged: SetDocument,
  mine: SetDocument,
  theirs: SetDocument,
): Pick<Merge, 'document' | 'remarked'> {
  const remarked: Merge['remarked'] = [];
  let document = merged;
  for (const piece of merged.pieces) {
    const twins = document.pieces.filter(({ mark }) => mark === piece.mark);
    if (twins.length < 2) continue;
    const own = twins.find(({ id }) => !theirs.pieces.some((other) => other.id === id)) ?? twins.at(-1);
    if (own === undefined) continue;
    const to = nextMark({ ...document, pieces: [...document.pieces, ...mine.pieces] }, own.kind);
    remarked.push({ pieceId: own.id, from: own.mark, to });
    const pieces = document.pieces.map((one) => (one.id === own.id ? { ...one, mark: to } : one));
    document = { ...document, pieces };
  }
  return { document, remarked };
}

/** Keeps each person at one place, mine where both sides moved somebody, and reports who lost theirs. */
function withEveryoneOnce(merged: SetDocument, mine: SetDocument): Pick<Merge, 'document' | 'unseated'> {
  const isMine = (seat: SetDocument['seating'][number]) =>
    mine.seating.some((own) => own.pieceId === seat.pieceId && own.place === seat.place);
  const ordered = [...merged.seating].sort((a, b) => Number(isMine(b)) - Number(isMine(a)));
  const seen = new Set<string>();
  const once = ordered.filter(({ sitter }) => {
    if (sitter.kind !== 'cast') return true;
    const again = seen.has(sitter.castId);
    seen.add(sitter.castId);
    return !again;
  });
  const document = withoutLostParts({ ...merged, seating: once });
  return { document, unseated: merged.seating.filter((seat) => !document.seating.includes(seat)) };
}

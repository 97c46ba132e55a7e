import type { CushionChoice } from '../cushions/cushion-choice.ts';
import { cushionKey, cushionKeyParts } from '../cushions/cushion-key.ts';
import { cushionRuns, type CushionedPiece } from '../cushions/cushion-runs.ts';
import { mirroredShape, otherEdge } from '../cushions/mirrored-shape.ts';
import { mirroredWear } from '../cushions/wear.ts';
import type { Piece, SetDocument } from './document.ts';

type Choices = NonNullable<SetDocument['cushions']>;

/** Changes of a choice: a value to set, `undefined` to go back to what the workshop does otherwise. */
export type CushionChange = { [K in keyof CushionChoice]?: CushionChoice[K] | undefined };

const isCushioned = (piece: Piece | undefined): piece is CushionedPiece =>
  piece?.kind === 'bench' || piece?.kind === 'loose-seat';

/**
 * Whether a key can name a cushion of a set: its piece is there and carries cushions of that kind.
 *
 * @param document - the set
 * @param key - as `cushionKey` makes it
 */
export function mayHaveCushion(document: SetDocument, key: string): boolean {
  const parts = cushionKeyParts(key);
  const piece = document.pieces.find(({ id }) => id === parts?.pieceId);
  return isCushioned(piece) && (piece.kind === 'bench' || parts?.kind === 'seat');
}

/**
 * Chooses something of one cushion.
 *
 * @param document - the set
 * @param key - of the cushion; one that no piece can have changes nothing
 * @param change - what is set and what is given back
 * @returns the new set; the key is gone where nothing is chosen of it any more
 */
export function chooseCushion(document: SetDocument, key: string, change: CushionChange): SetDocument {
  if (!mayHaveCushion(document, key)) return document;
  const merged = Object.entries({ ...document.cushions?.[key], ...change });
  const chosen = Object.fromEntries(merged.filter(([, value]) => value !== undefined)) as CushionChoice;
  const { [key]: _, ...others } = document.cushions ?? {};
  return withCushionChoices(
    document,
    Object.keys(chosen).length === 0 ? others : { ...others, [key]: chosen },
  );
}

/**
 * Drops what was chosen of cushions whose piece is no longer there.
 *
 * @param document - the set
 * @returns the same object when nothing was lost
 */
export function withoutLostCushions(document: SetDocument): SetDocument {
  if (document.cushions === undefined) return document;
  const all = Object.entries(document.cushions);
  const kept = all.filter(([key]) => mayHaveCushion(document, key));
  return kept.length === all.length ? document : withCushionChoices(document, Object.fromEntries(kept));
}

/**
 * Copies what was chosen of the cushions of a piece to its copy.
 *
 * @param document - a set that holds both
 * @param from - id of the piece in `choices`
 * @param toId - the copy
 * @param choices - where the choices stand; the set itself when left out
 * @returns the new set
 */
export function copyCushionChoices(
  document: SetDocument,
  from: string,
  toId: string,
  choices: SetDocument['cushions'] = document.cushions,
): SetDocument {
  const copied = choicesOf(choices, from).map(([parts, choice]): [string, CushionChoice] => [
    cushionKey({ ...parts, pieceId: toId }),
    choice,
  ]);
  if (copied.length === 0) return document;
  const added: Choices = Object.fromEntries(copied);
  return withCushionChoices(document, { ...document.cushions, ...added });
}

/**
 * Mirrors what was chosen of the cushions of pieces: the first from the left becomes the last, left becomes right.
 *
 * @param document - the set with these pieces mirrored already
 * @param pieceIds - which
 * @returns the new set
 */
export function mirrorCushionChoices(document: SetDocument, pieceIds: ReadonlySet<string>): SetDocument {
  if (document.cushions === undefined) return document;
  const counts = new Map<string, number>();
  for (const piece of document.pieces) {
    if (!pieceIds.has(piece.id) || !isCushioned(piece)) continue;
    for (const { kind, count } of cushionRuns(piece)) counts.set(`${piece.id}/${kind}`, count);
  }
  const mirrored = Object.entries(document.cushions).map(([key, choice]): [string, CushionChoice] => {
    const parts = cushionKeyParts(key);
    if (!parts || !pieceIds.has(parts.pieceId)) return [key, choice];
    const count = counts.get(`${parts.pieceId}/${parts.kind}`) ?? 0;
    const number = parts.number <= count ? count + 1 - parts.number : parts.number;
    return [cushionKey({ ...parts, number }), mirroredChoice(choice)];
  });
  return withCushionChoices(document, Object.fromEntries(mirrored));
}

/**
 * A set with these choices; the key is absent where there are none.
 *
 * @param document - the set
 * @param cushions - all of them
 */
export function withCushionChoices(
  { cushions: _, ...document }: SetDocument,
  cushions: Choices,
): SetDocument {
  return Object.keys(cushions).length === 0 ? document : { ...document, cushions };
}

function choicesOf(choices: SetDocument['cushions'], pieceId: string) {
  return Object.entries(choices ?? {}).flatMap(([key, choice]) => {
    const parts = cushionKeyParts(key);
    return parts?.pieceId === pieceId ? [[parts, choice] as const] : [];
  });
}

function mirroredChoice(choice: CushionChoice): CushionChoice {
  const { make, shape, cameraSides, wear } = choice;
  return {
    ...choice,
    ...(make && { make: { ...make, closureEdge: otherEdge(make.closureEdge) } }),
    ...(shape && { shape: mirroredShape(shape) }),
    ...(cameraSides && { cameraSides: cameraSides.map(otherEdge) }),
    ...(wear && { wear: wear.map(mirroredWear) }),
  };
}

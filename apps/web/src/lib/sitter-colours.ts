import { leastWornColour, SITTER_COLOURS, type SetDocument, type SitterColour } from '@settlewright/geometry';

/** What a mannequin is drawn in where the colour is free. */
const MANNEQUINS: Record<string, SitterColour> = { women: 4, men: 2, children: 3 };

/** The colour of a number, whatever was stored. */
export const sitterColour = (stored: number): SitterColour =>
  SITTER_COLOURS[(Math.max(1, Math.round(stored)) - 1) % SITTER_COLOURS.length] ?? 1;

/** How a drawing or a dot is filled. */
export const sitterFill = (stored: number): string => `var(--color-sitter-${sitterColour(stored)})`;

/**
 * A colour for each place that somebody sits at. People keep the colour they have in the production; no two sitters of
 * a set share one while there are enough.
 */
export function sitterColours(
  seating: SetDocument['seating'],
  ownOf: (castId: string) => number | undefined,
): ReadonlyMap<string, SitterColour> {
  const given = new Map<string, SitterColour>();
  const worn: SitterColour[] = [];
  const give = (placeId: string, colour: SitterColour) => {
    given.set(placeId, colour);
    worn.push(colour);
  };
  const seats = seating.map(({ pieceId, place, sitter }) => {
    const own =
      sitter.kind === 'cast'
        ? ownOf(sitter.castId)
        : MANNEQUINS[sitter.kind === 'child' ? 'children' : sitter.bodyData];
    return { placeId: `${pieceId}:${place}`, person: sitter.kind === 'cast', own: own && sitterColour(own) };
  });
  // People first: a mannequin has no colour of its own to keep.
  for (const person of [true, false]) {
    for (const { placeId, own } of seats.filter((seat) => seat.person === person)) {
      if (own && !worn.includes(own)) give(placeId, own);
    }
  }
  for (const { placeId } of seats) if (!given.has(placeId)) give(placeId, leastWornColour(worn));
  return given;
}

/** Colours that tell sitters apart, in the order in which they are given out; what they look like lives with the viewer. */
export const SITTER_COLOURS = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12] as const;

/** Number of a colour. */
export type SitterColour = (typeof SITTER_COLOURS)[number];

/**
 * The colour for the next person.
 *
 * @param worn - the colours of those who have one
 * @returns the colour worn least so far, the lowest of several
 */
export function leastWornColour(worn: readonly number[]): SitterColour {
  const times = (colour: number) => worn.filter((other) => other === colour).length;
  return [...SITTER_COLOURS].sort((a, b) => times(a) - times(b) || a - b)[0] ?? 1;
}

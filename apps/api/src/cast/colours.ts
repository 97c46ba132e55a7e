const COLOURS = [1, 2, 3, 4, 5, 6] as const;

/** The colour worn least so far, the lowest of several. */
export function nextColour(worn: readonly number[]): number {
  const times = (colour: number) => worn.filter((other) => other === colour).length;
  return [...COLOURS].sort((a, b) => times(a) - times(b) || a - b)[0] ?? 1;
}

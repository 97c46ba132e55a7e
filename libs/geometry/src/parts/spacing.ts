/**
 * Evenly spaced positions from one end to the other, both ends included.
 *
 * @param fromMm - the low end
 * @param toMm - the high end
 * @param pitchMm - two neighbours are never further apart than this, > 0
 * @returns at least two positions
 */
export function positionsAlong(fromMm: number, toMm: number, pitchMm: number): number[] {
  const gaps = Math.max(1, Math.ceil((toMm - fromMm) / pitchMm));
  return Array.from({ length: gaps + 1 }, (_, i) => fromMm + ((toMm - fromMm) * i) / gaps);
}

/** So much of half its range must be missing: a range that hardly reaches over the line says nothing of room left. Shop rule. */
const SURE_SHARE = 0.75;

/**
 * Whether a negative margin may be said as a shortage without its range.
 *
 * @param margin - room to the fail line in the rule's unit; negative when missing
 * @param half - half its 90 % range, same unit; 0 where nothing was predicted
 * @returns false for room left, and where the range reaches well over the line
 * @source shop rule
 */
export const isSureOfShort = (margin: number, half: number): boolean =>
  margin < 0 && -margin >= SURE_SHARE * half;

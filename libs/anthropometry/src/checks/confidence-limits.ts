/**
 * What a workshop may ask of a verdict instead of the rule book's probability, in steps of a hundredth.
 * Above one half, so that a seat cannot be said to fit and not to fit at once; below one, because the far
 * ends of a surveyed group are too thin to tell one in a thousand.
 */
export const CONFIDENCE_LIMITS = { lowest: 0.51, highest: 0.99, decimals: 2 } as const;

import { MM_PER_INCH } from '../units/length-style.ts';

/** Width and height, millimetres. */
interface Size {
  widthMm: number;
  heightMm: number;
}

/** How the cloth of tufts is measured out. */
export const FULLNESS_RULES = {
  'foam-thickness': {
    words: 'a foam thickness at each end of a diamond',
    source: 'published source',
  },
  'half-again': {
    words: '1 1/2 of cloth for every 1 of panel, and 1 in all round',
    source: 'published source',
  },
} as const;

export type FullnessRule = keyof typeof FULLNESS_RULES;

/** Diamonds that fill a field within a border exactly. */
export interface BorderedField {
  across: number;
  high: number;
  diamond: Size;
  field: Size;
}

/**
 * Whole diamonds in a field that a border leaves, as near to a wanted size as whole numbers allow.
 *
 * @param panel - the cushion's face
 * @param borderMm - left free all round
 * @param wanted - diamond, taller than wide as a rule
 * @returns how many, and their true size; the middle of the field is a diamond, not a button, when both are even
 * @source deep tufting article: 42 x 31 in with a border of 4 gives 34 x 23 and 4 x 2 diamonds of 8 1/2 x 11 1/2
 */
export function borderedField(panel: Size, borderMm: number, wanted: Size): BorderedField {
  const field = { widthMm: panel.widthMm - 2 * borderMm, heightMm: panel.heightMm - 2 * borderMm };
  const whole = (size: number, one: number): number => (size > 0 ? Math.max(1, Math.round(size / one)) : 0);
  const across = whole(field.widthMm, wanted.widthMm);
  const high = whole(field.heightMm, wanted.heightMm);
  return {
    across,
    high,
    field,
    diamond: {
      widthMm: across > 0 ? field.widthMm / across : 0,
      heightMm: high > 0 ? field.heightMm / high : 0,
    },
  };
}

/**
 * Cloth of one diamond, with what it needs to go down between its buttons.
 *
 * @param diamond - on the finished face
 * @param foamMm - thickness that the buttons pull in
 * @returns cloth between the same buttons
 * @source published tufting guide: 2 in of foam, 8 x 5 in diamonds, 12 x 9 in of cloth
 */
export function diamondCloth(diamond: Size, foamMm: number): Size {
  return { widthMm: diamond.widthMm + 2 * foamMm, heightMm: diamond.heightMm + 2 * foamMm };
}

const ALL_ROUND_MM = MM_PER_INCH;

/**
 * Cloth of a tufted panel by one of the named rules.
 *
 * @param panel - finished
 * @param rule - by which fullness is given
 * @param tufts - diamonds in the panel and the thickness they pull in; used by `foam-thickness`
 * @returns size to cut before tufting
 * @source `half-again`: Stephenson, Cutting and Draping: 12 x 18 in of panel take 18 x 27, with 1 in all round 20 x 29;
 * `foam-thickness`: as `diamondCloth`
 */
export function tuftedCloth(
  panel: Size,
  rule: FullnessRule,
  tufts: { across: number; high: number; foamMm: number },
): Size {
  if (rule === 'half-again') {
    return {
      widthMm: 1.5 * panel.widthMm + 2 * ALL_ROUND_MM,
      heightMm: 1.5 * panel.heightMm + 2 * ALL_ROUND_MM,
    };
  }
  return {
    widthMm: panel.widthMm + 2 * tufts.foamMm * tufts.across,
    heightMm: panel.heightMm + 2 * tufts.foamMm * tufts.high,
  };
}

/** A button from the lower left corner of the field. */
export type ButtonSpot = readonly [xMm: number, yMm: number];

/**
 * Buttons of a field: of diamonds in rows half a diamond apart, every other row set over by half; of biscuits at every
 * corner.
 *
 * @param field - how many and how large
 * @param pattern - diamond or biscuit
 * @returns spots row by row from below, each from the left; both ends of the field included
 */
export function fieldButtons(
  { across, high, diamond }: BorderedField,
  pattern: 'diamond' | 'biscuit',
): ButtonSpot[] {
  const { widthMm, heightMm } = diamond;
  const even = Array.from({ length: across + 1 }, (_, i) => i * widthMm);
  const odd = Array.from({ length: across }, (_, i) => (i + 0.5) * widthMm);
  if (pattern === 'biscuit') {
    return Array.from({ length: high + 1 }, (_, row) =>
      even.map((x): ButtonSpot => [x, row * heightMm]),
    ).flat();
  }
  return Array.from({ length: 2 * high + 1 }, (_, row) =>
    (row % 2 === 0 ? even : odd).map((x): ButtonSpot => [x, (row * heightMm) / 2]),
  ).flat();
}

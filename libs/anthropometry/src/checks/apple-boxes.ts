import { ruleNumber, type Rule } from './rule-book.ts';

/** The sizes of an apple box, tallest first. */
const APPLE_BOX_SIZES = ['full', 'half', 'quarter', 'pancake'] as const;
type AppleBoxSize = (typeof APPLE_BOX_SIZES)[number];

/** How many of each size are at hand. */
export type AppleBoxes = Readonly<Record<AppleBoxSize, number>>;

/** Boxes stacked under a seat or a foot. */
export interface BoxStack {
  boxes: AppleBoxes;
  heightMm: number;
}

const NONE: AppleBoxes = { full: 0, half: 0, quarter: 0, pancake: 0 };

/** Boxes closer to the wanted height than this are as good as each other, millimetres. */
const AS_GOOD_MM = 1e-6;

/**
 * The stack of apple boxes nearest to a wanted height: every combination of those at hand is tried. Of stacks as near
 * as each other the one with the fewest boxes stands, then the lower.
 *
 * @param rule - HEAD-04, for the heights of the boxes
 * @param atHand - how many of each size there are; whole, >= 0
 * @param wantedMm - height asked for; finite, >= 0
 * @returns the stack, empty when nothing comes nearer than the floor
 * @source sizes as in rule HEAD-04
 */
export function nearestStack(rule: Rule, atHand: AppleBoxes, wantedMm: number): BoxStack {
  let best: BoxStack = { boxes: NONE, heightMm: 0 };
  const tryFrom = (index: number, stack: BoxStack): void => {
    const size = APPLE_BOX_SIZES[index];
    if (size === undefined) {
      if (isBetter(stack, best, wantedMm)) best = stack;
      return;
    }
    const each = ruleNumber(rule, size);
    for (let count = 0; count <= atHand[size]; count += 1) {
      const heightMm = stack.heightMm + count * each;
      tryFrom(index + 1, { boxes: { ...stack.boxes, [size]: count }, heightMm });
      // Every further box only leads further past the wanted height.
      if (heightMm > wantedMm) break;
    }
  };
  tryFrom(0, best);
  return best;
}

function isBetter(one: BoxStack, other: BoxStack, wantedMm: number): boolean {
  const nearer = Math.abs(other.heightMm - wantedMm) - Math.abs(one.heightMm - wantedMm);
  if (Math.abs(nearer) > AS_GOOD_MM) return nearer > 0;
  const fewer = boxCount(other) - boxCount(one);
  return fewer === 0 ? one.heightMm < other.heightMm : fewer > 0;
}

const boxCount = ({ boxes }: BoxStack): number => APPLE_BOX_SIZES.reduce((sum, size) => sum + boxes[size], 0);

const SIZE_WORDS: Record<AppleBoxSize, string> = {
  full: 'full apple',
  half: 'half apple',
  quarter: 'quarter apple',
  pancake: 'pancake',
};

/**
 * A stack in plain words.
 *
 * @param stack - from `nearestStack`
 * @returns such as "half apple and pancake", "2 full apples", or "no box"
 */
export function stackWords({ boxes }: BoxStack): string {
  const parts = APPLE_BOX_SIZES.filter((size) => boxes[size] > 0).map((size) =>
    boxes[size] === 1 ? SIZE_WORDS[size] : `${boxes[size]} ${SIZE_WORDS[size]}s`,
  );
  if (parts.length < 2) return parts[0] ?? 'no box';
  return `${parts.slice(0, -1).join(', ')} and ${parts.at(-1) ?? ''}`;
}

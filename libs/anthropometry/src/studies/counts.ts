import type { MeasureKey } from '../measures/measures.ts';

/** The sexes are counted apart and put together only where shares are shown. */
export type Group = 'women' | 'men';

export const GROUPS: readonly Group[] = ['women', 'men'];

/** People counted, by sex. */
export type Tally = Record<Group, number>;

/** Counts both sexes. */
export const tallyOf = (count: (group: Group) => number): Tally => ({
  women: count('women'),
  men: count('men'),
});

/** How many fit, and how many of all fit or are tight. */
export interface FitTally {
  fits: Tally;
  atLeastTight: Tally;
  /** True when a measure that is read is not known of these people; then nobody is counted as fitting. */
  unknown: boolean;
  /** Why nothing is asked here; then nobody is counted. */
  silent?: string;
}

/** One rule at one place. */
export interface CellCount extends FitTally {
  placeId: string;
  ruleId: string;
}

/** One ticked rule at all ticked places together. */
export interface CheckCount extends FitTally {
  ruleId: string;
  /** True when one may be on either side of what the set offers: too small or too large for it. */
  twoSided: boolean;
  /** People who fit this rule and another one, by its id; each pair stands once, with the earlier rule. */
  fitsWith: Record<string, Tally>;
  /** Sums over those who fit, in tenths of a millimetre or kilogram, for the measures that tell who is lost. */
  sums: Partial<Record<MeasureKey, Tally>>;
}

/** Counts with every cushion at one end of how far it may go down. */
export interface EndCounts {
  places: (FitTally & { placeId: string })[];
  checks: (FitTally & { ruleId: string })[];
  all: FitTally;
}

/** What one part of a study counted: plain numbers that add up, whoever counted them. */
export interface PartialStudy {
  /** Numbers of the blocks of people, rising. */
  blocks: number[];
  /** Tells studies of different sets, rules or ticks apart. */
  question: string;
  people: Tally;
  cells: CellCount[];
  /** Ticked rules together at each ticked place. */
  places: (FitTally & { placeId: string })[];
  checks: CheckCount[];
  /** Ticked rules together at all ticked places. */
  all: FitTally;
  /** Sums over everyone, in tenths and square tenths. */
  everyone: Partial<Record<MeasureKey, { sum: Tally; squares: Tally }>>;
  /** The same with cushions that go down least and most; absent where it was not asked for or nobody sits on foam. */
  overDrop?: Record<DropEnd, EndCounts>;
}

/** Ends of the 90 % range of a drop. */
export type DropEnd = 'least' | 'most';

/**
 * Puts the parts of one study together. Every number is whole, so the order does not matter.
 *
 * @param partials - parts of the same question over different blocks; at least one
 * @returns the whole; without the range of the drop where a part was counted without it
 * @throws RangeError when there is none, a block comes twice or the parts answer different questions
 */
export function mergePartials(partials: readonly PartialStudy[]): PartialStudy {
  const [first, ...rest] = partials;
  if (!first) throw new RangeError('No part of a study was given; accepted: at least one');
  const blocks = partials.flatMap((partial) => partial.blocks).sort((a, b) => a - b);
  const twice = blocks.find((block, at) => block === blocks[at - 1]);
  if (twice !== undefined) throw new RangeError(`Block ${twice} comes twice; accepted: each once`);
  const stranger = rest.find(({ question }) => question !== first.question);
  if (stranger) {
    throw new RangeError(`Questions ${first.question} and ${stranger.question} differ; accepted: one`);
  }
  const hasDrop = partials.every(({ overDrop }) => overDrop);
  const parts = hasDrop ? partials : partials.map(({ overDrop: _, ...part }): PartialStudy => part);
  return { ...parts.slice(1).reduce(added, parts[0] as PartialStudy), blocks };
}

/** Adds the numbers of two things of one shape. */
export function added<Shape>(a: Shape, b: Shape): Shape {
  if (typeof a === 'number') return (a + (b as number)) as Shape;
  if (Array.isArray(a)) return a.map((one: unknown, at) => added(one, (b as unknown[])[at])) as Shape;
  if (typeof a !== 'object' || a === null) return a;
  return Object.fromEntries(
    Object.entries(a).map(([key, one]) => [key, added(one, (b as Record<string, unknown>)[key])]),
  ) as Shape;
}

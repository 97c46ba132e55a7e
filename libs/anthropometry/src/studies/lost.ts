import { TENTHS } from './bits.ts';
import { MEASURE_INFO } from '../measures/measure-info.ts';
import type { MeasureKey } from '../measures/measures.ts';
import { GROUPS, type CheckCount, type PartialStudy, type Tally } from './counts.ts';

/** How those who do not fit differ from the rest in one measure. */
export interface LostTrait {
  measure: MeasureKey;
  /** Means, millimetres (kilograms for weight). */
  lostMean: number;
  restMean: number;
  /** Difference of the means in standard deviations of everyone. */
  apart: number;
  /** "short", "heavy", "small elbow rest"; nothing where they hardly differ. */
  word?: string;
}

/** Those who do not fit a rule. */
export interface Lost {
  /** 0 to 1. */
  share: number;
  /** Share of women among them, 0 to 1. */
  women: number;
  traits: LostTrait[];
  /** "short and light, mostly women". */
  words: string;
}

/** Half a standard deviation: from here a difference is told in words. */
const TOLD_APART = 0.5;
/** So much more of one sex than among everyone is told in words. */
const TOLD_SHARE = 0.2;

/**
 * Share of people who do not fit.
 *
 * @param fits - people who fit
 * @param people - people drawn
 * @param weights - of the sexes, adding to 1
 */
export function mixedLost(fits: Tally, people: Tally, weights: Tally): number {
  let lost = 0;
  for (const group of GROUPS) {
    if (people[group] > 0) lost += weights[group] * (1 - fits[group] / people[group]);
  }
  return lost;
}

/**
 * Who does not fit a rule, against the rest.
 *
 * @param check - counts of the rule
 * @param counts - of the whole study
 * @param weights - of the sexes, adding to 1
 * @returns nothing when nobody is lost or the rule could not be counted
 */
export function lostBy(check: CheckCount, counts: PartialStudy, weights: Tally): Lost | undefined {
  const { people } = counts;
  const share = check.unknown ? 0 : mixedLost(check.fits, people, weights);
  if (share === 0) return undefined;
  /** Weight of one person of a sex. */
  const each = (group: keyof Tally): number => (people[group] > 0 ? weights[group] / people[group] : 0);
  const mixed = (tally: Tally): number => GROUPS.reduce((sum, group) => sum + each(group) * tally[group], 0);
  const women = (each('women') * (people.women - check.fits.women)) / share;
  const traits: LostTrait[] = [];
  for (const [key, fitSums] of Object.entries(check.sums) as [MeasureKey, Tally][]) {
    const all = counts.everyone[key];
    if (!all) continue;
    const mean = mixed(all.sum);
    const sd = Math.sqrt(Math.max(0, mixed(all.squares) - mean * mean));
    const lostMean = (mean - mixed(fitSums)) / share;
    const restMean = share < 1 ? mixed(fitSums) / (1 - share) : mean;
    const apart = sd > 0 ? (lostMean - restMean) / sd : 0;
    const word = Math.abs(apart) >= TOLD_APART ? wordFor(key, apart) : undefined;
    traits.push({
      measure: key,
      lostMean: lostMean / TENTHS,
      restMean: restMean / TENTHS,
      apart,
      ...(word ? { word } : {}),
    });
  }
  return { share, women, traits, words: wordsFor(traits, check.twoSided, women, weights) };
}

const OWN_WORDS: Partial<Record<MeasureKey, [low: string, high: string]>> = {
  stature: ['short', 'tall'],
  weight_kg: ['light', 'heavy'],
};

function wordFor(key: MeasureKey, apart: number): string {
  const { plain } = MEASURE_INFO[key];
  const [low, high] = OWN_WORDS[key] ?? [`small ${plain}`, `large ${plain}`];
  return apart < 0 ? low : high;
}

function wordsFor(traits: readonly LostTrait[], twoSided: boolean, women: number, weights: Tally): string {
  const words = traits.flatMap(({ word }) => (word ? [word] : []));
  const own = traits.find(({ measure }) => !OWN_WORDS[measure]);
  if (words.length === 0 && twoSided && own) {
    words.push(`small or large ${MEASURE_INFO[own.measure].plain}`);
  }
  const told = words.length > 1 ? `${words.slice(0, -1).join(', ')} and ${words.at(-1)}` : words[0];
  return [told, sexWords(women, weights)].filter(Boolean).join('; ') || 'no one kind of body';
}

function sexWords(women: number, weights: Tally): string | undefined {
  if (women >= 0.5 && women - weights.women >= TOLD_SHARE) return 'mostly women';
  if (women <= 0.5 && weights.women - women >= TOLD_SHARE) return 'mostly men';
  return undefined;
}

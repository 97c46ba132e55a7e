import type { Practice, RuleBook } from '@settlewright/anthropometry';
import { MM_PER_INCH, type LengthStyle } from '../units/length-style.ts';
import { kindOf, SEAT_AND_TABLES, type Dimension } from './dimension.ts';
import { dimensionValue, markWords } from './dimension-words.ts';
import type { StoryStick } from './story-stick.ts';
import type { Stretch } from './stretches.ts';

/** A range that stands over the tape and decides no sitter's verdict. */
export interface StickBand {
  /** Stands beside the range. */
  name: string;
  /** The whole sentence, with where it comes from. */
  words: string;
  stretches: Stretch[];
}

/** Practices are kept by the kind of number they are about. */
function practiceOf(ruleBook: RuleBook, dimension: Pick<Dimension, 'id'>): Practice | undefined {
  const kind = kindOf(dimension);
  return ruleBook.practices.find(({ id }) => id === (kind === SEAT_AND_TABLES ? 'seat-height' : kind));
}

/**
 * What is usual, and what code clauses ask of pieces that are marked accessible.
 *
 * @param stick - the stick
 * @param ruleBook - practices and where rules come from
 * @param style - how lengths are shown
 * @returns ranges in the dimension's unit, cut to the values that were tried
 */
export function stickBands(
  { dimension, clauses, values }: Pick<StoryStick, 'dimension' | 'clauses' | 'values'>,
  ruleBook: RuleBook,
  style: LengthStyle,
): StickBand[] {
  const [least = 0, most = 0] = [values[0], values.at(-1)];
  const show = (value: number) => dimensionValue(value, dimension.unit, style);
  const bands: StickBand[] = [];
  const practice = practiceOf(ruleBook, dimension);
  if (practice) {
    const [from, to] = [practice.lowerIn * MM_PER_INCH, practice.upperIn * MM_PER_INCH];
    bands.push({
      name: 'usual',
      words: `Usual: ${show(from)} to ${show(to)}, mostly ${show(practice.usualIn * MM_PER_INCH)} (${practice.sourceWord}: ${practice.source}).`,
      stretches: cut({ from, to }, least, most),
    });
  }
  for (const { ruleId, clause, marks, inside } of clauses) {
    const ranges = inside.map(({ from, to }) => `${show(from)} to ${show(to)}`).join(' and ');
    bands.push({
      name: `clause ${clause}, ${markWords(marks)}`,
      words: `Inside clause ${clause} for ${markWords(marks)}: ${ranges || 'nowhere here'} (${ruleBook.rule(ruleId).sourceWord}).`,
      stretches: inside,
    });
  }
  return bands;
}

function cut({ from, to }: Stretch, least: number, most: number): Stretch[] {
  const inside = { from: Math.max(from, least), to: Math.min(to, most) };
  return inside.from < inside.to ? [inside] : [];
}

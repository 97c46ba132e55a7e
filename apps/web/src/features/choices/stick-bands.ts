import { MM_PER_INCH } from '@settlewright/geometry';
import type { Practice, RuleBook } from '@settlewright/anthropometry';
import type { LengthStyle, StoryStick, Stretch } from '@settlewright/geometry';
import { dimensionValue, markWords } from '@/lib/dimension-words.ts';

/** A range that stands over the tape and decides no sitter's verdict. */
export interface StickBand {
  /** Stands beside the range. */
  name: string;
  /** The whole sentence, with where it comes from. */
  words: string;
  stretches: Stretch[];
}

/** Practices are kept by the kind of number they are about. */
function practiceOf(ruleBook: RuleBook, dimensionId: string): Practice | undefined {
  const kind = dimensionId === 'seat-and-tables' ? 'seat-height' : dimensionId.split('|')[0];
  return ruleBook.practices.find(({ id }) => id === kind);
}

/** What is usual, and what code clauses ask of pieces that are marked accessible. */
export function stickBands(
  { dimension, clauses, values }: StoryStick,
  ruleBook: RuleBook,
  style: LengthStyle,
): StickBand[] {
  const [least = 0, most = 0] = [values[0], values.at(-1)];
  const show = (value: number) => dimensionValue(value, dimension.unit, style);
  const bands: StickBand[] = [];
  const practice = practiceOf(ruleBook, dimension.id);
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

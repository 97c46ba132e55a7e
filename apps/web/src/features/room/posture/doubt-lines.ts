import { MEASURE_INFO, type Body, type MeasureKey } from '@settlewright/anthropometry';
import { formatLength, formatMass, type BodyRange, type LengthStyle } from '@settlewright/geometry';

const asSentence = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** What is in doubt of a body, the widest range first: "Sitting height 33½″ to 36¾″"; weight stands last. */
export function doubtLines(range: BodyRange, style: LengthStyle): { key: MeasureKey; words: string }[] {
  return range.uncertain
    .map((key) => ({ key, low: range.smaller[key] ?? 0, high: range.larger[key] ?? 0 }))
    .sort((a, b) => widthOf(b) - widthOf(a))
    .map(({ key, low, high }) => {
      const say = (value: number): string =>
        key === 'weight_kg' ? formatMass(value, style) : formatLength(value, style);
      return { key, words: `${asSentence(MEASURE_INFO[key].plain)} ${say(low)} to ${say(high)}` };
    });
}

const widthOf = ({ key, low, high }: { key: MeasureKey; low: number; high: number }): number =>
  key === 'weight_kg' ? 0 : high - low;

/** What stands where nothing is in doubt. */
export const sayCertain = (belief: Pick<Body, 'person'> | undefined): string =>
  belief?.person.exact ? 'A mannequin of one size, nothing in doubt.' : 'Measured, nothing in doubt.';

import { Measure, splitFractions } from '@/components/measure.tsx';

const isLength = (word: string): boolean => splitFractions(word).some(({ fraction }) => fraction);

/** A sentence whose lengths have real fractions and are never parted. */
export function Sentence({ text }: { text: string }) {
  return text.split(/(\S+)/).map((word, n) => (isLength(word) ? <Measure key={n} text={word} /> : word));
}

import { useFormat } from '@/lib/format.ts';
import { Measure } from './measure.tsx';

interface LengthProps {
  mm: number;
  /** Feet and inches from a foot on: for people and lengths of pieces. */
  feet?: boolean;
}

/** A length in the reader's units, with real fractions and its words for a screen reader. */
export function Length({ mm, feet }: LengthProps) {
  const format = useFormat();
  return <Measure text={format.length(mm, { feet })} spoken={format.spoken(mm, { feet })} />;
}

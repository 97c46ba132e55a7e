import { useState } from 'react';
import { LengthField } from '@/components/length-field.tsx';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';

interface TakenLengthProps {
  label: string;
  valueMm: number;
  minMm: number;
  maxMm: number;
  description?: string;
  onTake: (mm: number) => void;
}

/** A length that is taken when the field is left, so that typing is one step. */
export function TakenLength({ valueMm, onTake, ...field }: TakenLengthProps) {
  const [typed, setTyped] = useState<QuantityEntry | null>(null);
  const entry = typed ?? entryOf(valueMm);
  return (
    <LengthField
      {...field}
      entry={entry}
      error={entry.problem}
      onChange={setTyped}
      onBlur={() => {
        if (!typed || typed.problem) return;
        setTyped(null);
        if (typed.value !== null && Math.abs(typed.value - valueMm) > 1e-6) onTake(typed.value);
      }}
    />
  );
}

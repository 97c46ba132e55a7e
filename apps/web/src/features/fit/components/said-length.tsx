import { useState } from 'react';
import { LengthField } from '@/components/length-field.tsx';
import type { QuantityEntry } from '@/components/quantity-entry.ts';

interface SaidLengthProps {
  label: string;
  valueMm: number | undefined;
  minMm?: number;
  maxMm: number;
  /** Whether the field may be left empty, to take back what was said. */
  optional?: boolean;
  onSay: (valueMm: number | undefined) => void;
}

function Field({ label, valueMm, minMm = 0, maxMm, optional = false, onSay }: SaidLengthProps) {
  const [entry, setEntry] = useState<QuantityEntry>({ value: valueMm ?? null });
  return (
    <LengthField
      label={label}
      optional={optional}
      entry={entry}
      error={entry.problem}
      minMm={minMm}
      maxMm={maxMm}
      onChange={setEntry}
      onBlur={() => {
        const said = entry.value ?? undefined;
        if (entry.problem !== undefined || said === valueMm) return;
        if (said !== undefined || optional) onSay(said);
        else setEntry({ value: valueMm ?? null });
      }}
    />
  );
}

/** A length that is said when the field is left, and follows when it changes elsewhere. */
export function SaidLength(props: SaidLengthProps) {
  return <Field key={props.valueMm ?? 'none'} {...props} />;
}

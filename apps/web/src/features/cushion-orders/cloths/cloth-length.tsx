import type { ReactNode } from 'react';
import { LengthField } from '@/components/length-field.tsx';
import type { ClothDraft, LengthKey } from './cloth-draft.ts';

export interface ClothFieldsProps {
  draft: ClothDraft;
  faults: Record<string, string>;
  /** "yard" or "metre" */
  per: string;
  onChange: (change: Partial<ClothDraft>) => void;
}

/** A length of a cloth, never in feet. */
export function ClothLength({
  at,
  path,
  range: [minMm, maxMm],
  draft,
  faults,
  onChange,
  ...words
}: Omit<ClothFieldsProps, 'per'> & {
  at: LengthKey;
  path: string;
  range: [number, number];
  label: string;
  description?: ReactNode;
}) {
  const entry = draft.lengths[at];
  return (
    <LengthField
      {...words}
      {...{ entry, minMm, maxMm }}
      feet={false}
      error={entry.problem ?? faults[path]}
      onChange={(next) => onChange({ lengths: { ...draft.lengths, [at]: next } })}
    />
  );
}

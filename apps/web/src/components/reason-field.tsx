import type { Ref } from 'react';
import { TextArea } from './text-field.tsx';

interface ReasonFieldProps {
  value: string;
  /** Said where a reason is asked for and none is given. */
  error?: string;
  optional?: boolean;
  /** What the reason stands behind; the list of known differences when absent. */
  behind?: string;
  onChange: (reason: string) => void;
  ref?: Ref<HTMLTextAreaElement>;
}

/** What is said where a choice against a check is kept and nothing tells why. */
export const REASON_MISSING = 'Say why it is kept.';

/** Why a choice is kept knowingly: the same words wherever the known differences grow. */
export function ReasonField({ value, error, optional, behind, onChange, ref }: ReasonFieldProps) {
  return (
    <TextArea
      ref={ref}
      label="Why it is kept"
      optional={optional}
      error={error}
      description={`Stands ${behind ? `behind “${behind}”` : 'in the known differences'}, with your name and today’s date.`}
      placeholder="For example: the photograph shows it, and the camera sees it."
      value={value}
      maxLength={1000}
      rows={2}
      onChange={(event) => onChange(event.target.value)}
    />
  );
}

import { useRef, useState, type Ref } from 'react';
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

/** A reason that has to be given: the field asks for it where it is missing once somebody wants to go on. */
export function useReason() {
  const [reason, setReason] = useState('');
  const [asked, setAsked] = useState(false);
  const ref = useRef<HTMLTextAreaElement>(null);
  const given = reason.trim();
  return {
    field: {
      ref,
      value: reason,
      error: asked && given === '' ? 'Say why it is kept.' : undefined,
      onChange: setReason,
    } satisfies ReasonFieldProps,
    /** The reason, which leaves the field empty; without one nothing, and the field is pointed out. */
    take: (): string | undefined => {
      setAsked(given === '');
      if (given === '') {
        ref.current?.focus();
        return undefined;
      }
      setReason('');
      return given;
    },
  };
}

import type { ReactNode, Ref } from 'react';
import { useState } from 'react';
import { classNames } from './class-names.ts';
import { FIELD_LINE, FieldFrame, type FieldWords } from './field-frame.tsx';
import { typedForm } from './measure.tsx';
import type { QuantityEntry } from './quantity-entry.ts';

export type Reading =
  | { ok: true; value: number }
  | { ok: false; message: string; offers?: { value: number; words: ReactNode }[] };

export interface QuantityFieldProps extends FieldWords {
  entry: QuantityEntry;
  onChange: (entry: QuantityEntry) => void;
  onBlur?: () => void;
  /** How the value stands in the field at rest. */
  show: (value: number) => string;
  read: (text: string) => Reading;
  /** Both units, in words, under the field. */
  echo?: (value: number) => ReactNode;
  /** One press of an arrow key. */
  step: number;
  placeholder?: string;
  name?: string;
  ref?: Ref<HTMLInputElement>;
}

/**
 * A number with a unit, typed however it comes. Until somebody types, the value keeps all its digits:
 * what is shown is rounded, what is stored is not.
 */
export function QuantityField({
  entry,
  onChange,
  onBlur,
  show,
  read,
  echo,
  step,
  placeholder,
  name,
  ref,
  error,
  description,
  optional,
  ...words
}: QuantityFieldProps) {
  const [typed, setTyped] = useState<string | null>(null);
  const [offers, setOffers] = useState<{ value: number; words: ReactNode }[]>([]);
  const shown = typed ?? (entry.value === null ? '' : typedForm(show(entry.value)));

  const take = (text: string) => {
    setTyped(text);
    setOffers([]);
    if (text.trim() === '') {
      onChange({ value: null });
      return;
    }
    const reading = read(text);
    if (reading.ok) onChange({ value: reading.value });
    else {
      setOffers(reading.offers ?? []);
      onChange({ value: entry.value, problem: reading.message });
    }
  };

  const choose = (value: number) => {
    setTyped(null);
    setOffers([]);
    onChange({ value });
  };

  return (
    <FieldFrame
      {...words}
      optional={optional && 'if known'}
      error={error}
      description={
        <>
          {offers.length > 0 && (
            <span className="mb-1.5 flex flex-wrap gap-2">
              {offers.map((offer) => (
                <button
                  key={offer.value}
                  type="button"
                  onClick={() => choose(offer.value)}
                  className="quick min-h-8 rounded-sm border-[1.25px] border-rule-strong px-2.5 text-sm font-medium text-ink hover:border-ink hover:bg-sunk"
                >
                  {offer.words}
                </button>
              ))}
            </span>
          )}
          {entry.value !== null && entry.problem === undefined && echo ? echo(entry.value) : description}
        </>
      }
    >
      {(control) => (
        <input
          {...control}
          ref={ref}
          name={name}
          value={shown}
          placeholder={placeholder}
          inputMode="text"
          autoComplete="off"
          spellCheck={false}
          className={classNames(FIELD_LINE, 'h-12')}
          onChange={(event) => take(event.target.value)}
          onBlur={() => {
            if (entry.problem === undefined) setTyped(null);
            onBlur?.();
          }}
          onKeyDown={(event) => {
            if (entry.value === null || (event.key !== 'ArrowUp' && event.key !== 'ArrowDown')) return;
            event.preventDefault();
            const size = step * (event.shiftKey ? 8 : 1) * (event.altKey ? 0.5 : 1);
            const value = entry.value + (event.key === 'ArrowUp' ? size : -size);
            if (value >= 0) choose(value);
          }}
        />
      )}
    </FieldFrame>
  );
}

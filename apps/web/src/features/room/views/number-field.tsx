import { useId, useState } from 'react';
import { TextField } from '@/components/text-field.tsx';

interface Props {
  label: string;
  unit: string;
  value: number;
  min: number;
  max: number;
  /** Usual values, offered while typing. */
  offers?: readonly number[];
  onCommit: (value: number) => void;
}

const shown = (value: number): string => String(Number(value.toFixed(2)));

/** A plain number of one unit, taken by Enter or on leaving the field; what cannot be taken is said and changes nothing. */
export function NumberField({ label, unit, value, min, max, offers, onCommit }: Props) {
  const list = useId();
  const [typed, setTyped] = useState<string | null>(null);
  const [error, setError] = useState<string>();
  const take = () => {
    if (typed === null) return;
    const read = Number(typed.replace(unit, '').replace(',', '.').replace('−', '-').trim() || NaN);
    if (!Number.isFinite(read) || read < min || read > max) {
      setError(`“${typed.trim()}” cannot be taken; ${shown(min)} to ${shown(max)} ${unit} is.`);
      return;
    }
    setTyped(null);
    setError(undefined);
    if (read !== value) onCommit(read);
  };
  return (
    <>
      <TextField
        label={`${label}, ${unit}`}
        value={typed ?? shown(value)}
        error={error}
        inputMode="decimal"
        autoComplete="off"
        list={offers && list}
        onChange={(event) => setTyped(event.target.value)}
        onBlur={take}
        onKeyDown={(event) => {
          if (event.key === 'Enter') take();
          else if (event.key === 'Escape') {
            setTyped(null);
            setError(undefined);
          }
        }}
      />
      {offers && (
        <datalist id={list}>
          {offers.map((offer) => (
            <option key={offer} value={offer} />
          ))}
        </datalist>
      )}
    </>
  );
}

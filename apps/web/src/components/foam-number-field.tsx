import { foamNumber, foamUnit, fromFoamNumber } from '@settlewright/geometry';
import { useFormat } from '@/lib/format.ts';
import type { FieldWords } from './field-frame.tsx';
import type { QuantityEntry } from './quantity-entry.ts';
import { QuantityField, type Reading } from './quantity-field.tsx';

interface FoamNumberFieldProps extends FieldWords {
  /** A factor has no unit. */
  what: 'density' | 'firmness' | 'factor';
  entry: QuantityEntry;
  onChange: (entry: QuantityEntry) => void;
  /** In kilograms per cubic metre, newtons or times. */
  min: number;
  max: number;
}

const DIGITS = { density: 1, firmness: 0, factor: 2 } as const;

/** Density, firmness or support factor of a foam, in the units of the page. */
export function FoamNumberField({ what, entry, min, max, ...field }: FoamNumberFieldProps) {
  const { style } = useFormat();
  const shown = (value: number) => (what === 'factor' ? value : foamNumber(what, value, style));
  const unit = what === 'factor' ? '' : `\u202f${foamUnit(what, style)}`;
  const words = (value: number) => `${Number(shown(value).toFixed(DIGITS[what]))}${unit}`;
  const read = (text: string): Reading => {
    const [, digits] = /^\s*(\d+(?:[.,]\d+)?)\s*(?:[a-z/³²0-9]*)\s*$/i.exec(text) ?? [];
    const number = digits === undefined ? NaN : Number(digits.replace(',', '.'));
    const value = what === 'factor' ? number : fromFoamNumber(what, number, style);
    // The ends are shown rounded: typed back they are taken.
    const [least, most] = [min - 1e-9, max + 1e-9];
    if (value >= least && value <= most) return { ok: true, value };
    const range = `${words(min)} to ${words(max)} is taken`;
    return { ok: false, message: `${Number.isNaN(number) ? 'A number' : range}; read “${text.trim()}”.` };
  };
  return (
    <QuantityField
      {...field}
      entry={entry}
      show={words}
      read={read}
      step={what === 'factor' ? 0.1 : what === 'density' ? 1 : 5}
      error={field.error ?? entry.problem}
    />
  );
}

import { formatMass, KG_PER_POUND, parseMass } from '@settlewright/geometry';
import type { Ref } from 'react';
import { useFormat } from '@/lib/format.ts';
import type { FieldWords } from './field-frame.tsx';
import type { QuantityEntry } from './quantity-entry.ts';
import { QuantityField, type Reading } from './quantity-field.tsx';

interface MassFieldProps extends FieldWords {
  entry: QuantityEntry;
  onChange: (entry: QuantityEntry) => void;
  onBlur?: () => void;
  minKg: number;
  maxKg: number;
  name?: string;
  ref?: Ref<HTMLInputElement>;
}

/** A weight in pounds or kilograms, read back in both. */
export function MassField({ minKg, maxKg, ...field }: MassFieldProps) {
  const format = useFormat();
  const metric = format.bareMass === 'kg';
  const other = { system: metric ? 'feet-inches' : 'millimetres', roundTo: 8 } as const;

  const read = (text: string): Reading => {
    const reading = parseMass(text, format.bareMass);
    if (!reading.ok) return { ok: false, message: reading.error.message };
    if (reading.value < minKg || reading.value > maxKg) {
      const range = `${format.mass(minKg)} to ${format.mass(maxKg)}`;
      return {
        ok: false,
        message: `“${text.trim()}” reads as ${format.mass(reading.value)}; ${range} is taken.`,
      };
    }
    return { ok: true, value: reading.value };
  };

  return (
    <QuantityField
      {...field}
      show={format.mass}
      read={read}
      step={metric ? 1 : KG_PER_POUND}
      echo={(kg) => `${format.mass(kg)} is ${formatMass(kg, other)}`}
    />
  );
}

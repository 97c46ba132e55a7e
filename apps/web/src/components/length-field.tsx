import {
  formatLength,
  lengthStep,
  type LengthStyle,
  parseLength,
  parseStature,
} from '@settlewright/geometry';
import type { Ref } from 'react';
import { useFormat } from '@/lib/format.ts';
import type { FieldWords } from './field-frame.tsx';
import { Measure } from './measure.tsx';
import type { QuantityEntry } from './quantity-entry.ts';
import { QuantityField, type Reading } from './quantity-field.tsx';

const MILLIMETRES: LengthStyle = { system: 'millimetres', roundTo: 8 };
const INCHES: LengthStyle = { system: 'feet-inches', roundTo: 16 };

interface LengthFieldProps extends FieldWords {
  entry: QuantityEntry;
  onChange: (entry: QuantityEntry) => void;
  onBlur?: () => void;
  /** Shortest and longest that is taken, millimetres. */
  minMm: number;
  maxMm: number;
  feet?: boolean;
  /** The height of a person: "180" is one in centimetres, whatever the display unit. */
  stature?: boolean;
  placeholder?: string;
  name?: string;
  ref?: Ref<HTMLInputElement>;
}

/** A length in feet, inches, fractions or millimetres, read back in both units. */
export function LengthField({ minMm, maxMm, feet, stature, ...field }: LengthFieldProps) {
  const format = useFormat();
  const other = format.style.system === 'millimetres' ? { ...INCHES, feet } : MILLIMETRES;

  const read = (text: string): Reading => {
    const reading = stature
      ? parseStature(text, format.bareUnit, { minMm, maxMm })
      : parseLength(text, format.bareUnit, { negative: minMm < 0 });
    if (!reading.ok) {
      const offers = reading.error.readings
        ?.filter((mm) => mm >= minMm && mm <= maxMm)
        .map((mm) => ({
          value: mm,
          words: (
            <>
              <Measure text={format.length(mm, { feet })} />, <Measure text={formatLength(mm, other)} />
            </>
          ),
        }));
      return { ok: false, message: reading.error.message, offers };
    }
    if (reading.value < minMm || reading.value > maxMm) {
      const range = `${format.length(minMm, { feet })} to ${format.length(maxMm, { feet })}`;
      const was = format.length(reading.value, { feet });
      return { ok: false, message: `“${text.trim()}” reads as ${was}; ${range} is taken.` };
    }
    return { ok: true, value: reading.value };
  };

  return (
    <QuantityField
      {...field}
      show={(mm) => format.length(mm, { feet })}
      read={read}
      step={lengthStep(format.style)}
      echo={(mm) => (
        <>
          <Measure text={format.length(mm, { feet })} /> is <Measure text={formatLength(mm, other)} />
        </>
      )}
    />
  );
}

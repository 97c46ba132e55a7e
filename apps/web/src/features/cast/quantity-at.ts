import type { Ref } from 'react';
import type { QuantityEntry } from '@/components/quantity-entry.ts';

interface Controlled {
  field: {
    value: QuantityEntry;
    onChange: (entry: QuantityEntry) => void;
    onBlur: () => void;
    ref: Ref<HTMLInputElement>;
  };
  fieldState: { error?: { message?: string } };
}

/** What a field of a quantity takes from the form: words that cannot be read come before what the form says of it. */
export const quantityAt = ({ field: { value, ...field }, fieldState }: Controlled) => ({
  entry: value,
  onChange: field.onChange,
  onBlur: field.onBlur,
  ref: field.ref,
  error: value.problem ?? fieldState.error?.message,
});

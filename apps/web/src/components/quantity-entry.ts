/** What a field for a length or a weight holds: the value in force, and what could not be read. */
export interface QuantityEntry {
  /** Millimetres or kilograms; null when the field is empty. */
  value: number | null;
  /** Set while the text in the field cannot be taken; a form that holds one is not sent. */
  problem?: string;
}

export const entryOf = (value: number | null | undefined): QuantityEntry => ({ value: value ?? null });

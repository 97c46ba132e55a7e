import { dimensionOf, stickValues, type Dimension, type SetDocument } from '@settlewright/geometry';
import { dimensionStep } from '@/lib/dimension-words.ts';

/** The sets along one dimension, each made once. It stays while the set only moves along that dimension. */
export interface TriedValues {
  /** `at` answers from what was made before. */
  dimension: Dimension;
  /** Rounding step in the dimension's unit. */
  step: number;
  /** Values a stick tries, rising. */
  values: number[];
  /** Where the set stands along the dimension; `undefined` when it has changed in another way. */
  valueOf: (document: SetDocument) => number | undefined;
  /** The nearest value that can be chosen. */
  snap: (value: number) => number;
}

/** Prepares the sets along a dimension of a set; nothing when it has no such number. */
export function triedValues(
  document: SetDocument,
  dimensionId: string,
  lengthStepMm: number,
): TriedValues | undefined {
  const found = dimensionOf(document, dimensionId);
  if (!found) return undefined;
  const { min, max, value: start } = found;
  const made = new Map<string, SetDocument | undefined>([[start.toFixed(3), document]]);
  const places = new WeakMap<SetDocument, number>([[document, start]]);
  const at: Dimension['at'] = (value, on) => {
    if (on && on !== document) return found.at(value, on);
    const key = value.toFixed(3);
    if (!made.has(key)) {
      const set = found.at(value);
      made.set(key, set);
      if (set) places.set(set, value);
    }
    return made.get(key);
  };
  const step = dimensionStep(found.unit, lengthStepMm);
  return {
    dimension: { ...found, at },
    step,
    values: stickValues(found, step),
    valueOf: (set) => places.get(set),
    snap: (value) => {
      const most = Math.floor(max / step + 1e-6) * step;
      const least = Math.ceil(min / step - 1e-6) * step;
      const rounded = Math.min(most, Math.max(least, Math.round(value / step) * step));
      return Math.abs(start - value) < Math.abs(rounded - value) ? start : rounded;
    },
  };
}

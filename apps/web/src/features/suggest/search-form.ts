import type { FreeDimension, LengthStyle, SetDocument, Dimension } from '@settlewright/geometry';
import { dimensionsOf, lengthStep } from '@settlewright/geometry';
import { DEFAULT_CROWD, type CrowdChoice } from '@/lib/crowd/crowds.ts';
import { dimensionStep } from '@/lib/dimension-words.ts';

/** How far one dimension may go; in its own unit. */
export interface Freedom {
  dimensionId: string;
  /** `near`: the look demands about what is there now. */
  kind: 'range' | 'near';
  min: number;
  max: number;
}

/** What the person chose before a search. */
export interface SearchForm {
  freedoms: Freedom[];
  /** Ids of sitters who need not be served. */
  leftOut: string[];
  /** Null where nobody besides the sitters is asked about. */
  crowd: CrowdChoice | null;
}

const START_IDS = ['seat-height', 'seat-depth', 'table-height'];
const REACH: Record<Dimension['unit'], number> = { mm: 2 * 25.4, deg: 4, N: 60 };
const NEAR: Record<Dimension['unit'], number> = { mm: 0.25 * 25.4, deg: 1, N: 20 };

/** How far a dimension goes where nothing else was said. */
export function startFreedom(dimension: Dimension, kind: Freedom['kind'] = 'range'): Freedom {
  const { id, unit, value, min, max } = dimension;
  const reach = (kind === 'range' ? REACH : NEAR)[unit];
  return {
    dimensionId: id,
    kind,
    min: Math.max(min, value - reach),
    max: Math.min(max, value + reach),
  };
}

/** Heights and depths that most sets turn on. */
export function startForm(document: SetDocument): SearchForm {
  const dimensions = dimensionsOf(document);
  return {
    freedoms: START_IDS.flatMap((id) => {
      const found = dimensions.find((one) => one.id === id);
      return found ? [startFreedom(found)] : [];
    }),
    leftOut: [],
    crowd: DEFAULT_CROWD,
  };
}

/** The free dimensions of a form, of those that the set still has. */
export function freeOf(
  form: SearchForm,
  dimensions: readonly Dimension[],
  style: LengthStyle,
): FreeDimension[] {
  return form.freedoms.flatMap(({ dimensionId, min, max }) => {
    const found = dimensions.find(({ id }) => id === dimensionId);
    return found ? [{ dimensionId, min, max, step: dimensionStep(found.unit, lengthStep(style)) }] : [];
  });
}

/** Everything that an answer hangs on, as one short name. */
export function questionOf(parts: unknown): string {
  let [a, b] = [0x811c9dc5, 0x1b873593];
  for (const letter of JSON.stringify(parts)) {
    a = Math.imul(a ^ (letter.codePointAt(0) ?? 0), 0x01000193);
    b = Math.imul(b ^ (letter.codePointAt(0) ?? 0), 0x5bd1e995) + 1;
  }
  return `${(a >>> 0).toString(36)}-${(b >>> 0).toString(36)}`;
}

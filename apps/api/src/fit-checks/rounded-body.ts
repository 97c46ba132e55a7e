import { type KnownPerson, MEASURE_KEYS, type MeasureKey } from '@settlewright/anthropometry';

const STEP_MM = 20;

/** A body good enough to draw and too coarse to be somebody's measures. */
export interface RoundedBody {
  placeId: string;
  means: Record<Exclude<MeasureKey, 'weight_kg'>, number>;
  shoeMm: number;
  clothing: KnownPerson['clothing'];
}

const coarse = (mm: number) => Math.round(mm / STEP_MM) * STEP_MM;

export function roundedBody(
  placeId: string,
  person: KnownPerson,
  means: Record<MeasureKey, number>,
): RoundedBody {
  const lengths = MEASURE_KEYS.filter((key) => key !== 'weight_kg').map((key) => [key, coarse(means[key])]);
  return {
    placeId,
    means: Object.fromEntries(lengths) as RoundedBody['means'],
    shoeMm: coarse(person.shoeMm),
    clothing: person.clothing,
  };
}

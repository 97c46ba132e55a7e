import type { KnownPerson, MeasureKey } from '@settlewright/anthropometry';
import { FIGURE_KEYS } from '@settlewright/geometry';

const STEP_MM = 20;

/** What shapes a drawn body, but for the weight: of the rest nothing is sent. */
const DRAWN_MEASURES = FIGURE_KEYS.filter((key) => key !== 'weight_kg');

/** A body good enough to draw and too coarse to be somebody's measures. */
export interface RoundedBody {
  placeId: string;
  means: Record<(typeof DRAWN_MEASURES)[number], number>;
  shoeMm: number;
  clothing: KnownPerson['clothing'];
}

const coarse = (mm: number) => Math.round(mm / STEP_MM) * STEP_MM;

export function roundedBody(
  placeId: string,
  person: KnownPerson,
  means: Record<MeasureKey, number>,
): RoundedBody {
  return {
    placeId,
    means: Object.fromEntries(DRAWN_MEASURES.map((key) => [key, coarse(means[key])])) as RoundedBody['means'],
    shoeMm: coarse(person.shoeMm),
    clothing: person.clothing,
  };
}

import type { KnownPerson, MeasureKey } from '@settlewright/anthropometry';

const STEP_MM = 20;

/** What shapes a drawn body, but for the weight: of the rest nothing is sent. */
export const DRAWN_MEASURES = [
  'stature',
  'sitting_height',
  'eye_height_sitting',
  'acromial_height_sitting',
  'elbow_rest_height',
  'popliteal_height',
  'knee_height_sitting',
  'buttock_popliteal_length',
  'buttock_knee_length',
  'thigh_clearance',
  'hip_breadth_sitting',
  'bideltoid_breadth',
  'forearm_forearm_breadth',
  'biacromial_breadth',
  'abdominal_extension_depth_sitting',
  'chest_depth',
  'foot_length',
  'foot_breadth',
  'forearm_hand_length',
  'head_breadth',
  'head_length',
  'hand_length',
  'lateral_malleolus_height',
  'chest_breadth',
  'waist_breadth',
] as const satisfies readonly MeasureKey[];

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

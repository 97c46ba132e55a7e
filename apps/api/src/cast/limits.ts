import { TAPE_MEASURE_KEYS, type TapeMeasureKey } from '@settlewright/anthropometry';

/**
 * What a field accepts. Wide on purpose: these catch a wrong unit or a slipped digit, not an unusual body;
 * no verdict is drawn from them.
 */
export interface Limit {
  label: string;
  min: number;
  max: number;
  unit: 'mm' | 'kg' | 'years';
}

export const STATURE_LIMIT: Limit = { label: 'Stature', min: 1000, max: 2300, unit: 'mm' };
export const WEIGHT_LIMIT: Limit = { label: 'Weight', min: 25, max: 300, unit: 'kg' };
/** From the youngest whom adults' body data describe. */
export const AGE_LIMIT: Limit = { label: 'Age', min: 16, max: 110, unit: 'years' };
export const SHOE_LIMIT: Limit = { label: 'Shoe height', min: 0, max: 150, unit: 'mm' };
/** Shoe height of somebody whose is not told. */
export const USUAL_SHOE_MM = 25;

export const TAPE_LIMITS: Record<TapeMeasureKey, Limit> = {
  sitting_height: { label: 'Sitting height', min: 500, max: 1200, unit: 'mm' },
  eye_height_sitting: { label: 'Eye height, sitting', min: 400, max: 1100, unit: 'mm' },
  acromial_height_sitting: { label: 'Shoulder height, sitting', min: 300, max: 900, unit: 'mm' },
  elbow_rest_height: { label: 'Elbow rest height', min: 80, max: 450, unit: 'mm' },
  popliteal_height: { label: 'Back-of-knee height', min: 200, max: 650, unit: 'mm' },
  knee_height_sitting: { label: 'Knee height, sitting', min: 250, max: 800, unit: 'mm' },
  buttock_popliteal_length: { label: 'Seat back to back of knee', min: 250, max: 750, unit: 'mm' },
  buttock_knee_length: { label: 'Seat back to front of knee', min: 300, max: 900, unit: 'mm' },
  thigh_clearance: { label: 'Thigh height over the seat', min: 60, max: 350, unit: 'mm' },
  hip_breadth_sitting: { label: 'Hip breadth, sitting', min: 200, max: 800, unit: 'mm' },
  bideltoid_breadth: { label: 'Shoulder breadth', min: 250, max: 800, unit: 'mm' },
  forearm_forearm_breadth: { label: 'Elbow-to-elbow breadth', min: 250, max: 1000, unit: 'mm' },
  abdominal_extension_depth_sitting: { label: 'Belly depth, sitting', min: 100, max: 700, unit: 'mm' },
};

export const NAME_MAX = 120;
export const ROLE_MAX = 120;
export const NOTES_MAX = 4000;
export const TAKEN_BY_MAX = 120;

export function isTapeMeasureKey(key: string): key is TapeMeasureKey {
  return (TAPE_MEASURE_KEYS as readonly string[]).includes(key);
}

export function within(limit: Limit, value: number): boolean {
  return Number.isFinite(value) && value >= limit.min && value <= limit.max;
}

export function acceptedWords(limit: Limit): string {
  return `${limit.min} to ${limit.max} ${limit.unit}`;
}

import type { TapeMeasureKey } from '@settlewright/anthropometry';

interface Limit {
  min: number;
  max: number;
}

/** What a field takes. Wide on purpose: it catches a wrong unit or a slipped digit, not an unusual body. */
export const STATURE_MM: Limit = { min: 1000, max: 2300 };
export const WEIGHT_KG: Limit = { min: 25, max: 300 };
/** From the youngest whom adults' body data describe; whole years. */
export const AGE_YEARS: Limit = { min: 16, max: 110 };
export const SHOE_MM: Limit = { min: 0, max: 150 };

export const TAPE_MM: Record<TapeMeasureKey, Limit> = {
  sitting_height: { min: 500, max: 1200 },
  eye_height_sitting: { min: 400, max: 1100 },
  acromial_height_sitting: { min: 300, max: 900 },
  elbow_rest_height: { min: 80, max: 450 },
  popliteal_height: { min: 200, max: 650 },
  knee_height_sitting: { min: 250, max: 800 },
  buttock_popliteal_length: { min: 250, max: 750 },
  buttock_knee_length: { min: 300, max: 900 },
  thigh_clearance: { min: 60, max: 350 },
  hip_breadth_sitting: { min: 200, max: 800 },
  bideltoid_breadth: { min: 250, max: 800 },
  forearm_forearm_breadth: { min: 250, max: 1000 },
  abdominal_extension_depth_sitting: { min: 100, max: 700 },
};

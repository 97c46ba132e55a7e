import type { MeasureKey } from '@settlewright/anthropometry';
import { clamp, mix } from './vector.ts';

/** Body measures (mm, ISO 7250-1 names) or a subset of them, as the mannequin reads them. */
export type FigureMeans = Partial<Record<MeasureKey, number>>;

/** The measures that shape a mannequin. */
export const FIGURE_KEYS = [
  'stature',
  'weight_kg',
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
  'chest_breadth',
  'waist_breadth',
  'foot_length',
  'foot_breadth',
  'head_length',
  'head_breadth',
  'lateral_malleolus_height',
  'forearm_hand_length',
  'hand_length',
] as const satisfies readonly MeasureKey[];

/**
 * The measures of one body by the short names the sections use, and the radii derived from them.
 * All lengths in millimetres. ISO initials: SH sitting height, EH eye, AH acromion, ER elbow rest,
 * PH popliteal, KH knee, BPL buttock-popliteal, BKL buttock-knee, TC thigh clearance, HB hip breadth,
 * BD bideltoid, AD abdominal depth, CD and CB chest, WB waist breadth, BA biacromial, FF across the
 * elbows, FL and FB foot, HL and HBr head, MH malleolus, FHL forearm-hand, Ha hand.
 */
export interface Figure {
  SH: number;
  EH: number;
  AH: number;
  ER: number;
  PH: number;
  KH: number;
  BPL: number;
  BKL: number;
  TC: number;
  HB: number;
  BD: number;
  AD: number;
  CD: number;
  CB: number;
  WB: number;
  BA: number;
  FF: number;
  FL: number;
  FB: number;
  HL: number;
  HBr: number;
  MH: number;
  FHL: number;
  Ha: number;
  /** Where the rearmost buttock is drawn, forward of the back; 0 unless the skin bulges there. */
  rump: number;
  /** 0 for a man's build, 1 for a woman's; between when the figure lies between. */
  woman: number;
  /** Stature over the mean of the sex. */
  k: number;
  bodyMassIndex: number;
  radius: {
    neck: number;
    arm: number;
    elbow: number;
    forearm: number;
    wrist: number;
    knee: number;
    calf: number;
    ankle: number;
  };
}

const need = (means: FigureMeans, key: MeasureKey): number => {
  const value = means[key];
  if (value === undefined || !Number.isFinite(value) || value <= 0) {
    throw new RangeError(
      `${key}: read ${String(value)}; a length in millimetres above 0 is needed to draw a body`,
    );
  }
  return value;
};

/** A measure, or its usual share of another one when the caller may not see it. */
const orShare = (means: FigureMeans, key: MeasureKey, base: number, share: number): number => {
  const value = means[key];
  return value !== undefined && Number.isFinite(value) && value > 0 ? value : base * share;
};

/**
 * Reads the measures that shape a body.
 *
 * The seat measures must be there; breadths and depths that a caller may not see (weight, head, hand)
 * fall back on their usual share of stature.
 *
 * @param means - body measures in millimetres, weight in kilograms
 * @returns the figure; throws a RangeError naming the measure when one it cannot do without is missing
 * @source shares of stature: means of the ANSUR II survey; radii against body mass index by eye
 */
export function readFigure(means: FigureMeans): Figure {
  const stature = need(means, 'stature');
  const HB = need(means, 'hip_breadth_sitting');
  const BD = need(means, 'bideltoid_breadth');
  const AD = need(means, 'abdominal_extension_depth_sitting');
  const BA = orShare(means, 'biacromial_breadth', BD, 0.81);
  const woman = clamp((HB / BA - 0.95) / 0.1, 0, 1);
  const weight = means.weight_kg;
  const bodyMassIndex =
    weight !== undefined && Number.isFinite(weight) && weight > 0
      ? weight / (stature / 1000) ** 2
      : 27 + 0.1 * (AD - 0.145 * stature);
  const b = clamp(bodyMassIndex, 14, 60);
  const k = stature / mix(1756, 1629, woman);
  const rootK = Math.sqrt(k);
  const arm = mix(18 + 1.12 * b, 15 + 1.13 * b, woman) * rootK;
  const FL = orShare(means, 'foot_length', stature, 0.154);
  return {
    SH: need(means, 'sitting_height'),
    EH: need(means, 'eye_height_sitting'),
    AH: need(means, 'acromial_height_sitting'),
    ER: need(means, 'elbow_rest_height'),
    PH: need(means, 'popliteal_height'),
    KH: need(means, 'knee_height_sitting'),
    BPL: need(means, 'buttock_popliteal_length'),
    BKL: need(means, 'buttock_knee_length'),
    TC: need(means, 'thigh_clearance'),
    rump: 0,
    HB,
    BD,
    AD,
    BA,
    woman,
    k,
    bodyMassIndex,
    CD: orShare(means, 'chest_depth', AD, 1),
    CB: orShare(means, 'chest_breadth', BA, 0.7),
    WB: orShare(means, 'waist_breadth', HB, 0.86),
    FF: orShare(means, 'forearm_forearm_breadth', BD, 1.12),
    FL,
    FB: orShare(means, 'foot_breadth', FL, 0.376),
    HL: orShare(means, 'head_length', stature, 0.114),
    HBr: orShare(means, 'head_breadth', stature, 0.089),
    MH: orShare(means, 'lateral_malleolus_height', stature, 0.04),
    FHL: orShare(means, 'forearm_hand_length', stature, 0.276),
    Ha: orShare(means, 'hand_length', stature, 0.111),
    radius: {
      neck: mix(39 + 0.82 * b, 37 + 0.62 * b, woman) * rootK,
      arm,
      elbow: 25 * rootK + 0.4 * arm,
      forearm: 13 * rootK + 0.62 * arm,
      wrist: mix(28, 25, woman) * rootK,
      knee: mix(36 + 0.85 * b, 34 + 0.95 * b, woman) * rootK,
      calf: (29 + 1.1 * b) * rootK,
      ankle: mix(36, 33, woman) * rootK,
    },
  };
}

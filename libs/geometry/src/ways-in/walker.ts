import type { Clothing, MeasureKey } from '@settlewright/anthropometry';
import type { PlanPoint } from '../situation/plan.ts';

/** The measures of a body that a way in asks for; millimetres. */
export type WalkerMeasures = Readonly<
  Record<
    Extract<
      MeasureKey,
      | 'stature'
      | 'hip_breadth'
      | 'bideltoid_breadth'
      | 'waist_breadth'
      | 'thigh_clearance'
      | 'buttock_depth'
      | 'chest_depth'
      | 'abdominal_extension_depth_sitting'
      | 'buttock_popliteal_length'
      | 'buttock_knee_length'
      | 'acromial_height_sitting'
      | 'hip_breadth_sitting'
    >,
    number
  >
>;

/** Which part of a body a band is. */
export type BandName = 'thighs' | 'trunk' | 'shins';

/**
 * One height band of a body seen from above: everything within a radius of a line. Such a stadium holds the ellipse of
 * the same breadth and depth, so what it passes the body passes.
 */
export interface Band {
  name: BandName;
  /** Heights above the floor that the band takes. */
  fromMm: number;
  toMm: number;
  /** Ends of the line in the body's frame: to its left, and ahead. */
  core: readonly [PlanPoint, PlanPoint];
  radiusMm: number;
}

/** A body as ways in see it: what the person measures, in shoes and clothes. */
export interface Walker {
  measures: WalkerMeasures;
  shoeMm: number;
  clothing: Clothing;
}

/** What is stepped over and what is leaned under, heights above the floor. */
export type BodyHeights = readonly [steppedOverMm: number, leanedUnderMm: number];

/**
 * Top of the thighs of somebody standing, as a share of stature.
 *
 * @source height of the gluteal fold, from memory
 */
const THIGH_TOP_SHARE = 0.46;

/**
 * Added by clothes, millimetres: across the hips, across the shoulders, to the thigh, to the trunk front to back.
 *
 * @source hips as in rule SEAT-05, thighs as in TABLE-01; shoulders 10 indoors and 40 in heavy outdoor clothing, trunk up
 * to 40 outdoors, ordinary indoor clothing otherwise nothing: clothing allowances of a published anthropometry course
 */
const CLOTHES: Record<Clothing, { hip: number; shoulder: number; thigh: number; trunk: number }> = {
  light: { hip: 10, shoulder: 10, thigh: 0, trunk: 0 },
  medium: { hip: 25, shoulder: 10, thigh: 0, trunk: 0 },
  heavy: { hip: 50, shoulder: 40, thigh: 35, trunk: 40 },
};

/** A stadium as broad and as deep as asked, its line across the body. */
function across(breadthMm: number, depthMm: number): Pick<Band, 'core' | 'radiusMm'> {
  const half = Math.max(0, breadthMm - depthMm) / 2;
  return {
    core: [
      [-half, 0],
      [half, 0],
    ],
    radiusMm: depthMm / 2,
  };
}

/**
 * Front to back of the trunk at its deepest, clothes included.
 *
 * @param walker - who
 * @returns millimetres
 */
export function trunkDepthMm({ measures, clothing }: Walker): number {
  const { abdominal_extension_depth_sitting: belly, chest_depth, buttock_depth } = measures;
  return Math.max(belly, chest_depth, buttock_depth) + CLOTHES[clothing].trunk;
}

/**
 * Somebody who stands or walks: thighs below, which go between a seat and a table; trunk above, which goes over both.
 *
 * @param walker - who
 * @param heights - what is stepped over and what is leaned under
 * @returns bands about the middle of the body, lowest first
 */
export function standing(walker: Walker, [steppedOverMm, leanedUnderMm]: BodyHeights): Band[] {
  const { measures, shoeMm, clothing } = walker;
  const wear = CLOTHES[clothing];
  const splitMm = THIGH_TOP_SHARE * measures.stature + shoeMm;
  const thighs = across(measures.hip_breadth + wear.hip, measures.thigh_clearance + wear.thigh);
  const trunk = across(measures.bideltoid_breadth + wear.shoulder, trunkDepthMm(walker));
  const bands: Band[] = [
    { name: 'thighs', fromMm: steppedOverMm, toMm: Math.min(splitMm, leanedUnderMm), ...thighs },
    { name: 'trunk', fromMm: splitMm, toMm: leanedUnderMm, ...trunk },
  ];
  return bands.filter(({ fromMm, toMm }) => toMm > fromMm);
}

/**
 * Somebody who slides along a seat: the trunk between back and table, and the shins, drawn back, between the seat's front
 * and what stands under the table. Each is about its own middle: they go forward and back by themselves.
 *
 * @param walker - who
 * @param seatTopMm - seat above the floor
 * @param steppedOverMm - what ends lower is no hindrance
 * @returns bands, the trunk first
 */
export function sliding(walker: Walker, seatTopMm: number, steppedOverMm: number): [Band, Band] {
  const { measures, clothing } = walker;
  const shinMm = measures.buttock_knee_length - measures.buttock_popliteal_length + CLOTHES[clothing].thigh;
  return [
    {
      name: 'trunk',
      fromMm: seatTopMm,
      toMm: seatTopMm + measures.acromial_height_sitting,
      ...across(measures.waist_breadth, trunkDepthMm(walker)),
    },
    { name: 'shins', fromMm: steppedOverMm, toMm: seatTopMm, ...across(shinMm, shinMm) },
  ];
}

/**
 * Somebody who sits, as those see it who pass: trunk, and legs out to the knees.
 *
 * @param walker - who
 * @param seatTopMm - seat above the floor
 * @param steppedOverMm - what ends lower is no hindrance
 * @returns bands about the rearmost point of the buttock, looking ahead
 */
export function seated(walker: Walker, seatTopMm: number, steppedOverMm: number): Band[] {
  const { measures, clothing } = walker;
  const wear = CLOTHES[clothing];
  const depth = trunkDepthMm(walker);
  const legs = (measures.hip_breadth_sitting + wear.hip) / 2;
  const half = Math.max(0, measures.bideltoid_breadth + wear.shoulder - depth) / 2;
  return [
    {
      name: 'thighs',
      fromMm: steppedOverMm,
      toMm: seatTopMm + measures.thigh_clearance + wear.thigh,
      core: [
        [0, legs],
        [0, Math.max(legs, measures.buttock_knee_length - legs)],
      ],
      radiusMm: legs,
    },
    {
      name: 'trunk',
      fromMm: seatTopMm,
      toMm: seatTopMm + measures.acromial_height_sitting,
      core: [
        [-half, depth / 2],
        [half, depth / 2],
      ],
      radiusMm: depth / 2,
    },
  ];
}

import type { Vec3 } from '../parts/part.ts';
import { toRoom, type BodyPlacement } from './body-placement.ts';
import type { Figure } from './figure.ts';
import { HIP_FORWARD_MM, HIP_HEIGHT_MM, restAnkle, restKnee } from './stance.ts';
import { clamp, turnAboutX } from './vector.ts';

const SHIN_FURTHEST_RAD = (28 * Math.PI) / 180;
const TOES_DOWN_RAD = (18 * Math.PI) / 180;
/** Furthest that shins are drawn back from upright. By eye, well within the range of a knee. */
export const SHINS_BACK_RAD = (15 * Math.PI) / 180;

/** A bar or step for the feet before the seat. */
export interface FootRail {
  /** Its top above the floor. */
  topMm: number;
  /** Its middle, level and forwards from the hip point of the place. */
  aheadOfHipMm: number;
}

/** Bends of the legs, radians, and where the soles are. */
export interface Legs {
  thighRad: number;
  shinRad: number;
  footRad: number;
  /** Sole above the floor when the feet hang. */
  heelGapMm: number;
  kneesLift: boolean;
}

/** How far feet have gone from where they would stand or hang, to keep clear of something. */
export interface FeetMoved {
  backMm: number;
  /** To the sitter's left; below 0 to the right. */
  leftMm: number;
}

/** Whether they have gone at all. */
export const haveMoved = ({ backMm, leftMm }: FeetMoved): boolean => backMm > 0 || leftMm !== 0;

const hipAxis: Vec3 = [0, HIP_HEIGHT_MM, HIP_FORWARD_MM];
const shinOf = (f: Figure): number => restKnee(f)[1] - restAnkle(f)[1];

/** Height of the knee joint above the floor. */
const kneeHeight = (f: Figure, placement: BodyPlacement, thighRad: number): number =>
  toRoom(placement, turnAboutX(restKnee(f), hipAxis, thighRad))[1];

/** The thigh lifted until its knee is so high. */
function thighLiftedTo(f: Figure, placement: BodyPlacement, kneeMm: number): number {
  let low = 0;
  let high = Math.PI / 3;
  for (let i = 0; i < 24; i++) {
    const middle = (low + high) / 2;
    if (kneeHeight(f, placement, -middle) < kneeMm) low = middle;
    else high = middle;
  }
  return -(low + high) / 2;
}

/** How far toes go down so that they reach what a sole is so far above. */
export const toesDown = (f: Figure, gapMm: number, mostRad = TOES_DOWN_RAD): number =>
  Math.min(mostRad, Math.asin(clamp(gapMm / (0.72 * f.FL), 0, 1)));

/** Thighs along the seat, feet on the floor if they reach it: shins forward when the seat is low, hanging when high. */
export function legsFor(f: Figure, placement: BodyPlacement, shoeMm: number): Legs {
  const shinMm = shinOf(f);
  const footMm = f.MH + shoeMm;
  const kneeMm = kneeHeight(f, placement, 0);
  const upright = placement.tiltRad;
  const cosine = (kneeMm - footMm) / shinMm;
  if (cosine >= 1) {
    const gap = kneeMm - footMm - shinMm;
    return {
      thighRad: 0,
      shinRad: upright,
      footRad: upright + toesDown(f, gap),
      heelGapMm: gap,
      kneesLift: false,
    };
  }
  const shin = Math.acos(clamp(cosine, -1, 1));
  if (shin <= SHIN_FURTHEST_RAD) {
    return { thighRad: 0, shinRad: upright - shin, footRad: upright, heelGapMm: 0, kneesLift: false };
  }
  return {
    thighRad: thighLiftedTo(f, placement, shinMm * Math.cos(SHIN_FURTHEST_RAD) + footMm),
    shinRad: upright - SHIN_FURTHEST_RAD,
    footRad: upright,
    heelGapMm: 0,
    kneesLift: true,
  };
}

/**
 * The same legs with the feet further back or aside: shins lean, thighs rise where the shins stand up from leaning
 * forwards, heels where the shins go beyond upright.
 *
 * @param legs - from `legsFor`
 * @returns the legs, and how far their shins lean to the sitter's left, radians
 */
export function legsMoved(
  f: Figure,
  placement: BodyPlacement,
  shoeMm: number,
  legs: Legs,
  { backMm, leftMm }: FeetMoved,
): Legs & { leftRad: number } {
  const upright = placement.tiltRad;
  const shinMm = shinOf(f);
  const leftRad = Math.asin(clamp(leftMm / shinMm, -1, 1));
  const leaningMm = shinMm * Math.cos(leftRad);
  const swing = Math.asin(clamp((shinMm * Math.sin(legs.shinRad - upright) + backMm) / leaningMm, -1, 1));
  const standsMm = leaningMm * Math.cos(swing) + f.MH + shoeMm;
  const over = kneeHeight(f, placement, legs.thighRad) - standsMm;
  return {
    ...legs,
    thighRad: over < 0 ? thighLiftedTo(f, placement, standsMm) : legs.thighRad,
    shinRad: upright + swing,
    footRad: upright + toesDown(f, over),
    leftRad,
  };
}

/**
 * Feet on a rail: thighs along the seat, shins forwards or backwards so that the soles lie on it.
 *
 * @returns the legs, or `undefined` when the soles do not come to lie on it
 */
export function legsOnRail(
  f: Figure,
  placement: BodyPlacement,
  shoeMm: number,
  rail: FootRail,
): Legs | undefined {
  const upright = placement.tiltRad;
  const knee = restKnee(f);
  const level = { ...placement, originMm: [0, placement.originMm[1], 0] as const, facingRad: 0 };
  const kneeAt = toRoom(level, knee);
  const cosine = (kneeAt[1] - f.MH - shoeMm - rail.topMm) / shinOf(f);
  if (cosine > 1 || cosine < Math.cos(SHIN_FURTHEST_RAD)) return undefined;
  const swing = Math.acos(cosine);
  const aheadOfOrigin = rail.aheadOfHipMm + HIP_FORWARD_MM;
  for (const shin of [-swing, swing]) {
    const ankle = kneeAt[2] - Math.sin(shin) * shinOf(f);
    const under = aheadOfOrigin - ankle;
    if (under < -0.25 * f.FL || under > 0.7 * f.FL) continue;
    return { thighRad: 0, shinRad: upright + shin, footRad: upright, heelGapMm: 0, kneesLift: false };
  }
  return undefined;
}

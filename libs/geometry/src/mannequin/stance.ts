import type { Vec3 } from '../parts/part.ts';
import type { Figure } from './figure.ts';
import { along, clamp, length, mix, sub, turnAboutX, unit } from './vector.ts';

/**
 * One arm in the body's own frame, always written as if it were the sitter's left one; the right arm
 * is its mirror image.
 */
export interface ArmStance {
  shoulder: Vec3;
  elbow: Vec3;
  wrist: Vec3;
  /** Unit vector from the wrist to the fingertips. */
  hand: Vec3;
  /** Unit vector out of the back of the hand. */
  handBack: Vec3;
}

/** One leg, written as if it were the sitter's left one. */
export interface LegStance {
  thighRad: number;
  /** The whole leg turned towards the other one, about the body's upright through its hip joint. */
  acrossRad: number;
  shinRad: number;
  footRad: number;
  toesOutRad: number;
  /** Shin leaning towards the other leg, as the thigh turns outwards about its own length. */
  inwardRad: number;
  /** Foot leaning so; 0 where it stands. */
  footInwardRad: number;
}

/**
 * How a body is bent, in its own frame: x to the sitter's left, y up from the pressed seat, z forward
 * from the rearmost buttock along the seat. Angles about x in radians; positive carries z downwards.
 */
export interface Stance {
  trunkRad: number;
  /** How far belt and chest bend against each other: the belt that much backwards, the chest forwards; 0 upright. */
  slumpRad: number;
  headRad: number;
  legs: readonly [left: LegStance, right: LegStance];
  arms: readonly [left: ArmStance, right: ArmStance];
  /** Height of the shoe under the heel. */
  shoeMm: number;
  /** Thickness of the sole under the ball of the foot; at most the heel. */
  forefootMm: number;
}

/** Point the trunk leans about: the hip axis over the seat and before the back. */
export const HIP_HEIGHT_MM = 92;
export const HIP_FORWARD_MM = 135;

/** Turns a point of the trunk with its lean. */
export const leanPoint = (p: Vec3, angleRad: number): Vec3 =>
  turnAboutX(p, [0, HIP_HEIGHT_MM, HIP_FORWARD_MM], angleRad);

/** The part of a stance that bends the trunk. */
export type TrunkBend = Pick<Stance, 'trunkRad' | 'slumpRad'>;

/** How far the chest is turned from upright. */
export const chestRad = (bend: TrunkBend): number => bend.trunkRad + bend.slumpRad;

/** Middle of the waist, where a slumped trunk bends. */
export const waistPivot = (f: Figure): Vec3 => [0, mix(f.TC, 0.75 * f.AH, 0.5), 0.5 * f.AD];

/**
 * Bends a point of the upright trunk.
 *
 * @param belt - share of the lean a point takes, 0 at the seat to 1
 * @param chest - share of the bend at the waist, 0 below it to 1 from the chest up
 */
export function bendPoint(f: Figure, bend: TrunkBend, p: Vec3, belt = 1, chest = 1): Vec3 {
  const leaned = leanPoint(p, (bend.trunkRad - bend.slumpRad) * belt);
  if (bend.slumpRad === 0 || chest === 0) return leaned;
  return turnAboutX(
    leaned,
    leanPoint(waistPivot(f), bend.trunkRad - bend.slumpRad),
    2 * bend.slumpRad * chest,
  );
}

/** The point of the upright trunk that a bend carries to `p`; under a bent waist roughly. */
export function unbendPoint(f: Figure, bend: TrunkBend, p: Vec3): Vec3 {
  if (bend.slumpRad === 0) return leanPoint(p, -bend.trunkRad);
  const belt = bend.trunkRad - bend.slumpRad;
  const waist = leanPoint(waistPivot(f), belt);
  if (p[1] < waist[1]) return leanPoint(p, -0.5 * belt);
  return leanPoint(turnAboutX(p, waist, -2 * bend.slumpRad), -belt);
}

/** Depth of the shoulder line before the rearmost buttock. */
export const shoulderLineMm = (f: Figure): number => 0.42 * f.CD - 4;

/** Centre of the left shoulder joint of an upright trunk. */
export function restShoulder(f: Figure): Vec3 {
  const d = clamp(0.275 * (f.BD - f.BA) + 0.35 * f.radius.arm, 34, 80);
  return [f.BD / 2 - d, 0.935 * f.AH, shoulderLineMm(f)];
}

/** Middle of the flesh at the left elbow of an upright trunk with the forearms level. */
export function restElbowFlesh(f: Figure): Vec3 {
  const e = f.radius.elbow;
  return [f.FF / 2 - e, f.ER + 1.11 * e, shoulderLineMm(f) + 4];
}

/**
 * How far the joint of the elbow lies from the middle of the flesh: down the upper arm, and back along the forearm.
 * The joint is over the tip by as much as the shoulder-elbow length exceeds acromion to radiale, and before its back
 * by as much as the forearm-hand length exceeds radiale to fingertip.
 */
function elbowIn(f: Figure): { downMm: number; backMm: number } {
  const e = f.radius.elbow;
  return {
    downMm: 1.11 * e - mix(OVER_TIP_MM.man, OVER_TIP_MM.woman, f.woman) * f.k,
    backMm: e - mix(BEFORE_BACK_MM.man, BEFORE_BACK_MM.woman, f.woman) * f.k,
  };
}
const OVER_TIP_MM = { man: 29, woman: 23 };
const BEFORE_BACK_MM = { man: 22, woman: 19 };

/** Joint of the left elbow of an upright trunk with the forearms level. */
export function restElbow(f: Figure): Vec3 {
  const { downMm, backMm } = elbowIn(f);
  const flesh = restElbowFlesh(f);
  const shoulder = restShoulder(f);
  let joint = flesh;
  for (let i = 0; i < 5; i++) {
    joint = along(along(flesh, direction(shoulder, joint), downMm), [0, 0, 1], -backMm);
  }
  return joint;
}

/** Middle of the flesh at an elbow: nearer the crook than the joint, the more so the more it is bent. */
export function elbowFlesh(
  f: Figure,
  { shoulder, elbow, wrist }: Pick<ArmStance, 'shoulder' | 'elbow' | 'wrist'>,
): Vec3 {
  const { downMm, backMm } = elbowIn(f);
  return along(along(elbow, direction(shoulder, elbow), -downMm), direction(elbow, wrist), backMm);
}

/** Lengths of the arm's links: shoulder to elbow so that the elbow rest comes true, elbow to wrist. */
export function armLinks(f: Figure): { upperMm: number; forearmMm: number } {
  const { backMm } = elbowIn(f);
  return {
    upperMm: length(sub(restElbow(f), restShoulder(f))),
    forearmMm: Math.max(120, f.FHL - f.Ha - f.radius.elbow + backMm),
  };
}

/** How far the biceps is drawn inwards so that the arm stays within the breadth of the shoulders. */
export function bicepsTuck(f: Figure): number {
  const restOut = mix(restShoulder(f)[0], restElbowFlesh(f)[0], 0.52) + 0.96 * f.radius.arm;
  return Math.max(0, restOut - (f.BD / 2 + 0.11 * (f.FF - f.BD)));
}

/** Radius of the knee; its centre lies as high over the seat. */
export const kneeRadius = (f: Figure): number => 0.42 * (f.KH - f.PH);

/** Centre of the knee with the thigh along the seat. */
export const restKnee = (f: Figure): Vec3 => [0.235 * f.HB + 6, kneeRadius(f), (f.BPL + f.BKL) / 2 - 4];

/** Centre of the ankle with the shin upright. */
export const restAnkle = (f: Figure): Vec3 => [0.235 * f.HB + 6, f.MH - f.PH, (f.BPL + f.BKL) / 2 - 4];

/** Thigh along the seat, shin upright, foot level. */
export const MEASURED_LEG: LegStance = {
  thighRad: 0,
  acrossRad: 0,
  shinRad: 0,
  footRad: 0,
  toesOutRad: 0,
  inwardRad: 0,
  footInwardRad: 0,
};

/** Upright, arms hanging, forearms level, shins upright: the posture in which the measures are defined. */
export function measuringStance(f: Figure): Stance {
  const shoulder = restShoulder(f);
  const elbow = restElbow(f);
  const wrist = along(elbow, [0, 0, 1], armLinks(f).forearmMm);
  const arm: ArmStance = { shoulder, elbow, wrist, hand: [0, 0, 1], handBack: [0, 1, 0] };
  return {
    trunkRad: 0,
    slumpRad: 0,
    headRad: 0,
    legs: [MEASURED_LEG, MEASURED_LEG],
    arms: [arm, arm],
    shoeMm: 0,
    forefootMm: 0,
  };
}

/** Whether one leg lies over the other from the thigh on. */
export const kneesCross = ({ legs }: Pick<Stance, 'legs'>): boolean =>
  legs.some(({ acrossRad }) => acrossRad !== 0);

/** Mirror image across the sitter's midplane. */
export const mirror = (p: Vec3): Vec3 => [-p[0], p[1], p[2]];

/** Direction of one point from another. */
export const direction = (from: Vec3, to: Vec3): Vec3 => unit(sub(to, from), [0, 0, 1]);

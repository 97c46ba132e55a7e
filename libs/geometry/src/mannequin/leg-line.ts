import type { Vec3 } from '../parts/part.ts';
import type { Figure } from './figure.ts';
import { HIP_FORWARD_MM, HIP_HEIGHT_MM, restAnkle, restKnee, type LegStance } from './stance.ts';
import { add, sub, turnAbout, turnAboutX, turnAboutY } from './vector.ts';

const FORWARDS: Vec3 = [0, 0, 1];
const ZERO: Vec3 = [0, 0, 0];

/** Centre of the left hip joint. */
export const hipJoint = (f: Figure): Vec3 => [0.24 * f.HB, HIP_HEIGHT_MM, HIP_FORWARD_MM];

/** Turns a point below a left knee towards the other leg. */
export const leanInwards = (p: Vec3, knee: Vec3, angleRad: number): Vec3 =>
  angleRad === 0 ? p : add(knee, turnAbout(sub(p, knee), FORWARDS, -angleRad));

/** Joints of a leg before it turns towards the other one, and that turn; a share of it where given. */
interface LegBends {
  hip: Vec3;
  knee: Vec3;
  ankle: Vec3;
  across: (p: Vec3, share?: number) => Vec3;
}

/** What carries the parts of a left leg to their places, one bend after the other. */
export function legBends(f: Figure, { thighRad, shinRad, inwardRad, acrossRad }: LegStance): LegBends {
  const hip = hipJoint(f);
  const rest = restKnee(f);
  const knee = turnAboutX(rest, hip, thighRad);
  const shin = turnAboutX(leanInwards(sub(restAnkle(f), rest), ZERO, inwardRad), ZERO, shinRad);
  const across = (p: Vec3, share = 1): Vec3 => (acrossRad === 0 ? p : turnAboutY(p, hip, -acrossRad * share));
  return { hip, knee, ankle: add(knee, shin), across };
}

/** Where the hip, knee and ankle of a leg lie, as if it were the left one. */
export function legLine(f: Figure, leg: LegStance): { hip: Vec3; knee: Vec3; ankle: Vec3 } {
  const { hip, knee, ankle, across } = legBends(f, leg);
  return { hip, knee: across(knee), ankle: across(ankle) };
}

/** Turns a direction of a level left foot as the leg has it. */
export const turnFoot = ({ footRad, toesOutRad, footInwardRad, acrossRad }: LegStance, v: Vec3): Vec3 =>
  turnAboutY(turnAboutX(leanInwards(v, ZERO, footInwardRad), ZERO, footRad), ZERO, toesOutRad - acrossRad);

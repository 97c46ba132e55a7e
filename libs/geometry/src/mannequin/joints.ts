import type { Vec3 } from '../parts/part.ts';
import { toRoom, type BodyPlacement } from './body-placement.ts';
import type { Figure } from './figure.ts';
import { legLine, turnFoot } from './leg-line.ts';
import {
  HIP_FORWARD_MM,
  HIP_HEIGHT_MM,
  bendPoint,
  chestRad,
  mirror,
  shoulderLineMm,
  type Stance,
} from './stance.ts';
import { add, along, turnAboutX } from './vector.ts';

type Paired = 'shoulder' | 'elbow' | 'wrist' | 'fingertip' | 'hip' | 'knee' | 'ankle' | 'heel' | 'toe';

/** Joint centres and landmarks in the room frame; pairs by the sitter's own left and right. */
export type MannequinJoints = {
  pelvis: Vec3;
  neck: Vec3;
  eye: Vec3;
  crown: Vec3;
} & { [K in Paired as `left${Capitalize<K>}` | `right${Capitalize<K>}`]: Vec3 };

/** Joint centres of a body in a stance, in the room. */
export function bodyJoints(f: Figure, stance: Stance, placement: BodyPlacement): MannequinJoints {
  const zS = shoulderLineMm(f);
  const giveBack = stance.headRad - chestRad(stance);
  const neck = bendPoint(f, stance, [0, f.AH + 20, zS - 14]);
  const onHead = (p: Vec3): Vec3 => {
    const skullBase: Vec3 = bendPoint(f, stance, [0, f.EH - 0.35 * (f.SH - f.EH), zS]);
    const pivot = turnAboutX(skullBase, neck, 0.4 * giveBack);
    return turnAboutX(turnAboutX(bendPoint(f, stance, p), neck, 0.4 * giveBack), pivot, 0.6 * giveBack);
  };
  const out = (p: Vec3): Vec3 => toRoom(placement, p);
  const pair = (side: 'left' | 'right'): Record<Paired, Vec3> => {
    const n = side === 'left' ? 0 : 1;
    const arm = stance.arms[n];
    const leg = legLine(f, stance.legs[n]);
    const foot = (p: Vec3): Vec3 => add(leg.ankle, turnFoot(stance.legs[n], p));
    const flip = (p: Vec3): Vec3 => out(side === 'left' ? p : mirror(p));
    const sole = -f.MH - stance.shoeMm;
    return {
      shoulder: flip(arm.shoulder),
      elbow: flip(arm.elbow),
      wrist: flip(arm.wrist),
      fingertip: flip(along(arm.wrist, arm.hand, f.Ha)),
      hip: flip(leg.hip),
      knee: flip(leg.knee),
      ankle: flip(leg.ankle),
      heel: flip(foot([0, sole, -0.255 * f.FL])),
      toe: flip(foot([0, sole, 0.745 * f.FL])),
    };
  };
  const left = pair('left');
  const right = pair('right');
  return {
    pelvis: out([0, HIP_HEIGHT_MM, HIP_FORWARD_MM]),
    neck: out(neck),
    eye: out(onHead([0, f.EH, zS + 1 + 0.54 * f.HL])),
    crown: out(onHead([0, f.SH, zS + 6 + 0.04 * f.HL])),
    leftShoulder: left.shoulder,
    leftElbow: left.elbow,
    leftWrist: left.wrist,
    leftFingertip: left.fingertip,
    leftHip: left.hip,
    leftKnee: left.knee,
    leftAnkle: left.ankle,
    leftHeel: left.heel,
    leftToe: left.toe,
    rightShoulder: right.shoulder,
    rightElbow: right.elbow,
    rightWrist: right.wrist,
    rightFingertip: right.fingertip,
    rightHip: right.hip,
    rightKnee: right.knee,
    rightAnkle: right.ankle,
    rightHeel: right.heel,
    rightToe: right.toe,
  };
}

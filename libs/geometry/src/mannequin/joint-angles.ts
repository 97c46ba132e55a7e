import { degrees } from '../units/angle.ts';
import type { JointLimit, JointRanges } from './joint-ranges.ts';
import type { MannequinPose } from './pose.ts';
import { chestRad, direction, type ArmStance, type LegStance, type Stance } from './stance.ts';
import { clamp, dot, turnAboutX } from './vector.ts';

type Motion = Pick<JointLimit, 'joint' | 'motion'>;

/** One bend of a body, degrees; `side` where the two sides differ. */
export interface JointAngle extends Motion {
  side?: 'left' | 'right';
  deg: number;
}

/** A bend beyond what most people manage: a warning, never a verdict. */
export interface JointWarning extends JointAngle {
  limitDeg: number;
  source: JointLimit['source'];
}

function armAngles(arm: ArmStance, stance: Stance): Omit<JointAngle, 'side'>[] {
  const upper = direction(arm.shoulder, arm.elbow);
  const forearm = direction(arm.elbow, arm.wrist);
  const [out, up, ahead] = turnAboutX(upper, [0, 0, 0], -chestRad(stance));
  const forwards = degrees(Math.atan2(ahead, -up));
  const bent = degrees(Math.asin(clamp(dot(forearm, arm.handBack), -1, 1)));
  return [
    { joint: 'shoulder', motion: 'flexion', deg: forwards },
    { joint: 'shoulder', motion: 'extension', deg: -forwards },
    { joint: 'shoulder', motion: 'abduction', deg: degrees(Math.atan2(out, Math.hypot(up, ahead))) },
    { joint: 'elbow', motion: 'flexion', deg: degrees(Math.acos(clamp(dot(upper, forearm), -1, 1))) },
    { joint: 'wrist', motion: 'flexion', deg: bent },
    { joint: 'wrist', motion: 'extension', deg: -bent },
  ];
}

function legAngles(
  { thighRad, acrossRad, shinRad, footRad, inwardRad }: LegStance,
  { trunkRad, slumpRad }: Stance,
): Omit<JointAngle, 'side'>[] {
  const ankle = degrees(footRad - shinRad);
  return [
    { joint: 'hip', motion: 'flexion', deg: 90 + degrees(trunkRad - slumpRad - thighRad) },
    { joint: 'hip', motion: 'adduction', deg: degrees(acrossRad) },
    {
      joint: 'hip',
      motion: 'rotation',
      deg: degrees(Math.atan2(Math.tan(inwardRad), Math.cos(shinRad - thighRad))),
    },
    { joint: 'knee', motion: 'flexion', deg: 90 + degrees(shinRad - thighRad) },
    { joint: 'ankle', motion: 'plantar flexion', deg: ankle },
    { joint: 'ankle', motion: 'dorsiflexion', deg: -ankle },
  ];
}

/**
 * The bends of a posed body as a clinic counts them: 0 standing with hanging arms, feet square to the shins.
 *
 * @param pose - a posed body
 * @returns degrees, below 0 the other way
 */
export function jointAngles({ stance }: Pick<MannequinPose, 'stance'>): JointAngle[] {
  const [left, right] = stance.legs.map((leg) => legAngles(leg, stance));
  return [
    ...left!.flatMap((angle, i): JointAngle[] => {
      const other = right![i]!;
      return angle.deg === other.deg
        ? [angle]
        : [
            { ...angle, side: 'left' },
            { ...other, side: 'right' },
          ];
    }),
    ...(['left', 'right'] as const).flatMap((side, i) =>
      armAngles(stance.arms[i]!, stance).map((angle) => ({ ...angle, side })),
    ),
  ];
}

/**
 * Bends of a posed body that go beyond the published ranges.
 *
 * @param pose - a posed body
 * @param ranges - from `readJointRanges`
 * @returns warnings, the furthest beyond its limit first
 */
export function jointWarnings(pose: Pick<MannequinPose, 'stance'>, { limits }: JointRanges): JointWarning[] {
  return jointAngles(pose)
    .flatMap((angle) => {
      const limit = limits.find(({ joint, motion }) => joint === angle.joint && motion === angle.motion);
      return limit && angle.deg > limit.deg ? [{ ...angle, limitDeg: limit.deg, source: limit.source }] : [];
    })
    .sort((a, b) => b.deg - b.limitDeg - (a.deg - a.limitDeg));
}

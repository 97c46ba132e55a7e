import type { Vec3 } from '../parts/part.ts';
import type { BodyPlacement } from './body-placement.ts';
import type { Figure } from './figure.ts';
import type { MannequinJoints } from './joints.ts';
import { mixPoints } from './vector.ts';

/** What a stretch of the body wears. */
export type MannequinTag = 'head' | 'hand' | 'shoe' | 'suit';

/** A simple solid along the body, room frame, millimetres. */
export type MannequinSegment =
  | {
      kind: 'rounded-cone';
      tag: MannequinTag;
      name: string;
      fromMm: Vec3;
      toMm: Vec3;
      fromRadiusMm: number;
      toRadiusMm: number;
    }
  | {
      kind: 'ellipsoid';
      tag: MannequinTag;
      name: string;
      centreMm: Vec3;
      /** Half axes across the sitter, upwards and forwards. */
      radiiMm: Vec3;
      facingRad: number;
    };

/** Simple solids of a body from its joints. */
export function bodySegments(
  f: Figure,
  joints: MannequinJoints,
  placement: BodyPlacement,
): MannequinSegment[] {
  const { radius } = f;
  const cone = (
    tag: MannequinTag,
    name: string,
    fromMm: Vec3,
    toMm: Vec3,
    fromRadiusMm: number,
    toRadiusMm: number,
  ): MannequinSegment => ({ kind: 'rounded-cone', tag, name, fromMm, toMm, fromRadiusMm, toRadiusMm });
  const limbs = (['left', 'right'] as const).flatMap((side) => [
    cone('suit', `${side} thigh`, joints[`${side}Hip`], joints[`${side}Knee`], f.TC / 2, radius.knee),
    cone('suit', `${side} shin`, joints[`${side}Knee`], joints[`${side}Ankle`], radius.knee, radius.ankle),
    cone('shoe', `${side} foot`, joints[`${side}Ankle`], joints[`${side}Toe`], f.FB / 2, 0.14 * f.FL),
    cone(
      'suit',
      `${side} upper arm`,
      joints[`${side}Shoulder`],
      joints[`${side}Elbow`],
      radius.arm,
      radius.elbow,
    ),
    cone(
      'suit',
      `${side} forearm`,
      joints[`${side}Elbow`],
      joints[`${side}Wrist`],
      radius.forearm,
      radius.wrist,
    ),
    cone('hand', `${side} hand`, joints[`${side}Wrist`], joints[`${side}Fingertip`], 0.2 * f.Ha, 0.12 * f.Ha),
  ]);
  const trunkMiddle = mixPoints(joints.pelvis, joints.neck, 0.45);
  return [
    {
      kind: 'ellipsoid',
      tag: 'suit',
      name: 'trunk',
      centreMm: trunkMiddle,
      radiiMm: [f.HB / 2, 0.56 * (f.AH - 40), f.AD / 2],
      facingRad: placement.facingRad,
    },
    cone(
      'head',
      'neck',
      joints.neck,
      mixPoints(joints.neck, joints.crown, 0.4),
      radius.neck,
      radius.neck * 0.93,
    ),
    {
      kind: 'ellipsoid',
      tag: 'head',
      name: 'head',
      centreMm: mixPoints(joints.neck, joints.crown, 0.66),
      radiiMm: [f.HBr / 2, (f.SH - f.EH) * 1.02, f.HL / 2],
      facingRad: placement.facingRad,
    },
    ...limbs,
  ];
}

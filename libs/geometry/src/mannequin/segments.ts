import type { Vec3 } from '../parts/part.ts';
import { toRoom, type BodyPlacement } from './body-placement.ts';
import type { Figure } from './figure.ts';
import { leanInwards, legBends, turnFoot } from './leg-line.ts';
import { thighRings } from './leg-sections.ts';
import {
  bendPoint,
  bicepsTuck,
  chestRad,
  direction,
  elbowFlesh,
  HIP_FORWARD_MM,
  kneeRadius,
  mirror,
  restAnkle,
  restElbowFlesh,
  restKnee,
  restShoulder,
  shoulderLineMm,
  type ArmStance,
  type Stance,
} from './stance.ts';
import { chestFront, chestHalf, chestHeight, trunkLevels } from './trunk-profile.ts';
import { add, along, clamp, cross, length, mix, sub, turnAboutX, unit } from './vector.ts';

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
      /** Turn about the sitter's left-hand axis; positive leans forward. */
      leanRad: number;
    };

/** A ball of the body: centre in the body frame, radius. */
type Ball = readonly [centre: Vec3, radius: number];
type Stretch = readonly [tag: MannequinTag, name: string, from: Ball, to: Ball];

/** Solids of one leg as if it were the left: top of the thigh, knee, calf and foot lie where the skin has them. */
function legStretches(f: Figure, stance: Stance, side: 0 | 1): Stretch[] {
  const leg = stance.legs[side];
  const { thighRad, shinRad, footRad, toesOutRad, inwardRad } = leg;
  const { hip, knee, ankle, across } = legBends(f, leg);
  const kneeRest = restKnee(f);
  const [first] = thighRings(f);
  const onThigh = (p: Vec3): Vec3 => across(turnAboutX(p, hip, thighRad));
  const onShin = (p: Vec3): Vec3 =>
    across(turnAboutX(leanInwards(add(knee, sub(p, kneeRest)), knee, inwardRad), knee, shinRad));
  const onFoot = ([x, y, z]: Vec3): Vec3 => add(across(ankle), turnFoot(leg, [x, y, z - FOOT_BACK_MM]));
  const cap = kneeRadius(f);
  const calf = (f.BKL - f.BPL - 7) / 2;
  const heel = 0.34 * f.FB;
  const toe = 0.22 * f.FB;
  const sole = -f.MH - stance.shoeMm;
  const thigh: Ball = [onThigh([first.centreX, f.TC / 2, first.z]), f.TC / 2];
  // A heel turned against the shin keeps some of its flesh with the shin.
  const heelIn = clamp(HEEL_IN_MM * (footRad - shinRad), -3, 9);
  const heelBall: Ball = [onFoot([0, sole + heel, heel + heelIn - 0.255 * f.FL]), heel];
  // Toes turned out stay as long as the skin is, though the inner ball comes forward.
  const toeBall = (out: number): Ball => [
    onFoot([
      out * (f.FB / 2 - toe),
      sole + toe,
      0.745 * f.FL - toe - (out < 0 ? (f.FB / 2 - toe) * Math.sin(toesOutRad) : 0),
    ]),
    toe,
  ];
  return [
    ['suit', 'thigh root', [onThigh([first.centreX, f.TC / 2, HIP_FORWARD_MM]), f.TC / 2], thigh],
    ['suit', 'thigh', thigh, [onThigh([kneeRest[0], f.KH - f.PH - cap, f.BKL - cap]), cap]],
    [
      'suit',
      'shin',
      [onShin([kneeRest[0], -30, f.BPL + calf]), calf],
      [onShin(restAnkle(f)), f.radius.ankle],
    ],
    ['shoe', 'foot', heelBall, toeBall(1)],
    ['shoe', 'foot inside', heelBall, toeBall(-1)],
  ];
}

/** Solids of a left arm: shoulder, elbow and fingertips lie where the skin has them. */
function armStretches(f: Figure, arm: ArmStance): Stretch[] {
  const flesh = elbowFlesh(f, arm);
  const u = direction(arm.shoulder, flesh);
  const lateral = unit(cross(direction(flesh, arm.wrist), u), [1, 0, 0]);
  const { radius, Ha } = f;
  const flush = bicepsTuck(f) + 0.11 * (f.FF - f.BD);
  const middle = along(along(arm.shoulder, u, 0.52 * length(sub(flesh, arm.shoulder))), lateral, -flush);
  const biceps: Ball = [middle, 0.96 * radius.arm];
  // The tip of the elbow lies a little beyond its centre.
  const elbow: Ball = [along(flesh, u, restElbowFlesh(f)[1] - f.ER - radius.elbow), radius.elbow];
  return [
    ['suit', 'shoulder', [arm.shoulder, f.BD / 2 - restShoulder(f)[0]], biceps],
    ['suit', 'upper arm', biceps, elbow],
    ['suit', 'forearm', elbow, [arm.wrist, radius.wrist]],
    ['hand', 'hand', [arm.wrist, 0.14 * Ha], [along(arm.wrist, arm.hand, 0.93 * Ha), 0.07 * Ha]],
  ];
}

/**
 * Simple solids along a body, for distances and quick drawings. Where a check measures (top of the thigh, knee, back of
 * the knee, elbow, shoulders, belly, buttock, head, foot) they reach as far as the near mesh, within 3 mm; of crossed legs
 * and the arms over them within 25.
 *
 * @param f - the figure as wanted
 * @param stance - its bends
 * @param placement - where it is
 * @returns solids in the room frame, millimetres
 */
export function bodySegments(f: Figure, stance: Stance, placement: BodyPlacement): MannequinSegment[] {
  const out = (p: Vec3): Vec3 => toRoom(placement, p);
  const solid = ([tag, name, from, to]: Stretch, side?: 'left' | 'right'): MannequinSegment => {
    const flip = (p: Vec3): Vec3 => out(side === 'right' ? mirror(p) : p);
    return {
      kind: 'rounded-cone',
      tag,
      name: side ? `${side} ${name}` : name,
      fromMm: flip(from[0]),
      toMm: flip(to[0]),
      fromRadiusMm: from[1],
      toRadiusMm: to[1],
    };
  };
  const limbs = ([0, 1] as const).flatMap((n) =>
    [...legStretches(f, stance, n), ...armStretches(f, stance.arms[n])].map((each) =>
      solid(each, n === 0 ? 'left' : 'right'),
    ),
  );
  const chest = chestRad(stance);
  const blob = (
    tag: MannequinTag,
    name: string,
    centre: Vec3,
    radiiMm: Vec3,
    bodyLean: number,
  ): MannequinSegment => ({
    kind: 'ellipsoid',
    tag,
    name,
    centreMm: out(centre),
    radiiMm,
    facingRad: placement.facingRad,
    leanRad: bodyLean - placement.tiltRad,
  });
  const zS = shoulderLineMm(f);
  const belly = trunkLevels(f)[2]!;
  const hollow = beltHollow(f);
  const front = f.AD + hollow;
  const skull = 0.99 * (f.SH - f.EH);
  const giveBack = stance.headRad - chest;
  const neckBase = bendPoint(f, stance, [0, f.AH + 20, zS - 14]);
  const head = turnAboutX(bendPoint(f, stance, [0, f.SH - skull, zS + 6 + 0.04 * f.HL]), neckBase, giveBack);
  const yoke: Vec3 = bendPoint(f, stance, [f.BA / 2 - YOKE_MM, f.AH - YOKE_MM, zS]);
  return [
    blob('suit', 'pelvis', [0, 92, 128], [f.HB / 2, 92, 128], 0),
    blob(
      'suit',
      'belly',
      bendPoint(f, stance, [0, belly.y, (front + hollow) / 2], 0.55, 0.15),
      [belly.halfWidth, 0.5 * (chestHeight(f) - 60), f.AD / 2],
      chest / 2,
    ),
    blob(
      'suit',
      'chest',
      bendPoint(f, stance, [0, mix(belly.y, f.AH, 0.62), 12 + f.CD / 2]),
      [chestHalf(f), 0.38 * (f.AH - f.TC), (chestFront(f) - 12) / 2],
      chest,
    ),
    solid(['suit', 'shoulders', [yoke, YOKE_MM], [mirror(yoke), YOKE_MM]]),
    solid(['head', 'neck', [neckBase, f.radius.neck], [head, 0.93 * f.radius.neck]]),
    blob('head', 'head', head, [f.HBr / 2, skull, f.HL / 2], stance.headRad),
    ...limbs,
  ];
}

/** How far the back of the belt stands before the rearmost buttock: less on a thin body. */
const beltHollow = (f: Figure): number => mix(26.5, 22.5, clamp((23 - f.bodyMassIndex) / 5, 0, 1));
const YOKE_MM = 45;
const HEEL_IN_MM = 22;
/** The solved skin has its feet this much further back than the joints, give or take 2. */
const FOOT_BACK_MM = 1.5;

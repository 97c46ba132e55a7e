import type { MeasureKey, PlaceSituation } from '@settlewright/anthropometry';
import type { Vec3 } from '../parts/part.ts';
import { armOnLap, armOnTable } from './arm-stance.ts';
import { bodyPlacement, toBody, toRoom, type BodyPlacement } from './body-placement.ts';
import type { Figure, FigureMeans } from './figure.ts';
import { readFigure } from './figure.ts';
import { bodyJoints, type MannequinJoints } from './joints.ts';
import { bodySegments, type MannequinSegment } from './segments.ts';
import {
  bendPoint,
  chestRad,
  HIP_FORWARD_MM,
  HIP_HEIGHT_MM,
  restAnkle,
  restKnee,
  shoulderLineMm,
  waistPivot,
  type Stance,
  type TrunkBend,
} from './stance.ts';
import { clamp, mix, turnAboutX } from './vector.ts';

/** Where a place stands, as the mannequin needs it; a `PlaceFrame` is one. */
export interface SeatPoint {
  /** On the unpressed seat, 135 mm before the back, on the place's centreline; room frame. */
  hipMm: Vec3;
  /** Turn about the vertical; 0 looks along +z. */
  facingRad: number;
}

/** What of the place's situation bends the body. */
export type SeatPosture = Pick<
  PlaceSituation,
  'effectiveDepthMm' | 'seatTiltRad' | 'backLeanRad' | 'backTopMm'
> & {
  table?: Pick<NonNullable<PlaceSituation['table']>, 'topMm' | 'overlapMm'> | undefined;
};

/** Something about the pose worth saying; `valueMm` where it has a size. */
export interface PoseNote {
  kind: 'feet-hang' | 'slides-forward' | 'knees-lift' | 'forearms-on-table' | 'hands-on-lap';
  valueMm?: number;
}

/** A seated body: its bends, where it is, and what follows from both. */
export interface MannequinPose {
  /** The measures it was made from. */
  means: FigureMeans;
  stance: Stance;
  placement: BodyPlacement;
  /** Joint centres in the room frame, millimetres. */
  joints: MannequinJoints;
  /** Simple solids along the body, room frame, for distances and quick drawings. */
  segments: MannequinSegment[];
  notes: PoseNote[];
  /** Top of the head above the floor. */
  headTopMm: number;
  /** Eye above the floor. */
  eyeMm: number;
  /** Sole of the shoe above the floor; 0 when the feet stand. */
  heelGapMm: number;
}

const SHIN_FURTHEST_RAD = (28 * Math.PI) / 180;
const LEAN_FURTHEST_RAD = (20 * Math.PI) / 180;
const TOES_DOWN_RAD = (18 * Math.PI) / 180;
/** Room left behind the knee before the sitter slides forward. */
const BEHIND_KNEE_MM = 50;

/** Everyday flat sole; a higher heel is taken to stand on a sole of this thickness. */
const FLAT_SOLE_MM = 25;
const SLUMP_FURTHEST_RAD = 0.6;

/** Height of the base of the skull, and so of the eye but for a constant, with the head held at an angle. */
function skullLevel(f: Figure, bend: TrunkBend, headRad: number): number {
  const zS = shoulderLineMm(f);
  const neck = bendPoint(f, bend, [0, f.AH + 20, zS - 14]);
  const base = bendPoint(f, bend, [0, f.EH - 0.35 * (f.SH - f.EH), zS]);
  return turnAboutX(base, neck, 0.4 * (headRad - chestRad(bend)))[1];
}

/** The bend that lowers the eye by so much. */
function slumpFor(f: Figure, trunkRad: number, headRad: number, slumpMm: number): number {
  if (!(slumpMm > 0)) return 0;
  const upright = skullLevel(f, { trunkRad, slumpRad: 0 }, headRad);
  let [low, high] = [0, SLUMP_FURTHEST_RAD];
  for (let i = 0; i < 24; i++) {
    const middle = (low + high) / 2;
    if (upright - skullLevel(f, { trunkRad, slumpRad: middle }, headRad) < slumpMm) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/** How far the pelvis moves forward so that a slumped back still rests where the upright one did. */
const pelvisForward = (f: Figure, slumpRad: number): number =>
  Math.sin(slumpRad) * (waistPivot(f)[1] - HIP_HEIGHT_MM);

interface Legs {
  thighRad: number;
  shinRad: number;
  footRad: number;
  heelGapMm: number;
  kneesLift: boolean;
}

/** Thighs along the seat, feet on the floor if they reach it: shins forward when the seat is low, hanging when high. */
function legsFor(f: Figure, placement: BodyPlacement, shoeMm: number): Legs {
  const hipAxis: Vec3 = [0, HIP_HEIGHT_MM, HIP_FORWARD_MM];
  const shinMm = restKnee(f)[1] - restAnkle(f)[1];
  const footMm = f.MH + shoeMm;
  const kneeHeight = (thighRad: number): number =>
    toRoom(placement, turnAboutX(restKnee(f), hipAxis, thighRad))[1];
  const upright = placement.tiltRad;
  const cosine = (kneeHeight(0) - footMm) / shinMm;
  if (cosine >= 1) {
    const gap = kneeHeight(0) - footMm - shinMm;
    const toes = Math.min(TOES_DOWN_RAD, Math.asin(clamp(gap / (0.72 * f.FL), 0, 1)));
    return { thighRad: 0, shinRad: upright, footRad: upright + toes, heelGapMm: gap, kneesLift: false };
  }
  const shin = Math.acos(clamp(cosine, -1, 1));
  if (shin <= SHIN_FURTHEST_RAD) {
    return { thighRad: 0, shinRad: upright - shin, footRad: upright, heelGapMm: 0, kneesLift: false };
  }
  let low = 0;
  let high = Math.PI / 3;
  for (let i = 0; i < 24; i++) {
    const middle = (low + high) / 2;
    if (kneeHeight(-middle) < shinMm * Math.cos(SHIN_FURTHEST_RAD) + footMm) low = middle;
    else high = middle;
  }
  return {
    thighRad: -(low + high) / 2,
    shinRad: upright - SHIN_FURTHEST_RAD,
    footRad: upright,
    heelGapMm: 0,
    kneesLift: true,
  };
}

/**
 * Seats a body at a place: pelvis on the pressed seat with the buttock against the back, unless the seat
 * is deeper than the buttock-popliteal length less 50 mm; trunk with the back, head level, thighs along
 * the seat, feet on the floor or hanging, forearms on a table in reach or hands on the lap.
 *
 * @param input.means - the sitter's measures (mm, weight kg); the pose keeps a reference
 * @param input.shoeMm - height of the shoe under the heel, mm
 * @param input.frame - the place: hip point on the unpressed seat, facing
 * @param input.situation - depth, tilt, lean and table of the place
 * @param input.sinkMm - how far the seat goes down under this sitter, mm
 * @param input.forefootMm - sole under the ball of the foot, mm; the heel's height when that is less, 25 otherwise
 * @param input.slumpMm - how much lower the eye is than upright, mm; 0 when absent. The pelvis moves forward, belt and
 * chest bend against each other
 * @returns the pose; throws a RangeError naming the measure when one is missing
 * @source hip centre 92 mm over the seat and 135 mm before the buttock: SAE J826 device figures and
 * survey links; behind-knee gap 50 mm: common practice; everyday shoes 25 to 45 mm and a slump of up to 40 mm: City
 * University of Hong Kong, Online Anthropometry, chapters 1 and 4; the shape of the slump by eye
 */
export function poseMannequin(input: {
  means: Record<MeasureKey, number> | FigureMeans;
  shoeMm: number;
  frame: SeatPoint;
  situation: SeatPosture;
  sinkMm: number;
  forefootMm?: number;
  slumpMm?: number;
}): MannequinPose {
  const { means, shoeMm, frame, situation, sinkMm } = input;
  const f = readFigure(means);
  const notes: PoseNote[] = [];
  const slideMm = Math.max(0, situation.effectiveDepthMm - (f.BPL - BEHIND_KNEE_MM));
  if (slideMm > 0) notes.push({ kind: 'slides-forward', valueMm: slideMm });
  const upright = situation.seatTiltRad;
  const lean = situation.backTopMm === undefined ? 0 : clamp(situation.backLeanRad, 0, LEAN_FURTHEST_RAD);
  const trunkRad = upright - lean;
  const headRad = mix(trunkRad, upright, 0.9);
  const slumpRad = slumpFor(f, trunkRad, headRad, input.slumpMm ?? 0);
  const bend = { trunkRad, slumpRad };
  const placement = bodyPlacement(frame, upright, sinkMm, slideMm + pelvisForward(f, slumpRad));

  const legs = legsFor(f, placement, shoeMm);
  if (legs.heelGapMm > 0.5) notes.push({ kind: 'feet-hang', valueMm: legs.heelGapMm });
  if (legs.kneesLift) notes.push({ kind: 'knees-lift' });

  const up: Vec3 = [0, Math.cos(upright), Math.sin(upright)];
  const edge =
    situation.table && toBody(placement, tableEdge(frame, situation.table, situation.effectiveDepthMm));
  const onTable = edge && armOnTable(f, bend, { topMm: edge[1], edgeMm: edge[2] }, up);
  notes.push({ kind: onTable ? 'forearms-on-table' : 'hands-on-lap' });
  const arm = onTable ?? armOnLap(f, bend);

  const stance: Stance = {
    trunkRad,
    slumpRad,
    headRad,
    thighRad: legs.thighRad,
    shinRad: legs.shinRad,
    footRad: legs.footRad,
    toesOutRad: 0.12,
    arms: [arm, arm],
    shoeMm,
    forefootMm: Math.min(input.forefootMm ?? FLAT_SOLE_MM, shoeMm),
  };
  const joints = bodyJoints(f, stance, placement);
  return {
    means,
    stance,
    placement,
    joints,
    segments: bodySegments(f, stance, placement),
    notes,
    headTopMm: joints.crown[1],
    eyeMm: joints.eye[1],
    heelGapMm: legs.heelGapMm,
  };
}

/** The near edge of the table's top on the place's centreline, room frame. */
function tableEdge(frame: SeatPoint, table: { topMm: number; overlapMm: number }, depthMm: number): Vec3 {
  const forward = depthMm - table.overlapMm - HIP_FORWARD_MM;
  return [
    frame.hipMm[0] + Math.sin(frame.facingRad) * forward,
    table.topMm,
    frame.hipMm[2] + Math.cos(frame.facingRad) * forward,
  ];
}

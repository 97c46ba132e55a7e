import type { MeasureKey, PlaceSituation, PlaceTableSituation } from '@settlewright/anthropometry';
import type { Vec3 } from '../parts/part.ts';
import type { PostureChoice } from '../room/posture-choice.ts';
import { armsFor, sillsOf } from './arm-posture.ts';
import { bodyPlacement, toBody, type BodyPlacement } from './body-placement.ts';
import type { FigureMeans } from './figure.ts';
import { readFigure } from './figure.ts';
import { bodyJoints, type MannequinJoints } from './joints.ts';
import { bodySegments, type MannequinSegment } from './segments.ts';
import type { FeetMoved, FootRail } from './leg-posture.ts';
import { sittingLegs } from './sitting-legs.ts';
import { HIP_FORWARD_MM, type Stance } from './stance.ts';
import { feetOutOfTheWay, type PoseNote } from './pose-note.ts';
import { trunkFor, upOn } from './trunk-posture.ts';

export type { PoseNote } from './pose-note.ts';

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
  table?:
    | (Pick<PlaceTableSituation, 'topMm' | 'overlapMm'> & Partial<Pick<PlaceTableSituation, 'undersideMm'>>)
    | undefined;
  sills?:
    | readonly Pick<PlaceSituation['sills'][number], 'side' | 'topMm' | 'centreToEdgeMm' | 'usableDepthMm'>[]
    | undefined;
  footRail?: FootRail | undefined;
};

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

/** Room left behind the knee before the sitter slides forward. */
const BEHIND_KNEE_MM = 50;

/** Everyday flat sole; a higher heel is taken to stand on a sole of this thickness. */
const FLAT_SOLE_MM = 25;
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
 * @param input.feet - how far feet keep away from others, from `feetClear`; those on a rail or crossed do not
 * @param input.choice - what somebody chose of the posture; absent parts are as above
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
  feet?: FeetMoved;
  choice?: PostureChoice | undefined;
}): MannequinPose {
  const { means, shoeMm, situation, sinkMm, choice = {} } = input;
  const f = readFigure(means);
  const notes: PoseNote[] = [];
  const slideMm = Math.max(0, situation.effectiveDepthMm - (f.BPL - BEHIND_KNEE_MM));
  if (slideMm > 0) notes.push({ kind: 'slides-forward', valueMm: slideMm });
  const tilt = situation.seatTiltRad;
  const { bend, headRad, forwardMm } = trunkFor(f, situation, choice.trunk, input.slumpMm ?? 0);
  const { leftMm, aheadMm } = choice.nudge ?? { leftMm: 0, aheadMm: 0 };
  const frame = moved(input.frame, leftMm, aheadMm);
  const forward = slideMm + forwardMm;
  const placement = bodyPlacement(frame, tilt, sinkMm, forward);
  if (choice.trunk === 'upright' && situation.backTopMm !== undefined) notes.push({ kind: 'sits-upright' });
  if (choice.trunk === 'slumped') notes.push({ kind: 'slumps' });

  const { footRail, table } = situation;
  const shoe = { shoeMm, forefootMm: Math.min(input.forefootMm ?? FLAT_SOLE_MM, shoeMm) };
  const overLap = (heightMm: number, from: NonNullable<SeatPosture['table']>): Vec3 =>
    toBody(placement, tableEdge(input.frame, from, heightMm, situation.effectiveDepthMm));
  const edge = table && overLap(table.topMm, table);
  const under = table?.undersideMm === undefined ? undefined : overLap(table.undersideMm, table);
  const {
    legs,
    heelGapMm,
    notes: legNotes,
  } = sittingLegs(
    f,
    {
      placement,
      shoe,
      footRail: footRail && { ...footRail, aheadOfHipMm: footRail.aheadOfHipMm - aheadMm - forward },
      seatFrontMm: situation.effectiveDepthMm - forward,
      table: under && { undersideMm: under[1], edgeMm: under[2] },
      feet: input.feet,
    },
    choice.feet,
  );
  notes.push(...legNotes);

  const rests = {
    table: edge && { topMm: edge[1], edgeMm: edge[2] },
    sills: sillsOf(situation.sills ?? [], placement.originMm[1], leftMm),
  };
  const { arms, notes: armNotes } = armsFor(f, bend, legs, rests, upOn(tilt), choice.arms);
  notes.push(...armNotes);
  if (feetOutOfTheWay(notes) || Object.values(choice).some((value) => value !== undefined)) {
    notes.push({ kind: 'not-as-checked' });
  }

  const stance: Stance = { ...bend, headRad, legs, arms, ...shoe };
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
    heelGapMm,
  };
}

/** A place moved to the sitter's left and forwards. */
function moved({ hipMm, facingRad }: SeatPoint, leftMm: number, aheadMm: number): SeatPoint {
  const [s, c] = [Math.sin(facingRad), Math.cos(facingRad)];
  return {
    hipMm: [hipMm[0] + leftMm * c + aheadMm * s, hipMm[1], hipMm[2] - leftMm * s + aheadMm * c],
    facingRad,
  };
}

/** The near edge of the table, at a height, on the place's centreline, room frame. */
function tableEdge(
  frame: SeatPoint,
  { overlapMm }: { overlapMm: number },
  heightMm: number,
  depthMm: number,
): Vec3 {
  const forward = depthMm - overlapMm - HIP_FORWARD_MM;
  return [
    frame.hipMm[0] + Math.sin(frame.facingRad) * forward,
    heightMm,
    frame.hipMm[2] + Math.cos(frame.facingRad) * forward,
  ];
}

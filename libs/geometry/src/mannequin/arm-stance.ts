import type { Vec3 } from '../parts/part.ts';
import type { Figure } from './figure.ts';
import { reachFor, type Reach } from './limb-reach.ts';
import { obstacles, overlap, type Rest, type ThighTop } from './arm-clearance.ts';
import type { Lap } from './lap.ts';
import {
  armLinks,
  bendPoint,
  elbowFlesh,
  measuringStance,
  restKnee,
  restShoulder,
  type ArmStance,
  type TrunkBend,
} from './stance.ts';
import { add, along, cross, length, mix, sub, unit } from './vector.ts';

const POLE: Vec3 = [0.15, -0.8, -0.6];
const SWIVEL_STEP_RAD = 0.1;
const MOST_SWIVELS = 14;

/** A place for the wrist and how much it is wanted less than the best one. */
interface Wish {
  wrist: Vec3;
  dislike: number;
}

/** The least turned and least stretched arm that is clear of trunk, back and table. */
function bestReach(f: Figure, bend: TrunkBend, wishes: Wish[], under: Rest | ThighTop): Reach {
  const shoulder = bendPoint(f, bend, restShoulder(f));
  const { upperMm, forearmMm } = armLinks(f);
  const among = obstacles(f, bend, shoulder, under);
  let best: { reach: Reach; cost: number } | undefined;
  for (const { wrist, dislike } of wishes) {
    const straightness = length(sub(wrist, shoulder)) / (upperMm + forearmMm);
    const atLeast = dislike + 5 * Math.max(0, straightness - 0.84) + 20 * Math.max(0, straightness - 0.99);
    for (let step = 0; step <= MOST_SWIVELS; step++) {
      const least = atLeast + step * SWIVEL_STEP_RAD;
      if (best && least >= best.cost) break;
      const reach = reachFor(shoulder, wrist, upperMm, forearmMm, POLE, step * SWIVEL_STEP_RAD);
      const flesh = elbowFlesh(f, { shoulder, elbow: reach.middle, wrist: reach.end });
      const cost = least + overlap(flesh, reach.end, among, best && best.cost - least);
      if (!best || cost < best.cost) best = { reach, cost };
    }
  }
  return best?.reach ?? reachFor(shoulder, shoulder, upperMm, forearmMm, POLE);
}

function armAt(f: Figure, bend: TrunkBend, reach: Reach, hand: Vec3, handBack: Vec3): ArmStance {
  const fingers = unit(hand);
  const side = unit(cross(handBack, fingers), [1, 0, 0]);
  return {
    shoulder: bendPoint(f, bend, restShoulder(f)),
    elbow: reach.middle,
    wrist: reach.end,
    hand: fingers,
    handBack: unit(cross(fingers, side)),
  };
}

const steps = (from: number, to: number, step: number): number[] =>
  Array.from({ length: Math.max(1, Math.floor((to - from) / step) + 1) }, (_, i) => from + i * step);

/**
 * A hand on the thighs, before the belly.
 *
 * @param lap - what is under this hand
 */
export function armOnLap(f: Figure, bend: TrunkBend, lap: Lap): ArmStance {
  const kneeX = restKnee(f)[0];
  const { top, lineX, leastX, nearMm, farMm, mostInwards, fingersDownMm } = lap;
  const height = (x: number, z: number): number => top(x, z) + 0.9 * f.radius.wrist + 4;
  const wishes = [0, 0.15, 0.3, 0.45].flatMap((out, i) =>
    steps(nearMm, farMm, 18).map((z): Wish => {
      const x = Math.max(lineX(z) + 0.05 * kneeX, leastX) + out * Math.max(1.05 * kneeX, leastX);
      return { wrist: [x, height(x, z), z], dislike: 0.2 * i };
    }),
  );
  const reach = bestReach(f, bend, wishes, top);
  const wrist = reach.end;
  const inwards = Math.min(mostInwards, (wrist[0] - lap.fingersX(wrist[2] + f.Ha)) / f.Ha) * f.Ha;
  const aside = wrist[0] - inwards;
  const middle = height(mix(wrist[0], aside, 0.5), wrist[2] + 0.5 * f.Ha) - wrist[1];
  const tip = height(aside, wrist[2] + f.Ha) - wrist[1];
  return armAt(
    f,
    bend,
    reach,
    [-inwards, Math.max(tip, 2 * middle) - fingersDownMm, f.Ha],
    [lap.slopeAt(mix(wrist[0], aside, 0.5), wrist[2] + 0.5 * f.Ha), 1, 0.1],
  );
}

/** Wishes that an arm can reach, stretched all but straight. */
function withinReach(f: Figure, shoulder: Vec3, wishes: Wish[]): Wish[] {
  const { upperMm, forearmMm } = armLinks(f);
  return wishes.filter(({ wrist }) => length(sub(wrist, shoulder)) < 0.985 * (upperMm + forearmMm));
}

/**
 * Forearms on a table.
 *
 * @returns the arm, or `undefined` when the table is out of reach or too high to lie on
 */
export function armOnTable(f: Figure, bend: TrunkBend, rest: Rest, up: Vec3): ArmStance | undefined {
  const shoulder = bendPoint(f, bend, restShoulder(f));
  if (rest.topMm > shoulder[1] - 120 || rest.topMm < 0.5 * f.TC) return undefined;
  const { forearmMm } = armLinks(f);
  const wishes = [0.34, 0.44, 0.54].flatMap((out, i) =>
    steps(Math.max(rest.edgeMm + 25, 0.7 * f.AD), rest.edgeMm + 0.8 * forearmMm, 12).map((z): Wish => ({
      wrist: [out * f.BA, rest.topMm + 0.86 * f.radius.wrist + 2, z],
      dislike: 0.12 * i,
    })),
  );
  const within = withinReach(f, shoulder, wishes);
  if (within.length === 0) return undefined;
  const reach = bestReach(f, bend, within, rest);
  return armAt(f, bend, reach, along(along([0, 0, 1], [1, 0, 0], -0.4), up, -0.06), up);
}

/** Hanging, forearms level: the posture in which elbow rest heights are taken. */
export function armLevel(f: Figure, bend: TrunkBend): ArmStance {
  const { shoulder: rest, elbow, wrist, hand, handBack } = measuringStance(f).arms[0];
  const shoulder = bendPoint(f, bend, rest);
  const moved = (p: Vec3): Vec3 => add(shoulder, sub(p, rest));
  return { shoulder, elbow: moved(elbow), wrist: moved(wrist), hand, handBack };
}

/** A sill on the left, in the body frame: top, near edge sideways from the midline, depth. */
interface SideRest {
  topMm: number;
  nearMm: number;
  depthMm: number;
}

/**
 * The left forearm on a sill beside the seat.
 *
 * @returns the arm, or `undefined` when the sill is out of reach, too high or too low to lie on
 */
export function armOnSill(f: Figure, bend: TrunkBend, sill: SideRest, up: Vec3): ArmStance | undefined {
  const shoulder = bendPoint(f, bend, restShoulder(f));
  if (sill.topMm > shoulder[1] - 40) return undefined;
  const { upperMm, forearmMm } = armLinks(f);
  const side = { topMm: sill.topMm, edgeMm: sill.nearMm, axis: 0 as const };
  const wishes = [25, 60, 95, 130]
    .filter((out) => out <= sill.depthMm)
    .flatMap((out, i) =>
      steps(0, 0.9 * forearmMm + 60, 20).map((ahead): Wish => ({
        wrist: [sill.nearMm + out, sill.topMm + 0.86 * f.radius.wrist + 2, shoulder[2] + ahead],
        dislike: 0.1 * i,
      })),
    );
  const within = withinReach(f, shoulder, wishes);
  if (within.length === 0) return undefined;
  const reach = bestReach(f, bend, within, side);
  // A forearm that hangs over the edge by its wrist alone does not lie on it.
  if (reach.middle[1] < sill.topMm - 0.5 * upperMm) return undefined;
  return armAt(f, bend, reach, along(sub(reach.end, reach.middle), up, -0.1 * forearmMm), up);
}

/** Cup on the table: this far in from its edge, and this high where the hand holds it. */
const CUP_IN_MM = 150;
const CUP_GRIP_MM = 45;

/**
 * A hand at a cup on the table before the shoulder.
 *
 * @returns the arm, or `undefined` when the cup is out of reach
 */
export function armToCup(f: Figure, bend: TrunkBend, rest: Rest, up: Vec3): ArmStance | undefined {
  const shoulder = bendPoint(f, bend, restShoulder(f));
  if (rest.topMm > shoulder[1] - 60 || rest.topMm < 0.5 * f.TC) return undefined;
  const wishes = [0, 40, 80, 120].map((further, i): Wish => ({
    wrist: [0.4 * f.BA, rest.topMm + CUP_GRIP_MM, rest.edgeMm + CUP_IN_MM - 0.55 * f.Ha + further],
    dislike: 0.1 * i,
  }));
  const within = withinReach(f, shoulder, wishes);
  if (within.length === 0) return undefined;
  const reach = bestReach(f, bend, within, rest);
  return armAt(f, bend, reach, along(along([0, 0, 1], [1, 0, 0], -0.35), up, 0.08), [1, 0.35, 0]);
}

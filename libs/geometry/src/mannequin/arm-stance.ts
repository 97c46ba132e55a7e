import type { Vec3 } from '../parts/part.ts';
import type { Figure } from './figure.ts';
import { reachFor, type Reach } from './limb-reach.ts';
import { thighTop } from './leg-sections.ts';
import { armLinks, HIP_FORWARD_MM, leanPoint, restKnee, restShoulder, type ArmStance } from './stance.ts';
import { along, clamp, cross, length, mix, sub, unit } from './vector.ts';

/** Something level the forearms can lie on, in the body frame. */
export interface Rest {
  /** Height of its top over the pressed seat. */
  topMm: number;
  /** Its near edge, forward of the rearmost buttock. */
  edgeMm: number;
}

const POLE: Vec3 = [0.15, -0.8, -0.6];
const SWIVEL_STEP_RAD = 0.1;
const MOST_SWIVELS = 14;

/** What an arm must keep clear of, worked out once for a body. */
interface Obstacles {
  /** Front of the trunk at a height, forward of the rearmost buttock. */
  trunkFront: (y: number) => number;
  /** How far the lean carries the line of the back at a height. */
  leaned: (y: number) => number;
  halfWaistMm: number;
  radius: (t: number) => number;
  elbowMm: number;
  rest: Rest | undefined;
}

function obstacles(f: Figure, trunkRad: number, rest: Rest | undefined): Obstacles {
  const belly = 30 + 0.02 * f.CD + f.AD;
  const crease = mix(HIP_FORWARD_MM + 0.42 * (belly - HIP_FORWARD_MM), belly, 0.62);
  const chest = 0.755 * f.AH;
  const bellyHeight = mix(f.TC, chest, 0.22);
  const foot = leanPoint([0, 0, 0], trunkRad)[2];
  const slope = leanPoint([0, 1, 0], trunkRad)[2] - foot;
  return {
    trunkFront: (y) =>
      y < bellyHeight
        ? mix(crease, belly, clamp((y - f.TC) / (bellyHeight - f.TC), 0, 1))
        : mix(belly, 12 + f.CD, clamp((y - bellyHeight) / (chest - bellyHeight), 0, 1)),
    leaned: (y) => foot + slope * y,
    halfWaistMm: 0.45 * f.WB,
    radius: (t) => mix(t === 0 ? f.radius.elbow : f.radius.forearm, f.radius.wrist, t),
    elbowMm: f.radius.elbow,
    rest,
  };
}

const SAMPLES = [0, 0.15, 0.3, 0.45, 0.6, 0.75, 0.9];

/**
 * How much an arm runs into things: 0 when elbow and forearm stay outside the trunk, before the back and
 * above the edge they lie on.
 */
function overlap(elbow: Vec3, wrist: Vec3, among: Obstacles): number {
  const { rest } = among;
  let most = Math.max(0, among.leaned(elbow[1]) - (elbow[2] - 0.9 * among.elbowMm)) / 60;
  for (const t of SAMPLES) {
    const y = mix(elbow[1], wrist[1], t);
    const radius = among.radius(t) * 0.8;
    const deepness = (among.trunkFront(y) - 20) / 2;
    const across = mix(elbow[0], wrist[0], t) / (among.halfWaistMm + radius);
    const deep = (mix(elbow[2], wrist[2], t) - deepness - 20 - 0.7 * among.leaned(y)) / (deepness + radius);
    most = Math.max(most, 1 - across * across - deep * deep);
  }
  if (rest && elbow[2] < rest.edgeMm && wrist[2] > rest.edgeMm) {
    const t = (rest.edgeMm - elbow[2]) / (wrist[2] - elbow[2]);
    most = Math.max(most, (rest.topMm - mix(elbow[1], wrist[1], t) + 0.95 * among.radius(t)) / 60);
  }
  return most;
}

/** A place for the wrist and how much it is wanted less than the best one. */
interface Wish {
  wrist: Vec3;
  dislike: number;
}

/** The least turned and least stretched arm that is clear of trunk, back and table. */
function bestReach(f: Figure, trunkRad: number, wishes: Wish[], rest?: Rest): Reach {
  const shoulder = leanPoint(restShoulder(f), trunkRad);
  const { upperMm, forearmMm } = armLinks(f);
  const among = obstacles(f, trunkRad, rest);
  let best: { reach: Reach; cost: number } | undefined;
  for (const { wrist, dislike } of wishes) {
    const straightness = length(sub(wrist, shoulder)) / (upperMm + forearmMm);
    const atLeast = dislike + 5 * Math.max(0, straightness - 0.84) + 20 * Math.max(0, straightness - 0.99);
    for (let step = 0; step <= MOST_SWIVELS; step++) {
      const least = atLeast + step * SWIVEL_STEP_RAD;
      if (best && least >= best.cost) break;
      const reach = reachFor(shoulder, wrist, upperMm, forearmMm, POLE, step * SWIVEL_STEP_RAD);
      const cost = least + 8 * overlap(reach.middle, reach.end, among);
      if (!best || cost < best.cost) best = { reach, cost };
    }
  }
  return best?.reach ?? reachFor(shoulder, shoulder, upperMm, forearmMm, POLE);
}

function armAt(f: Figure, trunkRad: number, reach: Reach, hand: Vec3, handBack: Vec3): ArmStance {
  const fingers = unit(hand);
  const side = unit(cross(handBack, fingers), [1, 0, 0]);
  return {
    shoulder: leanPoint(restShoulder(f), trunkRad),
    elbow: reach.middle,
    wrist: reach.end,
    hand: fingers,
    handBack: unit(cross(fingers, side)),
  };
}

const steps = (from: number, to: number, step: number): number[] =>
  Array.from({ length: Math.max(1, Math.floor((to - from) / step) + 1) }, (_, i) => from + i * step);

/** Hands on the thighs. */
export function armOnLap(f: Figure, trunkRad: number): ArmStance {
  const kneeX = restKnee(f)[0];
  const height = (x: number, z: number): number => thighTop(f, x, z) + 0.9 * f.radius.wrist + 4;
  const near = 0.62 * (30 + f.AD);
  const wishes = [1.05, 1.3, 1.55].flatMap((out, i) =>
    steps(near, f.BKL - 0.85 * f.Ha, 18).map((z): Wish => ({
      wrist: [out * kneeX, height(out * kneeX, z), z],
      dislike: 0.25 * i,
    })),
  );
  const reach = bestReach(f, trunkRad, wishes);
  const wrist = reach.end;
  const aside = wrist[0] - 0.28 * f.Ha;
  const middle = height(mix(wrist[0], aside, 0.5), wrist[2] + 0.5 * f.Ha) - wrist[1];
  const tip = height(aside, wrist[2] + f.Ha) - wrist[1];
  return armAt(f, trunkRad, reach, [-0.28 * f.Ha, Math.max(tip - 8, 2 * middle - 8), f.Ha], [0.12, 1, 0.1]);
}

/**
 * Forearms on a table.
 *
 * @returns the arm, or `undefined` when the table is out of reach or too high to lie on
 */
export function armOnTable(f: Figure, trunkRad: number, rest: Rest, up: Vec3): ArmStance | undefined {
  const shoulder = leanPoint(restShoulder(f), trunkRad);
  if (rest.topMm > shoulder[1] - 120 || rest.topMm < 0.5 * f.TC) return undefined;
  const { upperMm, forearmMm } = armLinks(f);
  const x = 0.32 * f.BA;
  const withinReach = steps(Math.max(rest.edgeMm + 25, 0.7 * f.AD), rest.edgeMm + 0.8 * forearmMm, 12)
    .map((z): Wish => ({ wrist: [x, rest.topMm + 0.86 * f.radius.wrist + 2, z], dislike: 0 }))
    .filter(({ wrist }) => length(sub(wrist, shoulder)) < 0.985 * (upperMm + forearmMm));
  if (withinReach.length === 0) return undefined;
  const reach = bestReach(f, trunkRad, withinReach, rest);
  return armAt(f, trunkRad, reach, along(along([0, 0, 1], [1, 0, 0], -0.4), up, -0.06), up);
}

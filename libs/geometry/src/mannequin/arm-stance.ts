import type { Vec3 } from '../parts/part.ts';
import type { Figure } from './figure.ts';
import { reachFor, type Reach } from './limb-reach.ts';
import { armLinks, HIP_FORWARD_MM, leanPoint, restKnee, restShoulder, type ArmStance } from './stance.ts';
import { along, clamp, cross, mix, mixPoints, sub, length, unit } from './vector.ts';

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

/** Front of the trunk at a height, upright, forward of the rearmost buttock. */
function trunkFront(f: Figure, y: number): number {
  const belly = 30 + 0.02 * f.CD + f.AD;
  const crease = mix(HIP_FORWARD_MM + 0.42 * (belly - HIP_FORWARD_MM), belly, 0.62);
  const chest = 0.755 * f.AH;
  const bellyHeight = mix(f.TC, chest, 0.22);
  if (y < bellyHeight) return mix(crease, belly, clamp((y - f.TC) / (bellyHeight - f.TC), 0, 1));
  return mix(belly, 12 + f.CD, clamp((y - bellyHeight) / (chest - bellyHeight), 0, 1));
}

/** True when the elbow and the forearm stay outside the trunk, and above the edge they lie on. */
function isClear(f: Figure, elbow: Vec3, wrist: Vec3, trunkRad: number, rest: Rest | undefined): boolean {
  for (const t of [0, 0.15, 0.3, 0.45, 0.6, 0.75, 0.9]) {
    const p = mixPoints(elbow, wrist, t);
    const radius = mix(t === 0 ? f.radius.elbow : f.radius.forearm, f.radius.wrist, t) * 0.8;
    const deepness = (trunkFront(f, p[1]) - 20) / 2;
    const middle = deepness + 20 + 0.7 * leanPoint([0, p[1], 0], trunkRad)[2];
    const across = p[0] / (0.9 * (f.WB / 2) + radius);
    const deep = (p[2] - middle) / (deepness + radius);
    if (across * across + deep * deep < 1) return false;
  }
  if (rest && elbow[2] < rest.edgeMm && wrist[2] > rest.edgeMm) {
    const t = (rest.edgeMm - elbow[2]) / (wrist[2] - elbow[2]);
    const under = mixPoints(elbow, wrist, t)[1] - 0.95 * mix(f.radius.forearm, f.radius.wrist, t);
    if (under < rest.topMm) return false;
  }
  return true;
}

/** The least turned arm that is clear of trunk and table among wrists at growing distance. */
function bestReach(f: Figure, trunkRad: number, wrists: Vec3[], rest?: Rest): Reach {
  const shoulder = leanPoint(restShoulder(f), trunkRad);
  const { upperMm, forearmMm } = armLinks(f);
  let best: { reach: Reach; cost: number } | undefined;
  for (const wrist of wrists) {
    const straightness = length(sub(wrist, shoulder)) / (upperMm + forearmMm);
    for (let step = 0; step <= MOST_SWIVELS; step++) {
      const reach = reachFor(shoulder, wrist, upperMm, forearmMm, POLE, step * SWIVEL_STEP_RAD);
      const blocked = !isClear(f, reach.middle, reach.end, trunkRad, rest);
      const cost = step * SWIVEL_STEP_RAD + 5 * Math.max(0, straightness - 0.84) + (blocked ? 10 : 0);
      if (!best || cost < best.cost) best = { reach, cost };
      if (!blocked) break;
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

/** Height of the thigh's upper side over the seat at a distance from the rearmost buttock. */
function thighTop(f: Figure, z: number): number {
  const t = f.KH - f.PH;
  const from = 0.45 * f.BPL;
  return mix(f.TC, t + 7, clamp((z - from) / (f.BPL - 52 - from), 0, 1));
}

/** Hands on the thighs. */
export function armOnLap(f: Figure, trunkRad: number): ArmStance {
  const x = 1.05 * restKnee(f)[0];
  const at = (z: number): Vec3 => [x, thighTop(f, z) + 0.9 * f.radius.wrist + 4, z];
  const near = 0.62 * (30 + f.AD);
  const reach = bestReach(f, trunkRad, steps(near, f.BKL - 0.85 * f.Ha, 12).map(at));
  const wrist = reach.end;
  const tip = at(wrist[2] + f.Ha);
  return armAt(f, trunkRad, reach, [-0.3 * f.Ha, tip[1] - wrist[1] - 10, f.Ha], [0.12, 1, 0.1]);
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
  const at = (z: number): Vec3 => [x, rest.topMm + 0.86 * f.radius.wrist + 2, z];
  const withinReach = steps(Math.max(rest.edgeMm + 25, 0.7 * f.AD), rest.edgeMm + 0.8 * forearmMm, 12)
    .map(at)
    .filter((wrist) => length(sub(wrist, shoulder)) < 0.985 * (upperMm + forearmMm));
  if (withinReach.length === 0) return undefined;
  const reach = bestReach(f, trunkRad, withinReach, rest);
  return armAt(f, trunkRad, reach, along(along([0, 0, 1], [1, 0, 0], -0.4), up, -0.06), up);
}

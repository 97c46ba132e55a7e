import { toRoom, type BodyPlacement } from './body-placement.ts';
import { TOES_OUT_RAD } from './crossed-legs.ts';
import type { Figure } from './figure.ts';
import { legCores, mirrored, nearestCore, type LegCore } from './leg-cores.ts';
import { legLine } from './leg-line.ts';
import type { Legs } from './leg-posture.ts';
import type { PoseNote } from './pose-note.ts';
import { MEASURED_LEG, restKnee, type LegStance, type Stance } from './stance.ts';
import { bellyFront } from './trunk-profile.ts';
import { clamp, mix, mixPoints } from './vector.ts';

const rad = (deg: number): number => (deg * Math.PI) / 180;

/**
 * How far beyond the midline the upper knee lies, in shares of how far knees stand from it uncrossed; the lower one lies
 * on it. By eye.
 */
const BEYOND = 0.55;
/** Lifts of the upper thigh that are tried; where none is enough the thighs are too full. By eye. */
const LIFTS_RAD = Array.from({ length: 27 }, (_, i) => rad(4 + i));
/** Of the way from the back to the knee, what the belly must leave free. By eye. */
const FREE_OF_BELLY = 0.44;
/** How much of their thickness legs give where they lie on each other, by section from the hip. By eye. */
const GIVES = [0.6, 0.5, 0.3, 0.26, 0.24, 0.24, 0.24, 0.1];
const KNEE_SECTION = 4;
const HEEL_SECTION = 9;
const BALL_SECTION = 12;
/** Air between what does not give: ankles and shoes; between a raised knee and a table. By eye. */
const AIR_MM = 8;
/** How far the hanging foot is stretched. By eye. */
const STRETCHED_RAD = rad(22);
/** How the upper shin likes to hang, forwards and across. By eye. */
const CALM_DEG = 12;

/** Ways the upper shin may hang, the calmest first. */
const HANGS = [0, 5, 10, 15, 20, 25, 30, 35, 40]
  .flatMap((forwards) => [0, 5, 10, 15, 20, 25, 30].map((across) => ({ forwards, across })))
  .map((hang) => ({ ...hang, restless: Math.hypot(hang.forwards - CALM_DEG, hang.across - CALM_DEG) }))
  .sort((a, b) => a.restless - b.restless);

/** Whether a leg stays out of the other from one section to another, but for what flesh gives. */
function clears(upper: readonly LegCore[], lower: readonly LegCore[], from: number, to: number): boolean {
  const firmness = (section: number): number => 1 - (GIVES[section] ?? 0);
  for (let i = from; i < to; i++) {
    const [a, b] = [upper[i]!, upper[i + 1]!];
    for (const t of [0, 0.25, 0.5, 0.75]) {
      const near = nearestCore(lower, mixPoints(a.at, b.at, t));
      const firm = mix(firmness(i), firmness(i + 1), t);
      const needed = firm * (mix(a.radiusMm, b.radiusMm, t) + near.radiusMm) + (firm > 0.95 ? AIR_MM : 0);
      if (near.distanceMm < needed) return false;
    }
  }
  return true;
}

/** Turn of a leg towards the other one that carries its knee to `kneeX`. */
function acrossTo(f: Figure, kneeX: number, thighRad: number): number {
  const { hip, knee } = legLine(f, { ...MEASURED_LEG, thighRad });
  const [aside, ahead] = [knee[0] - hip[0], knee[2] - hip[2]];
  return Math.asin(clamp((hip[0] - kneeX) / Math.hypot(aside, ahead), -1, 1)) + Math.atan2(aside, ahead);
}

/** What a table leaves over the seat, in the body frame. */
export interface TableOver {
  undersideMm: number;
  /** Near edge, forward of the rearmost buttock. */
  edgeMm: number;
}

/**
 * One knee over the other, the left over the right: the right knee on the midline under the left thigh, which rises by
 * what the right one needs; the left shin hangs across the right one, its foot a little stretched.
 *
 * @param f - the figure
 * @param legs - as they would stand or hang side by side
 * @param room - where the body is, its shoe, and the table over the lap where there is one
 * @returns both legs, or why the knees cannot cross here
 * @source geometry of thighs and shins; how far is turned stays within the published range of the hip
 */
export function crossedKnees(
  f: Figure,
  legs: Legs,
  {
    placement,
    shoe,
    table,
  }: {
    placement: BodyPlacement;
    shoe: Pick<Stance, 'shoeMm' | 'forefootMm'>;
    table?: TableOver | undefined;
  },
): { legs: Stance['legs'] } | { why: PoseNote['kind'] } {
  const { tiltRad } = placement;
  const [kneeX, , kneeZ] = restKnee(f);
  if (kneeZ - bellyFront(f) < FREE_OF_BELLY * kneeZ) return { why: 'knees-stay-apart' };
  const lower = standing(f, legs);
  const coresOf = legCores(f, shoe);
  const under = mirrored(coresOf(lower));
  const upperOf = (liftRad: number, forwardsRad: number, inwardRad: number): LegStance => ({
    thighRad: legs.thighRad - liftRad,
    acrossRad: acrossTo(f, -BEYOND * kneeX, legs.thighRad - liftRad),
    shinRad: tiltRad - forwardsRad,
    footRad: tiltRad - forwardsRad + STRETCHED_RAD,
    toesOutRad: 0,
    inwardRad,
    footInwardRad: inwardRad,
  });
  for (const lift of LIFTS_RAD) {
    const thigh = coresOf(upperOf(lift, 0, 0));
    if (!clears(thigh, under, 1, KNEE_SECTION)) continue;
    if (table && meetsTable(thigh, table)) return { why: 'table-over-knees' };
    for (const { forwards, across } of HANGS) {
      const upper = upperOf(lift, rad(forwards), rad(across));
      const cores = coresOf(upper);
      if (!clears(cores, under, KNEE_SECTION, BALL_SECTION)) continue;
      if (isOverFloor(cores, placement)) return { legs: [upper, lower] };
    }
  }
  return { why: 'knees-stay-apart' };
}

/** The lower leg: as it would stand, its knee on the midline, its toes still turned out. */
function standing(f: Figure, { thighRad, shinRad, footRad }: Legs): LegStance {
  const acrossRad = acrossTo(f, 0, thighRad);
  const toesOutRad = TOES_OUT_RAD + acrossRad / 2;
  return { ...MEASURED_LEG, thighRad, acrossRad, shinRad, footRad, toesOutRad };
}

/** Whether a foot hangs over the floor and not in it. */
const isOverFloor = (leg: readonly LegCore[], placement: BodyPlacement): boolean =>
  leg.slice(HEEL_SECTION).every(({ at, radiusMm }) => toRoom(placement, at)[1] > radiusMm);

/** Whether a raised thigh or its knee comes up against what lies over the lap. */
function meetsTable(thigh: readonly LegCore[], { undersideMm, edgeMm }: TableOver): boolean {
  return thigh
    .slice(1, KNEE_SECTION + 1)
    .some(({ at, radiusMm }) => at[2] + radiusMm > edgeMm && at[1] + radiusMm + AIR_MM > undersideMm);
}

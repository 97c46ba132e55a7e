import type { Figure } from './figure.ts';
import { SHINS_BACK_RAD, toesDown, type Legs } from './leg-posture.ts';
import { MEASURED_LEG, restAnkle, restKnee, type LegStance, type Stance } from './stance.ts';
import { clamp, mix } from './vector.ts';

export const TOES_OUT_RAD = 0.12;
/** Air between shins and between shoes that cross. */
const AIR_MM = 12;
/** Sections of a leg are rounder than boxes and fuller than ellipses by this exponent. */
const POWER = 2.2;
const TOES_DOWN_RAD = (28 * Math.PI) / 180;
/** Furthest that a foot is stretched against its shin: well within the range of an ankle. */
const STRETCHED_RAD = (40 * Math.PI) / 180;
const HEEL_OFF_MM = 10;

/** Both legs alike. */
export function sideBySide({ thighRad, shinRad, footRad }: Legs): Stance['legs'] {
  const leg: LegStance = { ...MEASURED_LEG, thighRad, shinRad, footRad, toesOutRad: TOES_OUT_RAD };
  return [leg, leg];
}

/**
 * Ankles crossed, the left one before the right: thighs turn outwards until each foot stands beyond the other, and the
 * left shin goes forwards until both pass each other. The right heel goes back no further than the front of the seat; the
 * left foot rests on the right one where it does not reach the floor.
 *
 * @param f - the figure
 * @param legs - as they would stand or hang side by side
 * @param tiltRad - slope of the seat: what upright is
 * @param seatFrontMm - front of the seat before the rearmost buttock
 * @source geometry of shins and shoes; how far is turned stays within the published range of the hip
 */
export function crossedAnkles(f: Figure, legs: Legs, tiltRad: number, seatFrontMm: number): Stance['legs'] {
  const [aside, rise] = [restKnee(f)[0], restKnee(f)[1]];
  const shinMm = rise - restAnkle(f)[1];
  const beyond = f.FB / 2 + AIR_MM / 2;
  const inwardRad = Math.asin(clamp((aside + beyond) / shinMm, 0, 0.6));
  const standsMm = shinMm * Math.cos(tiltRad - legs.shinRad);
  const level = shinMm * Math.cos(inwardRad);
  // Lower than upright by this swing, forwards or back, or the sole would go through the floor.
  const least = Math.acos(clamp(standsMm / level, -1, 1));
  const heelMm = (f.BPL + f.BKL) / 2 - 4 - 0.255 * f.FL;
  const most = Math.asin(clamp((heelMm - HEEL_OFF_MM - seatFrontMm) / level, 0, 1));
  const back = least <= most ? Math.min(most, SHINS_BACK_RAD) : -least;
  const apartMm = apartAtAnkles(f, shinMm, aside, beyond);
  const front = Math.asin(clamp(Math.sin(back) - apartMm / level, -0.85, 0));
  const legOf = (swing: number): LegStance => {
    const lifted = Math.max(0, standsMm - level * Math.cos(swing)) + legs.heelGapMm;
    const toes = toesDown(f, lifted, TOES_DOWN_RAD);
    const footRad = tiltRad + Math.min(toes, swing + STRETCHED_RAD);
    return {
      ...MEASURED_LEG,
      thighRad: legs.thighRad,
      shinRad: tiltRad + swing,
      footRad,
      toesOutRad: -TOES_OUT_RAD,
      inwardRad,
    };
  };
  return [legOf(front), legOf(back)];
}

/** How far before the other an ankle must be for the shins to pass each other all the way down. */
function apartAtAnkles(f: Figure, shinMm: number, aside: number, beyond: number): number {
  const calfAt = (restKnee(f)[1] + 0.36 * f.PH) / shinMm;
  let most = 0;
  for (let down = 0.25; down < 0.95; down += 0.05) {
    const t = clamp((down - calfAt) / (0.93 - calfAt), 0, 1);
    const half = mix(0.95 * f.radius.calf, 0.87 * f.radius.ankle, t) + AIR_MM / 2;
    const deep = mix(f.BKL - f.BPL - 13, 2.22 * f.radius.ankle, t) + AIR_MM;
    const across = Math.abs(aside - (aside + beyond) * down) / half;
    if (across < 1) most = Math.max(most, (deep / down) * (1 - across ** POWER) ** (1 / POWER));
  }
  return most;
}

import type { Figure } from './figure.ts';
import { hipJoint, legLine } from './leg-line.ts';
import { ROOT_ACROSS, ROOT_LIFT, thighRings, thighSurface } from './leg-sections.ts';
import { kneesCross, restKnee, type LegStance, type Stance } from './stance.ts';
import { bellyFront } from './trunk-profile.ts';
import { clamp, mix } from './vector.ts';

/** What one hand can lie on, as if it were the left one: sideways from the midline, forward of the rearmost buttock. */
export interface Lap {
  /** Height of the thighs over the seat. */
  top: (x: number, z: number) => number;
  /** The line on which hands lie. */
  lineX: (z: number) => number;
  /** How near to the midline a wrist may come. */
  leastX: number;
  /** A wrist lies no further back than this. */
  nearMm: number;
  /** A wrist lies no further forward than this. */
  farMm: number;
  /** Where fingertips would lie. */
  fingersX: (z: number) => number;
  /** How far inwards a hand turns for that at most, in shares of its length. */
  mostInwards: number;
  /** How much lower fingers end than what is under them. */
  fingersDownMm: number;
  /** How much the back of a hand tilts outwards, as a slope. */
  slopeAt: (x: number, z: number) => number;
}

/*
 * Hands on crossed knees, all by eye and in shares of a hand's length: the right one lies on the knee that is up, the left
 * one behind it along the outside of that thigh, so that neither lies on the other and elbows stay near the sides.
 */
/** How far behind the middle of the knee a wrist lies: furthest and nearest. */
const RIGHT_WRIST = [1, 0.6] as const;
const LEFT_WRIST = [1.6, 1.45] as const;
const LEFT_OUT = 0.3;
/** How much lower fingers end than a thigh is under them, mm. */
const ON_FLAT_MM = 8;
/** How much lower the fingers on the knee end than it rises. */
const FINGERS_DOWN = 0.12;
/** Hands turn inwards by at most this where they lie along a thigh. */
const MOST_INWARDS = 0.6;
/** The back of a hand tilts outwards by this, as a slope, and with what is under it, which is felt so far to both sides. */
const TILT = 0.12;
const FELT_MM = 12;

/** A thigh as it lies in a stance: its upper side, and its middle line. */
interface Thigh {
  top: (x: number, z: number) => number;
  lineX: (z: number) => number;
}

/** Upper side of a bent left thigh; `-Infinity` beside it. */
function bentThigh(f: Figure, { thighRad, acrossRad }: LegStance): Thigh {
  const rest = thighSurface(f);
  const [first, second, third] = thighRings(f);
  const [hipX, hipY, hipZ] = hipJoint(f);
  // A bent knee rises no further than its middle.
  const kneeZ = restKnee(f)[2];
  const middle = (z: number): { x: number; half: number } => {
    const [from, to] = z < second.z ? [first, second] : [second, third];
    const t = clamp((z - from.z) / (to.z - from.z), 0, 1);
    return { x: mix(from.centreX, to.centreX, t), half: mix(from.half, to.half, t) };
  };
  const free = (z: number): number => clamp((z - first.z) / (second.z - first.z), 0, 1);
  const across = (z: number): number => acrossRad * mix(ROOT_ACROSS, 1, free(z));
  return {
    lineX: (z) => middle(z).x - (z - hipZ) * Math.tan(across(z)),
    top: (x, z) => {
      const turn = across(z);
      const lift = -thighRad * mix(ROOT_LIFT, 1, free(z));
      const [c, s] = [Math.cos(turn), Math.sin(turn)];
      // The place before the leg turned towards the other, then before it rose.
      const x0 = hipX + (x - hipX) * c + (z - hipZ) * s;
      const ahead = (z - hipZ) * c - (x - hipX) * s;
      let along = hipZ + ahead;
      if (Math.abs(x0 - middle(hipZ + ahead).x) > first.half * 1.2) return -Infinity;
      // How far forward it was then hangs on how high it was there: two rounds bring it within a millimetre or two.
      for (let i = 0; i < 2; i++) {
        along = hipZ + (ahead + (rest(x0, along) - hipY) * Math.sin(lift)) / Math.cos(lift);
        along = Math.min(along, kneeZ);
      }
      const { x: centreX, half } = middle(along);
      if (Math.abs(x0 - centreX) > half) return -Infinity;
      return hipY + (rest(x0, along) - hipY) * Math.cos(lift) + (along - hipZ) * Math.sin(lift);
    },
  };
}

/**
 * The lap under one hand.
 *
 * @param f - the figure
 * @param legs - how both legs lie
 * @param side - 0 the left hand, 1 the right
 * @returns heights and lines as if the hand were the left one, millimetres. On crossed knees the left hand lies along
 * the thigh that is up, the right one on its knee
 */
export const lapUnder = (f: Figure, legs: Stance['legs'], side: 0 | 1): Lap =>
  kneesCross({ legs }) ? crossedLap(f, legs, side) : flatLap(f, legs[side]);

function flatLap(f: Figure, leg: LegStance): Lap {
  const rest = thighSurface(f);
  const bent = bentThigh(f, leg);
  const kneeX = restKnee(f)[0];
  return {
    top: leg.thighRad === 0 ? rest : (x, z) => Math.max(rest(x, z), bent.top(x, z)),
    lineX: () => kneeX,
    leastX: 0.5 * f.Ha + 12,
    nearMm: 0.62 * bellyFront(f),
    farMm: f.BKL - 0.85 * f.Ha,
    fingersX: () => 0.4 * f.Ha + 4,
    mostInwards: 0.28,
    fingersDownMm: ON_FLAT_MM,
    slopeAt: () => TILT,
  };
}

function crossedLap(f: Figure, legs: Stance['legs'], side: 0 | 1): Lap {
  const rest = thighSurface(f);
  const [own, other] = [bentThigh(f, legs[side]), bentThigh(f, legs[side === 0 ? 1 : 0])];
  const top = (x: number, z: number): number => Math.max(rest(x, z), own.top(x, z), other.top(-x, z));
  const slopeAt = (x: number, z: number): number =>
    TILT + (top(x - FELT_MM, z) - top(x + FELT_MM, z)) / (2 * FELT_MM);
  const kneeZ = legLine(f, legs[0]).knee[2];
  const [behindMost, behindLeast] = side === 0 ? LEFT_WRIST : RIGHT_WRIST;
  const lineX = (z: number): number => (side === 0 ? own.lineX(z) + LEFT_OUT * f.Ha : -other.lineX(z));
  return {
    top,
    lineX,
    leastX: -Infinity,
    nearMm: kneeZ - behindMost * f.Ha,
    farMm: kneeZ - behindLeast * f.Ha,
    fingersX: lineX,
    mostInwards: MOST_INWARDS,
    fingersDownMm: side === 0 ? ON_FLAT_MM : FINGERS_DOWN * f.Ha,
    slopeAt,
  };
}

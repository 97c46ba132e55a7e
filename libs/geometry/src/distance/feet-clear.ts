import type { FeetMoved } from '../mannequin/leg-posture.ts';
import { add, dot, sub, unit } from '../mannequin/vector.ts';
import type { Part } from '../parts/part.ts';
import {
  AIR_MM,
  BEHIND_MM,
  clearOf,
  gapOf,
  goneTo,
  legsOf,
  stepBack,
  STEP_MM,
  type FootedPose,
  type Legs,
} from './moving-legs.ts';
import { boundsGap } from './shape.ts';
import { partSurface } from './solids.ts';
import type { Surface } from './surface.ts';

/** Whoever is within this of straight ahead, as a cosine, is made room for. By eye. */
const AHEAD = 0.5;
/** Facings whose cosine is below this look at each other. By eye. */
const OPPOSITE = -0.7;
/** Ways past each other, the shortest first, the left before the right. By eye. */
const ASIDE_MM = Array.from({ length: 8 }, (_, i) => STEP_MM * (i + 1)).flatMap((mm) => [mm, -mm]);
/** Going that opens no gap by this much gains nothing. By eye. */
const GAIN_MM = 10;

const hasAhead = (one: Legs, other: Legs): boolean => dot(unit(sub(other.at, one.at)), one.ahead) > AHEAD;

/** Sitters whose legs may meet, and the parts near each. */
interface Around {
  parts: readonly (readonly Surface[])[];
  pairs: readonly (readonly [number, number])[];
}

/** The others who may meet somebody's legs, where they are now. */
const othersOf = (n: number, { pairs }: Around, now: readonly Legs[]): Legs[] =>
  pairs.flatMap(([i, j]) => (i === n ? [now[j]!] : j === n ? [now[i]!] : []));

/** Everybody who has somebody too near before them goes back, all at once, step by step. */
function goBack(start: readonly Legs[], around: Around): Legs[] {
  let now = [...start];
  let lately = new Set(start.keys());
  while (lately.size > 0) {
    const going = new Set(
      around.pairs.flatMap(([i, j]) => {
        const [one, other] = [now[i]!, now[j]!];
        if ((!lately.has(i) && !lately.has(j)) || gapOf(one, other) >= AIR_MM) return [];
        return [...(hasAhead(one, other) ? [i] : []), ...(hasAhead(other, one) ? [j] : [])];
      }),
    );
    const steps = new Map(
      [...going].flatMap((n) => {
        const gone = stepBack(now[n]!, around.parts[n]!, othersOf(n, around, now));
        return gone ? [[n, gone] as const] : [];
      }),
    );
    lately = new Set(steps.keys());
    now = now.map((legs, n) => steps.get(n) ?? legs);
  }
  return now;
}

/** Those who face each other and are still too near go aside, the nearest first. */
function goPast(start: readonly Legs[], around: Around): Legs[] {
  const now = [...start];
  const inTheWay = around.pairs
    .map(([i, j]) => ({
      i,
      j,
      gap: gapOf(now[i]!, now[j]!),
      spot: Math.hypot(...add(now[i]!.at, now[j]!.at)),
    }))
    .filter(({ i, j, gap }) => gap < AIR_MM && dot(now[i]!.ahead, now[j]!.ahead) < OPPOSITE)
    // Who was seated first does not decide.
    .sort((a, b) => a.gap - b.gap || a.spot - b.spot);
  const aside = (n: number, past: number, leftMm: number): Legs => {
    const legs = now[n]!;
    if (Math.abs(legs.gone.leftMm) >= Math.abs(leftMm)) return legs;
    const others = othersOf(n, around, now).filter((other) => other !== now[past]);
    return goneTo(legs, { ...legs.gone, leftMm }, around.parts[n]!, others) ?? legs;
  };
  for (const { i, j } of inTheWay) {
    for (const leftMm of ASIDE_MM) {
      const [one, other] = [aside(i, j, leftMm), aside(j, i, leftMm)];
      if (gapOf(one, other) < AIR_MM) continue;
      now[i] = one;
      now[j] = other;
      break;
    }
  }
  return now;
}

/**
 * How far sitters move their feet so that they keep clear of the feet of those opposite and of what stands before them:
 * back, those opposite each other alike; and where that is not enough, each to their own left, or each to their own right,
 * past the other. Feet that somebody put somewhere stay there.
 *
 * @param poses - the sitters of a set, as they sit each for themselves; room frame
 * @param parts - the parts of the set
 * @returns in steps of 10 mm, in the order of the poses; nothing where feet are clear or little is gained by going
 */
export function feetClear(poses: readonly FootedPose[], parts: readonly Part[]): FeetMoved[] {
  const surfaces = parts.map(partSurface);
  const alone = poses.map(legsOf);
  const near = alone.map(({ bounds, mostBackMm }) =>
    surfaces.filter((surface) => boundsGap(bounds, surface) < BEHIND_MM + mostBackMm),
  );
  const start = alone.map((legs, i) => near[i]!.reduce((gone, part) => clearOf(part, gone, near[i]!), legs));
  const pairs = start.flatMap((one, i) =>
    start.flatMap((other, j) => {
      const reach = AIR_MM + one.mostBackMm + other.mostBackMm;
      return j > i && boundsGap(one.bounds, other.bounds) < reach ? [[i, j] as const] : [];
    }),
  );
  const gaps = pairs.map(([i, j]) => gapOf(start[i]!, start[j]!));
  if (gaps.every((gap) => gap >= AIR_MM)) return start.map(({ gone }) => gone);
  const around = { parts: near, pairs };
  const end = goPast(goBack(start, around), around);
  const gained = new Set(
    pairs.flatMap(([i, j], p) => {
      const [before, after] = [gaps[p]!, gapOf(end[i]!, end[j]!)];
      return before < AIR_MM && (after >= AIR_MM || after > before + GAIN_MM) ? [i, j] : [];
    }),
  );
  return end.map(({ gone }, n) => (gained.has(n) ? gone : start[n]!.gone));
}

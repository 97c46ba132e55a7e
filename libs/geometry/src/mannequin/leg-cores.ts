import type { Vec3 } from '../parts/part.ts';
import type { Figure } from './figure.ts';
import { restLeg, sectionMover } from './leg-sections.ts';
import { HIP_FORWARD_MM, mirror, type LegStance, type Stance } from './stance.ts';
import { add, clamp, length, mix, scale, sub } from './vector.ts';

/** The middle of a leg's flesh at one of its sections, as if it were the left one. */
export interface LegCore {
  at: Vec3;
  radiusMm: number;
}

/**
 * Middles of the sections of a leg, from the hip to the ball of the foot.
 *
 * @param f - the figure
 * @param shoe - what it stands on
 * @returns what tells of a bent leg where they lie, as if it were the left one; millimetres
 */
export function legCores(
  f: Figure,
  shoe: Pick<Stance, 'shoeMm' | 'forefootMm'>,
): (leg: LegStance) => LegCore[] {
  const rest = restLeg(f, shoe).rings.map((ring) => {
    const at = scale(
      ring.reduce((sum, p) => add(sum, p)),
      1 / ring.length,
    );
    return { at, radiusMm: ring.reduce((sum, p) => sum + length(sub(p, at)), 0) / ring.length };
  });
  return (leg) => {
    const moved = sectionMover(f, leg);
    const root: LegCore = {
      at: [rest[0]!.at[0], rest[0]!.at[1], HIP_FORWARD_MM],
      radiusMm: rest[0]!.radiusMm,
    };
    return [root, ...rest.map(({ at, radiusMm }, i) => ({ at: moved(i + 1, at), radiusMm }))];
  };
}

/** The same of the right leg, where it is. */
export const mirrored = (cores: readonly LegCore[]): LegCore[] =>
  cores.map(({ at, radiusMm }) => ({ at: mirror(at), radiusMm }));

/** The place of a leg's middle nearest to a point, how far it is, and how thick the leg is there. */
interface Nearest {
  at: Vec3;
  distanceMm: number;
  radiusMm: number;
  /** Sections from the hip, with the share of the way to the next. */
  section: number;
}

/** The nearest place on the middles of a leg. */
export function nearestCore(cores: readonly LegCore[], [x, y, z]: Vec3): Nearest {
  let best: Nearest = { at: cores[0]!.at, distanceMm: Infinity, radiusMm: 0, section: 0 };
  for (let i = 0; i + 1 < cores.length; i++) {
    const { at: a, radiusMm: from } = cores[i]!;
    const { at: b, radiusMm: to } = cores[i + 1]!;
    const [ux, uy, uz] = [b[0] - a[0], b[1] - a[1], b[2] - a[2]];
    const along = (x - a[0]) * ux + (y - a[1]) * uy + (z - a[2]) * uz;
    const t = clamp(along / Math.max(1e-9, ux * ux + uy * uy + uz * uz), 0, 1);
    const at: Vec3 = [a[0] + t * ux, a[1] + t * uy, a[2] + t * uz];
    const distanceMm = Math.hypot(x - at[0], y - at[1], z - at[2]);
    if (distanceMm < best.distanceMm) best = { at, distanceMm, radiusMm: mix(from, to, t), section: i + t };
  }
  return best;
}

import type { Vec3 } from '../parts/part.ts';
import type { Figure } from './figure.ts';
import { SOFT, type SkinLevel } from './skin.ts';
import {
  bendPoint,
  bicepsTuck,
  direction,
  elbowFlesh,
  waistPivot,
  type ArmStance,
  type Stance,
} from './stance.ts';
import { along, clamp, cross, length, mix, sub, unit } from './vector.ts';

interface Cone {
  from: Vec3;
  axis: Vec3;
  lengthMm: number;
  fromRadius: number;
  toRadius: number;
}

const cone = (from: Vec3, to: Vec3, fromRadius: number, toRadius: number): Cone => ({
  from,
  axis: direction(from, to),
  lengthMm: Math.max(1e-6, length(sub(to, from))),
  fromRadius,
  toRadius,
});

/** Rounded cones that hold a left arm from under the armpit to the fingers. */
function armCones(f: Figure, arm: ArmStance): Cone[] {
  const { radius, Ha } = f;
  const { shoulder, wrist } = arm;
  const elbow = elbowFlesh(f, arm);
  const u = direction(shoulder, elbow);
  const g = direction(elbow, wrist);
  const lateral = unit(cross(g, u), [1, 0, 0]);
  const upperMm = length(sub(elbow, shoulder));
  const forearmMm = length(sub(wrist, elbow));
  const biceps = along(along(shoulder, u, 0.52 * upperMm), lateral, -bicepsTuck(f));
  const armpit = along(shoulder, u, 0.25 * upperMm);
  const below = along(elbow, g, 0.36 * forearmMm);
  const side = unit(cross(arm.handBack, arm.hand), [1, 0, 0]);
  const across = [-0.13, 0, 0.13].map((at) =>
    cone(
      along(along(wrist, arm.hand, 0.02 * Ha), side, at * Ha),
      along(along(wrist, arm.hand, 0.82 * Ha), side, 0.6 * at * Ha),
      0.135 * Ha,
      0.1 * Ha,
    ),
  );
  return [
    cone(armpit, biceps, 1.06 * radius.arm, 1.08 * radius.arm),
    cone(biceps, elbow, 1.08 * radius.arm, 1.16 * radius.elbow),
    cone(elbow, below, 1.16 * radius.elbow, 1.06 * radius.forearm),
    cone(below, wrist, 1.06 * radius.forearm, 1.14 * radius.wrist),
    ...across,
  ];
}

/** Distance from the surface of a cone; below 0 inside. */
function gapTo(c: Cone, x: number, y: number, z: number): number {
  const [dx, dy, dz] = [x - c.from[0], y - c.from[1], z - c.from[2]];
  const t = clamp(dx * c.axis[0] + dy * c.axis[1] + dz * c.axis[2], 0, c.lengthMm);
  const r = mix(c.fromRadius, c.toRadius, t / c.lengthMm);
  return Math.hypot(dx - t * c.axis[0], dy - t * c.axis[1], dz - t * c.axis[2]) - r;
}

/** Flesh stays this far off the arm. */
const AIR_MM = 3;
const MOST_STEPS = 24;

/**
 * Lets belly, flanks and thighs give way to arms and hands that lie on them, as flesh does: their skin moves inwards
 * (thighs downwards) until it is outside the arm.
 *
 * @param points - skin points of `at` in the body frame, changed in place
 */
export function giveWay(points: Float64Array, at: SkinLevel, figure: Figure, stance: Stance): void {
  const middle = bendPoint(figure, stance, waistPivot(figure), 1, 0);
  const sides = stance.arms.map((arm) => armCones(figure, arm));
  const reach = sides.map((cones) => {
    const low: number[] = [];
    const high: number[] = [];
    for (const i of [0, 1, 2]) {
      const ends = cones.flatMap((c) => {
        const far = c.from[i]! + c.axis[i]! * c.lengthMm;
        return [c.from[i]! - c.fromRadius, c.from[i]! + c.fromRadius, far - c.toRadius, far + c.toRadius];
      });
      low.push(Math.min(...ends) - AIR_MM);
      high.push(Math.max(...ends) + AIR_MM);
    }
    return { low, high };
  });
  for (let v = 0; v < at.level.pointCount; v++) {
    const soft = at.soft[v]!;
    if (soft === SOFT.none) continue;
    let [x, y, z] = [points[v * 3]!, points[v * 3 + 1]!, points[v * 3 + 2]!];
    const side = x < 0 ? 1 : 0;
    const mirrored = side === 1 ? -1 : 1;
    const { low, high } = reach[side]!;
    x *= mirrored;
    if (x < low[0]! || x > high[0]! || y < low[1]! || y > high[1]! || z < low[2]! || z > high[2]!) continue;
    const away: Vec3 = soft === SOFT.thigh ? [0, -1, 0] : unit([-x, 0, middle[2] - z], [0, 0, -1]);
    for (let step = 0; step < MOST_STEPS; step++) {
      let gap = Infinity;
      for (const c of sides[side]!) gap = Math.min(gap, gapTo(c, x, y, z));
      if (gap >= AIR_MM - 0.05) break;
      const by = Math.max(0.5, AIR_MM - gap);
      [x, y, z] = [x + away[0] * by, y + away[1] * by, z + away[2] * by];
    }
    points[v * 3] = mirrored * x;
    points[v * 3 + 1] = y;
    points[v * 3 + 2] = z;
  }
}

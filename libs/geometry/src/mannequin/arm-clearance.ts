import type { Vec3 } from '../parts/part.ts';
import type { Figure } from './figure.ts';
import { unbendPoint, type TrunkBend } from './stance.ts';
import { trunkGap, trunkLevels, type TrunkLevel } from './trunk-profile.ts';
import { mix, mixPoints } from './vector.ts';

/** Something level the forearms can lie on, in the body frame. */
export interface Rest {
  /** Height of its top over the pressed seat. */
  topMm: number;
  /** Its near edge, forward of the rearmost buttock; sideways from the midline where `axis` is 0. */
  edgeMm: number;
  axis?: 0;
}

/** Height of the thighs over the seat, by sideways and forwards. */
export type ThighTop = (x: number, z: number) => number;

/** What an arm must keep clear of, worked out once for a body. */
export interface Obstacles {
  figure: Figure;
  levels: readonly TrunkLevel[];
  bend: TrunkBend;
  shoulder: Vec3;
  /** What the forearm lies on. */
  under: Rest | ThighTop;
}

export const obstacles = (
  figure: Figure,
  bend: TrunkBend,
  shoulder: Vec3,
  under: Rest | ThighTop,
): Obstacles => ({
  figure,
  levels: trunkLevels(figure),
  bend,
  shoulder,
  under,
});

const UPPER_SAMPLES = [0.5, 0.65, 0.8];
const FOREARM_SAMPLES = [0, 0.15, 0.3, 0.45, 0.6, 0.75, 0.9, 1];
/** A limb this much into something counts as much as one radian of swivel. */
const BAD_MM = 12;
const AIR_MM = 3;

/**
 * How much an arm runs into trunk, back, thighs or the edge it lies on: the deepest place, in shares of 12 mm; 0 when
 * it is clear.
 *
 * @param enough - nothing deeper is looked for once this is reached
 */
export function overlap(elbow: Vec3, wrist: Vec3, among: Obstacles, enough = Infinity): number {
  const { figure, levels, bend, shoulder, under } = among;
  const rest = typeof under === 'function' ? undefined : under;
  const { radius } = figure;
  let most = 0;
  const look = (p: Vec3, r: number): void => {
    const upright = unbendPoint(figure, bend, p);
    most = Math.max(most, r + AIR_MM - trunkGap(levels, upright), 0.9 * r - upright[2]);
  };
  for (const t of UPPER_SAMPLES) look(mixPoints(shoulder, elbow, t), mix(radius.arm, radius.elbow, t) * 0.97);
  for (const t of FOREARM_SAMPLES) {
    const p = mixPoints(elbow, wrist, t);
    const r = mix(t === 0 ? radius.elbow : radius.forearm, radius.wrist, t);
    look(p, r);
    if (typeof under === 'function') most = Math.max(most, under(p[0], p[2]) + 0.9 * r - p[1]);
    if (most >= enough * BAD_MM) break;
  }
  const across = rest?.axis ?? 2;
  if (rest && elbow[across] < rest.edgeMm && wrist[across] > rest.edgeMm) {
    const t = (rest.edgeMm - elbow[across]) / (wrist[across] - elbow[across]);
    most = Math.max(
      most,
      rest.topMm - mix(elbow[1], wrist[1], t) + 0.95 * mix(radius.forearm, radius.wrist, t),
    );
  } else if (rest?.axis === 0 && elbow[0] >= rest.edgeMm) {
    most = Math.max(most, rest.topMm - elbow[1] + 0.95 * radius.elbow);
  }
  return most / BAD_MM;
}

import { partEdges } from '../drawing/solid-outline.ts';
import type { Part, PartRole } from '../parts/part.ts';
import type { FootRail } from './leg-posture.ts';
import type { SeatPoint } from './pose.ts';

const RAIL_ROLES: readonly PartRole[] = ['rail', 'foot'];
/** Feet look for a rail this far to either side, and this far before the hip. */
const ASIDE_MM = 150;
const AHEAD_MM = [250, 1000] as const;
const HIGHEST_MM = 450;

/**
 * What before a seat can carry the feet: the highest rail, or foot of a table, that lies across the way of the soles.
 *
 * @param parts - parts of the set
 * @param frame - the place: hip point and facing
 * @returns heights above the floor and distance before the hip, millimetres; `undefined` without one
 */
export function footRailOf(parts: readonly Part[], { hipMm, facingRad }: SeatPoint): FootRail | undefined {
  const [s, c] = [Math.sin(facingRad), Math.cos(facingRad)];
  let best: FootRail | undefined;
  for (const part of parts) {
    if (!RAIL_ROLES.includes(part.role)) continue;
    const corners = partEdges(part).corners.map(([x, y, z]) => {
      const [dx, dz] = [x - hipMm[0], z - hipMm[2]];
      return { aside: dx * c - dz * s, ahead: dx * s + dz * c, y };
    });
    const [left, right] = [Math.max, Math.min].map((of) => of(...corners.map(({ aside }) => aside)));
    const topMm = Math.max(...corners.map(({ y }) => y));
    const near = Math.max(AHEAD_MM[0], Math.min(...corners.map(({ ahead }) => ahead)));
    const far = Math.min(AHEAD_MM[1], Math.max(...corners.map(({ ahead }) => ahead)));
    if (left! < -ASIDE_MM || right! > ASIDE_MM || near > far || topMm > HIGHEST_MM) continue;
    if (!best || topMm > best.topMm) best = { topMm, aheadOfHipMm: (near + far) / 2 };
  }
  return best;
}

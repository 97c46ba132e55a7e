import { nearestBetween } from '../situation/plan-distance.ts';
import { outOfFrame, type PlanFrame, type PlanOutline, type PlanPoint } from '../situation/plan.ts';
import { lineDistance } from './convex.ts';
import type { Obstacle } from './obstacles.ts';
import type { Band, BandName } from './walker.ts';

/** Where a body is: its middle on the floor, and the way it looks; 0 looks along +z. */
export interface Pose {
  xMm: number;
  zMm: number;
  headingRad: number;
}

/** A band with what can come near it. */
interface BandAmong {
  band: Band;
  near: readonly Obstacle[];
}

/** A body among obstacles. */
export interface BodyAmong {
  bands: readonly BandAmong[];
}

/** More room than this to each side is open floor. */
export const OPEN_MM = 150;
/** Nothing comes nearer to the middle line of a body than this: nobody is half as thick. */
const CORE_MM = 40;
/** What lies within this of straight across the body from the nearest thing, as a cosine, is on its other side. */
const OTHER_SIDE = -0.3;

/**
 * Puts a body among the obstacles that share its heights.
 *
 * @param bands - of the body
 * @param obstacles - all there are
 * @returns the body with what each band can meet
 */
export function among(bands: readonly Band[], obstacles: readonly Obstacle[]): BodyAmong {
  return {
    bands: bands.map((band) => ({
      band,
      near: obstacles.filter(({ bottomMm, topMm }) => bottomMm < band.toMm && topMm > band.fromMm),
    })),
  };
}

/**
 * Ends of a band's line in the room.
 *
 * @param core - in the body's frame
 * @param pose - where the body is
 * @returns both ends, x and z
 */
export function coreAt(core: Band['core'], { xMm, zMm, headingRad }: Pose): [PlanPoint, PlanPoint] {
  const [a, b] = outOfFrame(core, { xMm, zMm, facingRad: headingRad });
  return [a ?? core[0], b ?? core[1]];
}

/**
 * A body that looks along a frame.
 *
 * @param plan - the frame
 * @param aheadMm - how far ahead of its origin the body's middle is
 * @returns where it is
 */
export function poseAhead(plan: PlanFrame, aheadMm: number): Pose {
  const [[xMm, zMm] = [0, 0]] = outOfFrame([[0, aheadMm]], plan);
  return { xMm, zMm, headingRad: plan.facingRad };
}

/**
 * Room to each side of a body: how much its depth could grow on both sides before it touched something.
 *
 * @param body - the body among obstacles
 * @param pose - where it is
 * @returns millimetres, at most `OPEN_MM`; negative where something stands in the body, minus infinity where it reaches
 *   the body's middle
 */
export function clearanceAt(body: BodyAmong, pose: Pose): number {
  // A search asks this a hundred thousand times: nothing is made on the way.
  let least = OPEN_MM;
  const c = Math.cos(pose.headingRad);
  const s = Math.sin(pose.headingRad);
  for (const { band, near } of body.bands) {
    const { radiusMm, core } = band;
    const ax = pose.xMm + core[0][0] * c + core[0][1] * s;
    const az = pose.zMm - core[0][0] * s + core[0][1] * c;
    const bx = pose.xMm + core[1][0] * c + core[1][1] * s;
    const bz = pose.zMm - core[1][0] * s + core[1][1] * c;
    const mx = (ax + bx) / 2;
    const mz = (az + bz) / 2;
    const half = Math.hypot(bx - ax, bz - az) / 2;
    for (const { shape } of near) {
      const limit = least + radiusMm;
      const reach = limit + half + shape.circle[2];
      const dx = shape.circle[0] - mx;
      const dz = shape.circle[1] - mz;
      if (dx * dx + dz * dz >= reach * reach) continue;
      const distance = lineDistance(shape, ax, az, bx, bz, limit);
      if (distance >= limit) continue;
      if (distance < CORE_MM) return -Infinity;
      least = distance - radiusMm;
    }
  }
  return least;
}

/** One side of a tight spot. */
export interface Side {
  pieceId: string;
  mark: string;
  placeId?: string;
  at: PlanPoint;
}

/** What holds a body on both sides. */
export interface Hold {
  band: BandName;
  clearMm: number;
  /** From thing to thing, across the body. */
  widthMm: number;
  /** How much of it the body takes: its depth at that height. */
  depthMm: number;
  /** One, or two where something stands on the other side as well. */
  between: Side[];
}

/**
 * What stands nearest to a body, and what on its other side.
 *
 * @param body - the body among obstacles
 * @param pose - where it is
 * @returns the tightest band's hold; undefined on open floor
 */
export function holdAt(body: BodyAmong, pose: Pose): Hold | undefined {
  let held: { hold: Hold; way: PlanPoint; distanceMm: number; band: BandAmong } | undefined;
  for (const bandAmong of body.bands) {
    const { band, near } = bandAmong;
    for (const one of near) {
      const found = nearestTo(band, pose, one);
      const clearMm = found.distanceMm - band.radiusMm;
      if (clearMm >= Math.min(OPEN_MM, held?.hold.clearMm ?? Infinity)) continue;
      const hold = {
        band: band.name,
        clearMm,
        widthMm: 2 * found.distanceMm,
        depthMm: 2 * band.radiusMm,
        between: [found.side],
      };
      held = { hold, way: found.way, distanceMm: found.distanceMm, band: bandAmong };
    }
  }
  if (held === undefined) return undefined;
  const { hold, way, distanceMm, band } = held;
  const across = band.near
    .map((one) => nearestTo(band.band, pose, one))
    .filter((one) => one.way[0] * way[0] + one.way[1] * way[1] < OTHER_SIDE)
    .sort((a, b) => a.distanceMm - b.distanceMm)[0];
  if (across === undefined || across.distanceMm - band.band.radiusMm >= OPEN_MM) return hold;
  return { ...hold, widthMm: distanceMm + across.distanceMm, between: [...hold.between, across.side] };
}

function nearestTo(band: Band, pose: Pose, { pieceId, mark, placeId, outline, shape }: Obstacle) {
  const core: PlanOutline = coreAt(band.core, pose);
  const [[ax, az] = [0, 0], [bx, bz] = [0, 0]] = core;
  const { from, to } = nearestBetween(core, outline);
  const distanceMm = lineDistance(shape, ax, az, bx, bz, Infinity);
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]) || 1;
  const way: PlanPoint = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  const side: Side = { pieceId, mark, at: to, ...(placeId === undefined ? {} : { placeId }) };
  return { distanceMm, way, side };
}

/**
 * Room to each side of a body, where something stands on both sides of it: beside one thing alone there is room to move
 * away.
 *
 * @param body - the body among obstacles
 * @param pose - where it is
 * @returns as `clearanceAt`, and `OPEN_MM` where a body that touches nothing has one side open
 */
export function squeezeAt(body: BodyAmong, pose: Pose): number {
  const clearMm = clearanceAt(body, pose);
  if (clearMm < 0 || clearMm >= OPEN_MM) return clearMm;
  return (holdAt(body, pose)?.between.length ?? 0) > 1 ? clearMm : OPEN_MM;
}

import type { Pose } from './room-around.ts';

const CHECK_MM = 40;
const CHECK_RAD = Math.PI / 20;
/** Where there is this much room to each side a path may be drawn closer than it was. */
const EASY_MM = 80;

/**
 * A pose between two others.
 *
 * @param from - one
 * @param to - the other
 * @param t - 0 at the first, 1 at the second
 */
export const poseBetween = (from: Pose, to: Pose, t: number): Pose => ({
  xMm: from.xMm + (to.xMm - from.xMm) * t,
  zMm: from.zMm + (to.zMm - from.zMm) * t,
  headingRad: from.headingRad + (to.headingRad - from.headingRad) * t,
});

/**
 * Poses along a path, close enough together.
 *
 * @param poses - the path
 * @param everyMm - how far two that follow each other may be apart; turns count too, a half turn as twenty steps
 * @returns the path with poses put in between
 */
export function resampled(poses: readonly Pose[], everyMm: number): Pose[] {
  return poses.flatMap((pose, i) => {
    const next = poses[i + 1];
    if (next === undefined) return [pose];
    const steps = stepsBetween(pose, next, everyMm);
    return Array.from({ length: steps }, (_, n) => poseBetween(pose, next, n / steps));
  });
}

const stepsBetween = (a: Pose, b: Pose, everyMm: number): number =>
  Math.max(
    1,
    Math.ceil(Math.hypot(b.xMm - a.xMm, b.zMm - a.zMm) / everyMm),
    Math.ceil(Math.abs(b.headingRad - a.headingRad) / CHECK_RAD),
  );

/**
 * Takes the corners out of a path wherever a straight piece has as much room.
 *
 * @param poses - the path
 * @param clearAt - room to each side at a pose
 * @returns poses of the path that are left, its ends among them
 */
export function straightened(poses: readonly Pose[], clearAt: (pose: Pose) => number): Pose[] {
  const clear = poses.map(clearAt);
  const kept: Pose[] = poses.slice(0, 1);
  let at = 0;
  while (at < poses.length - 1) {
    let next = at + 1;
    for (let jump = poses.length - 1 - at; jump > 1; jump = Math.floor(jump / 2)) {
      if (isAsOpen(at, at + jump)) {
        next = at + jump;
        break;
      }
    }
    const pose = poses[next];
    if (pose) kept.push(pose);
    at = next;
  }
  return kept;

  function isAsOpen(from: number, to: number): boolean {
    const [a, b] = [poses[from], poses[to]];
    if (!a || !b) return false;
    const asked = Math.min(EASY_MM, ...clear.slice(from, to + 1));
    const steps = stepsBetween(a, b, CHECK_MM);
    for (let n = 1; n < steps; n += 1) {
      if (clearAt(poseBetween(a, b, n / steps)) < asked) return false;
    }
    return true;
  }
}

import type { Pose } from './room-around.ts';
import { poseBetween } from './straighten.ts';

/** How far a pose may be moved across the path, and turned: what lies between two nodes of the search. */
const FIRST_MM = 16;
const FIRST_RAD = Math.PI / 30;
const LAST_MM = 0.01;
const MOST_MM = 48;
const MOST_RAD = Math.PI / 10;
const BETWEEN = 4;
/** Poses looked at, by pattern and by sections. */
const MOST_ROUNDS = [600, 60] as const;
const EDGE = 0.95;
/** A section search keeps this share of its stretch. */
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** The pose with the least room on a path, and how much that is. */
export interface Tightest {
  index: number;
  clearMm: number;
}

/**
 * Moves the tightest poses of a path across it, and turns them, until the one with the least room has as much as it can.
 *
 * @param path - poses close together; moved in place, and more are put in about the tightest
 * @param clearAt - room to each side at a pose
 * @param squeezeAt - the same where something stands on both sides, and open floor elsewhere: what counts as tight
 * @returns the tightest pose of the path
 * @source pattern search over two numbers; at the tightest, where that may stop on a ridge, golden sections within golden
 *   sections
 */
export function easeTightest(
  path: Pose[],
  clearAt: (pose: Pose) => number,
  squeezeAt: (pose: Pose) => number,
): Tightest {
  const clear = path.map(squeezeAt);
  // As the path first ran: poses that were moved say nothing of its direction any more.
  const sides = path.map((pose, i) => sideOf(path[i - 1] ?? pose, pose, path[i + 1] ?? pose));
  /** How far each pose has been eased: 0 not yet, 1 by pattern, 2 by sections. */
  const eased = path.map(() => 0);
  settle(1);
  for (let round = 0; round < 2; round += 1) {
    const { index } = least();
    const between: [number, Pose][] = [];
    for (const n of [index, index - 1]) {
      const [from, to] = [path[n], path[n + 1]];
      if (!from || !to) continue;
      const poses = Array.from({ length: BETWEEN - 1 }, (_, k) => poseBetween(from, to, (k + 1) / BETWEEN));
      between.push(...poses.map((pose): [number, Pose] => [n + 1, pose]).reverse());
    }
    for (const [at, pose] of between) {
      path.splice(at, 0, pose);
      clear.splice(at, 0, squeezeAt(pose));
      eased.splice(at, 0, 0);
      sides.splice(at, 0, sides[at] ?? [0, 1]);
    }
    settle(1);
  }
  settle(2);
  return least();

  function least(): Tightest {
    let index = 0;
    clear.forEach((clearMm, i) => {
      if (clearMm < (clear[index] ?? Infinity)) index = i;
    });
    return { index, clearMm: clear[index] ?? 0 };
  }

  function settle(stage: 1 | 2): void {
    for (let round = 0; round < (MOST_ROUNDS[stage - 1] ?? 0); round += 1) {
      const { index } = least();
      if ((eased[index] ?? 2) >= stage) return;
      eased[index] = stage;
      const at = across(index);
      const room = (mm: number, rad: number) => clearAt(at(mm, rad));
      const [mm, rad] = stage === 1 ? byPattern(room, clear[index] ?? 0) : bySections(room);
      const found = squeezeAt(at(mm, rad));
      if (found <= (clear[index] ?? 0)) continue;
      path[index] = at(mm, rad);
      clear[index] = found;
      // The best may lie beyond the edge of what was searched.
      if (Math.abs(mm) > EDGE * FIRST_MM || Math.abs(rad) > EDGE * FIRST_RAD) eased[index] = stage - 1;
    }
  }

  /** The poses across the path from one of its poses, moved and turned. */
  function across(index: number): (mm: number, rad: number) => Pose {
    const here = path[index] ?? { xMm: 0, zMm: 0, headingRad: 0 };
    const [ax, az] = sides[index] ?? [0, 1];
    return (mm, rad) => ({
      xMm: here.xMm + ax * mm,
      zMm: here.zMm + az * mm,
      headingRad: here.headingRad + rad,
    });
  }
}

/** Which way is across a path; one that only turns is moved across the body. */
function sideOf(before: Pose, here: Pose, after: Pose): readonly [number, number] {
  const [dx, dz] = [after.xMm - before.xMm, after.zMm - before.zMm];
  const length = Math.hypot(dx, dz);
  return length > 0 ? [-dz / length, dx / length] : [Math.sin(here.headingRad), Math.cos(here.headingRad)];
}

type Room = (mm: number, rad: number) => number;

const DIRECTIONS = [
  [1, 0],
  [-1, 0],
  [0, 1],
  [0, -1],
  [1, 1],
  [-1, -1],
  [1, -1],
  [-1, 1],
] as const;

function byPattern(roomAt: Room, roomNow: number): [mm: number, rad: number] {
  let [mm, rad, room] = [0, 0, roomNow];
  for (let step = 1; step * FIRST_MM > LAST_MM;) {
    let [bestMm, bestRad] = [mm, rad];
    let better = false;
    for (const [m, r] of DIRECTIONS) {
      const [tryMm, tryRad] = [mm + m * step * FIRST_MM, rad + r * step * FIRST_RAD];
      if (Math.abs(tryMm) > MOST_MM || Math.abs(tryRad) > MOST_RAD) continue;
      const found = roomAt(tryMm, tryRad);
      if (found > room) [bestMm, bestRad, room, better] = [tryMm, tryRad, found, true];
    }
    [mm, rad] = [bestMm, bestRad];
    if (!better) step /= 2;
  }
  return [mm, rad];
}

function bySections(roomAt: Room): [mm: number, rad: number] {
  const bestMm = (rad: number) => bySection((mm) => roomAt(mm, rad), FIRST_MM, LAST_MM);
  const rad = bySection((turned) => roomAt(bestMm(turned), turned), FIRST_RAD, LAST_MM / 100);
  return [bestMm(rad), rad];
}

/** Where a function with one hill is highest, between minus and plus a stretch. */
function bySection(height: (at: number) => number, reach: number, last: number): number {
  let [low, high] = [-reach, reach];
  let [a, b] = [high - GOLDEN * (high - low), low + GOLDEN * (high - low)];
  let [atA, atB] = [height(a), height(b)];
  while (high - low > last) {
    if (atA > atB) {
      [high, b, atB] = [b, a, atA];
      a = high - GOLDEN * (high - low);
      atA = height(a);
    } else {
      [low, a, atA] = [a, b, atB];
      b = low + GOLDEN * (high - low);
      atB = height(b);
    }
  }
  return (low + high) / 2;
}

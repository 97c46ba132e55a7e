import type { PlanFrame } from '../situation/plan.ts';
import { createKeyHeap } from './key-heap.ts';
import { OPEN_MM, type Pose } from './room-around.ts';

/** Headings of a half turn; a body seen from above is the same after one. */
const HEADINGS = 12;
const TURN_RAD = Math.PI / HEADINGS;
/** What a turn by one heading costs, and what sideways costs over straight on, as of way walked. */
const TURN_COST_MM = 60;
const SIDEWAYS_COST = 0.6;
/** Close by something a way costs this much more at most. */
const CLOSE_COST = 2;
const BUCKET_MM = 2;
const LONGEST_MM = 1e7;

/** Nodes of the search: a lattice in a frame, with headings. */
export interface Lattice {
  /** Its origin is a node, and its second axis heading 0. */
  frame: PlanFrame;
  stepMm: number;
  /** Lowest and highest node along both axes. */
  left: readonly [number, number];
  ahead: readonly [number, number];
}

/** Where a path may begin. */
export interface Start {
  /** Nodes along the frame's two axes. */
  left: number;
  ahead: number;
  /** Of the headings of a half turn, from the way the frame looks on. */
  heading: number;
  /** Least room on what lies before the path, and how long that is. */
  clearMm: number;
  costMm: number;
}

/** What a search writes on; one after another may use the same. */
export interface SearchSpace {
  /** Nodes written on by the last search. */
  written: number[];
  clear: Float32Array;
  least: Float32Array;
  cost: Float32Array;
  parent: Int32Array;
  done: Uint8Array;
}

/**
 * @returns a space to search in, which grows as needed
 */
export const searchSpace = (): SearchSpace => ({ written: [], ...blank(0) });

const blank = (size: number) => ({
  clear: new Float32Array(size).fill(NaN),
  least: new Float32Array(size).fill(-Infinity),
  cost: new Float32Array(size).fill(Infinity),
  parent: new Int32Array(size).fill(-1),
  done: new Uint8Array(size),
});

function cleared(space: SearchSpace, size: number): void {
  if (space.done.length < size) Object.assign(space, blank(size));
  else {
    for (const node of space.written) {
      space.clear[node] = NaN;
      space.least[node] = -Infinity;
      space.cost[node] = Infinity;
      space.parent[node] = -1;
      space.done[node] = 0;
    }
  }
  space.written = [];
}

export interface WidestPath {
  /** From the start on; headings run on without a jump. */
  poses: Pose[];
  /** Which of the starts it comes from. */
  start: number;
  clearMm: number;
}

/**
 * The heading of the search nearest to a turn.
 *
 * @param turnRad - from the way the lattice's frame looks
 * @returns a whole number from 0 on
 */
export const headingIndex = (turnRad: number): number =>
  ((Math.round(turnRad / TURN_RAD) % HEADINGS) + HEADINGS) % HEADINGS;

const MOVES = [-1, 0, 1].flatMap((dl) => [-1, 0, 1].flatMap((da) => (dl || da ? [[dl, da] as const] : [])));

/**
 * The path on which the least room to each side is largest, and of those a short and easy one.
 *
 * A best-first search by two keys: first the least room met so far, then the way walked plus what is left of it. The first
 * time it takes up a node of the goal, no path there has more room.
 *
 * @param lattice - where nodes are
 * @param clearAt - room to each side at a pose, at most `OPEN_MM`; minus infinity where nobody gets
 * @param starts - where it may begin
 * @param toGoal - least way to the goal from a spot, given along the frame's two axes; 0 at the goal; millimetres
 * @param space - to search in
 * @returns the path, to within the lattice; undefined where no path leads to the goal
 * @source widest-path variant of Dijkstra's search
 */
export function widestPath(
  lattice: Lattice,
  clearAt: (pose: Pose) => number,
  starts: readonly Start[],
  toGoal: (leftMm: number, aheadMm: number) => number,
  space: SearchSpace,
): WidestPath | undefined {
  const { stepMm, frame } = lattice;
  const [l0, a0] = [lattice.left[0], lattice.ahead[0]];
  const [nl, na] = [lattice.left[1] - l0 + 1, lattice.ahead[1] - a0 + 1];
  cleared(space, nl * na * HEADINGS);
  const { written, clear, least, cost, parent, done } = space;
  const heap = createKeyHeap();
  const [c, s] = [Math.cos(frame.facingRad), Math.sin(frame.facingRad)];
  const poseAt = (l: number, a: number, headingRad: number): Pose => {
    const left = (l + l0) * stepMm;
    const ahead = (a + a0) * stepMm;
    return { xMm: frame.xMm + left * c + ahead * s, zMm: frame.zMm - left * s + ahead * c, headingRad };
  };
  const goalFrom = (l: number, a: number): number => toGoal((l + l0) * stepMm, (a + a0) * stepMm);
  const clearOf = (node: number, l: number, a: number, h: number): number => {
    const known = clear[node] ?? NaN;
    if (!Number.isNaN(known)) return known;
    const value = clearAt(poseAt(l, a, frame.facingRad + h * TURN_RAD));
    clear[node] = value;
    written.push(node);
    return value;
  };
  function reach(node: number, l: number, a: number, clearMm: number, costMm: number, from: number): void {
    if (done[node] === 1 || clearMm === -Infinity) return;
    const bucket = Math.ceil((OPEN_MM - clearMm) / BUCKET_MM);
    const known = Math.ceil((OPEN_MM - (least[node] ?? 0)) / BUCKET_MM);
    if (bucket > known || (bucket === known && costMm >= (cost[node] ?? Infinity))) return;
    least[node] = clearMm;
    cost[node] = costMm;
    parent[node] = from;
    heap.push(bucket * LONGEST_MM + costMm + goalFrom(l, a), node);
  }
  starts.forEach(({ left, ahead, heading, clearMm, costMm }, i) => {
    const [l, a] = [left - l0, ahead - a0];
    if (l < 0 || l >= nl || a < 0 || a >= na) return;
    const node = (l * na + a) * HEADINGS + heading;
    reach(node, l, a, Math.min(clearMm, clearOf(node, l, a, heading)), costMm, -2 - i);
  });
  const ways = Array.from({ length: HEADINGS }, (_, h) =>
    MOVES.map(([dl, da]) => {
      const across = Math.abs(dl * Math.cos(h * TURN_RAD) - da * Math.sin(h * TURN_RAD));
      return (Math.hypot(dl, da) + SIDEWAYS_COST * across) * stepMm;
    }),
  );
  for (let node = heap.pop(); node >= 0; node = heap.pop()) {
    if (done[node] === 1) continue;
    done[node] = 1;
    const h = node % HEADINGS;
    const cell = (node - h) / HEADINGS;
    const l = Math.floor(cell / na);
    const a = cell % na;
    const clearMm = least[node] ?? 0;
    const costMm = cost[node] ?? 0;
    if (goalFrom(l, a) <= 0) return walkedTo(node);
    for (let m = 0; m < MOVES.length; m += 1) {
      const tl = l + (MOVES[m]?.[0] ?? 0);
      const ta = a + (MOVES[m]?.[1] ?? 0);
      if (tl < 0 || tl >= nl || ta < 0 || ta >= na) continue;
      const to = (tl * na + ta) * HEADINGS + h;
      if (done[to] === 1) continue;
      const room = clearOf(to, tl, ta, h);
      const close = 1 + (CLOSE_COST * (OPEN_MM - Math.max(0, room))) / OPEN_MM;
      reach(to, tl, ta, Math.min(clearMm, room), costMm + close * (ways[h]?.[m] ?? 0), node);
    }
    for (let turn = 1; turn < HEADINGS; turn += HEADINGS - 2) {
      const th = (h + turn) % HEADINGS;
      const to = node - h + th;
      if (done[to] === 1) continue;
      reach(to, l, a, Math.min(clearMm, clearOf(to, l, a, th)), costMm + TURN_COST_MM, node);
    }
  }
  return undefined;

  function walkedTo(goal: number): WidestPath {
    const nodes: number[] = [];
    let at = goal;
    for (; at >= 0; at = parent[at] ?? -1) nodes.push(at);
    let last = (nodes.at(-1) ?? 0) % HEADINGS;
    let headingRad = frame.facingRad + last * TURN_RAD;
    const poses = nodes.reverse().map((node): Pose => {
      const h = node % HEADINGS;
      const cell = (node - h) / HEADINGS;
      const turned = (h - last + HEADINGS) % HEADINGS;
      headingRad += (turned > HEADINGS / 2 ? turned - HEADINGS : turned) * TURN_RAD;
      last = h;
      return poseAt(Math.floor(cell / na), cell % na, headingRad);
    });
    return { poses, start: -2 - at, clearMm: least[goal] ?? 0 };
  }
}

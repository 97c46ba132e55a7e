import type { Cage } from './cage.ts';
import { readFigure, type Figure, type FigureMeans } from './figure.ts';
import { press } from './press.ts';
import { fitCage, skin, skinPoints, type SkinLevel } from './skin.ts';
import { measuringStance, restKnee } from './stance.ts';
import { clamp, mix } from './vector.ts';

/** Measures that are read back from the skin and corrected. */
const SOLVED = [
  'SH',
  'AH',
  'BA',
  'HB',
  'BD',
  'BPL',
  'BKL',
  'KH',
  'TC',
  'AD',
  'ER',
  'FF',
  'CD',
  'FL',
  'rump',
] as const;
type Solved = (typeof SOLVED)[number];

/** Share of an error that is put back in one pass. */
const GAIN: Record<Solved, number> = {
  SH: 1,
  AH: 0.9,
  BA: 0.9,
  HB: 1,
  BD: 0.85,
  BPL: 1,
  BKL: 1,
  KH: 1,
  TC: 1,
  AD: 0.85,
  ER: 1,
  FF: 0.85,
  CD: 0.8,
  FL: 1,
  rump: 1,
};
/** Passes on the coarse level, then on the fine one. */
const COARSE_PASSES = 3;
const FINE_PASSES = 6;
const CLOSE_ENOUGH_MM = 0.4;
const FURTHEST_MM = 45;

/** Which points of a level belong to what, worked out once. */
interface Readers {
  trunk: number[];
  legs: number[];
  calves: number[];
  arms: number[];
  shoes: number[];
  shins: number[];
  acromion: number;
}

function readersOf(at: SkinLevel, cage: Cage): Readers {
  const sets = {
    trunk: new Set<number>(),
    legs: new Set<number>(),
    calves: new Set<number>(),
    arms: new Set<number>(),
    shoes: new Set<number>(),
    shins: new Set<number>(),
  };
  at.level.quads.forEach((quad, q) => {
    const face = cage.faces[at.level.home[q]!.face]!;
    for (const v of quad) {
      if (face.region === 'trunk' || face.region === 'head') sets.trunk.add(v);
      if (face.region === 'arm') sets.arms.add(v);
      if (face.region === 'leg') sets.legs.add(v);
      if (face.region === 'shoe') sets.shoes.add(v);
      if (face.region === 'leg' && face.strip >= 3) sets.calves.add(v);
      if (face.region === 'leg' && face.strip >= 4) sets.shins.add(v);
    }
  });
  return {
    trunk: [...sets.trunk],
    legs: [...sets.legs],
    calves: [...sets.calves],
    arms: [...sets.arms],
    shoes: [...sets.shoes],
    shins: [...sets.shins],
    // Points of the cage keep their place on every level.
    acromion: cage.trunk[7]![3]!,
  };
}

const readers = new WeakMap<SkinLevel, Readers>();

/** Highest point of the legs from a depth onwards; at that depth itself between the points on either side. */
function legTop(
  p: Float64Array,
  legs: readonly number[],
  fromMm: number,
  toMm = Infinity,
): number | undefined {
  let top: number | undefined;
  let [before, after] = [-1, -1];
  for (const v of legs) {
    const [y, ahead] = [p[v * 3 + 1]!, p[v * 3 + 2]! - fromMm];
    if (ahead > 0 && p[v * 3 + 2]! < toMm && (top === undefined || y > top)) top = y;
    if (Math.abs(ahead) > 40) continue;
    if (ahead > 0 && (after < 0 || y > p[after * 3 + 1]!)) after = v;
    if (ahead <= 0 && (before < 0 || y > p[before * 3 + 1]!)) before = v;
  }
  if (top === undefined || before < 0 || after < 0) return top;
  const share = (fromMm - p[before * 3 + 2]!) / (p[after * 3 + 2]! - p[before * 3 + 2]!);
  return Math.max(top, mix(p[before * 3 + 1]!, p[after * 3 + 1]!, share));
}

/** Rearmost place of the left calf from 15 to 45 mm under the seat, between the points that lie above one another there. */
function kneeBack(p: Float64Array, calves: readonly number[], kneeX: number): number | undefined {
  const line = calves
    .filter((v) => Math.abs(p[v * 3]! - kneeX) < 14 && p[v * 3 + 1]! < 20 && p[v * 3 + 1]! > -90)
    .map((v) => ({ y: p[v * 3 + 1]!, z: p[v * 3 + 2]! }));
  const front = Math.max(...line.map(({ z }) => z));
  const rear = line.filter(({ z }) => z < front - 40).sort((a, b) => a.y - b.y);
  let most: number | undefined;
  for (let i = 0; i + 1 < rear.length; i++) {
    const [low, high] = [rear[i]!, rear[i + 1]!];
    for (const at of [Math.max(low.y, -45), Math.min(high.y, -15)]) {
      if (at < Math.max(low.y, -45) || at > Math.min(high.y, -15) || high.y - low.y < 1e-6) continue;
      const depth = mix(low.z, high.z, (at - low.y) / (high.y - low.y));
      if (most === undefined || depth < most) most = depth;
    }
  }
  return most;
}

/** Reads the solved measures from the skin in the measuring posture; `undefined` where nothing was in the window. */
function readBack(
  p: Float64Array,
  who: Readers,
  want: Figure,
  drawn: Figure,
): Record<Solved, number | undefined> {
  const most = (
    ids: number[],
    axis: number,
    keep: (v: number) => boolean,
    sign: 1 | -1 = 1,
  ): number | undefined => {
    let best: number | undefined;
    for (const v of ids) {
      if (!keep(v)) continue;
      const value = sign * p[v * 3 + axis]!;
      if (best === undefined || value > best) best = value;
    }
    return best === undefined ? undefined : sign * best;
  };
  const all = (): boolean => true;
  const x = (v: number): number => p[v * 3]!;
  const y = (v: number): number => p[v * 3 + 1]!;
  const z = (v: number): number => p[v * 3 + 2]!;
  const twice = (value: number | undefined): number | undefined =>
    value === undefined ? undefined : 2 * value;
  /** Greatest depth at one level between two heights, near the midline. */
  const depthBetween = (low: number, high: number, halfWidth: number): number | undefined => {
    const inBand = who.trunk.filter((v) => y(v) > low && y(v) < high && Math.abs(x(v)) < halfWidth);
    const furthest = most(inBand, 2, all);
    if (furthest === undefined) return undefined;
    let deepest: number | undefined;
    for (const v of inBand) {
      if (z(v) < furthest - 25) continue;
      const back = most(inBand, 2, (w) => Math.abs(y(w) - y(v)) < 9, -1) ?? z(v);
      if (deepest === undefined || z(v) - back > deepest) deepest = z(v) - back;
    }
    return deepest;
  };
  const knee = legTop(p, who.legs, want.BPL + 12);
  const belly = most(who.trunk, 2, (v) => y(v) > 0.36 * want.AH && y(v) < 0.55 * want.AH) ?? want.AD;
  const hips = Math.max(most(who.legs, 0, all) ?? 0, most(who.trunk, 0, (v) => y(v) < want.ER) ?? 0);
  const acrossShoulders = Math.max(
    most(who.arms, 0, (v) => y(v) > 0.79 * want.AH) ?? 0,
    most(who.trunk, 0, (v) => y(v) > 0.79 * want.AH) ?? 0,
  );
  return {
    rump: most(who.trunk, 2, (v) => y(v) < want.TC + 60, -1),
    SH: most(who.trunk, 1, all),
    HB: 2 * hips,
    BD: 2 * acrossShoulders,
    BPL: kneeBack(p, who.shins, restKnee(drawn)[0]),
    BKL: most(who.calves, 2, all),
    KH: knee === undefined ? undefined : knee + want.PH,
    TC: legTop(p, who.legs, belly + 4, drawn.BPL - 20),
    AD: depthBetween(want.TC + 8, want.TC + 0.5 * (0.75 * want.AH - want.TC), 0.2 * want.BA),
    ER: most(who.arms, 1, (v) => z(v) < 0.42 * want.CD + 60, -1),
    FF: twice(most(who.arms, 0, (v) => y(v) < want.ER + 80)),
    CD: depthBetween(0.72 * want.AH, 0.8 * want.AH, 0.31 * want.BA),
    AH: y(who.acromion),
    BA: 2 * x(who.acromion),
    FL: (most(who.shoes, 2, all) ?? 0) - (most(who.shoes, 2, all, -1) ?? 0),
  };
}

/** One correction of `drawn` from what its skin measures; returns the worst error found. */
function correct(want: Figure, drawn: Figure, at: SkinLevel, cage: Cage): number {
  let who = readers.get(at);
  if (!who) {
    who = readersOf(at, cage);
    readers.set(at, who);
  }
  const stance = measuringStance(drawn);
  const points = skinPoints(at, fitCage(drawn, stance));
  press(points, at, drawn, stance);
  const found = readBack(points, who, want, drawn);
  let worst = 0;
  for (const key of SOLVED) {
    const value = found[key];
    if (value === undefined) continue;
    const error = want[key] - value;
    worst = Math.max(worst, Math.abs(error));
    drawn[key] = clamp(drawn[key] + GAIN[key] * error, want[key] - FURTHEST_MM, want[key] + FURTHEST_MM);
  }
  return worst;
}

function solve(want: Figure): Figure {
  const { cage, coarse, fine } = skin();
  const drawn: Figure = { ...want };
  for (let pass = 0; pass < COARSE_PASSES; pass++) correct(want, drawn, coarse, cage);
  for (let pass = 0; pass < FINE_PASSES; pass++) {
    if (correct(want, drawn, fine, cage) < CLOSE_ENOUGH_MM) break;
  }
  return drawn;
}

const solved = new WeakMap<FigureMeans, { want: Figure; drawn: Figure }>();

/**
 * The figure to draw so that the skin has the wanted measures; remembered for each `means` object.
 *
 * @param means - body measures in millimetres, weight in kilograms; must not be changed afterwards
 * @returns the measures as wanted and as given to the sections
 */
export function solvedFigure(means: FigureMeans): { want: Figure; drawn: Figure } {
  let entry = solved.get(means);
  if (!entry) {
    const want = readFigure(means);
    entry = { want, drawn: solve(want) };
    solved.set(means, entry);
  }
  return entry;
}

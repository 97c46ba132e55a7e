import type { Cage } from './cage.ts';
import { readFigure, type Figure, type FigureMeans } from './figure.ts';
import { press } from './press.ts';
import { fitCage, skin, skinPoints, type SkinLevel } from './skin.ts';
import { measuringStance } from './stance.ts';
import { clamp } from './vector.ts';

/** Measures that are read back from the skin and corrected. */
const SOLVED = ['SH', 'HB', 'BD', 'BPL', 'BKL', 'KH', 'TC', 'AD', 'ER', 'FF', 'CD'] as const;
type Solved = (typeof SOLVED)[number];

/** Share of an error that is put back in one pass. */
const GAIN: Record<Solved, number> = {
  SH: 1,
  HB: 1,
  BD: 0.5,
  BPL: 1,
  BKL: 1,
  KH: 1,
  TC: 1,
  AD: 0.85,
  ER: 1,
  FF: 1,
  CD: 0.8,
};
/** Passes on the coarse level, then on the fine one. */
const COARSE_PASSES = 3;
const FINE_PASSES = 4;
const CLOSE_ENOUGH_MM = 0.4;
const FURTHEST_MM = 45;

/** Which points of a level belong to what, worked out once. */
interface Readers {
  trunk: number[];
  legs: number[];
  calves: number[];
  arms: number[];
}

function readersOf(at: SkinLevel, cage: Cage): Readers {
  const sets = {
    trunk: new Set<number>(),
    legs: new Set<number>(),
    calves: new Set<number>(),
    arms: new Set<number>(),
  };
  at.level.quads.forEach((quad, q) => {
    const face = cage.faces[at.level.home[q]!.face]!;
    for (const v of quad) {
      if (face.region === 'trunk' || face.region === 'head') sets.trunk.add(v);
      if (face.region === 'arm') sets.arms.add(v);
      if (face.region === 'leg') sets.legs.add(v);
      if (face.region === 'leg' && face.strip >= 3) sets.calves.add(v);
    }
  });
  return {
    trunk: [...sets.trunk],
    legs: [...sets.legs],
    calves: [...sets.calves],
    arms: [...sets.arms],
  };
}

const readers = new WeakMap<SkinLevel, Readers>();

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
  const y = (v: number): number => p[v * 3 + 1]!;
  const z = (v: number): number => p[v * 3 + 2]!;
  const twice = (value: number | undefined): number | undefined =>
    value === undefined ? undefined : 2 * value;
  const depthBetween = (low: number, high: number): number | undefined => {
    const inBand = (v: number): boolean => y(v) > low && y(v) < high;
    const front = most(who.trunk, 2, inBand);
    const back = most(who.trunk, 2, inBand, -1);
    return front === undefined || back === undefined ? undefined : front - back;
  };
  const knee = most(who.legs, 1, (v) => z(v) > drawn.BPL + 12);
  const belly = 30 + 0.02 * drawn.CD + drawn.AD;
  const hips = Math.max(most(who.legs, 0, all) ?? 0, most(who.trunk, 0, (v) => y(v) < want.ER) ?? 0);
  const acrossShoulders = Math.max(
    most(who.arms, 0, (v) => y(v) > 0.79 * want.AH) ?? 0,
    most(who.trunk, 0, (v) => y(v) > 0.79 * want.AH) ?? 0,
  );
  const bellyFront = most(
    who.trunk,
    2,
    (v) => y(v) > want.TC + 12 && y(v) < want.TC + 0.62 * (0.755 * want.AH - want.TC),
  );
  return {
    SH: most(who.trunk, 1, all),
    HB: 2 * hips,
    BD: 2 * acrossShoulders,
    BPL: most(who.calves, 2, (v) => y(v) < -10 && y(v) > -60, -1),
    BKL: most(who.calves, 2, all),
    KH: knee === undefined ? undefined : knee + want.PH,
    TC: most(who.legs, 1, (v) => z(v) > belly + 10 && z(v) < drawn.BPL - 20),
    AD: bellyFront === undefined ? undefined : bellyFront - 28,
    ER: most(who.arms, 1, (v) => z(v) < 0.42 * want.CD + 60, -1),
    FF: twice(most(who.arms, 0, (v) => y(v) < want.ER + 130)),
    CD: depthBetween(0.72 * want.AH, 0.8 * want.AH),
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

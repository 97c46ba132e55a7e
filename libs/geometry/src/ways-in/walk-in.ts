import type { SetDocument } from '../room/document.ts';
import { footprint } from '../room/footprint.ts';
import { extent, inFrame, type PlanPoint } from '../situation/plan.ts';
import type { Survey, SurveyedPlace } from '../situation/survey.ts';
import type { Obstacle } from './obstacles.ts';
import { among, clearanceAt, holdAt, OPEN_MM, squeezeAt, type Pose } from './room-around.ts';
import { seatLine, type Station } from './seat-line.ts';
import { slider, type SlidePose } from './slide.ts';
import { startsAt, type SitDown, type SlideLine } from './starts.ts';
import { stepsOf } from './steps.ts';
import { resampled, straightened } from './straighten.ts';
import { easeTightest } from './tightest.ts';
import { standing, type BodyHeights, type Walker } from './walker.ts';
import type { TightSpot, WayStep } from './way-in.ts';
import { widestPath, type Lattice, type SearchSpace } from './widest-path.ts';

const STEP_MM = 40;
/** In a large room nodes stand further apart, so that there are no more of them than this along both axes together. */
const MOST_CELLS = 250_000;
/** Open floor around everything of the set. */
const AROUND_MM = 800;
const EVERY_MM = 25;

/** A way in that was found, with what it takes to ask more of it. */
export interface WalkedIn {
  steps: WayStep[];
  tightest?: TightSpot;
  /** Least room to each side on the whole way. */
  clearMm: number;
  /** Places that one slides over. */
  over: readonly string[];
  obstacles: readonly Obstacle[];
  /** Whether whoever walks the way meets these. */
  touches: (others: readonly Obstacle[]) => boolean;
}

/**
 * The way with most room to each side from the way in to a place.
 *
 * @param found - the survey of the set
 * @param place - where it leads
 * @param walker - who goes
 * @param obstacles - what stands in the way; of a chair one sits on, not the chair
 * @param heights - what is stepped over and what is leaned under
 * @param space - to search in
 * @param leastMm - ways with less room to each side are not looked for
 * @returns the way; undefined where none leads there, however thin one is
 */
export function walkIn(
  found: Survey,
  place: SurveyedPlace,
  walker: Walker,
  obstacles: readonly Obstacle[],
  heights: BodyHeights,
  space: SearchSpace,
  leastMm = -Infinity,
): WalkedIn | undefined {
  const { document } = found;
  const bands = standing(walker, heights);
  const body = among(bands, obstacles);
  const clearAt = (pose: Pose): number => clearanceAt(body, pose);
  const entrance = document.asked.entrance ?? document.asked.route?.[0];
  const lattice = latticeAround(document, place, entrance && [entrance.xMm, entrance.zMm]);
  const starts = startsAt(place, slideLines(found, place, walker, obstacles, heights[0]), lattice).filter(
    ({ clearMm }) => clearMm >= leastMm,
  );
  const widest = widestPath(
    lattice,
    (pose) => {
      const clearMm = clearAt(pose);
      return clearMm < leastMm ? -Infinity : clearMm;
    },
    starts,
    entrance ? toSpot(lattice, [entrance.xMm, entrance.zMm]) : toOpenFloor(lattice),
    space,
  );
  const start = widest && starts[widest.start];
  if (!widest || !start) return undefined;
  const path = resampled(straightened(widest.poses, clearAt), EVERY_MM);
  const stood = easeTightest(path, clearAt, (pose) => squeezeAt(body, pose));
  const at = path[stood.index];
  const hold = at && stood.clearMm < OPEN_MM ? holdAt(body, at) : undefined;
  const slid = slidOn(start);
  const tight: TightSpot[] = [
    ...(at && hold ? [{ ...hold, move: 'stand' as const, at }] : []),
    ...tightSlide(slid.tightest),
  ].sort((a, b) => a.clearMm - b.clearMm);
  return {
    steps: stepsOf(path.slice().reverse(), slid.poses, place),
    ...(tight[0] ? { tightest: tight[0] } : {}),
    clearMm: Math.min(stood.clearMm, slid.tightest?.clearMm ?? OPEN_MM),
    over: start.over,
    obstacles,
    touches(others) {
      const met = among(bands, others);
      return path.some((pose) => clearanceAt(met, pose) < 0);
    },
  };
}

/** The seat to both sides of a place, with where a body has room on it. */
function slideLines(
  found: Survey,
  place: SurveyedPlace,
  walker: Walker,
  obstacles: readonly Obstacle[],
  steppedOverMm: number,
): SlideLine[] {
  return ([1, -1] as const).flatMap((side) => {
    const stations = seatLine(found, place, side);
    if (stations.length === 0) return [];
    const slide = slider(place, side, walker, obstacles, steppedOverMm);
    const known = new Map<Station, readonly SlidePose[]>();
    const at = (station: Station) => {
      const parts = known.get(station) ?? slide(station);
      known.set(station, parts);
      return parts;
    };
    return [{ stations, at }];
  });
}

/** What is slid along, from where one sits down to the place. */
function slidOn({ slid }: SitDown): { poses: Pose[]; tightest?: SlidePose } {
  if (slid === undefined) return { poses: [] };
  const { line, last } = slid;
  const stations = line.stations.slice(0, last + 1);
  const poses = stations.flatMap((station) => line.at(station)[0]?.pose ?? []).reverse();
  const [tightest] = stations
    .slice(1)
    .flatMap((station) => [...line.at(station)])
    .sort((a, b) => a.clearMm - b.clearMm);
  return { poses, ...(tightest ? { tightest } : {}) };
}

function tightSlide(tightest: SlidePose | undefined): TightSpot[] {
  if (tightest === undefined || tightest.clearMm >= OPEN_MM) return [];
  const hold = holdAt(tightest.body, tightest.pose);
  return hold ? [{ ...hold, move: 'slide', at: tightest.pose }] : [];
}

/** Nodes about the place, over the whole set and the floor around it. */
function latticeAround(
  document: SetDocument,
  { plan }: SurveyedPlace,
  entrance: PlanPoint | undefined,
): Lattice {
  const corners = document.pieces.flatMap((piece) => [...footprint(piece).corners]);
  const points = inFrame(entrance ? [...corners, entrance] : corners, plan);
  const [left, ahead] = [extent(points, 0), extent(points, 1)];
  const area = (left[1] - left[0] + 2 * AROUND_MM) * (ahead[1] - ahead[0] + 2 * AROUND_MM);
  const stepMm = Math.max(STEP_MM, Math.sqrt(area / MOST_CELLS));
  const nodes = ([low, high]: readonly [number, number]) =>
    [Math.floor((low - AROUND_MM) / stepMm), Math.ceil((high + AROUND_MM) / stepMm)] as const;
  return { frame: plan, stepMm, left: nodes(left), ahead: nodes(ahead) };
}

/** The way left to a spot, taken as reached from the nodes about it. */
function toSpot({ frame, stepMm }: Lattice, spot: PlanPoint): (leftMm: number, aheadMm: number) => number {
  const [[left, ahead] = [0, 0]] = inFrame([spot], frame);
  return (l, a) => Math.max(0, Math.hypot(l - left, a - ahead) - stepMm);
}

/** The way left to the outermost nodes. */
function toOpenFloor({ stepMm, left, ahead }: Lattice): (leftMm: number, aheadMm: number) => number {
  const [l0, l1, a0, a1] = [...left, ...ahead].map((node) => node * stepMm) as [
    number,
    number,
    number,
    number,
  ];
  return (l, a) => Math.max(0, Math.min(l - l0, l1 - l, a - a0, a1 - a) - 1);
}

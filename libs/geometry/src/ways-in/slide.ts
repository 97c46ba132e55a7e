import { extent, inFrame } from '../situation/plan.ts';
import type { SurveyedPlace } from '../situation/survey.ts';
import type { Obstacle } from './obstacles.ts';
import {
  among,
  clearanceAt,
  OPEN_MM,
  poseAhead,
  squeezeAt,
  type BodyAmong,
  type Pose,
} from './room-around.ts';
import type { Station } from './seat-line.ts';
import { sliding, type Walker } from './walker.ts';

/** How far the middle of trunk or shins may be from where they rest, back and ahead, and how finely that is tried. */
const AHEAD_MM = [-120, 220] as const;
const TRIES = 18;
const LAST_MM = 0.01;

/** Trunk or shins of somebody who slides, where they have most room. */
export interface SlidePose {
  pose: Pose;
  clearMm: number;
  body: BodyAmong;
}

/**
 * Sliding along a seat: at every station trunk and shins go forward or back to where they have most room.
 *
 * @param place - where one slides to; what lies beyond it hinders nobody on the way
 * @param side - to which side of the place the seat line lies, 1 for the sitter's left
 * @param walker - who slides
 * @param obstacles - all there are; the seats slid on hinder the shins alone
 * @param steppedOverMm - what ends lower is no hindrance
 * @returns for a station, the trunk first
 */
export function slider(
  place: SurveyedPlace,
  side: 1 | -1,
  walker: Walker,
  obstacles: readonly Obstacle[],
  steppedOverMm: number,
): (station: Station) => [trunk: SlidePose, shins: SlidePose] {
  const [trunk, shins] = sliding(walker, place.frame.frontMm[1], steppedOverMm);
  const onWay = obstacles.filter(({ outline }) => {
    const [low, high] = extent(inFrame(outline, place.plan), 0);
    return side > 0 ? high > 0 : low < 0;
  });
  const bodies = new Map<string, readonly [BodyAmong, BodyAmong]>();
  const bodiesOn = (pieceId: string) => {
    const without = (group: string) =>
      onWay.filter((one) => one.group !== group || (group === 'back' && one.pieceId !== pieceId));
    const made =
      bodies.get(pieceId) ?? ([among([trunk], without('seat')), among([shins], without('back'))] as const);
    bodies.set(pieceId, made);
    return made;
  };
  return ({ plan, on }) => {
    const [above, below] = bodiesOn(on.piece.id);
    return [
      mostRoom(above, (mm) => poseAhead(plan, trunk.radiusMm - on.effectiveDepthMm + mm)),
      mostRoom(below, (mm) => poseAhead(plan, shins.radiusMm + mm)),
    ];
  };
}

/** Tries a body forward and back, then finer about the best. */
function mostRoom(body: BodyAmong, at: (mm: number) => Pose): SlidePose {
  const [low, high] = AHEAD_MM;
  const step = (high - low) / TRIES;
  // Where it rests comes first: with as much room anywhere, nobody moves.
  let [best, room] = [0, clearanceAt(body, at(0))];
  for (let n = 0; n <= TRIES && room < OPEN_MM; n += 1) {
    const clearMm = clearanceAt(body, at(low + n * step));
    if (clearMm > room) [best, room] = [low + n * step, clearMm];
  }
  for (let by = step / 2; by > LAST_MM && room < OPEN_MM && room > -Infinity; by /= 2) {
    for (const mm of [best - by, best + by]) {
      const clearMm = clearanceAt(body, at(mm));
      if (clearMm > room) [best, room] = [mm, clearMm];
    }
  }
  return { pose: at(best), clearMm: squeezeAt(body, at(best)), body };
}

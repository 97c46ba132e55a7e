import { inFrame, outOfFrame } from '../situation/plan.ts';
import type { SurveyedPlace } from '../situation/survey.ts';
import { OPEN_MM } from './room-around.ts';
import type { Station } from './seat-line.ts';
import type { SlidePose } from './slide.ts';
import { headingIndex, type Lattice, type Start } from './widest-path.ts';

/** One sits down from no further than this before the seat, or beside its end. */
const BEFORE_MM = 360;
const BESIDE_MM = 460;
/** One sits down with a turn, if need be, at a cost for each radian. */
const TURNS = [0, Math.PI / 4, Math.PI / 2, -Math.PI / 4] as const;
const TURN_COST_MM = 150;
/** Sliding is slower than walking. */
const SLIDE_COST = 2;

/** A seat line with where trunk and shins have room on it. */
export interface SlideLine {
  stations: readonly Station[];
  at: (station: Station) => readonly SlidePose[];
}

/** Where somebody stands who is about to sit down. */
export interface SitDown extends Start {
  /** What is slid along then; the first entry of `stations` is the place itself. */
  slid: { line: SlideLine; last: number } | undefined;
  over: readonly string[];
}

/**
 * Where one stands to sit down at a place: before it, or before another place of the seat or beside its end, to slide
 * from there.
 *
 * @param place - the place
 * @param lines - the seat to both sides; none for a chair
 * @param lattice - nodes of the search
 * @returns nodes to start the search from
 */
export function startsAt(place: SurveyedPlace, lines: readonly SlideLine[], lattice: Lattice): SitDown[] {
  const { frame, stepMm } = lattice;
  const steps = (fromMm: number, toMm: number): number[] => {
    const first = Math.ceil(fromMm / stepMm);
    return Array.from({ length: Math.max(0, Math.floor(toMm / stepMm) - first + 1) }, (_, n) => first + n);
  };
  if (lines.length === 0) {
    // The chair is pulled back: one stands where it stood.
    return steps(-place.effectiveDepthMm, BEFORE_MM / 2).map((ahead) => {
      return { left: 0, ahead, heading: 0, clearMm: OPEN_MM, costMm: 0, slid: undefined, over: [] };
    });
  }
  return lines.flatMap((line) => {
    let clearMm = OPEN_MM;
    return line.stations.flatMap(({ plan, on, out, slidMm, over }, last): SitDown[] => {
      const station = line.stations[last];
      if (last > 0 && station) {
        clearMm = Math.min(clearMm, ...line.at(station).map((part) => part.clearMm));
      }
      if (out === undefined || clearMm === -Infinity) return [];
      const slid = last === 0 ? undefined : { line, last };
      const stand = (leftMm: number, aheadMm: number): SitDown[] => {
        const [[left, ahead] = [0, 0]] = inFrame(outOfFrame([[leftMm, aheadMm]], plan), frame);
        return TURNS.map((turned) => ({
          left: Math.round(left / stepMm),
          ahead: Math.round(ahead / stepMm),
          heading: headingIndex(plan.facingRad - frame.facingRad + turned),
          clearMm,
          costMm: SLIDE_COST * slidMm + Math.hypot(leftMm, aheadMm) + TURN_COST_MM * Math.abs(turned),
          slid,
          over,
        }));
      };
      if (out === 'before') return steps(stepMm, BEFORE_MM).flatMap((n) => stand(0, n * stepMm));
      return steps(0, BESIDE_MM).flatMap((away) =>
        steps(-on.effectiveDepthMm / 2, BEFORE_MM).flatMap((ahead) =>
          stand(out * away * stepMm, ahead * stepMm),
        ),
      );
    });
  });
}

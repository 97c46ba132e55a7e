import type { SurveyedPlace } from '../situation/survey.ts';
import { poseAhead, type Pose } from './room-around.ts';
import type { Move, WayStep } from './way-in.ts';

/** From this much of it to the side a step is sideways, as a sine. */
const SIDEWAYS = 0.7;

/**
 * A way as stretches of one kind of move.
 *
 * @param walked - poses on foot, from the way in to where one sits down
 * @param slid - poses on the seat, on to the place
 * @param place - the place
 * @returns stretches that each begin where the last one ends; the last is sitting down or sitting back
 */
export function stepsOf(walked: readonly Pose[], slid: readonly Pose[], place: SurveyedPlace): WayStep[] {
  const steps: WayStep[] = [];
  walked.slice(1).forEach((to, i) => {
    const from = walked[i] ?? to;
    const move = moveBetween(from, to) ?? steps.at(-1)?.move ?? 'walk';
    const last = steps.at(-1);
    if (last?.move === move) last.poses.push(to);
    else steps.push({ move, poses: [from, to] });
  });
  const stood = walked.slice(-1);
  if (slid.length > 1) {
    steps.push({ move: 'sit', poses: [...stood, ...slid.slice(0, 1)] }, { move: 'slide', poses: [...slid] });
    return steps;
  }
  steps.push({ move: 'sit', poses: [...stood, poseAhead(place.plan, -place.hipBehindFrontMm)] });
  return steps;
}

function moveBetween(from: Pose, to: Pose): Move | undefined {
  const [dx, dz] = [to.xMm - from.xMm, to.zMm - from.zMm];
  const length = Math.hypot(dx, dz);
  if (length === 0) return undefined;
  const heading = (from.headingRad + to.headingRad) / 2;
  const aside = Math.abs(dx * Math.cos(heading) - dz * Math.sin(heading)) / length;
  return aside > SIDEWAYS ? 'sideways' : 'walk';
}

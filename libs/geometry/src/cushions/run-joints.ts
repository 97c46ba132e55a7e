import { z } from 'zod';

/** Where a run of cushions is divided, where somebody chose it. */
export const runJointsSchema = z.discriminatedUnion('by', [
  /** From the left end of the run as seen from in front. Places beyond the run are passed over. */
  z.strictObject({ by: z.literal('positions'), atMm: z.array(z.number().min(1).max(12000)).max(39) }),
  /** Near equal parts none longer than the longest cushion, every division on a board joint. */
  z.strictObject({ by: z.literal('board-lines') }),
]);

export type RunJoints = z.infer<typeof runJointsSchema>;

/** No stretch between two chosen joints is shorter, millimetres. */
export const SHORTEST_STRETCH_MM = 50;

/**
 * Divides a run into equal stretches no longer than a limit; a division goes to the nearest board joint
 * when that keeps both neighbours within the limit.
 *
 * @param leftMm - start of the run
 * @param rightMm - end of the run, greater than `leftMm`
 * @param longestMm - longest stretch allowed, > 0
 * @param jointsMm - preferred places for a division
 * @returns the ends of the stretches, rising, both ends of the run included
 */
export function divideRun(
  leftMm: number,
  rightMm: number,
  longestMm: number,
  jointsMm: readonly number[],
): number[] {
  const length = rightMm - leftMm;
  const count = Math.max(1, Math.ceil(length / longestMm - 1e-9));
  const ends = [leftMm];
  for (let i = 1; i < count; i += 1) {
    const even = leftMm + (length * i) / count;
    const before = ends[ends.length - 1]!;
    const stretchesAfter = count - i;
    const fitting = jointsMm.filter(
      (joint) =>
        joint > before + 1 &&
        joint - before <= longestMm + 1e-6 &&
        rightMm - joint <= stretchesAfter * longestMm + 1e-6,
    );
    const nearest = fitting.sort((a, b) => Math.abs(a - even) - Math.abs(b - even))[0];
    ends.push(nearest !== undefined && Math.abs(nearest - even) < length / count / 4 ? nearest : even);
  }
  return [...ends, rightMm];
}

/**
 * Divides a run on board joints only, as near to equal as they allow.
 *
 * @param leftMm - start of the run
 * @param rightMm - end of the run
 * @param longestMm - longest stretch wanted; one more stretch is made before it is passed
 * @param jointsMm - where boards meet, rising
 * @returns the ends of the stretches, rising; a run without a joint is not divided
 */
export function divideOnBoards(
  leftMm: number,
  rightMm: number,
  longestMm: number,
  jointsMm: readonly number[],
): number[] {
  const inside = jointsMm.filter(
    (joint) => joint >= leftMm + SHORTEST_STRETCH_MM && joint <= rightMm - SHORTEST_STRETCH_MM,
  );
  const length = rightMm - leftMm;
  const least = Math.max(1, Math.ceil(length / longestMm - 1e-9));
  let ends = [leftMm, rightMm];
  for (let count = least; count <= inside.length + 1; count += 1) {
    const cuts = new Set<number>();
    for (let i = 1; i < count; i += 1) {
      const even = leftMm + (length * i) / count;
      cuts.add(
        inside.reduce((best, joint) => (Math.abs(joint - even) < Math.abs(best - even) ? joint : best)),
      );
    }
    ends = [leftMm, ...[...cuts].sort((a, b) => a - b), rightMm];
    if (ends.slice(1).every((end, i) => end - ends[i]! <= longestMm + 1e-6)) break;
  }
  return ends;
}

/**
 * Divides a run at chosen places.
 *
 * @param leftMm - start of the run
 * @param rightMm - end of the run
 * @param atMm - from its start
 * @returns the ends of the stretches; a place nearer to an end or to the one before than a cushion can be is passed over
 */
export function divideAt(leftMm: number, rightMm: number, atMm: readonly number[]): number[] {
  const ends = [leftMm];
  for (const at of [...atMm].sort((a, b) => a - b)) {
    const joint = leftMm + at;
    if (joint < ends[ends.length - 1]! + SHORTEST_STRETCH_MM || joint > rightMm - SHORTEST_STRETCH_MM)
      continue;
    ends.push(joint);
  }
  return [...ends, rightMm];
}

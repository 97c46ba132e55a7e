import { poseMannequin, type PoseNote, type PostureChoice } from '@settlewright/geometry';
import type { SeatedBody } from '../picture.ts';

/** What says that a choice cannot be had here. */
const REFUSALS: readonly PoseNote['kind'][] = [
  'table-out-of-reach',
  'sill-out-of-reach',
  'rail-out-of-reach',
  'too-full-to-cross',
  'too-low-to-cross',
  'table-over-knees',
];

/** Why a choice cannot be had at a place; `undefined` where it can. */
export function refusalOf(
  { pose, at }: Pick<SeatedBody, 'pose' | 'at'>,
  choice: PostureChoice,
): PoseNote | undefined {
  const { notes } = poseMannequin({ ...at, means: pose.means, choice });
  return notes.find(({ kind }) => REFUSALS.includes(kind));
}

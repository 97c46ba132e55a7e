import { poseMannequin, type PoseNote, type PostureChoice } from '@settlewright/geometry';
import type { SeatedBody } from '../picture.ts';

/** What says that a choice cannot be had here, and which part of it. */
const REFUSALS: Partial<Record<PoseNote['kind'], 'arms' | 'feet'>> = {
  'table-out-of-reach': 'arms',
  'sill-out-of-reach': 'arms',
  'rail-out-of-reach': 'feet',
  'knees-stay-apart': 'feet',
  'table-over-knees': 'feet',
};

/** Why a choice cannot be had at a place; `undefined` where it can. */
export function refusalOf(
  { pose, at }: Pick<SeatedBody, 'pose' | 'at'>,
  choice: PostureChoice,
): PoseNote | undefined {
  const { notes } = poseMannequin({ ...at, means: pose.means, choice });
  return notes.find(({ kind }) => kind in REFUSALS);
}

/** What of a choice is had: parts that were chosen where there was room for them may be refused by now. */
export function choiceHad({ pose, at }: Pick<SeatedBody, 'pose' | 'at'>): PostureChoice {
  const refused = pose.notes.flatMap(({ kind }) => REFUSALS[kind] ?? []);
  return Object.fromEntries(
    Object.entries(at.choice ?? {}).filter(([part]) => !(refused as string[]).includes(part)),
  );
}

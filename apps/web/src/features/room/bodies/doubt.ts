import type { Body } from '@settlewright/anthropometry';
import { bodyRange, ghostPoses, type BodyRange, type MannequinPose } from '@settlewright/geometry';
import { create } from 'zustand';
import type { SeatedBody } from '../picture.ts';

/** Whether what is not known of bodies is drawn round them; off until somebody asks. */
export const useDoubt = create<{ shown: boolean }>(() => ({ shown: false }));

/** More people at once would cover each other with outlines. */
const MOST = 4;

const ranges = new WeakMap<Body, BodyRange>();

/** Which measures of a body are in doubt and between what; `undefined` for readers who may not see measures. */
export function doubtOf({ belief }: Pick<SeatedBody, 'belief'>): BodyRange | undefined {
  if (!belief) return undefined;
  const range = ranges.get(belief) ?? bodyRange(belief);
  ranges.set(belief, range);
  return range;
}

interface Ghosts {
  smaller: MannequinPose;
  larger: MannequinPose;
}
const made = new WeakMap<MannequinPose, { ghosts: Ghosts | undefined }>();

/** The smaller and the larger body that somebody may have; none where every measure is known. */
export function ghostsOf(body: Pick<SeatedBody, 'belief' | 'pose' | 'at'>): Ghosts | undefined {
  const known = made.get(body.pose);
  if (known) return known.ghosts;
  const range = doubtOf(body);
  const ghosts = range && ghostPoses(range, body.at);
  made.set(body.pose, { ghosts });
  return ghosts;
}

/** Whose doubt is drawn: the chosen sitter's, else everybody's while they are few, else the first one's. */
export function doubted<T extends Pick<SeatedBody, 'placeId'>>(
  bodies: readonly T[],
  placeId: string | undefined,
): readonly T[] {
  const chosen = bodies.filter((body) => body.placeId === placeId);
  if (chosen.length > 0) return chosen;
  return bodies.length > MOST ? bodies.slice(0, 1) : bodies;
}

/** What is said when the outlines come and go. */
export function sayDoubt(bodies: readonly Pick<SeatedBody, 'belief' | 'name'>[]): string {
  const inDoubt = bodies.filter((body) => (doubtOf(body)?.uncertain.length ?? 0) > 0);
  if (inDoubt.length === 0) return 'Nothing in doubt of those drawn.';
  return `Dashed outlines show how small and how large ${inDoubt.map(({ name }) => name).join(', ')} may be.`;
}

import {
  mannequinMesh,
  type MannequinDetail,
  type MannequinMesh,
  type MannequinPose,
} from '@settlewright/geometry';
import { createAsker } from '@/lib/ask-worker.ts';
import type { BodyQuestion } from './body.worker.ts';
import { createSkins } from './kept-skins.ts';

const ask = createAsker(
  () => new Worker(new URL('./body.worker.ts', import.meta.url), { type: 'module', name: 'bodies' }),
  'The drawing of bodies stopped.',
);

const skins = createSkins();

/** A skin that was made before, here or where the same body sat the same way. */
export const knownBody = (pose: MannequinPose, detail: MannequinDetail): MannequinMesh | undefined =>
  skins.known(pose, detail);

/** The skin of a pose at once, made on the page where it was not made before. */
export const bodyNow = (pose: MannequinPose, detail: MannequinDetail): MannequinMesh =>
  knownBody(pose, detail) ?? skins.keep(pose, detail, mannequinMesh(pose, detail));

let last: Promise<unknown> = Promise.resolve();

/**
 * Has a worker make the skin of a pose, so that the page stays free. One is made at a time: those that nobody wants any
 * more when their turn comes are not made, and answer with nothing. Where there are no workers the page makes it itself.
 */
export function askBody(
  pose: MannequinPose,
  detail: MannequinDetail,
  isWanted: () => boolean,
): Promise<MannequinMesh | undefined> {
  const answer = last.then(async () => {
    if (!isWanted()) return undefined;
    const known = knownBody(pose, detail);
    if (known) return known;
    if (typeof Worker === 'undefined') return bodyNow(pose, detail);
    const { means, stance, placement } = pose;
    const mesh = await ask<MannequinMesh>((id): BodyQuestion => ({
      id,
      pose: { means, stance, placement },
      detail,
    }));
    return skins.keep(pose, detail, mesh);
  });
  last = answer.catch(() => undefined);
  return answer;
}

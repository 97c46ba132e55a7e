import { mannequinMesh, type MannequinDetail, type MannequinPose } from '@settlewright/geometry';
import { replyTo } from '@/lib/ask-worker.ts';

export interface BodyQuestion {
  id: number;
  pose: Pick<MannequinPose, 'means' | 'stance' | 'placement'>;
  detail: MannequinDetail;
}

type Means = BodyQuestion['pose']['means'];

/** Bodies whose shape is kept solved. */
const MOST_BODIES = 64;
const solved = new Map<string, Means>();

/** One object for the same measures however often they arrive: what was solved for it is remembered by it. */
function sameMeans(means: Means): Means {
  const key = JSON.stringify(means);
  const known = solved.get(key) ?? means;
  solved.delete(key);
  solved.set(key, known);
  const oldest = solved.keys().next();
  if (solved.size > MOST_BODIES && !oldest.done) solved.delete(oldest.value);
  return known;
}

self.onmessage = ({ data: { id, pose, detail } }: MessageEvent<BodyQuestion>) => {
  void replyTo(id, () => mannequinMesh({ ...pose, means: sameMeans(pose.means) }, detail)).then((reply) => {
    // What all bodies have in common stays here; the skin of this one is handed over.
    const own = 'answer' in reply ? [reply.answer.positions.buffer, reply.answer.normals.buffer] : [];
    self.postMessage(reply, { transfer: own });
  });
};

import { mannequinMesh, type MannequinDetail, type MannequinPose } from '@settlewright/geometry';
import { replyTo } from '@/lib/ask-worker.ts';

export interface BodyQuestion {
  id: number;
  pose: Pick<MannequinPose, 'means' | 'stance' | 'placement'>;
  detail: MannequinDetail;
}

self.onmessage = ({ data: { id, pose, detail } }: MessageEvent<BodyQuestion>) => {
  void replyTo(id, () => mannequinMesh(pose, detail)).then((reply) => {
    // What all bodies have in common stays here; the skin of this one is handed over.
    const own = 'answer' in reply ? [reply.answer.positions.buffer, reply.answer.normals.buffer] : [];
    self.postMessage(reply, { transfer: own });
  });
};

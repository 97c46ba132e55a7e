import {
  mannequinMesh,
  sitterDistances,
  type MannequinMesh,
  type MannequinPose,
  type Part,
} from '@settlewright/geometry';
import { replyTo } from '@/lib/ask-worker.ts';

export interface DistancesQuestion {
  id: number;
  bodies: readonly {
    placeId: string;
    pieceId: string;
    pose: Pick<MannequinPose, 'means' | 'stance' | 'placement' | 'segments'>;
  }[];
  parts: readonly Part[];
}

self.onmessage = ({ data: { id, bodies, parts } }: MessageEvent<DistancesQuestion>) => {
  void replyTo(id, () =>
    sitterDistances(
      bodies.map((body) => {
        let mesh: MannequinMesh | undefined;
        return {
          ...body,
          // Made for those alone that something is near to.
          get mesh() {
            mesh ??= mannequinMesh(body.pose);
            return mesh;
          },
        };
      }),
      parts,
    ),
  ).then((reply) => self.postMessage(reply));
};

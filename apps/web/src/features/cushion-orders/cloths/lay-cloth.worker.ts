import { layCloth, type ClothOfOrder } from '@settlewright/geometry';
import { replyTo } from '@/lib/ask-worker.ts';

export interface NumberedCloth {
  id: number;
  cloth: ClothOfOrder;
}

self.onmessage = ({ data: { id, cloth } }: MessageEvent<NumberedCloth>) => {
  void replyTo(id, () => layCloth(cloth) ?? null).then((reply) => self.postMessage(reply));
};

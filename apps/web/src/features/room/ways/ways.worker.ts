import { findWaysIn, type Comer, type MayMove, type SetDocument } from '@settlewright/geometry';
import { replyTo } from '@/lib/ask-worker.ts';

export interface WaysQuestion {
  id: number;
  document: SetDocument;
  comers: readonly Comer[];
  heightsMm: readonly [steppedOver: number, leanedUnder: number];
  mayMove?: MayMove;
}

self.onmessage = ({ data: { id, document, comers, heightsMm, mayMove } }: MessageEvent<WaysQuestion>) => {
  void replyTo(id, () => findWaysIn(document, comers, heightsMm, mayMove)).then((reply) =>
    self.postMessage(reply),
  );
};

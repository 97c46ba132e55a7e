import { findWaysIn, type Comer, type SetDocument } from '@settlewright/geometry';
import { replyTo } from '@/lib/ask-worker.ts';

export interface WaysQuestion {
  id: number;
  document: SetDocument;
  comers: readonly Comer[];
  heightsMm: readonly [steppedOver: number, leanedUnder: number];
}

self.onmessage = ({ data: { id, document, comers, heightsMm } }: MessageEvent<WaysQuestion>) => {
  void replyTo(id, () => findWaysIn(document, comers, heightsMm)).then((reply) => self.postMessage(reply));
};

import { findWaysIn, type Comer, type SetDocument, type WaysIn } from '@settlewright/geometry';
import type { Reply } from '@/lib/ask-worker.ts';

export interface WaysQuestion {
  id: number;
  document: SetDocument;
  comers: readonly Comer[];
  heightsMm: readonly [steppedOver: number, leanedUnder: number];
}

self.onmessage = ({ data: { id, document, comers, heightsMm } }: MessageEvent<WaysQuestion>) => {
  let reply: Reply<WaysIn>;
  try {
    reply = { id, answer: findWaysIn(document, comers, heightsMm) };
  } catch (fault) {
    reply = { id, fault: fault instanceof Error ? fault.message : String(fault) };
  }
  self.postMessage(reply);
};

import { faultWords } from '@/lib/ask-worker.ts';
import { search, type SearchAsked, type SearchTold } from './search.ts';

export type SearchReply = SearchTold | { fault: string };

// One worker is one search; whoever stops it ends the worker and keeps what was told.
self.onmessage = ({ data }: MessageEvent<SearchAsked>) => {
  const say = (reply: SearchReply): void => self.postMessage(reply);
  search(data, say).catch((fault: unknown) => say({ fault: faultWords(fault) }));
};

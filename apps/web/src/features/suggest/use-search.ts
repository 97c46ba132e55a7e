import type { Tried } from '@settlewright/geometry';
import { useCallback, useEffect, useRef, useState } from 'react';
import { registerUnsentWork } from '@/lib/unsent-work.ts';
import { keepSearch, wipeSearches, type KeptSearch } from './kept-search.ts';
import type { SearchAsked, SearchTold } from './search.ts';
import type { SearchReply } from './search.worker.ts';

/** A search that runs, ran or failed. */
export interface SearchRun {
  question: string;
  asked: Omit<SearchAsked, 'known'>;
  state: KeptSearch['state'] | 'failed';
  told?: SearchTold;
  /** Seconds since it started, and what it knew then. */
  seconds: number;
  knownAtStart: number;
  fault?: string;
}

interface Start extends Pick<KeptSearch, 'form' | 'question'> {
  asked: Omit<SearchAsked, 'known'>;
  known?: Tried[];
}

const KEEP_EVERY_MS = 1500;

/** Runs one search at a time in a worker of its own and keeps what was tried, so that a reload loses nothing. */
export function useSearch(userId: string, setId: string) {
  const [run, setRun] = useState<SearchRun>();
  const worker = useRef<Worker>(undefined);
  const kept = useRef<KeptSearch>(undefined);

  const keep = useCallback(
    (state: KeptSearch['state']) => {
      if (!kept.current) return;
      kept.current = { ...kept.current, state };
      keepSearch(userId, setId, kept.current);
    },
    [userId, setId],
  );

  const start = useCallback(
    ({ form, question, asked, known = [] }: Start) => {
      worker.current?.terminate();
      const mine = new Worker(new URL('./search.worker.ts', import.meta.url), {
        type: 'module',
        name: 'suggest',
      });
      worker.current = mine;
      kept.current = { form, question, tried: [...known], state: 'running' };
      keep('running');
      const [startedAt, knownAtStart] = [performance.now(), known.length];
      let keptAt = startedAt;
      setRun({ question, asked, state: 'running', seconds: 0, knownAtStart });
      const fail = (fault: string) => setRun((before) => before && { ...before, state: 'failed', fault });
      mine.onerror = () => fail('The search stopped. Reload the page.');
      mine.onmessage = ({ data }: MessageEvent<SearchReply>) => {
        if (worker.current !== mine) return;
        if ('fault' in data) {
          fail(data.fault);
          return;
        }
        kept.current?.tried.push(...data.tried);
        const now = performance.now();
        if (data.ended || now - keptAt > KEEP_EVERY_MS) {
          keep(data.ended ? 'done' : 'running');
          keptAt = now;
        }
        const state = data.ended ? 'done' : 'running';
        setRun({ question, asked, state, told: data, seconds: (now - startedAt) / 1000, knownAtStart });
      };
      mine.postMessage({ ...asked, known } satisfies SearchAsked);
    },
    [keep],
  );

  const stop = useCallback(() => {
    worker.current?.terminate();
    worker.current = undefined;
    keep('stopped');
    setRun((before) => before && { ...before, state: 'stopped' });
  }, [keep]);

  useEffect(
    () => () => {
      // Left running in what is kept: it goes on when the page is opened again.
      worker.current?.terminate();
      if (kept.current?.state === 'running') keep('running');
    },
    [keep],
  );
  useEffect(
    () =>
      registerUnsentWork({
        pending: () => false,
        describe: () => '',
        wipe: () => wipeSearches(userId),
      }),
    [userId],
  );
  return { run, start, stop };
}

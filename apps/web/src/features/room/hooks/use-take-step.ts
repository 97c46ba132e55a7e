import type { SetDocument } from '@settlewright/geometry';
import { useCallback } from 'react';
import { announce } from '@/lib/announce.ts';
import { useSurroundings } from '../room-context.tsx';
import { useRoomStore } from '../store.ts';
import { changedVerdicts } from '../verdict-words.ts';

/** Takes a document as one named step and says it, with the verdicts that changed. */
export type TakeStep = (next: SetDocument, step: string, aside?: string) => void;

export function useTakeStep(): TakeStep {
  const store = useRoomStore();
  const { maker, engine } = useSurroundings();
  return useCallback(
    (next, step, aside) => {
      const { document, commit } = store.getState();
      if (next === document) return;
      commit(next, step);
      const verdicts = changedVerdicts(maker.check(document), maker.check(next), engine.ruleBook);
      announce(`${[step, ...(aside ? [aside] : []), ...verdicts].join('. ')}.`);
    },
    [store, maker, engine],
  );
}

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
      announce(sentences(step, aside, ...verdicts));
    },
    [store, maker, engine],
  );
}

/** The same for steps that come fast, as of a key held down: the verdicts that changed are said when they rest. */
export function useTakeMovingStep(): TakeStep {
  const store = useRoomStore();
  const { maker, engine } = useSurroundings();
  return useCallback(
    (next, step, aside) => {
      const { document, commitMoving } = store.getState();
      if (next === document) return;
      commitMoving(next, step, (before) => {
        const verdicts = changedVerdicts(maker.check(before), maker.check(next), engine.ruleBook);
        if (verdicts.length > 0) announce(sentences(step, aside, ...verdicts));
      });
      announce(sentences(step, aside));
    },
    [store, maker, engine],
  );
}

const sentences = (...words: (string | undefined)[]): string =>
  `${words.filter((word) => word !== undefined).join('. ')}.`;

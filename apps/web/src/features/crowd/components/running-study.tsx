import { useEffect, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { SawBoard } from '@/components/saw-board.tsx';
import type { ServerStudy } from '@/lib/contract.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useCancelStudy } from '../studies.ts';
import { studyPeople } from '../study-people.ts';

interface RunningStudyProps {
  study: ServerStudy;
  setAt: string;
  canCancel: boolean;
}

/** A count that stands still for so long is explained. */
const STILL_MS = 15_000;

/** How far a count is, and the way to stop it. */
export function RunningStudy({ study, setAt, canCancel }: RunningStudyProps) {
  const cancel = useCancelStudy(setAt);
  const { done, blocks } = study.progress;
  const isQueued = study.state === 'queued';
  const isStill = useStill(`${study.state} ${done}`);
  const words = isQueued ? 'waiting for its turn' : `${done} of ${blocks} parts counted`;
  return (
    <div className="mb-4">
      <SawBoard share={blocks > 0 ? done / blocks : 0} label="Counting a million" words={words} />
      <div className="mt-2 flex flex-wrap items-center justify-between gap-3">
        <p className="min-w-0 flex-1 text-sm text-ink-2">
          {studyPeople(study)}, {words}.{' '}
          {isStill &&
            (isQueued
              ? 'No counter is free yet.'
              : 'A part whose counter stopped is counted again by itself after a minute or so.')}{' '}
          You may leave this page.
        </p>
        {canCancel && (
          <Button size="small" busy={cancel.isPending} onClick={() => cancel.mutate(study.id)}>
            Cancel
          </Button>
        )}
      </div>
      {cancel.isError && <p className="mt-1 text-sm text-wont">{sayProblem(cancel.error)}</p>}
    </div>
  );
}

/** True once something has been the same for a while. */
function useStill(state: string): boolean {
  const [stillAt, setStillAt] = useState<string>();
  useEffect(() => {
    const wait = setTimeout(() => setStillAt(state), STILL_MS);
    return () => clearTimeout(wait);
  }, [state]);
  return stillAt === state;
}

import { useEffect, useRef } from 'react';
import { Button } from '@/components/button.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { announce } from '@/lib/announce.ts';
import type { CrowdChoice } from '@/lib/crowd/crowds.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useCrowdView } from '../crowd-view.ts';
import { isOpen, useStartStudy, useStudies } from '../studies.ts';
import { EndedStudy } from './ended-study.tsx';
import { RunningStudy } from './running-study.tsx';
import { StartFault } from './start-fault.tsx';

interface CountMillionProps {
  /** Absent where these people cannot be asked: then what was counted is shown, without a button. */
  crowd?: CrowdChoice;
  /** What counts at once; everything when absent. */
  ruleIds?: string[];
}

const SHOWN = 4;

/** The same question put to a million people on the server; it goes on when the page is left. */
export function CountMillion({ crowd, ruleIds }: CountMillionProps) {
  const { setAt, draftNumber } = useCrowdView();
  const { canEdit } = useWorkshop();
  const studies = useStudies(setAt);
  const start = useStartStudy(setAt);
  const told = (studies.data ?? []).filter(({ state }) => state !== 'cancelled');
  const isCounting = told.some(isOpen);
  useSaidWhenDone(isCounting, told[0]?.state === 'done');
  const canStart = canEdit && crowd !== undefined;
  if (!studies.data || (!canStart && told.length === 0)) return null;
  return (
    <section aria-labelledby="million-heading" className="mt-10 max-w-text">
      <RuleHeading id="million-heading">A million people</RuleHeading>
      {told
        .slice(0, SHOWN)
        .map((study) =>
          isOpen(study) ? (
            <RunningStudy key={study.id} study={study} setAt={setAt} canCancel={canEdit} />
          ) : (
            <EndedStudy key={study.id} study={study} draftNumber={draftNumber} />
          ),
        )}
      {start.isError && <StartFault error={start.error} shown={draftNumber} />}
      {canStart && (
        <div className="mt-3 flex flex-wrap items-center gap-x-4 gap-y-2">
          <Button
            busy={start.isPending || isCounting}
            busyWords="Counting"
            onClick={() => start.mutate({ crowd, draftNumber, ...(ruleIds ? { ruleIds } : {}) })}
          >
            Count a million
          </Button>
          <p className="min-w-48 flex-1 text-sm text-ink-2">
            On the server, for the people and the ticks above. It narrows what chance does to the range, not
            how surveys differ.
          </p>
        </div>
      )}
    </section>
  );
}

function useSaidWhenDone(isCounting: boolean, isDone: boolean): void {
  const was = useRef(false);
  useEffect(() => {
    if (was.current && !isCounting && isDone) announce('The million is counted.');
    was.current = isCounting;
  }, [isCounting, isDone]);
}

import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { SawBoard } from '@/components/saw-board.tsx';
import type { ServerStudy } from '@/lib/contract.ts';
import type { CrowdChoice } from '@/lib/crowd/crowds.ts';
import { momentWords } from '@/lib/dates.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useCrowdView } from '../crowd-view.ts';
import { isOpen, useCancelStudy, useStartStudy, useStudies } from '../studies.ts';
import { fineRange } from '../words.ts';

interface CountMillionProps {
  crowd: CrowdChoice;
  /** What counts at once; everything when absent. */
  ruleIds: string[] | undefined;
}

const SHOWN = 4;
const count = (people: number): string => people.toLocaleString('en-GB');

/** The same question put to a million people on the server; it goes on when the page is left. */
export function CountMillion({ crowd, ruleIds }: CountMillionProps) {
  const { setAt, draftNumber } = useCrowdView();
  const { canEdit } = useWorkshop();
  const studies = useStudies(setAt);
  const start = useStartStudy(setAt);
  const told = (studies.data ?? []).filter(({ state }) => state !== 'cancelled');
  if (!studies.data || (!canEdit && told.length === 0)) return null;
  return (
    <section aria-labelledby="million-heading" className="mt-10 max-w-text">
      <RuleHeading id="million-heading">A million people</RuleHeading>
      {told
        .slice(0, SHOWN)
        .map((study) =>
          isOpen(study) ? (
            <Running key={study.id} study={study} setAt={setAt} canCancel={canEdit} />
          ) : (
            <Ended key={study.id} study={study} />
          ),
        )}
      {start.isError && (
        <Notice tone="wont" className="my-3">
          {sayProblem(start.error)}
        </Notice>
      )}
      {canEdit && (
        <div className="mt-3 flex flex-wrap items-center gap-4">
          <Button
            busy={start.isPending || told.some(isOpen)}
            busyWords="Counting"
            onClick={() => start.mutate({ crowd, draftNumber, ...(ruleIds ? { ruleIds } : {}) })}
          >
            Count a million
          </Button>
          <p className="min-w-0 flex-1 text-sm text-ink-2">
            On the server, for the people and the ticks above. It narrows what chance does to the range, not
            how surveys differ.
          </p>
        </div>
      )}
    </section>
  );
}

interface RunningProps {
  study: ServerStudy;
  setAt: string;
  canCancel: boolean;
}

function Running({ study, setAt, canCancel }: RunningProps) {
  const cancel = useCancelStudy(setAt);
  const { done, blocks } = study.progress;
  const words = study.state === 'queued' ? 'waiting for its turn' : `${done} of ${blocks} parts counted`;
  return (
    <div className="mb-4">
      <SawBoard share={blocks > 0 ? done / blocks : 0} label="Counting a million" words={words} />
      <div className="mt-2 flex flex-wrap items-center justify-between gap-3">
        <p className="text-sm text-ink-2">
          {study.population.name}, {words}
        </p>
        {canCancel && (
          <Button size="small" busy={cancel.isPending} onClick={() => cancel.mutate(study.id)}>
            Cancel
          </Button>
        )}
      </div>
    </div>
  );
}

function Ended({ study }: { study: ServerStudy }) {
  const { population, womenPercent, people, draftNumber, revisionLetter, ruleIds, outcome, fault } = study;
  const of = revisionLetter ? `revision ${revisionLetter}` : `draft ${draftNumber}`;
  const mix = womenPercent === undefined ? '' : `, ${womenPercent} in 100 women`;
  return (
    <p className="border-b border-rule py-2">
      <span className="font-medium">
        {study.state === 'failed'
          ? `Not counted: ${fault ?? 'the count failed'}`
          : outcome?.kind === 'shares'
            ? `${fineRange(outcome.fits.mixed)} in 100 fit ${ruleIds ? `${ruleIds.length} checks` : 'all checks'} at once`
            : outcome?.kind === 'silent'
              ? `Nothing to count: ${outcome.reason}`
              : 'Not known: a measure that is read is not known of these people'}
      </span>
      <span className="block text-sm text-ink-2">
        {count(people)} people of {population.name}
        {mix}, {of}. {study.startedBy.name}, {momentWords(study.endedAt ?? study.startedAt)}.
      </span>
    </p>
  );
}

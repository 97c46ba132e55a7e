import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { useCushionSettings } from '@/lib/cushion-settings.ts';
import { dayWords } from '@/lib/dates.ts';
import { sayProblem } from '@/lib/problem.ts';
import type { WorkshopAtHand } from '@/lib/workshop.ts';
import { AllowancesForm } from './allowances-form.tsx';
import { Foams } from './foams.tsx';

/** How the workshop makes cushions: allowances, and the foams it buys. */
export function CushionSettings({ workshop }: { workshop: WorkshopAtHand }) {
  const read = useCushionSettings(workshop.id);
  const kept = read.data;
  return (
    <>
      <section>
        <RuleHeading className="mb-4">How cushions are made</RuleHeading>
        {read.isPending && <PaleBars words="Loading the allowances" />}
        {read.isError && <Notice tone="wont">{sayProblem(read.error)}</Notice>}
        {kept && (
          <>
            <p className="mb-4 text-sm text-ink-2">
              Allowances that turn a place into a finished size, and that into foam and cloth. Revisions that
              are issued keep those of their day.
              {kept.changedAt &&
                ` Last changed on ${dayWords(kept.changedAt)}${kept.changedByName ? ` by ${kept.changedByName}` : ''}.`}
            </p>
            <AllowancesForm
              key={kept.number}
              workshopId={workshop.id}
              kept={kept}
              canChange={workshop.canEdit}
            />
          </>
        )}
      </section>
      {kept && <Foams workshop={workshop} kept={kept} />}
    </>
  );
}

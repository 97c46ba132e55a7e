import type { Drawing } from '@settlewright/geometry';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { toast } from 'sonner';
import { FormDialog } from '@/components/dialog.tsx';
import { DrawingSvg } from '@/components/drawing-svg.tsx';
import { MoreIcon } from '@/components/icons.tsx';
import { Length } from '@/components/length.tsx';
import { Menu } from '@/components/menu.tsx';
import { TextField } from '@/components/text-field.tsx';
import { Verdict, VerdictCounts } from '@/components/verdict.tsx';
import type { SetSummary } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useProduction } from '@/lib/production.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { type SetStep, useSetStep } from '../api.ts';
import { describeSet } from '../describe-set.ts';

function issuedWords({ lastRevision }: SetSummary): string {
  if (lastRevision === undefined) return 'nothing issued yet';
  const approved = lastRevision.approval?.decision === 'approved' ? ', approved' : '';
  return `after ${lastRevision.letter}, issued ${dayWords(lastRevision.issuedAt)}${approved}`;
}

function SetCounts({ set }: { set: SetSummary }) {
  if (set.seatedCount === 0)
    return <Verdict verdict="notKnown" more=", nobody seated yet" className="text-sm" />;
  if (set.counts === undefined) return <p className="text-sm text-ink-2">The fit sheet could not be made.</p>;
  return <VerdictCounts counts={set.counts} className="text-sm" />;
}

interface SetRowProps {
  set: SetSummary;
  plan: Drawing;
  pxPerMm: number;
}

export function SetRow({ set, plan, pxPerMm }: SetRowProps) {
  const workshop = useWorkshop();
  const production = useProduction();
  const step = useSetStep(workshop.id, production.id);
  const [asking, setAsking] = useState<'rename' | 'archive' | null>(null);
  const [name, setName] = useState(set.name);
  const archived = set.status === 'archived';
  const home = `/w/${workshop.id}/p/${production.id}/sets/${set.id}`;
  const checks = Object.values(set.counts ?? {}).reduce((sum, count) => sum + count, 0);

  const go = (input: SetStep, done: string) =>
    step.mutate(input, {
      onSuccess: () => {
        setAsking(null);
        toast(done);
      },
      onError: (error) => {
        if (input.step !== 'rename') toast(sayProblem(error));
      },
    });

  return (
    <li className="relative flex gap-7 border-b border-rule py-5 max-tablet:flex-col max-tablet:gap-3">
      <div className="flex w-66 shrink-0 items-center max-tablet:w-auto">
        <DrawingSvg drawing={plan} pxPerMm={pxPerMm} className="max-w-full" />
      </div>
      <div className="min-w-0 flex-1 self-center max-tablet:self-start">
        <h3 className="text-lg font-semibold">
          <Link
            to={home}
            className="underline decoration-transparent decoration-[1.5px] underline-offset-4 after:absolute after:inset-0 hover:decoration-chalk"
          >
            {set.name}
          </Link>
        </h3>
        <p className="mb-2 text-sm text-ink-2">{describeSet(set.document, set.seatedCount, checks)}</p>
        <SetCounts set={set} />
      </div>
      <dl className="w-36 shrink-0 self-center text-right text-sm max-tablet:flex max-tablet:w-auto max-tablet:items-baseline max-tablet:gap-4 max-tablet:self-start max-tablet:text-left">
        {plan.boundsMm.width > 0 && (
          <div>
            <dt className="text-xs text-ink-3 max-tablet:sr-only">Length</dt>
            <dd className="text-lg font-medium">
              <Length mm={plan.boundsMm.width} feet />
            </dd>
          </div>
        )}
        <div>
          <dt className="sr-only">State</dt>
          <dd>
            <span className="font-medium">Draft {set.draftNumber}</span>
            <span className="block text-xs text-ink-3">{issuedWords(set)}</span>
          </dd>
        </div>
      </dl>
      {workshop.canEdit && (
        <div className="relative z-10 self-center max-tablet:absolute max-tablet:top-4 max-tablet:right-0">
          <Menu
            name={`More for ${set.name}`}
            button={<MoreIcon />}
            buttonClassName="quick flex size-9 items-center justify-center rounded-sm hover:bg-sunk data-open:bg-chalk-wash"
            side="end"
            entries={[
              { id: 'fit', words: 'Fit sheet', to: `${home}/fit` },
              { id: 'revisions', words: 'Revisions', to: `${home}/revisions` },
              { id: 'rename', words: 'Rename', onPress: () => setAsking('rename') },
              {
                id: 'duplicate',
                words: 'Duplicate',
                onPress: () => go({ id: set.id, step: 'duplicate' }, `${set.name} duplicated.`),
              },
              archived
                ? {
                    id: 'restore',
                    words: 'Restore',
                    onPress: () => go({ id: set.id, step: 'restore' }, `${set.name} restored.`),
                  }
                : { id: 'archive', words: 'Archive', onPress: () => setAsking('archive') },
            ]}
          />
        </div>
      )}
      <FormDialog
        open={asking === 'rename'}
        onClose={() => setAsking(null)}
        title={`Rename ${set.name}`}
        verb="Rename"
        busy={step.isPending}
        problem={step.isError ? sayProblem(step.error) : null}
        onSubmit={(event) => {
          event.preventDefault();
          if (name.trim() !== '')
            go({ id: set.id, step: 'rename', name: name.trim() }, `Now called ${name.trim()}.`);
        }}
      >
        <TextField
          label="Name"
          value={name}
          maxLength={120}
          error={name.trim() === '' ? 'A set needs a name.' : undefined}
          onChange={(event) => setName(event.target.value)}
        />
      </FormDialog>
      <FormDialog
        open={asking === 'archive'}
        onClose={() => setAsking(null)}
        title={`Archive ${set.name}?`}
        describe="It leaves the list and can be restored at any time. Its revisions and orders stay as they are."
        verb="Archive"
        busy={step.isPending}
        onSubmit={(event) => {
          event.preventDefault();
          go({ id: set.id, step: 'archive' }, `${set.name} archived.`);
        }}
      >
        {null}
      </FormDialog>
    </li>
  );
}

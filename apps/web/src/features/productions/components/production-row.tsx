import { useState } from 'react';
import { Link } from 'react-router-dom';
import { toast } from 'sonner';
import { FormDialog } from '@/components/dialog.tsx';
import { MoreIcon } from '@/components/icons.tsx';
import { Menu } from '@/components/menu.tsx';
import type { Production } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { sayProblem } from '@/lib/problem.ts';
import { UNIT_WORDS } from '@/lib/unit-choice.ts';
import type { WorkshopAtHand } from '@/lib/workshop.ts';
import { type ProductionStep, useProductionStep } from '../api.ts';

const DONE: Record<ProductionStep, string> = {
  duplicate: 'duplicated',
  archive: 'archived',
  restore: 'restored',
};

export function ProductionRow({
  workshop,
  production,
}: {
  workshop: WorkshopAtHand;
  production: Production;
}) {
  const step = useProductionStep(workshop.id);
  const [archiving, setArchiving] = useState(false);
  const archived = production.status === 'archived';
  const go = (name: ProductionStep) =>
    step.mutate(
      { id: production.id, step: name },
      {
        onSuccess: () => {
          setArchiving(false);
          toast(`${production.name} ${DONE[name]}.`);
        },
        onError: (error) => toast(sayProblem(error)),
      },
    );
  return (
    <li className="relative flex items-center gap-6 border-b border-rule py-5 max-tablet:gap-3 max-tablet:py-4">
      <div className="min-w-0 flex-1">
        {production.summary && <p className="truncate text-sm text-ink-2">{production.summary}</p>}
        <h2 className="text-xl leading-8 font-light tracking-hero">
          <Link
            to={`/w/${workshop.id}/p/${production.id}`}
            className="underline decoration-transparent decoration-[1.5px] underline-offset-4 after:absolute after:inset-0 hover:decoration-chalk"
          >
            {production.name}
          </Link>
        </h2>
      </div>
      <dl className="flex gap-8 text-right text-sm max-tablet:hidden">
        <div>
          <dt className="text-xs text-ink-3">Units</dt>
          <dd>{UNIT_WORDS[production.units]}</dd>
        </div>
        <div className="w-32">
          <dt className="text-xs text-ink-3">Last changed</dt>
          <dd>{dayWords(production.updatedAt)}</dd>
        </div>
      </dl>
      {workshop.canEdit && (
        <div className="relative z-10">
          <Menu
            name={`More for ${production.name}`}
            button={<MoreIcon />}
            buttonClassName="quick flex size-10 items-center justify-center rounded-sm hover:bg-sunk data-open:bg-chalk-wash"
            side="end"
            entries={[
              { id: 'duplicate', words: 'Duplicate', onPress: () => go('duplicate') },
              archived
                ? { id: 'restore', words: 'Restore', onPress: () => go('restore') }
                : { id: 'archive', words: 'Archive', onPress: () => setArchiving(true) },
            ]}
          />
        </div>
      )}
      <FormDialog
        open={archiving}
        onClose={() => setArchiving(false)}
        title={`Archive ${production.name}?`}
        describe="It leaves this list and can be restored at any time. Sets, people and orders stay as they are."
        verb="Archive"
        busy={step.isPending}
        onSubmit={(event) => {
          event.preventDefault();
          go('archive');
        }}
      >
        {null}
      </FormDialog>
    </li>
  );
}

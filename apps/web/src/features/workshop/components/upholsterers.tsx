import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import type { Upholsterer } from '@/lib/contract.ts';
import { sayProblem } from '@/lib/problem.ts';
import type { WorkshopAtHand } from '@/lib/workshop.ts';
import { useUpholsterers } from '../api.ts';
import { UpholstererDialog } from './upholsterer-dialog.tsx';

export function Upholsterers({ workshop }: { workshop: WorkshopAtHand }) {
  const upholsterers = useUpholsterers(workshop.id);
  const [open, setOpen] = useState(false);
  const [entry, setEntry] = useState<Upholsterer | null>(null);
  const show = (chosen: Upholsterer | null) => {
    setEntry(chosen);
    setOpen(true);
  };
  const items = upholsterers.data?.items ?? [];
  return (
    <section>
      <RuleHeading
        aside={
          workshop.canEdit && (
            <Button look="word" onClick={() => show(null)}>
              Add an upholsterer
            </Button>
          )
        }
      >
        Upholsterers
      </RuleHeading>
      {upholsterers.isPending && <PaleBars words="Loading upholsterers" rows={2} />}
      {upholsterers.isError && <Notice tone="wont">{sayProblem(upholsterers.error)}</Notice>}
      {upholsterers.isSuccess && items.length === 0 && (
        <p className="py-3 text-ink-2">Nobody yet. Cushion orders are sent to somebody in this list.</p>
      )}
      <ul>
        {items.map((upholsterer) => (
          <li key={upholsterer.id} className="flex items-center gap-4 border-b border-rule py-2.5">
            <div className="min-w-0 flex-1">
              <div className="truncate font-medium">{upholsterer.name}</div>
              <div className="truncate text-sm text-ink-2">
                {[upholsterer.contactName, upholsterer.email, upholsterer.telephone]
                  .filter(Boolean)
                  .join(', ')}
              </div>
              {upholsterer.leadDays !== null && (
                <div className="truncate text-sm text-ink-2">Usually {upholsterer.leadDays} working days</div>
              )}
            </div>
            {workshop.canEdit && (
              <Button look="word" onClick={() => show(upholsterer)}>
                Edit <span className="sr-only">{upholsterer.name}</span>
              </Button>
            )}
          </li>
        ))}
      </ul>
      {open && <UpholstererDialog workshopId={workshop.id} entry={entry} onClose={() => setOpen(false)} />}
    </section>
  );
}

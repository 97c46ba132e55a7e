import { planOf, type SetDocument } from '@settlewright/geometry';
import { useMemo, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { commonScale } from '@/components/drawing-svg.tsx';
import { DashedBay, EmptyState } from '@/components/empty-state.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { ScaleBar } from '@/components/scale-bar.tsx';
import { sayProblem } from '@/lib/problem.ts';
import { useProduction } from '@/lib/production.ts';
import { sitterColours } from '@/lib/sitter-colours.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useSets } from '../api.ts';
import { SetRow } from './set-row.tsx';

const ROOM_PX = { width: 260, height: 132 };

export type ColourOf = (castId: string) => number | undefined;

function planWithSitters(document: SetDocument, colourOf: ColourOf) {
  const colours = sitterColours(document.seating, colourOf);
  return planOf(document, { sitters: [...colours].map(([placeId, colour]) => ({ placeId, colour })) });
}

interface SetsProps {
  /** The colour a person is drawn in. */
  colourOf: ColourOf;
  onAdd: () => void;
}

/** The sets of a production with their plans, all at one scale. */
export function Sets({ colourOf, onAdd }: SetsProps) {
  const workshop = useWorkshop();
  const production = useProduction();
  const [status, setStatus] = useState<'active' | 'archived'>('active');
  const sets = useSets(workshop.id, production.id, status);
  const items = sets.data?.items;
  const plans = useMemo(
    () => (items ?? []).map((set) => ({ set, plan: planWithSitters(set.document, colourOf) })),
    [items, colourOf],
  );
  const pxPerMm = commonScale(
    plans.map(({ plan }) => plan),
    ROOM_PX,
  );
  return (
    <section aria-labelledby="sets">
      <RuleHeading
        id="sets"
        aside={
          <span className="flex items-center gap-3 text-sm text-ink-2">
            {plans.length > 0 && (
              <span className="flex items-center gap-3 max-tablet:hidden">
                plans at one scale <ScaleBar pxPerMm={pxPerMm} />
              </span>
            )}
            <Button look="word" onClick={() => setStatus(status === 'active' ? 'archived' : 'active')}>
              {status === 'active' ? 'Archived sets' : 'Sets at work'}
            </Button>
          </span>
        }
      >
        {status === 'active' ? 'Sets' : 'Archived sets'}
      </RuleHeading>
      {sets.isPending && <PaleBars words="Loading sets" rows={3} />}
      {sets.isError && (
        <Notice tone="wont" title="The sets could not be fetched">
          {sayProblem(sets.error)}
        </Notice>
      )}
      {sets.isSuccess && plans.length === 0 && status === 'archived' && (
        <p className="py-4 text-ink-2">Nothing archived.</p>
      )}
      {sets.isSuccess && plans.length === 0 && status === 'active' && (
        <EmptyState
          title="No sets yet"
          drawing={<DashedBay />}
          actions={
            workshop.canEdit && (
              <Button look="main" onClick={onAdd}>
                Add a set
              </Button>
            )
          }
        >
          {workshop.canEdit
            ? 'Begin with an arrangement and change its sizes, or with an empty floor.'
            : 'The owner or a designer adds one; its plan will stand here.'}
        </EmptyState>
      )}
      <ul>
        {plans.map(({ set, plan }) => (
          <SetRow key={set.id} set={set} plan={plan} pxPerMm={pxPerMm} />
        ))}
      </ul>
    </section>
  );
}

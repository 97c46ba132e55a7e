import { useCallback } from 'react';
import { useCast } from '@/features/cast/api.ts';
import { NewOrderButton } from '@/features/cushion-orders/index.ts';
import { PeopleSummary } from '@/features/cast/components/people-summary.tsx';
import { ProductionPage } from '@/features/productions/components/production-page.tsx';
import type { ColourOf } from '@/features/productions/components/sets.tsx';
import { useProduction } from '@/lib/production.ts';
import { useWorkshop } from '@/lib/workshop.ts';

/** Sets, people and orders come from features that do not know each other; here they meet. */
export function Component() {
  const workshop = useWorkshop();
  const production = useProduction();
  const cast = useCast({ workshopId: workshop.id, productionId: production.id });
  const people = cast.data?.items;
  const colourOf = useCallback<ColourOf>(
    (castId) => people?.find((candidate) => candidate.id === castId)?.colour,
    [people],
  );
  return (
    <ProductionPage
      colourOf={colourOf}
      people={<PeopleSummary />}
      orderAction={
        workshop.canEdit ? (
          <NewOrderButton workshopId={workshop.id} productionId={production.id} />
        ) : undefined
      }
    />
  );
}

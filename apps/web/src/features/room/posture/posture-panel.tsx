import { lazy, Suspense } from 'react';
import { Button } from '@/components/button.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { useSurroundings } from '../room-context.tsx';
import { openSitting, useChosenPlace } from './chosen-place.ts';

const Sitting = lazy(() => import('./sitting.tsx'));

/** How everybody sits and what room is round them; for those who may see bodies as they are. */
export function PosturePanel() {
  const { detail } = useSurroundings();
  const open = useChosenPlace((state) => state.open);
  if (detail !== 'full') return null;
  return (
    <section aria-labelledby="sitting-heading">
      <RuleHeading
        id="sitting-heading"
        aside={
          <Button look="word" aria-expanded={open} onClick={() => openSitting(!open)}>
            {open ? 'Close sitting' : 'Show sitting'}
          </Button>
        }
      >
        How they sit
      </RuleHeading>
      {open && (
        <Suspense fallback={<LoadingLine words="Looking at who sits here" />}>
          <Sitting />
        </Suspense>
      )}
    </section>
  );
}

import { lazy, Suspense, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { useSurroundings } from '../room-context.tsx';
import { useRoom } from '../store.ts';
import { useLaidTapes } from './tape-store.ts';

const Measures = lazy(() => import('./measures.tsx'));

/** Measuring by name, and every tape and pinned line in words. */
export function MeasurePanel() {
  const { path } = useSurroundings();
  const [open, setOpen] = useState(false);
  const count = useLaidTapes(path.setId).length + useRoom((state) => state.document.dimensions?.length ?? 0);
  return (
    <section aria-labelledby="measure-heading">
      <RuleHeading
        id="measure-heading"
        aside={
          <Button look="word" aria-expanded={open} onClick={() => setOpen(!open)}>
            {open ? 'Close measuring' : count > 0 ? `Show ${count} measured` : 'Measure by name'}
          </Button>
        }
      >
        Measure
      </RuleHeading>
      {open && (
        <Suspense fallback={null}>
          <Measures />
        </Suspense>
      )}
    </section>
  );
}

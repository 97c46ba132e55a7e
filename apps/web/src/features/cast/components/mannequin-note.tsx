import { lazy, Suspense } from 'react';
import { Disclosure } from '@/components/disclosure.tsx';
import { LoadingLine } from '@/components/loading.tsx';

const MannequinTable = lazy(() => import('./mannequin-table.tsx'));

/** What a percentile mannequin is, and what it is not. */
export function MannequinNote() {
  return (
    <section className="ruled pt-2">
      <h2 className="font-semibold">Nobody cast yet? Seat a mannequin</h2>
      <p className="mt-1 max-w-text text-sm text-ink-2">
        In the room a place can be given to a mannequin, say “woman, 5th in stature”: of a hundred surveyed
        women five are shorter. It has that height, and of everything else what is usual at that height. It is
        exact, so it shows no range; nobody living is like that in every measure. The fit sheet reads the
        public apart, each check at the end that it protects.
      </p>
      <Disclosure words="How tall they are">
        <Suspense fallback={<LoadingLine words="Fetching the survey" />}>
          <MannequinTable />
        </Suspense>
      </Disclosure>
    </section>
  );
}

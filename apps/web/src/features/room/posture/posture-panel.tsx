import { lazy, Suspense } from 'react';
import { LoadingLine } from '@/components/loading.tsx';
import { DisclosedSection } from '../components/disclosed-section.tsx';
import { useSurroundings } from '../room-context.tsx';
import { openSitting, useChosenPlace } from './chosen-place.ts';

const Sitting = lazy(() => import('./sitting.tsx'));

/** How everybody sits and what room is round them; for those who may see bodies as they are. */
export function PosturePanel() {
  const { detail } = useSurroundings();
  const open = useChosenPlace((state) => state.open);
  if (detail !== 'full') return null;
  return (
    <DisclosedSection
      id="sitting-heading"
      title="How they sit"
      open={open}
      onToggle={() => openSitting(!open)}
      words={{ closed: 'Show sitting', open: 'Close sitting' }}
    >
      <Suspense fallback={<LoadingLine words="Looking at who sits here" />}>
        <Sitting />
      </Suspense>
    </DisclosedSection>
  );
}

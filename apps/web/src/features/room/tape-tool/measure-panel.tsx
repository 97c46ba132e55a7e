import { lazy, Suspense, useState } from 'react';
import { DisclosedSection } from '../components/disclosed-section.tsx';
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
    <DisclosedSection
      id="measure-heading"
      title="Measure"
      open={open}
      onToggle={() => setOpen(!open)}
      words={{ closed: count > 0 ? `Show ${count} measured` : 'Measure by name', open: 'Close measuring' }}
    >
      <Suspense fallback={null}>
        <Measures />
      </Suspense>
    </DisclosedSection>
  );
}

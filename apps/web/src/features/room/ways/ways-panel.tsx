import { lazy, Suspense, useState } from 'react';
import { LoadingLine } from '@/components/loading.tsx';
import { DisclosedSection } from '../components/disclosed-section.tsx';
import { useRoom } from '../store.ts';

const Ways = lazy(() => import('./ways.tsx'));

/** How everybody gets to their place; looked for when it is opened. */
export function WaysPanel() {
  // What was taken: while something is dragged or typed nobody is sent anywhere.
  const document = useRoom((state) => state.document);
  const [open, setOpen] = useState(false);
  return (
    <DisclosedSection
      id="ways-heading"
      title="Ways in"
      open={open}
      onToggle={() => setOpen(!open)}
      words={{ closed: 'Show ways in', open: 'Close ways in' }}
    >
      <Suspense fallback={<LoadingLine words="Looking at the ways in" />}>
        <Ways document={document} />
      </Suspense>
    </DisclosedSection>
  );
}

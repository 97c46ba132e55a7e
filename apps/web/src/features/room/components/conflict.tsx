import { lazy, Suspense } from 'react';
import { LoadingLine } from '@/components/loading.tsx';
import type { DraftConflict } from '../save/autosave.ts';

const ConflictScreen = lazy(async () => ({
  default: (await import('./conflict-screen.tsx')).ConflictScreen,
}));

/** The screen of two versions, in place of the set. */
export function Conflict({ conflict }: { conflict: DraftConflict }) {
  return (
    <Suspense fallback={<LoadingLine words="Comparing both versions" />}>
      <ConflictScreen conflict={conflict} />
    </Suspense>
  );
}

import { QueryClientProvider } from '@tanstack/react-query';
import { useEffect } from 'react';
import { RouterProvider } from 'react-router-dom';
import { mayHaveSession, markSignedOut, useSession } from '@/lib/session.ts';
import { refreshSession } from '@/lib/api-client.ts';
import { queryClient } from '@/lib/query-client.ts';
import { LiveRegion } from './live-region.tsx';
import { router } from './router.tsx';

/** Asks once, at the start, whether this browser still has a session. */
function useRestoredSession(): void {
  useEffect(() => {
    if (useSession.getState().status !== 'unknown') return;
    if (!mayHaveSession()) {
      markSignedOut();
      return;
    }
    refreshSession().then(
      (restored) => {
        if (!restored) markSignedOut();
      },
      () => markSignedOut(),
    );
  }, []);
}

/** What one person saw must not greet the next one on this computer. */
function useCacheOfOnePerson(): void {
  useEffect(
    () =>
      useSession.subscribe((now, before) => {
        if (before.user !== null && now.user?.id !== before.user.id) queryClient.clear();
      }),
    [],
  );
}

export function App() {
  useRestoredSession();
  useCacheOfOnePerson();
  return (
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
      <LiveRegion />
    </QueryClientProvider>
  );
}

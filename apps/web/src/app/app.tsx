import { QueryClientProvider } from '@tanstack/react-query';
import { useEffect } from 'react';
import { RouterProvider } from 'react-router-dom';
import { Toaster } from 'sonner';
import { mayHaveSession, markSignedOut, useSession } from '@/lib/session.ts';
import { refreshSession } from '@/lib/api-client.ts';
import { queryClient } from '@/lib/query-client.ts';
import { useTheme } from '@/lib/theme.ts';
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
  const theme = useTheme((state) => state.choice);
  return (
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
      <LiveRegion />
      <Toaster
        theme={theme}
        position="bottom-center"
        toastOptions={{
          unstyled: true,
          classNames: {
            toast: 'flex w-full items-start gap-3 rounded-md bg-ink px-4 py-3 text-sm text-paper shadow-slip',
            actionButton: 'ml-auto shrink-0 font-semibold underline underline-offset-4',
          },
        }}
      />
    </QueryClientProvider>
  );
}

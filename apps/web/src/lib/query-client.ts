import { QueryClient } from '@tanstack/react-query';
import { Problem } from './problem.ts';

/** What the server refused stays refused; only a missing answer is worth asking for again. */
function mayRetry(failures: number, error: unknown): boolean {
  return !(error instanceof Problem) && failures < 2;
}

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { staleTime: 30_000, retry: mayRetry, networkMode: 'always', refetchOnWindowFocus: true },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
}

export const queryClient = createQueryClient();

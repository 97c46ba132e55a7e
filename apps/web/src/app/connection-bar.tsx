import { useEffect } from 'react';
import { api } from '@/lib/api-client.ts';
import { useConnection } from '@/lib/connection.ts';

/** A brick rule under the title block while the server does not answer; it asks again by itself. */
export function ConnectionBar() {
  const reachable = useConnection((state) => state.reachable);
  useEffect(() => {
    if (reachable) return;
    const ask = () => {
      // The client notes whether there was an answer; what it said is of no interest here.
      api.get('/health/live', { anonymous: true }).catch(() => undefined);
    };
    const timer = setInterval(ask, 5_000);
    window.addEventListener('online', ask);
    return () => {
      clearInterval(timer);
      window.removeEventListener('online', ask);
    };
  }, [reachable]);
  if (reachable) return null;
  return (
    <div role="status" className="border-b border-rule bg-sheet">
      <div className="mx-auto max-w-page border-l-4 border-wont px-4 py-2.5 tablet:mx-8">
        <span className="font-medium">The server can’t be reached.</span>{' '}
        <span className="text-ink-2">
          What you change is kept on this computer and sent when the line is back. Go on working.
        </span>
      </div>
    </div>
  );
}

import { useEffect } from 'react';

/** Names the page in the tab and in the history; the place in the app comes last. */
export function usePageTitle(title: string | undefined): void {
  useEffect(() => {
    document.title = title === undefined || title === '' ? 'Settlewright' : `${title} · Settlewright`;
  }, [title]);
}

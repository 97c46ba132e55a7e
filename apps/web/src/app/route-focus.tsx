import { useEffect, useRef } from 'react';
import { useLocation } from 'react-router-dom';

/**
 * After a change of page the focus goes to its heading, so that a keyboard or a screen reader starts there.
 * A change of search words alone (a selected piece, a view) is no change of page.
 */
export function RouteFocus() {
  const { pathname } = useLocation();
  const last = useRef<string | null>(null);
  useEffect(() => {
    const first = last.current === null;
    const changed = last.current !== pathname;
    last.current = pathname;
    if (first || !changed) return;
    let tries = 0;
    let frame = 0;
    const settle = () => {
      const heading = document.querySelector<HTMLElement>('[data-page-heading]');
      const busy =
        document.activeElement !== document.body && document.activeElement?.closest('main') !== null;
      if (heading !== null && !busy) heading.focus({ preventScroll: true });
      else if (heading === null && tries < 120) {
        tries += 1;
        frame = requestAnimationFrame(settle);
      }
    };
    frame = requestAnimationFrame(settle);
    return () => cancelAnimationFrame(frame);
  }, [pathname]);
  return null;
}

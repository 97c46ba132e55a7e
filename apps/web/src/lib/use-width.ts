import { useCallback, useState } from 'react';

/** Width of an element in whole pixels, followed as the page changes; `undefined` until it stands. */
export function useWidth(): [(element: HTMLElement | null) => (() => void) | undefined, number | undefined] {
  const [width, setWidth] = useState<number>();
  const measure = useCallback((element: HTMLElement | null) => {
    if (element === null) return undefined;
    const note = () => setWidth(Math.floor(element.clientWidth) || undefined);
    note();
    const observer = new ResizeObserver(note);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [measure, width];
}

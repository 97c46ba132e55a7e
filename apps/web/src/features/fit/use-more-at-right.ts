import { useCallback, useState } from 'react';

/** Where a box that scrolls sideways hides something behind its right edge. */
interface MoreAtRight {
  more: boolean;
  /** Room that its upright and its level scrollbar take. */
  uprightBarPx: number;
  levelBarPx: number;
}

/** Whether there is more at the right of a box, followed as it is scrolled or changes its size. */
export function useMoreAtRight(): [(element: HTMLElement | null) => (() => void) | undefined, MoreAtRight] {
  const [more, setMore] = useState(false);
  const [uprightBarPx, setUprightBarPx] = useState(0);
  const [levelBarPx, setLevelBarPx] = useState(0);
  const follow = useCallback((element: HTMLElement | null) => {
    if (element === null) return undefined;
    const note = () => {
      setMore(element.scrollLeft + element.clientWidth < element.scrollWidth - 1);
      // What scrolls sideways shows through a gutter that holds no scrollbar.
      const holdsBar = element.scrollHeight > element.clientHeight;
      setUprightBarPx(holdsBar ? element.offsetWidth - element.clientWidth : 0);
      setLevelBarPx(element.offsetHeight - element.clientHeight);
    };
    note();
    const observer = new ResizeObserver(note);
    observer.observe(element);
    // The table grows with its columns while the box keeps its size.
    if (element.firstElementChild) observer.observe(element.firstElementChild);
    element.addEventListener('scroll', note, { passive: true });
    return () => {
      observer.disconnect();
      element.removeEventListener('scroll', note);
    };
  }, []);
  return [follow, { more, uprightBarPx, levelBarPx }];
}

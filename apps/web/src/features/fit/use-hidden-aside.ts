import { useCallback, useRef, useState } from 'react';

interface Hidden {
  before: number;
  after: number;
}

const NOTHING: Hidden = { before: 0, after: 0 };
/** Rounding of a browser at odd zooms, pixels. */
const SLACK_PX = 2;

/** How many children of a row stand, at least in part, beyond its left and right edges. */
export function hiddenIn(
  row: { left: number; right: number },
  items: readonly { left: number; right: number }[],
): Hidden {
  return {
    before: items.filter(({ left }) => left < row.left - SLACK_PX).length,
    after: items.filter(({ right }) => right > row.right + SLACK_PX).length,
  };
}

/** Follows what a row that scrolls sideways hides; `go` brings the next hidden ones into view. */
export function useHiddenAside() {
  const row = useRef<HTMLElement>(null);
  const [hidden, setHidden] = useState(NOTHING);
  const follow = useCallback((element: HTMLElement | null) => {
    row.current = element;
    if (element === null) return undefined;
    const note = () => {
      const edges = element.getBoundingClientRect();
      const items = [...element.children].map((child) => child.getBoundingClientRect());
      const next = hiddenIn(edges, items);
      // What is counted as hidden shows no half of its words either.
      [...element.children].forEach((child, n) =>
        child.toggleAttribute('data-aside', n < next.before || n >= items.length - next.after),
      );
      setHidden((now) => (now.before === next.before && now.after === next.after ? now : next));
    };
    note();
    const sizes = new ResizeObserver(note);
    sizes.observe(element);
    for (const child of element.children) sizes.observe(child);
    // People come and go while the row keeps its size.
    const people = new MutationObserver(() => {
      for (const child of element.children) sizes.observe(child);
      note();
    });
    people.observe(element, { childList: true });
    element.addEventListener('scroll', note, { passive: true });
    return () => {
      sizes.disconnect();
      people.disconnect();
      element.removeEventListener('scroll', note);
    };
  }, []);
  const go = (direction: 1 | -1) => {
    const element = row.current;
    element?.scrollBy({ left: direction * element.clientWidth * 0.8 });
  };
  return { follow, ...hidden, go };
}

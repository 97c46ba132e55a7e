import { useEffect, useLayoutEffect, useRef, useState, type RefObject } from 'react';
import type { TitleCell } from '@/lib/title-cells.ts';
import { cellsInMenu } from './title-fit.ts';

/** As wide as `CELL` lets a cell grow. */
const MOST_PX = 288;
/** The mark on the button of the menu that takes what has no room. */
const MENU_MARK_PX = 20;
/** Names keep some fifteen, nine or six letters. */
const leastPx = (headerPx: number): number => (headerPx < 480 ? 76 : headerPx < 1200 ? 112 : 152);

const NONE: readonly string[] = [];
const saysOf = ({ id, label, value }: TitleCell): string => `${id} ${label} ${value}`;

/** Width of the words of a cell, whether all of them are seen or not; 0 where they are hidden. */
const wordsPx = (cell: Element): number =>
  [...cell.querySelectorAll('[data-words]')].reduce(
    (most, { scrollWidth }) => Math.max(most, scrollWidth),
    0,
  );

/** Which cells of the title block stand in its menu, found before the page is painted. */
export function useTitleFit(cells: readonly TitleCell[]): {
  header: RefObject<HTMLElement | null>;
  moved: readonly string[];
} {
  const header = useRef<HTMLElement>(null);
  const known = useRef(new Map<string, number>());
  const [moved, setMoved] = useState(NONE);
  const [width, setWidth] = useState(0);

  useLayoutEffect(() => {
    const element = header.current;
    if (!element) return undefined;
    const observer = new ResizeObserver(() => setWidth(element.clientWidth));
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  useEffect(() => {
    void document.fonts?.ready.then(() => {
      // The first words may have been measured in the fallback font.
      known.current.clear();
      setMoved([]);
    });
  }, []);

  useLayoutEffect(() => {
    const element = header.current;
    if (!element || element.clientWidth === 0) return;
    const style = getComputedStyle(element);
    // Both paddings, the rule at the left, and a pixel for what was rounded off.
    const padPx = 2 * parseFloat(style.getPropertyValue('--cell-pad')) * 16 + 2;
    const namePx = leastPx(element.clientWidth);
    const naturalPx = (words: number) => Math.min(MOST_PX, words + padPx);
    const standing = [...element.querySelectorAll<HTMLElement>('[data-cell]')];
    for (const cell of cells) {
      const box = standing.find(({ dataset }) => dataset.cell === cell.id);
      if (box) known.current.set(saysOf(cell), wordsPx(box));
    }
    const fitted = cells.map((cell) => {
      const natural = naturalPx(known.current.get(saysOf(cell)) ?? 0);
      return { ...cell, natural, leastPx: cell.shortens ? Math.min(natural, namePx) : natural };
    });
    for (const box of standing) {
      const cell = fitted.find(({ id }) => id === box.dataset.cell);
      if (!cell) continue;
      box.style.minWidth = `${cell.leastPx}px`;
      // A long name gives more of itself, so that a short one stays whole.
      box.style.flexShrink = String(Math.max(1, (cell.natural - cell.leastPx) ** 2 / cell.natural));
    }
    const fixedPx = [...element.querySelectorAll<HTMLElement>('[data-fixed]')].map((box) => {
      const words = wordsPx(box);
      if (words === 0) {
        box.style.minWidth = '';
        return box.offsetWidth;
      }
      const least = Math.min(naturalPx(words), namePx);
      box.style.minWidth = `${least}px`;
      return least;
    });
    const roomPx =
      element.clientWidth -
      parseFloat(style.paddingLeft) -
      parseFloat(style.paddingRight) -
      fixedPx.reduce((sum, px) => sum + px, 0);
    // A cell whose words changed inside the menu is shown once to be measured.
    const strange = cells.some((cell) => !known.current.has(saysOf(cell)));
    const next = strange ? NONE : cellsInMenu(fitted, roomPx, MENU_MARK_PX + padPx);
    if (next.join() !== moved.join()) setMoved(next);
  }, [cells, moved, width]);

  return { header, moved };
}

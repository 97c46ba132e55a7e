import type { ReactNode } from 'react';
import { OpenIcon } from '@/components/icons.tsx';
import { useHiddenAside } from '../use-hidden-aside.ts';

/** A row that scrolls sideways, with a button at each end that hides something and says how many. */
export function SittersRow({ children }: { children: ReactNode }) {
  const { follow, before, after, go } = useHiddenAside();
  return (
    <div className="flex min-w-0 flex-1 items-center max-tablet:hidden">
      <Further side="left" count={before} onPress={() => go(-1)} />
      <ul
        ref={follow}
        className="flex min-w-0 flex-1 scroll-px-1 gap-x-4 overflow-x-auto motion-safe:scroll-smooth [scrollbar-width:none]"
      >
        {children}
      </ul>
      <Further side="right" count={after} onPress={() => go(1)} />
    </div>
  );
}

interface FurtherProps {
  side: 'left' | 'right';
  /** Sitters that are not, or not wholly, in view on this side. */
  count: number;
  onPress: () => void;
}

function Further({ side, count, onPress }: FurtherProps) {
  if (count === 0) return null;
  return (
    <button
      type="button"
      // The sitters themselves are reached with Tab and come into view.
      tabIndex={-1}
      onClick={onPress}
      aria-label={`${count} more to the ${side}`}
      className={`quick flex min-h-11 shrink-0 items-center gap-1 border-rule-strong px-2.5 text-sm font-medium hover:bg-sunk ${
        side === 'left' ? 'mr-2 border-r' : 'ml-2 flex-row-reverse border-l'
      }`}
    >
      <span className={side === 'left' ? 'rotate-90' : '-rotate-90'}>
        <OpenIcon />
      </span>
      {count} more
    </button>
  );
}

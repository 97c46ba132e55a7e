import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { FitGrid } from './fit-grid.tsx';
import { FitCaution } from './fit-key.tsx';
import { FitPeople } from './fit-people.tsx';
import { FitStrip } from './fit-strip.tsx';

interface FitFootProps {
  isOpen: boolean;
  onToggle: () => void;
  shortcut?: string;
  /** The selected piece in one line, so that its numbers can be changed with the sheet in view. */
  line?: ReactNode;
  /** Address of the sheet as a page of its own. */
  pageTo: string;
}

/** The strip at the foot of the room, and the drawer that opens above the lower part of it. */
export function FitFoot({ isOpen, onToggle, shortcut, line, pageTo }: FitFootProps) {
  return (
    <div className="sticky bottom-0 z-20 shrink-0">
      <FitStrip isOpen={isOpen} onToggle={onToggle} shortcut={shortcut} />
      {isOpen && (
        <section
          id="fit-drawer"
          aria-label="Fit sheet"
          className="h-[356px] overflow-auto bg-sheet px-8 pb-4 max-tablet:h-auto max-tablet:max-h-[70dvh] max-tablet:px-4"
        >
          <div className="flex flex-wrap items-baseline gap-x-6 py-2 text-sm text-ink-2">
            <div className="min-w-0 flex-1">{line}</div>
            <p>+ room left, − short, est. 90 in 100</p>
            <Link className="link text-ink" to={pageTo}>
              Open as a page
            </Link>
          </div>
          <div className="bg-sheet max-tablet:hidden">
            <FitGrid />
          </div>
          <div className="tablet:hidden">
            <FitPeople />
          </div>
          <div className="pt-3">
            <FitCaution />
          </div>
        </section>
      )}
    </div>
  );
}

import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { classNames } from '@/components/class-names.ts';
import { OpenIcon } from '@/components/icons.tsx';
import { FitGrid } from './fit-grid.tsx';
import { FitCaution, FitConfidence } from './fit-key.tsx';
import { FitPeople } from './fit-people.tsx';
import { FitStrip } from './fit-strip.tsx';
import { MeasureNextLine } from './measure-next.tsx';

interface FitFootProps {
  isOpen: boolean;
  onToggle: () => void;
  /** The single key that does the same; undefined when single keys are switched off. */
  shortcut?: string;
  /** The selected piece in one line, so that its numbers can be changed with the sheet in view. */
  line?: ReactNode;
  /** Address of the sheet as a page of its own. */
  pageTo: string;
}

/** The strip at the foot of the room, and the drawer that opens over the lower part of it. */
export function FitFoot({ isOpen, onToggle, shortcut, line, pageTo }: FitFootProps) {
  return (
    <div className="sticky bottom-0 z-20 min-w-0 shrink-0 border-t border-ink bg-sheet shadow-drawer">
      <div
        className={classNames(
          'mx-auto flex max-w-[90rem] items-center gap-x-6 px-8 max-tablet:gap-x-4 max-tablet:px-4',
          isOpen ? 'min-h-14 max-tablet:flex-wrap' : 'min-h-[68px]',
        )}
      >
        <button
          type="button"
          aria-expanded={isOpen}
          aria-controls={isOpen ? 'fit-drawer' : undefined}
          className="flex min-h-11 items-center gap-2 font-semibold whitespace-nowrap"
          onClick={onToggle}
        >
          <span className={classNames('settle transition-transform', !isOpen && 'rotate-180')}>
            <OpenIcon />
          </span>
          Fit sheet
          {shortcut !== undefined && (
            <kbd className="border border-rule-strong px-1.5 text-xs font-normal max-tablet:hidden">
              {shortcut}
            </kbd>
          )}
        </button>
        {isOpen ? (
          <>
            <div className="min-w-0 flex-1 max-tablet:hidden">{line}</div>
            <p className="text-xs text-ink-2 max-desk:hidden">+ room left, − short, est. 90 in 100</p>
            <Link className="link reach text-sm whitespace-nowrap max-tablet:ml-auto" to={pageTo}>
              Open as a page
            </Link>
          </>
        ) : (
          <FitStrip onOpen={onToggle} />
        )}
      </div>
      {isOpen && (
        <section
          id="fit-drawer"
          aria-label="Fit sheet"
          className="mx-auto flex h-[330px] max-h-[50dvh] max-w-[90rem] flex-col px-8 max-tablet:h-auto max-tablet:max-h-[70dvh] max-tablet:overflow-y-auto max-tablet:px-4 max-tablet:pb-4"
        >
          <FitGrid ground="sheet" className="min-h-0 flex-1 max-tablet:hidden" />
          <div className="tablet:hidden">
            <FitPeople />
          </div>
          <div className="shrink-0 py-1.5">
            <MeasureNextLine />
            <FitConfidence small />
            <div className="max-desk:hidden">
              <FitCaution small />
            </div>
          </div>
        </section>
      )}
    </div>
  );
}

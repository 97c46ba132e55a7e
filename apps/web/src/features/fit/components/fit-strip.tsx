import type { SitterRow } from '@settlewright/anthropometry';
import { OpenIcon } from '@/components/icons.tsx';
import { classNames } from '@/components/class-names.ts';
import { SitterDot } from '@/components/sitter-dot.tsx';
import { Verdict, VerdictCounts } from '@/components/verdict.tsx';
import { checkName } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';

function WorstOf({ row }: { row: SitterRow }) {
  const { ruleBook } = useFitView();
  const judged = row.cells.filter(({ outcome }) => outcome.kind === 'verdict');
  const causes = judged.filter(({ outcome }) => outcome.kind === 'verdict' && outcome.verdict === row.worst);
  const estimated = causes.every(({ outcome }) => outcome.kind === 'verdict' && outcome.estimated);
  const [cause] = causes;
  const more =
    row.worst === 'fits'
      ? `, all ${judged.length} checks`
      : causes.length === 1 && cause !== undefined
        ? `, ${checkName(ruleBook, cause).toLowerCase()}`
        : `, ${causes.length} checks`;
  return (
    <Verdict
      verdict={row.worst}
      estimated={estimated && row.worst !== 'notKnown'}
      more={more}
      className="text-sm"
    />
  );
}

interface FitStripProps {
  isOpen: boolean;
  onToggle: () => void;
  /** The single key that does the same; undefined when single keys are switched off. */
  shortcut?: string;
}

/** Always at the foot of the room: each sitter with the worst verdict and the check that causes it. */
export function FitStrip({ isOpen, onToggle, shortcut }: FitStripProps) {
  const { sheet, colourOf, open } = useFitView();
  return (
    <div className="flex min-h-[68px] items-center gap-8 border-t border-ink bg-sheet px-8 py-2 shadow-drawer max-tablet:gap-4 max-tablet:px-4">
      <button
        type="button"
        aria-expanded={isOpen}
        aria-controls="fit-drawer"
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
      {sheet.rows.length === 0 ? (
        <p className="text-ink-2">Nobody is seated yet. Choose a bench and say who sits at each place.</p>
      ) : (
        <>
          <ul className="flex min-w-0 flex-1 gap-x-8 overflow-x-auto max-tablet:hidden">
            {sheet.rows.map((row) => (
              <li key={`${row.sitterId}|${row.placeId}`}>
                <button
                  type="button"
                  className="quick grid min-h-11 content-center px-1 text-left whitespace-nowrap hover:bg-sunk"
                  onClick={() => {
                    const cause = row.cells.find(
                      ({ outcome }) => outcome.kind === 'verdict' && outcome.verdict === row.worst,
                    );
                    if (!isOpen) onToggle();
                    open(cause?.id ?? null);
                  }}
                >
                  <span className="inline-flex items-center gap-2">
                    <SitterDot colour={colourOf(row.sitterId)} /> {row.name.split(' ')[0]?.replace(/,$/, '')}
                  </span>
                  <WorstOf row={row} />
                </button>
              </li>
            ))}
          </ul>
          <VerdictCounts counts={sheet.counts} className="text-sm tablet:hidden" />
        </>
      )}
    </div>
  );
}

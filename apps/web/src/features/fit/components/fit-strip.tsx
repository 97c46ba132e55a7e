import type { SitterRow } from '@settlewright/anthropometry';
import { SitterDot } from '@/components/sitter-dot.tsx';
import { Verdict, VerdictCounts } from '@/components/verdict.tsx';
import { checkName } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';
import { SittersRow } from './sitters-row.tsx';
import { CountedApart } from './counted-apart.tsx';
import { shortName } from '@/lib/short-name.ts';

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
      estimated={causes.length > 0 && estimated && row.worst !== 'notKnown'}
      more={more}
      className="text-sm"
    />
  );
}

/** Each sitter with the worst verdict and the check that causes it; counts alone on a phone. */
export function FitStrip({ onOpen }: { onOpen: () => void }) {
  const { sheet, colourOf, open } = useFitView();
  if (sheet.rows.length === 0) {
    return <p className="text-ink-2">Nobody is seated yet. Choose a bench and say who sits at each place.</p>;
  }
  return (
    <>
      <SittersRow>
        {sheet.rows.map((row) => (
          <li key={`${row.sitterId}|${row.placeId}`} className="shrink-0 data-aside:opacity-0">
            <button
              type="button"
              className="quick grid min-h-12 content-center px-1.5 text-left whitespace-nowrap hover:bg-sunk focus-visible:-outline-offset-2"
              onClick={() => {
                const cause = row.cells.find(
                  ({ outcome }) => outcome.kind === 'verdict' && outcome.verdict === row.worst,
                );
                onOpen();
                open(cause?.id ?? null);
              }}
            >
              <span className="inline-flex items-center gap-2">
                <SitterDot colour={colourOf(row.sitterId)} /> {shortName(row.name)}
              </span>
              <WorstOf row={row} />
            </button>
          </li>
        ))}
      </SittersRow>
      <div className="min-w-0 text-sm max-tablet:py-1.5">
        <VerdictCounts counts={sheet.counts} className="tablet:hidden" />
        <CountedApart className="text-xs text-ink-2 tablet:max-w-56 tablet:max-desk:hidden" />
      </div>
    </>
  );
}

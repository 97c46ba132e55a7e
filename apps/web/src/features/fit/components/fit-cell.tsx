import type { FitCell, VerdictOutcome } from '@settlewright/anthropometry';
import { Measure } from '@/components/measure.tsx';
import { VerdictCell } from '@/components/verdict.tsx';
import { marginText } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';

/** Signed margin with half its range in quiet ink. */
export function Margin({ outcome, ruleId }: { outcome: VerdictOutcome; ruleId: string }) {
  const { ruleBook, style } = useFitView();
  const { margin, range } = marginText(outcome, ruleBook.rule(ruleId).unit, style);
  return (
    <span className="whitespace-nowrap">
      <Measure text={margin} />
      {range !== undefined && (
        <span className="ml-1 text-xs font-normal text-ink-2">
          <Measure text={range} />
        </span>
      )}
    </span>
  );
}

/** What stands in one cell of the sheet. */
export function CellContent({ cell, readAs }: { cell: FitCell; readAs?: string }) {
  const { outcome } = cell;
  if (outcome.kind === 'verdict') {
    return (
      <span className="grid justify-items-start">
        <VerdictCell
          verdict={outcome.verdict}
          estimated={outcome.estimated}
          margin={<Margin outcome={outcome} ruleId={cell.ruleId} />}
        />
        {readAs !== undefined && (
          <span className="ml-[34px] text-xs whitespace-nowrap text-ink-2">{readAs}</span>
        )}
      </span>
    );
  }
  if (outcome.kind === 'clause') {
    return (
      <span className={outcome.inside ? 'text-fits' : 'text-wont'}>
        {outcome.inside ? 'inside' : 'outside'} clause {outcome.clause}
      </span>
    );
  }
  return (
    <span className="text-sm text-ink-3">
      {outcome.kind === 'information' ? outcome.words : outcome.reason}
    </span>
  );
}

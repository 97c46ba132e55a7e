import { SOURCE_MARK_WORDS, whyFor, type FitCell, type VerdictOutcome } from '@settlewright/anthropometry';
import { Measure } from '@/components/measure.tsx';
import { Verdict } from '@/components/verdict.tsx';
import { amountText, measureWords } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';
import { Margin } from './fit-cell.tsx';
import { FixList } from './fix-list.tsx';
import { Ledger } from './ledger.tsx';

/** Lines of a rule in words: "pass up to 16⅜″, fail beyond 17⅜″". */
function LimitWords({ outcome, ruleId }: { outcome: VerdictOutcome; ruleId: string }) {
  const { ruleBook, style } = useFitView();
  const { unit } = ruleBook.rule(ruleId);
  const words = (name: string, { lower, upper }: VerdictOutcome['pass']) => {
    const from = lower === undefined ? undefined : amountText(lower, unit, style);
    const to = upper === undefined ? undefined : amountText(upper, unit, style);
    if (from !== undefined && to !== undefined) return `${name} ${from} to ${to}`;
    return from === undefined ? `${name} up to ${to ?? ''}` : `${name} from ${from}`;
  };
  return (
    <p className="text-sm text-ink-2">
      <Measure text={words('Fits', outcome.pass)} />; <Measure text={words('tight', outcome.fail)} />.
    </p>
  );
}

function Sums({ outcome, ruleId }: { outcome: VerdictOutcome; ruleId: string }) {
  const { ruleBook, style } = useFitView();
  const { unit } = ruleBook.rule(ruleId);
  return (
    <div className="grid content-start gap-3">
      <div className="grid grid-cols-2 gap-6 max-tablet:grid-cols-1">
        <Ledger caption="The body" lines={outcome.bodyLedger} unit={unit} />
        <Ledger caption="The set" lines={outcome.setLedger} unit={unit} />
      </div>
      <div className="flex flex-wrap items-baseline justify-between gap-x-4 border-t border-ink pt-2">
        <Verdict verdict={outcome.verdict} estimated={outcome.estimated} />
        <p className="text-sm text-ink-2">
          measured <Measure text={amountText(outcome.value, unit, style)} />, margin{' '}
          <span className="text-xl font-light text-ink">
            <Margin outcome={outcome} ruleId={ruleId} />
          </span>
        </p>
      </div>
      <LimitWords outcome={outcome} ruleId={ruleId} />
    </div>
  );
}

function Doubt({ outcome }: { outcome: VerdictOutcome }) {
  if (!outcome.estimated) return null;
  const inHundred = (probability: number) => Math.round(probability * 100);
  return (
    <p className="mt-2 text-sm text-ink-2">
      Predicted, not measured: {inHundred(outcome.probability.pass)} in 100 such people fit,{' '}
      {inHundred(outcome.probability.insideFail)} in 100 are at least tight.
      {outcome.settleWith.length > 0 && (
        <strong className="font-semibold text-ink">
          {' '}
          To settle it, measure {measureWords(outcome.settleWith.slice(0, 2))}.
        </strong>
      )}
    </p>
  );
}

/** Where a limit comes from, in the same words on screen and paper. */
export function SourceLine({ ruleId }: { ruleId: string }) {
  const { ruleBook } = useFitView();
  const rule = ruleBook.rule(ruleId);
  return (
    <p className="mt-2 text-sm text-ink-2">
      Rule {rule.id}, {rule.sourceWord}. {rule.thresholdBasis}.{' '}
      {rule.sources.map(({ cite, mark }, index) => (
        <span key={cite}>
          {index > 0 && '; '}
          {cite} ({SOURCE_MARK_WORDS[mark]})
        </span>
      ))}
      .
    </p>
  );
}

/** Everything behind one cell: the sum, why, the source, and what would change it. */
export function CellSlip({ cell, sitterName }: { cell: FitCell; sitterName: string }) {
  const { ruleBook, detail } = useFitView();
  const { outcome } = cell;
  const rule = ruleBook.rule(cell.ruleId);
  const full = detail === 'full';
  return (
    <div className="grid gap-6 bg-sheet px-5 py-4 shadow-slip desk:grid-cols-[minmax(18rem,1.1fr)_1fr_1.2fr]">
      {outcome.kind === 'verdict' && full && <Sums outcome={outcome} ruleId={cell.ruleId} />}
      {outcome.kind === 'verdict' && !full && (
        <p className="flex items-baseline gap-3">
          <Verdict verdict={outcome.verdict} estimated={outcome.estimated} />
          <Margin outcome={outcome} ruleId={cell.ruleId} />
        </p>
      )}
      <div>
        <p>
          <strong className="font-semibold">Why.</strong> {whyFor(rule, sitterName)}
        </p>
        {outcome.kind === 'verdict' && full && <Doubt outcome={outcome} />}
        {cell.side !== undefined && <p className="mt-2 text-sm text-ink-2">At the sitter’s {cell.side}.</p>}
        <SourceLine ruleId={cell.ruleId} />
      </div>
      {outcome.kind === 'verdict' && outcome.verdict !== 'fits' && <FixList cell={cell} />}
    </div>
  );
}

import type { FitCell, VerdictOutcome } from '@settlewright/anthropometry';
import { Fragment } from 'react';
import { Measure } from '@/components/measure.tsx';
import { Verdict, verdictTone } from '@/components/verdict.tsx';
import { amountText, REMOVED } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';
import { marginSum, type MarginSum } from '../sums.ts';
import { DropWords } from './drop-words.tsx';
import { Margin } from './fit-cell.tsx';
import { Ledger } from './ledger.tsx';
import { MeasureLink } from './measure-link.tsx';

interface Props {
  outcome: VerdictOutcome;
  ruleId: string;
}

/** Lines of a rule in words: "Fits up to 16⅜″; tight up to 17⅜″." */
function LimitWords({ outcome, ruleId }: Props) {
  const { ruleBook, style } = useFitView();
  const { unit } = ruleBook.rule(ruleId);
  const words = (name: string, { lower, upper }: VerdictOutcome['pass']) => {
    const from = lower === undefined ? undefined : amountText(lower, unit, style);
    const to = upper === undefined ? undefined : amountText(upper, unit, style);
    if (from === undefined && to === undefined) return [];
    if (from !== undefined && to !== undefined) return [`${name} ${from} to ${to}`];
    return [to === undefined ? `${name} from ${from ?? ''}` : `${name} up to ${to}`];
  };
  const lines = [...words('fits', outcome.pass), ...words('tight', outcome.fail)];
  if (lines.length === 0) return null;
  return (
    <p className="text-sm text-ink-2">
      {lines.map((line, index) => (
        <span key={line}>
          {index > 0 && ', '}
          <Measure text={line} />
        </span>
      ))}
    </p>
  );
}

/** The verdict and how its margin follows from the line and the value. */
function MarginLine({ outcome, ruleId, sum }: Props & { sum: MarginSum | undefined }) {
  const { ruleBook, style } = useFitView();
  const { unit } = ruleBook.rule(ruleId);
  const show = (value: number) => <Measure text={amountText(value, unit, style)} />;
  return (
    <div className="flex flex-wrap items-baseline justify-between gap-x-6 border-b border-ink pb-1">
      <Verdict verdict={outcome.verdict} estimated={outcome.estimated} className="whitespace-nowrap" />
      <p className="text-lg font-light whitespace-nowrap">
        {sum && (
          <>
            {show(sum.from.shown)} − {show(sum.take.shown)} {sum.closes ? '=' : '≈'}{' '}
          </>
        )}
        <span className={`text-2xl tracking-hero ${verdictTone(outcome.verdict)}`}>
          <Margin outcome={outcome} ruleId={ruleId} />
        </span>
      </p>
    </div>
  );
}

/** The sum behind a verdict as two small ledgers that close to the margin. */
export function Sums({ outcome, ruleId }: Props) {
  const { ruleBook, style } = useFitView();
  const { unit } = ruleBook.rule(ruleId);
  if (typeof outcome.value !== 'number') {
    return (
      <div className="grid content-start gap-2">
        <Verdict verdict={outcome.verdict} estimated={outcome.estimated} />
        <p className="text-sm text-ink-2">
          The numbers behind it are {REMOVED}: they told of a person who is no longer in the cast.
        </p>
      </div>
    );
  }
  const sum = marginSum(outcome, unit, style);
  const valueFirst = sum?.from.exact === outcome.value;
  const [value, line] = valueFirst ? [sum?.from, sum?.take] : [sum?.take, sum?.from];
  return (
    <div className="grid content-start gap-3">
      <MarginLine outcome={outcome} ruleId={ruleId} sum={sum} />
      <div className="grid grid-cols-2 items-start gap-6 max-phone:grid-cols-1 max-phone:gap-3">
        <Ledger caption="The body" lines={outcome.bodyLedger} unit={unit} closesTo={line} />
        <Ledger caption="The set" lines={outcome.setLedger} unit={unit} closesTo={value} />
      </div>
      <LimitWords outcome={outcome} ruleId={ruleId} />
    </div>
  );
}

/** How sure a verdict is, how sure it has to be, and which measure, or a test sit, would settle it. */
export function Doubt({ outcome, cell, of }: { outcome: VerdictOutcome; cell: FitCell; of: string }) {
  const { sheet } = useFitView();
  if (typeof outcome.margin !== 'number') return null;
  const { drops = [], settleBySit } = outcome;
  const inHundred = (probability: number) => Math.round(probability * 100);
  const settling = outcome.settleWith.slice(0, 2);
  const foamAlone = outcome.settleWith.length === 0 && drops.length > 0;
  return (
    <>
      <DropWords drops={drops} />
      {outcome.estimated && (
        <p className="mt-2 text-sm text-ink-2">
          {foamAlone ? 'The foam is an estimate' : 'Predicted, not measured'}:{' '}
          {inHundred(outcome.probability.pass)} in 100 such{' '}
          {drops.length > 0 ? 'people on such foam' : 'people'} fit,{' '}
          {inHundred(outcome.probability.insideFail)} in 100 are at least tight; a verdict asks for{' '}
          {inHundred(sheet.confidence)}.
          {(settling.length > 0 || settleBySit) && (
            <strong className="font-semibold text-ink">
              {' '}
              To settle it,{settling.length > 0 && ' measure '}
              {settling.map((key, index) => (
                <Fragment key={key}>
                  {index > 0 && ' and '}
                  <MeasureLink castId={cell.sitterId} of={of} measure={key} />
                </Fragment>
              ))}
              {settleBySit &&
                `${settling.length > 0 ? ', and' : ''} sit on this foam and measure how far it goes down`}
              .
            </strong>
          )}
        </p>
      )}
    </>
  );
}

import { SOURCE_MARK_WORDS, whyFor, type FitCell } from '@settlewright/anthropometry';
import type { CSSProperties } from 'react';
import { classNames } from '@/components/class-names.ts';
import { Verdict } from '@/components/verdict.tsx';
import { useFitView } from '../fit-view.ts';
import { Doubt, Sums } from './cell-sums.tsx';
import { Margin } from './fit-cell.tsx';
import { FixList } from './fix-list.tsx';

const asSentence = (text: string) => `${text.charAt(0).toUpperCase()}${text.slice(1).replace(/\.$/, '')}.`;

/** Where a limit comes from, in the same words on screen and paper. */
function SourceLine({ ruleId }: { ruleId: string }) {
  const { ruleBook } = useFitView();
  const rule = ruleBook.rule(ruleId);
  return (
    <p className="mt-2 text-sm break-words text-ink-2">
      Rule {rule.id}, {rule.sourceWord}. {asSentence(rule.thresholdBasis)}{' '}
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
  const { ruleBook, detail, fixesFor, measuredAs } = useFitView();
  const { outcome } = cell;
  const verdict = outcome.kind === 'verdict' ? outcome : undefined;
  const posture = cell.scope === 'person' ? (measuredAs?.(cell.sitterId ?? '') ?? '') : '';
  const sums = verdict !== undefined && detail === 'full';
  // The public sits nowhere in particular, so there is no one number to change for it.
  const ofThePublic = cell.scope === 'person' && cell.sitterId === undefined;
  const fixable =
    fixesFor !== undefined &&
    !ofThePublic &&
    ((verdict !== undefined && verdict.verdict !== 'fits') || (outcome.kind === 'clause' && !outcome.inside));
  const columns = [sums && 'minmax(20rem,1.1fr)', 'minmax(14rem,0.9fr)', fixable && 'minmax(18rem,1.1fr)'];
  return (
    <div className="@container bg-(--slip,var(--color-sheet)) shadow-slip">
      <div
        className={classNames(
          'grid gap-x-10 gap-y-5 px-5 py-4 max-tablet:px-4',
          '@min-[60rem]:[grid-template-columns:var(--columns)]',
          sums && fixable && '@min-[42rem]:@max-[60rem]:grid-cols-2',
        )}
        style={{ '--columns': columns.filter(Boolean).join(' ') } as CSSProperties}
      >
        {verdict && sums && <Sums outcome={verdict} ruleId={cell.ruleId} />}
        <div>
          {verdict && !sums && (
            <p className="mb-2 flex flex-wrap items-baseline gap-x-3">
              <Verdict verdict={verdict.verdict} estimated={verdict.estimated} />
              <Margin outcome={verdict} ruleId={cell.ruleId} />
            </p>
          )}
          <p className="max-w-text">
            <strong className="font-semibold">Why.</strong> {whyFor(ruleBook.rule(cell.ruleId), sitterName)}
          </p>
          {verdict && sums && <Doubt outcome={verdict} cell={cell} of={sitterName} />}
          {cell.side !== undefined && <p className="mt-2 text-sm text-ink-2">At the sitter’s {cell.side}.</p>}
          {posture !== '' && <p className="mt-2 text-sm text-ink-2">{posture}</p>}
          <SourceLine ruleId={cell.ruleId} />
        </div>
        {fixable && (
          <div className={classNames(sums && '@min-[42rem]:@max-[60rem]:col-span-2')}>
            <FixList cell={cell} />
          </div>
        )}
      </div>
    </div>
  );
}

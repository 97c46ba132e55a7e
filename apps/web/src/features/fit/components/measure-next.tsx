import type { NextMeasures, SitterRow } from '@settlewright/anthropometry';
import { Fragment } from 'react';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { SitterDot } from '@/components/sitter-dot.tsx';
import { settlesWords } from '@/lib/settles-words.ts';
import { useFitView } from '../fit-view.ts';
import { useNextMeasures } from '../next/use-next-measures.ts';
import { MeasureLink } from './measure-link.tsx';

function Line({ row, next }: { row: SitterRow; next: NextMeasures }) {
  const { colourOf } = useFitView();
  return (
    <li className="flex min-h-11 flex-wrap items-center gap-x-3 gap-y-0.5 border-b border-rule py-1.5">
      <span className="inline-flex items-center gap-2 font-medium">
        <SitterDot colour={colourOf(row.sitterId)} /> {row.name}
      </span>
      <span>
        {next.order.map(({ key }, index) => (
          <Fragment key={key}>
            {index > 0 && ', then '}
            <MeasureLink castId={row.sitterId} of={row.name} measure={key} />
          </Fragment>
        ))}
      </span>
      <span className="text-sm text-ink-2">{settlesWords(next.order, next.uncertain.length)}</span>
    </li>
  );
}

/** The one or two measurements of each sitter that settle most; nothing while nobody has a check in doubt. */
export function MeasureNext({ level = 2 }: { level?: 2 | 3 }) {
  const { sheet } = useFitView();
  const found = useNextMeasures();
  const lines = sheet.rows.flatMap((row) => {
    const next = found.get(row);
    return next && next.order.length > 0 ? [{ row, next }] : [];
  });
  if (lines.length === 0) return null;
  return (
    <section className={level === 2 ? 'mt-10' : 'mt-2'}>
      <RuleHeading level={level}>Measure next</RuleHeading>
      {level === 2 && (
        <p className="max-w-text text-ink-2">
          What to take of each person before anything else. Each was tried with the values it may have.
        </p>
      )}
      <ul>
        {lines.map(({ row, next }) => (
          <Line key={`${row.sitterId}|${row.placeId}`} row={row} next={next} />
        ))}
      </ul>
    </section>
  );
}

import type { NextMeasures, SitterRow } from '@settlewright/anthropometry';
import { Fragment } from 'react';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { SitterDot } from '@/components/sitter-dot.tsx';
import { noBodyWords } from '@/lib/no-body-words.ts';
import { settlesWords } from '@/lib/settles-words.ts';
import { useFitView } from '../fit-view.ts';
import { useNextMeasures } from '../next/use-next-measures.ts';
import { MeasureLink } from './measure-link.tsx';
import { shortName } from '@/lib/short-name.ts';

function Order({ row, next }: { row: SitterRow; next: NextMeasures }) {
  return next.order.map(({ key }, index) => (
    <Fragment key={key}>
      {index > 0 && ', then '}
      <MeasureLink castId={row.sitterId} of={row.name} measure={key} />
    </Fragment>
  ));
}

interface Found {
  row: SitterRow;
  next: NextMeasures;
}

/** Rows with something to measure; none while nobody has a check in doubt. */
function useLines(): Found[] {
  const { sheet } = useFitView();
  const found = useNextMeasures();
  return sheet.rows.flatMap((row) => {
    const next = found.get(row);
    return next && next.order.length > 0 ? [{ row, next }] : [];
  });
}

/** The one or two measurements of each sitter that settle most. */
export function MeasureNext() {
  const { basis, colourOf } = useFitView();
  const withoutBody = basis?.sitters.filter(({ noBody }) => noBody).length ?? 0;
  const lines = useLines();
  if (lines.length === 0) return null;
  return (
    <section className="mt-10">
      <RuleHeading>Measure next</RuleHeading>
      <p className="max-w-text text-ink-2">
        What to take of each person before anything else. Each was tried with the values it may have.
      </p>
      <ul>
        {lines.map(({ row, next }) => (
          <li
            key={`${row.sitterId}|${row.placeId}`}
            className="flex min-h-11 flex-wrap items-center gap-x-3 gap-y-0.5 border-b border-rule py-1.5"
          >
            <span className="inline-flex items-center gap-2 font-medium">
              <SitterDot colour={colourOf(row.sitterId)} /> {row.name}
            </span>
            <span>
              <Order row={row} next={next} />
            </span>
            <span className="text-sm text-ink-2">{settlesWords(next.order, next.uncertain.length)}</span>
          </li>
        ))}
      </ul>
      {withoutBody > 0 && <p className="mt-2 text-sm text-ink-2">{noBodyWords(withoutBody)}</p>}
    </section>
  );
}

/** The same in one line, for the drawer. */
export function MeasureNextLine() {
  const lines = useLines();
  if (lines.length === 0) return null;
  return (
    <p className="text-sm tablet:overflow-x-auto tablet:whitespace-nowrap" tabIndex={0}>
      <strong className="font-semibold">Measure next.</strong>{' '}
      {lines.map(({ row, next }, index) => (
        <Fragment key={`${row.sitterId}|${row.placeId}`}>
          {index > 0 && '; '}
          {shortName(row.name)}: <Order row={row} next={next} />
        </Fragment>
      ))}
      .
    </p>
  );
}

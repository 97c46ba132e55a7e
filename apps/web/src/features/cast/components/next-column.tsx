import { MEASURE_INFO } from '@settlewright/anthropometry';
import { Fragment } from 'react';
import { Link } from 'react-router-dom';
import type { DataColumn } from '@/components/data-table.tsx';
import type { CastMember, PersonNext } from '@/lib/contract.ts';
import { settlesWords } from '@/lib/settles-words.ts';

const MOST = 2;

function Next({ person, next }: { person: CastMember; next: PersonNext }) {
  const first = next.order.slice(0, MOST);
  if (first.length === 0) return null;
  return (
    <span className="block text-sm">
      {first.map(({ key }, index) => (
        <Fragment key={key}>
          {index > 0 && ', then '}
          <Link className="link" to={`?${new URLSearchParams({ edit: person.id, field: key })}`}>
            {MEASURE_INFO[key].plain}
            <span className="sr-only">, enter it for {person.name}</span>
          </Link>
        </Fragment>
      ))}
      <span className="block text-xs text-ink-2">
        {settlesWords(first, next.uncertain)}, {new Intl.ListFormat('en').format(next.sets)}
      </span>
    </span>
  );
}

/** What to measure next of each person, for the sets they sit in. */
export function nextColumn(items: readonly PersonNext[] | undefined): DataColumn<CastMember> {
  const nextOf = (person: CastMember) => items?.find(({ castId }) => castId === person.id);
  return {
    id: 'next',
    header: 'Measure next',
    value: (person) => nextOf(person)?.uncertain,
    quietOnPhone: (person) => (nextOf(person)?.order.length ?? 0) === 0,
    cell: (person) => {
      const next = nextOf(person);
      return next ? <Next person={person} next={next} /> : null;
    },
  };
}

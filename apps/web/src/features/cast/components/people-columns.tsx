import type { DataColumn } from '@/components/data-table.tsx';
import { Length } from '@/components/length.tsx';
import type { CastMember } from '@/lib/contract.ts';
import type { Format } from '@/lib/format.ts';
import { knownBy } from '../known-by.ts';
import { PersonName } from './person-name.tsx';

export const nameColumn: DataColumn<CastMember> = {
  id: 'name',
  header: 'Name',
  value: (person) => `${person.name} ${person.role}`,
  cell: (person) => <PersonName person={person} />,
};

/** What designers see of a body. */
export function measureColumns(format: Format): DataColumn<CastMember>[] {
  return [
    {
      id: 'height',
      header: 'Height',
      align: 'right',
      value: (person) => person.statureMm,
      cell: (person) =>
        person.statureMm === undefined ? (
          <span className="text-ink-3">not known</span>
        ) : (
          <span className={person.statureSource === 'measured' ? 'font-semibold' : undefined}>
            <Length mm={person.statureMm} feet />
            {person.statureSource === 'told' && <span className="text-sm text-ink-2">, told</span>}
          </span>
        ),
    },
    {
      id: 'weight',
      header: 'Weight',
      align: 'right',
      value: (person) => person.weightKg,
      cell: (person) =>
        person.weightKg === undefined ? (
          <span className="text-ink-3">not known</span>
        ) : (
          format.mass(person.weightKg)
        ),
    },
    {
      id: 'shoe',
      header: 'Shoe',
      align: 'right',
      quietOnPhone: true,
      value: (person) => person.shoeMm,
      cell: (person) => (person.shoeMm === undefined ? '' : <Length mm={person.shoeMm} />),
    },
    {
      id: 'known',
      header: 'Known by',
      value: (person) => knownBy(person).words,
      cell: (person) => <span className="text-sm text-ink-2">{knownBy(person).words}</span>,
    },
  ];
}

/** What everybody else sees: names and parts. */
export const namesOnly: DataColumn<CastMember>[] = [
  {
    ...nameColumn,
    value: (person) => person.name,
    cell: (person) => <PersonName person={{ ...person, role: '' }} />,
  },
  { id: 'part', header: 'Part', value: (person) => person.role, cell: (person) => person.role },
];

import { TAPE_MEASURE_KEYS } from '@settlewright/anthropometry';
import { type Cell, csvText } from '../../common/spreadsheet-cell';
import type { CastMember } from '../entities/cast-member.entity';

const HEAD = [
  'name',
  'role',
  'body_data',
  'stature_mm',
  'stature_source',
  'weight_kg',
  'age',
  ...TAPE_MEASURE_KEYS.map((key) => `${key}_mm`),
  'taken_by',
  'taken_on',
  'shoe_mm',
  'clothing',
  'notes',
];

/** A list of people that can be brought in again as it is. */
export function writeCastCsv(people: readonly CastMember[]): string {
  return csvText([HEAD, ...people.map(rowOf)]);
}

function rowOf(person: CastMember): Cell[] {
  const taken = Object.values(person.measured);
  return [
    person.name,
    person.role,
    person.bodyData,
    person.statureMm,
    person.statureSource,
    person.weightKg,
    person.age,
    ...TAPE_MEASURE_KEYS.map((key) => person.measured[key]?.mm),
    shared(taken.map(({ takenBy }) => takenBy)),
    shared(taken.map(({ takenOn }) => takenOn)),
    person.shoeMm,
    person.clothing,
    person.notes,
  ];
}

/** The row has one cell for what each measure may say differently. */
function shared(values: (string | undefined)[]): string {
  const [first] = values;
  return first !== undefined && values.every((value) => value === first) ? first : '';
}

import { Select } from '@/components/select.tsx';
import type { OpenSurveyMapping, SurveyPreview } from '@/lib/contract.ts';
import { columnUse, unitsOf, USES, withUnit, withUse } from './mapping.ts';

interface ColumnTableProps {
  columns: SurveyPreview['columns'];
  mapping: OpenSurveyMapping;
  onChange: (mapping: OpenSurveyMapping) => void;
}

/** What each column of the table is, and in which unit. */
export function ColumnTable({ columns, mapping, onChange }: ColumnTableProps) {
  return (
    <ul className="max-h-96 overflow-y-auto border-y border-rule">
      {columns.map(({ name, examples }) => {
        const use = columnUse(mapping, name);
        const measure = mapping.measures.find(({ column }) => column === name);
        return (
          <li
            key={name}
            className="grid items-end gap-3 border-b border-rule py-2 phone:grid-cols-[minmax(0,1fr)_16rem_6rem]"
          >
            <p className="min-w-0 self-center">
              <span className="block truncate font-medium">{name}</span>
              <span className="block truncate text-sm text-ink-2">{examples.join(', ')}</span>
            </p>
            <Select
              label={`${name} is`}
              value={use}
              options={USES}
              onChange={(next) => onChange(withUse(mapping, name, next))}
            />
            {measure?.unit && (
              <Select
                label="in"
                value={measure.unit}
                options={unitsOf(measure.key).map((unit) => ({ value: unit, words: unit }))}
                onChange={(unit) => onChange(withUnit(mapping, name, unit))}
              />
            )}
          </li>
        );
      })}
    </ul>
  );
}

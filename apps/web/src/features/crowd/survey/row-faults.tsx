import { Disclosure } from '@/components/disclosure.tsx';
import type { SurveyPreview } from '@/lib/contract.ts';

/** From so many faults on, a column that makes nearly all of them is named. */
const MANY = 10;
const NEARLY_ALL = 0.9;

/** Which lines of the file were left out, and why. */
export function RowFaults({ faults, count }: { faults: SurveyPreview['faults']; count: number }) {
  if (faults.length === 0) return null;
  const shown = faults.length < count ? `the first ${faults.length} of ${count}` : `${count}`;
  const column = columnToBlame(faults);
  return (
    <Disclosure open words={`Faults: ${shown}`}>
      {column !== undefined && (
        <p className="mb-2">
          Nearly all are in “{column}”. Say above what that column is and in which unit, or that it is not
          read.
        </p>
      )}
      <ul className="max-h-48 overflow-y-auto text-sm" tabIndex={0} aria-label="Faults">
        {faults.map(({ line, field, read, accepted }) => (
          <li key={`${line} ${field}`} className="border-b border-rule py-1">
            Line {line}, {field}: {read === '' ? 'nothing there' : `“${read}”`}; accepted: {accepted}.
          </li>
        ))}
      </ul>
    </Disclosure>
  );
}

function columnToBlame(faults: SurveyPreview['faults']): string | undefined {
  if (faults.length < MANY) return undefined;
  const counts = new Map<string, number>();
  for (const { field } of faults) counts.set(field, (counts.get(field) ?? 0) + 1);
  return [...counts].find(([, faulty]) => faulty >= NEARLY_ALL * faults.length)?.[0];
}

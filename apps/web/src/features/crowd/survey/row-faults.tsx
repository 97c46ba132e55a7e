import { Disclosure } from '@/components/disclosure.tsx';
import type { SurveyPreview } from '@/lib/contract.ts';

/** Which lines of the file were left out, and why. */
export function RowFaults({ faults, count }: { faults: SurveyPreview['faults']; count: number }) {
  if (faults.length === 0) return null;
  const shown = faults.length < count ? `the first ${faults.length} of ${count}` : `${count}`;
  return (
    <Disclosure words={`Faults: ${shown}`}>
      <ul className="max-h-48 overflow-y-auto text-sm" tabIndex={0} aria-label="Faults">
        {faults.map(({ line, field, read, accepted }) => (
          <li key={`${line} ${field}`} className="border-b border-rule py-1">
            Line {line}, {field}: “{read}”; accepted: {accepted}.
          </li>
        ))}
      </ul>
    </Disclosure>
  );
}

import { Length } from '@/components/length.tsx';
import type { ImportRow } from '@/lib/contract.ts';
import { useFormat } from '@/lib/format.ts';

function Remarks({ row }: { row: ImportRow }) {
  return (
    <ul className="text-sm">
      {row.problems.map((problem) => (
        <li key={`${problem.column}${problem.read}`} className="font-medium text-wont">
          {problem.message}.
        </li>
      ))}
      {row.warnings.map((warning) => (
        <li key={`${warning.column}${warning.read}`} className="text-ink-2">
          {warning.message}.
        </li>
      ))}
    </ul>
  );
}

/** How every row was read: the value, or the line, the column and the reason. */
export function ImportPreviewTable({ rows }: { rows: readonly ImportRow[] }) {
  const format = useFormat();
  return (
    <div
      className="max-h-[22rem] overflow-auto"
      tabIndex={0}
      role="region"
      aria-label="Rows as they are read"
    >
      <table className="w-full border-collapse">
        <thead className="sticky top-0 bg-sheet">
          <tr className="border-b-[1.25px] border-ink text-left text-xs text-ink-3">
            {['Line', 'Name', 'Height', 'Weight', 'Tape', 'Remarks'].map((words) => (
              <th key={words} scope="col" className="py-1.5 pr-4 font-medium">
                {words}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr
              key={row.line}
              className={`border-b border-rule align-top ${row.value ? '' : 'bg-wont-wash'}`}
            >
              <th scope="row" className="py-2 pr-4 pl-1 text-left text-sm font-medium">
                {row.line}
              </th>
              <td className="py-2 pr-4 whitespace-nowrap">
                {row.value?.name ?? <span className="text-ink-2">left out</span>}
              </td>
              <td className="py-2 pr-4">
                {row.value?.statureMm !== undefined && <Length mm={row.value.statureMm} feet />}
              </td>
              <td className="py-2 pr-4 whitespace-nowrap">
                {row.value?.weightKg !== undefined && format.mass(row.value.weightKg)}
              </td>
              <td className="py-2 pr-4">{Object.keys(row.value?.measured ?? {}).length || ''}</td>
              <td className="py-2">
                <Remarks row={row} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

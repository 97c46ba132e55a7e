import type { LedgerLine, RuleUnit } from '@settlewright/anthropometry';
import { Measure } from '@/components/measure.tsx';
import { classNames } from '@/components/class-names.ts';
import { amountText } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';

interface LedgerProps {
  caption: string;
  lines: readonly LedgerLine[];
  unit: RuleUnit;
}

/** A sum written out: terms, and a ruled line above each total. */
export function Ledger({ caption, lines, unit }: LedgerProps) {
  const { style } = useFitView();
  return (
    <table className="w-full border-collapse text-sm">
      <caption className="sr-only">{caption}</caption>
      <tbody>
        {lines.map((line, index) => (
          <tr
            key={index}
            className={classNames(line.kind === 'total' && 'border-t border-ink font-semibold')}
          >
            <th scope="row" className="py-0.5 pr-3 text-left font-[inherit]">
              {line.label}
            </th>
            <td className="py-0.5 text-right whitespace-nowrap">
              <Measure text={amountText(line.value, unit, style)} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

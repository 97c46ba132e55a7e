import type { LedgerLine, RuleUnit } from '@settlewright/anthropometry';
import { Measure } from '@/components/measure.tsx';
import { classNames } from '@/components/class-names.ts';
import { amountText } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';
import { closedLedger, type Shown } from '../sums.ts';

interface LedgerProps {
  caption: string;
  lines: readonly LedgerLine[];
  unit: RuleUnit;
  /** The figure of a total, where the margin below is to follow from it. */
  closesTo?: Shown;
}

/** A sum written out: terms with their signs, and a ruled line above each total. */
export function Ledger({ caption, lines, unit, closesTo }: LedgerProps) {
  const { style } = useFitView();
  return (
    <table className="w-full border-collapse text-sm">
      <caption className="sr-only">{caption}</caption>
      <tbody>
        {closedLedger(lines, unit, style, closesTo).map((line, index) => {
          const total = line.kind === 'total';
          const sign = total || index === 0 ? '' : line.value < 0 ? '− ' : '+ ';
          return (
            <tr key={index} className={classNames(total && 'border-t border-ink')}>
              <th
                scope="row"
                className={classNames('py-0.5 pr-3 text-left', total ? 'font-semibold' : 'font-normal')}
              >
                {sign}
                {line.label}
              </th>
              <td className="py-0.5 text-right font-semibold whitespace-nowrap">
                <Measure text={amountText(sign === '' ? line.value : Math.abs(line.value), unit, style)} />
              </td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}

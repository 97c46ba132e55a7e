import type { RuleBook } from '@settlewright/anthropometry';
import { formatAngle, formatLength, type ComparedCell, type LengthStyle } from '@settlewright/geometry';
import { Measure } from '@/components/measure.tsx';
import { Verdict } from '@/components/verdict.tsx';

interface ListProps {
  cells: readonly ComparedCell[];
  ruleBook: RuleBook;
  style: LengthStyle;
  /** Says which pieces a cell is about. */
  withMarks?: boolean;
}

function State({ cell, when }: { cell: ComparedCell; when: 'before' | 'after' }) {
  const outcome = cell[when]?.outcome;
  if (when === 'after' && cell.to === 'gone') return <span className="font-medium">no longer asked</span>;
  if (outcome?.kind === 'verdict') return <Verdict verdict={outcome.verdict} estimated={outcome.estimated} />;
  return <span className="font-medium">{when === 'before' ? cell.from : cell.to} the clause</span>;
}

function marginOf(cell: ComparedCell['after'], unit: string, style: LengthStyle): string | undefined {
  const outcome = cell?.outcome;
  if (outcome?.kind !== 'verdict' || typeof outcome.margin !== 'number') return undefined;
  const { margin } = outcome;
  const size =
    unit === 'deg' ? formatAngle(margin) : unit === 'mm' ? formatLength(margin, style) : String(margin);
  return margin >= 0 && !size.startsWith('−') ? `+${size}` : size;
}

/** Checks that turned: what they said, what they say, and the room that was and is left. */
export function ComparedChanges({ cells, ruleBook, style, withMarks = false }: ListProps) {
  return (
    <ul>
      {cells.map((cell) => {
        const rule = ruleBook.rule(cell.ruleId);
        const [before, after] = [
          marginOf(cell.before, rule.unit, style),
          marginOf(cell.after, rule.unit, style),
        ];
        return (
          <li key={cell.before.id} className="border-b border-rule py-2 last:border-0">
            <span className="block text-sm">
              <span className="font-medium">{rule.columnName}</span>
              {withMarks && <span className="text-ink-2"> {cell.marks.join(', ')}</span>}
            </span>
            <span className="flex flex-wrap items-center gap-x-3 gap-y-1 text-sm">
              <State cell={cell} when="before" />
              <span className="text-ink-3">to</span>
              <State cell={cell} when="after" />
              {before !== undefined && after !== undefined && (
                <span className="text-ink-2">
                  <Measure text={before} /> to <Measure text={after} />
                </span>
              )}
            </span>
          </li>
        );
      })}
    </ul>
  );
}

/** "2 better, 1 worse, 11 keep their verdict" for a line. */
export function changeCount({
  gains,
  losses,
  kept,
}: {
  gains: unknown[];
  losses: unknown[];
  kept: number;
}): string {
  return [
    gains.length > 0 && `${gains.length} better`,
    losses.length > 0 && `${losses.length} worse`,
    kept > 0 && `${kept} keep ${kept === 1 ? 'its' : 'their'} verdict`,
  ]
    .filter(Boolean)
    .join(', ');
}

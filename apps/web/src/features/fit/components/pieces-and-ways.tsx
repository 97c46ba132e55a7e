import type { FitCell } from '@settlewright/anthropometry';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { classNames } from '@/components/class-names.ts';
import { amountText, checkName } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';
import { CellSlip } from './cell-slip.tsx';
import { CellContent } from './fit-cell.tsx';

function ClauseParts({ cell }: { cell: FitCell }) {
  const { style, ruleBook } = useFitView();
  if (cell.outcome.kind !== 'clause') return null;
  const { unit } = ruleBook.rule(cell.ruleId);
  return (
    <ul className="text-xs text-ink-2">
      {cell.outcome.parts.map((part) => (
        <li key={part.label}>
          {part.label} {amountText(part.value, unit, style)}: {part.inside ? 'inside' : 'outside'}
        </li>
      ))}
    </ul>
  );
}

function Line({ cell }: { cell: FitCell }) {
  const { ruleBook, light, openCellId, open, litCellId } = useFitView();
  const isOpen = openCellId === cell.id;
  return (
    <li className={classNames('border-b border-rule', isOpen && 'col-span-full')}>
      <button
        type="button"
        aria-expanded={isOpen}
        className={classNames(
          'quick grid min-h-12 w-full grid-cols-[1fr_auto] items-center gap-3 py-1.5 text-left hover:bg-sunk',
          litCellId === cell.id && 'bg-sheet',
        )}
        onFocus={() => light(cell.id)}
        onPointerEnter={() => light(cell.id)}
        onPointerLeave={() => light(null)}
        onClick={() => open(isOpen ? null : cell.id)}
      >
        <span>
          <span className="font-medium">{checkName(ruleBook, cell)}</span>{' '}
          <span className="text-ink-2">{cell.marks.join(', ')}</span>
          <ClauseParts cell={cell} />
        </span>
        <CellContent cell={cell} />
      </button>
      {isOpen && (
        <section aria-label={checkName(ruleBook, cell)}>
          <CellSlip cell={cell} sitterName={cell.marks.join(' and ')} />
        </section>
      )}
    </li>
  );
}

/** Rules about a bench, a table, a pair or a way, and the code clauses. */
export function PiecesAndWays() {
  const { sheet } = useFitView();
  const asked = sheet.piecesAndWays.filter(
    ({ outcome }) =>
      outcome.kind === 'verdict' || outcome.kind === 'clause' || outcome.kind === 'information',
  );
  return (
    <section>
      <RuleHeading>Pieces and ways</RuleHeading>
      {asked.length === 0 ? (
        <p className="text-ink-2">Nothing to say yet: no bench, table or way is asked about.</p>
      ) : (
        <ul className="grid gap-x-8 phone:grid-cols-2 desk:grid-cols-4">
          {asked.map((cell) => (
            <Line key={cell.id} cell={cell} />
          ))}
        </ul>
      )}
      <NotAsked />
    </section>
  );
}

/** What the crew would have to say before these can be asked: "no spot for turning round is marked: Turning space". */
function NotAsked() {
  const { sheet, ruleBook } = useFitView();
  const reasons = new Map<string, Set<string>>();
  for (const cell of [...sheet.rows.flatMap((row) => row.cells), ...sheet.piecesAndWays]) {
    const { outcome } = cell;
    if (outcome.kind !== 'notAsked') continue;
    reasons.set(outcome.reason, (reasons.get(outcome.reason) ?? new Set()).add(checkName(ruleBook, cell)));
  }
  if (reasons.size === 0) return null;
  return (
    <div className="mt-4 max-w-text text-sm text-ink-2">
      <h3 className="font-medium">Not asked</h3>
      <ul>
        {[...reasons].map(([reason, names]) => (
          <li key={reason}>
            {[...names].join(', ')}: {reason}
          </li>
        ))}
      </ul>
    </div>
  );
}

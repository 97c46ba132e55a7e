import type { FitCell, Verdict } from '@settlewright/anthropometry';
import { classNames } from '@/components/class-names.ts';
import { outcomeWords } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';
import { CellContent } from './fit-cell.tsx';

const WASHES: Record<Verdict, string> = {
  fits: 'bg-fits-wash',
  tight: 'bg-tight-wash',
  wontFit: 'bg-wont-wash',
  notKnown: 'bg-unknown-wash',
};
const EDGES: Record<Verdict, string> = {
  fits: 'border-t-fits',
  tight: 'border-t-tight',
  wontFit: 'border-t-wont',
  notKnown: 'border-t-unknown',
};

interface GridCellProps {
  cell: FitCell | undefined;
  /** Who the row is about, and which check the column is. */
  name: string;
  column: string;
  position: string;
  tabStop: boolean;
  /** A change has just turned this verdict. */
  turned: boolean;
  onReach: () => void;
  readAs?: string;
}

/** One cell: a button that opens its slip, and lights its gap while it is pointed at. */
export function GridCell({ cell, name, column, position, tabStop, turned, onReach, readAs }: GridCellProps) {
  const { ruleBook, style, litCellId, light, openCellId, open } = useFitView();
  const check = column.toLowerCase();
  if (cell === undefined) {
    return (
      <td
        data-grid-cell={position}
        tabIndex={tabStop ? 0 : -1}
        aria-label={`${name}, ${check}, not asked`}
        className="border-b border-rule px-2 text-sm text-ink-3"
        onFocus={onReach}
      >
        –
      </td>
    );
  }
  const isOpen = openCellId === cell.id;
  const verdict = cell.outcome.kind === 'verdict' ? cell.outcome.verdict : undefined;
  const edge = !isOpen
    ? 'border-t-transparent'
    : verdict === undefined
      ? 'border-t-rule-strong'
      : EDGES[verdict];
  const washed = turned || (litCellId === cell.id && !isOpen);
  const ground = washed ? (verdict === undefined ? 'bg-sunk' : WASHES[verdict]) : isOpen && 'bg-(--slip)';
  const words = outcomeWords(cell.outcome, ruleBook.rule(cell.ruleId).unit, style);
  return (
    <td className="border-b border-rule p-0">
      <button
        type="button"
        data-grid-cell={position}
        data-turned={turned || undefined}
        tabIndex={tabStop ? 0 : -1}
        aria-label={`${name}, ${check}, ${words}`}
        aria-expanded={isOpen}
        className={classNames(
          'quick flex min-h-11 w-full items-center border-t-[3px] px-2 pb-[3px] text-left hover:bg-sunk',
          'focus-visible:relative focus-visible:z-[1]',
          edge,
          ground,
        )}
        onFocus={() => {
          onReach();
          light(cell.id);
        }}
        onPointerEnter={() => light(cell.id)}
        onPointerLeave={() => light(null)}
        onClick={() => open(isOpen ? null : cell.id)}
      >
        <CellContent cell={cell} readAs={readAs} />
      </button>
    </td>
  );
}

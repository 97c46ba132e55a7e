import { Link } from 'react-router-dom';
import { Menu } from '@/components/menu.tsx';
import { Wordmark } from '@/components/brand.tsx';
import { classNames } from '@/components/class-names.ts';
import { type TitleCell, useAllTitleCells } from '@/lib/title-cells.ts';
import { AccountCell } from './account-cell.tsx';
import { MoreCell } from './more-cell.tsx';
import { CELL, CellFace, PRESSABLE } from './title-cell.tsx';
import { useSavedTime } from './use-saved-time.ts';
import { useTitleFit } from './use-title-fit.ts';
import { useUnitsCell } from './use-units-cell.ts';

function Cell({ cell }: { cell: TitleCell }) {
  const face = <CellFace label={cell.label} value={cell.value} quiet={cell.disabled} />;
  if (cell.menu) {
    return (
      <Menu
        name={cell.name ?? `${cell.label}: ${cell.value}, menu`}
        button={face}
        buttonClassName={classNames(CELL, PRESSABLE)}
        entries={cell.menu}
        side={cell.side === 'right' ? 'end' : 'start'}
      />
    );
  }
  if (cell.to !== undefined) {
    return (
      <Link to={cell.to} aria-label={cell.name} className={classNames(CELL, PRESSABLE)}>
        {face}
      </Link>
    );
  }
  if (cell.onPress !== undefined) {
    return (
      <button
        type="button"
        aria-label={cell.name}
        disabled={cell.disabled}
        onClick={cell.onPress}
        className={classNames(CELL, cell.disabled ? 'cursor-default' : PRESSABLE)}
      >
        {face}
      </button>
    );
  }
  return (
    <div className={CELL} aria-label={cell.name} role={cell.name === undefined ? undefined : 'group'}>
      {face}
    </div>
  );
}

function Cells({ cells, moved }: { cells: readonly TitleCell[]; moved: readonly string[] }) {
  return cells
    .filter(({ id }) => !moved.includes(id))
    .map((cell) => (
      <div key={cell.id} data-cell={cell.id} className="flex border-l border-rule">
        <Cell cell={cell} />
      </div>
    ));
}

/** The ruled strip across the top, as on a drawing; it takes the place of a menu bar. */
export function TitleBlock({ home }: { home: string }) {
  const units = useUnitsCell();
  const saved = useSavedTime();
  const set = useAllTitleCells();
  const cells = [...set, units, ...(saved ? [saved] : [])];
  const { header, moved } = useTitleFit(cells);
  return (
    <header
      ref={header}
      className="sticky top-0 z-30 flex h-14 border-b-[1.25px] border-ink bg-paper pr-3 pl-8 [--cell-pad:1.25rem] max-desk:[--cell-pad:1rem] max-tablet:h-[52px] max-tablet:pr-0 max-tablet:pl-4 max-tablet:[--cell-pad:0.75rem] max-phone:[--cell-pad:0.5rem] print:hidden"
    >
      <Link
        to={home}
        data-fixed
        aria-label="Settlewright, all productions"
        className="flex shrink-0 items-center pr-5 no-underline max-tablet:pr-3"
      >
        <Wordmark quiet />
      </Link>
      {/* All cells give way to each other, whichever side they stand on. */}
      <nav aria-label="Where you are" className="contents">
        <Cells cells={cells.filter(({ side }) => side === 'left')} moved={moved} />
      </nav>
      <div className="min-w-0 flex-1 border-l border-rule" />
      <Cells cells={cells.filter(({ side }) => side === 'right')} moved={moved} />
      <MoreCell cells={cells.filter(({ id }) => moved.includes(id))} />
      <AccountCell />
    </header>
  );
}

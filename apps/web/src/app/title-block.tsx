import { Link } from 'react-router-dom';
import { Menu } from '@/components/menu.tsx';
import { Wordmark } from '@/components/brand.tsx';
import { classNames } from '@/components/class-names.ts';
import { type TitleCell, useAllTitleCells } from '@/lib/title-cells.ts';
import { AccountCell } from './account-cell.tsx';
import { SavedCell } from './saved-cell.tsx';
import { CELL, CellFace, PRESSABLE } from './title-cell.tsx';
import { UnitsCell } from './units-cell.tsx';

function Cell({ cell }: { cell: TitleCell }) {
  const face = <CellFace label={cell.label} value={cell.value} quiet={cell.disabled} />;
  if (cell.menu) {
    return (
      <Menu
        name={cell.name ?? `${cell.label}: ${typeof cell.value === 'string' ? cell.value : ''}, menu`}
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

function Cells({ cells }: { cells: TitleCell[] }) {
  return cells.map((cell) => (
    <div key={cell.id} className={classNames('flex min-w-0', !cell.phone && 'max-tablet:hidden')}>
      <Cell cell={cell} />
    </div>
  ));
}

/** The ruled strip across the top, as on a drawing; it takes the place of a menu bar. */
export function TitleBlock({ home }: { home: string }) {
  const cells = useAllTitleCells();
  const left = cells.filter((cell) => cell.side === 'left');
  const right = cells.filter((cell) => cell.side === 'right');
  return (
    <header className="sticky top-0 z-30 flex h-14 border-b-[1.25px] border-ink bg-paper pl-8 max-tablet:h-[52px] max-tablet:pl-4 print:hidden">
      <Link
        to={home}
        aria-label="Settlewright, all productions"
        className="flex shrink-0 items-center pr-5 no-underline max-tablet:pr-3"
      >
        <Wordmark quiet />
      </Link>
      <nav aria-label="Where you are" className="flex min-w-0 divide-x divide-rule border-x border-rule">
        <Cells cells={left} />
      </nav>
      <div className="min-w-0 flex-1" />
      <div className="flex min-w-0 divide-x divide-rule border-l border-rule pr-3 max-tablet:pr-0">
        <Cells cells={right} />
        <UnitsCell />
        <SavedCell />
        <AccountCell />
      </div>
    </header>
  );
}

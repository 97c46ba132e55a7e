import { Fragment, useMemo, useRef, useState, type KeyboardEvent } from 'react';
import { classNames } from '@/components/class-names.ts';
import { Measure } from '@/components/measure.tsx';
import { SitterDot } from '@/components/sitter-dot.tsx';
import { columnsOf, orderedRows, type RowOrder } from '../columns.ts';
import { useFitView } from '../fit-view.ts';
import { useMoreAtRight } from '../use-more-at-right.ts';
import { useTurnedCells } from '../use-turned-cells.ts';
import { GridCell } from './grid-cell.tsx';
import { SlipRow } from './slip-row.tsx';

interface FitGridProps {
  order?: RowOrder;
  showPlace?: boolean;
  showPublic?: boolean;
  /** What the grid lies on: the frozen column and head have the same ground, the slip the other one. */
  ground: 'paper' | 'sheet';
  className?: string;
}

const GROUNDS = {
  paper: '[--ground:var(--color-paper)] [--slip:var(--color-sheet)]',
  sheet: '[--ground:var(--color-sheet)] [--slip:var(--color-paper)]',
};
const HEAD = 'sticky top-0 border-b border-ink bg-(--ground) py-2 font-normal whitespace-nowrap';
/** Its scrollbar shows whether or not the system hides those at rest. */
const SCROLLER =
  '@container relative min-h-0 overflow-x-scroll overflow-y-auto [scrollbar-gutter:stable] ' +
  '[scrollbar-color:auto] [&::-webkit-scrollbar]:size-2.5 ' +
  '[&::-webkit-scrollbar-corner]:bg-transparent [&::-webkit-scrollbar-thumb]:bg-rule-strong';
const FROZEN = 'sticky left-0 bg-(--ground) pr-3 text-left whitespace-nowrap';

/** Sitters by checks. Arrow keys move between cells, Enter opens one, Escape closes it. */
export function FitGrid({ order = 'place', showPlace, showPublic, ground, className }: FitGridProps) {
  const { sheet, ruleBook, colourOf, aside, measuredAs, openCellId, open } = useFitView();
  const columns = useMemo(() => columnsOf(sheet, ruleBook), [sheet, ruleBook]);
  const rows = useMemo(() => orderedRows(sheet, order), [sheet, order]);
  const turned = useTurnedCells(sheet);
  const [at, setAt] = useState({ row: 0, column: 0 });
  const [scroller, { more, uprightBarPx, levelBarPx }] = useMoreAtRight();
  const table = useRef<HTMLTableElement>(null);
  const publicCells = showPublic ? sheet.publicRow.cells : [];
  const last = { row: rows.length - (publicCells.length > 0 ? 0 : 1), column: columns.length - 1 };
  // A sheet that has become smaller keeps one cell that Tab reaches.
  const reached = { row: Math.min(at.row, last.row), column: Math.min(at.column, last.column) };

  const go = (row: number, column: number) =>
    table.current?.querySelector<HTMLElement>(`[data-grid-cell="${row}:${column}"]`)?.focus();

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Escape' && openCellId !== null) {
      event.stopPropagation();
      open(null);
      go(reached.row, reached.column);
      return;
    }
    const onCell = event.target instanceof HTMLElement && event.target.dataset.gridCell !== undefined;
    if (!onCell || event.altKey || event.metaKey) return;
    const { row, column } = reached;
    const moves: Record<string, [number, number]> = {
      ArrowUp: [Math.max(0, row - 1), column],
      ArrowDown: [Math.min(last.row, row + 1), column],
      ArrowLeft: [row, Math.max(0, column - 1)],
      ArrowRight: [row, Math.min(last.column, column + 1)],
      Home: [event.ctrlKey ? 0 : row, 0],
      End: [event.ctrlKey ? last.row : row, last.column],
    };
    const move = moves[event.key];
    if (move === undefined) return;
    event.preventDefault();
    event.stopPropagation();
    go(...move);
  };

  const place = (row: number, column: number) => ({
    position: `${row}:${column}`,
    tabStop: reached.row === row && reached.column === column,
    onReach: () => setAt({ row, column }),
  });
  const span = columns.length + (showPlace ? 2 : 1);
  const openedPublic = publicCells.find((cell) => cell.id === openCellId);

  return (
    <div className={classNames('relative flex flex-col', GROUNDS[ground], className)}>
      <div ref={scroller} className={SCROLLER}>
        <table
          ref={table}
          role="grid"
          className="w-full min-w-max border-separate border-spacing-0 border-b border-ink"
          onKeyDown={onKeyDown}
        >
          <caption className="sr-only">Fit sheet: sitters against checks</caption>
          <thead>
            <tr className="text-left text-sm text-ink-2">
              <th scope="col" className={classNames(HEAD, 'left-0 z-20 pr-3')}>
                Sitter
              </th>
              {showPlace && (
                <th scope="col" className={classNames(HEAD, 'z-10 pr-2')}>
                  Place
                </th>
              )}
              {columns.map((column) => (
                <th key={column.name} scope="col" className={classNames(HEAD, 'z-10 px-2')}>
                  {column.name}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map((row, rowIndex) => {
              const opened = row.cells.find((cell) => cell.id === openCellId);
              const said = aside(row.sitterId);
              return (
                <Fragment key={`${row.sitterId}|${row.placeId}`}>
                  <tr>
                    <th scope="row" className={classNames(FROZEN, 'z-[5] border-b border-rule font-medium')}>
                      <span className="inline-flex items-center gap-2">
                        <SitterDot colour={colourOf(row.sitterId)} />
                        <span>
                          {row.name}{' '}
                          {said !== '' && (
                            <span className="text-sm font-normal text-ink-2">
                              <Measure text={said} />
                            </span>
                          )}
                          {measuredAs?.(row.sitterId) && (
                            <span className="block text-xs font-normal text-ink-2">
                              measured in the standard posture
                            </span>
                          )}
                        </span>
                      </span>
                    </th>
                    {showPlace && (
                      <td className="border-b border-rule pr-2 text-sm whitespace-nowrap text-ink-2">
                        {row.mark}, place {row.place}
                      </td>
                    )}
                    {columns.map((column, columnIndex) => {
                      const cell = column.cellOf(row.cells);
                      return (
                        <GridCell
                          key={column.name}
                          cell={cell}
                          name={row.name}
                          column={column.name}
                          turned={cell !== undefined && turned.has(cell.id)}
                          {...place(rowIndex, columnIndex)}
                        />
                      );
                    })}
                  </tr>
                  {opened && <SlipRow cell={opened} about={row.name} name={row.name} span={span} />}
                </Fragment>
              );
            })}
            {publicCells.length > 0 && (
              <tr>
                <th scope="row" className={classNames(FROZEN, 'z-[5] border-b border-rule font-medium')}>
                  The public <span className="text-sm font-normal text-ink-2">5th or 95th in 100</span>
                </th>
                {showPlace && <td className="border-b border-rule pr-2 text-sm text-ink-2">any place</td>}
                {columns.map((column, columnIndex) => {
                  const cell = column.cellOf(publicCells);
                  return (
                    <GridCell
                      key={column.name}
                      cell={cell}
                      readAs={cell?.readAs}
                      name={`The public${cell === undefined ? '' : `, ${cell.readAs}`}`}
                      column={column.name}
                      turned={false}
                      {...place(rows.length, columnIndex)}
                    />
                  );
                })}
              </tr>
            )}
            {openedPublic && (
              <SlipRow cell={openedPublic} about="somebody of the public" name="The public" span={span} />
            )}
          </tbody>
        </table>
      </div>
      {more && (
        // No wider than the margin of an open slip, so that it darkens nothing that is read.
        <div
          data-more-at-right
          aria-hidden="true"
          style={{ right: uprightBarPx, bottom: levelBarPx }}
          className="pointer-events-none absolute top-0 z-30 w-5 bg-linear-to-l from-ink/25 to-transparent"
        />
      )}
    </div>
  );
}

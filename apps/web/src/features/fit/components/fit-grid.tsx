import type { FitCell } from '@settlewright/anthropometry';
import { Fragment, useMemo, useRef, useState, type KeyboardEvent } from 'react';
import { classNames } from '@/components/class-names.ts';
import { Measure } from '@/components/measure.tsx';
import { SitterDot } from '@/components/sitter-dot.tsx';
import { columnsOf, orderedRows, type RowOrder } from '../columns.ts';
import { outcomeWords } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';
import { CellSlip } from './cell-slip.tsx';
import { CellContent } from './fit-cell.tsx';

interface GridCellProps {
  cell: FitCell | undefined;
  name: string;
  column: string;
  tabStop: boolean;
  position: string;
  onReach: () => void;
  readAs?: string;
}

function GridCell({ cell, name, column, tabStop, position, onReach, readAs }: GridCellProps) {
  const { ruleBook, style, litCellId, light, openCellId, open } = useFitView();
  if (cell === undefined) return <td className="px-2 text-sm text-ink-3">–</td>;
  const isOpen = openCellId === cell.id;
  const words = outcomeWords(cell.outcome, ruleBook.rule(cell.ruleId).unit, style);
  return (
    <td className="p-0">
      <button
        type="button"
        data-grid-cell={position}
        tabIndex={tabStop ? 0 : -1}
        aria-label={`${name}, ${column.toLowerCase()}, ${words}`}
        aria-expanded={isOpen}
        className={classNames(
          'quick flex min-h-12 w-full items-center px-2 py-1 text-left hover:bg-sunk',
          (isOpen || litCellId === cell.id) && 'bg-sheet shadow-[inset_0_2px_0_currentColor]',
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

interface FitGridProps {
  order?: RowOrder;
  showPlace?: boolean;
  showPublic?: boolean;
}

/** Sitters by checks. Arrow keys move between cells, Enter opens one, Escape closes it. */
export function FitGrid({ order = 'place', showPlace = false, showPublic = false }: FitGridProps) {
  const { sheet, ruleBook, colourOf, aside, openCellId, open } = useFitView();
  const columns = useMemo(() => columnsOf(sheet, ruleBook), [sheet, ruleBook]);
  const rows = useMemo(() => orderedRows(sheet, order), [sheet, order]);
  const [reached, setReached] = useState({ row: 0, column: 0 });
  const table = useRef<HTMLTableElement>(null);
  const rowCount = rows.length + (showPublic ? 1 : 0);

  const go = (row: number, column: number) =>
    table.current?.querySelector<HTMLElement>(`[data-grid-cell="${row}:${column}"]`)?.focus();

  const onKeyDown = (event: KeyboardEvent) => {
    const { row, column } = reached;
    const lastRow = rowCount - 1;
    const lastColumn = columns.length - 1;
    const moves: Record<string, [number, number]> = {
      ArrowUp: [Math.max(0, row - 1), column],
      ArrowDown: [Math.min(lastRow, row + 1), column],
      ArrowLeft: [row, Math.max(0, column - 1)],
      ArrowRight: [row, Math.min(lastColumn, column + 1)],
      Home: [event.ctrlKey ? 0 : row, 0],
      End: [event.ctrlKey ? lastRow : row, lastColumn],
    };
    const move = moves[event.key];
    if (move !== undefined) {
      event.preventDefault();
      go(...move);
    } else if (event.key === 'Escape' && openCellId !== null) {
      event.stopPropagation();
      open(null);
    }
  };

  const span = columns.length + 1 + (showPlace ? 1 : 0);
  return (
    <table ref={table} className="w-full min-w-max border-collapse" onKeyDown={onKeyDown}>
      <caption className="sr-only">Fit sheet: sitters against checks</caption>
      <thead className="sticky top-0 z-10 bg-[inherit]">
        <tr className="border-b border-ink text-left text-sm text-ink-2">
          <th scope="col" className="sticky left-0 z-10 bg-[inherit] py-2 pr-3 font-normal">
            Sitter
          </th>
          {showPlace && (
            <th scope="col" className="px-2 font-normal">
              Place
            </th>
          )}
          {columns.map((column) => (
            <th key={column.name} scope="col" className="px-2 font-normal">
              {column.name}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row, rowIndex) => {
          const opened = row.cells.find((cell) => cell.id === openCellId);
          return (
            <Fragment key={`${row.sitterId}|${row.placeId}`}>
              <tr className="border-b border-rule">
                <th
                  scope="row"
                  className="sticky left-0 z-10 bg-[inherit] py-1 pr-3 text-left font-medium whitespace-nowrap"
                >
                  <span className="inline-flex items-center gap-2">
                    <SitterDot colour={colourOf(row.sitterId)} />
                    <span>
                      {row.name}{' '}
                      <span className="font-normal text-ink-2">
                        <Measure text={aside(row.sitterId)} />
                      </span>
                    </span>
                  </span>
                </th>
                {showPlace && (
                  <td className="px-2 text-sm whitespace-nowrap text-ink-2">
                    {row.mark}, place {row.place}
                  </td>
                )}
                {columns.map((column, columnIndex) => (
                  <GridCell
                    key={column.name}
                    cell={column.cellOf(row.cells)}
                    name={row.name}
                    column={column.name}
                    position={`${rowIndex}:${columnIndex}`}
                    tabStop={reached.row === rowIndex && reached.column === columnIndex}
                    onReach={() => setReached({ row: rowIndex, column: columnIndex })}
                  />
                ))}
              </tr>
              {opened !== undefined && (
                <tr>
                  <td colSpan={span} className="p-0">
                    <section aria-label={`${row.name}, ${ruleBook.rule(opened.ruleId).columnName}`}>
                      <CellSlip cell={opened} sitterName={row.name} />
                    </section>
                  </td>
                </tr>
              )}
            </Fragment>
          );
        })}
        {showPublic && (
          <PublicRowCells
            columns={columns}
            rowIndex={rows.length}
            span={span}
            showPlace={showPlace}
            reached={reached}
            onReach={setReached}
          />
        )}
      </tbody>
    </table>
  );
}

interface PublicRowProps {
  columns: ReturnType<typeof columnsOf>;
  rowIndex: number;
  span: number;
  showPlace: boolean;
  reached: { row: number; column: number };
  onReach: (at: { row: number; column: number }) => void;
}

/** The public: each rule read at the end of the population that it protects, and saying so. */
function PublicRowCells({ columns, rowIndex, span, showPlace, reached, onReach }: PublicRowProps) {
  const { sheet, openCellId } = useFitView();
  const { cells } = sheet.publicRow;
  if (cells.length === 0) return null;
  const opened = cells.find((cell) => cell.id === openCellId);
  return (
    <>
      <tr className="border-y border-ink">
        <th scope="row" className="sticky left-0 z-10 bg-[inherit] py-1 pr-3 text-left font-medium">
          The public <span className="font-normal text-ink-2">5th or 95th in 100</span>
        </th>
        {showPlace && <td className="px-2 text-sm text-ink-2">any place</td>}
        {columns.map((column, columnIndex) => {
          const cell = column.cellOf(cells);
          const readAs = cells.find((candidate) => candidate.id === cell?.id)?.readAs;
          return (
            <GridCell
              key={column.name}
              cell={cell}
              readAs={readAs}
              name={`The public${readAs === undefined ? '' : `, ${readAs}`}`}
              column={column.name}
              position={`${rowIndex}:${columnIndex}`}
              tabStop={reached.row === rowIndex && reached.column === columnIndex}
              onReach={() => onReach({ row: rowIndex, column: columnIndex })}
            />
          );
        })}
      </tr>
      {opened !== undefined && (
        <tr>
          <td colSpan={span} className="p-0">
            <CellSlip cell={opened} sitterName="somebody of the public" />
          </td>
        </tr>
      )}
    </>
  );
}

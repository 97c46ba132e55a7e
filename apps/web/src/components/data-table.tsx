import {
  type ColumnDef,
  type RowData,
  columnFilteringFeature,
  createFilteredRowModel,
  createPaginatedRowModel,
  createSortedRowModel,
  filterFn_includesString,
  globalFilteringFeature,
  rowPaginationFeature,
  rowSortingFeature,
  sortFn_alphanumeric,
  sortFn_text,
  tableFeatures,
  useTable,
} from '@tanstack/react-table';
import type { ReactNode } from 'react';
import { useMemo } from 'react';
import { Button } from './button.tsx';
import { classNames } from './class-names.ts';
import { SearchIcon, SortIcon } from './icons.tsx';

const features = tableFeatures({
  rowSortingFeature,
  columnFilteringFeature,
  globalFilteringFeature,
  rowPaginationFeature,
  sortedRowModel: createSortedRowModel(),
  filteredRowModel: createFilteredRowModel(),
  paginatedRowModel: createPaginatedRowModel(),
  sortFns: { alphanumeric: sortFn_alphanumeric, text: sortFn_text },
  filterFns: { includesString: filterFn_includesString },
});

export interface DataColumn<Row> {
  id: string;
  header: string;
  /** What the column sorts by and the filter reads. */
  value: (row: Row) => string | number | undefined;
  cell: (row: Row) => ReactNode;
  align?: 'left' | 'right';
  sortable?: boolean;
  /** Left out on a phone, where each row reads as a small list: always, or where a row has nothing to say there. */
  quietOnPhone?: boolean | ((row: Row) => boolean);
}

interface DataTableProps<Row extends RowData> {
  /** Says what the table lists; heard, not seen. */
  caption: string;
  rows: readonly Row[];
  columns: readonly DataColumn<Row>[];
  rowKey: (row: Row) => string;
  /** Label of the filter; without it there is none. */
  filterLabel?: string;
  pageSize?: number;
  /** Shown when the filter leaves nothing. */
  nothingFound?: string;
  /** Stands to the right of the filter. */
  tools?: ReactNode;
}

const quietOnPhone = <Row,>(column: DataColumn<Row> | undefined, row: Row): boolean =>
  typeof column?.quietOnPhone === 'function' ? column.quietOnPhone(row) : column?.quietOnPhone === true;

/** Rows that sort, filter and page; on a phone each row becomes a small list. */
export function DataTable<Row extends RowData>({
  caption,
  rows,
  columns,
  rowKey,
  filterLabel,
  pageSize = 25,
  nothingFound = 'Nothing matches.',
  tools,
}: DataTableProps<Row>) {
  const data = useMemo(() => [...rows], [rows]);
  const definitions = useMemo(
    () =>
      columns.map((column): ColumnDef<typeof features, Row> => ({
        id: column.id,
        header: column.header,
        accessorFn: column.value,
        enableSorting: column.sortable ?? true,
        sortUndefined: 'last',
        cell: ({ row }) => column.cell(row.original),
      })),
    [columns],
  );
  const table = useTable({
    features,
    columns: definitions,
    data,
    getRowId: rowKey,
    globalFilterFn: 'includesString',
    getColumnCanGlobalFilter: () => true,
    enableSortingRemoval: false,
    enableMultiSort: false,
    initialState: { pagination: { pageIndex: 0, pageSize } },
  });
  const { pageIndex } = table.state.pagination;
  const filtered = table.getFilteredRowModel().rows.length;
  const pages = table.getPageCount();
  const about = new Map(columns.map((column) => [column.id, column]));

  return (
    <div>
      {(filterLabel !== undefined || tools !== undefined) && (
        <div className="mb-3 flex flex-wrap items-center justify-between gap-3 max-tablet:flex-col max-tablet:items-stretch">
          {filterLabel !== undefined && (
            <label className="flex h-10 min-w-0 items-center tablet:flex-1 gap-2 border-b-[1.5px] border-rule-strong text-ink-2 focus-within:border-chalk tablet:max-w-80">
              <SearchIcon />
              <span className="sr-only">{filterLabel}</span>
              <input
                type="search"
                value={(table.state.globalFilter as string | undefined) ?? ''}
                placeholder={filterLabel}
                onChange={(event) => table.setGlobalFilter(event.target.value)}
                className="h-full w-full min-w-0 bg-transparent text-ink outline-none"
              />
            </label>
          )}
          {tools}
        </div>
      )}
      <table className="w-full border-collapse max-tablet:block">
        <caption className="sr-only">{caption}</caption>
        <thead className="max-tablet:sr-only">
          {table.getHeaderGroups().map((group) => (
            <tr key={group.id} className="border-b-[1.25px] border-ink">
              {group.headers.map((header) => {
                const sorted = header.column.getIsSorted();
                const right = about.get(header.column.id)?.align === 'right';
                return (
                  <th
                    key={header.id}
                    scope="col"
                    aria-sort={sorted === 'asc' ? 'ascending' : sorted === 'desc' ? 'descending' : undefined}
                    className={classNames(
                      'py-1 pr-4 text-xs font-medium text-ink-3 last:pr-0',
                      right ? 'text-right' : 'text-left',
                    )}
                  >
                    {header.column.getCanSort() ? (
                      <button
                        type="button"
                        onClick={header.column.getToggleSortingHandler()}
                        className={classNames(
                          'inline-flex min-h-7 items-center gap-1 hover:text-ink',
                          right && 'flex-row-reverse',
                          sorted && 'text-ink',
                        )}
                      >
                        {about.get(header.column.id)?.header}
                        <SortIcon direction={sorted} />
                      </button>
                    ) : (
                      <span className={about.get(header.column.id)?.header === '' ? 'sr-only' : undefined}>
                        {about.get(header.column.id)?.header || 'Actions'}
                      </span>
                    )}
                  </th>
                );
              })}
            </tr>
          ))}
        </thead>
        <tbody className="max-tablet:block">
          {table.getRowModel().rows.map((row) => (
            <tr
              key={row.id}
              className="border-b border-rule max-tablet:grid max-tablet:gap-y-1 max-tablet:py-3"
            >
              {row.getAllCells().map((cell, index) => {
                const column = about.get(cell.column.id);
                const content = <table.FlexRender cell={cell} />;
                if (index === 0) {
                  return (
                    <th
                      key={cell.id}
                      scope="row"
                      className="py-2.5 pr-4 text-left font-normal max-tablet:py-0"
                    >
                      {content}
                    </th>
                  );
                }
                return (
                  <td
                    key={cell.id}
                    className={classNames(
                      'py-2.5 pr-4 last:pr-0 max-tablet:flex max-tablet:justify-between max-tablet:gap-4 max-tablet:py-0 max-tablet:pr-0 max-tablet:text-right',
                      column?.align === 'right' && 'text-right',
                      quietOnPhone(column, row.original) && 'max-tablet:hidden',
                    )}
                  >
                    <span aria-hidden="true" className="shrink-0 text-sm text-ink-3 tablet:hidden">
                      {column?.header}
                    </span>
                    {content}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
      <div className="mt-3 flex flex-wrap items-center justify-between gap-3 text-sm text-ink-3">
        <p role="status">
          {filtered === 0 && rows.length > 0
            ? nothingFound
            : filtered !== rows.length
              ? `${filtered} of ${rows.length}`
              : pages > 1
                ? `${rows.length} in all`
                : ''}
        </p>
        {pages > 1 && (
          <nav aria-label={`Pages of ${caption}`} className="flex items-center gap-3">
            <Button size="small" disabled={!table.getCanPreviousPage()} onClick={() => table.previousPage()}>
              Back
            </Button>
            <span>
              page {pageIndex + 1} of {pages}
            </span>
            <Button size="small" disabled={!table.getCanNextPage()} onClick={() => table.nextPage()}>
              On
            </Button>
          </nav>
        )}
      </div>
    </div>
  );
}

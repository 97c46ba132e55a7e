import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { type DataColumn, DataTable } from './data-table.tsx';

interface Plank {
  name: string;
  mm?: number;
}

const COLUMNS: DataColumn<Plank>[] = [
  { id: 'name', header: 'Name', value: (row) => row.name, cell: (row) => row.name },
  { id: 'mm', header: 'Length', value: (row) => row.mm, cell: (row) => row.mm ?? 'not known' },
];
const ROWS: Plank[] = [
  { name: 'oak', mm: 900 },
  { name: 'ash' },
  { name: 'elm', mm: 95 },
  { name: 'box', mm: 1200 },
];

const show = (pageSize = 25) =>
  render(
    <DataTable
      caption="Planks"
      rows={ROWS}
      columns={COLUMNS}
      rowKey={(row) => row.name}
      filterLabel="Find a plank"
      pageSize={pageSize}
    />,
  );
const names = () => screen.getAllByRole('rowheader').map((cell) => cell.textContent);

describe('DataTable', () => {
  it('sorts numbers as numbers, keeps what is not known last both ways and says so to a reader', async () => {
    show();
    const header = screen.getByRole('columnheader', { name: 'Length' });
    await userEvent.click(within(header).getByRole('button'));
    const first = names();
    await userEvent.click(within(header).getByRole('button'));
    const second = names();
    expect([first, second]).toContainEqual(['elm', 'oak', 'box', 'ash']);
    expect([first, second]).toContainEqual(['box', 'oak', 'elm', 'ash']);
    expect(header).toHaveAttribute('aria-sort');
  });

  it('filters by any column, counts what is left and says when nothing is', async () => {
    show();
    const filter = screen.getByRole('searchbox', { name: 'Find a plank' });
    await userEvent.type(filter, 'oa');
    expect(names()).toEqual(['oak']);
    expect(screen.getByRole('status')).toHaveTextContent('1 of 4');
    await userEvent.type(filter, 'xx');
    expect(screen.queryAllByRole('rowheader')).toEqual([]);
    expect(screen.getByRole('status')).toHaveTextContent('Nothing matches.');
  });

  it('pages with buttons that stop at the ends', async () => {
    show(3);
    expect(names()).toHaveLength(3);
    expect(screen.getByRole('button', { name: 'Back' })).toBeDisabled();
    await userEvent.click(screen.getByRole('button', { name: 'On' }));
    expect(names()).toEqual(['box']);
    expect(screen.getByRole('button', { name: 'On' })).toBeDisabled();
  });
});

import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it } from 'vitest';
import { ruleBook, sheet, showSheet } from '../test/show-sheet.tsx';
import { FitPeople } from './fit-people.tsx';

it('lists people in trouble first, whatever their place, and folds what fits', async () => {
  const user = userEvent.setup();
  const calm = sheet.rows.map((row) =>
    row.sitterId === 'marcus' ? { ...row, worst: 'tight' as const } : row,
  );
  showSheet(<FitPeople showPublic />, { sheet: { ...sheet, rows: [...calm].reverse() } });
  const names = screen.getAllByRole('region').map((section) => section.getAttribute('aria-label'));
  expect(names).toEqual(['Hetty Vance', 'Marcus Adeyemi-Rowe', 'The public']);
  const hetty = within(screen.getByRole('region', { name: 'Hetty Vance' }));
  const fitting = sheet.rows
    .find(({ sitterId }) => sitterId === 'hetty')
    ?.cells.find(({ outcome }) => outcome.kind === 'verdict' && outcome.verdict === 'fits');
  const name = ruleBook.rule(fitting?.ruleId ?? '').columnName;
  expect(hetty.queryByRole('button', { name: new RegExp(`^${name}`) })).toBeNull();
  await user.click(hetty.getByRole('button', { name: /^Show/ }));
  expect(hetty.getByRole('button', { name: new RegExp(`^${name}.*fits`) })).toBeVisible();
});

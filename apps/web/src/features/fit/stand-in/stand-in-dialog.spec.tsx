import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { basis, showSheet } from '../test/show-sheet.tsx';
import { StandInDialog } from './stand-in-dialog.tsx';

const dialog = <StandInDialog open onClose={() => undefined} />;

describe('StandInDialog', () => {
  it('says nothing until it is known who tries the seat', () => {
    showSheet(dialog, { basis });
    expect(screen.getByText(/Type a height/)).toBeVisible();
    expect(screen.queryByRole('heading', { level: 3 })).toBeNull();
  });

  it('tells check by check what a taller stranger’s sit is worth', async () => {
    showSheet(dialog, { basis });
    await userEvent.click(screen.getByLabelText(/Their height/));
    await userEvent.paste('6\' 2"');
    await userEvent.tab();
    const cannot = await screen.findByRole('heading', { name: 'This sit cannot tell' });
    const group = within(cannot.closest('section') as HTMLElement);
    expect(group.getAllByText(/Tape .* instead|Weigh .* instead/).length).toBeGreaterThan(0);
    expect(
      group.getAllByText(/this sit cannot tell\. (Tape|Weigh) (Hetty|the stand-in)/).length,
    ).toBeGreaterThan(0);
    const little = await screen.findByRole('heading', { name: /^Says little/ });
    expect(
      within(little.closest('section') as HTMLElement).getAllByText(
        /says little: the stand-in and Hetty differ here by .* \(shop rule\)/,
      ).length,
    ).toBeGreaterThan(0);
    expect(
      screen.getAllByText(
        /holds for Hetty because of the room there is, .* although their bodies differ here/,
      ).length,
    ).toBeGreaterThan(0);
    expect(screen.queryByText(/\bThe’s\b|at The\b/)).toBeNull();
    // Her back of knee was taken, his is predicted from a height half a head above hers.
    expect(screen.getAllByText(/back of knee \+/).length).toBeGreaterThan(0);
  });

  it('takes somebody of the cast as the stand-in', async () => {
    showSheet(dialog, { basis });
    await userEvent.click(screen.getByRole('button', { name: /Tried by/ }));
    await userEvent.click(await screen.findByRole('option', { name: /Marcus/ }));
    expect(screen.queryByLabelText(/Their height/)).toBeNull();
    expect((await screen.findAllByText(/Marcus Adeyemi-Rowe against Hetty Vance/)).length).toBeGreaterThan(0);
  });

  it('asks before a typed height is lost', async () => {
    showSheet(dialog, { basis });
    await userEvent.type(screen.getByLabelText(/Their height/), '6');
    await userEvent.keyboard('{Escape}');
    expect(screen.getByRole('dialog', { name: 'Discard what you typed?' })).toBeVisible();
  });
});

import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { Dialog, FormDialog } from './dialog.tsx';
import { TextField } from './text-field.tsx';

function Page({ form = true }: { form?: boolean }) {
  const [open, setOpen] = useState(true);
  const close = () => setOpen(false);
  return form ? (
    <FormDialog open={open} onClose={close} title="Add a person" verb="Add" onSubmit={close}>
      <TextField label="Name" defaultValue="Hetty" />
    </FormDialog>
  ) : (
    <Dialog open={open} onClose={close} title="All numbers">
      <TextField label="Name" defaultValue="Hetty" />
    </Dialog>
  );
}

const dialog = () => screen.queryByRole('dialog', { name: 'Add a person' });
const question = () => screen.queryByRole('dialog', { name: 'Discard what you typed?' });
const name = () => screen.getByRole('textbox', { name: 'Name' });

describe('a dialog with something typed in it', () => {
  it.each([
    ['Escape', () => userEvent.keyboard('{Escape}')],
    ['the cross', () => userEvent.click(screen.getByRole('button', { name: 'Close' }))],
    // A press on the dimmed page around it.
    ['a press outside', () => userEvent.click(document.body)],
  ])('asks before %s discards it, and keeps it', async (_way, leave) => {
    render(<Page />);
    await userEvent.type(name(), ' Vance');
    await leave();
    expect(question()).toBeVisible();
    expect(screen.getByRole('button', { name: 'Keep typing' })).toHaveFocus();
    await userEvent.keyboard('{Escape}');
    expect(question()).toBeNull();
    expect(name()).toHaveValue('Hetty Vance');
    await leave();
    await userEvent.click(screen.getByRole('button', { name: 'Discard' }));
    expect(dialog()).toBeNull();
  });

  it('closes at once when nothing was typed, when it was taken back, and by Cancel', async () => {
    const { unmount } = render(<Page />);
    await userEvent.click(name());
    await userEvent.keyboard('{Escape}');
    expect(dialog()).toBeNull();
    unmount();
    const second = render(<Page />);
    await userEvent.type(name(), 'x{Backspace}');
    await userEvent.keyboard('{Escape}');
    expect(dialog()).toBeNull();
    second.unmount();
    render(<Page />);
    await userEvent.type(name(), 'x');
    await userEvent.click(screen.getByRole('button', { name: 'Cancel' }));
    expect(dialog()).toBeNull();
  });

  it('does not ask where what is typed is taken as it goes', async () => {
    render(<Page form={false} />);
    await userEvent.type(name(), 'x');
    await userEvent.keyboard('{Escape}');
    expect(screen.queryByRole('dialog')).toBeNull();
  });
});

import { ARRANGEMENTS, type SetDocument } from '@settlewright/geometry';
import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { RoomContext, type RoomSurroundings } from '../room-context.tsx';
import { KnownDifferences } from './known-differences.tsx';

const banquette = ARRANGEMENTS.find(({ id }) => id === 'banquette')!.build();

function Page() {
  const [document, setDocument] = useState<SetDocument>({
    ...banquette,
    knownDifferences: [{ id: 'd1', text: 'The sill is 1″ higher.' }],
  });
  return (
    <RoomContext value={{ canEdit: true } as RoomSurroundings}>
      <KnownDifferences document={document} onReplace={setDocument} />
    </RoomContext>
  );
}

const list = () => screen.queryByRole('dialog', { name: 'Known differences' });
const question = () => screen.queryByRole('dialog', { name: 'Discard what you typed?' });

async function open() {
  render(<Page />);
  await userEvent.click(screen.getByRole('button', { name: /open the list/ }));
}

describe('KnownDifferences', () => {
  it.each([['Another one'], ['Difference 1']])('asks before what stands in “%s” is lost', async (label) => {
    await open();
    await userEvent.type(screen.getByRole('textbox', { name: label }), 'Buttons in fours.');
    await userEvent.keyboard('{Escape}');
    expect(question()).toBeVisible();
    await userEvent.click(screen.getByRole('button', { name: 'Keep typing' }));
    expect(list()).toBeVisible();
  });

  it('does not ask for what was taken', async () => {
    await open();
    await userEvent.type(screen.getByRole('textbox', { name: 'Difference 1' }), ' Seen by all.');
    await userEvent.tab();
    await userEvent.type(screen.getByRole('textbox', { name: 'Another one' }), 'Buttons in fours.');
    await userEvent.click(screen.getByRole('button', { name: 'Add it' }));
    await userEvent.keyboard('{Escape}');
    expect(question()).toBeNull();
    expect(list()).toBeNull();
    expect(screen.getByText(/Seen by all\. Buttons in fours\./)).toBeVisible();
  });
});

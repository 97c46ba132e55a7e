import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { Dialog } from './dialog.tsx';
import { Select } from './select.tsx';

const OPTIONS = [
  { value: 'order', words: 'The order' },
  { value: 'C1', words: 'Cushion C1' },
] as const;

function About() {
  const [value, setValue] = useState<'order' | 'C1'>('order');
  return (
    <main>
      <Select label="About" value={value} options={OPTIONS} onChange={setValue} />
      <textarea aria-label="Question" />
    </main>
  );
}

const list = () => screen.queryByRole('listbox');
const open = () => userEvent.click(screen.getByRole('button', { name: /^About/ }));

describe('one of a few', () => {
  it('is chosen, and the list is gone', async () => {
    render(<About />);
    await open();
    await userEvent.click(await screen.findByRole('option', { name: 'Cushion C1' }));
    expect(list()).toBeNull();
    expect(screen.getByRole('button', { name: 'About, Cushion C1' })).toHaveFocus();
  });

  it('comes into view without moving the page', async () => {
    const moved = vi.spyOn(Element.prototype, 'scrollIntoView');
    render(<About />);
    await open();
    await userEvent.keyboard('{ArrowDown}');
    await new Promise(requestAnimationFrame);
    expect(screen.getByRole('option', { name: 'Cushion C1' })).toHaveAttribute('data-focus');
    expect(moved).not.toHaveBeenCalled();
    moved.mockRestore();
  });

  it('leaves the rest of the page to be used while its list is open', async () => {
    render(<About />);
    await open();
    expect(list()).not.toBeNull();
    const question = screen.getByLabelText('Question');
    expect(question.closest('[inert], [aria-hidden="true"]')).toBeNull();
    await userEvent.click(question);
    expect(list()).toBeNull();
    expect(question).toHaveFocus();
  });

  it('is left with Escape before the dialog it stands in', async () => {
    let closed = 0;
    render(
      <Dialog open onClose={() => (closed += 1)} title="Cushions">
        <About />
      </Dialog>,
    );
    await open();
    await userEvent.keyboard('{Escape}');
    expect(list()).toBeNull();
    expect(closed).toBe(0);
  });
});

import { dimensionOf, type SetDocument } from '@settlewright/geometry';
import { fireEvent, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import type { CrowdTasks } from '@/lib/crowd/crowd-tasks.ts';
import { checkOf, facingBenches, HETTY, showStick } from '../test/show-stick.tsx';

/** A crowd of whom a lower seat always suits more, and of whom the belly room turns most away. */
vi.mock('@/lib/crowd/ask-crowd.ts', () => ({
  askCrowd: (task: 'curve' | 'shares', { values }: CrowdTasks['curve']['asked']) =>
    Promise.resolve(
      task === 'shares'
        ? { rejectsMost: { ruleId: 'TABLE-06', lost: 0.6 } }
        : {
            points: values.map((value) => ({ value, fits: Math.max(0, 1 - value / 1000) })),
            told: { name: 'People', source: 'a count', cautions: ['They are soldiers.'] },
          },
    ),
}));

const heightOf = (document: SetDocument | undefined): number =>
  (document && dimensionOf(document, 'seat-height')?.value) ?? 0;
/** A busy machine tries a hundred sets in a second or more. */
const SLOW = { timeout: 15_000 };
const slider = () => screen.findByRole('slider', { name: 'Seat height, pressed' }, SLOW);

const press = (element: HTMLElement, ...keys: string[]) => {
  for (const key of keys) fireEvent.keyDown(element, { key });
};

describe('the plumb line', () => {
  it('says the value, whom it serves and how many of the public', async () => {
    showStick();
    const bob = await slider();
    await waitFor(
      () => expect(bob).toHaveAttribute('aria-valuetext', expect.stringMatching(/in 100$/)),
      SLOW,
    );
    expect(await screen.findByText(/turns most away, about 60 in 100\./, {}, SLOW)).toBeVisible();
    expect(bob.getAttribute('aria-valuetext')).toMatch(
      /^.*inch.*; .*(fit|fits|tight|won’t fit).*; about \d+ in 100$/,
    );
  });

  it('moves by a step with the keys, and the set follows once with Enter', async () => {
    const onStep = vi.fn<(document: SetDocument, step: string) => void>();
    showStick({ onStep });
    const bob = await slider();
    const before = Number(bob.getAttribute('aria-valuenow'));
    // At once, as the set follows by itself when the keys rest.
    press(bob, 'ArrowLeft', 'ArrowLeft');
    const moved = Number(bob.getAttribute('aria-valuenow'));
    expect(before - moved).toBeGreaterThan(25.4 / 8);
    expect(before - moved).toBeLessThanOrEqual(25.4 / 4 + 1e-6);
    expect(onStep).not.toHaveBeenCalled();
    press(bob, 'Enter');
    expect(onStep).toHaveBeenCalledOnce();
    expect(heightOf(onStep.mock.lastCall?.[0])).toBeCloseTo(moved, 3);
    expect(onStep.mock.lastCall?.[1]).toMatch(/^Seat height, pressed .+″ to .+″$/);
  });

  it('goes back with Escape and leaves the set as it is', async () => {
    const onStep = vi.fn();
    showStick({ onStep });
    const bob = await slider();
    const before = bob.getAttribute('aria-valuenow');
    press(bob, 'PageDown', 'Escape');
    expect(bob).toHaveAttribute('aria-valuenow', before);
    fireEvent.blur(bob);
    expect(onStep).not.toHaveBeenCalled();
  });
});

describe('the choice', () => {
  it('keeps the look with a note: why, by whom and when', async () => {
    const onStep = vi.fn<(document: SetDocument, step: string) => void>();
    const user = userEvent.setup();
    showStick({ onStep });
    await user.type(
      await screen.findByLabelText('Note for the known differences', {}, SLOW),
      'The photograph shows it.',
    );
    await user.click(screen.getByRole('button', { name: /^Keep .* with this note$/ }));
    const [difference] = onStep.mock.lastCall?.[0].knownDifferences ?? [];
    expect(difference).toMatchObject({
      reason: 'The photograph shows it.',
      by: 'Nell Abara',
      on: new Date().toISOString().slice(0, 10),
    });
    expect(difference?.text).toMatch(/^Seat height, pressed kept at /);
    expect(heightOf(onStep.mock.lastCall?.[0])).toBe(heightOf(facingBenches));
  });

  it('takes both pieces along as one step, and then has nothing better to offer', async () => {
    const onStep = vi.fn<(document: SetDocument, step: string) => void>();
    const user = userEvent.setup();
    showStick({ onStep, check: checkOf([HETTY]) }, '?d=seat-and-tables');
    await user.click(await screen.findByRole('button', { name: /^Take / }, SLOW));
    expect(onStep).toHaveBeenCalledOnce();
    const after = onStep.mock.lastCall?.[0];
    const table = (document: SetDocument | undefined) => {
      const found = document?.pieces.find(({ kind }) => kind === 'table');
      return found?.kind === 'table' ? found.heightMm : 0;
    };
    expect(table(after) - table(facingBenches)).toBeCloseTo(heightOf(after) - heightOf(facingBenches), 6);
    expect(heightOf(after)).not.toBe(heightOf(facingBenches));
    expect(await screen.findByRole('heading', { name: 'No other value serves more' }, SLOW)).toBeVisible();
  });

  it('names who needs what when no value suits both', async () => {
    showStick();
    const words = await screen.findByText(/^No value suits all two/, {}, SLOW);
    expect(words).toHaveTextContent(/all two: Hetty needs .* or less, Marcus .* or more\./);
  });
});

describe('for readers without measures', () => {
  it('tells why there are no laths, and shows none', () => {
    showStick({ detail: 'verdicts' });
    expect(screen.getByText(/gives their bodies away/)).toBeVisible();
    expect(screen.queryByRole('slider')).toBeNull();
    expect(screen.queryByRole('table')).toBeNull();
  });
});

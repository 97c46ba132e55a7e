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
const SLOW = { timeout: 18_000 };
const slider = () => screen.findByRole('slider', { name: 'Seat height, pressed' }, SLOW);

/** Words in a drawing, whole. */
const drawn = (words: RegExp) => (_: string, element: Element | null) =>
  element?.tagName === 'text' && words.test(element.textContent ?? '');
const markNow = () => screen.getByText(drawn(/^\S+″ now$/));

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

describe('while a value is tried', () => {
  it('keeps the mark of where the set stands, and writes a series of keys as one step', async () => {
    const onStep = vi.fn<(document: SetDocument, step: string) => void>();
    showStick({ onStep });
    const bob = await slider();
    const [stood] = (bob.getAttribute('aria-valuetext') ?? '').split(';');
    press(bob, 'ArrowLeft', 'ArrowLeft', 'ArrowLeft');
    expect(bob.getAttribute('aria-valuetext')).not.toContain(`${stood};`);
    const start = markNow().textContent.replace(' now', '');
    expect(onStep).not.toHaveBeenCalled();
    fireEvent.blur(bob);
    expect(onStep).toHaveBeenCalledOnce();
    expect(onStep.mock.lastCall?.[1]).toContain(`Seat height, pressed ${start} to `);
  });

  it('takes undo as the way back, and leaves what was written before alone', async () => {
    const onStep = vi.fn();
    showStick({ onStep });
    const bob = await slider();
    const before = bob.getAttribute('aria-valuenow');
    press(bob, 'PageDown');
    const pressed = fireEvent.keyDown(bob, { key: 'z', ctrlKey: true });
    expect(bob).toHaveAttribute('aria-valuenow', before);
    expect(pressed).toBe(false);
    expect(fireEvent.keyDown(bob, { key: 'z', ctrlKey: true })).toBe(true);
    expect(onStep).not.toHaveBeenCalled();
  });

  it('says whom the value under the hand costs, and goes back by a button', async () => {
    const onStep = vi.fn();
    const user = userEvent.setup();
    showStick({ onStep });
    const bob = await slider();
    const before = bob.getAttribute('aria-valuenow');
    bob.focus();
    press(bob, 'PageUp', 'PageUp');
    const back = await screen.findByRole('button', { name: /^Back to / }, SLOW);
    expect(screen.getByText('Worse').nextElementSibling).toHaveTextContent(/Hetty|Marcus/);
    await user.click(back);
    expect(bob).toHaveAttribute('aria-valuenow', before);
    expect(onStep).not.toHaveBeenCalled();
  });

  it('settles the laths whose verdict turns, and no other', async () => {
    const { container } = showStick();
    const bob = await slider();
    expect(container.querySelectorAll('.lath-settles')).toHaveLength(0);
    const verdicts = () => /; (.*?);|; (.*)$/.exec(bob.getAttribute('aria-valuetext') ?? '')?.[0];
    const before = verdicts();
    // Lower until the verdict of one of the two turns.
    for (let n = 0; n < 40 && verdicts() === before; n += 1) press(bob, 'ArrowLeft');
    expect(verdicts()).not.toBe(before);
    expect(container.querySelectorAll('.lath-settles')).toHaveLength(1);
  });

  it('follows a finger, and writes when the focus goes elsewhere', async () => {
    const onStep = vi.fn();
    showStick({ onStep });
    const bob = await slider();
    Object.assign(bob, { setPointerCapture: () => undefined, hasPointerCapture: () => false });
    const before = Number(bob.getAttribute('aria-valuenow'));
    fireEvent.pointerDown(bob, { button: 0, pointerId: 4, clientX: 300 });
    fireEvent.pointerMove(bob, { pointerId: 4, clientX: 200 });
    const low = Number(bob.getAttribute('aria-valuenow'));
    expect(low).toBeLessThan(before);
    fireEvent.pointerUp(bob, { pointerId: 4 });
    fireEvent.pointerMove(bob, { pointerId: 4, clientX: 400 });
    expect(Number(bob.getAttribute('aria-valuenow'))).toBe(low);
    expect(bob).toHaveClass('touch-none');
    expect(onStep).not.toHaveBeenCalled();
    fireEvent.blur(bob);
    expect(onStep).toHaveBeenCalledOnce();
  });
});

describe('the choice', () => {
  it('keeps the look with a reason, by whom and when, and asks for one', async () => {
    const onStep = vi.fn<(document: SetDocument, step: string) => void>();
    const user = userEvent.setup();
    showStick({ onStep });
    const reason = await screen.findByLabelText('Why it is kept', {}, SLOW);
    const keep = screen.getByRole('button', { name: /^Keep .* with this note$/ });
    await user.click(keep);
    expect(onStep).not.toHaveBeenCalled();
    expect(reason).toHaveFocus();
    expect(reason).toHaveAccessibleDescription(/^Say why it is kept\./);
    await user.type(reason, 'The photograph shows it.');
    await user.click(keep);
    const [difference] = onStep.mock.lastCall?.[0].knownDifferences ?? [];
    expect(difference).toMatchObject({
      reason: 'The photograph shows it.',
      by: 'Nell Abara',
      on: new Date().toISOString().slice(0, 10),
    });
    expect(difference?.text).toMatch(/^Seat height, pressed kept at /);
    expect(heightOf(onStep.mock.lastCall?.[0])).toBe(heightOf(facingBenches));
  });

  it('offers a foot rail to whose feet hang, and puts it in the note', async () => {
    const user = userEvent.setup();
    showStick();
    await screen.findByRole('heading', { name: 'Or a foot rail' }, SLOW);
    const reason = screen.getByLabelText('Why it is kept');
    expect(reason).not.toHaveAccessibleDescription(/foot rail/);
    await user.click(screen.getByRole('button', { name: 'Put the rail in the note below' }));
    expect(reason).toHaveAccessibleDescription(
      /with a foot rail for Hetty \(.*″ high to fit, .*″ to be tight\)/,
    );
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
    expect(words).toHaveTextContent(/all two: Hetty needs .* or less.*, Marcus .* or more \(est/);
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

describe('the paper', () => {
  it('is asked of the server with the value under the hand, and says what went wrong', async () => {
    const paper = vi.fn(() => Promise.reject(new Error('Somebody saved a newer draft meanwhile.')));
    const user = userEvent.setup();
    showStick({ paper });
    await slider();
    await user.click(screen.getByRole('button', { name: 'Save as PDF' }));
    expect(paper).toHaveBeenCalledWith('story-stick.pdf', {
      dimension: 'seat-height',
      value: heightOf(facingBenches),
      ruleId: 'SEAT-02',
      populationId: 'us-civilians-2015',
      womenPercent: 50,
      units: 'feet-inches',
      roundTo: 8,
    });
    expect(await screen.findByText('Somebody saved a newer draft meanwhile.')).toBeVisible();
  });

  it('asks for no mix where the population holds one sex', async () => {
    const paper = vi.fn(() => Promise.resolve());
    const user = userEvent.setup();
    showStick({ paper }, '?d=seat-height&people=german');
    await slider();
    await user.click(screen.getByRole('button', { name: 'Save as PDF' }));
    const [, sent] = paper.mock.lastCall as unknown as [string, object];
    expect(sent).toMatchObject({ populationId: 'german' });
    expect(sent).not.toHaveProperty('womenPercent');
  });
});

describe('the public', () => {
  it('has nothing to mix where a population holds one sex', async () => {
    showStick({}, '?d=seat-height&people=german');
    await slider();
    expect(screen.getByRole('combobox', { name: 'Population' })).toBeVisible();
    expect(screen.queryByRole('slider', { name: 'Women of 100 people' })).toBeNull();
  });
});

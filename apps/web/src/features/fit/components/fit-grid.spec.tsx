import type { FitCell, FitSheet } from '@settlewright/anthropometry';
import { setParameter, type Fix } from '@settlewright/geometry';
import { act, fireEvent, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { check, facingBenches, sheet, showSheet } from '../test/show-sheet.tsx';
import { FitGrid } from './fit-grid.tsx';

const seatHeight = (who: RegExp) =>
  screen.getByRole('button', { name: new RegExp(`${who.source}.*, seat height,`) });
const hetty = () => seatHeight(/^Hetty Vance/);
const slip = () => screen.getByRole('region', { name: 'Hetty Vance, seat height' });

/** The sheet with every outcome changed, as the server sends it or keeps it. */
function mapped(change: (cell: FitCell) => FitCell): FitSheet {
  return {
    ...sheet,
    rows: sheet.rows.map((row) => ({ ...row, cells: row.cells.map(change) })),
    publicRow: { cells: [] },
  };
}

describe('keys of the fit grid', () => {
  it('has one stop for Tab; arrows, Home and End move between cells', async () => {
    const user = userEvent.setup();
    showSheet(<FitGrid ground="paper" showPublic />);
    const stops = screen.getAllByRole('button').filter((button) => button.tabIndex === 0);
    expect(stops).toEqual([hetty()]);
    await user.tab();
    expect(hetty()).toHaveFocus();
    await user.keyboard('{ArrowDown}');
    expect(seatHeight(/^Marcus/)).toHaveFocus();
    await user.keyboard('{ArrowUp}{ArrowRight}');
    expect(document.activeElement).toHaveAccessibleName(/^Hetty Vance, seat depth,/);
    await user.keyboard('{End}');
    const [firstRow] = screen.getAllByRole('row').slice(1);
    expect(
      within(firstRow ?? document.body)
        .getAllByRole('button')
        .at(-1),
    ).toHaveFocus();
    await user.keyboard('{Home}');
    expect(hetty()).toHaveFocus();
    await user.keyboard('{Control>}{End}{/Control}');
    expect(document.activeElement).toHaveAccessibleName(/^The public, /);
    expect(document.activeElement).toHaveAttribute('tabindex', '0');
    await user.keyboard('{ArrowDown}{ArrowRight}');
    expect(document.activeElement).toHaveAccessibleName(/^The public, /);
    await user.keyboard('{Control>}{Home}{/Control}');
    expect(hetty()).toHaveFocus();
  });

  it('opens with Enter, closes with Escape from within the slip, and keeps the focus on the cell', async () => {
    const user = userEvent.setup();
    showSheet(<FitGrid ground="paper" />, { fixes: true, onTake: () => undefined });
    act(() => hetty().focus());
    await user.keyboard('{Enter}');
    expect(hetty()).toHaveAttribute('aria-expanded', 'true');
    expect(hetty()).toHaveFocus();
    const [tryIt] = await within(slip()).findAllByRole('button', { name: /^Try it/ });
    act(() => tryIt?.focus());
    await user.keyboard('{ArrowRight}');
    expect(tryIt).toHaveFocus();
    await user.keyboard('{Escape}');
    expect(screen.queryByRole('region')).toBeNull();
    expect(hetty()).toHaveFocus();
  });
});

describe('the slip of a cell', () => {
  it('names a cell with sitter, check, verdict and margin in words', () => {
    showSheet(<FitGrid ground="paper" />);
    expect(hetty()).toHaveAccessibleName(/^Hetty Vance, seat height, won’t fit, minus .* inch(es)?$/);
    expect(seatHeight(/^Marcus/)).toHaveAccessibleName(/estimated, plus .*give or take/);
  });

  it('shows sums that close, why, the source, and what would change it with who loses', async () => {
    const user = userEvent.setup();
    showSheet(<FitGrid ground="paper" />, { fixes: true, onTake: () => undefined });
    await user.click(hetty());
    const inSlip = within(slip());
    expect(inSlip.getByRole('table', { name: 'The body' })).toHaveTextContent(
      /\+ shoe1″.*pass line.*fail line/,
    );
    expect(inSlip.getByRole('table', { name: 'The set' })).toHaveTextContent(
      /\+ cushion.*− sinks under Hetty/,
    );
    expect(slip()).toHaveTextContent(/^won’t fit.*″ − .*″ = −.*Back of knee/);
    expect(inSlip.getByText(/crook of Hetty Vance’s knee/)).toBeVisible();
    expect(inSlip.getByText(/^The cushion goes down/)).toHaveTextContent(
      /½″.* to .*″ in 90 of 100 cases \(estimate, give or take 30 %, from memory\)\.$/,
    );
    expect(inSlip.getByText(/Rule SEAT-02, from memory\. Coefficients/)).toBeVisible();
    expect(inSlip.getByText('What would change it, and for whom')).toBeVisible();
    const fixes = await inSlip.findByRole('list', { name: 'What would change it, and for whom' });
    expect(within(fixes).getAllByText(/^Hetty, seat height: (fits|tight)/)[0]).toBeVisible();
  });

  it('says of a verdict that hangs on the cushion what sitting on it would settle', async () => {
    const user = userEvent.setup();
    const near = mapped(({ outcome, ...cell }) => ({
      ...cell,
      outcome:
        outcome.kind === 'verdict' && outcome.drops
          ? { ...outcome, verdict: 'notKnown', estimated: true, settleBySit: true, settleWith: [] }
          : outcome,
    }));
    const { change } = showSheet(<FitGrid ground="paper" />, { sheet: near });
    await user.click(hetty());
    expect(within(slip()).getByText(/^To settle it, sit on this foam/)).toBeVisible();
    const drop = { error: 0.13, sits: 2, lowMm: 10, bestMm: 12, highMm: 14, bottomsOut: 'no' as const };
    change({
      sheet: mapped(({ outcome, ...cell }) => ({
        ...cell,
        outcome: outcome.kind === 'verdict' ? { ...outcome, drops: [drop] } : outcome,
      })),
    });
    expect(within(slip()).getByText(/by 2 test sits, give or take 13 %/)).toBeVisible();
  });

  it('takes a fix as it was shown', async () => {
    const user = userEvent.setup();
    const taken = vi.fn<(fix: Fix) => void>();
    showSheet(<FitGrid ground="paper" />, { fixes: true, onTake: taken });
    await user.click(hetty());
    const [first] = await within(slip()).findAllByRole('button', { name: /^Try it: B1, .*seat.* to / });
    await user.click(first ?? document.body);
    const fix = taken.mock.calls[0]?.[0];
    const after = check(fix?.document ?? facingBenches).rows[0]?.cells.find(
      ({ ruleId }) => ruleId === 'SEAT-02',
    );
    expect(after?.outcome).toMatchObject({ kind: 'verdict', verdict: fix?.reaches });
    expect(fix?.toValue).toBeLessThan(fix?.fromValue ?? 0);
  });

  it('says when nothing changes it, and offers no change to who may not make one', async () => {
    const user = userEvent.setup();
    const { change } = showSheet(<FitGrid ground="paper" />, {
      sheet: check(facingBenches),
      fixesFor: () => [],
    });
    await user.click(hetty());
    expect(await within(slip()).findByText(/^No single number changes this/)).toBeVisible();
    change({ sheet: check(facingBenches) });
    expect(slip()).toBeVisible();
    expect(screen.queryByText('What would change it, and for whom')).toBeNull();
  });

  it('shows a carpenter the verdict and the margin, and nothing it rests on', async () => {
    const user = userEvent.setup();
    const bare = mapped(({ outcome, ...cell }) => {
      if (outcome.kind !== 'verdict') return { ...cell, outcome };
      const { kind, verdict, margin, estimated } = outcome;
      // What the server sends to people who do not see measures.
      return { ...cell, outcome: { kind, verdict, margin, estimated } as typeof outcome };
    });
    showSheet(<FitGrid ground="paper" />, { sheet: bare, detail: 'verdicts' });
    await user.click(hetty());
    expect(within(slip()).getByText('won’t fit')).toBeVisible();
    expect(within(slip()).queryByRole('table')).toBeNull();
    expect(within(slip()).queryByText(/in 100/)).toBeNull();
  });

  it('says “removed” for the numbers of a person who was removed, never 0', async () => {
    const user = userEvent.setup();
    const emptied = mapped(({ outcome, ...cell }) => {
      if (outcome.kind !== 'verdict') return { ...cell, outcome };
      const gone = { ...outcome, value: null, margin: null, probability: null, pass: {}, fail: {} };
      const { marginRange: _range, ...left } = { ...gone, bodyLedger: [], setLedger: [], settleWith: [] };
      return { ...cell, outcome: left as unknown as typeof outcome };
    });
    showSheet(<FitGrid ground="paper" order="margin" />, { sheet: emptied });
    expect(hetty()).toHaveAccessibleName('Hetty Vance, seat height, won’t fit, removed');
    await user.click(hetty());
    expect(within(slip()).getByText(/^The numbers behind it are removed/)).toBeVisible();
    expect(slip()).not.toHaveTextContent(/\b0″|NaN|null/);
    await user.click(seatHeight(/^Marcus/));
    expect(screen.getByRole('region')).not.toHaveTextContent(/\b0 in 100|NaN/);
  });
});

it('shades its right edge as long as columns stand behind it', () => {
  const wide = vi.spyOn(Element.prototype, 'scrollWidth', 'get').mockReturnValue(900);
  const box = vi.spyOn(Element.prototype, 'clientWidth', 'get').mockReturnValue(600);
  const { container } = showSheet(<FitGrid ground="paper" />);
  const shade = () => container.querySelector('[data-more-at-right]');
  expect(shade()).not.toBeNull();
  const scroller = screen.getByRole('grid').parentElement ?? document.body;
  scroller.scrollLeft = 300;
  fireEvent.scroll(scroller);
  expect(shade()).toBeNull();
  wide.mockRestore();
  box.mockRestore();
});

it('washes the ground of a cell whose verdict a change has turned, for two seconds', () => {
  vi.useFakeTimers();
  const { change } = showSheet(<FitGrid ground="paper" />);
  const bench = facingBenches.pieces.find(({ kind }) => kind === 'bench');
  const lower = setParameter(facingBenches, bench?.id ?? '', 'pressedSeatHeight', 385);
  if (!lower.ok) throw new Error('The seat cannot be lowered.');
  change({ sheet: check(lower.value) });
  expect(hetty()).toHaveAttribute('data-turned');
  act(() => {
    vi.advanceTimersByTime(2000);
  });
  expect(hetty()).not.toHaveAttribute('data-turned');
  vi.useRealTimers();
});

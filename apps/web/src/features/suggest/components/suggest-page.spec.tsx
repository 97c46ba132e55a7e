import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { HttpResponse, http } from 'msw';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import type { SearchAsked, SearchTold } from '../search.ts';
import { bay, searchAtOnce, Shown } from '../test/show-suggest.tsx';

/** A short search is really made, which takes a busy machine a while. */
const FOUND = { timeout: 15_000 };

const asked: SearchAsked[] = [];
let isHeld = false;

/** Does the worker's work on the spot; `isHeld` lets it speak once and then go on without an end. */
class WorkerAtHand {
  onmessage: ((event: { data: SearchTold }) => void) | null = null;
  postMessage(question: SearchAsked): void {
    asked.push(question);
    const told = searchAtOnce(question);
    setTimeout(() => this.onmessage?.({ data: { ...told, ended: !isHeld } }));
  }
  terminate(): void {
    this.onmessage = null;
  }
}

beforeEach(() => {
  asked.length = 0;
  isHeld = false;
  sessionStorage.clear();
  signInAs('owner');
  vi.stubGlobal('Worker', WorkerAtHand);
  server.use(
    http.get('*/populations', () => HttpResponse.json({ items: [], total: 0, page: 1, pageSize: 200 })),
  );
});
afterEach(() => vi.unstubAllGlobals());

const at = { path: '/w/:workshopId', at: `/w/${WORKSHOP_ID}` };
const show = (props: Parameters<typeof Shown>[0] = {}) => {
  const user = userEvent.setup();
  return { user, ...renderPage(<Shown {...props} />, at) };
};

describe('suggested dimensions', () => {
  it('starts with heights and depths, each within its range, and everyone served', async () => {
    const { user } = show();
    await user.click(screen.getByRole('button', { name: 'Search' }));
    const [first] = asked;
    expect(first?.free.map(({ dimensionId }) => dimensionId)).toEqual([
      'seat-height',
      'seat-depth',
      'table-height',
    ]);
    expect(first?.sitters.map(({ name }) => name)).toEqual(['Hetty', 'Marcus']);
    expect(first?.crowd).toMatchObject({ women: 50 });
  });

  it('searches by the keyboard for whom is ticked, with what the look demands held', async () => {
    const { user } = show();
    const hetty = screen.getByRole('checkbox', { name: /Hetty/ });
    hetty.focus();
    await user.keyboard(' ');
    screen.getByRole('checkbox', { name: /^Seat depth: B1 and B2/ }).focus();
    await user.keyboard(' ');
    const search = screen.getByRole('button', { name: 'Search' });
    search.focus();
    await user.keyboard('{Enter}');
    expect(asked[0]?.sitters.map(({ name }) => name)).toEqual(['Marcus']);
    expect(asked[0]?.free.map(({ dimensionId }) => dimensionId)).toEqual(['seat-height', 'table-height']);
  });

  it('does not let two choices move one number', () => {
    show();
    expect(screen.getByRole('checkbox', { name: /^Seat height, pressed: B1 and B2 with T1/ })).toBeDisabled();
  });

  it('gives answers with their costs by name, says who is to blame, and takes one as one step', async () => {
    const onReplace = vi.fn();
    const { user } = show({ onReplace });
    await user.click(screen.getByRole('button', { name: 'Search' }));
    const best = await screen.findByRole('region', { name: /^Best found/ }, FOUND);
    expect(within(best).getByText(/sitters to serve (is|are) at least tight in every check/)).toBeVisible();
    expect(within(best).getAllByText(/Hetty|Marcus/).length).toBeGreaterThan(0);
    expect(screen.getByText('No choice of these dimensions serves everyone')).toBeVisible();
    await user.click(within(best).getByRole('button', { name: /Take it/ }));
    expect(onReplace).toHaveBeenCalledTimes(1);
    const [document, step] = onReplace.mock.lastCall as [typeof bay, string];
    expect(document.pieces).not.toEqual(bay.pieces);
    expect(step).toMatch(/^Suggested: /);
    expect(screen.getByText(/Undo puts it back/)).toBeVisible();
  });

  it('keeps the look with a note, who said so and when', async () => {
    const onReplace = vi.fn();
    const { user } = show({ onReplace });
    await user.click(screen.getByRole('button', { name: 'Search' }));
    const reason = await screen.findByLabelText('Why it is kept', {}, FOUND);
    await user.click(screen.getByRole('button', { name: 'Keep as it is, with a note' }));
    expect(onReplace).not.toHaveBeenCalled();
    expect(reason).toHaveFocus();
    expect(reason).toHaveAccessibleDescription(/Say why it is kept\./);
    await user.type(reason, 'The photograph shows it.');
    await user.click(screen.getByRole('button', { name: 'Keep as it is, with a note' }));
    const [document] = onReplace.mock.lastCall as [typeof bay];
    expect(document.pieces).toEqual(bay.pieces);
    const [kept] = document.knownDifferences;
    expect(kept).toMatchObject({ reason: 'The photograph shows it.', by: 'Nell Abara' });
    expect(kept?.text).toMatch(/kept at .+ \(suggested .+\)/);
    expect(kept?.on).toMatch(/^\d{4}-\d\d-\d\d$/);
  });

  it('does not search with a survey that was removed, and says why', async () => {
    const id = '11111111-2222-4333-8444-555555555555';
    const survey = { id, name: 'The crew', women: 58, men: 60 };
    server.use(
      http.get('*/populations', () =>
        HttpResponse.json({ items: [survey], total: 1, page: 1, pageSize: 200 }),
      ),
      http.get(`*/populations/${id}`, () =>
        HttpResponse.json({ title: 'Not found', status: 404, code: 'not-found' }, { status: 404 }),
      ),
    );
    const { user } = show();
    await user.click(screen.getByRole('combobox', { name: 'Population' }));
    await user.click(await screen.findByRole('option', { name: /The crew/ }));
    expect(await screen.findByText(/This survey was removed from the workshop/)).toBeVisible();
    expect(screen.getByRole('button', { name: 'Search' })).toBeDisabled();
    expect(screen.getByText('Choose another population, or untick it, to search.')).toBeVisible();
    await user.click(screen.getByRole('checkbox', { name: /as many as can be of a population/ }));
    expect(screen.getByRole('button', { name: 'Search' })).toBeEnabled();
  });

  it('says once that a place has no body behind it', () => {
    const { unmount } = show({ placesWithoutBody: 2 });
    expect(screen.getByText(/^2 places have no body behind them/)).toHaveTextContent(/never count as served/);
    unmount();
    show();
    expect(screen.queryByText(/no body behind/)).toBeNull();
  });

  it('stops and keeps what is found', async () => {
    isHeld = true;
    const { user } = show();
    await user.click(screen.getByRole('button', { name: 'Search' }));
    await screen.findByRole('region', { name: /^Best found/ }, FOUND);
    expect(screen.getByRole('progressbar')).toBeVisible();
    expect(screen.queryByRole('button', { name: /Take it/ })).toBeNull();
    await user.click(screen.getByRole('button', { name: /Stop and keep/ }));
    expect(screen.queryByRole('progressbar')).toBeNull();
    expect(screen.getByText(/Stopped early after \d+ choices of at most \d+/)).toBeVisible();
    expect(screen.getAllByRole('button', { name: /Take it/ }).length).toBeGreaterThan(0);
  });

  it('goes on after a reload with what was tried', async () => {
    isHeld = true;
    const { user, unmount } = show();
    await user.click(screen.getByRole('button', { name: 'Search' }));
    await screen.findByRole('region', { name: /^Best found/ }, FOUND);
    unmount();
    isHeld = false;
    show();
    await waitFor(() => expect(asked).toHaveLength(2));
    expect(asked[1]?.known.length).toBeGreaterThan(10);
    expect(await screen.findByRole('region', { name: /^Best found/ }, FOUND)).toBeVisible();
  });

  it('is for those who decide the dimensions', () => {
    show({ canEdit: false });
    expect(screen.queryByRole('button', { name: 'Search' })).toBeNull();
    expect(screen.getByText(/owner and the designers/)).toBeVisible();
  });
});

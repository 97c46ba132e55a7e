import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { HttpResponse, http } from 'msw';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { OwnSurveys } from './own-surveys.tsx';

const crew = {
  id: '0a0a0a0a-0000-4000-8000-000000000001',
  name: 'The crew',
  source: 'Measured by Nell in May.',
  women: 40,
  men: 45,
  leftOut: 2,
  read: ['stature', 'weight_kg'],
  estimated: [],
  rowsKept: true,
  addedBy: { id: 'u1', name: 'Nell Abara' },
  addedAt: '2026-05-20T10:00:00Z',
};

describe('surveys of one’s own', () => {
  let items: object[] = [];
  let gone: string[] = [];
  beforeEach(() => {
    signInAs('owner');
    items = [crew];
    gone = [];
    server.use(
      http.get('*/populations', () =>
        HttpResponse.json({ items, total: items.length, page: 1, pageSize: 200 }),
      ),
      http.get(`*/populations/${crew.id}/studies`, () =>
        HttpResponse.json({
          items: [
            { setId: 's1', setName: 'Dining car', productionName: 'Supper', studies: 3, unfinished: 1 },
          ],
        }),
      ),
      http.delete(`*/populations/${crew.id}/rows`, () => {
        items = [{ ...crew, rowsKept: false }];
        return new HttpResponse(null, { status: 204 });
      }),
      http.delete(`*/populations/${crew.id}`, () => {
        gone.push(crew.id);
        items = [];
        return new HttpResponse(null, { status: 204 });
      }),
    );
  });

  async function open() {
    const user = userEvent.setup({ delay: null });
    const onRemoved = vi.fn();
    renderPage(<OwnSurveys onRemoved={onRemoved} />, { path: '/w/:workshopId', at: `/w/${WORKSHOP_ID}` });
    await user.click(await screen.findByRole('button', { name: 'Your own surveys: 1' }));
    return { user, onRemoved };
  }

  it('says before one is removed where it was counted with and what stays, and removes it', async () => {
    const { user, onRemoved } = await open();
    await user.click(screen.getByRole('button', { name: 'Remove The crew' }));
    const dialog = await screen.findByRole('dialog', { name: 'Remove The crew?' });
    expect(
      await within(dialog).findByText('Dining car, Supper: 3 counts, 1 of them under way; it goes on'),
    ).toBeVisible();
    expect(within(dialog).getByText(/Counts that were made with it stay/)).toBeVisible();
    expect(gone).toEqual([]);
    await user.click(within(dialog).getByRole('button', { name: 'Remove' }));
    await vi.waitFor(() => expect(onRemoved).toHaveBeenCalledWith(crew.id));
    expect(gone).toEqual([crew.id]);
    await vi.waitFor(() => expect(screen.queryByRole('button', { name: /Your own surveys/ })).toBeNull());
  });

  it('forgets kept rows and keeps the statistics', async () => {
    const { user } = await open();
    expect(screen.getByText(/The measured rows are kept, too/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Keep statistics only of The crew' }));
    expect(await screen.findByText(/Only statistics are kept/)).toBeVisible();
  });

  it('is nothing that a reader sees', () => {
    signInAs('reviewer');
    renderPage(<OwnSurveys onRemoved={vi.fn()} />, { path: '/w/:workshopId', at: `/w/${WORKSHOP_ID}` });
    expect(screen.queryByRole('button', { name: /Your own surveys/ })).toBeNull();
  });
});

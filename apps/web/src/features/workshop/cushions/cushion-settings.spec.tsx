import { NO_OWN_CUSHIONS, type WorkshopCushions } from '@settlewright/geometry';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import { renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { CushionSettings } from './cushion-settings.tsx';

const SEAM = 'Seam allowance';

function show(canEdit: boolean, settings: WorkshopCushions = NO_OWN_CUSHIONS) {
  signInAs(canEdit ? 'designer' : 'carpenter');
  const sent: unknown[] = [];
  const kept = { number: 3, settings, changedAt: '2025-03-03T10:00:00Z', changedByName: 'Nell Abara' };
  server.use(
    http.get('*/api/workshops/:workshopId/cushion-settings', () => HttpResponse.json(kept)),
    http.put('*/api/workshops/:workshopId/cushion-settings', async ({ request }) => {
      const body = (await request.json()) as { settings: WorkshopCushions };
      sent.push(body);
      return HttpResponse.json({ ...kept, number: 4, settings: body.settings });
    }),
  );
  renderPage(
    <CushionSettings
      workshop={{
        id: WORKSHOP_ID,
        name: 'Ropewalk Scenic',
        role: canEdit ? 'designer' : 'carpenter',
        isDemo: false,
        canEdit,
        isOwner: false,
      }}
    />,
  );
  return sent;
}

it('shows what is in force with its source to whoever may not change it', async () => {
  show(false, { allowancesMm: { seam: 16 }, foams: [] });
  const seam = (await screen.findByText(SEAM)).closest('div')!;
  expect(within(seam).getByText('(shop rule)')).toBeVisible();
  expect(screen.getByText(/Last changed on 3 March 2025 by Nell Abara/)).toBeVisible();
  expect(screen.queryByRole('textbox')).toBeNull();
  expect(screen.queryByRole('button', { name: 'Add a foam' })).toBeNull();
});

it('sends what was typed, and leaves out what is as usual', async () => {
  const sent = show(true);
  await userEvent.type(await screen.findByLabelText(SEAM), '5/8');
  await userEvent.click(screen.getByRole('button', { name: 'Save the allowances' }));
  await waitFor(() => expect(sent).toHaveLength(1));
  expect(sent[0]).toEqual({
    baseNumber: 3,
    settings: { allowancesMm: { seam: expect.closeTo(15.875, 6) as number }, foams: [] },
  });
});

it('sends nothing while a field cannot be read', async () => {
  const sent = show(true);
  await userEvent.type(await screen.findByLabelText(SEAM), '9 ft');
  await userEvent.click(screen.getByRole('button', { name: 'Save the allowances' }));
  expect(screen.getByLabelText(SEAM)).toHaveAttribute('aria-invalid', 'true');
  expect(sent).toEqual([]);
});

it('adds a foam of the shop with density and firmness in the units of the page', async () => {
  const sent = show(true);
  await userEvent.click(await screen.findByRole('button', { name: 'Add a foam' }));
  const dialog = await screen.findByRole('dialog');
  await userEvent.type(within(dialog).getByLabelText('Name of the grade'), 'dense booth');
  await userEvent.clear(within(dialog).getByLabelText('Firmness'));
  await userEvent.type(within(dialog).getByLabelText('Firmness'), '60');
  await userEvent.click(within(dialog).getByRole('button', { name: 'Add' }));
  await waitFor(() => expect(sent).toHaveLength(1));
  const { foams } = (sent[0] as { settings: WorkshopCushions }).settings;
  expect(foams).toHaveLength(1);
  expect(foams[0]).toMatchObject({ name: 'dense booth', use: 'seat', layers: [], wrapMm: 0 });
  expect(foams[0]!.ifd25N).toBeCloseTo(60 * 4.4482216, 4);
});

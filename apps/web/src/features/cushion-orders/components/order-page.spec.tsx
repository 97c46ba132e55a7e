import { plainCover } from '@settlewright/geometry';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { beforeEach, describe, expect, it } from 'vitest';
import { PRODUCTION_ID, renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import type { Order } from '../order.ts';
import { LIFE, ORDER, SENT_ORDER } from '../test/orders.ts';
import { OrderPage } from './order-page.tsx';

const AT = '*/api/workshops/:workshopId/productions/:productionId/orders/:orderId';
const BOOK = '*/api/workshops/:workshopId/upholsterers';
const page = (items: unknown[]) => ({ items, total: items.length, page: 1, pageSize: 200 });
const FENNIMORE = { id: 'u9', name: 'Fennimore & Daughter', email: 'odile@fennimore.example' };

function show(order: Order) {
  server.use(
    http.get(AT, () => HttpResponse.json(order)),
    http.get(`${AT}/messages`, () => HttpResponse.json(page([]))),
    http.get(`${AT}/life`, () => HttpResponse.json(LIFE)),
    http.get(BOOK, () => HttpResponse.json(page([FENNIMORE]))),
  );
  const path = { workshopId: WORKSHOP_ID, productionId: PRODUCTION_ID, orderId: order.id };
  return renderPage(<OrderPage path={path} />, {
    path: '/w/:workshopId/p/:productionId/orders/:orderId',
    at: `/w/${WORKSHOP_ID}/p/${PRODUCTION_ID}/orders/${order.id}`,
  });
}

describe('OrderPage', () => {
  beforeEach(() => signInAs('owner'));

  it('does not send an order to nobody', async () => {
    const user = userEvent.setup();
    const sent: unknown[] = [];
    server.use(
      http.post(`${AT}/send`, async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json(SENT_ORDER);
      }),
    );
    show(ORDER);
    await user.click(await screen.findByRole('button', { name: 'Send the order' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Send the order' }));
    await user.type(dialog.getByLabelText(/^Message/), 'Cloth leaves us on the 10th.');
    await user.click(dialog.getByRole('button', { name: 'Send the order' }));
    expect(dialog.getByText(/^Nobody was chosen/)).toBeVisible();
    expect(dialog.getByRole('combobox', { name: 'To' })).toBeInvalid();
    expect(dialog.getByRole('combobox', { name: 'To' })).toHaveAccessibleDescription(/^Nobody was chosen/);
    expect(sent).toEqual([]);
    await user.click(dialog.getByRole('combobox', { name: 'To' }));
    await user.click(await screen.findByRole('option', { name: /Fennimore/ }));
    await user.click(dialog.getByRole('button', { name: 'Send the order' }));
    await waitFor(() =>
      expect(sent).toEqual([{ upholstererId: 'u9', message: 'Cloth leaves us on the 10th.' }]),
    );
  });

  it.each([
    [ORDER, /^Not said yet: welt, needed-by date\. .* about them\.$/],
    [{ ...ORDER, neededBy: '2026-02-26' }, /^Not said yet: welt\. .* about it\.$/],
    [{ ...ORDER, spec: { ...ORDER.spec, welt: 'Self, 10 mm cord' }, neededBy: '2026-02-26' }, undefined],
  ])('says before sending what the order leaves open', async (order, words) => {
    const user = userEvent.setup();
    show(order);
    await user.click(await screen.findByRole('button', { name: 'Send the order' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Send the order' }));
    if (words === undefined) expect(dialog.queryByText(/^Not said yet/)).toBeNull();
    else expect(dialog.getByText(words)).toBeVisible();
    expect(dialog.getByLabelText('Message (optional)')).toBeVisible();
  });

  it('names before sending what cannot be made, and asks for no cover where cloths are said', async () => {
    const user = userEvent.setup();
    const [first, ...rest] = ORDER.cushions;
    show({
      ...ORDER,
      spec: { ...ORDER.spec, cover: '' },
      covers: [plainCover('plum moquette')],
      cushions: [{ ...first!, faults: ['a waterfall front wraps a plain rectangle only'] }, ...rest],
    });
    await user.click(await screen.findByRole('button', { name: 'Send the order' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Send the order' }));
    expect(dialog.getByText('C1 cannot be made as asked')).toBeVisible();
    expect(dialog.getByText(/^C1: a waterfall front wraps a plain rectangle only\./)).toBeVisible();
    expect(dialog.getByText(/^Not said yet/)).not.toHaveTextContent('cover');
  });

  it('says of each cushion what the camera sees, what holds it and what its maker is told', async () => {
    const [first, ...rest] = ORDER.cushions;
    const told = { cameraSides: ['front' as const], holdDown: 'snaps' as const, notes: 'Pile to the front.' };
    show({ ...ORDER, covers: [plainCover('green cord')], cushions: [{ ...first!, ...told }, ...rest] });
    const cushion = within(await screen.findByRole('region', { name: 'Cushions C1' }));
    const said = (name: string) => cushion.getByText(name, { selector: 'dt' }).nextElementSibling;
    expect(said('Cover')).toHaveTextContent('green cord; Plum moquette');
    expect(said('Camera')).toHaveTextContent('sees the front');
    expect(said('Hold-down')).toHaveTextContent('snaps, studs on the wood');
    expect(said('Notes')).toHaveTextContent('Pile to the front.');
  });

  it.each([
    ['odile@fennimore.example', '', 'odile@fennimore.example'],
    ['Fennimore Upholstery', 'Fennimore Upholstery', ''],
  ])('puts %s into the field it belongs to', async (typed, business, email) => {
    const user = userEvent.setup();
    show(ORDER);
    await user.click(await screen.findByRole('button', { name: 'Send the order' }));
    const sending = within(await screen.findByRole('dialog', { name: 'Send the order' }));
    await user.type(sending.getByRole('combobox', { name: 'To' }), typed);
    await user.click(await screen.findByRole('option', { name: /^Add “/ }));
    const adding = within(await screen.findByRole('dialog', { name: 'Add an upholsterer' }));
    expect(adding.getByLabelText('Business')).toHaveValue(business);
    expect(adding.getByLabelText('E-mail')).toHaveValue(email);
  });

  it('puts what the server refuses beside its field and keeps what was typed', async () => {
    const user = userEvent.setup();
    server.use(
      http.patch(AT, () =>
        HttpResponse.json(
          {
            code: 'validation',
            title: 'Not taken',
            detail: '',
            fields: [
              { path: 'spec.welt', code: 'too-long', message: 'The welt may have 200 letters.' },
              { path: 'cushionMarks', code: 'unknown', message: 'There is no cushion C9 in revision B.' },
            ],
          },
          { status: 400 },
        ),
      ),
    );
    show(ORDER);
    await user.click(await screen.findByRole('button', { name: 'Change the order' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Change the order' }));
    await user.type(dialog.getByLabelText('Cushions'), 'C9');
    await user.click(dialog.getByRole('button', { name: 'Change the order' }));
    await waitFor(() =>
      expect(dialog.getByLabelText('Cushions')).toHaveAccessibleDescription(/no cushion C9 in revision B/),
    );
    expect(dialog.getByLabelText('Welt')).toHaveAccessibleDescription('The welt may have 200 letters.');
    expect(dialog.getByLabelText('Cushions')).toHaveValue('C9');
  });

  it('reads the order and the thread again when the window has the focus again', async () => {
    show(SENT_ORDER);
    expect(await screen.findByText('The mail could not be sent.')).toBeVisible();
    const message = {
      side: 'upholsterer',
      authorName: 'Odile',
      text: 'All clear.',
      at: '2026-02-01T08:00:00Z',
    };
    server.use(
      http.get(AT, () =>
        HttpResponse.json({ ...SENT_ORDER, lastMail: { ...SENT_ORDER.lastMail, state: 'sent' } }),
      ),
      http.get(`${AT}/messages`, () => HttpResponse.json(page([message]))),
    );
    window.dispatchEvent(new Event('visibilitychange'));
    expect(await screen.findByText(/^The mail went out/)).toBeVisible();
    expect(await screen.findByText('All clear.')).toBeVisible();
  });

  it('offers to send a mail again that did not go out', async () => {
    const user = userEvent.setup();
    let again = 0;
    server.use(
      http.post(`${AT}/mail/send-again`, () => {
        again += 1;
        return HttpResponse.json(SENT_ORDER);
      }),
    );
    show(SENT_ORDER);
    expect(await screen.findByText('The mail could not be sent.')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Send the mail again' }));
    await waitFor(() => expect(again).toBe(1));
  });

  it('shows a reviewer the order and nothing to change', async () => {
    signInAs('reviewer');
    show({ ...SENT_ORDER, lastMail: null });
    expect(await screen.findByRole('heading', { name: 'Dining car, seat cushions' })).toBeVisible();
    expect(screen.queryByRole('button', { name: /Send|Change|Cancel|Record|Revoke/ })).toBeNull();
    expect(screen.queryByRole('textbox')).toBeNull();
  });

  it('hands out lists and cutting files for the programs of the shop', async () => {
    const user = userEvent.setup();
    const asked: string[] = [];
    server.use(
      http.get(`${AT}/:file`, ({ params }) => {
        asked.push(String(params.file));
        return params.file === 'panels.dxf'
          ? HttpResponse.json({ code: 'gone', title: 'The revision is gone.' }, { status: 410 })
          : new HttpResponse('mark');
      }),
    );
    show(ORDER);
    const files = within(await screen.findByRole('region', { name: 'Files for the shop' }));
    await user.click(files.getByRole('button', { name: 'Schedule (CSV)' }));
    await waitFor(() => expect(asked).toContain('schedule.csv'));
    await user.click(files.getByRole('button', { name: 'Outlines and panels (DXF)' }));
    expect(await files.findByText('The revision is gone.')).toBeVisible();
  });
});

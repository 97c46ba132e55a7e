import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { beforeEach, describe, expect, it } from 'vitest';
import type { OrderLife } from '@/lib/contract.ts';
import { PRODUCTION_ID, renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { CUSHIONS, LIFE, PUBLIC_ORDER, QUOTE, SENT_ORDER } from '../test/orders.ts';
import { UpholstererPage } from '../components/upholsterer-page.tsx';
import { ShopLife } from './shop-life.tsx';

const OUTLINE = CUSHIONS[0]!.outline.map((corner) => ({ ...corner, at: [...corner.at] }));
const LINK = '*/api/link/:token';
const AT = '*/api/workshops/:workshopId/productions/:productionId/orders/:orderId';

/** Serves a life and keeps what is posted to the steps below it. */
function serve(at: string, life: Partial<OrderLife>) {
  const posted: [string, unknown][] = [];
  const whole = { ...LIFE, ...life };
  server.use(
    http.get(LINK, () => HttpResponse.json(PUBLIC_ORDER)),
    http.get(`${at}/life`, () => HttpResponse.json(whole)),
    http.post(`${at}/*`, async ({ request }) => {
      const path = new URL(request.url).pathname;
      const text = await request.text();
      posted.push([
        path.split(/orders\/[^/]+\/|link\/[^/]+\//)[1] ?? '',
        text === '' ? null : JSON.parse(text),
      ]);
      return HttpResponse.json(whole);
    }),
  );
  return posted;
}

const showPage = () => renderPage(<UpholstererPage token="secret-token" />);
const showShop = (order = SENT_ORDER) => {
  signInAs('owner');
  const path = { workshopId: WORKSHOP_ID, productionId: PRODUCTION_ID, orderId: order.id };
  return renderPage(<ShopLife path={path} order={order} />);
};

describe("the upholsterer's page", () => {
  beforeEach(() => localStorage.clear());

  it('takes a price line by line, adds it up, and sends it for what was read', async () => {
    const user = userEvent.setup();
    const posted = serve(LINK, {});
    showPage();
    const price = within(await screen.findByRole('region', { name: 'Price' }));
    await user.click(price.getByRole('button', { name: 'Send the quote' }));
    expect(price.getByLabelText('Each')).toHaveAccessibleDescription(/is no amount/);
    expect(posted).toEqual([]);
    await user.type(price.getByLabelText('For'), 'Seat cushion');
    await user.clear(price.getByLabelText('How many'));
    await user.type(price.getByLabelText('How many'), '4');
    await user.type(price.getByLabelText('Each'), '465');
    await user.type(price.getByLabelText('Good until'), '2099-02-19');
    await user.type(price.getByLabelText('Who quotes, typed'), 'Odile');
    expect(price.getByText('Total $1,860.00')).toBeVisible();
    await user.click(price.getByRole('button', { name: 'Send the quote' }));
    await waitFor(() => expect(posted).toHaveLength(1));
    expect(posted[0]).toEqual([
      'quote',
      expect.objectContaining({
        name: 'Odile',
        sentAt: PUBLIC_ORDER.sentAt,
        currency: 'USD',
        lines: [{ text: 'Seat cushion', quantity: 4, unitMinor: 46_500 }],
      }),
    ]);
  });

  it('says what changed side by side, and that it asks for a new word', async () => {
    serve(LINK, {
      earlierRevision: 'A',
      changes: [
        { mark: 'C1', field: 'width', before: [{ mm: 1016 }], after: [{ mm: 1066.8 }] },
        { mark: null, field: 'cover', before: [{ text: 'plum moquette' }], after: [] },
        {
          ...{ mark: 'C1', field: 'outline', before: [{ text: 'plain rectangle' }] },
          after: [{ text: 'notch ' }, { mm: 50.8 }],
          outlines: { before: OUTLINE, after: OUTLINE },
        },
        { mark: 'C2', field: 'depth', before: [{ mm: 762 }], after: [{ mm: 762.4 }] },
      ],
    });
    showPage();
    const changed = within(await screen.findByRole('region', { name: 'What changed' }));
    expect(changed.getByText('Revision B replaces revision A.')).toBeVisible();
    const rows = changed.getAllByRole('row').map((row) => row.textContent);
    expect(rows[1]).toMatch(/^C1, width.*40.*42/);
    expect(rows[3]).toMatch(/^C1, outlineplain rectanglenotch 2″$/);
    expect(changed.getAllByRole('row')[3]!.querySelectorAll('svg')).toHaveLength(2);
    expect(rows[2]).toBe('Coverplum moquettenothing');
    expect(rows[4]).toMatch(/, 0\.4 mm more$/);
  });

  it('lets the batch wait for the word on the first article', async () => {
    serve(LINK, { firstArticle: 'waiting', upholstererMayQuote: false });
    showPage();
    expect(await screen.findByText(/The batch waits for its word/)).toBeVisible();
    expect(screen.queryByRole('button', { name: /batch is in work/ })).toBeNull();
  });

  it('marks how far the work is with a typed name', async () => {
    const user = userEvent.setup();
    const posted = serve(LINK, { upholstererMayMark: ['shipped'], upholstererMayQuote: false });
    showPage();
    await user.click(await screen.findByRole('button', { name: 'It is shipped' }));
    expect(posted).toEqual([]);
    await user.type(screen.getByLabelText('Who says so, typed'), 'Odile');
    await user.type(screen.getByLabelText(/^Carrier and number/), 'Two parcels');
    await user.click(screen.getByRole('button', { name: 'It is shipped' }));
    await waitFor(() =>
      expect(posted).toEqual([['state', { to: 'shipped', name: 'Odile', note: 'Two parcels' }]]),
    );
  });
});

describe("the workshop's side", () => {
  it('accepts a quote that is in force, and declines with a reason', async () => {
    const user = userEvent.setup();
    const posted = serve(AT, { quotes: [QUOTE] });
    showShop();
    await user.click(await screen.findByRole('button', { name: 'Decline' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Decline the quote' }));
    await user.click(dialog.getByRole('button', { name: 'Decline the quote' }));
    expect(dialog.getByLabelText('Reason')).toHaveAccessibleDescription(/^No reason/);
    await user.click(dialog.getByRole('button', { name: 'Leave it open' }));
    await user.click(screen.getByRole('button', { name: 'Accept the quote' }));
    await waitFor(() => expect(posted).toEqual([['quotes/q1/accept', null]]));
  });

  it('offers nothing to accept of a quote for what was sent before', async () => {
    serve(AT, { quotes: [{ ...QUOTE, inForce: false }] });
    showShop();
    expect(await screen.findByText(/cannot be accepted any more/)).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Accept the quote' })).toBeNull();
  });

  it('pays online only where there is an account, and by hand always', async () => {
    serve(AT, { quotes: [{ ...QUOTE, state: 'accepted' }] });
    showShop();
    expect(await screen.findByRole('button', { name: 'Put a payment down' })).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Pay a deposit' })).toBeNull();
  });

  it('inspects what arrived; an empty size is sent as not measured', async () => {
    const user = userEvent.setup();
    const posted = serve(AT, {});
    showShop({ ...SENT_ORDER, state: 'shipped' });
    await user.click(await screen.findByRole('button', { name: 'Inspect the delivery' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Inspect the delivery' }));
    const [first] = SENT_ORDER.cushions;
    await user.type(dialog.getByLabelText(`${first!.mark}, width`), '1000mm');
    await user.tab();
    await user.click(dialog.getByRole('radio', { name: /Rejected/ }));
    await user.type(dialog.getByLabelText(/^Note/), 'Too wide.');
    await user.click(dialog.getByRole('button', { name: 'Reject the delivery' }));
    await waitFor(() => expect(posted).toHaveLength(1));
    const body = posted[0]![1] as { cushions: object[] };
    expect(body).toMatchObject({ kind: 'received', outcome: 'rejected', note: 'Too wide.' });
    expect(body.cushions[0]).toMatchObject({ mark: first!.mark, widthMm: 1000, depthMm: null });
  });

  it('takes a photograph into the sheet, and says a refusal at its field', async () => {
    const user = userEvent.setup();
    const sent: unknown[] = [];
    const photo = {
      ...{ id: 'f9', side: 'workshop', byName: 'Nell Abara', at: '2026-02-01T08:00:00Z', current: true },
      ...{ name: 'seam.jpg', type: 'image/jpeg', bytes: 9, widthPx: 1, heightPx: 1, cushionMark: null },
    };
    serve(AT, {});
    const message = 'C1 is out or was not measured: say why it is accepted';
    server.use(
      http.post(`${AT}/files`, () => {
        const added = { ...LIFE, files: [photo] };
        server.use(http.get(`${AT}/life`, () => HttpResponse.json(added)));
        return HttpResponse.json(added);
      }),
      http.post(`${AT}/inspections`, async ({ request }) => {
        sent.push(await request.json());
        const fields = [{ path: 'note', code: 'reason-missing', message }];
        return HttpResponse.json(
          { code: 'invalid', title: 'Some fields', status: 400, fields },
          { status: 400 },
        );
      }),
    );
    showShop({ ...SENT_ORDER, state: 'shipped' });
    await user.click(await screen.findByRole('button', { name: 'Inspect the delivery' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Inspect the delivery' }));
    const file = new File(['x'], 'seam.png', { type: 'image/png' });
    await user.upload(dialog.getByLabelText('Add a photograph'), file);
    expect(await dialog.findByRole('checkbox', { name: 'seam.jpg' })).toBeChecked();
    await user.click(dialog.getByRole('button', { name: 'Accept the delivery' }));
    await waitFor(() =>
      expect(dialog.getByLabelText(/^Note/)).toHaveAccessibleDescription(new RegExp(message)),
    );
    expect(dialog.queryByText('Some fields')).toBeNull();
    expect(sent).toMatchObject([{ photoIds: ['f9'] }]);
  });

  it('sends a letter in doubt again, and only such a one', async () => {
    const user = userEvent.setup();
    const mail = { id: 'm1', subject: 'Cushion order 1', at: '2026-02-01T08:00:00Z' };
    const posted = serve(AT, {
      mails: [
        { ...mail, state: 'perhaps-sent' },
        { ...mail, id: 'm2', state: 'sent' },
      ],
    });
    showShop();
    await user.click(await screen.findByRole('button', { name: 'Mails to the upholsterer' }));
    expect(screen.getByText(/perhaps sent/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Send again' }));
    await waitFor(() => expect(posted).toEqual([['mails/m1/send-again', null]]));
  });
});

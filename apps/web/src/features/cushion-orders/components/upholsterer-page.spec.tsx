import { plainCover } from '@settlewright/geometry';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { beforeEach, describe, expect, it } from 'vitest';
import { renderPage } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { LIFE, PUBLIC_ORDER } from '../test/orders.ts';
import { UpholstererPage } from './upholsterer-page.tsx';

const LINK = '*/api/link/:token';
const refusal = (status: number, code: string, detail: string) =>
  HttpResponse.json({ code, title: detail, detail, status }, { status });

beforeEach(() => server.use(http.get(`${LINK}/life`, () => HttpResponse.json(LIFE))));

const show = () => renderPage(<UpholstererPage token="secret-token" />);
const say = () => screen.findByRole('button', { name: 'I can make this as drawn' });

describe('the order behind a private link', () => {
  it('shows sizes and drawings without an account', async () => {
    server.use(http.get(LINK, () => HttpResponse.json(PUBLIC_ORDER)));
    show();
    expect(await screen.findByRole('heading', { name: 'Dining car, seat cushions' })).toBeVisible();
    expect(screen.getAllByRole('img', { name: /plan with measures/ })).not.toHaveLength(0);
    expect(screen.getAllByText('Plum moquette')[0]).toBeVisible();
    const paper = within(screen.getByRole('region', { name: 'The paper' }));
    for (const [name, file] of [
      ['Drawing pack, PDF', 'spec.pdf'],
      ['Schedule (CSV)', 'schedule.csv'],
      ['Outlines and panels (DXF)', 'panels.dxf'],
    ] as const)
      expect(paper.getByRole('link', { name })).toHaveAttribute('href', `/api/link/secret-token/${file}`);
  });

  it('is in millimetres throughout where the workshop works in them, with inches beside the size', async () => {
    server.use(http.get(LINK, () => HttpResponse.json({ ...PUBLIC_ORDER, units: 'millimetres' })));
    show();
    const [group] = await screen.findAllByRole('region', { name: /^Cushions / });
    await waitFor(() => expect(group).toHaveTextContent(/± 6\smm/));
    expect(group).toHaveTextContent(/seam to seam\. .* × .*″, ± 6/);
    expect(group).toHaveTextContent(/kg\/m³, firmness \d+\sN/);
    expect(group).toHaveTextContent(/LoadedSinks \d+\smm \(.*under 50\skg, .*\(estimate, give or take 30 %/);
    expect(group).toHaveTextContent(/\d+\smm \(\d+\.\d\sm\) for 2 seams/);
    expect(group).not.toHaveTextContent(/lb|¼″/);
  });

  it('is read in the units and printed on the paper that they choose, as sent unless they do', async () => {
    const user = userEvent.setup();
    server.use(http.get(LINK, () => HttpResponse.json(PUBLIC_ORDER)));
    show();
    const paper = within(await screen.findByRole('region', { name: 'The paper' }));
    await user.click(paper.getByRole('button', { name: /^Paper, Letter/ }));
    await user.click(await screen.findByRole('option', { name: 'A4' }));
    await user.click(paper.getByRole('button', { name: /^Units, As sent/ }));
    await user.click(await screen.findByRole('option', { name: 'Millimetres' }));
    expect(paper.getByRole('link', { name: 'Drawing pack, PDF' })).toHaveAttribute(
      'href',
      '/api/link/secret-token/spec.pdf?paper=a4&units=millimetres&roundTo=8',
    );
    expect(screen.getAllByRole('region', { name: /^Cushions / })[0]).toHaveTextContent(/kg\/m³/);
    await user.click(paper.getByRole('button', { name: /^Units, Millimetres/ }));
    await user.click(await screen.findByRole('option', { name: /^As sent/ }));
    expect(screen.getAllByRole('region', { name: /^Cushions / })[0]).toHaveTextContent(/lb\/ft³/);
  });

  it('says its cloths and where a cushion is to look used', async () => {
    const [first, ...others] = PUBLIC_ORDER.cushions;
    const wear = [{ place: 'front-edge' as const, look: 'worn-through' as const }];
    const covers = [{ ...plainCover('plum moquette'), direction: 'railroad' as const }];
    const order = { ...PUBLIC_ORDER, covers, cushions: [{ ...first!, wear }, ...others] };
    server.use(http.get(LINK, () => HttpResponse.json(order)));
    show();
    const cloths = await screen.findByRole('region', { name: 'Cloths' });
    expect(cloths).toHaveTextContent(/plum moquette: 54″ wide, railroaded, .*of every cushion/);
    const marked = screen.getByRole('list', { name: `Marked wear of ${first!.mark}` });
    expect(marked).toHaveTextContent('A1 front edge: worn through');
  });

  it('is agreed to with a typed name, for exactly what was sent', async () => {
    const user = userEvent.setup();
    const asked: unknown[] = [];
    server.use(
      http.get(LINK, () => HttpResponse.json(PUBLIC_ORDER)),
      http.post(`${LINK}/acknowledge`, async ({ request }) => {
        asked.push(await request.json());
        const acknowledgement = { name: 'Odile Fennimore', at: '2026-02-01T08:00:00Z', revisionLetter: 'B' };
        return HttpResponse.json({ ...PUBLIC_ORDER, acknowledgement });
      }),
    );
    show();
    await user.click(await say());
    expect(screen.getByLabelText('Your name, typed')).toHaveAccessibleDescription(/^No name was typed/);
    expect(asked).toEqual([]);
    await user.type(screen.getByLabelText('Your name, typed'), 'Odile Fennimore');
    await user.click(await say());
    expect(await screen.findByText(/Odile Fennimore can make revision B as drawn/)).toBeVisible();
    expect(asked).toEqual([{ name: 'Odile Fennimore', sentAt: PUBLIC_ORDER.sentAt }]);
  });

  it('reads the order anew when the workshop sent it again meanwhile, and keeps the name', async () => {
    const user = userEvent.setup();
    let revisionLetter = 'B';
    server.use(
      http.get(LINK, () => HttpResponse.json({ ...PUBLIC_ORDER, revisionLetter })),
      http.post(`${LINK}/acknowledge`, () => {
        revisionLetter = 'C';
        return refusal(409, 'order-sent-again', 'Sent again.');
      }),
    );
    show();
    await user.type(await screen.findByLabelText('Your name, typed'), 'Odile');
    await user.click(await say());
    expect(await screen.findByText(/sent this order again while you were reading/)).toBeVisible();
    expect(await screen.findByText(/^Order 1, revision C/)).toBeVisible();
    expect(screen.getByLabelText('Your name, typed')).toHaveValue('Odile');
  });

  it('keeps what was written when it could not be sent, also on the next visit', async () => {
    const user = userEvent.setup();
    let down = true;
    const text = 'Which day does the moquette reach me?';
    server.use(
      http.get(LINK, () => HttpResponse.json(PUBLIC_ORDER)),
      http.post(`${LINK}/reply`, () => {
        if (down) return refusal(429, 'too-many-requests', 'Too many messages. Wait a minute.');
        const message = { side: 'upholsterer', authorName: 'Odile', text, at: '2026-02-01T08:00:00Z' };
        return HttpResponse.json({ ...PUBLIC_ORDER, messages: [message] });
      }),
    );
    const first = show();
    const box = () => screen.findByLabelText('Ask or answer the workshop');
    await user.type(await box(), text);
    await user.click(screen.getByRole('button', { name: 'Send to the workshop' }));
    expect(await screen.findByText('Too many messages. Wait a minute.')).toBeVisible();
    expect(await box()).toHaveValue(text);
    first.unmount();
    show();
    expect(await box()).toHaveValue(text);
    down = false;
    await user.click(screen.getByRole('button', { name: 'Send to the workshop' }));
    expect(
      await within(await screen.findByRole('list', { name: 'Messages' })).findByText(text),
    ).toBeVisible();
    expect(await box()).toHaveValue('');
  });
});

describe('a link that shows nothing', () => {
  it.each([
    [410, 'link-expired', 'This link has expired', /Ask the workshop to mail a new one/],
    [410, 'link-revoked', 'This link was ended by the workshop', /Ask the workshop/],
    [404, 'not-found', 'No order stands behind this link', /Open it from the mail again/],
  ])('says so for %i %s', async (status, code, title, about) => {
    server.use(http.get(LINK, () => refusal(status, code, 'detail')));
    show();
    expect(await screen.findByRole('heading', { name: title })).toBeVisible();
    expect(screen.getByText(about)).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Try again' })).toBeNull();
  });
});

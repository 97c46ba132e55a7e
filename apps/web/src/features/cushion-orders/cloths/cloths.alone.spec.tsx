import { layCloth, orderCoverSchema, plainCover, type ClothOfOrder } from '@settlewright/geometry';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { PRODUCTION_ID, renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import type { Order } from '../order.ts';
import { CUSHIONS, ORDER } from '../test/orders.ts';
import { draftOf, readCloth } from './cloth-draft.ts';
import ClothsSection from './cloths-section.tsx';

vi.mock('./ask-lay.ts', () => ({
  askLay: (cloth: ClothOfOrder) => Promise.resolve(layCloth(structuredClone(cloth), 40) ?? null),
}));

const AT = '*/api/workshops/:workshopId/productions/:productionId/orders/:orderId';
const MOQUETTE = {
  ...plainCover('Plum moquette'),
  ...{ pricePerMetreMinor: 5249, currency: 'USD', direction: 'up-roll' as const },
  ...{ nap: 'to-the-front' as const, repeatMm: { acrossMm: 355.6, alongMm: 300 } },
};
const YARD = 914.4;

function show(order: Order) {
  const path = { workshopId: WORKSHOP_ID, productionId: PRODUCTION_ID, orderId: order.id };
  return renderPage(<ClothsSection path={path} order={order} />, {
    path: '/w/:workshopId/p/:productionId/orders/:orderId',
    at: `/w/${WORKSHOP_ID}/p/${PRODUCTION_ID}/orders/${order.id}`,
  });
}

describe('the cloths of an order', () => {
  beforeEach(() => signInAs('owner'));

  it('are assumed, and called so, until one is said', async () => {
    show(ORDER);
    expect(await screen.findByText(/^No cloth is said yet/)).toBeVisible();
    expect(await screen.findByText(/, as assumed/)).toBeVisible();
    expect(screen.queryByRole('button', { name: /^Change/ })).toBeNull();
  });

  it('say what to buy, what it costs and what is wasted', async () => {
    show({ ...ORDER, covers: [MOQUETTE] });
    expect(await screen.findByText(/\$[\d.,]+ of it for what is wasted/)).toBeVisible();
    expect(screen.getByText(/yd \(.*″\)$/, { selector: 'b' })).toBeVisible();
    expect(screen.queryByText(/assumed/)).toBeNull();
    expect(screen.getByText(/^Thread about .* yd; .*buttons?\.$/u)).toBeVisible();
  });

  it('are added with their measures, and a nap that may lie either way is refused', async () => {
    const user = userEvent.setup();
    const sent: { covers: unknown[] }[] = [];
    server.use(
      http.patch(AT, async ({ request }) => {
        sent.push((await request.json()) as { covers: unknown[] });
        return HttpResponse.json(ORDER);
      }),
    );
    show(ORDER);
    await user.click(await screen.findByRole('button', { name: 'Add a cloth' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Add the cloth' }));
    await user.type(dialog.getByLabelText('Name'), 'Green cord');
    await user.type(dialog.getByLabelText(/^Price of a yard/), '48.00');
    await user.click(dialog.getByRole('button', { name: /^Nap/ }));
    await user.click(await screen.findByRole('option', { name: 'Nap runs to the front edge' }));
    await user.click(dialog.getByRole('button', { name: 'Add the cloth' }));
    expect(dialog.getByText(/^A cloth with a nap lies one way/)).toBeVisible();
    expect(sent).toEqual([]);
    await user.click(dialog.getByRole('button', { name: /^Lies/ }));
    await user.click(await screen.findByRole('option', { name: 'Up the roll' }));
    await user.click(dialog.getByRole('button', { name: 'Add the cloth' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    const [cover] = sent[0]!.covers;
    expect(orderCoverSchema.parse(cover)).toMatchObject({
      ...{ name: 'Green cord', direction: 'up-roll', nap: 'to-the-front' },
      ...{ pricePerMetreMinor: 5249, currency: 'USD' },
    });
  });

  it('are not changed by a reviewer', async () => {
    signInAs('reviewer');
    show({ ...ORDER, covers: [MOQUETTE] });
    expect(await screen.findByRole('heading', { name: 'Plum moquette' })).toBeVisible();
    expect(screen.queryByRole('button')).toBeNull();
  });
});

describe('a cloth as it is typed', () => {
  const mark = CUSHIONS[0]!.mark;
  const own = { sampleKept: true, dyeLot: 'K 7', measuredWidthMm: 1390, receivedMm: 9000, flaws: 'a pull' };

  it.each([
    ['as it is', MOQUETTE],
    ['with some cushions and parts', { ...MOQUETTE, cushionMarks: [mark], parts: ['welt' as const] }],
    ['for the boxing and the welt', { ...MOQUETTE, parts: ['edges' as const, 'welt' as const] }],
    ['for the faces and the welt', { ...MOQUETTE, parts: ['faces' as const, 'welt' as const] }],
    ['sent in', { ...MOQUETTE, com: { ...own, receivedOn: '2026-02-01' } }],
  ])('is kept %s', (_, cover) => {
    expect(readCloth(draftOf(cover, CUSHIONS, YARD), CUSHIONS, YARD)).toEqual({ cover });
  });

  it.each([
    ['name', { name: ' ' }],
    ['pricePerMetreMinor', { price: '1,2' }],
    ['currency', { currency: 'dollars' }],
    ['cushionMarks', { covered: 'marks' as const, marks: 'C900' }],
    ['cushionMarks', { covered: 'marks' as const, marks: '' }],
    ['widthMm', { lengths: { ...draftOf(MOQUETTE, CUSHIONS, YARD).lengths, width: { value: null } } }],
  ])('is refused by its %s', (path, wrong) => {
    const read = readCloth({ ...draftOf(MOQUETTE, CUSHIONS, YARD), ...wrong }, CUSHIONS, YARD);
    expect(read).toEqual({ faults: { [path]: expect.any(String) as string } });
  });
});

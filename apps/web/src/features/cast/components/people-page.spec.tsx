import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { beforeEach, describe, expect, it } from 'vitest';
import { useUnitChoice } from '@/lib/unit-choice.ts';
import { PRODUCTION_ID, renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { PeoplePage } from './people-page.tsx';

const HETTY = {
  id: '6b1f0c5e-1a0e-4c53-9a55-0a3d6f6f9b01',
  name: 'Hetty Vance',
  role: 'the girl',
  colour: 4,
  bodyData: 'women',
  statureMm: 1511.3,
  statureSource: 'measured',
  weightKg: 52,
  measured: { popliteal_height: { mm: 375.4, takenBy: 'Nell Abara', takenOn: '2026-01-25' } },
  shoeMm: 25,
  clothing: 'light',
  notes: '',
  createdAt: '2026-01-20T10:00:00Z',
  removed: false,
};

const NEXT = [
  {
    castId: HETTY.id,
    sets: ['Dining car'],
    uncertain: 4,
    order: [
      { key: 'elbow_rest_height', settles: 2.1, ruleIds: ['SILL-01'] },
      { key: 'weight_kg', settles: 0.8, ruleIds: [] },
    ],
  },
];

const castPath = '*/api/workshops/:workshopId/productions/:productionId/cast';
const page = (items: unknown[]) => ({ items, total: items.length, page: 1, pageSize: 200 });
const show = () =>
  renderPage(<PeoplePage />, {
    path: '/w/:workshopId/p/:productionId/people',
    at: `/w/${WORKSHOP_ID}/p/${PRODUCTION_ID}/people`,
  });

describe('PeoplePage', () => {
  beforeEach(() => {
    server.use(http.get(`${castPath}/measure-next`, () => HttpResponse.json({ items: NEXT })));
    useUnitChoice.setState({ production: { system: 'feet-inches', roundTo: 8 }, personal: null });
  });

  it('shows height, weight and how well a person is known to a designer', async () => {
    signInAs('designer');
    server.use(http.get(castPath, () => HttpResponse.json(page([HETTY]))));
    show();
    const row = (await screen.findByRole('rowheader', { name: /Hetty Vance/ })).closest('tr') as HTMLElement;
    expect(within(row).getByText('2 measures')).toBeVisible();
    expect(within(row).getByText(/115/)).toBeVisible();
    expect(within(row).getByText('four feet eleven and one half inches')).toBeInTheDocument();
  });

  it('names the measures that settle most and opens the dialog at one of them', async () => {
    signInAs('designer');
    server.use(http.get(castPath, () => HttpResponse.json(page([HETTY]))));
    show();
    expect(await screen.findByText(/settles about 3 of 4 checks in doubt, Dining car/)).toBeVisible();
    await userEvent.click(screen.getByRole('link', { name: /^elbow rest/ }));
    const dialog = await screen.findByRole('dialog');
    await waitFor(() => expect(within(dialog).getByLabelText('Elbow rest')).toHaveFocus());
    expect(within(dialog).getByRole('button', { name: 'Measuring sheet (PDF)' })).toBeVisible();
  });

  it('says how many places were not looked at, and looks at the rest', async () => {
    signInAs('designer');
    let asked = 0;
    server.use(
      http.get(castPath, () => HttpResponse.json(page([HETTY]))),
      http.get(`${castPath}/measure-next`, () => {
        asked += 1;
        return HttpResponse.json({ items: NEXT, leftOut: asked === 1 ? 3 : 0 });
      }),
    );
    show();
    expect(await screen.findByText(/3 taken places were not looked at yet/)).toBeVisible();
    await userEvent.click(screen.getByRole('button', { name: 'Look at the rest' }));
    await waitFor(() => expect(screen.queryByText(/not looked at yet/)).toBeNull());
    expect(asked).toBe(2);
  });

  it('shows a carpenter names and parts, and no way to a number', async () => {
    signInAs('carpenter');
    server.use(
      http.get(castPath, () =>
        HttpResponse.json(page([{ id: HETTY.id, name: 'Hetty Vance', role: 'the girl', colour: 4 }])),
      ),
    );
    show();
    expect(await screen.findByText('Hetty Vance')).toBeVisible();
    expect(screen.queryByRole('columnheader', { name: /Height|Weight/ })).toBeNull();
    expect(screen.queryByRole('button', { name: /Add|Edit|CSV/ })).toBeNull();
  });

  it('sends only a changed reading with the new taker and leaves the others as they were', async () => {
    signInAs('owner');
    let sent: unknown;
    server.use(
      http.get(castPath, () => HttpResponse.json(page([HETTY]))),
      http.patch(`${castPath}/:castId`, async ({ request }) => {
        sent = await request.json();
        return HttpResponse.json(HETTY);
      }),
    );
    show();
    await userEvent.click(await screen.findByRole('button', { name: 'Edit Hetty Vance' }));
    const dialog = await screen.findByRole('dialog');
    await userEvent.click(within(dialog).getByLabelText('Taken by'));
    await userEvent.paste('Joss Verity');
    await userEvent.click(within(dialog).getByLabelText('Elbow rest'));
    await userEvent.paste('9 1/2');
    await userEvent.click(within(dialog).getByRole('button', { name: 'Save' }));
    await waitFor(() => expect(sent).toBeDefined());
    expect(sent).toMatchObject({
      statureMm: 1511.3,
      measured: {
        popliteal_height: { mm: 375.4, takenBy: 'Nell Abara', takenOn: '2026-01-25' },
        elbow_rest_height: { mm: 241.3, takenBy: 'Joss Verity' },
      },
    });
  });

  it('keeps the dialog open and puts the refusal of the server beside its field', async () => {
    signInAs('owner');
    server.use(
      http.get(castPath, () => HttpResponse.json(page([HETTY]))),
      http.patch(`${castPath}/:castId`, () =>
        HttpResponse.json(
          {
            status: 400,
            code: 'invalid-request',
            title: 'Bad Request',
            detail: '',
            fields: [{ path: 'statureMm', code: 'range', message: 'Stature: 1000 to 2300 mm is accepted.' }],
          },
          { status: 400 },
        ),
      ),
    );
    show();
    await userEvent.click(await screen.findByRole('button', { name: 'Edit Hetty Vance' }));
    const dialog = await screen.findByRole('dialog');
    await userEvent.click(within(dialog).getByRole('button', { name: 'Save' }));
    expect(await within(dialog).findByText('Stature: 1000 to 2300 mm is accepted.')).toBeVisible();
    expect(within(dialog).getByLabelText(/^Height/)).toHaveAttribute('aria-invalid', 'true');
  });

  it('previews a table row by row and adds the rows that can be taken', async () => {
    signInAs('owner');
    let imported: unknown;
    const good = { ...HETTY, name: 'Ines Faro' };
    server.use(
      http.get(castPath, () => HttpResponse.json(page([]))),
      http.post(`${castPath}/import/preview`, () =>
        HttpResponse.json({
          columns: [{ header: 'name', key: 'name' }],
          ignoredColumns: ['hat'],
          rows: [
            { line: 2, value: good, problems: [], warnings: [] },
            {
              line: 3,
              problems: [
                { column: 'height', read: '3/0', accepted: 'x', message: 'height: read "3/0"; two readings' },
              ],
              warnings: [],
            },
          ],
        }),
      ),
      http.post(`${castPath}/import`, async ({ request }) => {
        imported = await request.json();
        return HttpResponse.json({ added: 1, refused: 1, refusedRows: [] });
      }),
    );
    show();
    await userEvent.click(await screen.findByRole('button', { name: 'Add from a table' }));
    await userEvent.type(await screen.findByLabelText(/The table/), 'name,height,hat');
    await userEvent.click(screen.getByRole('button', { name: 'See how it reads' }));
    expect(await screen.findByText(/1 of 2 rows can be taken/)).toBeVisible();
    const bad = screen.getByRole('rowheader', { name: '3' }).closest('tr') as HTMLElement;
    expect(within(bad).getByText(/two readings/)).toBeVisible();
    expect(screen.getByText(/“hat”/)).toBeVisible();
    await userEvent.click(screen.getByRole('button', { name: 'Add 1 person' }));
    await waitFor(() => expect(imported).toEqual({ csv: 'name,height,hat' }));
  });

  describe('erasing', () => {
    const at = (where: string, name: string, alreadySent = false) => ({
      where,
      before: 'ask ',
      name,
      after: ' first',
      alreadySent,
      copies: 1,
    });
    let namedAfter = 0;
    async function open(answer: () => Response) {
      signInAs('owner');
      const erased: unknown[] = [];
      namedAfter = 0;
      server.use(
        http.get(castPath, () => HttpResponse.json(page(erased.length > 0 ? [] : [HETTY]))),
        http.get(`${castPath}/:castId/named`, () => {
          if (erased.length === 0) return answer();
          namedAfter += 1;
          return HttpResponse.json({}, { status: 404 });
        }),
        http.delete(`${castPath}/:castId`, ({ params }) => {
          erased.push(params.castId);
          return new HttpResponse(null, { status: 204 });
        }),
      );
      show();
      await userEvent.click(await screen.findByRole('button', { name: 'More for Hetty Vance' }));
      await userEvent.click(await screen.findByRole('menuitem', { name: 'Erase' }));
      return { dialog: await screen.findByRole('dialog'), erased };
    }

    it('shows first where the name stands, what was sent already and what is left', async () => {
      const { dialog, erased } = await open(() =>
        HttpResponse.json({
          places: [at('Carriage, room note', 'HETTY VANCE'), at('Order 1, letter', 'Hetty Vance', true)],
          placeCount: 2,
          parts: [at('Carriage, draft, note on B1', 'Vance')],
          partCount: 1,
        }),
      );
      const kept = await within(dialog).findByRole('region', { name: /takes the place of the name/ });
      expect(within(kept).getByText('HETTY VANCE').tagName).toBe('MARK');
      expect(within(kept).queryByText(/letter/)).toBeNull();
      const sent = within(dialog).getByRole('region', { name: 'Already sent, cannot be called back' });
      expect(within(sent).getByText('Order 1, letter')).toBeVisible();
      await userEvent.click(within(dialog).getByText(/Parts of the name in 1 place/));
      expect(within(dialog).getByText('Carriage, draft, note on B1')).toBeVisible();
      expect(erased).toEqual([]);
      await userEvent.click(within(dialog).getByRole('button', { name: 'Erase' }));
      await waitFor(() => expect(erased).toEqual([HETTY.id]));
    });

    it('says what becomes of verdicts, and asks nothing about somebody who is gone', async () => {
      const { dialog, erased } = await open(() =>
        HttpResponse.json({ places: [], placeCount: 0, parts: [], partCount: 0 }),
      );
      expect(within(dialog).getByText(/Issued fit sheets keep their verdicts/)).toHaveTextContent(
        /A draft has no body at the place any more: its checks there become not known/,
      );
      await within(dialog).findByText(/Nobody typed the whole name/);
      await userEvent.click(within(dialog).getByRole('button', { name: 'Erase' }));
      expect(await screen.findByText('Nobody yet')).toBeVisible();
      expect(erased).toEqual([HETTY.id]);
      expect(namedAfter).toBe(0);
    });

    it('may still be done when the places cannot be listed', async () => {
      const { dialog, erased } = await open(() => HttpResponse.json({}, { status: 500 }));
      expect(await within(dialog).findByText(/could not be listed/)).toBeVisible();
      await userEvent.click(within(dialog).getByRole('button', { name: 'Erase' }));
      await waitFor(() => expect(erased).toEqual([HETTY.id]));
    });
  });
});

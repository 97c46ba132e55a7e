import { loadRuleBook } from '@settlewright/anthropometry';
import { ARRANGEMENTS, type SetDocument } from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { HttpResponse, http } from 'msw';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { createCrowdDesk } from '@/lib/crowd/crowd-desk.ts';
import { renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { CrowdContext } from '../crowd-view.ts';
import { CrowdPage } from './crowd-page.tsx';

// There is no worker here: the desk that stands in it is asked itself, with fewer people.
const desk = createCrowdDesk();
vi.mock('@/lib/crowd/ask-crowd.ts', () => ({
  askCrowd: (task: 'shares', asked: Parameters<typeof desk.answer>[1]) =>
    desk.answer(task, { ...asked, count: 1000 } as never),
}));

/** People are really drawn and counted here, which takes a busy machine a while. */
const COUNTED = { timeout: 15_000 };

const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const ruleBook = loadRuleBook(rules);

let studies: unknown[] = [];

beforeEach(() => {
  signInAs('owner');
  studies = [];
  server.use(
    http.get('*/sets/1/studies', () => HttpResponse.json({ items: studies })),
    http.get('*/populations', () => HttpResponse.json({ items: [], total: 0, page: 1, pageSize: 200 })),
  );
});

function show(document: SetDocument = bay, search = '') {
  const user = userEvent.setup();
  const page = (
    <CrowdContext value={{ setName: 'Dining car', setAt: '/sets/1', draftNumber: 41, document, ruleBook }}>
      <CrowdPage roomTo="/room" fitTo="/fit" />
    </CrowdContext>
  );
  return { user, ...renderPage(page, { path: '/w/:workshopId', at: `/w/${WORKSHOP_ID}${search}` }) };
}

describe('who fits', () => {
  it('says the share with its doubt, its source and its cautions, and who is lost', async () => {
    show();
    expect(await screen.findByText(/in 100 fit all checks at once/, {}, COUNTED)).toBeVisible();
    const people = screen.getByRole('region', { name: 'About these people' });
    expect(within(people).getByText(/Source: /)).toBeVisible();
    expect(within(people).getByText(/shoes of 25 mm/)).toBeVisible();
    expect(within(people).getByText(/Guidance, not certification/)).toBeVisible();
    const checks = screen.getByRole('region', { name: 'Check by check' });
    expect(within(checks).getAllByText(/^Lost: /).length).toBeGreaterThan(0);
    expect(within(checks).getAllByText(/^\d+ to \d+ over the drop$/).length).toBeGreaterThan(0);
    expect(screen.getByRole('region', { name: 'Place by place' })).toHaveTextContent('B1, place 1');
  });

  it('counts only the ticked checks at once, by the keyboard too', async () => {
    const { user } = show();
    await screen.findByText(/fit all checks at once/, {}, COUNTED);
    const boxes = screen.getAllByRole('checkbox');
    const rows = boxes.length;
    boxes[0]?.focus();
    await user.keyboard(' ');
    expect(
      await screen.findByText(new RegExp(`${rows - 1} of ${rows} checks at once`), {}, COUNTED),
    ).toBeVisible();
    expect(boxes[0]).toHaveFocus();
    await user.click(screen.getByRole('button', { name: 'Count all checks' }));
    await waitFor(() => expect(screen.getByText(/all checks at once/)).toBeVisible(), COUNTED);
  });

  it('keeps the people in the address', async () => {
    show(bay, '?people=us-soldiers-2012&women=0');
    expect(await screen.findByText(/in 100 fit all checks at once/, {}, COUNTED)).toBeVisible();
    expect(screen.getByRole('slider', { name: 'Women of 100 people' })).toHaveValue('0');
    expect(screen.getByRole('region', { name: 'About these people' })).toHaveTextContent(/soldiers/i);
  });

  it('has a million counted on the server, shows how far it is, and cancels it', async () => {
    const sent: unknown[] = [];
    const study = {
      id: 's1',
      state: 'running',
      progress: { blocks: 40, done: 12 },
      draftNumber: 41,
      population: { id: 'us-civilians-2015', name: 'US adults 2015', cautions: [] },
      womenPercent: 50,
      people: 1_000_000,
      startedBy: { id: 'u1', name: 'Nell Abara' },
      startedAt: '2026-01-20T10:00:00Z',
    };
    server.use(
      http.post('*/sets/1/studies', async ({ request }) => {
        sent.push(await request.json());
        studies = [study];
        return HttpResponse.json(study, { status: 201 });
      }),
      http.post('*/sets/1/studies/s1/cancel', () => {
        studies = [{ ...study, state: 'cancelled' }];
        return HttpResponse.json({ ...study, state: 'cancelled' });
      }),
    );
    const { user } = show();
    await user.click(await screen.findByRole('button', { name: 'Count a million' }, COUNTED));
    const board = await screen.findByRole('progressbar', { name: 'Counting a million' });
    expect(board).toHaveAttribute('aria-valuetext', '12 of 40 parts counted');
    expect(sent).toEqual([
      { populationId: 'us-civilians-2015', womenPercent: 50, people: 1_000_000, draftNumber: 41 },
    ]);
    await user.click(screen.getByRole('button', { name: 'Cancel' }));
    await waitFor(() => expect(screen.queryByRole('progressbar')).toBeNull());
  });

  it('sends no mix, and shows none, for a population of one sex', async () => {
    const sent: unknown[] = [];
    server.use(
      http.post('*/sets/1/studies', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json({}, { status: 201 });
      }),
    );
    const { user } = show(bay, '?people=german');
    await user.click(await screen.findByRole('button', { name: 'Count a million' }, COUNTED));
    await waitFor(() =>
      expect(sent).toEqual([{ populationId: 'german', people: 1_000_000, draftNumber: 41 }]),
    );
    expect(screen.queryByRole('slider')).toBeNull();
  });

  it('shows what was counted to a reader, without a button', async () => {
    signInAs('reviewer');
    studies = [
      {
        id: 's1',
        state: 'done',
        progress: { blocks: 40, done: 40 },
        draftNumber: 40,
        population: { id: 'us-civilians-2015', name: 'US adults 2015', cautions: [] },
        people: 1_000_000,
        startedBy: { id: 'u1', name: 'Nell Abara' },
        startedAt: '2026-01-20T10:00:00Z',
        outcome: {
          kind: 'shares',
          fits: { mixed: { value: 0.3424, low: 0.3415, high: 0.3433 } },
          overDrop: { fits: { low: 0.281, high: 0.393 } },
        },
      },
    ];
    show();
    expect(
      await screen.findByText(
        /\(34.2 to 34.3\) fit all checks at once; 28.1 to 39.3 over the drop/,
        {},
        COUNTED,
      ),
    ).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Count a million' })).toBeNull();
  });

  it('says what is missing where there is no place to sit', () => {
    show({ ...bay, pieces: [], seating: [] });
    expect(screen.getByText('No place to sit')).toBeVisible();
  });
});

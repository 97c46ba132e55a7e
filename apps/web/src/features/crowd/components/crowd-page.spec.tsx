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

const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const ruleBook = loadRuleBook(rules);

beforeEach(() => {
  signInAs('owner');
  server.use(
    http.get('*/populations', () => HttpResponse.json({ items: [], total: 0, page: 1, pageSize: 200 })),
  );
});

function show(document: SetDocument = bay, search = '') {
  const user = userEvent.setup();
  const page = (
    <CrowdContext value={{ setName: 'Dining car', document, ruleBook }}>
      <CrowdPage roomTo="/room" fitTo="/fit" />
    </CrowdContext>
  );
  return { user, ...renderPage(page, { path: '/w/:workshopId', at: `/w/${WORKSHOP_ID}${search}` }) };
}

describe('who fits', () => {
  it('says the share with its doubt, its source and its cautions, and who is lost', async () => {
    show();
    expect(await screen.findByText(/in 100 fit all checks at once/)).toBeVisible();
    const people = screen.getByRole('region', { name: 'About these people' });
    expect(within(people).getByText(/Source: /)).toBeVisible();
    expect(within(people).getByText(/shoes of 25 mm/)).toBeVisible();
    expect(within(people).getByText(/Guidance, not certification/)).toBeVisible();
    const checks = screen.getByRole('region', { name: 'Check by check' });
    expect(within(checks).getAllByText(/^Lost: /).length).toBeGreaterThan(0);
    expect(screen.getByRole('region', { name: 'Place by place' })).toHaveTextContent('B1, place 1');
  });

  it('counts only the ticked checks at once, by the keyboard too', async () => {
    const { user } = show();
    await screen.findByText(/fit all checks at once/);
    const boxes = screen.getAllByRole('checkbox');
    const rows = boxes.length;
    boxes[0]?.focus();
    await user.keyboard(' ');
    expect(await screen.findByText(new RegExp(`${rows - 1} of ${rows} checks at once`))).toBeVisible();
    expect(boxes[0]).toHaveFocus();
    await user.click(screen.getByRole('button', { name: 'Count all checks' }));
    await waitFor(() => expect(screen.getByText(/all checks at once/)).toBeVisible());
  });

  it('keeps the people in the address', async () => {
    show(bay, '?people=us-soldiers-2012&women=0');
    expect(await screen.findByText(/in 100 fit all checks at once/)).toBeVisible();
    expect(screen.getByRole('slider', { name: 'Women of 100 people' })).toHaveValue('0');
    expect(screen.getByRole('region', { name: 'About these people' })).toHaveTextContent(/soldiers/i);
  });

  it('says what is missing where there is no place to sit', () => {
    show({ ...bay, pieces: [], seating: [] });
    expect(screen.getByText('No place to sit')).toBeVisible();
  });
});

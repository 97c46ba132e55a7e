import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import type { Workshop } from '@/lib/contract.ts';
import { renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { ConfidenceForm } from './confidence-form.tsx';

const WORKSHOP: Workshop = {
  id: WORKSHOP_ID,
  name: 'Ropewalk Scenic',
  telephone: '',
  paper: 'a4',
  timeZone: 'UTC',
  confidence: null,
  confidenceSetAt: null,
  isDemo: false,
  role: 'owner',
};
const LABEL = 'Probability a verdict asks for';
const SAVE = { name: 'Save the probability' };

function show(canChange: boolean, change: Partial<Workshop> = {}) {
  signInAs('owner');
  const sent: unknown[] = [];
  server.use(
    http.patch('*/api/workshops/:workshopId', async ({ request }) => {
      sent.push(await request.json());
      return HttpResponse.json(WORKSHOP);
    }),
  );
  renderPage(<ConfidenceForm workshop={{ ...WORKSHOP, ...change }} canChange={canChange} />);
  return sent;
}

it('tells everybody what is in force, its default and the mark of that', async () => {
  show(false, { confidence: 0.95, confidenceSetAt: '2025-03-03T10:00:00Z' });
  expect(
    await screen.findByText(
      /probability of 0\.95 or more, set by the workshop on 3 March 2025; the default is 0\.90 \(shop rule\)/,
    ),
  ).toBeVisible();
  expect(screen.queryByRole('textbox')).toBeNull();
  expect(screen.queryByRole('button')).toBeNull();
});

it.each([
  ['0.95', 0.95],
  ['0,8', 0.8],
  ['75 %', 0.75],
  ['.6', 0.6],
])('sends %s as %s', async (typed, value) => {
  const sent = show(true);
  await userEvent.type(await screen.findByLabelText(LABEL), typed);
  await userEvent.click(screen.getByRole('button', SAVE));
  await waitFor(() => expect(sent).toEqual([{ confidence: value }]));
});

it('goes back to the default when the field is emptied', async () => {
  const sent = show(true, { confidence: 0.95 });
  await userEvent.clear(await screen.findByLabelText(LABEL));
  await userEvent.click(screen.getByRole('button', SAVE));
  await waitFor(() => expect(sent).toEqual([{ confidence: null }]));
});

it.each(['0.5', '1', '0.905', '90', 'high', '-0.9'])('refuses %s beside the field', async (typed) => {
  const sent = show(true);
  await userEvent.type(await screen.findByLabelText(LABEL), typed);
  await userEvent.click(screen.getByRole('button', SAVE));
  expect(await screen.findByText(new RegExp(`0\\.51 to 0\\.99 .* read “${typed}”`))).toBeVisible();
  expect(screen.getByLabelText(LABEL)).toHaveAttribute('aria-invalid', 'true');
  expect(sent).toEqual([]);
});

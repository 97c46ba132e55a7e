import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { HttpResponse, http } from 'msw';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { AddSurvey } from './add-survey.tsx';
import type { OpenSurveyMapping } from '@/lib/contract.ts';
import { columnUse, wholeMapping, withUnit, withUse } from './mapping.ts';

const GUESSED: OpenSurveyMapping = {
  sex: { column: 'sex' },
  measures: [
    { key: 'stature', column: 'height', unit: 'mm' },
    { key: 'weight_kg', column: 'weight', unit: 'kg' },
  ],
  decimalComma: false,
};

const read = {
  columns: ['sex', 'height', 'weight', 'knee'].map((name) => ({ name, examples: ['1', '2'] })),
  rows: 42,
  mapping: GUESSED,
  problems: [],
  women: 20,
  men: 20,
  leftOut: 2,
  faults: [{ line: 7, row: 6, field: 'height', read: 'tall', accepted: 'a number of millimetres' }],
  faultCount: 1,
  read: ['stature', 'weight_kg'],
  estimated: ['popliteal_height'],
};

describe('a survey of one’s own', () => {
  const sent: Record<string, unknown>[] = [];
  beforeEach(() => {
    sent.length = 0;
    signInAs('owner');
    server.use(
      http.post('*/populations/preview', async ({ request }) => {
        const { mapping } = (await request.json()) as { mapping?: OpenSurveyMapping };
        return HttpResponse.json({ ...read, ...(mapping ? { mapping } : {}) });
      }),
      http.post('*/populations', async ({ request }) => {
        sent.push((await request.json()) as Record<string, unknown>);
        return HttpResponse.json({ id: 'own-1' }, { status: 201 });
      }),
    );
  });

  it('is read from a file, shows its faults, and is added with its name and source', async () => {
    const user = userEvent.setup({ delay: null });
    const onAdded = vi.fn();
    renderPage(<AddSurvey onAdded={onAdded} />, { path: '/w/:workshopId', at: `/w/${WORKSHOP_ID}` });
    await user.click(screen.getByRole('button', { name: 'Add your own survey' }));
    const dialog = await screen.findByRole('dialog');
    const file = new File(['sex,height,weight,knee\nf,1600,60,480'], 'crew.csv', { type: 'text/csv' });
    await user.upload(within(dialog).getByLabelText(/The table as a CSV file/), file);
    expect(
      await within(dialog).findByText(
        /20 women and 20 men can be read; 2 of 42 rows/,
        {},
        { timeout: 15_000 },
      ),
    ).toBeVisible();
    expect(within(dialog).getByText(/Line 7, height: “tall”/)).toBeVisible();
    const add = within(dialog).getByRole('button', { name: 'Add these 40 people' });
    expect(add).toBeDisabled();
    await user.click(within(dialog).getByLabelText('Name'));
    await user.paste('The crew');
    await user.click(within(dialog).getByLabelText('Source'));
    await user.paste('Measured by Nell in May.');
    await user.click(add);
    await vi.waitFor(() => expect(onAdded).toHaveBeenCalledWith('own-1'), { timeout: 15_000 });
    expect(sent).toEqual([expect.objectContaining({ name: 'The crew', keepRows: false, mapping: GUESSED })]);
  });

  it('loses nothing that was typed when a column is read another way, or the slip is closed', async () => {
    const user = userEvent.setup({ delay: null });
    renderPage(<AddSurvey onAdded={vi.fn()} />, { path: '/w/:workshopId', at: `/w/${WORKSHOP_ID}` });
    await user.click(screen.getByRole('button', { name: 'Add your own survey' }));
    const file = new File(['sex,height,weight,knee\nf,1600,60,480'], 'crew.csv', { type: 'text/csv' });
    await user.upload(await screen.findByLabelText(/The table as a CSV file/), file);
    await user.click(await screen.findByLabelText('Name', {}, { timeout: 15_000 }));
    await user.paste('The crew');
    await user.click(screen.getByRole('checkbox', { name: /comma stands before/ }));
    await vi.waitFor(() => expect(screen.getByRole('status')).toHaveAttribute('aria-busy', 'false'), {
      timeout: 15_000,
    });
    expect(screen.getByLabelText('Name')).toHaveValue('The crew');
    await user.click(screen.getByRole('button', { name: 'Close' }));
    await user.click(await screen.findByRole('button', { name: 'Go on with crew.csv' }));
    expect(await screen.findByLabelText('Name')).toHaveValue('The crew');
  });
});

describe('what columns are', () => {
  it('moves a use from one column to another', () => {
    const moved = withUse(GUESSED, 'knee', 'stature');
    expect(columnUse(moved, 'knee')).toBe('stature');
    expect(columnUse(moved, 'height')).toBe('unread');
    expect(moved.measures).toHaveLength(2);
  });

  it('knows the unit of each column', () => {
    expect(withUnit(GUESSED, 'height', 'in').measures[0]?.unit).toBe('in');
    // Of a column that is pointed out the server finds it.
    const pointed = withUse(GUESSED, 'knee', 'weight_kg');
    expect(pointed.measures.at(-1)).toEqual({ key: 'weight_kg', column: 'knee' });
    expect(wholeMapping(pointed)).toBeUndefined();
    expect(wholeMapping(withUnit(pointed, 'knee', 'lb'))?.measures.at(-1)?.unit).toBe('lb');
  });

  it('cannot be sent without the sex', () => {
    expect(wholeMapping(withUse(GUESSED, 'sex', 'unread'))).toBeUndefined();
    expect(wholeMapping(withUse(GUESSED, 'knee', 'age'))).toMatchObject({
      age: 'knee',
      sex: { column: 'sex' },
    });
  });
});

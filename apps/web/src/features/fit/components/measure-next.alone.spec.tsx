import { createBodyModel } from '@settlewright/anthropometry';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { screen, within } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { describe, expect, it, vi } from 'vitest';
import { answerNext, type NextQuestion } from '../next/next-question.ts';
import { basis, sheet, showSheet } from '../test/show-sheet.tsx';
import { MeasureNext, MeasureNextLine } from './measure-next.tsx';

// There is no worker here; the same question is answered on the spot.
vi.mock('../next/ask-next.ts', () => {
  const model = createBodyModel(summary);
  return {
    askNext: (question: NextQuestion) => Promise.resolve(answerNext(structuredClone(question), model)),
  };
});

const personTo = (castId: string, key: string) => `/people?edit=${castId}&field=${key}`;
const list = (
  <MemoryRouter>
    <MeasureNext />
  </MemoryRouter>
);

describe('MeasureNext', { timeout: 30_000 }, () => {
  it('names the measures of each person in doubt and leads to their fields', async () => {
    showSheet(list, { basis, personTo });
    const region = await screen.findByText('Marcus Adeyemi-Rowe', {}, { timeout: 20_000 });
    const line = within(region.closest('li') as HTMLElement);
    const [first] = line.getAllByRole('link');
    expect(first).toHaveAttribute('href', expect.stringMatching(/^\/people\?edit=marcus&field=[a-z_]+$/));
    expect(line.getByText(/(settles about|may settle) .* in doubt/)).toBeVisible();
  });

  it('names nobody whose body is gone, and says that a place has none', async () => {
    const [hetty, marcus] = basis.sitters;
    if (!hetty || !marcus) throw new Error('Two sit here.');
    const gone = { ...basis, sitters: [{ ...hetty, noBody: true as const }, marcus] };
    showSheet(list, { sheet: structuredClone(sheet), basis: gone, personTo });
    await screen.findByText('Marcus Adeyemi-Rowe', {}, { timeout: 20_000 });
    expect(screen.queryByText('Hetty Vance')).toBeNull();
    expect(screen.getByText(/^1 place has no body behind it/)).toBeVisible();
  });

  it('says the same in one line', async () => {
    const line = (
      <MemoryRouter>
        <MeasureNextLine />
      </MemoryRouter>
    );
    showSheet(line, { basis, personTo });
    expect(await screen.findByText(/Marcus: /, {}, { timeout: 20_000 })).toHaveTextContent(
      /^Measure next\. .*Marcus: [a-z ]+, enter it for Marcus Adeyemi-Rowe.*\.$/,
    );
  });

  it('says nothing to readers who may not see measures', () => {
    showSheet(list);
    expect(screen.queryByText('Measure next')).toBeNull();
  });
});

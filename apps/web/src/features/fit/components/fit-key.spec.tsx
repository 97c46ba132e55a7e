import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { sheet, showSheet } from '../test/show-sheet.tsx';
import { FitConfidence, FitKey } from './fit-key.tsx';

it('says the probability that the verdicts of the sheet were given at', () => {
  const { change } = showSheet(<FitConfidence />);
  expect(
    screen.getByText('A verdict is given at a probability of 0.90 or more; that is the default (shop rule).'),
  ).toBeVisible();
  change({ sheet: { ...sheet, confidence: 0.8 }, confidenceSetAt: '2025-03-03T10:00:00Z' });
  expect(
    screen.getByText(
      'A verdict is given at a probability of 0.80 or more, set by the workshop on 3 March 2025; the default is 0.90 (shop rule).',
    ),
  ).toBeVisible();
});

it('says to readers without measures that margins are rough, and to no other', () => {
  const { change } = showSheet(<FitKey />, { detail: 'verdicts' });
  expect(screen.getByText(/at least so much is left, at most so much is short/)).toBeVisible();
  change({ detail: 'full' });
  expect(screen.queryByText(/at least so much/)).toBeNull();
});

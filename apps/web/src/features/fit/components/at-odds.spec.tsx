import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { check, facingBenches, ruleBook, showSheet } from '../test/show-sheet.tsx';
import { AtOdds } from './at-odds.tsx';
import { PiecesAndWays } from './pieces-and-ways.tsx';

const kept = check({
  ...facingBenches,
  pieces: facingBenches.pieces.map((piece) => (piece.mark === 'B1' ? { ...piece, accessible: true } : piece)),
});

describe('rules at odds', () => {
  it('stand side by side with the purpose of each and their numbers', () => {
    showSheet(<AtOdds />, { sheet: kept });
    const heading = screen.getByRole('heading', {
      name: /^B1\. A bench kept accessible is also sat on by short/,
    });
    const item = heading.closest('li') as HTMLElement;
    expect(within(item).getByText('A seat as high as a wheelchair helps to move across.')).toBeVisible();
    expect(within(item).getByText(/lets short sitters put their feet/)).toBeVisible();
    expect(within(item).getByText('inside clause 903.5')).toBeVisible();
    expect(
      within(item).getByText(/From the lowest accessible seat, 17″, the cushion must sink by/),
    ).toBeVisible();
  });

  it('are no section where nothing is at odds', () => {
    showSheet(<AtOdds />, { sheet: { ...kept, rows: [], publicRow: { cells: [] }, piecesAndWays: [] } });
    expect(screen.queryByRole('heading')).toBeNull();
  });
});

describe('what is not asked', () => {
  it('says what would have to be given, one line a reason', () => {
    showSheet(<PiecesAndWays />);
    expect(screen.getByText(/^Turning space: no spot for turning round is marked/)).toBeVisible();
    expect(screen.getByText(/^Lens to eye: the height of the lens is not given/)).toBeVisible();
    const bench = ['ACC-01', 'ACC-02', 'ACC-03', 'ACC-04']
      .map((id) => ruleBook.rule(id).columnName)
      .join(', ');
    expect(screen.getByText(`${bench}: no bench is marked accessible`)).toBeVisible();
  });
});

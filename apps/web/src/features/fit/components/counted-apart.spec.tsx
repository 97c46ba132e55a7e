import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { sheet, showSheet } from '../test/show-sheet.tsx';
import { CountedApart } from './counted-apart.tsx';

const cells = sheet.rows.flatMap((row) => row.cells).filter(({ outcome }) => outcome.kind === 'verdict');
const as = (verdict: 'wontFit' | 'tight' | 'fits' | 'notKnown', at: number) => {
  const cell = cells[at];
  if (cell?.outcome.kind !== 'verdict') throw new Error('The sheet has too few verdicts.');
  return { ...cell, outcome: { ...cell.outcome, verdict } };
};
const read = (cell: ReturnType<typeof as>) => ({ ...cell, readAs: '5th woman' });

it('says what the counts of sitters leave out', () => {
  showSheet(<CountedApart />, {
    sheet: {
      ...sheet,
      publicRow: { cells: [as('wontFit', 0), as('wontFit', 1), as('tight', 2), as('fits', 3)].map(read) },
      piecesAndWays: [as('wontFit', 0), as('notKnown', 1)],
    },
  });
  expect(screen.getByText('The public: 2 won’t fit, 1 tight. Pieces and ways: 1 won’t fit.')).toBeVisible();
});

it('says nothing where nothing is tight or short', () => {
  const { container } = showSheet(<CountedApart />, {
    sheet: { ...sheet, publicRow: { cells: [as('fits', 0)].map(read) }, piecesAndWays: [as('notKnown', 1)] },
  });
  expect(container).toBeEmptyDOMElement();
});

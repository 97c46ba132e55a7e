import { describe, expect, it } from 'vitest';
import { cellsInMenu, type FittedCell } from './title-fit.ts';

const cells: FittedCell[] = [
  { id: 'workshop', leastPx: 110, yields: 50 },
  { id: 'production', leastPx: 110, yields: 20 },
  { id: 'set', leastPx: 90 },
  { id: 'draft', leastPx: 160, yields: 30 },
  { id: 'units', leastPx: 100, yields: 60 },
];

describe('the cells of the title block', () => {
  it('all stand while names can still be shortened', () => {
    expect(cellsInMenu(cells, 710, 50)).toEqual([]);
    expect(cellsInMenu(cells, 570, 50)).toEqual([]);
  });

  it('leave the least needed first, with room for the menu that takes them', () => {
    // 100 px of units leave 470, and the menu makes it 520 again.
    expect(cellsInMenu(cells, 569, 50)).toEqual(['units']);
    expect(cellsInMenu(cells, 519, 50)).toEqual(['units', 'workshop']);
    expect(cellsInMenu(cells, 300, 50)).toEqual(['units', 'workshop', 'draft']);
  });

  it('never leave where they say which set is open', () => {
    expect(cellsInMenu(cells, 0, 50)).toEqual(['units', 'workshop', 'draft', 'production']);
  });
});

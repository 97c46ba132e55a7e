import type { CellState } from '@settlewright/geometry';

/** What a check may say before and after a change. */
export const CELL_STATES = [
  'fits',
  'tight',
  'wontFit',
  'notKnown',
  'inside',
  'outside',
  'gone',
] as const satisfies CellState[];

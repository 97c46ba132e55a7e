import type { StickRow } from './story-stick.ts';

/**
 * Rows of a stick as they are read: highest band first; who fits nowhere comes last.
 *
 * @param rows - rows with their bands
 */
export function orderedRows<Row extends Pick<StickRow, 'tight'>>(rows: readonly Row[]): Row[] {
  const middle = ({ tight }: Row) => {
    const [first, last] = [tight[0], tight.at(-1)];
    return first && last ? (first.from + last.to) / 2 : -Infinity;
  };
  return [...rows].sort((a, b) => middle(b) - middle(a));
}

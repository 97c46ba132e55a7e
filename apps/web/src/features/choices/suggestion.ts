import type { StickRow, StoryStick, Stretch } from '@settlewright/geometry';

/** A value of the dimension and whom it serves. */
export interface Served {
  value: number;
  /** Rows that are at least tight there, and those of them that fit. */
  served: number;
  fits: number;
}

type Answers = Pick<StoryStick, 'values' | 'rows'>;

/** Whom each tried value serves. */
export function servedAt({ values, rows }: Answers): Served[] {
  return values.map((value, i) => {
    const fits = rows.filter(({ states }) => states[i] === 'fits').length;
    const tight = rows.filter(({ states }) => states[i] === 'tight').length;
    return { value, served: fits + tight, fits };
  });
}

/**
 * The value that serves most sitters; of equals the nearest to the present one, then the one that fits more. What is
 * not known is never served.
 */
export function bestValue(stick: Answers, present: number): Served | undefined {
  if (stick.rows.length === 0) return undefined;
  return servedAt(stick).reduce<Served | undefined>((best, one) => {
    if (!best || one.served !== best.served) return !best || one.served > best.served ? one : best;
    const nearer = Math.abs(best.value - present) - Math.abs(one.value - present);
    if (Math.abs(nearer) > 1e-6) return nearer > 0 ? one : best;
    return one.fits > best.fits ? one : best;
  }, undefined);
}

/** The fewest people without whom a value is at least tight for everybody else. */
export interface Elsewhere {
  rows: StickRow[];
  /** What suits the others. */
  others: Stretch;
}

const holds = (row: StickRow, value: number): boolean =>
  row.tight.some(({ from, to }) => from - 1e-6 <= value && value <= to + 1e-6);

/** Whom to seat elsewhere; nothing when one value is at least tight for all, or for nobody. */
export function seatElsewhere(
  { rows, allTight }: Pick<StoryStick, 'rows' | 'allTight'>,
  present: number,
): Elsewhere | undefined {
  if (allTight.length > 0) return undefined;
  const ends = rows.flatMap(({ tight }) => tight.flatMap(({ from, to }) => [from, to]));
  const sorted = [...ends].sort((a, b) => Math.abs(a - present) - Math.abs(b - present));
  let best: { value: number; kept: StickRow[] } | undefined;
  for (const value of sorted) {
    const kept = rows.filter((row) => holds(row, value));
    if (!best || kept.length > best.kept.length) best = { value, kept };
  }
  if (!best) return undefined;
  const { value, kept } = best;
  const around = kept.flatMap(({ tight }) =>
    tight.filter(({ from, to }) => from - 1e-6 <= value && value <= to + 1e-6),
  );
  return {
    rows: rows.filter((row) => !kept.includes(row)),
    others: {
      from: Math.max(...around.map(({ from }) => from)),
      to: Math.min(...around.map(({ to }) => to)),
    },
  };
}

/** Two sitters that no value serves together: who needs the least, and who the most. */
export function furthestApart(rows: readonly StickRow[]): { low: StickRow; high: StickRow } | undefined {
  const told = rows.filter(({ tight }) => tight.length > 0);
  const topOf = (row: StickRow) => row.tight.at(-1)?.to ?? 0;
  const footOf = (row: StickRow) => row.tight[0]?.from ?? 0;
  const [low] = [...told].sort((a, b) => topOf(a) - topOf(b));
  const [high] = [...told].sort((a, b) => footOf(b) - footOf(a));
  return low && high && topOf(low) < footOf(high) ? { low, high } : undefined;
}

/** Highest band first; who fits nowhere comes last. */
export function orderedRows(rows: readonly StickRow[]): StickRow[] {
  const middle = ({ tight }: StickRow) => {
    const [first, last] = [tight[0], tight.at(-1)];
    return first && last ? (first.from + last.to) / 2 : -Infinity;
  };
  return [...rows].sort((a, b) => middle(b) - middle(a));
}

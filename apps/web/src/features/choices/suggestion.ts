import {
  whereAll,
  type CellState,
  type StickRow,
  type StoryStick,
  type Stretch,
} from '@settlewright/geometry';

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
  /** Tried values that suit the others. */
  others: Stretch;
}

/** Verdicts that serve; what is not known does not. */
export const SERVED: readonly CellState[] = ['fits', 'tight'];

/** Whom to seat elsewhere, by their verdicts; nothing when one value is at least tight for all, or for nobody. */
export function seatElsewhere(
  { values, rows, allTight }: Pick<StoryStick, 'values' | 'rows' | 'allTight'>,
  present: number,
): Elsewhere | undefined {
  if (allTight.length > 0) return undefined;
  const best = bestValue({ values, rows }, present);
  if (!best || best.served === 0) return undefined;
  const at = values.indexOf(best.value);
  const isKept = ({ states }: StickRow) => SERVED.includes(states[at] ?? 'gone');
  const others = whereAll(values, rows.filter(isKept), SERVED).find(
    ({ from, to }) => from <= best.value && best.value <= to,
  );
  return others && { rows: rows.filter((row) => !isKept(row)), others };
}

/** Two sitters that no value serves together, by best guess of who is not measured: who needs the least, and who the most. */
export function furthestApart(rows: readonly StickRow[]): { low: StickRow; high: StickRow } | undefined {
  const told = rows.filter(({ tight }) => tight.length > 0);
  const topOf = (row: StickRow) => row.tight.at(-1)?.to ?? 0;
  const footOf = (row: StickRow) => row.tight[0]?.from ?? 0;
  const [low] = [...told].sort((a, b) => topOf(a) - topOf(b));
  const [high] = [...told].sort((a, b) => footOf(b) - footOf(a));
  return low && high && topOf(low) < footOf(high) ? { low, high } : undefined;
}

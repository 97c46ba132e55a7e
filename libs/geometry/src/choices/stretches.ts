/** A stretch of values. */
export interface Stretch {
  from: number;
  to: number;
}

/** How far below zero still counts as on the line, millimetres. */
const ON_THE_LINE = 0.1;

/**
 * Where a series is not negative.
 *
 * @param values - rising values
 * @param rooms - the series at each value
 * @returns stretches, their ends by straight interpolation between two values
 */
export function stretches(values: readonly number[], rooms: readonly number[]): Stretch[] {
  const found: Stretch[] = [];
  let from: number | undefined;
  for (const [i, room] of rooms.entries()) {
    const value = values[i] as number;
    const inside = room >= -ON_THE_LINE && room !== Infinity;
    if (inside && from === undefined) from = crossing(values, rooms, i - 1, i) ?? value;
    if (!inside && from !== undefined) {
      found.push({ from, to: crossing(values, rooms, i - 1, i) ?? (values[i - 1] as number) });
      from = undefined;
    }
  }
  if (from !== undefined) found.push({ from, to: values.at(-1) as number });
  return found;
}

function crossing(
  values: readonly number[],
  rooms: readonly number[],
  before: number,
  after: number,
): number | undefined {
  const [a, b] = [rooms[before], rooms[after]];
  if (a === undefined || b === undefined || !Number.isFinite(a) || !Number.isFinite(b) || a === b)
    return undefined;
  const share = Math.min(1, Math.max(0, -a / (b - a)));
  const [from, to] = [values[before] as number, values[after] as number];
  return from + share * (to - from);
}

/** What several lists of stretches have in common. */
export function common(lists: readonly (readonly Stretch[])[]): Stretch[] {
  const [first, ...rest] = lists;
  return rest.reduce<Stretch[]>(
    (kept, list) =>
      kept.flatMap((a) =>
        list.flatMap((b) => {
          const both = { from: Math.max(a.from, b.from), to: Math.min(a.to, b.to) };
          return both.from <= both.to ? [both] : [];
        }),
      ),
    [...(first ?? [])],
  );
}

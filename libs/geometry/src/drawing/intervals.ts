/** A stretch of a line or circle, from and to, rising. */
export type Interval = readonly [number, number];

/**
 * Stretches put together where they meet.
 *
 * @param intervals - in any order
 * @param nearMm - gaps no longer than this are closed
 * @returns rising, none touching another
 */
export function union(intervals: readonly Interval[], nearMm: number): Interval[] {
  const joined: [number, number][] = [];
  for (const [from, to] of [...intervals].sort((a, b) => a[0] - b[0])) {
    const last = joined.at(-1);
    if (last && from <= last[1] + nearMm) last[1] = Math.max(last[1], to);
    else joined.push([from, to]);
  }
  return joined;
}

/**
 * What is left of stretches when others are taken away.
 *
 * @param whole - rising, none touching another
 * @param taken - as above
 * @param shortestMm - what is left and shorter is dropped
 * @returns rising, none touching another
 */
export function without(
  whole: readonly Interval[],
  taken: readonly Interval[],
  shortestMm: number,
): Interval[] {
  return whole.flatMap(([from, to]) => {
    const left: Interval[] = [];
    let at = from;
    for (const [a, b] of taken) {
      if (b <= at || a >= to) continue;
      if (a > at) left.push([at, a]);
      at = Math.max(at, b);
    }
    if (at < to) left.push([at, to]);
    return left.filter(([a, b]) => b - a >= shortestMm);
  });
}

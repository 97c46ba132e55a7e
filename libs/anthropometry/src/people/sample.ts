import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import { drawPeople } from '../populations/draws.ts';
import { drawOrder, factorRows, linearBodies, type BodyRow } from '../populations/linear-bodies.ts';
import type { Draws, GroupBodies } from '../populations/population.ts';
import { DERIVED, isLogged, toWorked } from '../populations/worked.ts';
import type { WeightedPosterior } from './body-moments.ts';

/**
 * Draws people as one person may be: what was taken stands, the rest varies together.
 *
 * @param parts - beliefs of one or two groups
 * @param fixed - measures whose value does not vary, mm and kg
 * @param count - people, 1 or more
 * @param seed - whole number
 * @returns columns in mm and kg
 * @throws RangeError when count or seed is out of range
 */
export function samplePerson(
  parts: readonly WeightedPosterior[],
  fixed: ReadonlyMap<MeasureKey, number>,
  count: number,
  seed: number,
): Draws {
  const bodies = parts.map((part) => ({ share: part.weight, bodies: bodiesOf(part, fixed) }));
  const draws = drawPeople(bodies, new Set(MEASURE_KEYS), count, seed);
  for (const { name, group, shift } of parts) {
    const woman = name === 'women' ? 1 : 0;
    for (const [place, by] of shift) {
      const column = draws.columns[group.keys[place] as MeasureKey];
      column?.forEach((value, row) => {
        if (draws.isWoman[row] === woman) column[row] = value + by;
      });
    }
  }
  if (parts.some(({ shift }) => shift.size > 0)) sumAgain(draws);
  // A derived measure that was taken is itself and not the sum of its parts.
  for (const [key, value] of fixed) draws.columns[key]?.fill(value);
  return draws;
}

/** Derived measures of people whose other measures were moved. */
function sumAgain({ columns }: Draws): void {
  for (const [key, parts] of Object.entries(DERIVED) as [MeasureKey, (typeof DERIVED)[MeasureKey] & {}][]) {
    const own = columns[key];
    const from = parts.map(([part, factor]) => ({ column: columns[part], factor }));
    own?.forEach((_, row) => {
      own[row] = from.reduce((sum, { column, factor }) => sum + factor * (column?.[row] as number), 0);
    });
  }
}

function bodiesOf(
  { name, group, posterior: { mean, covariance, scale } }: WeightedPosterior,
  fixed: ReadonlyMap<MeasureKey, number>,
): GroupBodies {
  const places = new Map(group.keys.map((key, place) => [key, place]));
  const open = drawOrder(group.keys.filter((key) => !fixed.has(key)));
  const own = Float64Array.from(open, (key) => scale?.[places.get(key) as number] ?? 1);
  const between = new Float64Array(open.length ** 2);
  open.forEach((a, i) => {
    open.forEach((b, j) => {
      const c = covariance[(places.get(a) as number) * group.size + (places.get(b) as number)] as number;
      between[i * open.length + j] = c * (own[i] as number) * (own[j] as number);
    });
  });
  const unbounded = { low: -Infinity, high: Infinity };
  const factors = open.length > 0 ? factorRows(between, open.length) : [];
  const rows = open.map((key, i): BodyRow => ({
    key,
    mean: mean[places.get(key) as number] as number,
    factors: factors[i] as Float64Array,
    logged: isLogged(key),
    ...unbounded,
  }));
  const still = group.keys.filter((key) => fixed.has(key));
  for (const key of still) {
    const value = toWorked(key, fixed.get(key) as number);
    rows.push({ key, mean: value, factors: new Float64Array(0), logged: isLogged(key), ...unbounded });
  }
  return linearBodies(name, rows);
}

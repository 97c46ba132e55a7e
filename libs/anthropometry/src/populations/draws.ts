import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import type { BodyWriter, Draws, PopulationPart } from './population.ts';
import { quickQuantile } from './quick-normal.ts';
import { sobolWalk } from './sobol.ts';

const FRACTIONS = 4294967296;

/**
 * Draws whole people from the parts of a population. The first number of a point picks the part, the others make
 * the body, so a share of any limits moves little between seeds.
 *
 * @param parts - shares add to 1
 * @param known - measures that every part knows
 * @param count - people, 1 or more
 * @param seed - whole number
 * @param block - stretch of the whole, 0 or more
 * @param measures - columns wanted
 * @returns people row by row, the same for the same arguments
 * @throws RangeError when a number is out of range
 */
export function drawPeople(
  parts: readonly PopulationPart[],
  known: ReadonlySet<MeasureKey>,
  count: number,
  seed: number,
  block = 0,
  measures: readonly MeasureKey[] = MEASURE_KEYS,
): Draws {
  for (const [name, value, least] of [
    ['count', count, 1],
    ['block', block, 0],
    ['seed', seed, -Infinity],
  ] as const) {
    if (!Number.isInteger(value) || value < least) {
      throw new RangeError(
        `${name} is ${value}; accepted: whole numbers${least === -Infinity ? '' : ` from ${least}`}`,
      );
    }
  }
  const columns = new Map(
    measures.filter((key) => known.has(key)).map((key) => [key, new Float32Array(count)]),
  );
  const writers = parts.map(({ bodies }) => bodies.writer(columns));
  const women = parts.map(({ bodies }) => (bodies.group === 'women' ? 1 : 0));
  const ends = endsOf(parts);
  const isWoman = new Uint8Array(count);
  const dimensions = Math.max(...writers.map((writer) => writer.dimensions));
  const walk = sobolWalk(1 + dimensions, seed, block * count);
  const { point } = walk;
  const normals = new Float64Array(dimensions);
  for (let row = 0; row < count; row += 1) {
    if (row > 0) walk.next();
    const pick = point[0] as number;
    let part = 0;
    while (pick >= (ends[part] as number)) part += 1;
    isWoman[row] = women[part] as number;
    for (let d = 0; d < dimensions; d += 1) normals[d] = quickQuantile(point[d + 1] as number);
    (writers[part] as BodyWriter).write(normals, row);
  }
  return { count, columns: Object.fromEntries(columns), isWoman, bodyDataKnown: true };
}

/** Where the stretch of each part ends among the 32-bit fractions; the last takes all that is left. */
function endsOf(parts: readonly PopulationPart[]): number[] {
  let sum = 0;
  return parts.map(({ share }, n) => {
    sum += share;
    return n === parts.length - 1 ? FRACTIONS : sum * FRACTIONS;
  });
}

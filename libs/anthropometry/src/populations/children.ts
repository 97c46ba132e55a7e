import type { MeasureKey } from '../measures/measures.ts';
import { normalCdf, normalDensity } from '../people/normal.ts';
import type { Children, ChildSizeMark, ChildYear } from './children-file.ts';
import { populationOf } from './mix.ts';
import type { GroupBodies, Population } from './population.ts';
import type { SurveyGroup } from './survey.ts';

const KNOWN: ReadonlySet<MeasureKey> = new Set(['stature', 'weight_kg', 'popliteal_height']);

/**
 * Children of one size mark, as many girls as boys: stature, weight and popliteal height, and nothing else.
 *
 * @param children - from `readChildren`
 * @param mark - number of the mark
 * @returns girls count as women and boys as men; the warning is among the cautions
 * @throws RangeError when there is no such mark
 */
export function childrenOfMark(children: Children, mark: number): Population {
  const found = children.marks.find((each) => each.mark === mark);
  if (!found) {
    throw new RangeError(`mark is ${mark}; accepted: ${children.marks.map((each) => each.mark).join(', ')}`);
  }
  return populationOf(
    {
      id: `children-${mark}`,
      name: `children of size mark ${mark}`,
      kind: 'estimated',
      source: 'EN 1729-1 size marks in school-furniture guides; weight after NHANES 2015-2016',
      licence: 'printed figures, cited; US government work (from memory)',
      cautions: [children.warning],
      read: new Set<MeasureKey>(['stature', 'popliteal_height']),
    },
    [
      { share: 0.5, bodies: bodiesOf('women', children.growth.girls, found, children.shoeWithinMm) },
      { share: 0.5, bodies: bodiesOf('men', children.growth.boys, found, children.shoeWithinMm) },
    ],
  );
}

const REACH = 3.625;
const STEPS_PER_SD = 16;

function bodiesOf(
  group: SurveyGroup,
  years: readonly ChildYear[],
  { statureMm, poplitealWithShoesMm }: ChildSizeMark,
  shoeMm: number,
): GroupBodies {
  const [low, high] = statureMm;
  const [shortest, longest] = poplitealWithShoesMm;
  let shapes: { stature: Float64Array; lnWeight: Float64Array; spread: Float64Array } | undefined;
  return {
    group,
    known: KNOWN,
    writer(columns) {
      shapes ??= shapesOf(years, low, high);
      const { stature, lnWeight, spread } = shapes;
      const [statures, weights, legs] = (['stature', 'weight_kg', 'popliteal_height'] as const).map((key) =>
        columns.get(key),
      );
      return {
        dimensions: 2,
        write(normals, row) {
          const at = Math.min(
            stature.length - 1,
            Math.max(0, ((normals[0] as number) + REACH) * STEPS_PER_SD),
          );
          const mm = between(stature, at);
          if (statures) statures[row] = mm;
          if (weights) {
            weights[row] = Math.exp(between(lnWeight, at) + between(spread, at) * (normals[1] as number));
          }
          if (legs) legs[row] = shortest + ((mm - low) / (high - low)) * (longest - shortest) - shoeMm;
        },
      };
    },
  };
}

function between(values: Float64Array, at: number): number {
  const below = Math.min(values.length - 2, Math.floor(at));
  const low = values[below] as number;
  return low + (at - below) * ((values[below + 1] as number) - low);
}

/** Stature, and the middle and spread of ln weight at it, at steps of a normal number. */
function shapesOf(years: readonly ChildYear[], low: number, high: number) {
  const below = (mm: number) =>
    years.reduce((sum, { statureMm: { mean, sd } }) => sum + normalCdf((mm - mean) / sd), 0);
  const [from, to] = [below(low), below(high)];
  const stature = Float64Array.from({ length: 2 * REACH * STEPS_PER_SD + 1 }, (_, step) => {
    const wanted = from + normalCdf(step / STEPS_PER_SD - REACH) * (to - from);
    let [under, over] = [low, high];
    while (over - under > 0.01) {
      const middle = (under + over) / 2;
      if (below(middle) < wanted) under = middle;
      else over = middle;
    }
    return (under + over) / 2;
  });
  const at = [...stature].map((mm) => weightAt(years, mm));
  return {
    stature,
    lnWeight: Float64Array.from(at, ({ ln }) => ln),
    spread: Float64Array.from(at, ({ sd }) => sd),
  };
}

/** Weight of the ages at which children have a stature, each age counting by how often it has it. */
export function weightAt(years: readonly ChildYear[], mm: number): { ln: number; sd: number } {
  let [total, ln, variance] = [0, 0, 0];
  for (const { statureMm, weightKg } of years) {
    const often = normalDensity((mm - statureMm.mean) / statureMm.sd) / statureMm.sd;
    const own = Math.log1p((weightKg.sd / weightKg.mean) ** 2);
    total += often;
    ln += often * (Math.log(weightKg.mean) - own / 2);
    variance += often * own;
  }
  return { ln: ln / total, sd: Math.sqrt(variance / total) };
}

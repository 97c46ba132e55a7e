import { createBodyModel, MEASURE_KEYS, type MeasureKey } from '@settlewright/anthropometry';
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };

type Means = Record<MeasureKey, number>;
const model = createBodyModel(survey);

/** Women and men at percentiles of stature, the rest as expected at that stature. */
export const percentilePeople = (percentiles: readonly number[]): [string, Means][] =>
  (['women', 'men'] as const).flatMap((bodyData) =>
    percentiles.map((percentile): [string, Means] => [
      `${bodyData}, ${percentile} % in stature`,
      model.predict(model.mannequin({ bodyData, measure: 'stature', percentile })).means(),
    ]),
  );

/** People drawn from the survey model: every measure varies, together with the others. */
export function drawnPeople(count: number, seed: number): [string, Means][] {
  const draws = model
    .predict({ bodyData: 'mixed', measured: {}, shoeMm: 0, clothing: 'light' })
    .sample(count, seed);
  return Array.from({ length: count }, (_, row) => [
    `person ${row + 1} of seed ${seed}`,
    Object.fromEntries(MEASURE_KEYS.map((key) => [key, draws.columns[key]![row]!])) as Means,
  ]);
}

const BUILDS = { light: -1.65, expected: 0, heavy: 1.65 } as const;

/** 18 builds: both sexes at 5, 50 and 95 % of stature, each light, of expected weight and heavy (1.65 SD of ln weight). */
export function builds(): [string, Means][] {
  return (['women', 'men'] as const).flatMap((bodyData) =>
    [5, 50, 95].flatMap((percentile) => {
      const stature = model.percentile(bodyData, 'stature', percentile);
      const shared = {
        bodyData,
        stature: { mm: stature, source: 'measured' as const },
        measured: {},
        shoeMm: 25,
        clothing: 'light' as const,
      };
      const { mean, sd } = model.predict(shared).estimate('weight_kg').components[0]!;
      const spread = Math.sqrt(Math.log1p((sd / mean) ** 2));
      const middle = Math.log(mean) - spread ** 2 / 2;
      return Object.entries(BUILDS).map(([name, deviations]): [string, Means] => [
        `${name} ${bodyData}, ${percentile} % in stature`,
        model.predict({ ...shared, weightKg: Math.exp(middle + deviations * spread) }).means(),
      ]);
    }),
  );
}

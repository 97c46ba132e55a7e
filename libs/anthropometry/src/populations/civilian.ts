import { CholeskyDecomposition, inverse, Matrix } from 'ml-matrix';
import { normalQuantile } from '../people/normal.ts';
import { readCivilianFile, type CivilianFile, type CivilianGroup } from './civilian-file.ts';
import { drawOrder, factorRows, linearBodies, type Bend, type BodyRow } from './linear-bodies.ts';
import { populationOf } from './mix.ts';
import type { GroupBodies, Population } from './population.ts';
import type { SurveyGroup } from './survey.ts';

/** Measures among the first of the draw order, whose normals are turned so that each leans on few of them. */
const TURNED = 8;

/**
 * US civilians of 2015 and 2016 of 20 and more, as many women as men. Stature and weight were measured; every other
 * measure is what soldiers of that stature and weight have, with the soldiers' spread about it.
 *
 * @param file - parsed `seed-data/populations/civilian-2015.json`
 * @throws Error naming the field that does not hold together
 * @source regression with residuals after Parkinson and Reed 2010 (Ergonomics), residuals drawn as a normal vector
 */
export function civilians2015(file: unknown): Population {
  const read = readCivilianFile(file);
  return populationOf(
    {
      id: 'us-civilians-2015',
      name: 'US civilians 2015 to 2016',
      kind: 'generated',
      source: read.source,
      licence: 'US government works (from memory; no licence text came with the files)',
      cautions: [
        'Only stature and weight of civilians were measured; nobody has counted these shares.',
        'Weights beyond the heaviest soldier are carried on along the same line.',
        'Bellies of older people are under-predicted: add about 0.8 mm (men) or 0.35 mm (women) a year above 30.',
      ],
      read: new Set(['stature', 'weight_kg']),
    },
    (['women', 'men'] as const).map((group) => ({ share: 0.5, bodies: bodiesOf(read, group) })),
  );
}

function bodiesOf({ measures, percents, groups }: CivilianFile, group: SurveyGroup): GroupBodies {
  const data = groups[group];
  const { stature, ln_weight: lnWeight } = data;
  const others = drawOrder(measures);
  const places = others.map((key) => measures.indexOf(key));
  const residuals = factorRows(residualCovariance(data, places), others.length);
  const rows: BodyRow[] = [
    { key: 'stature', mean: 0, factors: Float64Array.of(1), logged: false, ...ends(stature.range) },
    {
      key: 'weight_kg',
      mean: 0,
      factors: Float64Array.of(0, 1),
      logged: true,
      ...ends(lnWeight.range, Math.exp),
    },
    ...others.map((key, n) => {
      const place = places[n] as number;
      const [mean, perMm, perLn] = data.coef[place] as [number, number, number];
      return {
        key,
        mean,
        factors: Float64Array.of(perMm, perLn, ...(residuals[n] as Float64Array)),
        logged: false,
        ...ends(data.range[place] as [number, number]),
      };
    }),
  ];
  return linearBodies(group, rows, bendOf(rows, data, percents));
}

const ends = ([low, high]: readonly [number, number], unit = (x: number) => x) => ({
  low: unit(low),
  high: unit(high),
});

function residualCovariance(
  { residual_sd, residual_corr }: CivilianGroup,
  places: readonly number[],
): Float64Array {
  return Float64Array.from({ length: places.length ** 2 }, (_, at) => {
    const a = places[Math.floor(at / places.length)] as number;
    const b = places[at % places.length] as number;
    const r = residual_corr[Math.min(a, b)]?.[Math.abs(a - b)] as number;
    return r * (residual_sd[a] as number) * (residual_sd[b] as number);
  });
}

/**
 * Turns the first normals so that the measures checked most hang on the first of them, then gives the first two the
 * counted shapes of stature and ln weight, which keep their correlation.
 */
function bendOf(rows: readonly BodyRow[], data: CivilianGroup, percents: readonly number[]): Bend {
  const { stature, ln_weight: lnWeight, r_stature_ln_weight: r } = data;
  const rest = Math.sqrt(1 - r * r);
  const statureAt = shapeOf(percents, stature.p);
  const lnWeightAt = shapeOf(percents, lnWeight.p);
  const turn = turnOf(rows.slice(0, TURNED), stature.sd, [lnWeight.sd * r, lnWeight.sd * rest]);
  const before = new Float64Array(TURNED);
  return {
    dimensions: TURNED,
    change(normals) {
      for (let i = 0; i < TURNED; i += 1) before[i] = normals[i] as number;
      for (let i = 0; i < TURNED; i += 1) {
        let sum = 0;
        for (let k = 0; k < TURNED; k += 1) sum += (turn[i * TURNED + k] as number) * (before[k] as number);
        normals[i] = sum;
      }
      const [a, b] = [normals[0] as number, normals[1] as number];
      normals[0] = statureAt(a);
      normals[1] = lnWeightAt(r * a + rest * b);
    },
  };
}

/**
 * The rotation under which the measures of the first rows, were stature and ln weight normal, become a triangular
 * product in the draw order.
 */
function turnOf(
  rows: readonly BodyRow[],
  perStature: number,
  perLnWeight: readonly [number, number],
): Float64Array {
  const size = rows.length;
  const given = drawOrder(rows.map(({ key }) => key));
  const linear = new Matrix(
    given.map((key) => {
      const { factors } = rows.find((row) => row.key === key) as BodyRow;
      const line = Array.from({ length: size }, (_, k) => factors[k] ?? 0);
      const [a = 0, b = 0] = line;
      line[0] = a * perStature + b * perLnWeight[0];
      line[1] = b * perLnWeight[1];
      return line;
    }),
  );
  const covariance = linear.mmul(linear.transpose());
  const lower = new CholeskyDecomposition(covariance).lowerTriangularMatrix;
  return Float64Array.from(inverse(linear).mmul(lower).to1DArray());
}

const REACH = 3.625;
const STEPS_PER_SD = 64;

/** Value at a normal number: straight between the counted percentiles, held at the outermost ones. */
function shapeOf(percents: readonly number[], values: readonly number[]): (z: number) => number {
  const knots = percents.map((percent) => normalQuantile(percent / 100));
  const table = Float64Array.from({ length: 2 * REACH * STEPS_PER_SD + 1 }, (_, at) => {
    const z = at / STEPS_PER_SD - REACH;
    const next = knots.findIndex((knot) => knot >= z);
    if (next <= 0) return values.at(next === 0 ? 0 : -1) as number;
    const [z0, z1] = [knots[next - 1] as number, knots[next] as number];
    const [v0, v1] = [values[next - 1] as number, values[next] as number];
    return v0 + ((z - z0) / (z1 - z0)) * (v1 - v0);
  });
  const last = table.length - 1;
  return (z) => {
    const at = Math.min(last, Math.max(0, (z + REACH) * STEPS_PER_SD));
    const below = Math.min(last - 1, Math.floor(at));
    const low = table[below] as number;
    return low + (at - below) * ((table[below + 1] as number) - low);
  };
}

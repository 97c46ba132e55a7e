// node scripts/make-civilian-population.mjs: makes seed-data/populations/civilian-2015.json from the rows of a national
// health survey (stature and weight) and from the soldiers' statistics (everything else). With --print it only prints.
// The rows are looked for in the folder that RAW_DATA names, else in shared/data beside the checkout.
import fs from 'node:fs';
import path from 'node:path';
import { gunzipSync } from 'node:zlib';
import { root } from './root.mjs';

const folder = process.env.RAW_DATA ?? path.join(root, '../shared/data');
const rowsFile = path.join(folder, 'nhanes-2015-16-adults.csv.gz');
const populations = path.join(root, 'seed-data/populations');

const PERCENTS = [
  0.02, 0.1, 0.25, 0.5, 1, 2.5, 5, 7.5, 10, 15, 20, 25, 30, 35, 40, 45, 50, 55, 60, 65, 70, 75, 80, 85, 90,
  92.5, 95, 97.5, 99, 99.5, 99.75, 99.9, 99.98,
];
const GIVEN = ['stature', 'weight_kg'];
/** Follows from three other measures. */
const DERIVED = 'acromial_height';
/** How far a drawn measure may lie from what stature and weight say, in spreads of what is left over. */
const RESIDUAL_REACH = 4;

const digits = (x, count) => Number(x.toPrecision(count));
const decimals = (x, places) => Number(x.toFixed(places));

function readPeople() {
  const [head, ...lines] = gunzipSync(fs.readFileSync(rowsFile)).toString('utf8').trim().split(/\r?\n/);
  const names = head.split(',');
  const people = { men: [], women: [] };
  for (const line of lines) {
    const cells = Object.fromEntries(line.split(',').map((cell, at) => [names[at], cell]));
    people[cells.sex === 'M' ? 'men' : 'women'].push({
      stature: Number(cells.stature_mm),
      lnWeight: Math.log(Number(cells.weight_kg)),
      share: Number(cells.sample_weight),
    });
  }
  for (const group of Object.values(people)) {
    const total = group.reduce((sum, { share }) => sum + share, 0);
    for (const person of group) person.share /= total;
  }
  return people;
}

const weighted = (people, of) => people.reduce((sum, person) => sum + person.share * of(person), 0);

function momentsOf(people) {
  const s = weighted(people, ({ stature }) => stature);
  const w = weighted(people, ({ lnWeight }) => lnWeight);
  const cov = (a, b) => weighted(people, (person) => a(person) * b(person));
  const ds = ({ stature }) => stature - s;
  const dw = ({ lnWeight }) => lnWeight - w;
  const sd = [Math.sqrt(cov(ds, ds)), Math.sqrt(cov(dw, dw))];
  return {
    mean: [s, w],
    sd,
    r: cov(ds, dw) / (sd[0] * sd[1]),
    skew: cov((p) => dw(p) ** 2, dw) / sd[1] ** 3,
  };
}

/** Weighted percentiles; each person stands at the middle of his or her own stretch. */
function percentiles(people, of) {
  const sorted = people.map((person) => [of(person), person.share]).sort((a, b) => a[0] - b[0]);
  let sum = 0;
  const at = sorted.map(([value, share]) => {
    sum += share;
    return [sum - share / 2, value];
  });
  return PERCENTS.map((percent) => {
    const p = percent / 100;
    const next = at.findIndex(([share]) => share >= p);
    if (next <= 0) return at.at(next === 0 ? 0 : -1)[1];
    const [[p0, v0], [p1, v1]] = [at[next - 1], at[next]];
    return v0 + ((p - p0) / (p1 - p0)) * (v1 - v0);
  });
}

/** Regressions on stature and ln weight, and what is left over, of one sex of the soldiers. */
function bodiesOf(summary, group) {
  const { measures, stats, corr, log, reg_stature_lnweight: regressions } = summary;
  const keys = measures.filter((key) => !GIVEN.includes(key) && key !== DERIVED);
  const logs = ['mean', 'sd'].map((field) => log[group][field][log.measures.indexOf('weight_kg')]);
  const size = log.measures.length;
  const [a, b] = GIVEN.map((key) => log.measures.indexOf(key)).sort((x, y) => x - y);
  const r = log[group].corr[a * size - (a * (a - 1)) / 2 + (b - a)];
  const sds = [stats[group].stature.sd, logs[1]];
  const correlation = (one, other) => {
    const [row, column] = [one, other].map((key) => measures.indexOf(key)).sort((x, y) => x - y);
    return corr[group][row][column - row];
  };
  const slopes = (key) => regressions[group][key].slice(1, 3);
  const explained = (one, other) => {
    const [s1, w1] = slopes(one).map((slope, n) => slope * sds[n]);
    const [s2, w2] = slopes(other).map((slope, n) => slope * sds[n]);
    return s1 * s2 + w1 * w2 + r * (s1 * w2 + w1 * s2);
  };
  const left = (one, other) =>
    correlation(one, other) * stats[group][one].sd * stats[group][other].sd - explained(one, other);
  return {
    keys,
    coefficients: keys.map((key) => regressions[group][key].slice(0, 3)),
    residualSds: keys.map((key) => regressions[group][key][3]),
    residualCorrelations: keys.map((one, row) =>
      keys
        .slice(row)
        .map((other) => decimals(left(one, other) / Math.sqrt(left(one, one) * left(other, other)), 4)),
    ),
  };
}

function groupOf(people, bodies) {
  const { mean, sd, r, skew } = momentsOf(people);
  const range = (of) => [Math.min(...people.map(of)), Math.max(...people.map(of))];
  return {
    n: people.length,
    stature: {
      mean: decimals(mean[0], 2),
      sd: decimals(sd[0], 2),
      p: percentiles(people, (p) => p.stature).map((x) => decimals(x, 1)),
      range: range((p) => p.stature),
    },
    ln_weight: {
      mean: decimals(mean[1], 5),
      sd: decimals(sd[1], 5),
      skew: decimals(skew, 3),
      p: percentiles(people, (p) => p.lnWeight).map((x) => decimals(x, 5)),
      range: range((p) => p.lnWeight).map((x) => decimals(x, 5)),
    },
    r_stature_ln_weight: decimals(r, 4),
    coef: bodies.coefficients,
    residual_sd: bodies.residualSds,
    residual_corr: bodies.residualCorrelations,
    range: bodies.coefficients.map(([b0, bs, bw], n) => {
      const says = ({ stature, lnWeight }) => b0 + bs * stature + bw * lnWeight;
      const [low, high] = range(says);
      const reach = RESIDUAL_REACH * bodies.residualSds[n];
      return [digits(low - reach, 5), digits(high + reach, 5)];
    }),
  };
}

if (!fs.existsSync(rowsFile)) {
  console.error(`${rowsFile} is not there; accepted: a folder in RAW_DATA that holds the rows.`);
  process.exit(2);
}
const people = readPeople();
const summary = JSON.parse(fs.readFileSync(path.join(populations, 'ansur2.json'), 'utf8'));
const bodies = { men: bodiesOf(summary, 'men'), women: bodiesOf(summary, 'women') };
const population = {
  about: {
    source:
      'NHANES 2015-2016, adults of 20 and more (stature, weight, examination weights, pregnant women left out); every other measure after ANSUR II (2012) regressions on stature and ln weight',
    units: 'mm; ln_weight natural log of kg',
    percentile_keys: PERCENTS,
    keys: {
      'stature, ln_weight': 'weighted mean, sd, values at percentile_keys, observed range',
      r_stature_ln_weight: 'weighted correlation',
      coef: '[intercept, per mm of stature, per unit of ln weight] in the order of measures',
      'residual_sd, residual_corr':
        'what is left over, correlations as upper triangle with the diagonal, row by row',
      range: 'what stature and weight say of anyone in the survey, and 4 residual sds beyond',
    },
  },
  measures: bodies.men.keys,
  men: groupOf(people.men, bodies.men),
  women: groupOf(people.women, bodies.women),
};
const text = `${JSON.stringify(population)
  .replace(
    /,"(women|men|measures|stature|ln_weight|coef|residual_sd|residual_corr|range|r_stature_ln_weight)":/g,
    ',\n"$1":',
  )
  .replace(/\],\[/g, '],\n[')}\n`;
if (process.argv.includes('--print')) process.stdout.write(text);
else fs.writeFileSync(path.join(populations, 'civilian-2015.json'), text);

import assert from 'node:assert/strict';
import { spawnSync } from 'node:child_process';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { drawPeople, lensHeightMm, makePlace, ruleBook, studyOnce, wear } from './lib/study-scene.mjs';
import { leastTime } from './lib/times.mjs';

const reference = fileURLToPath(new URL('reference/study_40k.py', import.meta.url));
const WARM_UP = 20;
const RUNS = 41;
/** Rounding of 32-bit sums may put so many people on the other side of a line. */
const ROUNDED = 3;

/** Least time of a study of 40,000 people against the least of the same study in vectorised NumPy, same columns. */
export async function run() {
  const people = drawPeople(40_000);
  const theirs = inNumPy(people);
  if (!theirs) return [];
  leastTime(WARM_UP, () => studyOnce(people));
  const ours = leastTime(RUNS, () => studyOnce(people));
  sameAnswers(studyOnce(people), theirs.counts, people);
  return [
    {
      name: 'study-40k-ratio',
      value: ours / theirs.leastMs,
      unit: 'times',
      aim: 0.5,
      reference: theirs.leastMs,
    },
  ];
}

/** The study by `reference/study_40k.py`; nothing where there is no Python with NumPy. */
function inNumPy(people) {
  const folder = fs.mkdtempSync(path.join(os.tmpdir(), 'study-'));
  try {
    const columns = Object.keys(people.columns);
    const file = path.join(folder, 'people.f32');
    const rows = [...columns.map((key) => people.columns[key]), Float32Array.from(people.isWoman)];
    fs.writeFileSync(file, Buffer.concat(rows.map((row) => Buffer.from(row.buffer))));
    const asked = {
      file,
      columns,
      place: makePlace(),
      rules: Object.fromEntries(ruleBook.rules.map(({ id, numbers }) => [id, numbers])),
      wear: {
        shoeMm: wear.shoeMm,
        clothingMm: ruleBook.rule('SEAT-05').numbers.clothingMediumMm,
        lapMm: ruleBook.rule('TABLE-01').numbers.clothingMediumMm,
      },
      lensHeightMm,
      toleranceMm: ruleBook.boundaryTolerance.mm,
      warmUp: WARM_UP,
      runs: RUNS,
    };
    const env = { ...process.env, OMP_NUM_THREADS: '1', OPENBLAS_NUM_THREADS: '1' };
    const answer = spawnSync('python3', [reference], { input: JSON.stringify(asked), encoding: 'utf8', env });
    if (answer.status === 0) return JSON.parse(answer.stdout);
    if (answer.error?.code === 'ENOENT' || answer.stderr.includes("No module named 'numpy'")) {
      console.error('study-40k-ratio left out: needs python3 with numpy');
      return undefined;
    }
    throw new Error(`The reference failed: ${answer.error ?? answer.stderr}`);
  } finally {
    fs.rmSync(folder, { recursive: true });
  }
}

/** The comparison means something only while both count the same people. */
function sameAnswers(ours, theirs, people) {
  const women = people.isWoman.reduce((sum, x) => sum + x, 0);
  const of = { women, men: people.count - women };
  const near = (what, { fits, atLeastTight }, counted) => {
    for (const [name, shares] of Object.entries({ fits, atLeastTight })) {
      for (const group of ['women', 'men']) {
        const difference = Math.abs(shares[group].value * of[group] - counted[name][group]);
        assert(difference <= ROUNDED, `${what}, ${name}, ${group}: ${difference} people apart`);
      }
    }
  };
  const asked = ours.checks.map(({ ruleId }) => ruleId);
  assert.deepEqual(asked.toSorted(), Object.keys(theirs.checks).toSorted());
  for (const { ruleId, outcome } of ours.checks) near(ruleId, outcome, theirs.checks[ruleId]);
  near('all', ours.all, theirs.all);
  assert.equal(ours.rejectsMost.ruleId, theirs.rejectsMost);
  assert.equal(ours.rejectsNext.ruleId, theirs.rejectsNext);
}

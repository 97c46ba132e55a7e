import { normalQuantile } from '../people/normal.ts';
import type { KnownPerson } from '../people/person.ts';
import { fixed, ofBody, type Amount } from './amount.ts';
import { eachBench, NO_PLACES } from './each-bench.ts';
import { plainQuestion, type PieceAsked, type PieceCheck } from './piece-check.ts';
import { fixedSide, question, type Entry, type Side } from './question.ts';
import { ruleNumber, type Rule } from './rule-book.ts';
import type { BenchSituation } from './situation.ts';
import type { Question } from './verdict.ts';

/** Adds 1 part in a billion so that a length which holds a whole number of places is not cut by rounding. */
const WHOLE = 1e-9;

/** A person nothing is known of: one of as many women as men. */
const ANYONE: KnownPerson = { bodyData: 'mixed', measured: {}, shoeMm: 0, clothing: 'medium' };

/**
 * Shoulder room: length of a bench against the shoulder widths of those who sit on it. An empty place counts as
 * anyone; a bench nobody sits on is read as a random group.
 *
 * @source rule SIDE-01
 */
export const shoulderRoom: PieceCheck = {
  id: 'SIDE-01',
  ask: eachBench((bench, asked) => {
    const count = bench.placeIds.length;
    if (count === 0) return NO_PLACES;
    const each = ruleNumber(asked.rule, 'allowanceEach');
    const entries: Entry[] = [];
    let empty = 0;
    for (const id of bench.placeIds) {
      const seated = asked.seated.get(id);
      if (seated) entries.push([seated.name, ofBody(seated.body, 'bideltoid_breadth')]);
      else empty += 1;
    }
    if (empty === count) return randomGroup(asked, bench);
    for (let n = 0; n < empty; n += 1) {
      // A new person object each time: strangers do not share one body.
      entries.push(['anyone', ofBody(asked.model.predict({ ...ANYONE }), 'bideltoid_breadth')]);
    }
    return lengthQuestion(bench, {
      pass: [...entries, [`${each} mm each`, fixed(each * count)]],
      further: [['shoulders touching', fixed(-each * count)]],
    });
  }),
};

function randomGroup({ rule, model }: PieceAsked, bench: BenchSituation): Question {
  const count = bench.placeIds.length;
  const { components } = model.predict(ANYONE).estimate('bideltoid_breadth');
  const mean = components.reduce((sum, c) => sum + c.weight * c.mean, 0);
  const variance = components.reduce((sum, c) => sum + c.weight * (c.sd ** 2 + (c.mean - mean) ** 2), 0);
  const lines = groupNeedMm(rule, mean, Math.sqrt(variance), count);
  return lengthQuestion(bench, {
    pass: [
      [`${count} mean shoulder widths`, fixed(lines.failMm)],
      ['for 95 groups in 100', fixed(lines.spreadMm)],
      ['clothing and movement', fixed(lines.passMm - lines.failMm - lines.spreadMm)],
    ],
    fail: [[`${count} mean shoulder widths`, fixed(lines.failMm)]],
  });
}

/**
 * Length that random groups of sitters need side by side.
 *
 * @param rule - SIDE-01
 * @param meanMm - mean shoulder width
 * @param sdMm - spread of the shoulder width
 * @param count - sitters
 * @returns pass and fail line, and the part of the pass line that the spread takes
 * @source rule SIDE-01: n · mean + z · sd · √n + n · allowance
 */
export function groupNeedMm(
  rule: Rule,
  meanMm: number,
  sdMm: number,
  count: number,
): { passMm: number; failMm: number; spreadMm: number } {
  const z = normalQuantile(ruleNumber(rule, 'groupPercentile') / 100);
  const failMm = count * meanMm;
  const spreadMm = z * sdMm * Math.sqrt(count);
  return { failMm, spreadMm, passMm: failMm + spreadMm + count * ruleNumber(rule, 'allowanceEach') };
}

const lengthQuestion = (bench: BenchSituation, lower: Side): Question =>
  plainQuestion(`length of ${bench.mark}`, bench.lengthMm, { lower });

/**
 * Width of a place: length of a bench per place, and the load a code counts for it.
 *
 * @source rule SIDE-02
 */
export const placeWidth: PieceCheck = {
  id: 'SIDE-02',
  ask: eachBench((bench, { rule }) => {
    const count = bench.placeIds.length;
    if (count === 0) return NO_PLACES;
    const value: Amount = fixed(bench.lengthMm / count);
    const load = codeLoad(rule, bench.lengthMm);
    return question({
      value,
      setLedger: () => [
        { label: `length of ${bench.mark}`, value: bench.lengthMm, kind: 'term' },
        { label: 'places claimed', value: count, kind: 'term' },
        { label: 'width of a place', value: bench.lengthMm / count, kind: 'total' },
        { label: 'persons a code counts, as a bench', value: load.bench, kind: 'total' },
        { label: 'persons a code counts, as a booth', value: load.booth, kind: 'total' },
      ],
      lower: fixedSide(ruleNumber(rule, 'pass'), ruleNumber(rule, 'fail')),
    });
  }),
};

/**
 * Persons a building code counts for a length of fixed seating.
 *
 * @param rule - SIDE-02
 * @param lengthMm - length of the bench; finite, >= 0
 * @returns whole persons, as a bench without arms and as a booth
 * @source rule SIDE-02
 */
export function codeLoad(rule: Rule, lengthMm: number): { bench: number; booth: number } {
  return {
    bench: Math.floor(lengthMm / ruleNumber(rule, 'codeBench') + WHOLE),
    booth: Math.floor(lengthMm / ruleNumber(rule, 'codeBooth') + WHOLE),
  };
}

import { fixed, ofBody, type Amount } from './amount.ts';
import { nothing, plainQuestion, type PieceAnswer, type PieceAsked, type PieceCheck } from './piece-check.ts';
import { fixedSide, question, type Entry, type Side } from './question.ts';
import { ruleNumber, type Rule } from './rule-book.ts';
import type { BenchSituation, PlaceSituation } from './situation.ts';
import { normalQuantile } from '../people/normal.ts';
import type { KnownPerson } from '../people/person.ts';
import type { Question } from './verdict.ts';

/** Adds 1 part in a billion so that a length which holds a whole number of places is not cut by rounding. */
const WHOLE = 1e-9;
const DEGREES = 180 / Math.PI;

/** Asks every bench; a bench without places has nobody to ask for. */
const eachBench =
  (ask: (bench: BenchSituation, asked: PieceAsked) => PieceAnswer['said']) =>
  (asked: PieceAsked): PieceAnswer[] => {
    const { benches } = asked.situation;
    if (benches.length === 0) return nothing('no bench');
    return benches.map((bench) => ({
      pieceIds: [bench.pieceId],
      marks: [bench.mark],
      said: ask(bench, asked),
    }));
  };

/** Asks every bench by the place that comes out lowest. */
const byWorstPlace = (ask: (place: PlaceSituation, asked: PieceAsked) => number | undefined) => {
  return (bench: BenchSituation, asked: PieceAsked, worse: (value: number) => number): number | undefined => {
    const values = bench.placeIds
      .map((id) => asked.places.get(id))
      .map((place) => (place ? ask(place, asked) : undefined))
      .filter((value) => value !== undefined);
    return values.length === 0 ? undefined : values.reduce((a, b) => (worse(b) < worse(a) ? b : a));
  };
};

const NO_PLACES = { kind: 'doesNotApply', reason: 'no place on the bench' } as const;

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

const heelRoom = byWorstPlace((place) => place.heelRoomMm);

/**
 * Heel space: set-back of the riser at the floor behind the front edge.
 *
 * @source rule SEAT-07
 */
export const heelSpace: PieceCheck = {
  id: 'SEAT-07',
  ask: eachBench((bench, asked) => {
    const value = heelRoom(bench, asked, (v) => v);
    if (value === undefined) return { kind: 'doesNotApply', reason: 'open base' };
    return plainQuestion('riser behind the front edge', value, {
      lower: fixedSide(ruleNumber(asked.rule, 'pass'), ruleNumber(asked.rule, 'fail')),
    });
  }),
};

const tilt = byWorstPlace((place) => place.seatTiltRad * DEGREES);

/**
 * Seat tilt, front edge up.
 *
 * @source rule SEAT-06
 */
export const seatTilt: PieceCheck = {
  id: 'SEAT-06',
  ask: eachBench((bench, asked) => {
    const value = tilt(bench, asked, (v) => -Math.abs(v));
    if (value === undefined) return NO_PLACES;
    return plainQuestion('seat from level', value, sides(asked.rule, 'passLower', 'passUpper'));
  }),
};

const angle = byWorstPlace((place) =>
  place.backTopMm === undefined ? undefined : 90 + (place.backLeanRad - place.seatTiltRad) * DEGREES,
);

/**
 * Angle between seat and back.
 *
 * @source rule BACK-01
 */
export const backAngle: PieceCheck = {
  id: 'BACK-01',
  ask: eachBench((bench, asked) => {
    const value = angle(bench, asked, (v) => v);
    if (value === undefined) return { kind: 'doesNotApply', reason: 'no back' };
    const { backPosture } = asked.settings;
    return plainQuestion(
      'back from the seat',
      value,
      sides(asked.rule, `${backPosture}PassLower`, `${backPosture}PassUpper`),
    );
  }),
};

/** Asks the backs of benches; a wall alone is a back without a curve. */
const eachBack = (ask: (lumbar: NonNullable<BenchSituation['lumbar']>, rule: Rule) => PieceAnswer['said']) =>
  eachBench(({ lumbar }, { rule }) =>
    lumbar ? ask(lumbar, rule) : { kind: 'doesNotApply', reason: 'no back' },
  );

/**
 * Height of the curve of a back over the pressed seat.
 *
 * @source rule BACK-02
 */
export const lumbarHeight: PieceCheck = {
  id: 'BACK-02',
  ask: eachBack(({ apexMm }, rule) =>
    apexMm === 0
      ? { kind: 'doesNotApply', reason: 'the back is flat' }
      : plainQuestion('curve over the pressed seat', apexMm, {
          lower: fixedSide(ruleNumber(rule, 'passLower'), ruleNumber(rule, 'failLower')),
          upper: fixedSide(ruleNumber(rule, 'passUpper'), ruleNumber(rule, 'failUpper')),
        }),
  ),
};

/** Said on the ledger of a back without a recess, beside the pass line. */
const FLAT = 'the back is flat; a recess is better';

/**
 * Room for the pelvis: how far the back gives way a little over the seat.
 *
 * @source rule BACK-04
 */
export const pelvisRoom: PieceCheck = {
  id: 'BACK-04',
  ask: eachBack(({ recessMm }, rule) =>
    plainQuestion(recessMm === 0 ? FLAT : 'back gives way by', recessMm, {
      lower: fixedSide(ruleNumber(rule, 'pass'), ruleNumber(rule, 'fail')),
    }),
  ),
};

/**
 * People that whoever sits innermost slides past to get out.
 *
 * @source rule EGRESS-08
 */
export const slidePast: PieceCheck = {
  id: 'EGRESS-08',
  ask: eachBench((bench, { rule }) => {
    if (bench.placeIds.length === 0) return NO_PLACES;
    if (bench.slidePast === undefined) {
      return { kind: 'notAsked', reason: `the drawing shows no way out of ${bench.mark}` };
    }
    return plainQuestion('people to slide past', bench.slidePast, {
      upper: fixedSide(ruleNumber(rule, 'pass'), ruleNumber(rule, 'fail')),
    });
  }),
};

const sides = (rule: Rule, lower: string, upper: string) => ({
  lower: fixedSide(ruleNumber(rule, lower), ruleNumber(rule, 'failLower')),
  upper: fixedSide(ruleNumber(rule, upper), ruleNumber(rule, 'failUpper')),
});

import { eachBench, NO_PLACES } from './each-bench.ts';
import { plainQuestion, type PieceAnswer, type PieceAsked, type PieceCheck } from './piece-check.ts';
import { fixedSide } from './question.ts';
import { ruleNumber, type Rule } from './rule-book.ts';
import type { BenchSituation, PlaceSituation } from './situation.ts';

const DEGREES = 180 / Math.PI;

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

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  check,
  person,
  personCell,
  place,
  publicCell,
  set,
  sill,
  sitter,
  verdictOf,
} from '../../test/example-set.ts';
import type { KnownPerson } from '../people/person.ts';
import { ruleBook } from '../../test/seed.ts';
import { ruleNumber } from './rule-book.ts';
import { sinkBand } from './sink-band.ts';
import type { FoamSituation, PlaceSituation } from './situation.ts';

/** Vector of the trade's estimator: 170 lb on 4 in of IFD 36, support factor 2, goes down 1.28 in. */
const FOAM: FoamSituation = { thicknessMm: 101.6, ifd25N: 36 * 4.4482216152605, supportFactor: 2 };
const HEAVY_KG = 170 * 0.45359237;
const DROP_MM = 1.28 * 25.4;
const TOP_MM = 480;

const known = (change: Partial<KnownPerson> = {}): KnownPerson =>
  person({ weightKg: HEAVY_KG, measured: { elbow_rest_height: 230 }, ...change });
const cushioned = (change: Partial<PlaceSituation> = {}): PlaceSituation =>
  place({ seatTopFrontMm: TOP_MM, seatTopHipMm: TOP_MM, deckHeightMm: 380, foam: FOAM, ...change });
/** The same seat, hard, as low as the cushion is pressed. */
const hard = (downMm: number, change: Partial<PlaceSituation>): PlaceSituation =>
  place({ seatTopFrontMm: TOP_MM - downMm, seatTopHipMm: TOP_MM - downMm, deckHeightMm: 380, ...change });
const elbow = (at: PlaceSituation, who = known()) => verdictOf(personCell('SILL-01', at, who));
const sillAt = (topMm: number): Partial<PlaceSituation> => ({ sills: [sill({ topMm })] });

describe('a verdict over the range of a drop', () => {
  const rule = ruleBook.rule('SILL-01');
  const [pass, fail] = [ruleNumber(rule, 'pass'), ruleNumber(rule, 'fail')];
  /** Height of a sill whose upper line is reached with the cushion at its best estimate. */
  const onLine = (line: number) => TOP_MM - DROP_MM + 230 + line;

  it('shows the range and what it rests on', () => {
    const { drops, marginRange, margin } = elbow(cushioned(sillAt(onLine(0))));
    expect(drops).toHaveLength(1);
    expect(drops![0]!.bestMm).toBeCloseTo(DROP_MM, 0);
    expect(drops![0]!.lowMm).toBeCloseTo(0.7 * DROP_MM, 0);
    expect(drops![0]!.highMm).toBeCloseTo(1.3 * DROP_MM, 0);
    expect(drops![0]).toMatchObject({ error: 0.3, sits: 0, bottomsOut: 'no' });
    expect(marginRange!.low).toBeLessThan(margin);
    expect(marginRange!.high).toBeLessThanOrEqual(fail + 1e-6);
  });

  it('is no pass where the foam may let the sitter down past the line, and says to sit on it', () => {
    const near = elbow(cushioned(sillAt(onLine(pass) - 3)));
    expect(elbow(hard(DROP_MM, sillAt(onLine(pass) - 3))).verdict).toBe('fits');
    expect(near).toMatchObject({ verdict: 'tight', estimated: true, settleBySit: true, settleWith: [] });
    const past = elbow(cushioned(sillAt(onLine(fail) - 3)));
    expect(elbow(hard(DROP_MM, sillAt(onLine(fail) - 3))).verdict).toBe('tight');
    expect(past).toMatchObject({ verdict: 'notKnown', settleBySit: true });
  });

  it('is what both ends say where they say the same', () => {
    fc.assert(
      fc.property(fc.double({ min: 560, max: 860, noNaN: true }), (topMm) => {
        const { lowMm, highMm } = sinkBand(FOAM, HEAVY_KG);
        const ends = [lowMm, highMm].map((mm) => elbow(hard(mm, sillAt(topMm))).verdict);
        const { verdict } = elbow(cushioned(sillAt(topMm)));
        // A sill may be too low at one end and too high at the other: that is not one and the same.
        fc.pre(ends[0] === ends[1] && Math.abs(topMm - onLine(0)) > fail);
        expect(verdict).toBe(ends[0]);
      }),
    );
  });

  it('hangs on no cushion where there is none', () => {
    const { drops, settleBySit, estimated } = elbow(hard(DROP_MM, sillAt(onLine(pass))));
    expect([drops, settleBySit, estimated]).toEqual([undefined, undefined, false]);
    expect(verdictOf(personCell('SEAT-05', cushioned(), known())).drops).toBeUndefined();
  });

  it('is settled by sits', () => {
    const tried = { ...FOAM, tested: { factor: 1, error: 0.02, sits: 40 } };
    const at = { ...sillAt(onLine(pass) - 3), foam: tried };
    expect(elbow(cushioned(at))).toMatchObject({ verdict: 'fits', drops: [{ sits: 40, error: 0.02 }] });
    const softer = { ...FOAM, tested: { factor: 1.5, error: 0.02, sits: 40 } };
    expect(elbow(cushioned({ ...at, foam: softer })).value).toBeCloseTo(
      elbow(cushioned(at)).value + 0.5 * DROP_MM,
      0,
    );
  });

  it('counts for the public as well', () => {
    const { drops } = verdictOf(publicCell('SILL-02', cushioned(sillAt(700))));
    expect(drops![0]!.bestMm).toBeCloseTo(sinkBand(FOAM, 77).bestMm, 9);
  });

  it('of two who face each other counts both cushions', () => {
    const places = ['b1:1', 'b2:1'].map((placeId) =>
      cushioned({ placeId, pieceId: placeId.slice(0, 2), foam: { ...FOAM } }),
    );
    const facing = [
      {
        pieceIds: ['b1', 'b2'] as [string, string],
        marks: ['B1', 'B2'] as [string, string],
        gapMm: 900,
        pairs: [['b1:1', 'b2:1']] as [string, string][],
      },
    ];
    const who = known({ measured: { eye_height_sitting: 750 } });
    const { piecesAndWays } = check(
      set({ places, facing }),
      [sitter(who, 'b1:1'), sitter(who, 'b2:1', 'Bo')],
      { appleBoxes: { full: 0, half: 0, quarter: 0, pancake: 0 } },
    );
    const cell = piecesAndWays.find(({ ruleId }) => ruleId === 'HEAD-04')!;
    const { value, drops, marginRange } = verdictOf(cell);
    expect(value).toBeCloseTo(0, 9);
    expect(drops).toHaveLength(2);
    // Independent: the spread of both is that of one times the root of two, to either side of level.
    const one = 0.3 * DROP_MM;
    expect(marginRange!.high - marginRange!.low).toBeGreaterThan(0.5 * one);
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lapTable, person, place, sill } from '../../test/example-set.ts';
import { model, ruleBook } from '../../test/seed.ts';
import type { KnownPerson } from '../people/person.ts';
import { checkSitter } from './check-set.ts';
import type { PlaceSituation } from './situation.ts';
import { SINK_ERROR } from './sink-band.ts';
import { standIn, type StandInCheck } from './stand-in.ts';

const SETTINGS = { backPosture: 'dining', trafficBehind: 'none' } as const;
const HALF_A_FOOT_MM = 152.4;

const HETTY: KnownPerson = {
  bodyData: 'women',
  stature: { mm: 1600, source: 'measured' },
  measured: {},
  shoeMm: 25,
  clothing: 'light',
};
const carpenter = (change: Partial<KnownPerson> = {}): KnownPerson => ({
  ...HETTY,
  bodyData: 'men',
  stature: { mm: 1600 + HALF_A_FOOT_MM, source: 'measured' },
  ...change,
});

const FOAM = { thicknessMm: 75, ifd25N: 150, supportFactor: 2.4 };
const everything = place({
  table: lapTable({ kneeDepthMm: 320, footDepthMm: 500 }),
  sills: [sill(), sill({ side: 'right', topMm: 640 })],
  overhead: { pieceId: 'o1', mark: 'O1', undersideMm: 1500 },
  backTopMm: 900,
  wallMm: { left: 330, right: 400 },
});

const tried = (castMember: KnownPerson, other: KnownPerson, at: PlaceSituation = everything) =>
  standIn({ place: at, castMember, standIn: other, ruleBook, model, settings: SETTINGS });

function of(checks: readonly StandInCheck[], ruleId: string) {
  const check = checks.find((one) => one.ruleId === ruleId);
  if (!check?.difference || !check.room) throw new Error(`nothing said of ${ruleId}`);
  return { ...check, difference: check.difference, room: check.room };
}

describe('a stand-in tries the seat', () => {
  it('carries everything over between two people of one body', () => {
    for (const checks of [
      tried(HETTY, HETTY, { ...everything, foam: FOAM }),
      tried(
        model.mannequin({ bodyData: 'women', measure: 'stature', percentile: 30 }),
        structuredClone(model.mannequin({ bodyData: 'women', measure: 'stature', percentile: 30 })),
      ),
    ]) {
      const asked = checks.filter(({ answer }) => answer !== 'notAsked');
      expect(asked.length).toBeGreaterThan(10);
      for (const check of asked) {
        expect(check.answer, check.ruleId).toBe('carriesOver');
        expect(check.side, check.ruleId).toBe('same');
        expect(check.because, check.ruleId).toBe('bodies');
        expect(check.saysLittle, check.ruleId).toBe(false);
        for (const spread of [check.difference, ...check.parts]) {
          expect(spread?.best, check.ruleId).toBeCloseTo(0, 6);
          expect((spread?.high ?? 1) - (spread?.low ?? 0), check.ruleId).toBeCloseTo(0, 6);
        }
      }
    }
  });

  it('two of one height are not one body', () => {
    const elbow = of(tried(HETTY, { ...HETTY }), 'SILL-01');
    expect(elbow.difference.best).toBeCloseTo(0, 6);
    expect(elbow.difference.high - elbow.difference.low).toBeGreaterThan(60);
    expect(elbow.answer).toBe('cannotTell');
    expect(elbow.take?.key).toBe('elbow_rest_height');
  });

  it('a carpenter half a foot taller misleads about knee room', () => {
    // Underside between the two knees: his knees touch, hers have room.
    const at = place({ table: lapTable({ undersideMm: 560, topMm: 592 }) });
    const knees = of(tried(HETTY, carpenter(), at), 'TABLE-02');
    expect(knees.misleads).toBe(true);
    expect(knees.answer).not.toBe('carriesOver');
    expect(knees.side).toBe('lessRoom');
    expect(knees.room.standIn).toBeLessThan(0);
    expect(knees.room.castMember).toBeGreaterThan(0);
    expect(knees.parts).toHaveLength(1);
    expect(knees.parts[0]).toMatchObject({ key: 'knee_height_sitting' });
    expect(knees.parts[0]?.best).toBeGreaterThan(40);
    // The gap that he measures and the difference give hers.
    expect(knees.room.standIn + knees.difference.best).toBeCloseTo(knees.room.castMember, 6);
  });

  it('the tall one is on the unsafe side of a seat that hangs the feet of the short one', () => {
    const high = of(tried(HETTY, carpenter(), place({ seatTopFrontMm: 480, seatTopHipMm: 480 })), 'SEAT-02');
    expect(high.side).toBe('moreRoom');
    expect(high.difference.best).toBeLessThan(0);
    expect(high.misleads || high.answer !== 'carriesOver').toBe(true);
  });

  it('carries over by room alone where there is much of it, and then says how the bodies differ', () => {
    const roomy = place({ table: lapTable({ undersideMm: 760, topMm: 790 }) });
    const her = person({ shoeMm: 25, measured: { knee_height_sitting: 500 } });
    const by = (differenceMm: number) =>
      of(
        tried(her, person({ shoeMm: 25, measured: { knee_height_sitting: 500 + differenceMm } }), roomy),
        'TABLE-02',
      );
    expect(by(0)).toMatchObject({ answer: 'carriesOver', because: 'bodies', saysLittle: false });
    expect(by(30)).toMatchObject({ answer: 'carriesOver', because: 'room', saysLittle: false });
    expect(by(-30).because).toBe('room');
    const { littleSaidMm } = ruleBook.standIn;
    expect(by(littleSaidMm).saysLittle).toBe(false);
    expect(by(littleSaidMm + 1)).toMatchObject({ answer: 'carriesOver', because: 'room', saysLittle: true });
    expect(by(-littleSaidMm - 1).saysLittle).toBe(true);
  });

  it('says little of the seat depth of somebody with much shorter thighs, however much room there is', () => {
    const shallow = place({ effectiveDepthMm: 330 });
    const her = person({ measured: { buttock_popliteal_length: 420 } });
    const him = person({ measured: { buttock_popliteal_length: 560 } });
    expect(of(tried(her, him, shallow), 'SEAT-04')).toMatchObject({ saysLittle: true });
  });

  it('adds by hand: knees of 500 and 560, shoes of 25 and 40', () => {
    const her = person({ shoeMm: 25, measured: { knee_height_sitting: 500 } });
    const him = person({ shoeMm: 40, measured: { knee_height_sitting: 560 } });
    const at = place({ table: lapTable({ undersideMm: 590, topMm: 620 }) });
    const knees = of(tried(her, him, at), 'TABLE-02');
    expect(knees.difference).toEqual({ best: 75, low: 75, high: 75 });
    expect(knees.parts).toEqual([{ key: 'knee_height_sitting', best: 60, low: 60, high: 60 }]);
    expect(knees.answer).toBe('withDifference');
    expect(knees.because).toBeUndefined();
    expect(knees.misleads).toBe(true);
    expect(knees.saysLittle).toBe(true);
  });

  it('says so where the weights decide how far the cushion goes down', () => {
    const lying = place({ foam: { thicknessMm: 150, ifd25N: 90, supportFactor: 2.2 }, sills: [sill()] });
    const known = { measured: { elbow_rest_height: 230 } };
    const open = of(tried({ ...HETTY, ...known }, carpenter(known), lying), 'SILL-01');
    expect(open.parts.map(({ key }) => key)).toContain('weight_kg');
    expect(open.difference.high - open.difference.low).toBeGreaterThan(20);
    const weighed = of(
      tried({ ...HETTY, ...known, weightKg: 58 }, carpenter({ ...known, weightKg: 84 }), lying),
      'SILL-01',
    );
    const { high, low, best } = weighed.difference;
    // One and the same cushion: what is not known of it is a share of the difference, not of either drop.
    expect(high - low).toBeCloseTo(2 * SINK_ERROR.share * Math.abs(best), 2);
    expect(best).not.toBeCloseTo(0, 0);
  });

  it('leaves out what is not asked at the place', () => {
    const [knees] = tried(HETTY, carpenter(), place()).filter(({ ruleId }) => ruleId === 'TABLE-02');
    expect(knees).toMatchObject({ answer: 'notAsked', reason: 'no table', parts: [] });
  });

  const someone = fc.record({
    bodyData: fc.constantFrom('women' as const, 'men' as const, 'mixed' as const),
    stature: fc.record({
      mm: fc.integer({ min: 1500, max: 1950 }),
      source: fc.constantFrom('measured' as const, 'told' as const),
    }),
    measured: fc.constant({}),
    shoeMm: fc.integer({ min: 0, max: 60 }),
    clothing: fc.constantFrom('light' as const, 'medium' as const, 'heavy' as const),
  });

  it('changes sign when the two change seats', () => {
    fc.assert(
      fc.property(someone, someone, (one, other) => {
        const there = tried(one, other);
        const back = tried(other, one);
        for (const [i, check] of there.entries()) {
          const turned = back[i] as StandInCheck;
          for (const part of check.parts) {
            const same = turned.parts.find(({ key }) => key === part.key);
            if (!same) continue;
            expect(same.best).toBeCloseTo(-part.best, 6);
            expect(same.low).toBeCloseTo(-part.high, 4);
            expect(same.high).toBeCloseTo(-part.low, 4);
          }
          if (check.ruleId !== 'TABLE-02' || !check.difference || !turned.difference) continue;
          expect(turned.difference.best).toBeCloseTo(-check.difference.best, 6);
          expect(turned.difference.low).toBeCloseTo(-check.difference.high, 4);
        }
      }),
      { numRuns: 8 },
    );
  });

  it('is never wider for one more measured part', () => {
    fc.assert(
      fc.property(someone, someone, fc.constantFrom('castMember', 'standIn'), (one, other, who) => {
        const before = tried(one, other);
        for (const [ruleId, key] of [
          ['TABLE-02', 'knee_height_sitting'],
          ['SILL-01', 'elbow_rest_height'],
        ] as const) {
          const taken = (known: KnownPerson): KnownPerson => ({
            ...known,
            measured: { [key]: model.predict(known).mean(key) },
          });
          const after = who === 'castMember' ? tried(taken(one), other) : tried(one, taken(other));
          const width = (checks: readonly StandInCheck[]) => {
            const { difference } = of(checks, ruleId);
            return difference.high - difference.low;
          };
          expect(width(after), ruleId).toBeLessThanOrEqual(width(before) + 1e-3);
        }
      }),
      { numRuns: 8 },
    );
  });

  it('reads the same rooms as the fit sheet', () => {
    const row = checkSitter(
      {
        situation: { places: [everything], benches: [], tables: [], facing: [], corners: [], ways: [] },
        ruleBook,
        model,
        settings: SETTINGS,
      },
      { id: 'h', name: 'Hetty', kind: 'cast', placeId: everything.placeId, person: HETTY },
    );
    for (const check of tried(HETTY, carpenter())) {
      const cell = row.cells.find(({ ruleId }) => ruleId === check.ruleId);
      if (cell?.outcome.kind !== 'verdict') expect(check.answer, check.ruleId).toBe('notAsked');
      else expect(check.room?.castMember, check.ruleId).toBeCloseTo(cell.outcome.margin, 9);
    }
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lapTable, place } from '../../test/example-set.ts';
import { outsideCheck } from '../../test/outside-check.ts';
import { fitRules, ruleBook } from '../../test/seed.ts';
import { lensHeightMm, places, raised, soldiers, wear } from '../../test/study-people.ts';
import { loadRuleBook } from '../checks/rule-book.ts';
import type { Draws } from '../populations/population.ts';
import { curveOf, mapOf, mergeCurves } from './curve.ts';
import { groupShares, type GroupShares } from './group-shares.ts';
import { sharesOf, type ShareOutcome } from './shares.ts';
import { createStudy } from './study.ts';

const setup = { places, ruleBook, wear, lensHeightMm };
const people = soldiers.draw(2000, 11);

function fitsOf(outcome: ShareOutcome | undefined): GroupShares {
  if (outcome?.kind !== 'shares') throw new Error(`no shares: ${outcome?.kind}`);
  return outcome.fits;
}

describe('a bench of five limits, counted in the survey’s rows', () => {
  // Seat 407 with a shoe of 25; depth 430 within 0.95 of the thigh; elbows within 610; 212 over the seat with 25 to
  // spare; hips and 25 within 457. The rules are given these limits and nothing else. The survey's rows are whole
  // millimetres, so the drawn people are rounded like them.
  const numbers: Record<string, Record<string, number>> = {
    'SEAT-02': { levelDeg: 0, steepDeg: 90 },
    'SEAT-04': { passLowerShare: 0, failLowerShare: 0 },
    'SIDE-03': { allowanceMm: 0 },
  };
  const limits = loadRuleBook({
    ...fitRules,
    rules: fitRules.rules.map((rule) => ({ ...rule, numbers: { ...rule.numbers, ...numbers[rule.id] } })),
  });
  const bench = place({
    effectiveDepthMm: 430,
    widthMm: 457,
    wallMm: { left: 305 },
    table: lapTable({ undersideMm: 407 + 212 }),
  });
  const asked = { shoeMm: 25, clothing: 'medium' } as const;
  const ruleIds = ['SEAT-02', 'SEAT-04', 'SIDE-03', 'TABLE-01', 'SEAT-05'];
  const drawn = soldiers.draw(40_000, 1);
  const rounded = Object.entries(drawn.columns).map(([key, column]) => [key, column.map(Math.round)]);
  const { checks, all } = createStudy(
    { ...drawn, columns: Object.fromEntries(rounded) as Draws['columns'] },
    {
      places: [bench],
      ruleBook: limits,
      wear: { women: asked, men: asked },
      ticked: { ruleIds },
    },
  ).shares();

  it.each([
    ['men', [97.9, 97.3, 72.9, 69.9, 95.1], 57.5],
    ['women', [61.6, 88.3, 99.4, 91.6, 85.3], 49.1],
  ] as const)('%s: each limit, and all five at once', (group, each, joint) => {
    const check = (what: string, outcome: ShareOutcome | undefined, expected: number) => {
      outsideCheck({
        source: 'people counted in the rows of ANSUR II',
        what: `${group}, bench of five limits, ${what}`,
        expected,
        ours: 100 * (fitsOf(outcome)[group]?.value as number),
        tolerance: 2.5,
        unit: 'points',
      });
    };
    ruleIds.forEach((id, at) => {
      check(id, checks.find(({ ruleId }) => ruleId === id)?.outcome, each[at] as number);
    });
    check('all at once', all, joint);
  });
});

describe('laws of shares', () => {
  const study = createStudy(people, setup);
  const counts = study.partial();
  const shares = study.shares();

  it('no joint share is above the share of any rule or place in it; tight never lowers a share', () => {
    const all = fitsOf(shares.all).mixed.value;
    for (const { outcome } of [...shares.checks, ...shares.places]) {
      expect(all).toBeLessThanOrEqual(fitsOf(outcome).mixed.value);
      if (outcome.kind !== 'shares') continue;
      expect(outcome.atLeastTight.mixed.value).toBeGreaterThanOrEqual(outcome.fits.mixed.value);
    }
  });

  it('mixing is linear', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), (women) => {
        const mixed = sharesOf(counts, { mix: { women, men: 1 - women } });
        for (const [at, { outcome }] of mixed.checks.entries()) {
          const own = fitsOf(shares.checks[at]?.outcome);
          const expected = women * (own.women?.value as number) + (1 - women) * (own.men?.value as number);
          expect(fitsOf(outcome).mixed.value).toBeCloseTo(expected, 12);
        }
      }),
      { numRuns: 20 },
    );
  });

  it('raising a limit never lowers its share', () => {
    const byMm = fc.integer({ min: 0, max: 80 });
    fc.assert(
      fc.property(byMm, byMm, (a, b) => {
        const at = (by: number) => {
          const [first] = places;
          if (!first?.table) throw new Error('no table');
          const wider = {
            ...first,
            widthMm: 380 + by,
            table: { ...first.table, undersideMm: 560 + by },
          };
          const { checks } = study.countAt([wider]);
          return ['SEAT-05', 'TABLE-01', 'TABLE-02'].map((id) => {
            const tally = checks.find(({ ruleId }) => ruleId === id)?.fits;
            return tally ? tally.women + tally.men : NaN;
          });
        };
        const [low, high] = [at(Math.min(a, b)), at(Math.max(a, b))];
        low.forEach((count, n) => {
          expect(high[n]).toBeGreaterThanOrEqual(count);
        });
      }),
      { numRuns: 25 },
    );
  });

  it('the order of places and of ticks does not matter', () => {
    const ruleIds = shares.checks.map(({ ruleId }) => ruleId);
    const placeIds = places.map(({ placeId }) => placeId);
    fc.assert(
      fc.property(
        fc.shuffledSubarray(ruleIds, { minLength: 1 }),
        fc.shuffledSubarray(placeIds, { minLength: 1 }),
        fc.shuffledSubarray(places, { minLength: places.length }),
        (rules, ticked, order) => {
          const one = createStudy(people, { ...setup, ticked: { ruleIds: rules, placeIds: ticked } });
          const other = createStudy(people, {
            ...setup,
            places: order,
            ticked: { ruleIds: rules.toSorted(), placeIds: ticked.toSorted() },
          });
          expect(other.partial().all).toEqual(one.partial().all);
        },
      ),
      { numRuns: 15 },
    );
  });

  it('seeds agree within 0.3 points', () => {
    const points = [1, 2, 3].map((seed) => {
      const { all, checks } = createStudy(soldiers.draw(40_000, seed), {
        ...setup,
        places: places.slice(0, 1),
        ticked: { ruleIds: ['SEAT-02', 'SEAT-04', 'TABLE-01', 'SILL-01', 'SEAT-05'] },
      }).shares();
      return [all, ...checks.map(({ outcome }) => outcome)].map(
        (outcome) => 100 * fitsOf(outcome).mixed.value,
      );
    });
    for (const [at] of (points[0] as number[]).entries()) {
      const values = points.map((seed) => seed[at] as number);
      expect(Math.max(...values) - Math.min(...values)).toBeLessThan(0.3);
    }
  });
});

describe('the range of a share', () => {
  const nobody = { women: 0, men: 0 };

  it('is Wilson’s interval', () => {
    // 50 of 100: 0.4038 to 0.5962; 0 of 100: 0 to 0.0370, by hand with z = 1.96.
    const of = { women: 100, men: 0 };
    const { mixed, women, men } = groupShares({ women: 50, men: 0 }, of, { women: 1, men: 0 });
    expect(mixed.low).toBeCloseTo(0.4038, 4);
    expect(mixed.high).toBeCloseTo(0.5962, 4);
    expect(women).toEqual(mixed);
    expect(men).toBeUndefined();
    const none = groupShares(nobody, of, { women: 1, men: 0 }).mixed;
    expect(none.low).toBe(0);
    expect(none.high).toBeCloseTo(0.037, 4);
  });

  it('grows when few people stand behind the body data', () => {
    const of = { women: 20_000, men: 20_000 };
    const half = { women: 10_000, men: 10_000 };
    const drawn = groupShares(half, of, { women: 0.5, men: 0.5 }).mixed;
    const surveyed = groupShares(half, of, { women: 0.5, men: 0.5 }, { women: 400, men: 400 }).mixed;
    // 1.96 · √(0.25 / 40,000) = 0.0049; with 400 surveyed of each sex 1.96 · √(0.25/2 · (1/20,000 + 1/400)) = 0.0350.
    expect(drawn.high - drawn.value).toBeCloseTo(0.0049, 4);
    expect(surveyed.high - surveyed.value).toBeCloseTo(0.035, 3);
  });

  it('refuses a mix of people who were not drawn', () => {
    const counts = createStudy(soldiers.draw(300, 1), setup).partial();
    expect(() => sharesOf(counts, { mix: nobody })).toThrow('accepted: a number above 0');
    const women = { ...counts, people: { women: 150, men: 0 } };
    expect(() => sharesOf(women, { mix: { women: 1, men: 1 } })).toThrow('nobody was drawn');
  });
});

describe('who is lost', () => {
  const ask = (ruleIds: string[], at = places) =>
    createStudy(people, {
      places: at,
      ruleBook,
      wear: { women: wear.men, men: wear.men },
      ticked: { ruleIds, placeIds: ['b1:3'] },
    }).shares();
  const lostBy = (ruleId: string, at = places) => {
    const lost = ask([ruleId], at).checks[0]?.lost;
    if (!lost) throw new Error(`nobody lost by ${ruleId}`);
    return lost;
  };

  it('is told in words: a high seat loses short people, mostly women', () => {
    const lost = lostBy('SEAT-02', raised(20));
    expect(lost.words).toContain('short');
    expect(lost.words).toContain('small back of knee');
    expect(lost.words).toContain('mostly women');
    const [stature] = lost.traits;
    expect(stature?.lostMean).toBeLessThan((stature?.restMean as number) - 50);
  });

  it('a seat in the middle loses both ends', () => {
    expect(lostBy('SEAT-04').words).toBe('small or large back to crook of knee');
  });

  it('a narrow place loses heavy people with wide hips', () => {
    const narrow = places.map((at) => ({ ...at, widthMm: 410 }));
    expect(lostBy('SEAT-05', narrow).words).toContain('heavy and large hip width');
  });

  it('names the rule that turns most away, and the next of those still left', () => {
    const { checks, rejectsMost, rejectsNext } = ask(['SEAT-02', 'SEAT-04', 'SEAT-05'], raised(50));
    const lost = checks.map(({ ruleId, outcome }) => [ruleId, 1 - fitsOf(outcome).mixed.value] as const);
    const most = lost.reduce((a, b) => (b[1] > a[1] ? b : a));
    expect(rejectsMost).toEqual({ ruleId: most[0], lost: expect.closeTo(most[1], 12) as number });
    const both = ask([most[0], rejectsNext?.ruleId as string], raised(50));
    const left = 1 - most[1];
    const leftByBoth = fitsOf(both.all).mixed.value;
    expect(rejectsNext?.lost).toBeCloseTo((left - leftByBoth) / left, 12);
  });

  it('is nobody when everyone fits', () => {
    const wide = places.map((at) => ({ ...at, widthMm: 900 }));
    const { checks, rejectsMost } = ask(['SEAT-05'], wide);
    expect(checks[0]?.lost).toBeUndefined();
    expect(rejectsMost).toBeUndefined();
  });
});

describe('a share of nothing', () => {
  const silent = { kind: 'silent', reason: 'no sill' };
  const bare = place({ placeId: 'b1:4', place: 4 });
  const [beside] = places;
  const ask = (at: typeof places, ruleIds: string[]) =>
    createStudy(people, { ...setup, places: at, ticked: { ruleIds } });

  it('is silent and not everybody, at a place and all at once', () => {
    const { all, places: said, checks } = ask([bare], ['SILL-01']).shares();
    expect(all).toEqual(silent);
    expect(said).toEqual([{ placeId: 'b1:4', outcome: silent }]);
    expect(checks).toEqual([]);
    expect(ask([bare], []).shares().all.kind).toBe('silent');
  });

  it('leaves the share of the places where a rule speaks as it is', () => {
    if (!beside) throw new Error('no place');
    const { all, places: said } = ask([beside, bare], ['SILL-01']).shares();
    expect(said[1]?.outcome).toEqual(silent);
    expect(all).toEqual(ask([beside], ['SILL-01']).shares().all);
  });

  it('is no number on a curve or a map', () => {
    const study = ask([bare], ['SILL-01']);
    expect(curveOf(study, [1], () => [bare])[0]?.all.silent).toBe('no sill');
    expect(mapOf(study, [1], [1], () => [bare]).all[0]?.[0]?.silent).toBe('no sill');
  });

  it('gives one reason only where there is one', () => {
    const { all } = ask([bare], ['SILL-01', 'TABLE-01']).shares();
    expect(all).toEqual({ kind: 'silent', reason: 'none of these checks has anything to say' });
  });
});

describe('curves and maps', () => {
  const study = createStudy(people, setup);
  const values = [-40, -20, -5, 0, 5, 20, 60];
  const alone = (by: number) => createStudy(people, { ...setup, places: raised(by) }).partial();

  it('hold at each value what a study there counts, and leave the study as it was', () => {
    const before = study.partial();
    const curve = curveOf(study, values, raised);
    curve.forEach(({ value, all, checks }) => {
      const there = alone(value);
      expect(all).toEqual(there.all);
      expect(checks).toEqual(
        there.checks.map(({ ruleId, fits, atLeastTight, unknown }) => ({
          ruleId,
          fits,
          atLeastTight,
          unknown,
        })),
      );
    });
    expect(study.partial()).toEqual(before);
  });

  it('over two dimensions hold the joint count of each pair', () => {
    const at = (up: number, deeper: number) =>
      raised(up).map((one) => ({ ...one, effectiveDepthMm: one.effectiveDepthMm + deeper }));
    const map = mapOf(study, [0, 10], [-30, 0, 30], at);
    expect(map.all.map((row) => row.length)).toEqual([2, 2, 2]);
    expect(map.all[2]?.[1]).toEqual(createStudy(people, { ...setup, places: at(10, 30) }).partial().all);
  });

  it('of parts add up', () => {
    const [a, b] = [0, 1].map((block) =>
      curveOf(createStudy(soldiers.draw(1000, 11, block), setup), values, raised),
    );
    if (!a || !b) throw new Error('no curve');
    expect(mergeCurves([b, a])).toEqual(curveOf(study, values, raised));
    expect(() => mergeCurves([a, b.slice(1)])).toThrow('the same values');
    expect(() => mergeCurves([])).toThrow('at least one');
  });
});

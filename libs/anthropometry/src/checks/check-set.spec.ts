import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  bench,
  check,
  lapTable,
  person,
  personCell,
  pieceCell,
  place,
  set,
  sill,
  sitter,
  verdictOf,
} from '../../test/example-set.ts';
import { ansur2, children, fitRules, model, ruleBook } from '../../test/seed.ts';
import { TAPE_MEASURE_KEYS } from '../measures/measures.ts';
import { createBodyModel } from '../people/body-model.ts';
import type { KnownPerson } from '../people/person.ts';
import { checkSet } from './check-set.ts';
import { loadRuleBook, ruleNumber, whyFor } from './rule-book.ts';

const FOAM = { thicknessMm: 95, ifd25N: 222, supportFactor: 2.2 };
const furnished = (change: Parameters<typeof place>[0] = {}) =>
  place({
    seatTopFrontMm: 476,
    seatTopHipMm: 476,
    deckHeightMm: 381,
    foam: FOAM,
    table: lapTable({ kneeDepthMm: 450, footDepthMm: 500 }),
    sills: [sill()],
    overhead: { pieceId: 'o1', mark: 'O1', undersideMm: 1500 },
    backTopMm: 900,
    wallMm: { left: 330 },
    ...change,
  });

const everyTape = fc.record(
  Object.fromEntries(
    TAPE_MEASURE_KEYS.map((key) => [key, fc.double({ min: 150, max: 900, noNaN: true })]),
  ) as Record<(typeof TAPE_MEASURE_KEYS)[number], fc.Arbitrary<number>>,
);
const anyone = fc.record({
  bodyData: fc.constantFrom('women', 'men', 'mixed' as const),
  stature: fc.record({
    mm: fc.double({ min: 1450, max: 2000, noNaN: true }),
    source: fc.constantFrom('measured', 'told' as const),
  }),
  weightKg: fc.option(fc.double({ min: 45, max: 140, noNaN: true }), { nil: undefined }),
}) as fc.Arbitrary<Partial<KnownPerson>>;

const withChildren = createBodyModel(ansur2, children);

describe('a child at a place', () => {
  const child = withChildren.child(3);
  const checked = (over: Parameters<typeof place>[0] = {}, sitters = [sitter(child)]) =>
    checkSet({
      situation: set({ places: [furnished(over)] }),
      sitters,
      ruleBook,
      model: withChildren,
      settings: { backPosture: 'dining', trafficBehind: 'none' },
    });

  it('is judged by height, weight and lower leg alone; all else is not known, never a pass', () => {
    const { rows, counts } = checked();
    const cells = rows[0]!.cells;
    const judged = cells.filter(({ outcome }) => outcome.kind === 'verdict');
    expect(judged.map(({ ruleId }) => ruleId)).toEqual(['SEAT-02']);
    const others = cells.filter(({ outcome }) => outcome.kind !== 'verdict').map(({ outcome }) => outcome);
    expect(others.every(({ kind }) => kind === 'notAsked' || kind === 'doesNotApply')).toBe(true);
    const unknown = others.filter(
      (outcome) => 'reason' in outcome && outcome.reason === 'not known of a child',
    );
    expect(unknown.length).toBeGreaterThan(10);
    expect(counts.notKnown).toBe(unknown.length);
    expect(rows[0]!.worst).toBe('wontFit');
  });

  it('on a seat of the size mark sits well, and yet the row is no pass', () => {
    const seat = withChildren.predict(child).mean('popliteal_height') + child.shoeMm - 25;
    const { rows } = checked({ seatTopFrontMm: seat, seatTopHipMm: seat, foam: undefined });
    const verdict = rows[0]!.cells.find(({ ruleId }) => ruleId === 'SEAT-02')?.outcome;
    expect(verdict).toMatchObject({ kind: 'verdict', verdict: 'fits' });
    expect(rows[0]!.worst).toBe('notKnown');
  });

  it('has its own three measures and shares of a grown-up, and there is none of a mark that is not printed', () => {
    const body = withChildren.predict(child);
    expect(body.mean('stature')).toBe((1190 + 1420) / 2);
    expect(body.mean('popliteal_height')).toBe((315 + 355) / 2 - 25);
    // NHANES 2015-2016: boys and girls of nine are 1.36 m and 34 kg, of eight 1.30 m and 30 kg.
    expect(body.weightKg).toBeGreaterThan(26);
    expect(body.weightKg).toBeLessThan(32);
    const adult = withChildren.predict({ bodyData: 'mixed', measured: {}, shoeMm: 0, clothing: 'light' });
    expect(body.mean('sitting_height') / body.mean('stature')).toBeCloseTo(
      adult.mean('sitting_height') / adult.mean('stature'),
      6,
    );
    expect(() => withChildren.child(9)).toThrow('sizeMark is 9; accepted: 1, 2, 3, 4, 5, 6');
    expect(() => model.child(3)).toThrow('accepted: none');
  });
});

describe('the sheet', () => {
  it('knows no check of a place that nobody is behind, whatever would hold of anybody', () => {
    const nobody: KnownPerson = { bodyData: 'mixed', measured: {}, shoeMm: 25, clothing: 'light' };
    const row = (noBody: boolean) =>
      check(set({ places: [furnished()] }), [{ ...sitter(nobody), ...(noBody ? { noBody: true } : {}) }])
        .rows[0];
    const verdicts = (noBody: boolean) =>
      row(noBody)?.cells.flatMap(({ outcome }) => (outcome.kind === 'verdict' ? [outcome.verdict] : [])) ??
      [];
    expect(verdicts(false)).toContain('fits');
    expect(verdicts(true)).toHaveLength(verdicts(false).length);
    expect(new Set(verdicts(true))).toEqual(new Set(['notKnown']));
    expect(row(true)?.worst).toBe('notKnown');
  });

  it('knows no pair, corner or bench with a place that nobody is behind, and hides no other pair', () => {
    const anybody: KnownPerson = { bodyData: 'mixed', measured: {}, shoeMm: 25, clothing: 'light' };
    const placeIds = ['b1:1', 'b1:2', 'b2:1', 'b2:2'];
    const corner = (placeId: string) => ({
      pieceIds: ['b1', 'b2'] as [string, string],
      marks: ['B1', 'B2'] as [string, string],
      placeId,
      centreFromFrontMm: 900,
      widthMm: 610,
      // Deep seats, before which just anybody's knees do not stand out.
      effectiveDepthMm: 800,
    });
    const room = (gapMm: number) =>
      set({
        places: placeIds.map((placeId) => place({ placeId, pieceId: placeId.slice(0, 2) })),
        benches: [bench({ lengthMm: 3000, placeIds: ['b1:1', 'b1:2'] })],
        corners: [corner('b1:1'), corner('b2:1')],
        facing: [
          {
            pieceIds: ['b1', 'b2'],
            marks: ['B1', 'B2'],
            gapMm,
            pairs: [
              ['b1:1', 'b2:1'],
              ['b1:2', 'b2:2'],
            ],
          },
        ],
      });
    const words = (ruleId: string, noBody: boolean, gapMm = 1500) =>
      check(
        room(gapMm),
        placeIds.map((id) => ({
          ...sitter({ ...anybody }, id),
          ...(noBody && id === 'b1:1' ? { noBody: true as const } : {}),
        })),
        { appleBoxes: { full: 4, half: 4, quarter: 4, pancake: 4 } },
      ).piecesAndWays.flatMap((cell) =>
        cell.ruleId === ruleId && cell.outcome.kind === 'verdict' ? [cell.outcome.verdict] : [],
      );
    for (const [ruleId, known, withNobody] of [
      ['SIDE-01', ['fits'], ['notKnown']],
      ['SIDE-04', ['fits'], ['fits', 'notKnown']],
      ['SIDE-05', ['fits', 'fits'], ['fits', 'notKnown']],
    ] as const) {
      expect([ruleId, words(ruleId, false)]).toEqual([ruleId, known]);
      expect([ruleId, words(ruleId, true)]).toEqual([ruleId, withNobody]);
    }
    expect(words('HEAD-04', true)[0]).toBe('notKnown');
    expect(words('SIDE-04', true, 100)).toEqual(['wontFit', 'notKnown']);
  });

  it('gives every row and the public row the same columns', () => {
    const places = [furnished(), place({ placeId: 'b1:2', place: 2 })];
    const sheet = check(set({ places }), [sitter(person()), sitter(person(), 'b1:2', 'Bo')]);
    const columns = sheet.publicRow.cells.map(({ ruleId }) => ruleBook.rule(ruleId).columnName);
    for (const row of sheet.rows) {
      expect(row.cells.map(({ ruleId }) => ruleBook.rule(ruleId).columnName)).toEqual(columns);
    }
    expect(columns.slice(0, 8)).toEqual([
      'Seat height',
      'Seat depth',
      'Hip width',
      'Thigh room',
      'Knee room',
      'Table height',
      'Belly room',
      'Elbow to sill',
    ]);
    const ids = [
      ...sheet.rows.flatMap(({ cells }) => cells),
      ...sheet.publicRow.cells,
      ...sheet.piecesAndWays,
    ];
    expect(new Set(ids.map(({ id }) => id)).size).toBe(ids.length);
  });

  it('says in plain words what does not apply', () => {
    const { rows, piecesAndWays } = check(set({ places: [place()] }), [sitter(person())]);
    const reasons = [...(rows[0]?.cells ?? []), ...piecesAndWays].flatMap(({ outcome }) =>
      outcome.kind === 'doesNotApply' ? [outcome.reason] : [],
    );
    expect(new Set(reasons)).toEqual(
      new Set([
        'no table',
        'no sill',
        'nothing overhead',
        'nothing overhead before the seat',
        'no back',
        'no wall',
        'no bench',
        'no facing benches',
        'no inside corner',
        'no sill beside a place',
        'no way between tables',
        'no loose seat with something behind',
        'no tables with chairs back to back',
        'no rows of seats',
      ]),
    );
    expect(pieceCell('SEAT-07', set({ places: [place()], benches: [bench()] })).outcome).toEqual({
      kind: 'doesNotApply',
      reason: 'open base',
    });
  });

  it('lists the places nobody sits at', () => {
    const places = [furnished(), place({ placeId: 'b1:2', place: 2 })];
    expect(check(set({ places }), [sitter(person())]).emptyPlaceIds).toEqual(['b1:2']);
  });

  it('says the same of the sitters where the public is left out', () => {
    const asked = {
      situation: set({ places: [furnished()] }),
      sitters: [sitter(person())],
      ruleBook,
      model,
      settings: { backPosture: 'dining', trafficBehind: 'none' },
    } as const;
    const [whole, alone] = [checkSet(asked), checkSet({ ...asked, sittersOnly: true })];
    expect(whole.publicRow.cells.length).toBeGreaterThan(0);
    expect(alone).toEqual({ ...whole, publicRow: { cells: [] } });
  });

  it('keeps a row for a sitter whose place is gone', () => {
    const { rows, counts } = check(set(), [sitter(person())]);
    expect(rows[0]?.worst).toBe('notKnown');
    expect(counts).toEqual({ fits: 0, tight: 0, wontFit: 0, notKnown: 0 });
  });

  it('counts what is not known as that, never as a pass', () => {
    fc.assert(
      fc.property(fc.array(anyone, { minLength: 1, maxLength: 3 }), (people) => {
        const places = people.map((_, n) => furnished({ placeId: `b1:${n + 1}`, place: n + 1 }));
        const sheet = check(
          set({ places }),
          people.map((who, n) => sitter(person(who), `b1:${n + 1}`)),
        );
        const verdicts = sheet.rows.flatMap(({ cells }) =>
          cells.flatMap(({ outcome }) => (outcome.kind === 'verdict' ? [outcome] : [])),
        );
        expect(sheet.counts.fits).toBe(
          verdicts.filter(({ probability }) => probability.pass >= 0.9 - 1e-9).length,
        );
        expect(sheet.counts.notKnown).toBe(verdicts.filter(({ verdict }) => verdict === 'notKnown').length);
        for (const row of sheet.rows) {
          if (row.cells.some(({ outcome }) => outcome.kind === 'verdict' && outcome.verdict === 'notKnown')) {
            expect(['notKnown', 'wontFit']).toContain(row.worst);
          }
        }
      }),
      { numRuns: 30 },
    );
  });
});

describe('laws of a place', () => {
  it('raising the seat by d lowers thigh room by d', () => {
    fc.assert(
      fc.property(anyone, fc.double({ min: 0, max: 80, noNaN: true }), (who, d) => {
        const room = (by: number) =>
          verdictOf(
            personCell(
              'TABLE-01',
              furnished({ seatTopHipMm: 476 + by, seatTopFrontMm: 476 + by, deckHeightMm: 381 + by }),
              person(who),
            ),
          );
        expect(room(0).value - room(d).value).toBeCloseTo(d, 6);
        expect(room(0).margin - room(d).margin).toBeCloseTo(d, 6);
      }),
      { numRuns: 40 },
    );
  });

  it('every tape taken and the weight known: no verdict of a person’s own rules is estimated', () => {
    fc.assert(
      fc.property(everyTape, fc.double({ min: 45, max: 140, noNaN: true }), (measured, weightKg) => {
        const who = person({ measured, weightKg, stature: { mm: 1700, source: 'measured' } });
        const foam = { ...FOAM, tested: { factor: 1, error: 0, sits: 1 } };
        const { rows } = check(set({ places: [furnished({ foam })] }), [sitter(who)]);
        for (const { outcome } of rows[0]?.cells ?? []) {
          if (outcome.kind !== 'verdict') continue;
          expect(outcome.estimated).toBe(false);
          expect([0, 1]).toContain(outcome.probability.pass);
          expect(outcome.settleWith).toEqual([]);
        }
      }),
      { numRuns: 40 },
    );
  });

  it('the sums close to what is compared', () => {
    fc.assert(
      fc.property(anyone, (who) => {
        const { rows, publicRow } = check(set({ places: [furnished()] }), [sitter(person(who))]);
        for (const { outcome } of [...(rows[0]?.cells ?? []), ...publicRow.cells]) {
          if (outcome.kind !== 'verdict') continue;
          const totals = (lines: typeof outcome.setLedger) => lines.filter(({ kind }) => kind === 'total');
          const value = totals(outcome.setLedger).at(-1)?.value ?? NaN;
          const fail = totals(outcome.bodyLedger).at(-1)?.value ?? NaN;
          expect(value).toBeCloseTo(outcome.value, 6);
          expect(Math.abs(value - fail)).toBeCloseTo(Math.abs(outcome.margin), 6);
          for (const ledger of [outcome.setLedger, outcome.bodyLedger]) expectClosed(ledger);
        }
      }),
      { numRuns: 30 },
    );
  });

  it('a heavier sitter sinks further, so the sill stands higher over the seat', () => {
    const over = (weightKg: number) =>
      verdictOf(personCell('SILL-01', furnished(), person({ weightKg }))).value;
    expect(over(110)).toBeGreaterThan(over(60) + 10);
  });

  it('an unknown weight leaves doubt in the sink, and says so', () => {
    const who = person({ measured: { popliteal_height: 390 }, weightKg: undefined });
    expect(verdictOf(personCell('SEAT-02', furnished(), who)).estimated).toBe(true);
    expect(verdictOf(personCell('SEAT-02', furnished({ foam: undefined }), who)).estimated).toBe(false);
  });

  it('heavy clothing takes hip room and thigh room', () => {
    const who = (clothing: KnownPerson['clothing']) =>
      person({ clothing, measured: { hip_breadth_sitting: 400, thigh_clearance: 160 } });
    const pass = (rule: string, clothing: KnownPerson['clothing']) =>
      verdictOf(personCell(rule, furnished(), who(clothing))).pass.lower ?? 0;
    expect(pass('SEAT-05', 'heavy') - pass('SEAT-05', 'light')).toBeCloseTo(40, 9);
    expect(pass('TABLE-01', 'heavy') - pass('TABLE-01', 'medium')).toBeCloseTo(35, 9);
  });
});

/** Every total is the sum of the lines since the seat or the pass line it follows from. */
function expectClosed(ledger: readonly { label: string; value: number; kind: string }[]): void {
  let sum = 0;
  let carried = 0;
  for (const { value, kind } of ledger) {
    if (kind === 'term') {
      sum += value;
      continue;
    }
    // A sum that starts anew carries nothing over; one that goes on from a total adds to it.
    expect([sum, sum + carried]).toContainEqual(expect.closeTo(value, 6));
    carried = value;
    sum = 0;
  }
}

describe('sills and walls', () => {
  const who = person({ measured: { elbow_rest_height: 233 } });

  it('of two sills the worse is shown with its side', () => {
    const sills = [sill({ topMm: 650 }), sill({ side: 'right', pieceId: 's2', mark: 'S2', topMm: 700 })];
    const cell = personCell('SILL-01', place({ sills }), who);
    expect(cell).toMatchObject({ side: 'right', marks: ['B1', 'S2'], pieceIds: ['b1', 's2'] });
    expect(verdictOf(cell).verdict).toBe('wontFit');
  });

  it('a sill behind the back is told, not judged', () => {
    const at = place({ sills: [sill({ side: 'behind', topMm: 900 })] });
    const shoulder = person({ measured: { acromial_height_sitting: 560 } });
    expect(personCell('SILL-01', at, shoulder).outcome).toEqual({
      kind: 'information',
      value: 407 + 560 - 900,
      words: 'shoulder over S1, the sill behind',
    });
    expect(personCell('SILL-05', at, shoulder).outcome).toMatchObject({ kind: 'doesNotApply' });
  });

  it('a wall on either hand is measured, the nearer shown', () => {
    const cell = personCell('SIDE-03', place({ wallMm: { left: 400, right: 250 } }), who);
    expect(cell.side).toBe('right');
  });
});

describe('personal forms', () => {
  it('knees before the belly: one line, so never tight', () => {
    const who = person({ measured: { buttock_knee_length: 600, abdominal_extension_depth_sitting: 230 } });
    const at = (kneeDepthMm: number) =>
      verdictOf(personCell('TABLE-03', place({ table: lapTable({ kneeDepthMm }) }), who));
    expect(at(370)).toMatchObject({ verdict: 'fits', pass: { lower: 370 }, fail: { lower: 370 } });
    expect(at(369).verdict).toBe('wontFit');
  });

  it('table height: from the elbow to 0.8517 elbow and 0.1483 shoulder', () => {
    const who = person({ measured: { elbow_rest_height: 230, acromial_height_sitting: 560 } });
    const outcome = verdictOf(personCell('TABLE-05', furnished(), who));
    expect(outcome.pass.lower).toBeCloseTo(230, 9);
    expect(outcome.pass.upper).toBeCloseTo(0.8517 * 230 + 0.1483 * 560, 9);
    expect(outcome.fail.lower).toBeCloseTo(205, 9);
  });

  it('facing knees: both sitters’ own needs, the longer one alone as the fail line', () => {
    const ends = ['b1', 'b2'].map((pieceId) =>
      place({ pieceId, placeId: `${pieceId}:1`, effectiveDepthMm: 440 }),
    );
    const situation = set({
      places: ends,
      facing: [{ pieceIds: ['b1', 'b2'], marks: ['B1', 'B2'], gapMm: 400, pairs: [['b1:1', 'b2:1']] }],
    });
    const sitters = [640, 560].map((mm, n) =>
      sitter(person({ measured: { buttock_knee_length: mm } }), ends[n]?.placeId),
    );
    expect(verdictOf(pieceCell('SIDE-04', situation, sitters))).toMatchObject({
      verdict: 'fits',
      pass: { lower: 200 + 120 + 50 },
      fail: { lower: 200 + 50 },
    });
  });

  it('the place at a corner waits for the neighbour’s knees', () => {
    const corner = (placeId: string) => ({
      pieceIds: ['b1', 'b2'] as [string, string],
      marks: ['B1', 'B2'] as [string, string],
      placeId,
      centreFromFrontMm: 420,
      widthMm: 600,
      effectiveDepthMm: 440,
    });
    const situation = set({ corners: [corner('b1:1'), corner('b2:1')] });
    const short = sitter(person({ measured: { buttock_knee_length: 550 } }), 'b2:1');
    const [first, second] = check(situation, [short]).piecesAndWays.filter(
      ({ ruleId }) => ruleId === 'SIDE-05',
    );
    // b1's first place meets the knees of whoever sits on b2; the other way round nobody is known: the 95th man, 669.
    expect(first && verdictOf(first)).toMatchObject({ verdict: 'fits', pass: { lower: 410 } });
    expect(second && verdictOf(second)).toMatchObject({ verdict: 'tight', pass: { lower: 529 } });
  });

  it('an empty place on a bench counts as anyone', () => {
    const placeIds = ['b1:1', 'b1:2'];
    const places = placeIds.map((placeId, n) => place({ placeId, place: n + 1 }));
    const situation = set({ places, benches: [bench({ lengthMm: 1000, placeIds })] });
    const half = verdictOf(
      pieceCell('SIDE-01', situation, [sitter(person({ measured: { bideltoid_breadth: 450 } }))]),
    );
    expect(half.estimated).toBe(true);
    // 450 and the mean of a crowd of both sexes, 480.4.
    expect(half.fail.lower).toBeCloseTo(930.4, 0);
    expect(verdictOf(pieceCell('SIDE-01', situation)).estimated).toBe(false);
  });

  it('who passes behind a seat sets the limit', () => {
    const situation = set({
      ways: [{ kind: 'behind-seat', pieceIds: ['t1'], marks: ['T1'], widthMm: 850 }],
    });
    const verdict = (trafficBehind: 'none' | 'edge-past' | 'wheelchair') =>
      verdictOf(pieceCell('EGRESS-02', situation, [], { trafficBehind })).verdict;
    expect([verdict('none'), verdict('edge-past'), verdict('wheelchair')]).toEqual([
      'fits',
      'tight',
      'wontFit',
    ]);
  });
});

describe('the rule book', () => {
  it('holds every number with a source and says what it rests on', () => {
    expect(ruleBook.rules).toHaveLength(53);
    for (const rule of ruleBook.rules) {
      expect(rule.sources.length).toBeGreaterThan(0);
      expect(rule.tier === 'code').toBe(rule.clause !== undefined);
      if (rule.publicRule) expect(ruleBook.rule(rule.publicRule).columnName).toBe(rule.columnName);
    }
  });

  it('keeps inches as inches', () => {
    const rule = ruleBook.rule('TABLE-08');
    expect(rule.numbers.passIn).toBe(24);
    expect(ruleNumber(rule, 'pass')).toBeCloseTo(609.6, 9);
    expect(() => ruleNumber(rule, 'least')).toThrow('TABLE-08 has no number least; accepted: passIn, failIn');
  });

  it('speaks of the sitter by name', () => {
    expect(whyFor(ruleBook.rule('TABLE-02'), 'Ada')).toMatch(/^Ada’s knees, shoes on,/);
  });

  it.each([
    [
      'a rule without a source',
      (copy: typeof fitRules) => (copy.rules[0]?.sources as unknown[]).splice(0),
      'rules.0.sources',
    ],
    [
      'two of one id',
      (copy: typeof fitRules) => copy.rules.push(structuredClone(copy.rules[0]) as never),
      'same id',
    ],
  ])('refuses %s', (_, spoil, message) => {
    const copy = structuredClone(fitRules);
    spoil(copy);
    expect(() => loadRuleBook(copy)).toThrow(message);
  });

  it('names what it does not hold', () => {
    expect(() => ruleBook.rule('SEAT-99')).toThrow('no rule SEAT-99; accepted: SEAT-02');
  });
});

import { describe, expect, it } from 'vitest';
import { model, ruleBook } from '../../test/seed.ts';
import { lensHeightMm, places, raised, soldiers, wear } from '../../test/study-people.ts';
import { sinkUnder } from '../checks/person-check.ts';
import { PERSON_CHECKS } from '../checks/person-checks.ts';
import { find } from '../checks/verdict.ts';
import type { MeasureKey } from '../measures/measures.ts';
import type { KnownPerson } from '../people/person.ts';
import type { Draws } from '../populations/population.ts';
import { mergePartials, type Tally } from './counts.ts';
import { createStudy } from './study.ts';

const setup = { places, ruleBook, wear, lensHeightMm };

/** One drawn person as somebody of whom every measure is taken. */
function exactPerson({ columns, isWoman }: Draws, row: number): KnownPerson {
  const { stature, weight_kg: weight, ...others } = columns;
  const group = isWoman[row] === 1 ? 'women' : 'men';
  return {
    bodyData: group,
    stature: { mm: stature?.[row] as number, source: 'measured' },
    weightKg: weight?.[row],
    measured: Object.fromEntries(
      Object.entries(others).map(([key, column]) => [key as MeasureKey, column[row] as number]),
    ),
    ...wear[group],
  };
}

describe('a study against judging one by one', () => {
  const people = soldiers.draw(200, 7);

  /** Rules that a good part of the people keep at every place. */
  const ruleIds = ['SEAT-04', 'SEAT-05', 'TABLE-03', 'HEAD-02', 'BACK-03'];

  /** Verdicts of every exact person by the plain checks: fits and at least tight, by place and rule. */
  function byHand() {
    const counted = new Map<string, { fits: Tally; atLeastTight: Tally }>();
    const all = { fits: { women: 0, men: 0 }, atLeastTight: { women: 0, men: 0 } };
    for (let row = 0; row < people.count; row += 1) {
      const group = people.isWoman[row] === 1 ? 'women' : 'men';
      const body = model.predict(exactPerson(people, row));
      let [fitsAll, tightAll] = [true, true];
      for (const at of places) {
        const sink = sinkUnder(at.foam, body);
        for (const check of PERSON_CHECKS) {
          const rule = ruleBook.rule(check.id);
          const said = check.ask({ rule, place: at, name: 'A', body, sink, model, lensHeightMm });
          if (!Array.isArray(said)) continue;
          const judgement = { confidence: 0.9, tolerance: ruleBook.boundaryTolerance[rule.unit] };
          const verdicts = said.map(({ question }) => find(question, judgement).verdict);
          expect(verdicts).not.toContain('notKnown');
          const key = `${at.placeId} ${rule.id}`;
          const tally = counted.get(key) ?? {
            fits: { women: 0, men: 0 },
            atLeastTight: { women: 0, men: 0 },
          };
          counted.set(key, tally);
          const [fits, tight] = [
            verdicts.every((verdict) => verdict === 'fits'),
            !verdicts.includes('wontFit'),
          ];
          if (fits) tally.fits[group] += 1;
          if (tight) tally.atLeastTight[group] += 1;
          if (!ruleIds.includes(rule.id)) continue;
          fitsAll &&= fits;
          tightAll &&= tight;
        }
      }
      if (fitsAll) all.fits[group] += 1;
      if (tightAll) all.atLeastTight[group] += 1;
    }
    return { counted, all };
  }

  it('counts the same people for every rule at every place, and for several at once', () => {
    const { counted, all } = byHand();
    const study = createStudy(people, setup).partial();
    const ticked = createStudy(people, { ...setup, ticked: { ruleIds } }).partial();
    const spoken = study.cells.filter(({ silent }) => silent === undefined);
    expect(spoken.map(({ placeId, ruleId }) => `${placeId} ${ruleId}`).sort()).toEqual(
      [...counted.keys()].sort(),
    );
    for (const { placeId, ruleId, fits, atLeastTight } of spoken) {
      expect({ placeId, ruleId, fits, atLeastTight }).toEqual({
        placeId,
        ruleId,
        ...counted.get(`${placeId} ${ruleId}`),
      });
    }
    expect(ticked.all).toEqual({ ...all, unknown: false });
    // Not an empty comparison: nearly every rule that speaks parts the people somewhere.
    const parting = study.checks.filter(({ fits }) => fits.women + fits.men < people.count);
    expect(parting.length).toBeGreaterThan(14);
    expect(all.fits.women + all.fits.men).toBeGreaterThan(5);
  });
});

describe('a study that moves', () => {
  const people = soldiers.draw(3000, 3);

  it('counts what a new study of the moved set counts', () => {
    const study = createStudy(people, setup);
    study.shares();
    for (const by of [3, 6, 9, -30, 120, 0, -400, 4]) {
      study.move(raised(by));
      expect(study.partial(), `${by}`).toEqual(
        createStudy(people, { ...setup, places: raised(by) }).partial(),
      );
    }
  });

  it('counts what a new study counts when foam and firmness change', () => {
    const study = createStudy(people, setup);
    for (const [thicknessMm, ifd25N] of [
      [90, 150],
      [60, 150],
      [60, 300],
      [0, 300],
    ] as const) {
      const moved = places.map((at) => (at.foam ? { ...at, foam: { ...at.foam, thicknessMm, ifd25N } } : at));
      study.move(moved);
      expect(study.partial()).toEqual(createStudy(people, { ...setup, places: moved }).partial());
    }
  });
});

describe('a study in parts', () => {
  const parts = [0, 1, 2, 3].map((block) => createStudy(soldiers.draw(500, 5, block), setup).partial(block));

  it('adds up to the whole, whoever counted which part', () => {
    const whole = createStudy(soldiers.draw(2000, 5), setup).partial();
    const merged = mergePartials(parts);
    expect(merged).toEqual({ ...whole, blocks: [0, 1, 2, 3] });
    const passed = JSON.parse(JSON.stringify(parts.toReversed())) as typeof parts;
    expect(mergePartials(passed)).toEqual(merged);
    const [a, b, c, d] = parts as [
      (typeof parts)[0],
      (typeof parts)[0],
      (typeof parts)[0],
      (typeof parts)[0],
    ];
    expect(mergePartials([mergePartials([d, a]), mergePartials([b, c])])).toEqual(merged);
  });

  it('refuses no part, a part that comes twice, and parts of different questions', () => {
    const [first] = parts;
    if (!first) throw new Error('no part');
    expect(() => mergePartials([])).toThrow('accepted: at least one');
    expect(() => mergePartials([first, first])).toThrow('Block 0 comes twice');
    const other = createStudy(soldiers.draw(500, 5, 1), { ...setup, places: raised(1) }).partial(1);
    expect(() => mergePartials([first, other])).toThrow('differ');
    const unticked = createStudy(soldiers.draw(500, 5, 1), { ...setup, ticked: { ruleIds: ['SEAT-02'] } });
    expect(() => mergePartials([first, unticked.partial(1)])).toThrow('differ');
  });
});

describe('what is not known of people', () => {
  const { columns, ...rest } = soldiers.draw(400, 2);
  const { elbow_rest_height: elbow, ...known } = columns;
  const study = createStudy({ ...rest, columns: known }, setup);

  it('is no share, neither of the rule nor of all at once', () => {
    expect(elbow).toBeDefined();
    const { checks, all, cells } = study.shares();
    expect(checks.find(({ ruleId }) => ruleId === 'SILL-01')?.outcome.kind).toBe('notKnown');
    expect(checks.find(({ ruleId }) => ruleId === 'SEAT-02')?.outcome.kind).toBe('shares');
    expect(all.kind).toBe('notKnown');
    const silent = cells.find(({ placeId, ruleId }) => placeId === 'b1:3' && ruleId === 'TABLE-01');
    expect(silent?.outcome).toEqual({ kind: 'silent', reason: 'no table' });
  });

  it('does not matter once the rules that read it are not ticked', () => {
    study.tick({ ruleIds: ['SEAT-02', 'SEAT-05'] });
    const { all, checks } = study.shares();
    expect(all.kind).toBe('shares');
    expect(checks.map(({ ruleId }) => ruleId)).toEqual(['SEAT-02', 'SEAT-05']);
  });
});

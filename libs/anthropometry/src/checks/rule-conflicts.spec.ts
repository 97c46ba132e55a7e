import { describe, expect, it } from 'vitest';
import {
  bench,
  check,
  lapTable,
  person,
  personCell,
  place,
  set,
  sill,
  sitter,
  table,
  verdictOf,
} from '../../test/example-set.ts';
import { fitRules, model, ruleBook } from '../../test/seed.ts';
import { conflictNote, conflictsIn } from './rule-conflicts.ts';
import { loadRuleBook, ruleNumber } from './rule-book.ts';
import type { SetSituation } from './situation.ts';
import type { KnownPerson } from '../people/person.ts';

const IN = 25.4;
const numbersOf = (id: string) => {
  const found = ruleBook.conflicts.find((one) => one.id === id);
  if (!found) throw new Error(`no conflict ${id}`);
  return found.numbers;
};
const rule = (id: string, name: string) => ruleNumber(ruleBook.rule(id), name);
const at = (situation: Partial<SetSituation>, who?: KnownPerson) => {
  const sheet = check(set(situation), who ? [sitter(who)] : []);
  return conflictsIn(sheet, ruleBook);
};
const idsAt = (...asked: Parameters<typeof at>) => at(...asked).map(({ conflict }) => conflict.id);

describe('numbers of rules that pull against each other', () => {
  const women = (key: 'popliteal_height' | 'buttock_popliteal_length', p: number) =>
    model.percentile('women', key, p);

  it('accessible height: 20 of sink before short sitters are tight, 57 before they fit', () => {
    const { lowestIn = 0, tightMm = 0, fitsMm = 0 } = numbersOf('accessible-height');
    const lowest = rule('ACC-01', 'lower');
    expect(lowestIn * IN).toBeCloseTo(lowest, 9);
    const shoe = rule('SEAT-01', 'shoe');
    // The middle woman is 387.0 to 388: the caution line 412 rounds it.
    expect(Math.abs(lowest - (women('popliteal_height', 50) + shoe) - tightMm)).toBeLessThan(1);
    expect(Math.abs(lowest - (women('popliteal_height', 5) + shoe) - fitsMm)).toBeLessThan(1);
  });

  it('accessible depth: the inch value of 20 in gives 67 and 89; the printed 510 would give 69 and 91', () => {
    const { leastIn = 0, tightMm = 0, fitsMm = 0 } = numbersOf('accessible-depth');
    const thigh = women('buttock_popliteal_length', 5);
    expect(leastIn * IN).toBeCloseTo(rule('ACC-02', 'depthLower'), 9);
    expect(Math.abs(leastIn * IN - thigh - tightMm)).toBeLessThan(0.5);
    expect(Math.abs(leastIn * IN - 0.95 * thigh - fitsMm)).toBeLessThan(0.6);
    expect([510 - 441, Math.round(510 - 0.95 * 441)]).toEqual([69, 91]);
  });

  it('belly: 419 deep leaves an overlap of 13; 441 deep with 76 of overlap always fails', () => {
    const { depthMm = 0, overlapMm = 0, deepMm = 0, farMm = 0 } = numbersOf('belly-and-depth');
    expect(depthMm - rule('TABLE-06', 'publicPass')).toBeCloseTo(overlapMm, 1);
    const large = model.percentile('men', 'abdominal_extension_depth_sitting', 95);
    expect(deepMm - farMm).toBeLessThan(large + rule('TABLE-06', 'failAllowance'));
    expect(deepMm).toBeLessThanOrEqual(Math.round(women('buttock_popliteal_length', 5)));
  });

  it.each([
    ['low', 190],
    ['high', 265],
  ] as const)('sill %s: shares beyond their own elbow', (name, over) => {
    const numbers = numbersOf('sill-public-and-person');
    expect(numbers[`${name}Mm`]).toBe(over);
    for (const [bodyData, group] of [
      ['men', 'Men'],
      ['women', 'Women'],
    ] as const) {
      const anyone = person({ bodyData, weightKg: undefined });
      const sills = [sill({ topMm: 407 + over })];
      const { probability } = verdictOf(personCell('SILL-01', place({ sills }), anyone));
      // Counted on the raw survey there; a smooth distribution here.
      expect(Math.abs(1 - probability.insideFail - (numbers[`${name}${group}Share`] ?? 0))).toBeLessThan(
        0.015,
      );
    }
  });

  it('table height: 232 for the largest thigh and a top of 25 make 257', () => {
    const { leastMm = 0, topMm = 0 } = numbersOf('table-height-and-thighs');
    const thigh = model.percentile('men', 'thigh_clearance', 95);
    expect(thigh + rule('TABLE-01', 'allowance') + topMm).toBeCloseTo(leastMm, 0);
  });

  it('curve of the back and the widest elbows', () => {
    const { fromMm = 0, toMm = 0 } = numbersOf('lumbar-and-pelvis');
    expect(fromMm).toBe(rule('BACK-02', 'passLower'));
    expect(toMm).toBe(200);
    const { edgeIn = 0, elbowsMm = 0 } = numbersOf('edge-and-elbows');
    expect(edgeIn * IN).toBeCloseTo(rule('TABLE-08', 'pass'), 9);
    expect(model.percentile('men', 'forearm_forearm_breadth', 95)).toBeCloseTo(elbowsMm, 0);
  });
});

describe('conflictsIn', () => {
  const short = person({
    measured: { popliteal_height: 350, buttock_popliteal_length: 441, thigh_clearance: 150 },
  });
  const kept = (unpressedSeatTopMm: number, depth = 432) => ({
    places: [
      place({
        seatTopFrontMm: unpressedSeatTopMm,
        seatTopHipMm: unpressedSeatTopMm,
        effectiveDepthMm: depth,
      }),
    ],
    benches: [bench({ accessible: true, unpressedSeatTopMm, effectiveDepthMm: depth })],
  });

  it('an accessible height against a short sitter, both ways round', () => {
    const [found] = at(kept(457), short);
    expect(found?.conflict.id).toBe('accessible-height');
    expect(found?.marks).toEqual(['B1']);
    expect(found?.sides.map(({ cells }) => cells.map(({ ruleId }) => ruleId).sort())).toEqual([
      ['ACC-01'],
      ['SEAT-01', 'SEAT-02'],
    ]);
    expect(idsAt(kept(370), short)).toContain('accessible-height');
  });

  it('is silent where both are met, where one side is not asked, and where pieces differ', () => {
    const tall = person({ measured: { popliteal_height: 440, buttock_popliteal_length: 560 } });
    const benches = [bench({ accessible: true, unpressedSeatTopMm: 440 })];
    const places = [place({ seatTopFrontMm: 440, seatTopHipMm: 440 })];
    const ofHim = at({ places, benches }, tall)
      .filter(({ conflict }) => conflict.id === 'accessible-height')
      .flatMap(({ sides }) => sides[1].cells.map(({ ruleId }) => ruleId));
    // Only the public's short woman is at odds with this seat.
    expect(ofHim).toEqual(['SEAT-01']);
    expect(idsAt({ places, benches: [bench({ unpressedSeatTopMm: 440 })] }, tall)).not.toContain(
      'accessible-height',
    );
    const elsewhere = [bench({ pieceId: 'b9', mark: 'B9', accessible: true, unpressedSeatTopMm: 440 })];
    expect(idsAt({ places, benches: elsewhere }, tall)).not.toContain('accessible-height');
  });

  it('depth 441 with 76 of overlap: belly against thigh', () => {
    const places = [place({ effectiveDepthMm: 441, table: lapTable({ overlapMm: 76 }) })];
    const found = at({ places }, short).find(({ conflict }) => conflict.id === 'belly-and-depth');
    expect(found?.sides[0].cells[0]).toMatchObject({ ruleId: 'TABLE-06' });
    expect(found?.sides[1].cells.map(({ ruleId }) => ruleId)).toContain('TABLE-07');
  });

  it('a low curve is at odds with pelvis room whatever the verdicts, a high one is not', () => {
    const curved = (apexMm: number) => idsAt({ benches: [bench({ lumbar: { apexMm, recessMm: 30 } })] });
    expect(curved(185)).toEqual(['lumbar-and-pelvis']);
    expect(curved(230)).toEqual([]);
  });

  it('a table edge that fits by the trade and not by the elbows', () => {
    const edges = (lengthMm: number) => ({
      tables: [
        table({ edges: [{ name: 'front' as const, lengthMm, placeIds: ['b1:1'], clearBetweenLegsMm: 900 }] }),
      ],
    });
    expect(idsAt(edges(620))).toEqual(['edge-and-elbows']);
    expect(idsAt(edges(700))).toEqual([]);
  });

  it('writes its numbers in the reader’s units', () => {
    const [first, , , sillOne] = ruleBook.conflicts;
    const inches = (mm: number) => `${Math.round((mm / IN) * 10) / 10} in`;
    expect(first && conflictNote(first, inches)).toContain(
      'lowest accessible seat, 17 in, the cushion must sink by 0.8 in',
    );
    expect(sillOne && conflictNote(sillOne, inches)).toContain('57 in 100 of men');
    for (const conflict of ruleBook.conflicts) {
      expect(conflictNote(conflict, inches)).not.toMatch(/NaN|\{/);
    }
  });

  it('refuses a conflict of rules that are not in the book', () => {
    const copy = structuredClone(fitRules);
    (copy.conflicts[0]?.sides[0]?.rules as string[]).push('SEAT-99');
    expect(() => loadRuleBook(copy)).toThrow('a conflict names SEAT-99');
  });
});

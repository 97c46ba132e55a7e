import {
  checkSet,
  createBodyModel,
  loadRuleBook,
  readSurvey,
  soldiers2012,
  type Sitter,
} from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import { describe, expect, it } from 'vitest';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { SetDocument } from '../room/document.ts';
import { measureSet } from '../situation/measure-set.ts';
import { documentAt } from './candidates.ts';
import { dimensionsOf } from './dimensions.ts';
import { judgeChoices } from './judge-choices.ts';

const ruleBook = loadRuleBook(rules);
const model = createBodyModel(survey);
const draws = soldiers2012(readSurvey(survey)).draw(500, 1);
const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const dimensions = dimensionsOf(bay);
const height = dimensions.find(({ id }) => id === 'seat-height') ?? dimensions[0];
if (!height) throw new Error('The bay has no dimensions.');
const free = [{ dimensionId: height.id, min: height.value - 50, max: height.value + 150, step: 3 }];
const input = { document: bay, dimensions, free };
const sitters: Sitter[] = [
  {
    id: 'small',
    name: 'small',
    kind: 'mannequin',
    placeId: 'b1:1',
    person: model.mannequin({ bodyData: 'women', measure: 'stature', percentile: 5 }),
  },
];
const wear = { shoeMm: 25, clothing: 'light' } as const;

describe('choices judged', () => {
  const judging = judgeChoices(input, { sitters, ruleBook, model, crowd: { draws, wear } });

  it('says of the sitters what the whole sheet says', () => {
    const whole = checkSet({
      situation: measureSet(bay, ruleBook),
      sitters,
      ruleBook,
      model,
      settings: bay.asked,
    });
    expect(judging.check(bay)).toEqual({ ...whole, publicRow: { cells: [] } });
  });

  it('asks for the probability that the workshop set', () => {
    const strict = judgeChoices(input, { sitters, ruleBook, model, settings: { confidence: 0.99 } });
    expect(strict.check(bay).confidence).toBe(0.99);
  });

  it('counts the rules that the free dimensions move, and no other', () => {
    expect(judging.counted).toContain('SEAT-02');
    expect(judging.counted).not.toContain('SEAT-04');
    expect(judging.counted).not.toContain('SEAT-05');
  });

  it('names what the people have no measure for, and then gives no share', () => {
    const { popliteal_height: _, ...columns } = draws.columns;
    const withoutShins = judgeChoices(input, {
      sitters,
      ruleBook,
      model,
      crowd: { draws: { ...draws, columns }, wear },
    });
    expect(judging.unknown).toEqual([]);
    expect(withoutShins.unknown).toContain('SEAT-02');
    expect(withoutShins.unknown).not.toContain('SEAT-04');
    expect(withoutShins.counted).not.toContain('SEAT-02');
    expect(withoutShins.share).toBeUndefined();
  });

  it('names what nobody meets', () => {
    const most = { ...free[0], dimensionId: height.id, step: 3, min: height.max - 10, max: height.max };
    const high = height.at(height.max) as SetDocument;
    const judged = judgeChoices(
      { document: high, dimensions: dimensionsOf(high), free: [most] },
      { sitters, ruleBook, model, crowd: { draws, wear } },
    );
    expect(judged.metByNobody).toContain('SEAT-02');
    expect(judged.counted).not.toContain('SEAT-02');
    expect(judging.metByNobody).not.toContain('SEAT-02');
  });

  it('serves fewer of a crowd on seats far too high', () => {
    const high = documentAt(input, [height.value + 150]);
    const [now, then] = [judging.share?.(bay) ?? -1, high && judging.share?.(high)];
    expect(now).toBeGreaterThan(then ?? 1);
    expect(now).toBeLessThanOrEqual(1);
  });

  it('gives no share where nobody besides the sitters is asked about', () => {
    expect(judgeChoices(input, { sitters, ruleBook, model }).share).toBeUndefined();
  });
});

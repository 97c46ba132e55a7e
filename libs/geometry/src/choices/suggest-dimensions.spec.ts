import {
  checkSet,
  createBodyModel,
  loadRuleBook,
  type FitSheet,
  type Sitter,
} from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import { describe, expect, it } from 'vitest';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { SetDocument } from '../room/document.ts';
import { measureSet } from '../situation/measure-set.ts';
import { documentAt, type FreeDimension, type SuggestInput, type Tried } from './candidates.ts';
import { dimensionsOf } from './dimensions.ts';
import { costOf, suggestDimensions, type Suggestion } from './suggest-dimensions.ts';

const ruleBook = loadRuleBook(rules);
const model = createBodyModel(survey);
const INCH = 25.4;

const seated = (id: string, placeId: string, bodyData: 'women' | 'men', percentile: number): Sitter => ({
  id,
  name: id,
  kind: 'mannequin',
  placeId,
  person: model.mannequin({ bodyData, measure: 'stature', percentile }),
});

const checkOf =
  (sitters: Sitter[]) =>
  (document: SetDocument): FitSheet =>
    checkSet({
      situation: measureSet(document, ruleBook),
      sitters,
      ruleBook,
      model,
      settings: { backPosture: 'dining', trafficBehind: 'none' },
    });

const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const dimensions = dimensionsOf(bay);
const free = (dimensionId: string, reach: number): FreeDimension => {
  const found = dimensions.find(({ id }) => id === dimensionId);
  if (!found) throw new Error(`no dimension ${dimensionId}`);
  const { value, min, max } = found;
  return {
    dimensionId,
    min: Math.max(min, value - reach),
    max: Math.min(max, value + reach),
    step: INCH / 8,
  };
};

const input = (change: Partial<SuggestInput>): SuggestInput => ({
  document: bay,
  dimensions,
  free: [free('seat-height', 76), free('seat-depth', 51)],
  check: checkOf([seated('one', 'b1:1', 'women', 40), seated('other', 'b2:1', 'women', 75)]),
  most: 70,
  ...change,
});

function run(search: Generator<Suggestion, Suggestion, void>): { end: Suggestion; steps: number } {
  for (let steps = 0; ; steps += 1) {
    const next = search.next();
    if (next.done) return { end: next.value, steps };
  }
}

describe('suggested dimensions', () => {
  const { end } = run(suggestDimensions(input({})));
  const [best] = end.answers;

  it('serves more checks than the present set, inside the ranges and on the rounding steps', () => {
    expect(best?.tried.misses.length).toBeLessThan(end.present?.misses.length ?? 0);
    const { free: ranges } = input({});
    for (const { tried } of end.answers) {
      for (const [i, value] of tried.values.entries()) {
        const { min, max, step } = ranges[i] as FreeDimension;
        expect(value).toBeGreaterThanOrEqual(min);
        expect(value).toBeLessThanOrEqual(max);
        const onStep = Math.abs(value / step - Math.round(value / step)) < 1e-6;
        expect(onStep || value === min || value === max || value === end.present?.values[i]).toBe(true);
      }
    }
  });

  it('says of an answer what the sheet of that set says', () => {
    const { values, misses, tight } = best?.tried as Tried;
    const sheet = input({}).check(documentAt(input({}), values) as SetDocument);
    const verdicts = sheet.rows.flatMap(({ cells }) =>
      cells.flatMap(({ outcome }) => (outcome.kind === 'verdict' ? [outcome.verdict] : [])),
    );
    expect(misses).toHaveLength(verdicts.filter((one) => one === 'wontFit' || one === 'notKnown').length);
    expect(tight).toBe(verdicts.filter((one) => one === 'tight').length);
  });

  it('finds no worse a choice than a plain walk over a coarse grid', () => {
    const [height, depth] = input({}).free as [FreeDimension, FreeDimension];
    const grid = Array.from({ length: 7 }, (_, i) => i / 6).flatMap((a) =>
      Array.from({ length: 5 }, (_, j) => j / 4).map((b) => [
        height.min + a * (height.max - height.min),
        depth.min + b * (depth.max - depth.min),
      ]),
    );
    const { check } = input({});
    const missed = grid.map((values) => {
      const sheet = check(documentAt(input({}), values) as SetDocument);
      return sheet.counts.wontFit + sheet.counts.notKnown;
    });
    expect(best?.tried.misses.length).toBeLessThanOrEqual(Math.min(...missed));
  });

  it('gives answers that differ, the nearest no farther than the best', () => {
    const nearest = end.answers.find(({ kind }) => kind === 'nearest');
    expect(new Set(end.answers.map(({ tried }) => tried.values.join(' '))).size).toBe(end.answers.length);
    if (nearest) expect(nearest.tried.distance).toBeLessThanOrEqual(best?.tried.distance ?? 0);
  });

  it('gives the same answers again, without a check when everything is known', () => {
    const known: Tried[] = [];
    const first = run(suggestDimensions(input({ onTried: (tried) => known.push(tried) })));
    expect(first.end.answers).toEqual(end.answers);
    let checks = 0;
    const check = (document: SetDocument): FitSheet => {
      checks += 1;
      return input({}).check(document);
    };
    const again = run(suggestDimensions(input({ known, check })));
    expect(again.end).toEqual(end);
    // The present set is asked once more, as the measure of what turns worse.
    expect(checks).toBe(1);
  });

  it('prefers the larger share of a population where nobody is missed', () => {
    const share = (document: SetDocument) =>
      (measureSet(document).places[0]?.effectiveDepthMm ?? 0) > 440 ? 0.2 : 0.8;
    const served = run(suggestDimensions(input({ share }))).end.answers[0]?.tried;
    expect(served?.share).toBe(0.8);
  });

  it('names who keeps every answer from serving all', () => {
    const check = checkOf([
      seated('small', 'b1:1', 'women', 1),
      seated('tall', 'b1:2', 'men', 99),
      seated('tall too', 'b2:1', 'men', 98),
    ]);
    const { blame, answers } = run(
      suggestDimensions(input({ check, free: [free('seat-height', 76)], most: 40 })),
    ).end;
    expect(answers[0]?.tried.misses.length).toBeGreaterThan(0);
    expect(['small', 'tall', 'tall too', 'SEAT-02']).toContain(blame?.id);
    expect(blame?.left).toBeLessThan(answers[0]?.tried.misses.length ?? 0);
  });

  it('counts a miss before everything else', () => {
    const one: Tried = { values: [], misses: [], tight: 20, worse: 5, share: 0, distance: 6 };
    const missed: Tried = {
      ...one,
      tight: 0,
      worse: 0,
      share: 1,
      distance: 0,
      misses: [{ sitterId: 'a', ruleId: 'R', byMm: 0 }],
    };
    expect(costOf(one)).toBeLessThan(costOf(missed));
  });
});

import { dimensionsOf } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { effectsOf } from './effects.ts';
import { freeOf, questionOf, startForm, startFreedom } from './search-form.ts';
import { bay, check, INCHES, ruleBook } from './test/show-suggest.tsx';
import {
  blameWords,
  isWorthTaking,
  publicWords,
  servedWords,
  shareWords,
  staysWords,
  stepWords,
  timeLeftWords,
  triedWords,
} from './words.ts';
import { dimensionWords } from '@/lib/dimension-words.ts';

const dimensions = dimensionsOf(bay);
const free = freeOf(startForm(bay), dimensions, INCHES);
const now = free.map(({ dimensionId }) => dimensions.find(({ id }) => id === dimensionId)?.value ?? 0);
const ground = {
  document: bay,
  dimensions,
  free,
  check,
  ruleBook,
  people: new Set(['hetty', 'marcus']),
  toServe: new Set(['hetty', 'marcus']),
};
const lower = effectsOf({ values: now.map((value, n) => (n === 0 ? value - 100 : value)) }, ground);
if (!lower) throw new Error('The seats cannot be lower.');

describe('words of a choice', () => {
  it('names the dimensions with their pieces', () => {
    const both = dimensions.find(({ id }) => id === 'seat-and-tables');
    expect(both && dimensionWords(both)).toBe('Seat height, pressed: B1 and B2 with T1');
  });

  it('says what moves and what stays', () => {
    expect(stepWords(lower.moves, INCHES)).toMatch(/^Suggested: seat height of B1 and B2 .+″ to .+″$/);
    expect(staysWords(lower.stays)).toBe('Seat depth of B1 and B2 and table height of T1 stay as now.');
  });

  it('tells the small sitter as better off and the tall one as worse on a lower seat', () => {
    const of = (people: typeof lower.better, who: string) =>
      people.find(({ name }) => name === who)?.checks.join(', ') ?? '';
    expect(of(lower.better, 'Hetty')).toMatch(/seat height (fits|tight)/);
    expect(of(lower.worse, 'Hetty')).not.toContain('seat height');
    expect(of(lower.worse, 'Marcus')).toMatch(/seat height won’t fit/);
  });

  it('never counts somebody as served whose checks or whose place are gone', () => {
    const onlyAt = (drop: (mark: string) => boolean) => ({
      ...ground,
      check: (document: typeof bay) =>
        check(
          document === bay ? bay : { ...document, pieces: document.pieces.filter(({ mark }) => !drop(mark)) },
        ),
    });
    const values = now.map((value, n) => (n === 0 ? value - 10 : value));
    const noTable = effectsOf(
      { values },
      onlyAt((mark) => mark === 'T1'),
    );
    expect(noTable?.worse.map(({ name }) => name)).toEqual(['Hetty', 'Marcus']);
    expect(noTable?.short[0]?.checks.join(', ')).toContain('no longer asked');
    expect([noTable?.served, noTable?.of]).toEqual([0, 2]);
    const noBench = effectsOf(
      { values },
      onlyAt((mark) => mark === 'B2'),
    );
    expect(noBench?.of).toBe(2);
    expect(noBench?.worse.find(({ name }) => name === 'Marcus')?.checks).toEqual(['no place']);
    expect(noBench?.short.find(({ name }) => name === 'Marcus')?.checks).toEqual(['no place']);
  });

  it('counts those alone who are to be served, and nobody without a body', () => {
    const values = now.map((value, n) => (n === 0 ? value - 100 : value));
    const alone = effectsOf(
      { values },
      { ...ground, people: new Set(['hetty']), toServe: new Set(['hetty']) },
    );
    expect(alone?.of).toBe(1);
    expect([...(alone?.worse ?? []), ...(alone?.short ?? [])].map(({ name }) => name)).not.toContain(
      'Marcus',
    );
    const wanted = effectsOf({ values }, { ...ground, toServe: new Set(['marcus']) });
    expect([wanted?.served, wanted?.of]).toEqual([0, 1]);
    expect(wanted?.better.map(({ name }) => name)).toContain('Hetty');
  });

  it('never counts what is not known as served', () => {
    const unknown = (document: typeof bay) => {
      const sheet = check(document);
      const rows = sheet.rows.map((row) => ({
        ...row,
        cells: row.cells.map((cell) =>
          cell.outcome.kind === 'verdict'
            ? { ...cell, outcome: { ...cell.outcome, verdict: 'notKnown' as const } }
            : cell,
        ),
      }));
      return { ...sheet, rows };
    };
    expect(effectsOf({ values: now }, { ...ground, check: unknown })).toMatchObject({
      served: 0,
      servedNow: 0,
      of: 2,
    });
  });

  it.each([
    [{ served: 2, servedNow: 1, of: 2 }, 'All 2 sitters to serve are at least tight in every check, now 1.'],
    [
      { served: 1, servedNow: 0, of: 2 },
      '1 of 2 sitters to serve is at least tight in every check, now none.',
    ],
    [
      { served: 0, servedNow: 0, of: 2 },
      'None of 2 sitters to serve is at least tight in every check, as now.',
    ],
    [{ served: 1, servedNow: 0, of: 1 }, 'The sitter to serve is at least tight in every check.'],
    [{ served: 0, servedNow: 0, of: 1 }, 'The sitter to serve is not at least tight in every check, as now.'],
    [{ served: 0, servedNow: 0, of: 0 }, 'Nobody named is to be served.'],
  ])('%o', (counts, words) => expect(servedWords(counts)).toBe(words));

  it('offers first only what serves somebody, or more of the public where nobody is named', () => {
    expect(isWorthTaking({ served: 0, of: 2 }, 0.9, 0.1)).toBe(false);
    expect(isWorthTaking({ served: 1, of: 2 }, 0.1, 0.9)).toBe(true);
    expect(isWorthTaking({ served: 0, of: 0 }, 0.3, 0.1)).toBe(true);
    expect(isWorthTaking({ served: 0, of: 0 }, 0.1, 0.1)).toBe(false);
    expect(isWorthTaking({ served: 0, of: 0 }, undefined, undefined)).toBe(false);
  });

  it('says how many choices an answer was chosen from', () => {
    expect(triedWords('done', { done: 213, of: 213 })).toBe(
      'Finished: 213 choices tried, and these are the best of them.',
    );
    expect(triedWords('stopped', { done: 57, of: 400 })).toMatch(
      /^Stopped early after 57 choices of at most 400:/,
    );
  });

  it('says shares as about so many of a hundred', () => {
    expect(shareWords(0.234, 0.002)).toBe('About 23 in 100, now fewer than 1 in 100');
    expect(shareWords(undefined, 0.2)).toBeUndefined();
  });

  it('says which checks a share leaves out, and gives none where one is not known', () => {
    const say = (rules: Partial<Parameters<typeof publicWords>[0]>) =>
      publicWords({ counted: [], unknown: [], metByNobody: [], ...rules }, (id) => id.toLowerCase());
    expect(say({ counted: ['A', 'B'], metByNobody: ['C'] })).toMatch(
      /^Counted are people who are at least tight in a and b at once, at every place of the set\. Left out, for nobody was found to meet it in these ranges: c\. For every other check/,
    );
    expect(say({ counted: ['A'], unknown: ['D'] })).toMatch(/^No share is given: d cannot be told/);
    expect(say({ counted: ['A'], unknown: ['D'] })).not.toContain('Counted');
    expect(say({})).toBe('None of these dimensions was found to change the share that meets a check.');
  });

  it('offers a foot rail to whom the seat is too high for', () => {
    const high = effectsOf({ values: now.map((value, n) => (n === 0 ? value + 60 : value)) }, ground);
    const blame = { kind: 'sitter', id: 'hetty', left: 2 } as const;
    const { what, help } = blameWords(blame, {
      sheet: high?.sheet ?? lower.sheet,
      ruleBook,
      show: (mm) => `${Math.round(mm)} mm`,
    });
    expect(what).toBe(
      'Hetty is whom these dimensions serve least: without Hetty 2 checks would still be missed.',
    );
    expect(help.join(' ')).toMatch(/Give Hetty a foot rail \d+ mm high/);
    expect(help.at(-1)).toMatch(/^Seat Hetty elsewhere/);
  });

  it('tells the time left once it can', () => {
    expect(timeLeftWords({ done: 5, of: 600 }, 1, 0)).toBe('');
    expect(timeLeftWords({ done: 100, of: 600 }, 2, 0)).toBe('at most 10 seconds left');
    expect(timeLeftWords({ done: 350, of: 600 }, 2, 250)).toBe('at most 5 seconds left');
  });
});

describe('what may move', () => {
  it('stays inside the limits of the pieces', () => {
    for (const dimension of dimensions) {
      for (const kind of ['range', 'near'] as const) {
        const { min, max } = startFreedom(dimension, kind);
        expect(min).toBeGreaterThanOrEqual(dimension.min);
        expect(max).toBeLessThanOrEqual(dimension.max);
        expect(min).toBeLessThanOrEqual(dimension.value);
        expect(max).toBeGreaterThanOrEqual(dimension.value);
      }
    }
  });

  it('names another question by another name', () => {
    expect(questionOf([bay.pieces, 1])).not.toBe(questionOf([bay.pieces, 2]));
    expect(questionOf([bay.pieces, 1])).toBe(questionOf([structuredClone(bay.pieces), 1]));
  });
});

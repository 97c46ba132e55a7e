import { orderedRows, type StickRow, type Stretch } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { commonWords, countsWords } from './common-words.ts';
import { bestValue, furthestApart, seatElsewhere } from './suggestion.ts';

const INCH = 25.4;
const inches = ([from, to]: readonly [number, number]): Stretch => ({ from: from * INCH, to: to * INCH });

/** A row that is tight over one stretch and fits over another, tried at whole inches from 14 to 18. */
const VALUES = [14, 15, 16, 17, 18].map((value) => value * INCH);
function row(name: string, tight: readonly [number, number], fits: readonly [number, number]): StickRow {
  const [outer, inner] = [inches(tight), inches(fits)];
  const holds = ({ from, to }: Stretch, value: number) => value >= from - 1e-6 && value <= to + 1e-6;
  return {
    sitterId: name,
    placeId: name,
    name,
    estimated: false,
    fits: [inner],
    tight: [outer],
    surelyTight: [outer],
    perhapsTight: [outer],
    states: VALUES.map((value) => (holds(inner, value) ? 'fits' : holds(outer, value) ? 'tight' : 'wontFit')),
  };
}

const hetty = row('Hetty Vance', [14, 15.875], [14, 15]);
const ottilie = row('Ottilie Brandt', [14, 17], [15, 16]);
const marcus = row('Marcus Rowe', [16.375, 18], [17, 18]);

describe('the value that serves most', () => {
  it('is the nearest of equals', () => {
    const best = bestValue({ values: VALUES, rows: [hetty, ottilie, marcus] }, 18 * INCH);
    expect(best).toEqual({ value: 17 * INCH, served: 2, fits: 1 });
  });

  it('is the present one when no other serves more', () => {
    expect(bestValue({ values: VALUES, rows: [hetty, ottilie, marcus] }, 14 * INCH)?.value).toBe(14 * INCH);
  });

  it('never counts what is not known', () => {
    const unknown: StickRow = {
      ...marcus,
      states: ['notKnown', 'notKnown', 'notKnown', 'notKnown', 'tight'],
    };
    expect(bestValue({ values: VALUES, rows: [unknown] }, 14 * INCH)).toEqual({
      value: 18 * INCH,
      served: 1,
      fits: 0,
    });
  });

  it('is none without sitters', () => expect(bestValue({ values: VALUES, rows: [] }, 17)).toBeUndefined());
});

describe('who is seated elsewhere', () => {
  it('is the fewest without whom a value suits the others', () => {
    const elsewhere = seatElsewhere(
      { values: VALUES, rows: [hetty, ottilie, marcus], allTight: [] },
      18 * INCH,
    );
    expect(elsewhere?.rows.map(({ name }) => name)).toEqual(['Hetty Vance']);
    expect(elsewhere?.others).toEqual(inches([17, 17]));
  });

  it('is nobody when one value suits all', () => {
    expect(
      seatElsewhere({ values: VALUES, rows: [hetty, ottilie], allTight: [inches([14, 15.875])] }, 18 * INCH),
    ).toBeUndefined();
  });

  it('names the two that stand furthest apart', () => {
    const apart = furthestApart([ottilie, marcus, hetty]);
    expect([apart?.low.name, apart?.high.name]).toEqual(['Hetty Vance', 'Marcus Rowe']);
    expect(furthestApart([ottilie, hetty])).toBeUndefined();
  });
});

describe('the words under the laths', () => {
  const dimension = { unit: 'mm' } as Parameters<typeof commonWords>[0]['dimension'];
  const options = {
    present: 18 * INCH,
    step: INCH / 8,
    style: { system: 'feet-inches', roundTo: 8 },
  } as const;

  it('say what everybody needs when nothing suits all', () => {
    expect(
      commonWords(
        { dimension, values: VALUES, rows: [hetty, ottilie, marcus], allFit: [], allTight: [] },
        options,
      ),
    ).toBe(
      'No value suits all three: Hetty needs 15⅞″ or less, Marcus 16⅜″ or more. Seat Hetty elsewhere, and 17″ suits the others.',
    );
  });

  it('never call a best guess a pass: who is not known is not suited', () => {
    const guessed: StickRow = {
      ...ottilie,
      name: 'Nell Ashby',
      estimated: true,
      states: VALUES.map(() => 'notKnown'),
    };
    const rows = [hetty, guessed];
    const words = commonWords({ dimension, values: VALUES, rows, allFit: [], allTight: [] }, options);
    expect(words).toBe(
      'No value is known to suit all two. None is known to suit Nell. Seat Nell elsewhere, and 14″ to 15″ suits the others.',
    );
    expect(seatElsewhere({ values: VALUES, rows: [guessed], allTight: [] }, 18 * INCH)).toBeUndefined();
  });

  it('say of an estimated end that it is a best guess', () => {
    const guessed: StickRow = { ...marcus, estimated: true };
    expect(
      commonWords({ dimension, values: VALUES, rows: [hetty, guessed], allFit: [], allTight: [] }, options),
    ).toContain('Hetty needs 15⅞″ or less, Marcus 16⅜″ or more (est., best guess).');
  });

  it('round the ends of a common band inwards', () => {
    const band = { from: 15.01 * INCH, to: 15.99 * INCH };
    expect(
      commonWords(
        { dimension, values: VALUES, rows: [hetty, ottilie], allFit: [], allTight: [band] },
        options,
      ),
    ).toBe('15⅛″ to 15⅞″ is at least tight for all two; no value fits all two.');
  });

  it('count verdicts for the slider', () => {
    expect(countsWords(['fits', 'tight', 'tight', 'wontFit', 'wontFit', 'notKnown'])).toBe(
      '1 fits, 2 tight, 2 won’t fit, 1 not known',
    );
    expect(countsWords(['fits', 'fits'])).toBe('2 fit');
  });
});

describe('the order of the rows', () => {
  it('is highest band first, and last who fits nowhere', () => {
    const nowhere: StickRow = { ...hetty, name: 'Nobody', tight: [] };
    expect(orderedRows([nowhere, hetty, marcus, ottilie]).map(({ name }) => name.split(' ')[0])).toEqual([
      'Marcus',
      'Ottilie',
      'Hetty',
      'Nobody',
    ]);
  });
});

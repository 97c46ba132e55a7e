import type { CellState } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { bestOffer, offerAt, type SitterAlong } from './offer.ts';
import { railHeights, servesWords } from './offer-words.ts';

const VALUES = [16, 17, 18, 19];
const STATES = { f: 'fits', t: 'tight', w: 'wontFit', u: 'notKnown' } as const;

/** A sitter whose worst verdicts at the four values are written as letters. */
function sitter(name: string, letters: string, missed?: number[]): SitterAlong {
  const states = [...letters].map((letter): CellState => STATES[letter as keyof typeof STATES]);
  const isMissed = (state: CellState) => Number(state === 'wontFit' || state === 'notKnown');
  return { sitterId: name, placeId: name, name, states, missed: missed ?? states.map(isMissed) };
}
const along = (sitters: SitterAlong[], worse = [0, 0, 0, 0]) => ({ values: VALUES, sitters, worse });

describe('the first offer', () => {
  it('is at least tight for all where such a value is, though another fits more', () => {
    const stick = along([sitter('Hetty', 'fftw'), sitter('Marcus', 'wtff')]);
    expect(bestOffer(stick, 19)).toMatchObject({ value: 18, lost: [] });
    expect(bestOffer(stick, 16)).toMatchObject({ value: 17, lost: [] });
  });

  it('is else the one that leaves out the fewest, by name', () => {
    const stick = along([
      sitter('Hetty Vance', 'twww'),
      sitter('Ottilie Brandt', 'twww'),
      sitter('Marcus Rowe', 'wttt'),
    ]);
    const best = bestOffer(stick, 19);
    expect(best?.value).toBe(16);
    expect(best && servesWords(best, 3)).toBe(
      'No value is at least tight for all by every check it moves; this one leaves out the fewest: Marcus.',
    );
  });

  it('never counts what is not known as served', () => {
    expect(bestOffer(along([sitter('Wren', 'uutw')]), 16)?.value).toBe(18);
  });

  it('misses fewer checks of who is lost anyway, then spoils less, then lies nearer', () => {
    const lost = sitter('Wren', 'wwww', [3, 2, 2, 2]);
    expect(bestOffer(along([lost]), 16)?.value).toBe(17);
    expect(bestOffer(along([lost], [0, 1, 0, 0]), 16)?.value).toBe(18);
    expect(bestOffer(along([lost]), 19)?.value).toBe(19);
  });

  it('is none where nobody’s verdict follows', () => expect(bestOffer(along([]), 16)).toBeUndefined());

  it('tells whom the present value leaves out', () =>
    expect(offerAt(along([sitter('Hetty', 'wttt')]), 16)?.lost.map(({ name }) => name)).toEqual(['Hetty']));
});

it('builds a foot rail up to the next step', () => {
  const rail = { sitterId: 'h', name: 'Hetty', estimated: true, tightMm: 26, fitsMm: 50.8 };
  expect(railHeights(rail, 25.4 / 8, { system: 'feet-inches', roundTo: 8 })).toBe(
    '2″ high to fit, 1⅛″ to be tight, est.',
  );
});

import { describe, expect, it } from 'vitest';
import { deriveCushions } from '../cushions/derive-cushions.ts';
import { PLAIN_MAKE } from '../cushions/making/cushion-make.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { chooseCushion, type CushionChange } from '../room/cushion-choices.ts';
import { phraseText, samePhrase } from '../units/phrase.ts';
import { clothPhrase } from './cloth-phrase.ts';
import { plainCover } from './order-cover.ts';
import { SAID_OF_CUSHION, saidOfCushion } from './said-of-cushion.ts';

const INCHES = { system: 'feet-inches', roundTo: 8 } as const;
const MM = { system: 'millimetres', roundTo: 8 } as const;
const start = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const said = (change: CushionChange) =>
  saidOfCushion(
    deriveCushions(chooseCushion(start, 'b1/seat-1', change)).find(({ key }) => key === 'b1/seat-1')!,
  );
const changed = (change: CushionChange) =>
  SAID_OF_CUSHION.filter((field) => !samePhrase(said({})[field], said(change)[field]));

describe('what an order says of a cushion', () => {
  it('changes where something was chosen, and only there', () => {
    expect(changed({})).toEqual([]);
    expect(changed({ make: { ...PLAIN_MAKE, welt: 'none' } })).toEqual(['make']);
    expect(changed({ shape: { notches: [{ edge: 'back', fromMm: 0, widthMm: 100, depthMm: 50 }] } })).toEqual(
      ['outline'],
    );
    expect(changed({ cameraSides: ['left'] })).toEqual(['camera']);
    expect(changed({ wear: [{ place: 'middle', look: 'fade' }] })).toEqual(['wear']);
    expect(changed({ notes: 'tight' })).toEqual(['cushion-notes']);
  });

  it('gives every edge and radius of an outline in the units of the reader', () => {
    const shape = { notches: [{ edge: 'back' as const, fromMm: 0, widthMm: 101.6, depthMm: 50.8 }] };
    expect(phraseText(said({ shape }).outline, INCHES)).toContain('notch 2″');
    expect(phraseText(said({ shape }).outline, MM)).toMatch(/notch 51\smm/u);
    expect(phraseText(said({}).outline, INCHES)).toBe('plain rectangle');
  });

  it('tells a length that differs by more than a tenth of a millimetre', () => {
    expect(samePhrase([{ mm: 10 }], [{ mm: 10.05 }])).toBe(true);
    expect(samePhrase([{ mm: 10 }], [{ mm: 10.2 }])).toBe(false);
    expect(samePhrase([{ mm: 10 }], [{ text: '10' }])).toBe(false);
  });
});

describe('a cloth in words', () => {
  const cover = {
    ...plainCover('plum moquette'),
    repeatMm: { acrossMm: 355.6, alongMm: 330.2 },
    pricePerMetreMinor: 4800,
    currency: 'EUR',
  };

  it('has its lengths in the units of the reader, and never its price', () => {
    expect(phraseText(clothPhrase(cover), INCHES)).toBe(
      'plum moquette: 54″ wide, either way, no nap, repeat 14″ across and 13″ along, centered on each cushion, bought by 4½″, for the whole cover of every cushion',
    );
    expect(phraseText(clothPhrase(cover), MM)).toMatch(/1372\smm wide/u);
    expect(phraseText(clothPhrase(cover), MM)).not.toMatch(/EUR|4800|48/u);
  });
});

import { describe, expect, it } from 'vitest';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { chooseCushion } from '../room/cushion-choices.ts';
import { panelCountWords, thicknessWords } from './choice-words.ts';
import { deriveCushions } from './derive-cushions.ts';
import { CONSTRUCTIONS, PLAIN_MAKE } from './making/cushion-make.ts';

const INCHES = { system: 'feet-inches', roundTo: 16 } as const;
const KEY = 'b1/seat-1';
const facing = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();

describe('words of a make', () => {
  it('name boxing as the measure of thickness only where there is boxing of that height', () => {
    const saying = CONSTRUCTIONS.filter((construction) => {
      const document = chooseCushion(facing, KEY, { make: { ...PLAIN_MAKE, construction } });
      const spec = deriveCushions(document).find(({ key }) => key === KEY)!;
      return thicknessWords(spec, INCHES) === 'Thickness is the boxing between seams.';
    });
    expect(saying).toEqual(['boxed']);
  });

  it('say how high tight boxing finishes', () => {
    const make = { ...PLAIN_MAKE, construction: 'tight-boxed' as const };
    const spec = deriveCushions(chooseCushion(facing, KEY, { make })).find(({ key }) => key === KEY)!;
    const inches = spec.making!.edgeHeightMm / 25.4;
    expect(inches).toBeLessThan(spec.finishedMm.thicknessMm / 25.4);
    expect(thicknessWords(spec, INCHES)).toMatch(/^Thickness is the foam; the boxing between seams is \d/);
  });

  it('count panels', () => {
    expect([
      panelCountWords(2, 'plate'),
      panelCountWords(1, 'boxing'),
      panelCountWords(2, 'zip half'),
    ]).toEqual(['2 plates', '1 boxing', '2 zip halves']);
  });
});

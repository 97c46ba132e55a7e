import type { StandInCheck } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import { standInWords } from './stand-in-words.ts';

const IN = 25.4;
const said = {
  unit: 'mm',
  style: { system: 'feet-inches', roundTo: 8 },
  littleSaidMm: 2 * IN,
} as const;
const pair = { castMember: 'Hetty Vance', standIn: 'Joss Verity' };
const measured = (inches: number) => ({ best: inches * IN, low: inches * IN, high: inches * IN });
const check = (change: Partial<StandInCheck>): StandInCheck => ({
  ruleId: 'SEAT-04',
  answer: 'carriesOver',
  because: 'room',
  parts: [],
  room: { castMember: 5 * IN, standIn: 4 * IN },
  difference: measured(1),
  saysLittle: false,
  misleads: false,
  side: 'notKnown',
  ...change,
});

describe('words of a stand-in’s sit', () => {
  it('say of what carries over by room how much room there is and how the bodies differ', () => {
    expect(standInWords(check({}), pair, said)).toBe(
      'what Joss finds holds for Hetty because of the room there is, about 4″ or more for either, although their bodies differ here by 1″.',
    );
    const apart = { best: 1 * IN, low: 0.5 * IN, high: 1.5 * IN };
    expect(standInWords(check({ difference: apart }), pair, said)).toContain('by about 1″ (½″ to 1½″)');
    const either = { best: 0, low: -2 * IN, high: 1 * IN };
    expect(standInWords(check({ difference: either }), pair, said)).toContain(
      'by up to 2″, either of them having more',
    );
  });

  it('say that both are short where that is what carries over', () => {
    const room = { castMember: -2 * IN, standIn: -3 * IN };
    expect(standInWords(check({ room }), pair, said)).toContain(
      'only because both are short of room, by about 2″ or more, although',
    );
  });

  it('speak of no room where the two have one body', () => {
    const same = check({ because: 'bodies', side: 'same', difference: measured(0) });
    expect(standInWords(same, pair, said)).toBe('what Joss finds holds for Hetty.');
  });

  it.each(['carriesOver', 'withDifference'] as const)(
    'say that a sit of bodies far apart says little: %s',
    (answer) => {
      const words = standInWords(check({ answer, saysLittle: true, difference: measured(-3) }), pair, said);
      expect(words).toBe(
        'the sit says little: Joss and Hetty differ here by 3″, more than the 2″ up to which one body is taken for another (shop rule). By the drawing Hetty has about 5″ of room; only Hetty can try that.',
      );
      expect(words).not.toMatch(/holds|Add|Take/);
    },
  );
});

import {
  checkSet,
  CROWD_WEAR,
  civilians2015,
  createBodyModel,
  createStudy,
  loadRuleBook,
} from '@settlewright/anthropometry';
import { measureSet } from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import ansur2 from '@settlewright/seed-data/populations/ansur2.json';
import civilian from '@settlewright/seed-data/populations/civilian-2015.json';
import { describe, expect, it } from '@jest/globals';
import { demoDocument, SCENARIO } from './scenario';

const ruleBook = loadRuleBook(rules);
const PEOPLE = 2000;

/** The set as the demonstration opens it; ids of the cast are their names. */
function opened(name: string) {
  const set = SCENARIO.sets.find((one) => one.name === name)!;
  return demoDocument(set, new Map(SCENARIO.cast.map((person) => [person.name, person.name])));
}

describe('the waiting room of the demonstration', () => {
  const room = opened('Waiting room');
  const situation = measureSet(room, ruleBook);

  it('serves most of the public at all places at once, and suits some in everything', () => {
    const study = createStudy(civilians2015(civilian).draw(PEOPLE, 1), {
      places: situation.places,
      ruleBook,
      wear: { women: CROWD_WEAR, men: CROWD_WEAR },
    });
    const { all } = study.shares();
    if (all.kind !== 'shares') throw new Error(all.kind);
    expect(all.atLeastTight.mixed.value).toBeGreaterThan(0.6);
    expect(all.fits.mixed.value).toBeGreaterThan(0.1);
    expect(all.fits.mixed.value).toBeLessThan(0.9);
  });

  it('fits the crew in most, leaves some of it tight, and one height open that a sit on the foam would settle', () => {
    const sitters = room.seating.flatMap(({ pieceId, place, sitter }) => {
      if (sitter.kind !== 'cast') return [];
      const person = SCENARIO.cast.find(({ name }) => name === sitter.castId)!;
      const tapes = Object.entries(person.measured).map(([key, tape]) => [key, tape.mm]);
      return [
        {
          id: person.name,
          name: person.name,
          kind: 'cast' as const,
          placeId: `${pieceId}:${place}`,
          person: {
            bodyData: person.bodyData as 'women' | 'men',
            stature: { mm: person.statureMm, source: person.statureSource as 'measured' | 'told' },
            ...('weightKg' in person ? { weightKg: person.weightKg } : {}),
            measured: Object.fromEntries(tapes),
            shoeMm: person.shoeMm,
            clothing: person.clothing as 'light',
          },
        },
      ];
    });
    const model = createBodyModel(ansur2);
    const { counts } = checkSet({ situation, sitters, ruleBook, model, settings: room.asked });
    const said = Object.values(counts).reduce((sum, count) => sum + count, 0);
    expect(counts.fits / said).toBeGreaterThan(0.75);
    expect(counts.notKnown).toBeGreaterThan(0);
    expect(counts.tight).toBeGreaterThan(0);
  });
});

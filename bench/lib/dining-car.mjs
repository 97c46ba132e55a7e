// The demo dining car with everyone who sits in it, for the figures about choosing dimensions.
import { createRequire } from 'node:module';
import { setParameter } from '@settlewright/geometry';

const load = createRequire(import.meta.url);
const scenario = load('@settlewright/seed-data/demo/scenario.json');
const told = scenario.sets.find(({ document }) => document === 'dining-car');

/** The set after all changes of its history. */
function lastDraft() {
  let set = load('@settlewright/seed-data/demo/dining-car.json');
  for (const { mark, key, value } of told.history.flatMap(({ changes }) => changes)) {
    const changed = setParameter(set, idOf(set, mark), key, value);
    if (!changed.ok) throw new Error(changed.error.message);
    set = changed.value;
  }
  return set;
}

const idOf = (set, mark) => set.pieces.find((piece) => piece.mark === mark).id;

export const diningCar = lastDraft();

/** The cast at their places, with what was measured of them. */
export const diners = told.seating.map(({ piece, place, who }) => {
  const { name, bodyData, statureMm, statureSource, weightKg, measured, shoeMm, clothing } =
    scenario.cast.find((member) => member.name === who);
  const tapes = Object.entries(measured).map(([key, { mm }]) => [key, mm]);
  return {
    id: name,
    name,
    kind: 'cast',
    placeId: `${idOf(diningCar, piece)}:${place}`,
    person: {
      bodyData,
      stature: { mm: statureMm, source: statureSource },
      weightKg,
      measured: Object.fromEntries(tapes),
      shoeMm,
      clothing,
    },
  };
});

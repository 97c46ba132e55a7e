// A dining room in which forty people sit, for the figures about large sets.
import { addPiece, emptySetDocument, seatSitter, setParameter } from '@settlewright/geometry';

const BAYS = 5;
const BAY_MM = 2100;
const AISLE_MM = 1500;
const FACING_MM = 1500;
const PERCENTILES = [5, 25, 50, 75, 95, 99];

/** Ten bays on both sides of an aisle: a table between two benches of two places each. */
export function roomOfForty() {
  let document = emptySetDocument();
  const add = (kind, place, numbers) => {
    const added = addPiece(document, kind, place);
    document = added.document;
    for (const [key, value] of Object.entries(numbers)) {
      const changed = setParameter(document, added.pieceId, key, value);
      if (!changed.ok) throw new Error(changed.error.message);
      document = changed.value;
    }
    return added.pieceId;
  };
  let sitter = 0;
  const seat = (bench) => {
    for (let place = 1; place <= 2; place += 1) {
      sitter += 1;
      document = seatSitter(document, bench, place, {
        kind: 'mannequin',
        bodyData: sitter % 2 === 0 ? 'men' : 'women',
        measure: 'stature',
        percentile: PERCENTILES[sitter % PERCENTILES.length],
      });
    }
  };
  for (const zMm of [0, FACING_MM + AISLE_MM + 1500]) {
    for (let bay = 0; bay < BAYS; bay += 1) {
      const xMm = (bay - (BAYS - 1) / 2) * BAY_MM;
      const numbers = { lengthMm: 1200, 'places.count': 2 };
      seat(add('bench', { xMm, zMm, turnDeg: 0 }, numbers));
      add('table', { xMm, zMm: zMm + 900, turnDeg: 0 }, { lengthMm: 1200 });
      seat(add('bench', { xMm, zMm: zMm + 1800, turnDeg: 180 }, numbers));
    }
  }
  return document;
}

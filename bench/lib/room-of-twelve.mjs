// A room in which twelve people sit, for the figures about pages.
import { addPiece, emptySetDocument, seatSitter, setParameter } from '@settlewright/geometry';

const PERCENTILES = [5, 25, 50, 75, 95, 99];

/** Three benches of four places in a row, a table before each, a wall behind. */
export function roomOfTwelve() {
  let document = emptySetDocument();
  const add = (kind, xMm, zMm) => {
    const added = addPiece(document, kind, { xMm, zMm, turnDeg: 0 });
    document = added.document;
    return added.pieceId;
  };
  const change = (pieceId, key, value) => {
    const changed = setParameter(document, pieceId, key, value);
    if (!changed.ok) throw new Error(changed.error.message);
    document = changed.value;
  };
  const wall = add('bulkhead', 0, 0);
  change(wall, 'lengthMm', 8400);
  for (const [row, xMm] of [-2700, 0, 2700].entries()) {
    const bench = add('bench', xMm, 0);
    change(bench, 'lengthMm', 2600);
    change(bench, 'places.count', 4);
    add('table', xMm, 900);
    for (let place = 1; place <= 4; place += 1) {
      const n = row * 4 + place;
      document = seatSitter(document, bench, place, {
        kind: 'mannequin',
        bodyData: n % 2 === 0 ? 'men' : 'women',
        measure: 'stature',
        percentile: PERCENTILES[n % PERCENTILES.length],
      });
    }
  }
  return document;
}

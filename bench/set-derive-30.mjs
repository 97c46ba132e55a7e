// Validating a set of 30 pieces and deriving all its parts.
import { ARRANGEMENTS, addPiece, deriveParts, readSetDocument } from '@settlewright/geometry';

const PIECES = 30;
const WARM_UP = 50;
const ROUNDS = 200;

/** Thirty pieces of all kinds, the walls cut around windows. */
function thirtyPieces() {
  let set = ARRANGEMENTS.find(({ id }) => id === 'facing-benches').build();
  const kinds = ['bench', 'table', 'bench', 'sill', 'loose-seat', 'bulkhead', 'overhead'];
  for (let i = 0; set.pieces.length < PIECES; i += 1) set = addPiece(set, kinds[i % kinds.length]).document;
  return set;
}

/** Runs the bench; returns figures with the median of many rounds. */
export async function run() {
  const json = thirtyPieces();
  const times = [];
  for (let i = 0; i < WARM_UP + ROUNDS; i += 1) {
    const start = performance.now();
    const read = readSetDocument(json);
    if (!read.ok) throw new Error(read.error.message);
    if (deriveParts(read.value).length < PIECES) throw new Error('parts are missing');
    if (i >= WARM_UP) times.push(performance.now() - start);
  }
  times.sort((a, b) => a - b);
  const value = Math.round(times[ROUNDS / 2] * 1000) / 1000;
  return [{ name: 'set-derive-30', value, unit: 'ms', aim: 5, reference: null }];
}

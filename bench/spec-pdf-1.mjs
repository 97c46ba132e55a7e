import { createRequire } from 'node:module';
import { ARRANGEMENTS, deriveCushions, planOf } from '@settlewright/geometry';

const load = createRequire(import.meta.url);
const WARM_UP = 3;
const RUNS = 15;

/** Two facing benches with buttons on the board lines, as an order of four cushions. */
function makeDocument() {
  const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches').build();
  for (const piece of document.pieces) {
    if (piece.kind !== 'bench') continue;
    piece.upholstery.buttons = { rows: 2, everyBoards: 3, alignTo: 'joints', on: 'both' };
  }
  return document;
}

function makePack(document, { specCushions, markedSections }) {
  const cushions = deriveCushions(document);
  return {
    paper: 'a4',
    units: { system: 'feet-inches', roundTo: 16 },
    production: 'Supper at Larch Junction',
    set: 'Dining car',
    workshop: { name: 'Ropewalk Scenic', telephone: '555 0142' },
    order: {
      number: 14,
      title: 'Dining car cushions',
      neededBy: 'Friday 26 February 2027',
      upholsterer: 'Fennimore & Daughter',
    },
    revision: {
      letter: 'C',
      issuedAt: new Date('2027-01-28T10:00:00Z'),
      issuedOn: '28 January 2027',
      issuedBy: 'Nell Abara',
      note: '',
    },
    words: {
      cover: 'plum moquette, supplied, 54″ wide',
      foam: 'bonded polyester wrap',
      welt: '5/32″ cord, same cloth',
      closure: '',
      fixing: 'two keyhole plates',
      buttons: 'covered, ⅞″',
      notes: '',
      flammability: 'maker’s label inside the zip',
    },
    cushions: specCushions(cushions),
    plan: planOf(document, { marks: 'cushions', marginMm: 60 }),
    sections: markedSections(document, cushions),
  };
}

/** Time to make the drawing pack of one order, cushions derived anew each time: the median of the runs. */
export async function run() {
  const { specPdf } = load('../apps/api/dist/paper/spec-pdf.js');
  const { specCushions } = load('../apps/api/dist/cushion-orders/spec-cushions.js');
  const { markedSections } = load('../apps/api/dist/cushion-orders/marked-sections.js');
  const document = makeDocument();
  const times = [];
  for (let n = 0; n < WARM_UP + RUNS; n += 1) {
    const start = performance.now();
    specPdf(makePack(document, { specCushions, markedSections }));
    if (n >= WARM_UP) times.push(performance.now() - start);
  }
  times.sort((a, b) => a - b);
  return [{ name: 'spec-pdf-1', value: times[(RUNS - 1) / 2], unit: 'ms', aim: 300, reference: null }];
}

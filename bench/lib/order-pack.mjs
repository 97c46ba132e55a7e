import { createRequire } from 'node:module';
import { deriveCushions, orderModel, pictureFromAbove, plainCover, planOf } from '@settlewright/geometry';

const load = createRequire(import.meta.url);

/** A cushion order of a whole set, as the API hands it to the thread that draws it. */
export function orderPack(document) {
  const { specCushions, bagLabels } = load('../../apps/api/dist/cushion-orders/spec-cushions.js');
  const { markedSections } = load('../../apps/api/dist/cushion-orders/marked-sections.js');
  const cushions = deriveCushions(document);
  const model = orderModel({ cushions, covers: [plainCover('plum moquette')] });
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
      pageUrl:
        'https://ropewalk.example/w/2b1f3c0e-1111-4222-8333-444455556666/p/2b1f3c0e-7777-4222-8333-444455556666/orders/14',
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
    toleranceMm: 6.35,
    model,
    assumedCloths: [],
    cushions: specCushions(model),
    labels: bagLabels(cushions),
    plan: planOf(document, { marks: 'cushions', marginMm: 60 }),
    picture: pictureFromAbove(document, new Set(cushions.map(({ benchId }) => benchId))),
    sections: markedSections(document, cushions),
  };
}

/** Buttons in two rows on the joints of every bench. */
export function withButtons(document) {
  for (const piece of document.pieces) {
    if (piece.kind !== 'bench') continue;
    piece.upholstery.buttons = { rows: 2, everyBoards: 3, alignTo: 'joints', on: 'both' };
  }
  return document;
}

import {
  chooseCushion,
  type CushionChoice,
  type CushionSpec,
  deriveCushions,
  ARRANGEMENTS,
  type LengthStyle,
  type OrderCover,
  orderModel,
  pictureFromAbove,
  plainCover,
  planOf,
  type SetDocument,
} from '@settlewright/geometry';
import { markedSections } from '../../src/cushion-orders/marked-sections';
import { bagLabels, specCushions } from '../../src/cushion-orders/spec-cushions';
import type { Paper } from '../../src/paper/pack';
import type { SpecPackData } from '../../src/paper/spec-pack';

export const ORDER_PAGE =
  'https://ropewalk.example/w/2b1f3c0e-1111-4222-8333-444455556666/p/2b1f3c0e-7777-4222-8333-444455556666/orders/2b1f3c0e-9999-4222-8333-444455556666';

export const INCHES: LengthStyle = { system: 'feet-inches', roundTo: 16 };

export function arrangement(id: string): SetDocument {
  const found = ARRANGEMENTS.find((one) => one.id === id);
  if (!found) throw new Error(`no arrangement ${id}`);
  return found.build();
}

/** The set with something chosen of the cushion that has a mark. */
export function chosen(document: SetDocument, mark: string, choice: CushionChoice): SetDocument {
  const cushion = deriveCushions(document).find((one) => one.mark === mark);
  if (!cushion) throw new Error(`no cushion ${mark}`);
  return chooseCushion(document, cushion.key, choice);
}

/** Two facing benches whose four cushions are made in four ways, one of them no rectangle. */
export function fourWays(): SetDocument {
  let document = arrangement('facing-benches');
  for (const piece of document.pieces) {
    if (piece.kind !== 'bench') continue;
    piece.upholstery.buttons = { rows: 2, everyBoards: 3, alignTo: 'joints', on: 'both' };
  }
  document = chosen(document, 'C1', {
    shape: {
      frontInMm: { left: 60, right: -40 },
      notches: [{ edge: 'back', fromMm: 300, widthMm: 120, depthMm: 70 }],
      cornerRadiusMm: { backLeft: 0, backRight: 0, frontLeft: 80, frontRight: 50 },
    },
    cameraSides: ['front'],
    holdDown: 'hook-and-loop',
    wear: [
      { place: 'front-edge', look: 'worn-through' },
      {
        place: 'area',
        areaMm: { fromEnd: 'left', fromSideMm: 90, fromFrontMm: 140, widthMm: 220, depthMm: 130 },
        look: 'stain',
        note: 'tea, an old ring',
      },
    ],
    notes: '=Rub the front edge.',
  });
  document = chosen(document, 'C2', {
    make: { construction: 'bullnose', closure: 'zip', closureEdge: 'back', welt: 'straight' },
  });
  document = chosen(document, 'C3', {
    make: { construction: 'plywood-backed', closure: 'stapled', closureEdge: 'front', welt: 'none' },
    holdDown: 'keyhole-plates',
  });
  return chosen(document, 'C4', {
    make: { construction: 'knife-edge', closure: 'hand-sewn', closureEdge: 'front', welt: 'bias' },
    tufting: { kind: 'none' },
  });
}

export const patterned = (change: Partial<OrderCover> = {}): OrderCover => ({
  ...plainCover('plum moquette'),
  direction: 'railroad',
  nap: 'to-the-front',
  repeatMm: { acrossMm: 340, alongMm: 300 },
  startMm: 150,
  ...change,
});

/** An order of the cushions of a set, ready to be drawn. */
export function orderPack(
  document: SetDocument,
  change: Partial<SpecPackData> & {
    covers?: OrderCover[];
    keep?: (spec: CushionSpec) => boolean;
    paper?: Paper;
  } = {},
): SpecPackData {
  const { covers = [patterned()], keep = () => true, ...rest } = change;
  const cushions = deriveCushions(document).filter(keep);
  const model = orderModel({ cushions, covers });
  return {
    paper: 'a4',
    units: INCHES,
    production: 'Supper at Larch Junction',
    set: 'Dining car',
    workshop: { name: 'Ropewalk Scenic', telephone: '555 0142' },
    order: {
      number: 14,
      title: 'Dining car cushions',
      neededBy: 'Friday 26 February 2027',
      upholsterer: 'Fennimore & Daughter',
      pageUrl: ORDER_PAGE,
    },
    revision: {
      letter: 'C',
      issuedAt: new Date('2027-01-28T10:00:00Z'),
      issuedOn: '28 January 2027',
      issuedBy: 'Nell Abara',
      note: 'zip longer',
    },
    since: { letter: 'B', changes: 'C1 notes: =Rub the front edge., was nothing' },
    words: {
      cover: 'plum moquette, supplied',
      foam: 'bonded polyester wrap',
      welt: '5/32″ cord, same cloth',
      closure: '',
      fixing: 'two keyhole plates',
      buttons: 'covered, ⅞″',
      notes: 'Front edges rubbed bald, middles sat flat.',
      flammability: 'test of the venue; maker’s statement of 3 January on file',
    },
    toleranceMm: 6.35,
    model,
    assumedCloths: [],
    cushions: specCushions(model),
    labels: bagLabels(cushions),
    plan: planOf(document, { marks: 'cushions', marginMm: 60 }),
    picture: pictureFromAbove(document, new Set(cushions.map(({ benchId }) => benchId))),
    sections: markedSections(document, cushions),
    ...rest,
  };
}

import {
  CLOSURE_WORDS,
  type CushionDatum,
  type CushionEdge,
  type CushionSpec,
  type EdgeMeets,
  handednessOf,
  type Handedness,
  makeWords,
  type OrderModel,
  outlineExtent,
  outlinePerimeter,
  type ScheduleRow,
} from '@settlewright/geometry';
import type { BagLabel, DatumLine, SpecCushion } from '../paper/spec-pack';
import { clothWay } from './cloth-way';

const MEETS: Record<EdgeMeets, string> = {
  wall: 'wall',
  'end-wall': 'end wall',
  arm: 'arm',
  neighbour: 'next cushion',
  'corner-cushion': 'corner cushion',
  free: 'free',
  'back-pad': 'back pad',
  front: 'front edge',
  'seat-cushion': 'seat cushion',
  top: 'top edge',
};

/** A wall further away than this is said in words and not drawn. */
const DRAWN_WITHIN_MM = 100;

/** Cushions as the sheets show them: those that come out of the same drawing stand together. */
export function specCushions(model: OrderModel, assumedCloths: readonly string[] = []): SpecCushion[] {
  return model.schedule.map((row) => specCushion(row, model, assumedCloths));
}

/** A label for the bag of every cushion, in the order of their marks. */
export function bagLabels(specs: readonly CushionSpec[]): BagLabel[] {
  return specs.map((spec, n) => ({
    mark: spec.mark,
    place: placeWords(spec),
    hand: LABEL_HAND[handednessOf(spec)],
    number: n + 1,
    count: specs.length,
  }));
}

const LABEL_HAND: Record<Handedness, string> = {
  left: 'LH, left hand as sat in',
  right: 'RH, right hand as sat in',
  either: 'fits either hand',
  'one-way': 'one way round, as drawn',
};

/** "B1, seat 1 of 2 from the left, seen from in front". */
function placeWords({ benchMark, kind, place }: CushionSpec): string {
  const which = place.of > 1 ? ` ${place.number} of ${place.of} from the left, seen from in front` : '';
  return `${benchMark}, ${kind}${which}`;
}

function specCushion(row: ScheduleRow, model: OrderModel, assumedCloths: readonly string[]): SpecCushion {
  const { spec, marks, benchMarks: benches, mirroredMarks: mirrorMarks } = row;
  const { making, make, buttons } = spec;
  const board = making?.board && {
    ...outlineExtent(making.board.outline),
    thicknessMm: making.board.thicknessMm,
  };
  return {
    row,
    marks,
    benches,
    mirrorMarks,
    kind: spec.kind,
    hand: handednessOf(spec),
    finished: spec.finishedMm,
    make: makeWords(make, spec.kind),
    ...(spec.curve && { curve: spec.curve }),
    panels: row.panels,
    ...(board && { board }),
    closure: {
      word: CLOSURE_WORDS[make.closure],
      edge: make.closureEdge,
      edgeMm: making?.closure.edgeMm ?? 0,
      wrapMm: making?.closure.wrapMm ?? 0,
    },
    weltMm: making?.welt.lengthMm ?? 0,
    perimeterMm: making?.perimeterMm ?? outlinePerimeter(spec.outline),
    faults: spec.faults,
    buttons: {
      columnsMm: buttons.columns.map(({ fromSeamMm }) => fromSeamMm),
      rowsMm: buttons.rowsMm,
      seamName: seamName(spec.datum),
      datum: datumLine(spec),
      boardLinesMm: spec.boardLinesMm,
    },
    edges: edgeWords(spec),
    meets: meetsWords(spec),
    cloth: clothWay(row, model, assumedCloths),
  };
}

/** Everything that shows on a sheet, to a tenth of a millimetre. */
function datumLine({ datum, buttons }: CushionSpec): DatumLine {
  return {
    name: datumName(datum),
    // Drawn with its back edge up, a cushion has the sitter's left at the right of the page.
    side: datum.side === 'left' ? 'right' : 'left',
    toSeamMm: datum.toSeamMm,
    columnsMm: buttons.columns.map(({ fromDatumMm }) => fromDatumMm),
    drawn: datum.meets !== 'bench-end' && datum.toSeamMm <= DRAWN_WITHIN_MM,
  };
}

/** "wall W1", "end wall", "bench end". */
function datumName({ meets, wallMark }: CushionDatum): string {
  if (meets === 'bench-end') return 'bench end';
  return wallMark ? `${MEETS[meets]} ${wallMark}` : MEETS[meets];
}

function seamName({ meets, side }: CushionDatum): string {
  if (meets === 'bench-end') return `sitter’s ${side}`;
  return meets === 'end-wall' ? 'end-wall' : `${meets}-end`;
}

function edgeWords({ kind, edges, cameraSides }: CushionSpec): SpecCushion['edges'] {
  const camera = (edge: CushionEdge) => (cameraSides.includes(edge) ? ', camera side' : '');
  return {
    back: `${kind === 'seat' ? 'back edge' : 'top edge'}${camera('back')}`,
    front: `${kind === 'seat' ? 'front edge' : 'bottom edge'}${camera('front')}`,
    left: `${endWords(edges.right)}, sitter’s right${camera('right')}`,
    right: `${endWords(edges.left)}, sitter’s left${camera('left')}`,
  };
}

const endWords = (edge: EdgeMeets): string => (edge === 'free' ? 'free end' : MEETS[edge]);

function meetsWords({ kind, edges }: CushionSpec): string {
  const free = (edge: EdgeMeets) => (edge === 'front' || edge === 'top' ? 'free' : MEETS[edge]);
  const [back, front] = kind === 'seat' ? ['back', 'front'] : ['top', 'bottom'];
  return (
    `Sitter’s left: ${MEETS[edges.left]} · right: ${MEETS[edges.right]} · ` +
    `${back}: ${free(edges.back)} · ${front}: ${free(edges.front)}`
  );
}

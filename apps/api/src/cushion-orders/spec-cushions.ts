import {
  CLOSURE_WORDS,
  type CushionDatum,
  type CushionSpec,
  type EdgeMeets,
  foamOfCushion,
  groupCushions,
  makeWords,
  outlineExtent,
  outlinePerimeter,
} from '@settlewright/geometry';
import type { DatumLine, SpecCushion } from '../paper/spec-pack';

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
export function specCushions(specs: readonly CushionSpec[]): SpecCushion[] {
  const byMark = new Map(specs.map((spec) => [spec.mark, spec]));
  return groupCushions(specs).map(({ marks, spec, mirroredMarks }) => {
    const benches = marks.map((mark) => byMark.get(mark)?.benchMark ?? '');
    return specCushion(spec, { marks, benches, mirrorMarks: mirroredMarks });
  });
}

function specCushion(
  spec: CushionSpec,
  alike: Pick<SpecCushion, 'marks' | 'benches' | 'mirrorMarks'>,
): SpecCushion {
  const { making, make, buttons } = spec;
  const foam = foamOfCushion(spec);
  const sawn = making ? outlineExtent(making.foam.outline) : spec.finishedMm;
  const board = making?.board && outlineExtent(making.board.outline);
  return {
    ...alike,
    kind: spec.kind,
    hand: spec.hand,
    finished: spec.finishedMm,
    make: makeWords(make, spec.kind),
    foam: { ...sawn, thicknessMm: making?.foam.thicknessMm ?? spec.finishedMm.thicknessMm },
    foamGrade: { ...spec.foam, name: spec.foam.grade },
    foamVolumeM3: foam?.volumeM3 ?? 0,
    foamMassKg: foam?.massKg ?? 0,
    ...(spec.curve && { curve: spec.curve }),
    panels: (making?.panels ?? []).map(({ name, count, cut }) => {
      const { widthMm, depthMm } = outlineExtent(cut);
      return { name, count, widthMm, heightMm: depthMm };
    }),
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
  };
}

/** Everything that shows on a sheet, to a tenth of a millimetre. */
function datumLine({ datum, buttons }: CushionSpec): DatumLine {
  return {
    name: datum.meets === 'bench-end' ? 'bench end' : MEETS[datum.meets],
    // Drawn with its back edge up, a cushion has the sitter's left at the right of the page.
    side: datum.side === 'left' ? 'right' : 'left',
    toSeamMm: datum.toSeamMm,
    columnsMm: buttons.columns.map(({ fromDatumMm }) => fromDatumMm),
    drawn: datum.meets !== 'bench-end' && datum.toSeamMm <= DRAWN_WITHIN_MM,
  };
}

function seamName({ meets, side }: CushionDatum): string {
  if (meets === 'bench-end') return `sitter’s ${side}`;
  return meets === 'end-wall' ? 'end-wall' : `${meets}-end`;
}

function edgeWords({ kind, edges }: CushionSpec): SpecCushion['edges'] {
  return {
    back: kind === 'seat' ? 'back edge' : 'top edge',
    front: kind === 'seat' ? 'front edge' : 'bottom edge',
    left: `${endWords(edges.right)}, sitter’s right`,
    right: `${endWords(edges.left)}, sitter’s left`,
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

import { outlineBox, outlinePoints, type OutlineCorner, type Point2 } from '../outlines/outline.ts';
import { formatLength } from '../units/format-length.ts';
import type { LengthStyle } from '../units/length-style.ts';
import { fittingSize } from './cushion-sizes.ts';
import type { ButtonTable, CushionSpec } from './cushion-spec.ts';
import type { CushionWarning } from './cushion-warning.ts';

/** A column may stand off its joint by so much: 1/8 in, trade practice, from memory. */
export const OFF_JOINT_MM = 3.175;

/** Where each button stands on the plan: back edge up, sitter's left at the right, from the lower left corner. */
export function buttonSpots(spec: Pick<CushionSpec, 'buttons' | 'datum' | 'placeMm' | 'gapsMm'>): Point2[] {
  const { columns, rowsMm, pattern } = spec.buttons;
  const { widthMm, depthMm } = fittingSize(spec);
  return rowsMm.flatMap((row, r) =>
    columns.flatMap(({ fromSeamMm }, c): Point2[] => {
      if (pattern === 'staggered' && c % 2 !== r % 2) return [];
      return [[spec.datum.side === 'left' ? widthMm - fromSeamMm : fromSeamMm, depthMm - row]];
    }),
  );
}

/**
 * What somebody should look at before a cushion is made.
 *
 * @param spec - the cushion
 * @returns warnings as data; see `cushionWarningWords`
 */
export function cushionWarnings(
  spec: Pick<
    CushionSpec,
    'buttons' | 'datum' | 'placeMm' | 'gapsMm' | 'outline' | 'make' | 'making' | 'kind' | 'cameraSides'
  > & {
    /** Whether columns are meant to stand on joints. */
    onJoints: boolean;
    /** Whether the outline was drawn freely; a taper that goes out is meant to. */
    drawn: boolean;
  },
): CushionWarning[] {
  const { make, cameraSides } = spec;
  const open = make.closure === 'stapled' || make.closure === 'hand-sewn' ? undefined : make.closureEdge;
  const outside = buttonSpots(spec).filter((spot) => !isInside(spot, spec.outline)).length;
  return [
    ...(spec.onJoints ? offJoint(spec.buttons) : []),
    ...(outside > 0 ? [{ code: 'buttons-outside' as const, count: outside }] : []),
    ...(spec.making?.board
      ? [{ code: 'board-beyond' as const, kind: spec.kind, boardMm: spec.making.board.thicknessMm }]
      : []),
    ...(spec.drawn ? beyondPlace(spec) : []),
    ...(open && cameraSides.includes(open) ? [{ code: 'closure-on-camera-side' as const, edge: open }] : []),
  ];
}

function offJoint({ columns }: ButtonTable): CushionWarning[] {
  const off = columns.map(({ offJointMm }) => Math.abs(offJointMm)).filter((mm) => mm > OFF_JOINT_MM + 1e-6);
  return off.length === 0 ? [] : [{ code: 'off-joint', columns: off.length, furthestMm: Math.max(...off) }];
}

/** Less than half a millimetre is drawing, not cloth. */
const BEYOND_MM = 0.5;

function beyondPlace(spec: Pick<CushionSpec, 'outline' | 'placeMm' | 'gapsMm'>): CushionWarning[] {
  const { widthMm, depthMm } = fittingSize(spec);
  const { x0, x1, y0, y1 } = outlineBox(spec.outline);
  const beyond = (
    [
      ['left', x1 - widthMm],
      ['right', -x0],
      ['back', y1 - depthMm],
      ['front', -y0],
    ] as const
  ).filter(([, mm]) => mm > BEYOND_MM);
  if (beyond.length === 0) return [];
  const furthestMm = Math.max(...beyond.map(([, mm]) => mm));
  return [{ code: 'beyond-place', edges: beyond.map(([edge]) => edge), furthestMm }];
}

/** Crossings of a ray to the right; a spot on the line counts as either. */
function isInside([x, y]: Point2, outline: readonly OutlineCorner[]): boolean {
  const points = outlinePoints(outline, 0.5);
  let inside = false;
  points.forEach(([x1, y1], i) => {
    const [x2, y2] = points[(i + 1) % points.length]!;
    if (y1 > y !== y2 > y && x < x1 + ((y - y1) / (y2 - y1)) * (x2 - x1)) inside = !inside;
  });
  return inside;
}

/**
 * A warning in words.
 *
 * @param warning - as data
 * @param style - units in which lengths are shown
 */
export function cushionWarningWords(warning: CushionWarning, style: LengthStyle): string {
  const show = (mm: number) => formatLength(mm, { ...style, feet: false });
  switch (warning.code) {
    case 'off-joint': {
      const { columns, furthestMm } = warning;
      const which = columns === 1 ? 'One button column stands' : `${columns} button columns stand`;
      return `${which} more than ${show(OFF_JOINT_MM)} off a board joint, the furthest ${show(furthestMm)}.`;
    }
    case 'buttons-outside':
      return warning.count === 1
        ? 'One button lies outside the outline.'
        : `${warning.count} buttons lie outside the outline.`;
    case 'beyond-place': {
      const where = warning.edges.map((edge) => `the ${edge}`).join(' and ');
      return `The drawn outline goes ${show(warning.furthestMm)} beyond its place at ${where}.`;
    }
    case 'board-beyond':
      return warning.kind === 'seat'
        ? `The board under it, ${show(warning.boardMm)}, is not in the seat height: set the deck lower by it.`
        : `The board behind it, ${show(warning.boardMm)}, is not in the thickness: it brings the back forward.`;
    case 'closure-on-camera-side':
      return `The closure is in the ${warning.edge} edge, which the camera sees.`;
  }
}

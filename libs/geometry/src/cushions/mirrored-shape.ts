import { outlineBox, type OutlineCorner } from '../outlines/outline.ts';
import type { CushionShape } from './cushion-shape.ts';

const OTHER: Readonly<Record<string, string>> = { left: 'right', right: 'left' };

/** An edge, end or hand of the mirror image: left and right change places, all else stays. */
export const otherEdge = <E extends string>(edge: E): E => (OTHER[edge] ?? edge) as E;

/**
 * An outline mirrored left to right about the middle of its width, still anticlockwise.
 *
 * @param corners - anticlockwise
 * @returns the same number of corners; left and right edges have changed names
 */
export function mirroredOutline(corners: readonly OutlineCorner[]): OutlineCorner[] {
  const { x0, x1 } = outlineBox(corners);
  const count = corners.length;
  return corners.map((_, j) => {
    const corner = corners[(count + 1 - j) % count]!;
    const edge = corners[(count - j) % count]!.edge;
    return { at: [x0 + x1 - corner.at[0], corner.at[1]], radiusMm: corner.radiusMm, edge: otherEdge(edge) };
  });
}

/**
 * A shape mirrored left to right.
 *
 * @param shape - of a cushion
 * @returns the same of its mirror image
 */
export function mirroredShape(shape: CushionShape): CushionShape {
  const { frontInMm, notches, cornerRadiusMm: round, drawn } = shape;
  return {
    ...(frontInMm && { frontInMm: { left: frontInMm.right, right: frontInMm.left } }),
    ...(notches && {
      notches: notches.map((notch) => ({
        ...notch,
        edge: otherEdge(notch.edge),
        ...((notch.edge === 'back' || notch.edge === 'front') && {
          fromEnd: notch.fromEnd === 'right' ? ('left' as const) : ('right' as const),
        }),
      })),
    }),
    ...(round && {
      cornerRadiusMm: {
        backLeft: round.backRight,
        backRight: round.backLeft,
        frontLeft: round.frontRight,
        frontRight: round.frontLeft,
      },
    }),
    ...(drawn && { drawn: mirroredDrawn(drawn) }),
  };
}

function mirroredDrawn(drawn: NonNullable<CushionShape['drawn']>): NonNullable<CushionShape['drawn']> {
  const outline = drawn.map(({ xMm, yMm, radiusMm, edge }): OutlineCorner => ({
    at: [xMm, yMm],
    radiusMm,
    edge,
  }));
  return mirroredOutline(outline).map(({ at, radiusMm, edge }) => ({
    xMm: at[0],
    yMm: at[1],
    radiusMm,
    edge: edge as 'back' | 'front' | 'left' | 'right',
  }));
}

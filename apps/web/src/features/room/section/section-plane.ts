import type { NamedView, SetDocument, Vec3, ViewDirection } from '@settlewright/geometry';
import { usualCut } from '../export/views-to-save.ts';
import type { Cut, SceneView } from '../scene/views.ts';

/** A cut that can be moved: what stands nearer than the plane, as seen from a direction, is taken away. */
export interface SectionPlane {
  direction: ViewDirection;
  /** Height above the floor from above, z from front or rear, x from left or right; millimetres in the room. */
  atMm: number;
}

const TOWARD: Record<ViewDirection, Vec3> = {
  above: [0, 1, 0],
  front: [0, 0, 1],
  rear: [0, 0, -1],
  left: [-1, 0, 0],
  right: [1, 0, 0],
};

const FROM_VIEW: Record<SceneView, ViewDirection> = {
  A: 'front',
  B: 'left',
  C: 'front',
  D: 'above',
  E: 'front',
  lens: 'front',
};

/** The axis of the room that a plane moves along. */
export function axisOf(direction: ViewDirection): 0 | 1 | 2 {
  if (direction === 'above') return 1;
  return direction === 'left' || direction === 'right' ? 0 : 2;
}

/** The plane as the scene cuts by it. */
export function cutOf({ direction, atMm }: SectionPlane): Cut {
  const pointMm: [number, number, number] = [0, 0, 0];
  pointMm[axisOf(direction)] = atMm;
  return { pointMm, toward: TOWARD[direction] };
}

/** The cut of a named view, where it is one that can be moved: view C has its own, through the bench. */
export function planeOfView({ camera, section }: NamedView): SectionPlane | undefined {
  if (!section || (camera.kind === 'letter' && camera.letter === 'C')) return undefined;
  for (const direction of Object.keys(TOWARD) as ViewDirection[]) {
    const apart = TOWARD[direction].map((value, n) => Math.abs(value - section.toward[n as 0 | 1 | 2]));
    if (Math.max(...apart) < 1e-6) return { direction, atMm: section.pointMm[axisOf(direction)] };
  }
  return undefined;
}

/** Where a cut begins: square to the present view, through the middle of the pieces. */
export function firstPlane(document: SetDocument, letter: SceneView): SectionPlane {
  const direction = FROM_VIEW[letter];
  return { direction, atMm: usualCut(document, direction) };
}

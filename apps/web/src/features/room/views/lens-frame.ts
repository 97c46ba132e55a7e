import { fieldAt, lensStand, type LensCamera } from '@settlewright/geometry';
import { add, fromAxes, scale } from '../scene/vectors.ts';
import type { ViewFrame, Viewport } from '../scene/view-frame.ts';
import type { Insets } from '../scene/views.ts';

/** Any plane square to the axis gives the same picture; this one lies amid a set. */
const PLANE_MM = 3000;
const NEAREST_MM = 60;
const FARTHEST_MM = 60_000;

export const NO_INSETS: Insets = { top: 0, right: 0, bottom: 0, left: 0 };

/** Where the frame of a lens lies on the sheet, CSS pixels from its top left. */
export interface FrameBox {
  left: number;
  top: number;
  width: number;
  height: number;
}

function fitted(lens: LensCamera, viewport: Viewport, insets: Insets) {
  const field = fieldAt(lens, PLANE_MM);
  const freeWidth = Math.max(40, viewport.width - insets.left - insets.right);
  const freeHeight = Math.max(40, viewport.height - insets.top - insets.bottom);
  return { field, mmPerPixel: Math.max(field.width / freeWidth, field.height / freeHeight) };
}

/** The true perspective of a lens, its whole frame within the insets of the sheet. */
export function lensFrame(lens: LensCamera, viewport: Viewport, insets: Insets): ViewFrame {
  const { eyeMm, right, up, toward } = lensStand(lens);
  const { mmPerPixel } = fitted(lens, viewport, insets);
  return {
    target: add(eyeMm, scale(toward, -PLANE_MM)),
    orientation: fromAxes(right, up, toward),
    perspective: 1 / PLANE_MM,
    eyeMm: [0, 0],
    centreMm: [
      ((insets.right - insets.left) / 2) * mmPerPixel,
      ((insets.top - insets.bottom) / 2) * mmPerPixel,
    ],
    halfHeightMm: (mmPerPixel * viewport.height) / 2,
    depthMm: [PLANE_MM - NEAREST_MM, PLANE_MM - FARTHEST_MM],
  };
}

/** The frame itself on that sheet. */
export function frameBox(lens: LensCamera, viewport: Viewport, insets: Insets): FrameBox {
  const { field, mmPerPixel } = fitted(lens, viewport, insets);
  const [width, height] = [field.width / mmPerPixel, field.height / mmPerPixel];
  return {
    left: (viewport.width + insets.left - insets.right - width) / 2,
    top: (viewport.height + insets.top - insets.bottom - height) / 2,
    width,
    height,
  };
}

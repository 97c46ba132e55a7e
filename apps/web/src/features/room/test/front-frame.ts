import type { ViewFrame } from '../scene/view-frame.ts';

/** Straight from in front, 2 m of the room from the top to the foot of the sheet. */
export const FRONT_FRAME: ViewFrame = {
  target: [0, 0, 0],
  orientation: [0, 0, 0, 1],
  perspective: 0,
  eyeMm: [0, 0],
  centreMm: [0, 0],
  halfHeightMm: 1000,
  depthMm: [3000, -3000],
};

import type { PieceOf } from '../room/document.ts';
import { benchLayout } from './bench-layout.ts';

/** Without an apex the back comes forward again up to here over the pressed seat, millimetres. */
const FLAT_AGAIN_MM = 300;
/** The back gives way fully up to here, or to half way to the apex where that is lower, millimetres. */
const FULL_UP_TO_MM = 150;
const STEPS = 16;

/**
 * The side view of a curved back between the seat and its apex: how it gives way for the pelvis and comes forward to
 * the face that the flat back has.
 *
 * @param bench - the bench
 * @returns points forward of the rear of the bench and above the floor, from the seat up, millimetres; none for a
 * flat back. Depth and apex are the document's; the line between them is smooth and governs nothing
 */
export function backCurve(bench: PieceOf<'bench'>): [forwardMm: number, heightMm: number][] {
  const { lumbar } = bench;
  const layout = benchLayout(bench);
  if (!layout.hasBack || !lumbar || (lumbar.recessMm === 0 && lumbar.apexMm === 0)) return [];
  const { pressedTopMm, seatTopRearMm, backTopMm, faceZMm, leanRad } = layout;
  const top = Math.min(lumbar.apexMm || FLAT_AGAIN_MM, backTopMm - pressedTopMm);
  const full = Math.min(FULL_UP_TO_MM, top / 2);
  const from = Math.min(Math.max(0, seatTopRearMm - pressedTopMm), top);
  return Array.from({ length: STEPS + 1 }, (_, i) => {
    const over = from + ((top - from) * i) / STEPS;
    const eased = over <= full ? 1 : (1 + Math.cos((Math.PI * (over - full)) / (top - full))) / 2;
    const height = pressedTopMm + over;
    const face = faceZMm - (height - seatTopRearMm) * Math.tan(leanRad);
    return [face - lumbar.recessMm * eased, height];
  });
}

import type { PieceOf } from '../room/document.ts';
import { benchLayout } from './bench-layout.ts';
import { cushionHeightMm } from './foam-situation.ts';

/** Without an apex the back comes forward again up to here over the pressed seat, millimetres. */
const FLAT_AGAIN_MM = 300;
/** The back gives way fully up to here, or to half way to the apex where that is lower, millimetres. */
const FULL_UP_TO_MM = 150;
const STEPS = 16;

type Corner = readonly [forwardMm: number, heightMm: number];

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

/** What is left of a back cushion where it gives way most, millimetres: a pad is never cut through. */
const LEAST_PAD_MM = 6;

/**
 * Side view of a back cushion whose face follows the curve of the back.
 *
 * @param bench - the bench
 * @param flat - the four corners of the cushion on a flat back, forward of the rear of the bench and above the floor:
 * lower rear, lower front, upper front, upper rear, millimetres
 * @returns the outline, turning the same way, inside the flat one; undefined where the face stays flat. A curve deeper
 * than the cushion is cut off before its rear
 */
export function curvedPad(
  bench: PieceOf<'bench'>,
  flat: readonly [Corner, Corner, Corner, Corner],
): Corner[] | undefined {
  const [lowRear, lowFront, highFront, highRear] = flat;
  const thickness = cushionHeightMm(bench.backCushion);
  const cos = Math.cos(benchLayout(bench).leanRad);
  const deepest = (thickness - LEAST_PAD_MM) / cos;
  const curve = backCurve(bench);
  const [lowest] = curve;
  if (!bench.lumbar?.recessMm || deepest <= 0 || lowest === undefined) return undefined;
  const slope = (highFront[0] - lowFront[0]) / (highFront[1] - lowFront[1]);
  const faceAt = (height: number) => lowFront[0] + (height - lowFront[1]) * slope;
  const givenWay = ([forward, height]: Corner) => Math.min(deepest, faceAt(height) - forward);
  // The lower edge is square to the face: the curve meets it this far along.
  const along = (givenWay(lowest) * cos) / thickness;
  const foot: Corner = [
    lowFront[0] + (lowRear[0] - lowFront[0]) * along,
    lowFront[1] + (lowRear[1] - lowFront[1]) * along,
  ];
  const face = curve
    .filter(([, height]) => height > lowFront[1] && height < highFront[1])
    .map((point): Corner => [faceAt(point[1]) - givenWay(point), point[1]]);
  return [lowRear, foot, ...face, highFront, highRear];
}

import { benchLayout } from '../pieces/bench-layout.ts';
import { cushionHeightMm } from '../pieces/foam-situation.ts';
import type { PieceOf } from '../room/document.ts';
import type { Grip } from './handle.ts';

/** How far up the back its lean is taken hold of. */
const UP_THE_BACK = 0.6;
const UP_THE_PAD = 0.3;

/**
 * Where a bench is taken hold of.
 *
 * @param bench - the bench
 * @returns grips in its own frame, the most important first; the rear of the bench stays but for a length
 */
export function benchGrips(bench: PieceOf<'bench'>): Grip[] {
  const layout = benchLayout(bench);
  const { backTopMm, faceZMm, frontZMm, seatTopFrontMm, seatTopRearMm, leanRad, hasBack } = layout;
  const half = bench.lengthMm / 2;
  const seat = cushionHeightMm(bench.seatCushion);
  const pad = cushionHeightMm(bench.backCushion);
  const middle = seatTopFrontMm - seat / 2;
  const [sin, cos] = [Math.sin(leanRad), Math.cos(leanRad)];
  const grips: Grip[] = [
    {
      key: 'lengthMm',
      side: 'left',
      pointMm: [-half, middle, frontZMm],
      along: [-1, 0, 0],
      farStays: true,
    },
    { key: 'lengthMm', side: 'right', pointMm: [half, middle, frontZMm], along: [1, 0, 0], farStays: true },
    { key: 'pressedSeatHeight', pointMm: [half / 2, seatTopFrontMm, frontZMm], along: [0, 1, 0] },
    { key: 'seatDepthMm', pointMm: [0, middle, frontZMm], along: [0, 0, 1] },
  ];
  if (hasBack) {
    const rise = backTopMm - seatTopRearMm;
    // Boards hang from the top of the back, which stays where it is: the foot of the back comes forward.
    const down = ((1 - UP_THE_BACK) * rise) / cos;
    const pivotMm = [half, backTopMm, bench.backThicknessMm] as const;
    grips.push(
      { key: 'backHeightMm', pointMm: [half / 2, backTopMm, bench.backThicknessMm], along: [0, 1, 0] },
      {
        key: 'backLeanDeg',
        pointMm: [half, backTopMm - down * cos, bench.backThicknessMm + down * sin],
        along: [0, sin, cos],
        pivotMm,
      },
    );
    if (pad > 0) {
      const up = (UP_THE_PAD * rise) / cos;
      grips.push({
        key: 'backCushion.thicknessMm',
        pointMm: [-half / 2, seatTopRearMm + up * cos, faceZMm - up * sin],
        along: [0, sin, cos],
      });
    }
  }
  if (seat > 0) {
    grips.push({
      key: 'seatCushion.thicknessMm',
      pointMm: [-half / 2, seatTopFrontMm - seat, frontZMm],
      along: [0, -1, 0],
    });
  }
  if (bench.base === 'box') {
    const low = layout.hasKick ? bench.kick.heightMm : 0;
    const y = (low + layout.deckUndersideAt(layout.riserFrontZMm)) / 2;
    grips.push({ key: 'lipMm', pointMm: [half * 0.75, y, layout.riserFrontZMm], along: [0, 0, -1] });
  }
  return grips;
}

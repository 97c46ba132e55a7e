import { cushionPanel } from '../cushions/cushion-panel.ts';
import type { CushionShape } from '../cushions/cushion-shape.ts';
import type { CushionSize } from '../cushions/cushion-sizes.ts';
import type { PartList } from '../parts/part-list.ts';
import type { Vec3 } from '../parts/part.ts';

/** A cushion before it is placed, in the frame of its piece. */
interface PlacedCushion {
  sizeMm: CushionSize;
  centreMm: Vec3;
  /** About the piece's x axis, as a box has it; negative lifts the front and leans a back. */
  pitchRad: number;
  shape: CushionShape | undefined;
}

/** Adds a cushion to the parts of its piece: a box, or the outline it is shaped to. */
export function addCushion(
  list: PartList,
  kind: 'seat' | 'back',
  { sizeMm, centreMm, pitchRad, shape }: PlacedCushion,
): void {
  const { widthMm, depthMm, thicknessMm } = sizeMm;
  const outlineMm = cushionPanel(sizeMm, shape);
  if (outlineMm) {
    const laid = kind === 'seat' ? pitchRad - Math.PI / 2 : pitchRad;
    list.panel(`${kind}-cushion`, 'cloth', { outlineMm, thicknessMm, centreMm, pitchRad: laid });
    return;
  }
  list.box(`${kind}-cushion`, 'cloth', {
    sizeMm: kind === 'seat' ? [widthMm, thicknessMm, depthMm] : [widthMm, depthMm, thicknessMm],
    centreMm,
    pitchRad,
  });
}

import { outlineExtent } from '../outlines/outline.ts';
import type { CushionChoice } from './cushion-choice.ts';
import type { CushionSettings } from './cushion-settings.ts';
import { shapedOutline } from './cushion-shape.ts';
import type { CushionSize } from './cushion-sizes.ts';
import type { CushionSpec, CushionTufting } from './cushion-spec.ts';
import { PLAIN_MAKE } from './making/cushion-make.ts';
import { rectangleOutline } from './making/cut-panels.ts';
import { makeCushion } from './making/make-cushion.ts';
import { withTuftedFace } from './making/tufted-face.ts';

/**
 * Plan and panels of a cushion by its choices.
 *
 * @param kind - a seat closes at its back edge, a back at its lower edge, unless something else was chosen
 * @param placedMm - finished size of the plain rectangle
 * @param choice - what was chosen
 * @param tufting - of its face
 * @param settings - allowances of the workshop
 * @returns what can be made, or the plain rectangle and in words why it cannot
 */
export function madeOf(
  kind: CushionSpec['kind'],
  placedMm: CushionSize,
  choice: CushionChoice,
  tufting: CushionTufting,
  settings: CushionSettings,
): Pick<CushionSpec, 'finishedMm' | 'make' | 'outline' | 'making' | 'faults'> {
  const make = choice.make ?? plainMake(kind);
  const { shape } = choice;
  const plan = shapedOutline(placedMm, shape);
  if (!plan.ok) {
    const outline = rectangleOutline(placedMm.widthMm, placedMm.depthMm);
    return { finishedMm: placedMm, make, outline, faults: [plan.fault] };
  }
  // What was drawn freely says its own size.
  const finishedMm = shape?.drawn ? { ...placedMm, ...outlineExtent(plan.corners) } : placedMm;
  const made = makeCushion({ finishedMm: placedMm, make, ...(shape && { shape }) }, settings);
  const tufted = made.ok ? withTuftedFace(made.made, tufting, make, settings.seam.valueMm) : made;
  const whole = { finishedMm, make, outline: plan.corners };
  return tufted.ok ? { ...whole, making: tufted.made, faults: [] } : { ...whole, faults: [tufted.fault] };
}

/**
 * The make of a cushion of which nothing was chosen.
 *
 * @param kind - seat or back
 */
export const plainMake = (kind: CushionSpec['kind']): typeof PLAIN_MAKE => ({
  ...PLAIN_MAKE,
  closureEdge: kind === 'seat' ? 'back' : 'front',
});

import type { CushionSpec } from '../cushions/cushion-spec.ts';
import { cushionPlan } from './cushion-plan.ts';
import { cushionFront, cushionSection } from './cushion-views.ts';
import type { Drawing } from './drawing.ts';

/** The views of one cushion. */
export interface CushionDrawing {
  /** From above, back edge up, so the sitter's left is at the right of the page. A back cushion: from the front, top up. */
  plan: Drawing;
  /** The front (or lower) edge, level. */
  front: Drawing;
  /** Cut from back to front, front at the right. */
  section: Drawing;
}

/**
 * Draws one cushion as data: plan with board lines, buttons, zip and chains of dimensions, front and section.
 *
 * @param spec - the cushion
 * @param options.labelMm - length a number takes on the drawing; short stretches lift theirs to another lane
 * @param options.stepMm - smallest step that lengths are shown in, so that the numbers of a chain add up as they are read
 * @returns three drawings, millimetres; numbers are left to the consumer
 */
export function cushionDrawing(
  spec: CushionSpec,
  options: { labelMm?: number; stepMm?: number } = {},
): CushionDrawing {
  const { widthMm, depthMm } = spec.finishedMm;
  const labelMm = options.labelMm ?? 0.06 * Math.max(widthMm, depthMm);
  return {
    plan: cushionPlan(spec, labelMm, options.stepMm),
    front: cushionFront(spec),
    section: cushionSection(spec),
  };
}

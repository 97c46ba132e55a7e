import { type Point2, wearHatch, type WearArea, wearMark, wearRectangle } from '@settlewright/geometry';
import type { CushionPlan, PlanPlace } from './plan-place';
import { PEN, type Sheet } from './sheet';
import type { TakenSpace, WordPlace } from './taken-space';

const HATCH_MM = 2.4;
const HATCH_GREY = 120;
/** Half of what a number takes across. */
const HALF_MM = 4;

interface Figure {
  sheet: Sheet;
  plan: Pick<CushionPlan, 'outline' | 'wear'>;
  place: PlanPlace;
  at: (point: Point2) => Point2;
}

/** Slanting lines over every area that is to look used. */
export function hatchWorn({ sheet, plan, place, at }: Figure): void {
  for (const area of plan.wear) {
    for (const [from, to] of wearHatch(plan, area, HATCH_MM / place.factor)) {
      const [[x1, y1], [x2, y2]] = [at(from), at(to)];
      sheet.line(x1, y1, x2, y2, { pen: PEN.hair, grey: HATCH_GREY });
    }
  }
}

/** The number of each area within it, as its fact names it. */
export function numberWorn({ sheet, plan, at }: Figure, taken: TakenSpace): void {
  plan.wear.forEach((area, i) => {
    taken.write(sheet, wearMark(i), placesIn(plan, area, at), { weight: 600, align: 'center' });
  });
}

/** At a level between the buttons first, then wherever there is room, at last beside the area. */
function placesIn(plan: Figure['plan'], area: WearArea, at: Figure['at']): WordPlace[] {
  const { x0, x1, y0, y1 } = wearRectangle(plan, area);
  const [left, top] = at([x0, y1]);
  const [right, foot] = at([x1, y0]);
  const level = (top + foot) / 2 + 1.2;
  const xs = steps(left + HALF_MM, right - HALF_MM);
  const ys = [level, ...steps(top + 4, foot - 1)];
  return [
    ...ys.flatMap((y) => xs.map((x) => ({ x, y }))),
    { x: right + HALF_MM, y: level },
    { x: left - HALF_MM, y: level },
  ];
}

/** From one end to the other, both included; the middle where there is no room between them. */
function steps(from: number, to: number): number[] {
  if (to <= from) return [(from + to) / 2];
  const count = Math.min(12, Math.ceil((to - from) / 2));
  return Array.from({ length: count + 1 }, (_, i) => from + ((to - from) * i) / count);
}

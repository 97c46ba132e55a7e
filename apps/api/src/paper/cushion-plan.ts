import {
  MOST_CHAINED_CORNERS,
  offsetFault,
  offsetOutline,
  outlineBox,
  type OutlineCorner,
  outlinePoints,
  outlineStretches,
  type Point2,
} from '@settlewright/geometry';
import { drawClothWay } from './cloth-way';
import { drawChains, type PlanChains } from './cushion-chains';
import { type CushionPlan, onPaper, type PlanPlace } from './plan-place';
import { PEN, type Sheet } from './sheet';
import { TakenSpace, type WordPlace } from './taken-space';
import { hatchWorn, numberWorn } from './worn-areas';

const BUTTON_MM = 1.35;
const SAG_MM = 0.5;

/** What drawing a plan needs to know of the paper it stands on. */
interface Figure {
  sheet: Sheet;
  plan: CushionPlan;
  place: PlanPlace;
  at: (point: Point2) => Point2;
  taken: TakenSpace;
}

/** A cushion from above by its real outline, back edge up, with seams, closure, buttons, words and chains. */
export function drawCushionPlan(sheet: Sheet, plan: CushionPlan, place: PlanPlace, chains: PlanChains): void {
  const figure: Figure = { sheet, plan, place, at: onPaper(plan, place), taken: new TakenSpace() };
  hatchWorn(figure);
  drawBoardLines(figure);
  drawOutline(figure);
  drawWall(figure, chains);
  keepNotchesClear(figure);
  drawClosure(figure);
  for (const spot of plan.buttons) drawButton(figure, figure.at(spot));
  numberWorn(figure, figure.taken);
  nameEdges(figure);
  drawClothWay(sheet, plan.cloth, boxOnPaper(figure), figure.taken);
  nameRadii(figure);
  drawChains(sheet, plan, place, chains);
}

function boxOnPaper({ plan, at }: Figure) {
  const { x0, x1, y0, y1 } = outlineBox(plan.outline);
  const [left, top] = at([x0, y1]);
  const [right, bottom] = at([x1, y0]);
  return { x: left, y: top, width: right - left, height: bottom - top };
}

function drawOutline({ sheet, plan, place, at }: Figure): void {
  const path = (corners: readonly OutlineCorner[]) => outlinePoints(corners, SAG_MM).map(at);
  sheet.path(path(plan.outline), { pen: PEN.edge, closed: true });
  const inner = offsetOutline(plan.outline, -0.9 / place.factor);
  if (!offsetFault(plan.outline, inner)) sheet.path(path(inner), { pen: PEN.hair, closed: true });
}

/** No words stand on the lines of a notch. */
function keepNotchesClear({ plan, at, taken }: Figure): void {
  for (const stretch of outlineStretches(plan.outline)) {
    if (stretch.kind === 'arc' || stretch.edge !== 'notch') continue;
    const [[x1, y1], [x2, y2]] = [at(stretch.from), at(stretch.to)];
    taken.take({
      x: Math.min(x1, x2) - 0.4,
      y: Math.min(y1, y2) - 0.4,
      width: Math.abs(x2 - x1) + 0.8,
      height: Math.abs(y2 - y1) + 0.8,
    });
  }
}

function drawBoardLines(figure: Figure): void {
  const { sheet, plan, at } = figure;
  const box = boxOnPaper(figure);
  for (const line of plan.boardLinesMm) {
    const [x] = at([plan.datum === 'left' ? line : plan.widthMm - line, 0]);
    // What was drawn freely may be smaller than its place.
    if (x < box.x || x > box.x + box.width) continue;
    sheet.line(x, box.y - 1.8, x, box.y + box.height + 1.8, { pen: PEN.hair, dash: [1.3, 0.9], grey: 110 });
  }
}

function drawButton({ sheet, taken }: Figure, [x, y]: Point2): void {
  sheet.circle(x, y, BUTTON_MM, { pen: 0.28, fill: 255 });
  for (const [dx, dy] of [
    [1, 1],
    [-1, 1],
    [1, -1],
    [-1, -1],
  ] as const) {
    sheet.line(x + dx * 1.4, y + dy * 1, x + dx * 2.6, y + dy * 1.7, { pen: PEN.hair });
  }
  taken.take({ x: x - 2.6, y: y - 1.8, width: 5.2, height: 3.6 });
}

/** A heavy line along the closure and round both ends, each end ticked and, where there is room, named. */
function drawClosure(figure: Figure): void {
  const { sheet, plan, at, taken } = figure;
  if (!plan.closure) return;
  const { path, wrapMm } = plan.closure;
  const points = path.map(at);
  sheet.path(points, { pen: PEN.cut });
  if (wrapMm === 0) return;
  const box = boxOnPaper(figure);
  for (const [end, next] of [points.slice(0, 2), points.slice(-2).reverse()]) {
    if (!end || !next) continue;
    const length = Math.hypot(next[0] - end[0], next[1] - end[1]) || 1;
    const across = [(-(next[1] - end[1]) / length) * 1.6, ((next[0] - end[0]) / length) * 1.6] as const;
    sheet.line(end[0] - across[0], end[1] - across[1], end[0] + across[0], end[1] + across[1], {
      pen: PEN.edge,
    });
    if (length < 7 || box.width < 60) continue;
    const inwards = end[0] < box.x + box.width / 2 ? 1 : -1;
    // Beyond what stands upright along the end.
    taken.write(sheet, 'ends here', [
      { x: end[0] + inwards * 7, y: end[1] + 1.1, align: inwards > 0 ? 'left' : 'right' },
    ]);
  }
}

function drawWall({ sheet, plan, place, at }: Figure, chains: PlanChains): void {
  if (!plan.wall) return;
  const { y0, y1 } = outlineBox(plan.outline);
  const right = plan.wall.side === 'right';
  const [x] = at([right ? plan.widthMm + plan.wall.gapMm : -plan.wall.gapMm, 0]);
  const top = place.y - chains.space.above + 4;
  const foot = place.y + (y1 - y0) * place.factor + 2.5;
  sheet.line(x, top, x, foot, { pen: 0.5 });
  sheet.hatchBeside(x, top, foot, right ? 1 : -1);
  const room = foot - place.y - 4;
  if (sheet.textWidth(plan.wall.name) > room) return;
  sheet.text(plan.wall.name, x + (right ? 4.6 : -3.4), place.y + room / 2, { angleDeg: 90, align: 'center' });
}

/** Words about an edge stay so far off the lines of the outline, mm. */
const CLEAR_MM = 1.5;

/** Middles for words of a width between two lines: in the middle, else as far off it as they allow. */
function middles([low, high]: readonly [number, number], width: number, off: readonly number[]): number[] {
  const middle = (low + high) / 2;
  const slack = (high - low - width) / 2 - CLEAR_MM;
  return slack < 0 ? [] : off.filter((by) => Math.abs(by) <= slack).map((by) => middle + by);
}

/** What each edge is called, beside it on the inside; the longest words that find room. */
function nameEdges(figure: Figure): void {
  const { sheet, plan, taken } = figure;
  const box = boxOnPaper(figure);
  const across = crossings(figure, 'x', box.x + box.width / 2);
  const along = crossings(figure, 'y', box.y + box.height / 2);
  if (across && across[1] - across[0] >= 14) {
    for (const [edge, y] of [
      ['back', across[0] + 4.4],
      ['front', across[1] - 2],
    ] as const) {
      const room = crossings(figure, 'y', y - 1.2);
      const whole = plan.closure?.edge === edge ? `${plan.edges[edge]} · ${plan.closure.words}` : '';
      for (const words of [whole, plan.edges[edge]]) {
        if (words === '' || !room) continue;
        const off = [0, -0.1, 0.1, -0.2, 0.2].map((share) => share * box.width);
        const places = middles(room, sheet.textWidth(words), off).map((x): WordPlace => ({ x, y }));
        if (taken.write(sheet, words, places, { align: 'center' })) break;
      }
    }
  }
  if (!along) return;
  // The sitter's left is at the right of the page.
  for (const [whole, hand, x] of [
    [plan.edges.left, 'sitter’s right', along[0] + 4],
    [plan.edges.right, 'sitter’s left', along[1] - 1.8],
  ] as const) {
    const room = crossings(figure, 'x', x - 1.2);
    if (!room) continue;
    for (const words of [whole, hand]) {
      const places = middles(room, sheet.textWidth(words), [0, 3, -3, 6, -6]).map((y) => ({ x, y }));
      if (taken.write(sheet, words, places, { angleDeg: 90, align: 'center' })) break;
    }
  }
}

/** Where a line through the middle of the page first enters and last leaves the outline. */
function crossings({ plan, at }: Figure, axis: 'x' | 'y', value: number): [number, number] | undefined {
  const [n, other] = axis === 'x' ? ([0, 1] as const) : ([1, 0] as const);
  const points = outlinePoints(plan.outline, SAG_MM).map(at);
  const met = points.flatMap((a, i) => {
    const b = points[(i + 1) % points.length]!;
    if (a[n] > value === b[n] > value) return [];
    return [a[other] + ((value - a[n]) / (b[n] - a[n])) * (b[other] - a[other])];
  });
  return met.length < 2 ? undefined : [Math.min(...met), Math.max(...met)];
}

/** Radii of round corners, each inside its corner; all of them stand in the template's table too. */
function nameRadii({ sheet, plan, place, at, taken }: Figure): void {
  if (plan.outline.length > MOST_CHAINED_CORNERS) return;
  const box = outlineBox(plan.outline);
  const middle = at([(box.x0 + box.x1) / 2, (box.y0 + box.y1) / 2]);
  for (const { at: corner, radiusMm } of plan.outline) {
    if (radiusMm < 0.5) continue;
    const [x, y] = at(corner);
    const [dx, dy] = [Math.sign(middle[0] - x) || 1, Math.sign(middle[1] - y) || 1];
    const places = [6, 9, 12, 16, 20].map((off) => ({
      x: x + dx * (off - 1),
      y: y + dy * off * 0.8 + 1.15,
      align: dx > 0 ? ('left' as const) : ('right' as const),
    }));
    taken.write(sheet, `R ${place.format(radiusMm)}`, places, { weight: 600 });
  }
}

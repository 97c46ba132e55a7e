import { drawChains, spaceAbove } from './cushion-chains';
import { PEN, type Sheet } from './sheet';
import type { CushionPlan, PlanPlace } from './plan-place';

export function drawCushionPlan(sheet: Sheet, plan: CushionPlan, place: PlanPlace): void {
  const width = plan.widthMm * place.factor;
  const depth = plan.depthMm * place.factor;
  const { x, y } = place;
  const across = (mm: number) =>
    plan.datum === 'left' ? x + mm * place.factor : x + width - mm * place.factor;
  drawBoardLines(sheet, plan, { across, y, depth });
  sheet.rect(x, y, width, depth, { pen: PEN.edge });
  sheet.rect(x + 0.9, y + 0.9, width - 1.8, depth - 1.8, { pen: PEN.hair });
  drawWall(sheet, plan, { x, y, width, depth, place });
  drawClosure(sheet, plan, { x, y, width, depth, factor: place.factor });
  for (const column of plan.columnsMm) {
    for (const row of plan.rowsMm) drawButton(sheet, across(column), y + row * place.factor);
  }
  nameEdges(sheet, plan, { x, y, width, depth, factor: place.factor });
  drawChains(sheet, plan, place, { width, depth });
}

function drawBoardLines(
  sheet: Sheet,
  plan: CushionPlan,
  at: { across: (mm: number) => number; y: number; depth: number },
): void {
  for (const line of plan.boardLinesMm) {
    sheet.line(at.across(line), at.y - 1.8, at.across(line), at.y + at.depth + 1.8, {
      pen: PEN.hair,
      dash: [1.3, 0.9],
      grey: 110,
    });
  }
}

function drawButton(sheet: Sheet, x: number, y: number): void {
  sheet.circle(x, y, 1.35, { pen: 0.28, fill: 255 });
  for (const [dx, dy] of [
    [1, 1],
    [-1, 1],
    [1, -1],
    [-1, -1],
  ] as const) {
    sheet.line(x + dx * 1.4, y + dy * 1, x + dx * 2.6, y + dy * 1.7, { pen: PEN.hair });
  }
}

function drawClosure(
  sheet: Sheet,
  plan: CushionPlan,
  at: { x: number; y: number; width: number; depth: number; factor: number },
): void {
  const { x, width } = at;
  const { closure } = plan;
  // Closures in the ends are said in words alone.
  if (!closure || closure.edge === 'left' || closure.edge === 'right') return;
  const inwards = closure.edge === 'back' ? 1 : -1;
  const edge = closure.edge === 'back' ? at.y : at.y + at.depth;
  const end = edge + inwards * closure.wrapMm * at.factor;
  sheet.line(x, edge, x + width, edge, { pen: PEN.cut });
  for (const side of [x, x + width]) {
    sheet.line(side, edge, side, end, { pen: PEN.cut });
    sheet.line(side - 1.6, end, side + 1.6, end, { pen: PEN.edge });
  }
  if (Math.abs(end - edge) > 7 && width > 60) {
    sheet.flag('ends here', x + 3, end + 1.1);
    sheet.flag('ends here', x + width - 3, end + 1.1, { align: 'right' });
  }
}

function drawWall(
  sheet: Sheet,
  plan: CushionPlan,
  at: { x: number; y: number; width: number; depth: number; place: PlanPlace },
): void {
  if (!plan.wall) return;
  const { x, y, width, depth, place } = at;
  const right = plan.wall.side === 'right';
  const gap = plan.wall.gapMm * place.factor;
  const wallX = right ? x + width + gap : x - gap;
  const top = y - spaceAbove(sheet, plan, place) + 4;
  sheet.line(wallX, top, wallX, y + depth + 2.5, { pen: 0.5 });
  sheet.hatchBeside(wallX, top, y + depth + 2.5, right ? 1 : -1);
  uprightWords(sheet, plan.wall.name, wallX + (right ? 4.6 : -3.4), y, depth);
}

/** Words that read along an upright edge, only where the edge is long enough to carry them. */
function uprightWords(sheet: Sheet, words: string, x: number, y: number, room: number): void {
  const length = sheet.textWidth(words);
  if (length > room - 2) return;
  sheet.text(words, x, y + room / 2, { angleDeg: 90, align: 'center' });
}

function nameEdges(
  sheet: Sheet,
  plan: CushionPlan,
  at: { x: number; y: number; width: number; depth: number; factor: number },
): void {
  const { x, y, width, depth, factor } = at;
  const middle = x + width / 2;
  const room = width - 12;
  const words = (edge: 'back' | 'front') =>
    firstThatFits(
      sheet,
      [plan.closure?.edge === edge ? `${plan.edges[edge]} · ${plan.closure.words}` : '', plan.edges[edge]],
      room,
    );
  if (depth >= 14) {
    const back = words('back');
    if (back) sheet.flag(back, middle, y + 4.4, { align: 'center' });
    const front = words('front');
    if (front) sheet.flag(front, middle, y + depth - 2, { align: 'center' });
  }
  const wrap = (plan.closure?.wrapMm ?? 0) * factor + 3;
  const [above, below] = plan.closure?.edge === 'back' ? [Math.max(6, wrap), 3] : [3, Math.max(6, wrap)];
  flagUpright(sheet, plan.edges.left, x + 4, y + above, depth - above - below);
  flagUpright(sheet, plan.edges.right, x + width - 1.8, y + above, depth - above - below);
}

function flagUpright(sheet: Sheet, words: string, x: number, y: number, room: number): void {
  if (sheet.textWidth(words) > room) return;
  sheet.flag(words, x, y + room / 2, { angleDeg: 90, align: 'center' });
}

function firstThatFits(sheet: Sheet, candidates: readonly string[], room: number): string | undefined {
  return candidates.find((words) => words !== '' && sheet.textWidth(words) <= room);
}

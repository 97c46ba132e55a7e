import { type Chain, chainDepth, drawChain } from './dimension-chain';
import { chainSide, type CushionPlan, PLAN_SPACE, type PlanPlace } from './plan-place';
import { PEN, type Sheet } from './sheet';

const FIRST_CHAIN_MM = 4.6;
const WALL_CHAIN_MM = 6.6;

/** Paper that the chains above the cushion need. */
export function spaceAbove(sheet: Sheet, plan: CushionPlan, place: PlanPlace): number {
  if (plan.columnsMm.length === 0) return 4;
  return FIRST_CHAIN_MM + chainDepth(sheet, columnChain(plan, place)) + (plan.wall ? WALL_CHAIN_MM + 3 : 1);
}

const bareOf = (format: PlanPlace['format']) => (mm: number) => format(mm).replace(/[″\s]|mm/g, '');

function columnChain(plan: CushionPlan, { x, y, factor, format, stepMm }: PlanPlace): Chain {
  const fromLeft =
    plan.datum === 'left' ? plan.columnsMm : [...plan.columnsMm].map((c) => plan.widthMm - c).reverse();
  const stops = [0, ...fromLeft, plan.widthMm];
  return {
    stops: stops.map((mm) => x + mm * factor),
    labels: spaces(stops, stepMm).map(bareOf(format)),
    at: y - FIRST_CHAIN_MM,
    direction: 'level',
    outwards: -1,
  };
}

export function drawChains(
  sheet: Sheet,
  plan: CushionPlan,
  place: PlanPlace,
  size: { width: number; depth: number },
): void {
  const { x, y, format } = place;
  if (plan.columnsMm.length > 0) {
    const columns = columnChain(plan, place);
    drawChain(sheet, columns);
    drawWallChain(sheet, plan, place, columns.at - chainDepth(sheet, columns) - WALL_CHAIN_MM + 2);
  }
  const foot = y + size.depth + 6;
  drawChain(sheet, {
    stops: [x, x + size.width],
    labels: [`${format(plan.widthMm)} finished, seam to seam`],
    at: foot,
    direction: 'level',
    outwards: 1,
  });
  drawGap(sheet, plan, place, foot);
  drawUprightChains(sheet, plan, place, size);
}

function drawGap(sheet: Sheet, plan: CushionPlan, { x, factor, format }: PlanPlace, foot: number): void {
  if (!plan.wall || plan.wall.gapMm <= 0) return;
  const right = plan.wall.side === 'right';
  const edge = right ? x + plan.widthMm * factor : x;
  const wallX = edge + (right ? 1 : -1) * plan.wall.gapMm * factor;
  sheet.line(edge, foot, wallX, foot, { pen: PEN.hair });
  sheet.line(wallX, foot - 1.3, wallX, foot + 1.3, { pen: PEN.hair });
  sheet.text(`${format(plan.wall.gapMm)} gap`, wallX + (right ? 1 : -1), foot + 1.15, {
    align: right ? 'left' : 'right',
  });
}

function drawUprightChains(
  sheet: Sheet,
  plan: CushionPlan,
  { x, y, factor, format, stepMm }: PlanPlace,
  size: { width: number; depth: number },
): void {
  const bare = bareOf(format);
  const outwards = chainSide(plan) === 'left' ? -1 : 1;
  const edge = outwards === -1 ? x : x + size.width;
  const whole = plan.rowsMm.length > 0 ? bare(plan.depthMm) : format(plan.depthMm);
  const rowStops = [0, ...plan.rowsMm, plan.depthMm];
  const rows: Chain = {
    stops: rowStops.map((mm) => y + mm * factor),
    labels: spaces(rowStops, stepMm).map(bare),
    at: edge + outwards * 6.2,
    direction: 'upright',
    outwards,
  };
  const beyond =
    plan.rowsMm.length > 0 ? chainDepth(sheet, rows) + sheet.textWidth(whole, { weight: 600 }) / 2 + 2 : 0;
  if (plan.rowsMm.length > 0) drawChain(sheet, rows);
  drawChain(sheet, {
    stops: [y, y + size.depth],
    labels: [whole],
    at: rows.at + outwards * beyond,
    direction: 'upright',
    outwards,
  });
}

/** The quiet line: where the columns stand from the wall, for who sets out along it. */
function drawWallChain(sheet: Sheet, plan: CushionPlan, { x, factor, format }: PlanPlace, at: number): void {
  if (!plan.wall) return;
  const bare = bareOf(format);
  const width = plan.widthMm * factor;
  const right = plan.wall.side === 'right';
  const wallX = right ? x + width + plan.wall.gapMm * factor : x - plan.wall.gapMm * factor;
  const onPaper = plan.wall.columnsMm.map((mm) => ({ mm, at: wallX + (right ? -1 : 1) * mm * factor }));
  const farthest = onPaper.at(-1);
  if (!farthest) return;
  sheet.line(wallX, at, farthest.at, at, { pen: PEN.hair });
  let lastEnd = wallX;
  for (const { mm, at: tick } of onPaper) {
    sheet.line(tick, at - 1, tick, at + 1, { pen: PEN.hair });
    const half = sheet.textWidth(bare(mm)) / 2 + 0.5;
    const clear = right ? tick + half < lastEnd : tick - half > lastEnd;
    if (!clear) continue;
    sheet.text(bare(mm), tick, at - 1.7, { align: 'center' });
    lastEnd = right ? tick - half : tick + half;
  }
  const words = 'from the wall';
  const beyond = right ? farthest.at - 2.2 : farthest.at + 2.2;
  const room = (right ? farthest.at - x : x + width - farthest.at) + PLAN_SPACE.chains;
  if (sheet.textWidth(words) + 3 < room)
    sheet.text(words, beyond, at + 1.15, { align: right ? 'right' : 'left' });
}

/** What lies between neighbouring stops, as whole steps. */
export function spaces(stops: readonly number[], stepMm: number): number[] {
  const rounded = stops.map((stop) => Math.round(stop / stepMm) * stepMm);
  return rounded.slice(1).map((stop, index) => stop - (rounded[index] ?? 0));
}

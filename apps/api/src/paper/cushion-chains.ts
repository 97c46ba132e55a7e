import { outlineBox, outlineStops, spacesBetween } from '@settlewright/geometry';
import { type Chain, chainDepth, chainWidth, drawChain } from './dimension-chain';
import { chainSide, type CushionPlan, type PlanPlace } from './plan-place';
import { PEN, type Sheet } from './sheet';

const FIRST_LEVEL_MM = 4.6;
const FOOT_MM = 6;
const FIRST_UPRIGHT_MM = 6.2;
const BETWEEN_MM = 2.2;
const WALL_CHAIN_MM = 6.6;
/** Paper for a wall and its name. */
const WALL_MM = 17;

type Unplaced = Omit<Chain, 'at'>;

/** Every chain round a cushion where it stands on the paper. */
export interface PlanChains {
  above: Chain[];
  below: Chain[];
  upright: Chain[];
  /** Paper that chains, wall and words need on each side of the outline. */
  space: { above: number; below: number; left: number; right: number };
}

/** Lays the chains out from the outline outwards: its corners, then its buttons, then the whole. */
export function planChains(sheet: Sheet, plan: CushionPlan, place: PlanPlace): PlanChains {
  const { x, y, factor, format } = place;
  const box = outlineBox(plan.outline);
  const bare = bareOf(format);
  const level = (mm: number) => x + (mm - box.x0) * factor;
  const down = (mm: number) => y + (box.y1 - mm) * factor;
  const chain = (
    stops: readonly number[],
    on: (mm: number) => number,
    rest: Pick<Chain, 'direction' | 'outwards'> & { quiet?: boolean },
  ): Unplaced => ({
    stops: stops.map(on),
    labels: spacesBetween(
      stops.map((stop) => Math.abs(stop - (stops[0] ?? 0))),
      place.stepMm,
    ).map(bare),
    ...rest,
  });
  const corners = outlineStops(plan.outline);
  const columns = columnStops(plan);
  const rows =
    plan.rowsMm.length > 0 ? [box.y1, ...plan.rowsMm.map((row) => plan.depthMm - row), box.y0] : [];
  const side = chainSide(plan) === 'left' ? -1 : 1;
  const up = { direction: 'level', outwards: -1 } as const;
  const foot = { direction: 'level', outwards: 1 } as const;
  const upright = { direction: 'upright', outwards: side } as const;
  const given = (stops: readonly number[]) => stops.length > 0;
  const whole = {
    ...chain([box.x0, box.x1], level, foot),
    labels: [`${format(box.x1 - box.x0)} finished, seam to seam`],
  };
  const cornersDown = [...corners.upright].reverse();
  const aboveChains = [corners.above, columns].filter(given).map((stops) => chain(stops, level, up));
  const uprightChains = [cornersDown, rows].filter(given).map((stops) => chain(stops, down, upright));
  const unit = uprightChains.length > 0 ? bare : format;
  const depth = { ...chain([box.y1, box.y0], down, upright), labels: [unit(box.y1 - box.y0)] };
  const edge = side === -1 ? x : level(box.x1);
  const above = stacked(sheet, aboveChains, y, FIRST_LEVEL_MM);
  const below = stacked(
    sheet,
    [...(given(corners.below) ? [chain(corners.below, level, foot)] : []), whole],
    down(box.y0),
    FOOT_MM,
  );
  const uprights = stacked(sheet, [...uprightChains, depth], edge, FIRST_UPRIGHT_MM);
  const wallGap = (plan.wall?.gapMm ?? 0) * factor;
  const sides = [reach(sheet, uprights, edge), plan.wall ? WALL_MM + wallGap : 3] as const;
  return {
    above,
    below,
    upright: uprights,
    space: {
      above: Math.max(4, reach(sheet, above, y) + (plan.wall && given(columns) ? WALL_CHAIN_MM + 3 : 1)),
      below: reach(sheet, below, down(box.y0)) + 2,
      left: side === -1 ? sides[0] : sides[1],
      right: side === -1 ? sides[1] : sides[0],
    },
  };
}

/** Columns from seam to seam of the rectangle they are measured in, whatever stands out of it. */
function columnStops({ columnsMm, datum, widthMm }: CushionPlan): number[] {
  if (columnsMm.length === 0) return [];
  const onPage = columnsMm.map((mm) => (datum === 'left' ? mm : widthMm - mm));
  return [0, ...onPage.sort((a, b) => a - b), widthMm];
}

/** Gives each chain its line, outside of the one before. */
function stacked(sheet: Sheet, chains: readonly Unplaced[], edge: number, first: number): Chain[] {
  const placed: Chain[] = [];
  for (const chain of chains) {
    const before = placed.at(-1);
    const own = chain.direction === 'level' ? 1.8 : chainWidth(sheet, chain) / 2;
    const off = before
      ? Math.abs(before.at - edge) + chainDepth(sheet, before) + BETWEEN_MM + own
      : Math.max(first, chain.direction === 'level' ? 0 : own + 2.4);
    placed.push({ ...chain, at: edge + chain.outwards * off });
  }
  return placed;
}

function reach(sheet: Sheet, chains: readonly Chain[], edge: number): number {
  const last = chains.at(-1);
  return last ? Math.abs(last.at - edge) + chainDepth(sheet, last) + 0.8 : 0;
}

const bareOf = (format: PlanPlace['format']) => (mm: number) => format(mm).replace(/[″\s\u202f]|mm/g, '');

export function drawChains(sheet: Sheet, plan: CushionPlan, place: PlanPlace, chains: PlanChains): void {
  for (const chain of [...chains.above, ...chains.below, ...chains.upright]) drawChain(sheet, chain);
  const columns = chains.above.at(-1);
  if (columns && plan.columnsMm.length > 0) {
    drawWallChain(sheet, plan, place, columns.at - chainDepth(sheet, columns) - WALL_CHAIN_MM + 2);
  }
  drawGap(sheet, plan, place, chains.below.at(-1)?.at ?? place.y);
}

function drawGap(sheet: Sheet, plan: CushionPlan, { x, factor, format }: PlanPlace, foot: number): void {
  if (!plan.wall || plan.wall.gapMm <= 0) return;
  const { x0 } = outlineBox(plan.outline);
  const right = plan.wall.side === 'right';
  const edge = x + ((right ? plan.widthMm : 0) - x0) * factor;
  const wallX = edge + (right ? 1 : -1) * plan.wall.gapMm * factor;
  sheet.line(edge, foot, wallX, foot, { pen: PEN.hair });
  sheet.line(wallX, foot - 1.3, wallX, foot + 1.3, { pen: PEN.hair });
  sheet.text(`${format(plan.wall.gapMm)} gap`, wallX + (right ? 1 : -1), foot + 1.15, {
    align: right ? 'left' : 'right',
  });
}

/** The quiet line: where the columns stand from the wall, for who sets out along it. */
function drawWallChain(sheet: Sheet, plan: CushionPlan, { x, factor, format }: PlanPlace, at: number): void {
  if (!plan.wall) return;
  const { x0 } = outlineBox(plan.outline);
  const bare = bareOf(format);
  const right = plan.wall.side === 'right';
  const wallX = x + ((right ? plan.widthMm + plan.wall.gapMm : -plan.wall.gapMm) - x0) * factor;
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
  const off = sheet.textWidth(bare(farthest.mm)) / 2 + 1.2;
  const beyond = right ? farthest.at - off : farthest.at + off;
  const room = right ? farthest.at - x : x + (plan.widthMm - x0) * factor - farthest.at;
  const words = 'from the wall';
  if (sheet.textWidth(words) + 3 < room + 14)
    sheet.text(words, beyond, at + 1.15, { align: right ? 'right' : 'left' });
}

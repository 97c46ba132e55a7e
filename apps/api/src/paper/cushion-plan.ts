import { type Chain, chainDepth, drawChain } from './dimension-chain';
import { PEN, type Sheet } from './sheet';

/** A cushion laid flat, in real millimetres. Page left and right, since the paper is read that way. */
export interface CushionPlan {
  widthMm: number;
  depthMm: number;
  /** Distances of the button columns from the seam on the datum side, rising. */
  columnsMm: readonly number[];
  /** Distances of the button rows from the back seam, rising. */
  rowsMm: readonly number[];
  /** The side of the page the columns are measured from. */
  datum: 'left' | 'right';
  /** Board joints under the cushion, measured like the columns. */
  boardLinesMm: readonly number[];
  wall: { side: 'left' | 'right'; gapMm: number; columnsMm: readonly number[]; name: string } | null;
  zip: { edge: 'back' | 'front'; wrapMm: number; words: string };
  edges: { back: string; front: string; left: string; right: string };
}

export interface PlanPlace {
  /** Top left corner of the cushion on the paper. */
  x: number;
  y: number;
  /** Paper millimetres for a real one. */
  factor: number;
  format: (mm: number) => string;
  /** Shown lengths are multiples of this; stops are rounded before they are subtracted, so that sums close. */
  stepMm: number;
}

/** Paper that the upright chains, the wall and the lower chain need around the cushion itself. */
export const PLAN_SPACE = { chains: 20, wall: 17, bottom: 11 } as const;

const FIRST_CHAIN_MM = 4.6;
const WALL_CHAIN_MM = 6.6;

/** The side that the upright chains stand on: away from the wall. */
export function chainSide(plan: Pick<CushionPlan, 'wall'>): 'left' | 'right' {
  return plan.wall?.side === 'left' ? 'right' : 'left';
}

/** Paper that the chains above the cushion need. */
export function spaceAbove(sheet: Sheet, plan: CushionPlan, place: PlanPlace): number {
  if (plan.columnsMm.length === 0) return 4;
  return FIRST_CHAIN_MM + chainDepth(sheet, columnChain(plan, place)) + (plan.wall ? WALL_CHAIN_MM + 3 : 1);
}

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
  drawZip(sheet, plan, { x, y, width, depth, factor: place.factor });
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

function drawZip(
  sheet: Sheet,
  plan: CushionPlan,
  at: { x: number; y: number; width: number; depth: number; factor: number },
): void {
  const { x, width } = at;
  const inwards = plan.zip.edge === 'back' ? 1 : -1;
  const edge = plan.zip.edge === 'back' ? at.y : at.y + at.depth;
  const end = edge + inwards * plan.zip.wrapMm * at.factor;
  sheet.line(x, edge, x + width, edge, { pen: PEN.cut });
  for (const side of [x, x + width]) {
    sheet.line(side, edge, side, end, { pen: PEN.cut });
    sheet.line(side - 1.6, end, side + 1.6, end, { pen: PEN.edge });
  }
  if (Math.abs(end - edge) > 7 && width > 60) {
    sheet.flag('zip end', x + 3, end + 1.1);
    sheet.flag('zip end', x + width - 3, end + 1.1, { align: 'right' });
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
      [plan.zip.edge === edge ? `${plan.edges[edge]} · ${plan.zip.words}` : '', plan.edges[edge]],
      room,
    );
  if (depth >= 14) {
    const back = words('back');
    if (back) sheet.flag(back, middle, y + 4.4, { align: 'center' });
    const front = words('front');
    if (front) sheet.flag(front, middle, y + depth - 2, { align: 'center' });
  }
  const wrap = plan.zip.wrapMm * factor + 3;
  const [above, below] = plan.zip.edge === 'back' ? [Math.max(6, wrap), 3] : [3, Math.max(6, wrap)];
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

function drawChains(
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

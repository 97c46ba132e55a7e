import { drawChain } from './dimension-chain';
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
  zip: { lengthMm: number; wrapMm: number; words: string } | null;
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

/** Paper that the chains and the wall need around the cushion itself. */
export const PLAN_SPACE = { left: 20, right: 17, bottom: 11 } as const;

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
  drawZip(sheet, plan, { x, y, width, factor: place.factor });
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
  at: { x: number; y: number; width: number; factor: number },
): void {
  if (!plan.zip) return;
  const { x, y, width, factor } = at;
  const wrap = plan.zip.wrapMm * factor;
  const inset = wrap < 0 ? -wrap : 0;
  const heavy = { pen: PEN.cut };
  sheet.line(x + inset, y, x + width - inset, y, heavy);
  if (wrap > 0) {
    for (const side of [x, x + width]) {
      sheet.line(side, y, side, y + wrap, heavy);
      sheet.line(side - 1.6, y + wrap, side + 1.6, y + wrap, { pen: PEN.edge });
    }
    if (wrap > 7 && width > 60) {
      sheet.flag('zip end', x + 3, y + wrap + 1.1);
      sheet.flag('zip end', x + width - 3, y + wrap + 1.1, { align: 'right' });
    }
  } else {
    for (const end of [x + inset, x + width - inset])
      sheet.line(end, y - 1.6, end, y + 1.6, { pen: PEN.edge });
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
  sheet.line(wallX, y - 11, wallX, y + depth + 2.5, { pen: 0.5 });
  sheet.hatchBeside(wallX, y - 11, y + depth + 2.5, right ? 1 : -1);
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
  const back = firstThatFits(
    sheet,
    [plan.zip ? `${plan.edges.back} · ${plan.zip.words}` : '', plan.edges.back],
    room,
  );
  if (depth >= 14) {
    if (back) sheet.flag(back, middle, y + 4.4, { align: 'center' });
    const front = firstThatFits(sheet, [plan.edges.front], room);
    if (front) sheet.flag(front, middle, y + depth - 2, { align: 'center' });
  }
  const under = Math.max(6, (plan.zip?.wrapMm ?? 0) * factor + 3);
  flagUpright(sheet, plan.edges.left, x + 4, y + under, depth - under - 3);
  flagUpright(sheet, plan.edges.right, x + width - 1.8, y + under, depth - under - 3);
}

function flagUpright(sheet: Sheet, words: string, x: number, y: number, room: number): void {
  if (sheet.textWidth(words) > room) return;
  sheet.flag(words, x, y + room / 2, { angleDeg: 90, align: 'center' });
}

function firstThatFits(sheet: Sheet, candidates: readonly string[], room: number): string | undefined {
  return candidates.find((words) => words !== '' && sheet.textWidth(words) <= room);
}

function drawChains(
  sheet: Sheet,
  plan: CushionPlan,
  place: PlanPlace,
  size: { width: number; depth: number },
): void {
  const { x, y, factor, format } = place;
  const bare = (mm: number) => format(mm).replace(/[″\s]|mm/g, '');
  const fromLeft =
    plan.datum === 'left' ? plan.columnsMm : [...plan.columnsMm].map((c) => plan.widthMm - c).reverse();
  const stops = [0, ...fromLeft, plan.widthMm];
  if (plan.columnsMm.length > 0) {
    drawChain(sheet, {
      stops: stops.map((mm) => x + mm * factor),
      labels: spaces(stops, place.stepMm).map(bare),
      at: y - 4.6,
      direction: 'level',
      outwards: -1,
    });
    drawWallChain(sheet, plan, place, { ...size, bare });
  }
  const foot = y + size.depth + 6;
  drawChain(sheet, {
    stops: [x, x + size.width],
    labels: [`${format(plan.widthMm)} finished, seam to seam`],
    at: foot,
    direction: 'level',
    outwards: 1,
  });
  if (plan.wall && plan.wall.gapMm > 0) {
    const right = plan.wall.side === 'right';
    const edge = right ? x + size.width : x;
    const wallX = edge + (right ? 1 : -1) * plan.wall.gapMm * factor;
    sheet.line(edge, foot, wallX, foot, { pen: PEN.hair });
    sheet.line(wallX, foot - 1.3, wallX, foot + 1.3, { pen: PEN.hair });
    sheet.text(`${format(plan.wall.gapMm)} gap`, wallX + (right ? 1 : -1), foot + 1.15, {
      align: right ? 'left' : 'right',
    });
  }
  const rowStops = [0, ...plan.rowsMm, plan.depthMm];
  drawChain(sheet, {
    stops: [y, y + size.depth],
    labels: [format(plan.depthMm)],
    at: x - (plan.rowsMm.length > 0 ? 15.5 : 6.5),
    direction: 'upright',
    outwards: -1,
  });
  if (plan.rowsMm.length > 0) {
    drawChain(sheet, {
      stops: rowStops.map((mm) => y + mm * factor),
      labels: spaces(rowStops, place.stepMm).map(bare),
      at: x - 6.5,
      direction: 'upright',
      outwards: -1,
    });
  }
}

/** The quiet line: where the columns stand from the wall, for who sets out along it. */
function drawWallChain(
  sheet: Sheet,
  plan: CushionPlan,
  { x, y, factor }: PlanPlace,
  { width, bare }: { width: number; bare: (mm: number) => string },
): void {
  if (!plan.wall) return;
  const right = plan.wall.side === 'right';
  const wallX = right ? x + width + plan.wall.gapMm * factor : x - plan.wall.gapMm * factor;
  const at = y - 11.2;
  const onPaper = plan.wall.columnsMm.map((mm) => ({ mm, at: wallX + (right ? -1 : 1) * mm * factor }));
  const farthest = onPaper.at(-1);
  if (!farthest) return;
  sheet.line(wallX, at, farthest.at, at, { pen: PEN.hair });
  let lastEnd = right ? wallX : wallX;
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
  const room = right ? farthest.at - x + PLAN_SPACE.left : x + width + PLAN_SPACE.right - farthest.at;
  if (sheet.textWidth(words) + 3 < room)
    sheet.text(words, beyond, at + 1.15, { align: right ? 'right' : 'left' });
}

/** What lies between neighbouring stops, as whole steps. */
export function spaces(stops: readonly number[], stepMm: number): number[] {
  const rounded = stops.map((stop) => Math.round(stop / stepMm) * stepMm);
  return rounded.slice(1).map((stop, index) => stop - (rounded[index] ?? 0));
}

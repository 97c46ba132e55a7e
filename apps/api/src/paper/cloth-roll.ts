import {
  type ClothLayout,
  type ClothOrder,
  type ClothPanel,
  formatLength,
  type LengthStyle,
  type PlacedPanel,
} from '@settlewright/geometry';
import { PEN, type Point, type Sheet } from './sheet';
import { TakenSpace, wordsBox } from './taken-space';

/** A roll with the panels on it. */
export interface Roll {
  cloth: ClothOrder;
  panels: readonly ClothPanel[];
  layout: ClothLayout;
  units: LengthStyle;
}

/** Paper over and under a strip of the roll: words and the rule. */
const OVER_MM = 7;
const UNDER_MM = 6;
/** Two strips to a sheet, as large as that allows: narrow panels are still to be named. */
const MOST_WIDTH_MM = 58;
/** More strips than this are not read: the roll is drawn smaller. */
const MOST_STRIPS = 8;
/** Real millimetres for one of the paper. */
const SCALES = [10, 15, 20, 25, 30, 40, 50, 75, 100];

/** Where along a panel its name may stand. */
const SHARES = [0.5, 0.38, 0.62, 0.26, 0.74, 0.14, 0.86];

interface RollScale {
  ratio: number;
  /** Of the roll, real millimetres that one strip shows. */
  stripLengthMm: number;
}

function scaleOf({ cloth, layout }: Roll, widthMm: number): RollScale {
  const whole = layout.lengthMm + cloth.startMm;
  const ratio =
    SCALES.find((one) => cloth.widthMm / one <= MOST_WIDTH_MM && whole / one <= MOST_STRIPS * widthMm) ?? 200;
  return { ratio, stripLengthMm: ratio * widthMm };
}

/** How many strips a roll takes, how high each is on paper, and the lines of the legend. */
export function rollHeights(
  sheet: Sheet,
  roll: Roll,
  widthMm: number,
): { strips: number; stripMm: number; legendMm: string[] } {
  const { ratio, stripLengthMm } = scaleOf(roll, widthMm);
  const whole = roll.layout.lengthMm + roll.cloth.startMm;
  const legendMm = roll.layout.placed.flatMap((panel, n) =>
    labelOf(sheet, panel, n, ratio).isWhole ? [] : [`${n + 1} = ${panel.id}`],
  );
  return {
    strips: Math.max(1, Math.ceil(whole / stripLengthMm - 1e-6)),
    stripMm: roll.cloth.widthMm / ratio + OVER_MM + UNDER_MM,
    legendMm,
  };
}

/** What stands in a panel: its name where that finds room, else its number. */
function labelOf(
  sheet: Sheet,
  panel: PlacedPanel,
  n: number,
  ratio: number,
): { text: string; isWhole: boolean } {
  const [long, high] = [panel.lengthMm / ratio, panel.widthMm / ratio];
  const isWhole = sheet.textWidth(panel.id, { size: 9 }) + 8 < long && high > 4.2;
  return { text: isWhole ? panel.id : String(n + 1), isWhole };
}

/** One strip of the roll: its start at the left, its width up the page. */
export function drawRoll(
  sheet: Sheet,
  roll: Roll,
  n: number,
  at: { x: number; y: number; width: number },
): void {
  const { cloth, layout, units } = roll;
  const { ratio, stripLengthMm } = scaleOf(roll, at.width);
  const from = n * stripLengthMm;
  const whole = layout.lengthMm + cloth.startMm;
  const to = Math.min(whole, from + stripLengthMm);
  const top = at.y + OVER_MM;
  const high = cloth.widthMm / ratio;
  const x = (mm: number) => at.x + (Math.min(to, Math.max(from, mm)) - from) / ratio;
  const y = (mm: number) => top + high - (mm + cloth.selvedgeMm) / ratio;
  const show = (mm: number) => formatLength(mm, { ...units, feet: false });
  const start = n === 0 ? 'from the start of the roll' : `from ${show(from)}`;
  sheet.text(`${start} to ${show(to)}, 1 : ${ratio}`, at.x, top - 1.6);
  const taken = new TakenSpace();
  drawRepeats(sheet, roll, { from, to, x, top, high, y });
  layout.placed.forEach((panel, index) => {
    const [a, b] = [panel.yMm + cloth.startMm, panel.yMm + panel.lengthMm + cloth.startMm];
    if (b <= from || a >= to) return;
    const box = { x0: x(a), x1: x(b), y0: y(panel.xMm + panel.widthMm), y1: y(panel.xMm) };
    sheet.rect(box.x0, box.y0, box.x1 - box.x0, box.y1 - box.y0, { pen: PEN.fine, fill: 244 });
    drawControl(sheet, roll, panel, { x, y, from, to });
    if ((a + b) / 2 < from || (a + b) / 2 >= to) return;
    drawPanelWords(sheet, panel, labelOf(sheet, panel, index, ratio).text, box, taken);
  });
  // The roll itself last, so that its edges are whole; where a strip goes on there is no edge.
  sheet.line(at.x, top, x(to), top, { pen: PEN.edge });
  sheet.line(at.x, top + high, x(to), top + high, { pen: PEN.edge });
  if (n === 0) sheet.line(at.x, top, at.x, top + high, { pen: PEN.edge });
  if (to >= whole - 1e-6) sheet.line(x(to), top, x(to), top + high, { pen: PEN.edge, dash: [2, 1] });
  if (cloth.startMm > 0 && n === 0) drawLeftOut(sheet, { x0: at.x, x1: x(cloth.startMm), top, high });
  sheet.text(`width ${show(cloth.widthMm)}`, at.x, top + high + 3.8);
  sheet.path(
    [
      [at.x + 34, top + high + 2.6],
      [at.x + 48, top + high + 2.6],
    ],
    { pen: PEN.edge },
  );
  sheet.path(
    [
      [at.x + 50, top + high + 2.6],
      [at.x + 47.6, top + high + 1.9],
      [at.x + 47.6, top + high + 3.3],
    ],
    { pen: PEN.hair, fill: 0, closed: true },
  );
  sheet.text('up the roll', at.x + 52, top + high + 3.8);
}

interface StripOn {
  x: (mm: number) => number;
  y: (mm: number) => number;
  from: number;
  to: number;
}

function drawRepeats(sheet: Sheet, { cloth }: Roll, strip: StripOn & { top: number; high: number }): void {
  const { alongMm, acrossMm } = cloth.repeatMm;
  const style = { pen: PEN.hair, dash: [0.6, 1.2], grey: 120 };
  if (alongMm > 0) {
    for (let mm = cloth.startMm; mm < strip.to; mm += alongMm) {
      if (mm > strip.from) sheet.line(strip.x(mm), strip.top, strip.x(mm), strip.top + strip.high, style);
    }
  }
  if (acrossMm <= 0) return;
  for (let mm = 0; mm < cloth.widthMm - 2 * cloth.selvedgeMm; mm += acrossMm) {
    sheet.line(strip.x(strip.from), strip.y(mm), strip.x(strip.to), strip.y(mm), style);
  }
}

/** A cross where the pattern has to begin on a panel. */
function drawControl(sheet: Sheet, { panels, cloth }: Roll, placed: PlacedPanel, strip: StripOn): void {
  const control = panels.find(({ id }) => id === placed.id)?.controlMm;
  if (!control) return;
  const [across, along] = placed.railroaded
    ? [control.alongMm, control.acrossMm]
    : [control.acrossMm, control.alongMm];
  const mm = placed.yMm + along + cloth.startMm;
  if (mm < strip.from || mm > strip.to) return;
  const [x, y] = [strip.x(mm), strip.y(placed.xMm + across)];
  sheet.line(x - 1.6, y, x + 1.6, y, { pen: PEN.edge });
  sheet.line(x, y - 1.6, x, y + 1.6, { pen: PEN.edge });
}

/** A name or number in its panel: in the middle, or along it where neighbours are so narrow that theirs would touch. */
function drawPanelWords(
  sheet: Sheet,
  panel: PlacedPanel,
  text: string,
  box: { x0: number; x1: number; y0: number; y1: number },
  taken: TakenSpace,
): void {
  const [long, high] = [box.x1 - box.x0, box.y1 - box.y0];
  const size = Math.min(long, high) > 3.4 ? 9 : 7;
  const width = sheet.textWidth(text, { size });
  const style = { align: 'center' as const, size, ...(width + 1 >= long && { angleDeg: 90 }) };
  const down = size * 0.128;
  // Beside the arrow, where there is room for one.
  const aside = width + 8 < long ? 1.5 : 0;
  const places = SHARES.map((share): Point =>
    style.angleDeg
      ? [(box.x0 + box.x1) / 2 + down, box.y0 + share * high]
      : [box.x0 + share * long - aside, (box.y0 + box.y1) / 2 + down],
  );
  const place = places.find((at) => taken.isFree(wordsBox(sheet, text, ...at, style)));
  if (!place) return;
  taken.take(wordsBox(sheet, text, ...place, style));
  sheet.text(text, ...place, style);
  const [x, y] = style.angleDeg ? [place[0] - down, place[1]] : [place[0] + aside, place[1] - down];
  // The panel's own up.
  const tip: Point = panel.railroaded ? [x + width / 2 + 2, y - 1.6] : [x + width / 2 + 3.6, y];
  const [dx, dy] = panel.railroaded ? [0, -1] : [1, 0];
  if (tip[0] + 1 > box.x1 || box.y1 - box.y0 < 4.6) return;
  sheet.line(tip[0] - dx * 3, tip[1] - dy * 3, ...tip, { pen: PEN.fine });
  sheet.path(
    [
      tip,
      [tip[0] - dx * 1.2 + dy * 0.6, tip[1] - dy * 1.2 + dx * 0.6],
      [tip[0] - dx * 1.2 - dy * 0.6, tip[1] - dy * 1.2 - dx * 0.6],
    ],
    { pen: PEN.hair, fill: 0, closed: true },
  );
}

function drawLeftOut(
  sheet: Sheet,
  { x0, x1, top, high }: { x0: number; x1: number; top: number; high: number },
): void {
  for (let off = 2; off < high + (x1 - x0); off += 2.4) {
    const from: Point = [x0 + Math.max(0, off - high), top + Math.min(high, off)];
    const to: Point = [x0 + Math.min(x1 - x0, off), top + Math.max(0, off - (x1 - x0))];
    sheet.line(...from, ...to, { pen: PEN.hair, grey: 120 });
  }
  sheet.line(x1, top, x1, top + high, { pen: PEN.fine });
}

import {
  buyWords,
  chartNote,
  DIRECTION_WORDS,
  formatLength,
  type LengthStyle,
  marksWords,
  NAP_WORDS,
} from '@settlewright/geometry';
import { drawRoll, rollHeights } from './cloth-roll';
import { type OrderPage, type OrderPages, PAD } from './order-pages';
import { paragraph } from './paragraph';
import type { ClothOnPaper, SpecPack } from './spec-pack';

/** The panels of each cloth on its roll. */
export function drawClothSheets(pages: OrderPages, pack: SpecPack): void {
  for (const one of pack.cloths) drawCloth(pages, pack, one);
}

function drawCloth(pages: OrderPages, { units }: SpecPack, one: ClothOnPaper): void {
  const { cover, marks } = one.cloth;
  const topic = ['Cutting layout', cover.name];
  const start = () => pages.page(topic, `Cutting layout: ${cover.name}`, `for ${marksWords(marks)}`);
  let page = start();
  page.y = drawClothWords(page, one, units);
  const { laid } = one;
  if (!laid) return;
  const widthMm = page.frame.right - page.frame.left - 2 * PAD;
  const roll = {
    cloth: one.cloth.cloth,
    panels: one.cloth.panels,
    layout: laid.layout,
    units,
  };
  const { strips, stripMm, legendMm } = rollHeights(page.sheet, roll, widthMm);
  for (let n = 0; n < strips; n += 1) {
    if (page.y + stripMm > page.frame.bottom - 2) page = start();
    drawRoll(page.sheet, roll, n, { x: page.frame.left + PAD, y: page.y, width: widthMm });
    page.y += stripMm;
  }
  if (legendMm.length === 0) return;
  drawLegend(start, page, legendMm);
}

function drawLegend(start: () => OrderPage, first: OrderPage, lines: readonly string[]): void {
  let page = first;
  page.y += 2;
  const width = (page.frame.right - page.frame.left - 2 * PAD) / 4;
  const step = 4.2;
  let rest = [...lines];
  while (rest.length > 0) {
    const rows = Math.floor((page.frame.bottom - page.y - 3) / step);
    if (rows < 1) {
      page = start();
      continue;
    }
    const needed = Math.min(rows, Math.ceil(rest.length / 4));
    rest.slice(0, 4 * needed).forEach((line, i) => {
      const [column, row] = [Math.floor(i / needed), i % needed];
      page.sheet.text(line, page.frame.left + PAD + column * width, page.y + 3.6 + row * step);
    });
    rest = rest.slice(4 * needed);
    if (rest.length > 0) page = start();
  }
}

function drawClothWords({ sheet, frame, y }: OrderPage, one: ClothOnPaper, units: LengthStyle): number {
  const { cloth, laid } = one;
  const { cover } = cloth;
  const show = (mm: number) => formatLength(mm, { ...units, feet: false });
  const { acrossMm, alongMm } = cover.repeatMm;
  const repeat =
    acrossMm > 0 || alongMm > 0
      ? `repeat ${show(acrossMm)} across, ${show(alongMm)} along, control line the middle of each ${cover.controlLine}`
      : 'no repeat';
  const x = frame.left + PAD;
  const width = frame.right - frame.left - 2 * PAD;
  const { missing } = buyWords(cloth);
  const buy = laid
    ? `${missing ? 'Buy at least' : 'Buy'} ${clothLength(laid.buyMm, units)}. The layout takes ${clothLength(laid.layout.lengthMm, units)}` +
      `${cover.startMm > 0 ? ` and ${show(cover.startMm)} are left out at the start` : ''}; ` +
      `${Math.round(laid.waste * 100)}\u00a0% of what is bought ends in no panel. ` +
      (missing
        ? `NOT in it: ${missing}.`
        : laid.chartMm === undefined
          ? 'No chart speaks of this cloth.'
          : `By the chart ${clothLength(laid.chartMm, units)}.`)
    : `No layout: ${cloth.faults.join('; ') || 'nothing is cut from it'}.`;
  let at = paragraph(sheet, [{ text: buy, weight: 600 }], x, y + 5.2, width);
  const described = one.assumed
    ? `Nothing was said of this cloth: laid as plain, ${show(cloth.cloth.widthMm)} wide, either way up. Ask before buying or cutting.`
    : `${show(cloth.cloth.widthMm)} wide${cover.com?.measuredWidthMm === undefined ? '' : ' as measured'}, selvedge ${show(cover.selvedgeMm)} a side, ` +
      `laid ${DIRECTION_WORDS[cover.direction]}, ${NAP_WORDS[cover.nap]}, ${repeat}.`;
  at = paragraph(sheet, described, x, at, width);
  const note = laid && chartNote(cloth, laid, units);
  if (note) at = paragraph(sheet, [{ text: `Note: ${note}`, weight: 600 }], x, at, width);
  const own = ownClothWords(one, units);
  if (own) at = paragraph(sheet, own, x, at, width);
  return at;
}

/** What was seen of a cloth that the workshop sent in. */
function ownClothWords({ cloth, laid }: ClothOnPaper, units: LengthStyle): string | undefined {
  const { com } = cloth.cover;
  if (!com) return undefined;
  const spare = laid?.spareMm;
  return [
    'Customer’s own material',
    com.sampleKept ? 'sample kept' : 'no sample kept',
    com.dyeLot ? `dye lot ${com.dyeLot}` : 'dye lot not said',
    com.receivedMm === undefined ? 'not yet received' : `received ${clothLength(com.receivedMm, units)}`,
    spare === undefined
      ? ''
      : spare < 0
        ? `SHORT by ${clothLength(-spare, units)}`
        : `${clothLength(spare, units)} to spare${cloth.faults.length > 0 ? ' at most' : ''}`,
    com.flaws ? `flaws: ${com.flaws}` : 'no flaws written down',
  ]
    .filter(Boolean)
    .join('; ');
}

/** Cloth by the yard with inches beside it, or by the metre. */
export function clothLength(mm: number, units: LengthStyle): string {
  return units.system === 'millimetres'
    ? `${(mm / 1000).toFixed(2)}\u00a0m`
    : `${(mm / 914.4).toFixed(2)}\u00a0yd (${formatLength(mm, { ...units, feet: false })})`;
}

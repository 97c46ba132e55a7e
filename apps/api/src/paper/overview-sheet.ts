import {
  buyWords,
  formatLength,
  HANDEDNESS_WORDS,
  marksWords,
  orderAssumptions,
} from '@settlewright/geometry';
import { CHECK_BAR_MM, drawCheckBar } from './check-bar';
import { drawDrawing } from './drawing-on-paper';
import { type OrderPages, PAD } from './order-pages';
import { type Column, drawFacts, drawHead, drawRow, type Fact, factHeight, rowHeight } from './ruled-table';
import { PEN, type Sheet } from './sheet';
import type { SpecCushion, SpecPack } from './spec-pack';
import { clothLength } from './cloth-sheets';
import { boxOf } from './cushion-facts';
import { foamWords, massWords, runWords, sizeWords, volumeWords } from './spec-words';
import { type Frame, frameOf } from './title-block';

const FACTS_WIDTH_MM = 118;
const SIGN_MM = 14;
const BY_NUMBER = new Intl.Collator('en', { numeric: true }).compare;
/** Rows of cushions that share the first sheet with the drawings; longer lists get sheets of their own. */
const LIST_SHARE = 0.42;

/** The first sheet, and further ones where the list of cushions or the words of the order need them. */
export function drawOverview(pages: OrderPages, pack: SpecPack): void {
  const sheet = pages.add(topicOf(pack));
  const frame = frameOf(sheet);
  const columns = listColumns(frame.right - frame.left - 2 * PAD);
  const rows = pack.cushions.map((cushion) => listRow(cushion, pack));
  const listHeight = [columns.map(({ head }) => head), ...rows].reduce(
    (sum, cells) => sum + rowHeight(sheet, columns, cells),
    10,
  );
  const listHere = listHeight <= (frame.bottom - frame.top) * LIST_SHARE;
  const split = frame.right - FACTS_WIDTH_MM;
  const floor = listHere ? frame.bottom - listHeight : frame.bottom;
  sheet.line(split, frame.top, split, floor, { pen: PEN.fine });
  drawDrawings(sheet, pack, { ...frame, right: split, bottom: floor });
  const left = drawWords(sheet, pack, { ...frame, left: split, bottom: floor });
  if (listHere) {
    sheet.line(frame.left, floor, frame.right, floor, { pen: PEN.fine });
    drawList(sheet, columns, rows, { x: frame.left + PAD, y: floor + 1.4, floor: frame.bottom });
  } else drawListSheets(pages, topicOf(pack), columns, rows);
  drawSecondSheet(pages, pack, left);
}

function topicOf(pack: SpecPack): string[] {
  const marks = pack.labels.map(({ mark }) => mark);
  return [marksWords(marks), cushionCount(pack)];
}

/** The plan, and below it the benches from above and one side; both beside each other where the list leaves less height. */
function drawDrawings(sheet: Sheet, pack: SpecPack, frame: Frame): void {
  const x = frame.left + PAD;
  const width = frame.right - PAD - x;
  const height = frame.bottom - frame.top - 10;
  const beside = height < 120;
  const box = beside ? { width: width / 2 - 2, height: height - 12 } : { width, height: height / 2 - 10 };
  const picture = beside ? { x: x + width / 2 + 2, y: frame.top } : { x, y: frame.top + height / 2 };
  sheet.text('Plan', x, frame.top + 6.2, { size: 10.5, weight: 600 });
  const scale = drawDrawing(sheet, pack.plan, pack.units, { x, y: frame.top + 13, ...box });
  sheet.text(`${scale.words}. Sizes govern.`, x, frame.top + 10.6);
  const marks = [...new Set(pack.cushions.flatMap(({ benches }) => benches))].sort(BY_NUMBER);
  sheet.text(`${marksWords(marks)} from above and one side`, picture.x, picture.y + 6.2, { weight: 600 });
  drawDrawing(sheet, pack.picture, pack.units, { x: picture.x, y: picture.y + 13, ...box });
}

/** The facts of the order as far as they find room; returns those that do not. */
function drawWords(sheet: Sheet, pack: SpecPack, frame: Frame): Fact[] {
  const box = { x: frame.left + PAD, y: frame.top + 8.6, width: FACTS_WIDTH_MM - 2 * PAD, labelWidth: 24 };
  sheet.text(`Order ${pack.order.number}: ${cushionCount(pack)}`, box.x, frame.top + 6.2, {
    size: 10.5,
    weight: 600,
  });
  const facts = orderFacts(pack);
  const room = frame.bottom - SIGN_MM - box.y;
  let used = 0;
  const fitting = facts.findIndex((fact) => {
    used += factHeight(sheet, fact, box);
    return used > room;
  });
  const here = fitting === -1 ? facts : facts.slice(0, fitting);
  const foot = drawFacts(sheet, here, box);
  if (here.length < facts.length) {
    sheet.text('More of the order stands on the next sheet.', box.x, foot + 4.4);
  }
  const sign = frame.bottom - 6.4;
  sheet.line(box.x, sign, box.x + box.width - 32, sign);
  sheet.line(box.x + box.width - 26, sign, box.x + box.width, sign);
  sheet.text('Agreed by', box.x, sign + 4.2);
  sheet.text('Date', box.x + box.width - 26, sign + 4.2);
  return facts.slice(here.length);
}

/** What found no room on the first sheet, beside a section with the bar that checks the print. */
function drawSecondSheet(pages: OrderPages, pack: SpecPack, facts: readonly Fact[]): void {
  const topic = topicOf(pack);
  const page = pages.page(topic, 'The order, continued');
  const { left, right, bottom } = page.frame;
  const half = (right - left) / 2;
  const split = left + half;
  page.sheet.line(split, page.y, split, bottom, { pen: PEN.fine });
  drawSection(page.sheet, pack, {
    x: split + PAD,
    y: page.y,
    width: half - 2 * PAD,
    height: bottom - page.y,
  });
  let rest = drawFitting(page.sheet, facts, { x: left + PAD, y: page.y, width: half - 2 * PAD }, bottom - 4);
  while (rest.length > 0) {
    const { sheet, frame, y } = pages.page(topic, 'Words of the order, continued');
    for (const x of [frame.left + PAD, frame.left + half + PAD]) {
      rest = drawFitting(sheet, rest, { x, y, width: half - 2 * PAD }, frame.bottom - 4);
    }
  }
}

/** Draws the facts that find room above the floor, one at least; returns the others. */
function drawFitting(
  sheet: Sheet,
  facts: readonly Fact[],
  at: { x: number; y: number; width: number },
  floor: number,
): readonly Fact[] {
  const box = { ...at, labelWidth: 24 };
  let used = 0;
  const over = facts.findIndex((fact) => (used += factHeight(sheet, fact, box)) > floor - at.y);
  const count = over === -1 ? facts.length : Math.max(1, over);
  drawFacts(sheet, facts.slice(0, count), box);
  return facts.slice(count);
}

function drawSection(
  sheet: Sheet,
  pack: SpecPack,
  box: { x: number; y: number; width: number; height: number },
): void {
  const bar = box.y + 12;
  drawCheckBar(sheet, box.x + (box.width - CHECK_BAR_MM) / 2, bar);
  const section = pack.sections[0];
  if (!section) return;
  const room = { x: box.x, y: bar + 14, width: box.width, height: box.height - 30 };
  const cut = drawDrawing(sheet, section.drawing, pack.units, room);
  sheet.text(`Section through ${marksWords(section.benches)}, ${cut.words}`, box.x, bar + 10, {
    weight: 600,
  });
}

function cushionCount(pack: SpecPack): string {
  const count = pack.labels.length;
  return count === 1 ? 'one cushion' : `${count} cushions`;
}

function orderFacts(pack: SpecPack): Fact[] {
  const { words, units, model, cushions } = pack;
  const { totals } = model;
  const bold = (text: string) => [{ text, weight: 600 as const }];
  const show = (mm: number) => formatLength(mm, { ...units, feet: false });
  const foams = totals.foam.map(
    ({ foam, thicknessMm, marks, massKg, volumeM3 }) =>
      `${marksWords(marks)}: ${foamWords(foam, thicknessMm, units)}, ${show(thicknessMm)} thick, ` +
      `${volumeWords(volumeM3, units)}, ${massWords(massKg, units)}`,
  );
  const zips = totals.zips.map(({ lengthMm, count }) => `${count} × ${show(lengthMm)}`).join(', ');
  const cloths = pack.cloths.map(({ cloth, laid, assumed }) =>
    laid
      ? `${cloth.cover.name}: ${buyWords(cloth).buy} ${clothLength(laid.buyMm, units)}${assumed ? ', as assumed' : ''}`
      : `${cloth.cover.name}: no layout`,
  );
  const takes = [
    totals.weltMm > 0 ? `welt and cord ${runWords(totals.weltMm, units)}` : '',
    zips ? `zips ${zips}` : '',
    totals.hookAndLoopMm > 0 ? `hook-and-loop ${runWords(totals.hookAndLoopMm, units)}` : '',
    totals.buttons > 0 ? `${totals.buttons} buttons` : '',
    totals.threadMm > 0 ? `thread about ${threadWords(totals.threadMm, units)}` : '',
  ].filter(Boolean);
  const notes = cushions.flatMap(({ marks, row }) =>
    row.spec.notes ? [`${marksWords(marks)}: ${row.spec.notes}`] : [],
  );
  const flammability = words.flammability
    ? `Required, with evidence as recorded: ${words.flammability.replace(/[.\s]+$/, '')}. Recorded here, not certified.`
    : 'No requirement recorded. Nothing here is certified.';
  const assumptions = [
    `Finished sizes within ± ${show(pack.toleranceMm)}.`,
    ...orderAssumptions(model, units),
    'Fit one cushion before cutting the rest.',
  ];
  const rows: [string, string][] = [
    ['NOT as asked', model.faults.map(({ mark, text }) => (mark ? `${mark}: ${text}` : text)).join('; ')],
    ['Revision', pack.revision.note],
    [`Since ${pack.since?.letter}`, pack.since?.changes ?? ''],
    ['Flammability', flammability],
    ['Cover', [...cloths, words.cover].filter(Boolean).join('; ')],
    ['Wear, ageing, notes', [words.notes, ...notes].filter(Boolean).join(' ')],
  ];
  const further: [string, string][] = [
    ['Foam', [...foams, words.foam].filter(Boolean).join('; ')],
    ['Takes', takes.join('; ')],
    ['Closure', words.closure],
    ['Welt', words.welt],
    ['Buttons', words.buttons],
    ['Fixing', words.fixing],
  ];
  const said = (list: readonly [string, string][]) =>
    list.filter(([, text]) => text !== '').map(([label, text]) => ({ label, value: bold(text) }));
  return [
    ...said(rows),
    { label: 'Assumptions', value: assumptions.join(' ') },
    ...said(further),
    {
      label: 'Caution',
      value:
        'Guidance for making, not certification. Local rules on fire and labels are the maker’s and the venue’s to settle.',
    },
  ];
}

/** Thread by the whole yard or metre: the rule behind it is no finer. */
const threadWords = (mm: number, { system }: SpecPack['units']): string =>
  system === 'millimetres' ? `${Math.ceil(mm / 1000)}\u00a0m` : `${Math.ceil(mm / 914.4)}\u00a0yd`;

function listColumns(width: number): Column[] {
  const shares: [string, number][] = [
    ['Marks', 30],
    ['On', 22],
    ['Kind, hand', 30],
    ['FINISHED, seam to seam', 44],
    ['Foam', 40],
    ['Made', 58],
    ['Closure', 19],
    ['Welt', 20],
  ];
  const whole = shares.reduce((sum, [, share]) => sum + share, 0);
  return shares.map(([head, share]) => ({ head, widthMm: (share / whole) * width }));
}

function listRow(cushion: SpecCushion, { units }: SpecPack): string[] {
  const made = cushion.faults.length === 0;
  const lengthOrNone = (mm: number) => {
    if (mm > 0) return formatLength(mm, { ...units, feet: false });
    return made ? 'none' : 'not known';
  };
  return [
    cushion.marks.length > 1
      ? `${marksWords(cushion.marks)}: make ${cushion.marks.length}`
      : marksWords(cushion.marks),
    marksWords([...new Set(cushion.benches)]),
    cushion.hand === 'either' ? cushion.kind : `${cushion.kind}, ${HANDEDNESS_WORDS[cushion.hand]}`,
    sizeWords(boxOf(cushion), units),
    cushion.row.sawnMm ? sizeWords(cushion.row.sawnMm, units) : 'not known',
    made ? cushion.make : `NOT as asked: ${cushion.faults.join('; ')}`,
    lengthOrNone(cushion.closure.edgeMm + 2 * cushion.closure.wrapMm),
    lengthOrNone(cushion.weltMm),
  ];
}

function drawList(
  sheet: Sheet,
  columns: readonly Column[],
  rows: readonly string[][],
  at: { x: number; y: number; floor: number },
): readonly string[][] {
  let y = drawHead(sheet, columns, at);
  for (const [index, row] of rows.entries()) {
    if (y + rowHeight(sheet, columns, row) > at.floor - 1) return rows.slice(index);
    y = drawRow(sheet, columns, row, { x: at.x, y }, { weight: 600 });
  }
  return [];
}

function drawListSheets(
  pages: OrderPages,
  topic: readonly string[],
  columns: readonly Column[],
  rows: readonly string[][],
): void {
  let rest = rows;
  while (rest.length > 0) {
    const { sheet, frame, y } = pages.page(topic, 'All cushions');
    rest = drawList(sheet, columns, rest, { x: frame.left + PAD, y, floor: frame.bottom });
  }
}

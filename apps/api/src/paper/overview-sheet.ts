import { formatLength } from '@settlewright/geometry';
import { CHECK_BAR_MM, drawCheckBar } from './check-bar';
import { drawDrawing } from './drawing-on-paper';
import type { Pack } from './pack';
import { type Column, drawFacts, drawHead, drawRow, type Fact, factHeight, rowHeight } from './ruled-table';
import { PEN, type Sheet } from './sheet';
import type { SpecCushion, SpecPack } from './spec-pack';
import { foamWords, isMetric, marksWords, massWords, runWords, sizeWords, volumeWords } from './spec-words';
import { type Frame, frameOf } from './title-block';

const PAD = 4;
const FACTS_WIDTH_MM = 98;
const SIGN_MM = 14;
/** Rows of cushions that share the first sheet with the drawings; longer lists get sheets of their own. */
const LIST_SHARE = 0.28;

/** The first sheet, and further ones where the list of cushions or the words of the order need them. */
export function drawOverview(pdf: Pack, pack: SpecPack): void {
  const sheet = pdf.addSheet();
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
  } else drawListSheets(pdf, columns, rows);
  drawMoreWords(pdf, left);
}

function drawDrawings(sheet: Sheet, pack: SpecPack, frame: Frame): void {
  const x = frame.left + PAD;
  const width = frame.right - PAD - x;
  const height = frame.bottom - frame.top;
  const section = pack.sections[0];
  sheet.text('Plan of the set, cushions marked', x, frame.top + 6.2, { size: 10.5, weight: 600 });
  const planHeight = section ? (height - 22) * 0.6 : height - 26;
  const scale = drawDrawing(sheet, pack.plan, pack.units, { x, y: frame.top + 9, width, height: planHeight });
  sheet.text(`Scale ${scale.words}. Sizes govern.`, frame.right - PAD, frame.top + 6.2, { align: 'right' });
  if (section) {
    const top = frame.top + 9 + planHeight + 3;
    sheet.line(x, top, x + width, top, { pen: PEN.fine });
    const room = { x, y: top + 7, width: width - CHECK_BAR_MM - 6, height: frame.bottom - top - 10 };
    const cut = drawDrawing(sheet, section.drawing, pack.units, room);
    sheet.text(`Section through ${section.bench}, ${cut.words}`, x, top + 5.2, { weight: 600 });
    drawCheckBar(sheet, frame.right - PAD - CHECK_BAR_MM, top + 10);
  } else drawCheckBar(sheet, x, frame.bottom - 5);
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
    sheet.text('More words of the order stand on a sheet of their own.', box.x, foot + 4.4);
  }
  const sign = frame.bottom - 6.4;
  sheet.line(box.x, sign, box.x + box.width - 32, sign);
  sheet.line(box.x + box.width - 26, sign, box.x + box.width, sign);
  sheet.text('Agreed by', box.x, sign + 4.2);
  sheet.text('Date', box.x + box.width - 26, sign + 4.2);
  return facts.slice(here.length);
}

function drawMoreWords(pdf: Pack, facts: readonly Fact[]): void {
  let rest = [...facts];
  while (rest.length > 0) {
    const sheet = pdf.addSheet();
    const frame = frameOf(sheet);
    const width = (frame.right - frame.left) / 2 - 2 * PAD;
    sheet.text('Words of the order, continued', frame.left + PAD, frame.top + 6.2, {
      size: 10.5,
      weight: 600,
    });
    for (const x of [frame.left + PAD, frame.left + width + 3 * PAD]) {
      const box = { x, y: frame.top + 8.6, width, labelWidth: 24 };
      let used = 0;
      const over = rest.findIndex(
        (fact) => (used += factHeight(sheet, fact, box)) > frame.bottom - box.y - 4,
      );
      const here = rest.slice(0, over === -1 ? rest.length : Math.max(1, over));
      drawFacts(sheet, here, box);
      rest = rest.slice(here.length);
    }
  }
}

function cushionCount(pack: SpecPack): string {
  const count = pack.cushions.reduce((sum, { marks }) => sum + marks.length, 0);
  return count === 1 ? 'one cushion' : `${count} cushions`;
}

function orderFacts(pack: SpecPack): Fact[] {
  const { words, units, cushions } = pack;
  const bold = (text: string) => [{ text, weight: 600 as const }];
  const total = (of: (cushion: SpecCushion) => number) =>
    cushions.reduce((sum, cushion) => sum + of(cushion) * cushion.marks.length, 0);
  const totals =
    `${cushionCount(pack)}; foam ${volumeWords(
      total((c) => c.foamVolumeM3),
      units,
    )}, ` +
    `${massWords(
      total((c) => c.foamMassKg),
      units,
    )}; welt ${runWords(
      total((c) => c.weltMm),
      units,
    )}`;
  const foams = [...new Set(cushions.map((cushion) => `${cushion.kind}: ${foamWords(cushion, units)}`))];
  const written: [string, string][] = [
    ['Cover', words.cover],
    ['Closure', words.closure],
    ['Welt', words.welt],
    ['Buttons', words.buttons],
    ['Fixing', words.fixing],
  ];
  const tolerance = isMetric(units) ? '6 mm' : '¼″';
  const flammability = words.flammability
    ? `Required: ${words.flammability.replace(/[.\s]+$/, '')}. Recorded here, not certified.`
    : 'No requirement recorded. Nothing here is certified.';
  return [
    { label: 'Totals', value: bold(totals) },
    { label: 'Foam', value: bold([...foams, words.foam].filter(Boolean).join('; ')) },
    ...written.filter(([, text]) => text !== '').map(([label, text]) => ({ label, value: bold(text) })),
    { label: 'Flammability', value: bold(flammability) },
    ...(pack.revision.note ? [{ label: 'Revision', value: bold(pack.revision.note) }] : []),
    {
      label: 'As given',
      value: `Sizes are finished, seam to seam, flat, before the foam swells them; ± ${tolerance}. New foam on a flat rigid deck. Fit one cushion before cutting the rest.`,
    },
    {
      label: 'Caution',
      value:
        'Guidance for making, not certification. Local rules on fire and labels are the maker’s and the venue’s to settle.',
    },
    ...(words.notes ? [{ label: 'Notes', value: bold(words.notes) }] : []),
  ];
}

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
  const show = (mm: number) => formatLength(mm, { ...units, feet: false });
  return [
    cushion.marks.length > 1
      ? `${marksWords(cushion.marks)}: make ${cushion.marks.length}`
      : marksWords(cushion.marks),
    marksWords([...new Set(cushion.benches)]),
    cushion.hand === 'either' ? cushion.kind : `${cushion.kind}, ${cushion.hand} hand`,
    sizeWords(cushion.finished, units),
    sizeWords(cushion.foam, units),
    cushion.faults.length > 0 ? `NOT as asked: ${cushion.faults.join('; ')}` : cushion.make,
    show(cushion.closure.edgeMm + 2 * cushion.closure.wrapMm),
    show(cushion.weltMm),
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

function drawListSheets(pdf: Pack, columns: readonly Column[], rows: readonly string[][]): void {
  let rest = rows;
  while (rest.length > 0) {
    const sheet = pdf.addSheet();
    const frame = frameOf(sheet);
    sheet.text('All cushions', frame.left + PAD, frame.top + 6.2, { size: 10.5, weight: 600 });
    rest = drawList(sheet, columns, rest, { x: frame.left + PAD, y: frame.top + 8, floor: frame.bottom });
  }
}

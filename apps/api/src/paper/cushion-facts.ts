import {
  allWearPhrase,
  curveWords,
  cushionWarningWords,
  formatLength,
  HANDEDNESS_WORDS,
  HOLD_DOWN_WORDS,
  lengthStep,
  marksWords,
  outlineExtent,
  panelCountWords,
  phraseText,
  thicknessWords,
  TUFTING_WORDS,
} from '@settlewright/geometry';
import { type OrderPages, PAD } from './order-pages';
import { paragraph } from './paragraph';
import { drawFacts, type Fact, factHeight } from './ruled-table';
import { leading, type Sheet } from './sheet';
import type { Size, SpecCushion, SpecPack } from './spec-pack';
import {
  bareLength,
  foamWords,
  massWords,
  otherSystemWords,
  pairWords,
  runWords,
  sizeWords,
  volumeWords,
} from './spec-words';
import type { Frame } from './title-block';

export const FACTS_WIDTH_MM = 98;
const LABEL_MM = 19.5;
const SIGN_MM = 17;

/** The right side of a cushion's sheet: the finished size large, all that follows from it, signature. */
export function drawFactsColumn(
  pages: OrderPages,
  { sheet, topic }: { sheet: Sheet; topic: readonly string[] },
  pack: SpecPack,
  cushion: SpecCushion,
  frame: Frame,
): void {
  const { units } = pack;
  const x = frame.left + PAD;
  const width = frame.right - PAD - x;
  sheet.text('FINISHED, seam to seam', x, frame.top + 5.6);
  drawHeroSize(sheet, cushion, pack, x, frame.top + 14.6);
  const tolerance = `± ${formatLength(pack.toleranceMm, { ...units, feet: false })}`;
  const lead = `${otherSystemWords(boxOf(cushion), units)}, ${tolerance}${cushion.row.needsTemplate ? ', the box round the outline' : ''}. ${thicknessWords(cushion.row.spec, units)}`;
  const y = paragraph(sheet, lead, x, frame.top + 20.6, width) - leading(9) + 2.2;
  const facts = factsOf(cushion, pack);
  const box = { x, y, width, labelWidth: LABEL_MM };
  const room = frame.bottom - SIGN_MM - 4 - y;
  const here = fitting(sheet, facts, box, room);
  const foot = drawFacts(sheet, facts.slice(0, here), box);
  if (here < facts.length) sheet.text('More of this cushion stands on the next sheet.', x, foot + 4);
  const sign = frame.bottom - 8;
  sheet.text('Fit one cushion before cutting the rest.', x, sign - 6.6);
  sheet.line(x, sign, x + width - 32, sign);
  sheet.line(x + width - 26, sign, x + width, sign);
  sheet.text('Agreed by', x, sign + 4.2);
  sheet.text('Date', x + width - 26, sign + 4.2);
  if (here < facts.length) drawRest(pages, topic, facts.slice(here));
}

/** How many facts find room. */
function fitting(
  sheet: Sheet,
  facts: readonly Fact[],
  box: { width: number; labelWidth: number },
  room: number,
): number {
  let used = 0;
  const over = facts.findIndex((fact) => (used += factHeight(sheet, fact, box)) > room);
  return over === -1 ? facts.length : over;
}

function drawRest(pages: OrderPages, topic: readonly string[], facts: readonly Fact[]): void {
  let rest = facts;
  while (rest.length > 0) {
    const page = pages.page(topic, `${topic[0] ?? ''}, continued`);
    const { left, right, bottom } = page.frame;
    const box = { x: left + PAD, y: page.y, width: right - left - 2 * PAD, labelWidth: 24 };
    const here = Math.max(1, fitting(page.sheet, rest, box, bottom - page.y - 2));
    drawFacts(page.sheet, rest.slice(0, here), box);
    rest = rest.slice(here);
  }
}

/** Size of the box round the outline. */
export const boxOf = ({ row: { spec } }: SpecCushion): Size => ({
  ...outlineExtent(spec.outline),
  thicknessMm: spec.finishedMm.thicknessMm,
});

function drawHeroSize(sheet: Sheet, cushion: SpecCushion, { units }: SpecPack, x: number, y: number): void {
  const { widthMm, depthMm, thicknessMm } = boxOf(cushion);
  const numbers = [
    bareLength(widthMm, units),
    bareLength(depthMm, units),
    formatLength(thicknessMm, { ...units, feet: false }),
  ];
  const width = (size: number) =>
    numbers.reduce((sum, number) => sum + sheet.textWidth(number, { size, weight: 300 }), 14);
  const size = [22, 20, 18, 16, 14].find((one) => width(one) <= FACTS_WIDTH_MM - 2 * PAD) ?? 12;
  let at = x;
  numbers.forEach((number, index) => {
    if (index > 0) sheet.text('×', at + 2.2, y, { size: 12, weight: 300 });
    if (index > 0) at += 7;
    sheet.text(number, at, y, { size, weight: 300 });
    at += sheet.textWidth(number, { size, weight: 300 });
  });
}

function factsOf(cushion: SpecCushion, pack: SpecPack): Fact[] {
  const { units, words } = pack;
  const { panels, board, closure, row } = cushion;
  const { spec } = row;
  const show = (mm: number) => formatLength(mm, { ...units, feet: false });
  const { count } = spec.buttons;
  const camera = spec.cameraSides.map((edge) => EDGE_NAMES[cushion.kind][edge]);
  const on = cushion.benches.map((bench, i) => `${cushion.marks[i]} for ${bench}`);
  const made = `${on.slice(0, 6).join(', ')}${on.length > 6 ? ' …' : ''}`;
  const facts: [string, string][] = [
    ['Make', `${cushion.marks.length}, ${HANDEDNESS_WORDS[cushion.hand]}: ${made}${mirrorWords(cushion)}`],
    ['Edges', cushion.meets],
    [
      'Foam',
      [
        row.sawnMm && `${sizeWords(row.sawnMm, units)}, `,
        foamWords(spec.foam, spec.finishedMm.thicknessMm, units),
        row.foam && `; ${volumeWords(row.foam.volumeM3, units)}, ${massWords(row.foam.massKg, units)} each`,
      ]
        .filter(Boolean)
        .join(''),
    ],
    ['Made', cushion.faults.length > 0 ? `NOT as asked: ${cushion.faults.join('; ')}` : cushion.make],
    [
      'Cut',
      panels
        .map(
          ({ name, count, widthMm, heightMm }) =>
            `${panelCountWords(count, name)} ${pairWords(widthMm, heightMm, units)}`,
        )
        .join('; '),
    ],
    ['Welt', weltWords(cushion, units)],
    [
      'Closure',
      closure.edgeMm > 0
        ? `${closure.word} ${closureWords(cushion, units)} of ${show(cushion.perimeterMm)} round`
        : closure.word,
    ],
    [
      'Buttons',
      count > 0
        ? `${count}, ${TUFTING_WORDS[spec.tufting.kind]}${words.buttons ? `, ${brief(words.buttons)}` : ''}; table on the button sheet`
        : 'none',
    ],
    [
      'Board',
      board
        ? `${pairWords(board.widthMm, board.depthMm, units)}, ${show(board.thicknessMm)} plywood, beyond the finished thickness`
        : '',
    ],
    ['Curve', cushion.curve ? curveWords(cushion.curve, units) : ''],
    ['Cover', coverWords(row.covers, words.cover && brief(words.cover))],
    ['Camera', camera.length > 0 ? `sees the ${camera.join(', ')}` : ''],
    [
      'Hold-down',
      [spec.holdDown && HOLD_DOWN_WORDS[spec.holdDown], words.fixing && brief(words.fixing)]
        .filter(Boolean)
        .join('; '),
    ],
    ['Template', row.needsTemplate ? 'at full size in this pack' : ''],
    ['Look at', spec.warnings.map((warning) => cushionWarningWords(warning, units)).join(' ')],
    ['Wear', phraseText(allWearPhrase(spec.wear ?? [], cushion.kind), units)],
    ['Notes', spec.notes ?? ''],
  ];
  return facts
    .filter(([, value]) => value !== '')
    .map(([label, value]) => ({ label, value: [{ text: value, weight: 600 }] }));
}

function weltWords({ weltMm, faults }: SpecCushion, units: SpecPack['units']): string {
  if (weltMm > 0) return `seams and joins: ${runWords(weltMm, units)}`;
  return faults.length === 0 ? 'none' : '';
}

/** Names of the cloths and what was written of them, the same thing once. */
export function coverWords(names: readonly string[], written: string): string {
  return [...names.filter((name) => !written.startsWith(name)), written].filter(Boolean).join('; ');
}

const EDGE_NAMES = {
  seat: { back: 'back edge', front: 'front edge', left: 'sitter’s left end', right: 'sitter’s right end' },
  back: { back: 'top edge', front: 'bottom edge', left: 'sitter’s left end', right: 'sitter’s right end' },
} as const;

function mirrorWords({ mirrorMarks }: SpecCushion): string {
  if (mirrorMarks.length === 0) return '';
  return `; ${marksWords(mirrorMarks)} ${mirrorMarks.length === 1 ? 'is' : 'are'} the mirror image`;
}

/** Long words stand once, on the first sheet. */
function brief(words: string): string {
  return words.length <= 90 ? words : 'see sheet 1';
}

/** The closure as a sum of rounded parts, so that it closes. */
export function closureWords({ closure }: SpecCushion, units: SpecPack['units']): string {
  const step = lengthStep(units);
  const round = (mm: number) => Math.round(mm / step) * step;
  const whole = round(closure.edgeMm) + 2 * round(closure.wrapMm);
  const shown = formatLength(whole, { ...units, feet: false });
  if (closure.wrapMm === 0) return shown;
  const wrap = bareLength(closure.wrapMm, units);
  return `${shown} = ${wrap} + ${bareLength(closure.edgeMm, units)} + ${wrap}`;
}

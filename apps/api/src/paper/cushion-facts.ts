import { curveWords, formatLength, lengthStep } from '@settlewright/geometry';
import { drawButtonTable } from './button-table';
import { paragraph } from './paragraph';
import { drawFacts, type Fact } from './ruled-table';
import { leading, type Sheet } from './sheet';
import type { SpecCushion, SpecPack } from './spec-pack';
import {
  bareLength,
  foamWords,
  handWords,
  marksWords,
  massWords,
  otherSystemWords,
  pairWords,
  runWords,
  sizeWords,
  volumeWords,
} from './spec-words';
import type { Frame } from './title-block';

export const FACTS_WIDTH_MM = 98;
export const PAD = 4;

/** The right side of a cushion's sheet: the finished size large, all that follows from it, buttons, signature. */
export function drawFactsColumn(sheet: Sheet, pack: SpecPack, cushion: SpecCushion, frame: Frame): void {
  const { units } = pack;
  const x = frame.left + PAD;
  const width = frame.right - PAD - x;
  sheet.text('FINISHED, seam to seam', x, frame.top + 5.6);
  drawHeroSize(sheet, cushion, pack, x, frame.top + 14.6);
  const tolerance = units.system === 'millimetres' ? '± 6 mm' : '± ¼″';
  const lead = `${otherSystemWords(cushion.finished, units)}, ${tolerance}. Thickness is the boxing between seams.`;
  let y = paragraph(sheet, lead, x, frame.top + 20.6, width) - leading(9) + 2.2;
  y = drawFacts(sheet, factsOf(cushion, pack), { x, y, width, labelWidth: 17 });
  const floor = frame.bottom - 13;
  y = drawButtonTable(sheet, cushion, pack, { x, y: y + 2.4, width, floor: floor - 14 });
  const taken = 'Taken as given: new foam on a flat board. Fit one cushion before cutting the rest.';
  paragraph(sheet, taken, x, Math.min(y + 4.6, floor - 8), width);
  const sign = frame.bottom - 8;
  sheet.line(x, sign, x + width - 32, sign);
  sheet.line(x + width - 26, sign, x + width, sign);
  sheet.text('Agreed by', x, sign + 4.2);
  sheet.text('Date', x + width - 26, sign + 4.2);
}

function drawHeroSize(sheet: Sheet, cushion: SpecCushion, { units }: SpecPack, x: number, y: number): void {
  const { widthMm, depthMm, thicknessMm } = cushion.finished;
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
  const { panels, board, closure } = cushion;
  const show = (mm: number) => formatLength(mm, { ...units, feet: false });
  const count = cushion.buttons.columnsMm.length * cushion.buttons.rowsMm.length;
  const on = cushion.benches.map((bench, i) => `${cushion.marks[i]} for ${bench}`);
  const made = `${on.slice(0, 6).join(', ')}${on.length > 6 ? ' …' : ''}`;
  const facts: [string, string][] = [
    ['Make', `${cushion.marks.length}, ${handWords(cushion.hand)}: ${made}${mirrorWords(cushion)}`],
    ['Edges', cushion.meets],
    [
      'Foam',
      `${sizeWords(cushion.foam, units)}, ${foamWords(cushion, units)}; ` +
        `${volumeWords(cushion.foamVolumeM3, units)}, ${massWords(cushion.foamMassKg, units)} each`,
    ],
    ['Made', cushion.faults.length > 0 ? `NOT as asked: ${cushion.faults.join('; ')}` : cushion.make],
    [
      'Cut',
      panels
        .map(
          ({ name, count, widthMm, heightMm }) => `${count} ${name} ${pairWords(widthMm, heightMm, units)}`,
        )
        .join('; '),
    ],
    ['Welt', cushion.weltMm > 0 ? `seams and joins: ${runWords(cushion.weltMm, units)}` : 'none'],
    [
      'Closure',
      closure.edgeMm > 0
        ? `${closure.word} ${closureWords(cushion, units)} of ${show(cushion.perimeterMm)} round`
        : closure.word,
    ],
    ['Buttons', count > 0 ? `${count}${words.buttons ? `, ${brief(words.buttons)}` : ''}` : 'none'],
    ['Board', board ? pairWords(board.widthMm, board.depthMm, units) : ''],
    ['Curve', cushion.curve ? curveWords(cushion.curve, units) : ''],
    ['Cover', words.cover && brief(words.cover)],
    ['Fixing', words.fixing && brief(words.fixing)],
  ];
  return facts
    .filter(([, value]) => value !== '')
    .map(([label, value]) => ({ label, value: [{ text: value, weight: 600 }] }));
}

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

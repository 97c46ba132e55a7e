import { type NextMeasureKey, type RuleBook, TAPE_MEASURE_KEYS } from '@settlewright/anthropometry';
import { formatLength, formatMass, type LengthStyle } from '@settlewright/geometry';
import { Pack, type Paper } from '../../../paper/pack';
import { linesNeeded, paragraph } from '../../../paper/paragraph';
import { leading, PEN, type Sheet } from '../../../paper/sheet';
import { drawFrame, frameOf, type TitleCell } from '../../../paper/title-block';
import type { PersonNextDto } from '../dto/measure-next.dto';
import type { CastMember } from '../../entities/cast-member.entity';
import { BOX_HEIGHT_MM, drawMeasureBox, type MeasureBox } from './measure-box';

interface PersonToMeasure {
  person: CastMember;
  /** Absent for somebody who sits in no set. */
  next: PersonNextDto | undefined;
  /** Places of this person that were not looked at for want of time. */
  placesLeftOut: number;
}

export interface MeasuringSheetInput {
  people: readonly PersonToMeasure[];
  ruleBook: RuleBook;
  style: LengthStyle;
  paper: Paper;
  timeZone: string;
  workshop: string;
  productionName: string;
  at: Date;
}

const PAD_MM = 4;
const GAP_MM = 2.4;
const COLUMNS = 3;
const HOW =
  'Barefoot, in light clothes, pockets empty. Sit upright on a hard, level seat, right back against a board, thighs ' +
  'level, knees at a right angle, feet flat on the floor or a block. Hold the tape straight, pull nothing tight, take ' +
  'each twice and write the mean. In shoes or on a cushion the numbers are of no use.';
const PRIVACY =
  'This sheet is personal data. Ask first, measure where others do not look on, show it to nobody who does not need ' +
  'it, and destroy it once the numbers are entered.';
/** Largest first; a name too long for two lines of each takes as many of the smallest as it needs. */
const NAME_SIZES = [20, 15] as const;
const SMALLEST_NAME = 11;
const MOST_NAME_LINES = 2;
const ALL_KEYS: readonly NextMeasureKey[] = ['stature', 'weight_kg', ...TAPE_MEASURE_KEYS];

/** Sheets to write measures on: for each person what settles most first, then the others. */
export function measuringSheetPdf(input: MeasuringSheetInput): Buffer {
  const [only, ...others] = input.people;
  const about = only && others.length === 0 ? only.person.name : input.productionName;
  const pack = new Pack({
    paper: input.paper,
    title: `${about}: measuring sheet`,
    author: input.workshop,
    subject: 'Measuring sheet',
    issuedAt: input.at,
  });
  const owners: CastMember[] = [];
  for (const one of input.people) {
    const before = pack.sheetCount;
    drawPerson(pack, input, one);
    for (let n = before; n < pack.sheetCount; n += 1) owners.push(one.person);
  }
  pack.eachSheet((sheet, number, count) => {
    const person = owners[number - 1];
    if (person) drawFrame(sheet, titleCells(input, person, number, count));
  });
  return pack.bytes();
}

function drawPerson(pack: Pack, input: MeasuringSheetInput, measured: PersonToMeasure): void {
  const { person, next } = measured;
  let left = boxesOf(input, person, next);
  for (let first = true; left.length > 0; first = false) {
    const sheet = pack.addSheet();
    const frame = frameOf(sheet);
    const width = frame.right - frame.left - 2 * PAD_MM;
    const top = first ? drawHead(sheet, measured, frame.left + PAD_MM, frame.top, width) : frame.top + PAD_MM;
    const rows = Math.floor((frame.bottom - 1 - top + GAP_MM) / (BOX_HEIGHT_MM + GAP_MM));
    const boxWidth = (width - (COLUMNS - 1) * GAP_MM) / COLUMNS;
    left.slice(0, rows * COLUMNS).forEach((box, n) => {
      const column = n % COLUMNS;
      drawMeasureBox(sheet, box, {
        x: frame.left + PAD_MM + column * (boxWidth + GAP_MM),
        y: top + Math.floor(n / COLUMNS) * (BOX_HEIGHT_MM + GAP_MM),
        width: boxWidth,
      });
    });
    left = left.slice(rows * COLUMNS);
  }
}

/** Name, part and how to sit; returns y under it. */
function drawHead(
  sheet: Sheet,
  { person, placesLeftOut }: PersonToMeasure,
  x: number,
  top: number,
  width: number,
): number {
  const own = width * 0.32;
  const size =
    NAME_SIZES.find((one) => linesNeeded(sheet, person.name, own, { size: one }) <= MOST_NAME_LINES) ??
    SMALLEST_NAME;
  const style = { size, weight: 300 } as const;
  const afterName = paragraph(sheet, person.name, x, top + 2.4 + 0.38 * size, own, style);
  const role = afterName - leading(size) + 6;
  const afterRole = person.role === '' ? role : paragraph(sheet, person.role, x, role, own);
  const column = x + width * 0.34;
  const room = width * 0.66;
  let foot = paragraph(sheet, HOW, column, top + 5.4, room);
  foot = paragraph(sheet, PRIVACY, column, foot, room, { weight: 600 });
  if (placesLeftOut > 0) foot = paragraph(sheet, leftOutWords(placesLeftOut), column, foot, room);
  const y = Math.max(foot - leading(9), afterRole - leading(9)) + 2;
  sheet.line(x, y, x + width, y, { pen: PEN.hair });
  return y + 2.4;
}

/** The order of a sheet rests on every place that was looked at. */
const leftOutWords = (places: number): string =>
  `${places === 1 ? '1 place' : `${places} places`} of this person could not be looked at in time, so another ` +
  'measure may settle more. Print again for the rest.';

/** What to take first with the reason, then the rest in the order of the form. */
function boxesOf(
  { ruleBook, style }: MeasuringSheetInput,
  person: CastMember,
  next: PersonNextDto | undefined,
): MeasureBox[] {
  const first = next?.order ?? [];
  const keys = first.map(({ key }) => key);
  const before = (key: NextMeasureKey) => {
    const words = takenWords(person, key, style);
    return words === '' ? {} : { before: words };
  };
  return [
    ...first.map(({ key, ruleIds }, n): MeasureBox => {
      const checks = [...new Set(ruleIds.map((id) => ruleBook.rule(id).columnName.toLowerCase()))];
      const rank = n === 0 ? 'First' : 'Next';
      const what = new Intl.ListFormat('en').format(checks.slice(0, 2));
      const why = checks.length > 0 ? `${rank}: settles ${what}.` : `${rank}: of more use than the rest.`;
      return { key, why, ...before(key) };
    }),
    ...ALL_KEYS.filter((key) => !keys.includes(key)).map((key): MeasureBox => ({ key, ...before(key) })),
  ];
}

/** "Taken before: 394 mm." */
function takenWords(person: CastMember, key: NextMeasureKey, style: LengthStyle): string {
  if (key === 'weight_kg') {
    return person.weightKg === null ? '' : `Known: ${formatMass(person.weightKg, style)}.`;
  }
  if (key === 'stature') {
    if (person.statureMm === null) return '';
    const how = person.statureSource === 'told' ? 'Told' : 'Taken before';
    return `${how}: ${formatLength(person.statureMm, { ...style, feet: true })}.`;
  }
  const taken = person.measured[key];
  return taken ? `Taken before: ${formatLength(taken.mm, style)}.` : '';
}

function titleCells(
  input: MeasuringSheetInput,
  person: CastMember,
  number: number,
  count: number,
): TitleCell[] {
  const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: input.timeZone }).format(
    input.at,
  );
  return [
    { label: 'Production', lines: [input.productionName] },
    { label: 'Measuring sheet of', lines: [person.name, ...(person.role ? [person.role] : [])], widthMm: 70 },
    { label: 'Workshop', lines: [input.workshop], widthMm: 54 },
    { label: 'Printed', lines: [day], widthMm: 36 },
    { label: 'Sheet', lines: [`${number} of ${count}`], widthMm: 22 },
  ];
}

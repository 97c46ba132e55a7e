import { drawChain } from './dimension-chain';
import { edgeKinds, edgeProfile, type EdgeProfile } from './edge-profiles';
import type { SectionWords } from './section-words';
import { PEN, type Point, type Sheet } from './sheet';
import type { SheetBox } from './taken-space';
import type { Construction } from '@settlewright/geometry';

const CROWN_MM = 6;

/** The cushion from the front, with its crown. */
export function drawCushionFront(
  sheet: Sheet,
  cushion: {
    construction: Construction;
    widthMm: number;
    thicknessMm: number;
    words: string;
    thicknessWords: string;
  },
  place: { x: number; y: number; factor: number },
): void {
  const { x, y, factor } = place;
  const width = cushion.widthMm * factor;
  const height = cushion.thicknessMm * factor;
  if (cushion.construction === 'knife-edge') drawLens(sheet, { x, y, width, height });
  else {
    const bulge = Math.min(0.6, height / 8);
    sheet.path(curve([x, y], [x + width / 2, y - 2 * CROWN_MM * factor], [x + width, y]), { pen: PEN.fine });
    sheet.path(
      [
        [x, y],
        [x + width, y],
        ...curve([x + width, y], [x + width + bulge, y + height / 2], [x + width, y + height]),
        [x, y + height],
        ...curve([x, y + height], [x - bulge, y + height / 2], [x, y]),
      ],
      { pen: PEN.edge, closed: true },
    );
  }
  if (sheet.textWidth(cushion.words) < width - 4 && height > 4) {
    sheet.flag(cushion.words, x + width / 2, y + height / 2 + 1.15, { align: 'center' });
  } else sheet.text(cushion.words, x, y + height + 4.2);
  drawChain(sheet, {
    stops: [y, y + height],
    labels: [cushion.thicknessWords],
    at: x - 6.5,
    direction: 'upright',
    outwards: -1,
  });
}

/** Two faces that meet in one seam at half the height, seen along the front. */
function drawLens(sheet: Sheet, box: SheetBox): void {
  const { x, y, width, height } = box;
  const [middle, right] = [y + height / 2, x + width];
  const end = Math.min(width / 4, height * 1.5);
  const face = (at: number): Point[] => [
    ...curve([x, middle], [x + end / 3, at], [x + end, at]),
    ...curve([right - end, at], [right - end / 3, at], [right, middle]),
  ];
  sheet.path([...face(y), ...face(y + height).reverse()], { pen: PEN.edge, closed: true });
  sheet.line(x, middle, right, middle, { pen: PEN.hair });
}

export interface CushionSection {
  construction: Construction;
  thicknessMm: number;
  /** Of the strip between the seams. */
  stripMm: number;
  welted: boolean;
  /** Edge with the closure, as far as the section shows it. */
  closureAt: 'front' | 'back' | null;
  /** Buttons stand in it, pulled in by so much. */
  buttonPullMm: number | null;
  words: SectionWords;
}

const REACH_MM = 21;
const WELT_MM = 0.9;
const DECK_MM = 2.4;
const LABEL_STEP_MM = 4.1;

/** The cushion cut from back to front and broken in the middle, front at the right, with what it lies on. */
export function drawCushionSection(
  sheet: Sheet,
  section: CushionSection,
  box: { x: number; y: number; width: number; height: number },
): void {
  const { words } = section;
  const before = Math.max(0, ...words.back.map(({ text }) => sheet.textWidth(text))) + 6;
  const t = Math.max(9, Math.min(box.height - 7, section.thicknessMm / 4));
  const whole = Math.min(2 * REACH_MM + 8, box.width - before - 6 - widest(sheet, words.front));
  const [left, top] = [box.x + before, box.y + 2];
  const right = left + whole;
  const strip = (section.stripMm / section.thicknessMm) * t;
  const size = { height: t, reach: whole / 2, strip };
  const kinds = edgeKinds(section.construction);
  const ends = [
    { profile: edgeProfile(kinds.back, size), at: ([u, v]: Point): Point => [left + u, top + v] },
    { profile: edgeProfile(kinds.front, size), at: ([u, v]: Point): Point => [right - u, top + v] },
  ] as const;
  for (const { profile, at } of ends) drawEnd(sheet, profile, at, section.welted);
  const board = ends[0].profile.board ? ends[0].profile.board.to[1] - t + 1 : 0.9;
  sheet.rect(left - 4, top + t + board, whole + 8, DECK_MM, { pen: PEN.edge });
  if (section.closureAt) {
    const { profile, at } = section.closureAt === 'back' ? ends[0] : ends[1];
    const [x, y] = at(profile.middle);
    sheet.rect(x - 0.9, y - 1.3, 1.8, 2.6, { fill: 0, bare: true });
  }
  if (section.buttonPullMm !== null) {
    const x = left + whole * 0.36;
    const dip = top + Math.min(t * 0.6, (section.buttonPullMm / section.thicknessMm) * t);
    sheet.path(
      [
        [x - 3, top - 0.7],
        [x, dip],
        [x + 3, top - 0.7],
      ],
      { pen: PEN.fine, fill: 255 },
    );
    sheet.line(x - 1.4, dip, x + 1.4, dip, { pen: 0.6 });
    sheet.line(x, dip, x, top + t, { pen: PEN.fine, dash: [0.8, 0.5] });
  }
  drawBreak(sheet, left + whole / 2, top - 2, top + t + board + DECK_MM + 1);
  const targets = { left, top, right, t, board };
  pointOut(sheet, words.back, left - 5.2, box.y, (at) => endPoint(ends[0], at, targets), 'right');
  pointOut(sheet, words.front, right + 5.8, box.y, (at) => endPoint(ends[1], at, targets), 'left');
}

const widest = (sheet: Sheet, words: SectionWords['front']) =>
  Math.max(0, ...words.map(({ text }) => sheet.textWidth(text)));

function drawEnd(sheet: Sheet, profile: EdgeProfile, at: (point: Point) => Point, welted: boolean): void {
  sheet.path(profile.foam.map(at), { pen: PEN.hair, fill: 238 });
  if (profile.board) {
    const [a, b] = [at(profile.board.from), at(profile.board.to)];
    sheet.rect(Math.min(a[0], b[0]), a[1], Math.abs(b[0] - a[0]), b[1] - a[1], { pen: PEN.fine, fill: 210 });
  }
  for (const line of profile.cloth) sheet.path(line.map(at), { pen: PEN.edge });
  for (const { at: seam, inwards } of profile.seams) {
    const [x, y] = at(seam);
    const [tx, ty] = at([seam[0] + inwards[0], seam[1] + inwards[1]]);
    sheet.line(x, y, tx, ty, { pen: 0.5 });
    const out = Math.sign(x - tx) * WELT_MM;
    if (welted)
      sheet.circle(x + out, y - Math.sign(ty - y) * WELT_MM * 0.8, WELT_MM, { pen: PEN.edge, fill: 255 });
    else sheet.circle(x, y, 0.5, { fill: 0 });
  }
  for (const staple of profile.staples) {
    const [x, y] = at(staple);
    sheet.line(x, y - 1.1, x, y + 0.5, { pen: 0.5 });
  }
}

function drawBreak(sheet: Sheet, x: number, top: number, foot: number): void {
  const middle = (top + foot) / 2;
  const line = (dx: number): Point[] => [
    [x + dx, top],
    [x + dx, middle - 2],
    [x + dx - 1.4, middle - 0.7],
    [x + dx + 1.4, middle + 0.7],
    [x + dx, middle + 2],
    [x + dx, foot],
  ];
  sheet.path([...line(-1), ...line(1).reverse()], { fill: 255, bare: true, closed: true });
  for (const dx of [-1, 1]) sheet.path(line(dx), { pen: PEN.hair });
}

interface End {
  profile: EdgeProfile;
  at: (point: Point) => Point;
}

/** Where a word of a section points to. */
function endPoint(
  { profile, at }: End,
  what: SectionWords['front'][number]['at'],
  { t, board }: { t: number; board: number },
): Point {
  const [first] = profile.seams;
  switch (what) {
    case 'top':
      return at(profile.top);
    case 'seam':
      return at(first?.at ?? [0, 0]);
    case 'allowance':
      return first ? at([first.at[0] + first.inwards[0], first.at[1] + first.inwards[1]]) : at([0, 0]);
    case 'middle':
      return at(profile.middle);
    case 'foam':
      return at([5, t * 0.62]);
    case 'board':
      return at([4, t + 1.2]);
    case 'staples':
      return at(profile.staples[0] ?? [0, t]);
    case 'deck':
      return at([-2.5, t + board + DECK_MM / 2]);
  }
}

function pointOut(
  sheet: Sheet,
  words: SectionWords['front'],
  x: number,
  top: number,
  pointOf: (at: SectionWords['front'][number]['at']) => Point,
  align: 'left' | 'right',
): void {
  const side = align === 'left' ? -1 : 1;
  words
    .map((word) => ({ ...word, point: pointOf(word.at) }))
    .sort((a, b) => a.point[1] - b.point[1])
    .forEach(({ text, point }, n) => {
      const y = top + n * LABEL_STEP_MM + 0.6;
      sheet.path([point, [x + side * 1.6, y], [x + side * 0.6, y]], { pen: PEN.hair, grey: 60 });
      sheet.text(text, x, y + 1.15, { align });
    });
}

/** A quadratic curve as short lines: three points, the middle one pulling. */
function curve(from: Point, pull: Point, to: Point): Point[] {
  return Array.from({ length: 17 }, (_, i) => {
    const t = i / 16;
    const blend = (k: 0 | 1) => (1 - t) ** 2 * from[k] + 2 * t * (1 - t) * pull[k] + t ** 2 * to[k];
    return [blend(0), blend(1)] as const;
  });
}

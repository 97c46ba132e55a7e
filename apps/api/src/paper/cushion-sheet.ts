import {
  buttonSpots,
  type Construction,
  closurePath,
  formatLength,
  FRONT_EDGE_WORDS,
  HANDEDNESS_WORDS,
  lengthStep,
  marksWords,
  OFF_JOINT_MM,
  orderDrop,
  orderDropWords,
  outlineBox,
  scaleWords,
  shopScales,
  spacesBetween,
} from '@settlewright/geometry';
import { CHECK_BAR_MM, drawCheckBar } from './check-bar';
import { type PlanChains, planChains } from './cushion-chains';
import { closureWords, drawFactsColumn, FACTS_WIDTH_MM } from './cushion-facts';
import { drawCushionPlan } from './cushion-plan';
import { drawCushionFront, drawCushionSection } from './cushion-views';
import { type OrderPages, PAD } from './order-pages';
import { linesNeeded, paragraph } from './paragraph';
import { type CushionPlan, type PlanPlace } from './plan-place';
import { sectionWords } from './section-words';
import { leading, PEN, type Sheet } from './sheet';
import type { SpecCushion, SpecPack } from './spec-pack';
import { bareLength } from './spec-words';
import { type Frame, frameOf } from './title-block';

const WRAPPED: ReadonlySet<Construction> = new Set(['waterfall', 'bullnose']);
const FOOT_MM = 44;
const HEAD_MM = 12;
const SUM_SIZE = 9.5;

/** One sheet for cushions that are made alike, and a second where their facts find no room on it. */
export function drawCushionSheet(pages: OrderPages, pack: SpecPack, cushion: SpecCushion): void {
  const topic = [
    marksWords(cushion.marks),
    `${cushion.kind}, ${HANDEDNESS_WORDS[cushion.hand]}, make ${cushion.marks.length}`,
  ];
  const sheet = pages.add(topic);
  const frame = frameOf(sheet);
  const split = frame.right - FACTS_WIDTH_MM;
  sheet.line(split, frame.top, split, frame.bottom, { pen: PEN.fine });
  drawFigures(sheet, pack, cushion, { ...frame, right: split });
  drawFactsColumn(pages, { sheet, topic }, pack, cushion, { ...frame, left: split });
}

function drawFigures(sheet: Sheet, pack: SpecPack, cushion: SpecCushion, frame: Frame): void {
  const left = frame.left + PAD;
  const right = frame.right - PAD;
  const width = right - left;
  const view = cushion.kind === 'seat' ? 'from above, back edge up' : 'from the front, top edge up';
  paragraph(sheet, `${headMarks(cushion)} ${view}`, left, frame.top + 6.2, width - 52, {
    size: 10.5,
    weight: 600,
  });
  const hand =
    cushion.hand === 'left' || cushion.hand === 'right'
      ? `drawn: ${HANDEDNESS_WORDS[cushion.hand]} as sat in`
      : 'sitter’s left is at the right';
  sheet.text(hand, right, frame.top + 6.2, { weight: 600, align: 'right' });
  const plan = planOf(cushion, pack);
  const sums = sumLines(cushion, pack);
  const sumsHigh = sums.reduce(
    (high, line) => high + linesNeeded(sheet, line, width, { size: SUM_SIZE }) * leading(SUM_SIZE),
    sums.length > 0 ? 3 : 0,
  );
  const room = frame.bottom - frame.top - HEAD_MM - FOOT_MM - sumsHigh;
  const { place, chains, scale } = placed(sheet, plan, pack, { width, height: room, cushion });
  const at = { ...place, x: left + chains.space.left, y: frame.top + HEAD_MM + chains.space.above };
  const moved = planChains(sheet, plan, at);
  drawCushionPlan(sheet, plan, at, moved);
  const box = outlineBox(plan.outline);
  const under = at.y + (box.y1 - box.y0) * at.factor + moved.space.below;
  const y = drawSums(sheet, sums, { x: left, y: under, width });
  const { thicknessMm, widthMm } = cushion.finished;
  sheet.text(cushion.kind === 'seat' ? 'From the front' : 'From above', left, y + 5.4);
  if (cushion.cloth) sheet.text(cushion.cloth.words, right, y + 5.4, { align: 'right', weight: 600 });
  drawCushionFront(
    sheet,
    {
      construction: cushion.row.spec.make.construction,
      widthMm,
      thicknessMm,
      words: frontWords(cushion, pack),
      thicknessWords: at.format(thicknessMm),
    },
    { x: at.x - box.x0 * at.factor, y: y + 9.5, factor: at.factor },
  );
  drawFoot(sheet, pack, cushion, { left, right, top: frame.bottom - FOOT_MM, scaleWords: scale });
}

/** The largest scale of a shop's ruler at which the plan finds room with all its chains. */
function placed(
  sheet: Sheet,
  plan: CushionPlan,
  { units }: SpecPack,
  room: { width: number; height: number; cushion: SpecCushion },
): { place: PlanPlace; chains: PlanChains; scale: string } {
  const box = outlineBox(plan.outline);
  const format = (mm: number) => formatLength(mm, { ...units, feet: false });
  const tried = shopScales(units.system).map((ratio) => {
    const place = { x: 0, y: 0, factor: 1 / ratio, format, stepMm: lengthStep(units) };
    const chains = planChains(sheet, plan, place);
    const { above, below, left, right } = chains.space;
    const front = 9.5 + room.cushion.finished.thicknessMm / ratio + 3;
    const fits =
      left + (box.x1 - box.x0) / ratio + right <= room.width &&
      above + (box.y1 - box.y0) / ratio + below + front <= room.height;
    return { place, chains, scale: scaleWords(units.system, ratio), fits };
  });
  return tried.find(({ fits }) => fits) ?? tried.at(-1)!;
}

function planOf(cushion: SpecCushion, { units }: SpecPack): CushionPlan {
  const { closure, edges, row, cloth } = cushion;
  const { spec } = row;
  const { rowsMm, columnsMm, datum, boardLinesMm } = cushion.buttons;
  const { side, name, toSeamMm, columnsMm: fromDatum } = datum;
  return {
    widthMm: spec.finishedMm.widthMm,
    depthMm: spec.finishedMm.depthMm,
    outline: spec.outline,
    columnsMm: rowsMm.length > 0 ? columnsMm : [],
    rowsMm: columnsMm.length > 0 ? rowsMm : [],
    buttons: buttonSpots(spec),
    datum: side,
    boardLinesMm,
    wall: datum.drawn ? { side, gapMm: toSeamMm, columnsMm: fromDatum, name } : null,
    edges,
    closure:
      closure.edgeMm > 0
        ? {
            edge: closure.edge,
            path: closurePath(spec.outline, closure.edge, closure.wrapMm),
            wrapMm: closure.wrapMm,
            words: `${closure.word} ${closureWords(cushion, units)}`,
          }
        : null,
    cloth,
    wear: spec.wear ?? [],
  };
}

/** What the view from the front says of its edge. */
function frontWords({ row: { spec }, finished }: SpecCushion, { units }: SpecPack): string {
  const show = (mm: number) => formatLength(mm, { ...units, feet: false });
  const crown = `crown up to ${show((spec.making?.crownMm ?? 0) + (spec.foam.wrap?.thicknessMm ?? 0))} more`;
  const strip = show(spec.making?.edgeHeightMm ?? finished.thicknessMm);
  const words: Record<Construction, string> = {
    boxed: `boxing ${strip} between seams; ${crown}`,
    'tight-boxed': `boxing ${strip} between seams, tight over the foam`,
    'knife-edge': FRONT_EDGE_WORDS['knife-edge'],
    waterfall: `${FRONT_EDGE_WORDS.waterfall}; ${crown}`,
    bullnose: `${FRONT_EDGE_WORDS.bullnose}; ${crown}`,
    'plywood-backed': 'cover pulled round the board and stapled under it',
  };
  return words[spec.make.construction];
}

/** The chains once more as sums, for whoever sets out with a rule. */
function sumLines(cushion: SpecCushion, { units }: SpecPack): string[] {
  const { columnsMm, rowsMm, datum, seamName } = cushion.buttons;
  if (columnsMm.length === 0 || rowsMm.length === 0) return [];
  const step = lengthStep(units);
  const show = (mm: number) => formatLength(mm, { ...units, feet: false });
  const sum = (stops: readonly number[], whole: number) => {
    const parts = spacesBetween([0, ...stops, whole], step).map((mm) => bareLength(mm, units));
    return `${shortSum(parts)} = ${show(whole)}`;
  };
  const seam = cushion.kind === 'seat' ? 'back' : 'top';
  const beyond = cushion.row.spec.warnings.some(({ code }) => code === 'off-joint');
  return [
    `From the ${seamName} seam ${sum(columnsMm, cushion.finished.widthMm)}.`,
    `Rows from the ${seam} seam ${sum(rowsMm, cushion.finished.depthMm)}.` +
      (datum.drawn
        ? ` Quiet line: from the ${datum.name}, ${show(datum.toSeamMm)} from there to the seam.`
        : ` The ${datum.name} is ${show(datum.toSeamMm)} from that seam.`) +
      (beyond ? ` CHECK: columns more than ${show(OFF_JOINT_MM)} off a joint, see the button sheet.` : ''),
  ];
}

function drawSums(
  sheet: Sheet,
  lines: readonly string[],
  at: { x: number; y: number; width: number },
): number {
  if (lines.length === 0) return at.y;
  sheet.line(at.x, at.y, at.x + at.width, at.y, { pen: PEN.fine });
  let y = at.y + 4.4;
  for (const line of lines) y = paragraph(sheet, line, at.x, y, at.width, { size: SUM_SIZE });
  const foot = y - leading(SUM_SIZE) + 1.8;
  sheet.line(at.x, foot, at.x + at.width, foot, { pen: PEN.fine });
  return foot;
}

/** "5⅞ + 9¾ + 9¾ + 9¾ + 7⅝", long runs of equals as "12 × 9¾". */
function shortSum(parts: readonly string[]): string {
  if (parts.length <= 9) return parts.join(' + ');
  const groups: { part: string; count: number }[] = [];
  for (const part of parts) {
    const last = groups.at(-1);
    if (last?.part === part) last.count += 1;
    else groups.push({ part, count: 1 });
  }
  return groups.map(({ part, count }) => (count > 1 ? `${count} × ${part}` : part)).join(' + ');
}

function drawFoot(
  sheet: Sheet,
  pack: SpecPack,
  cushion: SpecCushion,
  at: { left: number; right: number; top: number; scaleWords: string },
): void {
  const { units } = pack;
  const { spec } = cushion.row;
  sheet.line(at.left, at.top, at.right, at.top, { pen: PEN.fine });
  const left = cushion.kind === 'seat' ? 'back' : 'top';
  sheet.text(`Section, ${left} edge at the left, not to scale`, at.left, at.top + 4.6);
  const barX = at.right - CHECK_BAR_MM;
  const { closureEdge, welt, closure } = spec.make;
  drawCushionSection(
    sheet,
    {
      construction: spec.make.construction,
      thicknessMm: spec.finishedMm.thicknessMm,
      stripMm: spec.making?.edgeHeightMm ?? spec.finishedMm.thicknessMm,
      // Of a front in one piece only the sides are welted, which this cut does not meet.
      welted: welt !== 'none' && !WRAPPED.has(spec.make.construction),
      closureAt:
        closure !== 'stapled' && (closureEdge === 'front' || closureEdge === 'back') ? closureEdge : null,
      buttonPullMm: spec.buttons.count > 0 ? spec.tufting.pullMm : null,
      words: sectionWords(spec, units),
    },
    { x: at.left, y: at.top + 9, width: barX - at.left - 5, height: FOOT_MM - 12 },
  );
  paragraph(
    sheet,
    [{ text: `Scale of the plan ${at.scaleWords}. Sizes govern.`, weight: 600 }],
    barX,
    at.top + 4.6,
    CHECK_BAR_MM,
  );
  drawCheckBar(sheet, barX, at.top + 18);
  const drop = orderDrop(spec);
  const unloaded = drop
    ? orderDropWords(drop, units)
    : 'The back cushion is drawn as it is before anybody leans on it.';
  paragraph(sheet, unloaded, barX, at.top + 26, CHECK_BAR_MM);
}

function headMarks({ marks }: SpecCushion): string {
  if (marks.length === 1) return marks[0] ?? '';
  if (marks.length <= 4) return `${marks.slice(0, -1).join(', ')} and ${marks.at(-1)}`;
  return `${marks[0]} to ${marks.at(-1)} (${marks.length})`;
}

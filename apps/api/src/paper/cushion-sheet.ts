import { formatLength, lengthStep, scaleFor } from '@settlewright/geometry';
import { CHECK_BAR_MM, drawCheckBar } from './check-bar';
import { spaceAbove, spaces } from './cushion-chains';
import { closureWords, drawFactsColumn, FACTS_WIDTH_MM, PAD } from './cushion-facts';
import { drawCushionPlan } from './cushion-plan';
import { drawCushionCut, drawCushionFront } from './cushion-views';
import { paragraph } from './paragraph';
import { chainSide, type CushionPlan, PLAN_SPACE } from './plan-place';
import { leading, PEN, type Sheet } from './sheet';
import type { SpecCushion, SpecPack } from './spec-pack';
import { bareLength, sinkWords } from './spec-words';
import { type Frame, frameOf } from './title-block';

const FOOT_MM = 34;

/** One sheet for cushions that are made alike. */
export function drawCushionSheet(sheet: Sheet, pack: SpecPack, cushion: SpecCushion): void {
  const frame = frameOf(sheet);
  const split = frame.right - FACTS_WIDTH_MM;
  sheet.line(split, frame.top, split, frame.bottom, { pen: PEN.fine });
  drawFigures(sheet, pack, cushion, { ...frame, right: split });
  drawFactsColumn(sheet, pack, cushion, { ...frame, left: split });
}

function drawFigures(sheet: Sheet, pack: SpecPack, cushion: SpecCushion, frame: Frame): void {
  const { units } = pack;
  const left = frame.left + PAD;
  const right = frame.right - PAD;
  const width = right - left;
  const view = cushion.kind === 'seat' ? 'from above, back edge up' : 'from the front, top edge up';
  paragraph(sheet, `${headMarks(cushion)} ${view}`, left, frame.top + 6.2, width - 52, {
    size: 10.5,
    weight: 600,
  });
  const hand =
    cushion.hand === 'either' ? 'sitter’s left is at the right' : `drawn: ${cushion.hand} hand as sat in`;
  sheet.text(hand, right, frame.top + 6.2, { weight: 600, align: 'right' });

  const { widthMm, depthMm, thicknessMm } = cushion.finished;
  const plan = planOf(cushion, pack);
  const planSpace = {
    widthMm: width - PLAN_SPACE.chains - PLAN_SPACE.wall,
    heightMm: frame.bottom - frame.top - FOOT_MM - 62,
  };
  // A usual gap finds room beside the wall's name.
  const gap = Math.max(0, (plan.wall?.gapMm ?? 0) - 40);
  const scale = scaleFor(
    units.system,
    { widthMm: widthMm + gap, heightMm: depthMm + thicknessMm },
    planSpace,
  );
  const { factor } = scale;
  const before = chainSide(plan) === 'left' ? PLAN_SPACE.chains : PLAN_SPACE.wall + gap * factor;
  const place = {
    x: left + before,
    y: frame.top + 12,
    factor,
    format: (mm: number) => formatLength(mm, { ...units, feet: false }),
    stepMm: lengthStep(units),
  };
  place.y += spaceAbove(sheet, plan, place);
  drawCushionPlan(sheet, plan, place);

  let y = place.y + depthMm * factor + PLAN_SPACE.bottom;
  y = drawSums(sheet, pack, cushion, { x: left, y, width });
  const front = y + 9.5;
  sheet.text(cushion.kind === 'seat' ? 'From the front' : 'From above', left, y + 5.4);
  drawCushionFront(
    sheet,
    {
      widthMm,
      thicknessMm,
      words: `boxing ${formatLength(thicknessMm, { ...units, feet: false })} between welt seams; crown up to ${units.system === 'millimetres' ? '6 mm' : '¼″'} more`,
      thicknessWords: formatLength(thicknessMm, { ...units, feet: false }),
    },
    { x: place.x, y: front, factor },
  );
  drawFoot(sheet, pack, cushion, {
    left,
    right,
    top: frame.bottom - FOOT_MM,
    factor,
    scaleWords: scale.words,
  });
}

function planOf(cushion: SpecCushion, { units }: SpecPack): CushionPlan {
  const { closure, edges, finished } = cushion;
  const { rowsMm, columnsMm, datum, boardLinesMm } = cushion.buttons;
  const { side, name, toSeamMm, columnsMm: fromDatum } = datum;
  return {
    widthMm: finished.widthMm,
    depthMm: finished.depthMm,
    columnsMm,
    rowsMm,
    datum: side,
    boardLinesMm,
    wall: datum.drawn ? { side, gapMm: toSeamMm, columnsMm: fromDatum, name } : null,
    edges,
    closure:
      closure.edgeMm > 0
        ? {
            edge: closure.edge,
            wrapMm: closure.wrapMm,
            words: `${closure.word} ${closureWords(cushion, units)}`,
          }
        : null,
  };
}

/** The chains once more as sums, for whoever sets out with a rule. */
function drawSums(
  sheet: Sheet,
  pack: SpecPack,
  cushion: SpecCushion,
  at: { x: number; y: number; width: number },
): number {
  const { units } = pack;
  const { columnsMm, rowsMm, datum, seamName } = cushion.buttons;
  if (columnsMm.length === 0 || rowsMm.length === 0) return at.y;
  const step = lengthStep(units);
  const sum = (stops: readonly number[], whole: number) => {
    const parts = spaces([0, ...stops, whole], step).map((mm) => bareLength(mm, units));
    return `${shortSum(parts)} = ${formatLength(whole, { ...units, feet: false })}`;
  };
  const seam = cushion.kind === 'seat' ? 'back' : 'top';
  const lines = [
    `From the ${seamName} seam ${sum(columnsMm, cushion.finished.widthMm)}.`,
    `Rows from the ${seam} seam ${sum(rowsMm, cushion.finished.depthMm)}.` +
      (datum.drawn
        ? ` Quiet line: from the ${datum.name}, ${formatLength(datum.toSeamMm, { ...units, feet: false })} from there to the seam.`
        : ` The ${datum.name} is ${formatLength(datum.toSeamMm, { ...units, feet: false })} from that seam.`),
  ];
  sheet.line(at.x, at.y, at.x + at.width, at.y, { pen: PEN.fine });
  let y = at.y + 4.4;
  for (const line of lines) y = paragraph(sheet, line, at.x, y, at.width, { size: 9.5 });
  const foot = y - leading(9.5) + 1.8;
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
  at: { left: number; right: number; top: number; factor: number; scaleWords: string },
): void {
  const { units } = pack;
  sheet.line(at.left, at.top, at.right, at.top, { pen: PEN.fine });
  const rows = cushion.buttons.rowsMm.length > 0;
  const words = `Cut ${rows ? 'at a button row' : 'through the middle'}, ${cushion.kind === 'seat' ? 'front at the right' : 'face up'}`;
  sheet.text(words, at.left, at.top + 4.6);
  const barX = at.right - CHECK_BAR_MM;
  const most = (barX - at.left - 34) / cushion.finished.depthMm;
  drawCushionCut(
    sheet,
    {
      depthMm: cushion.finished.depthMm,
      thicknessMm: cushion.finished.thicknessMm,
      rowsMm: cushion.buttons.rowsMm,
      foamWords: `foam ${formatLength(cushion.foam.thicknessMm, { ...units, feet: false })}`,
      groundWords: cushion.kind === 'seat' ? 'deck' : 'back board',
    },
    { x: at.left + 4, y: at.top + 9, factor: Math.min(at.factor, most, 14 / cushion.finished.thicknessMm) },
  );
  sheet.text(`Scale ${at.scaleWords}. Sizes govern.`, barX, at.top + 4.6, { weight: 600 });
  drawCheckBar(sheet, barX, at.top + 13);
  const sink =
    cushion.kind === 'seat'
      ? sinkWords(cushion, units)
      : 'The back cushion is drawn as it is before anybody leans on it.';
  paragraph(sheet, sink, barX, at.top + 19.2, CHECK_BAR_MM);
}

function headMarks({ marks }: SpecCushion): string {
  if (marks.length === 1) return marks[0] ?? '';
  if (marks.length <= 4) return `${marks.slice(0, -1).join(', ')} and ${marks.at(-1)}`;
  return `${marks[0]} to ${marks.at(-1)} (${marks.length})`;
}

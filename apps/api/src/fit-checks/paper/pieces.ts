import type { LimitLines, RuleUnit } from '@settlewright/anthropometry';
import type { LengthStyle } from '@settlewright/geometry';
import { linesNeeded, paragraph } from '../../paper/paragraph';
import { leading, PEN } from '../../paper/sheet';
import { checkName, ruleOf, type ShownCell, VERDICT_WORDS } from '../shown-sheet';
import type { FitSheetPaper } from './fit-sheet-paper';
import type { Flow } from './flow';
import { drawGapMark, GAP_MARK_MM } from './gap-mark';
import { marginWords, valueWords } from './margin-words';

const COLUMNS = 3;
const GUTTER_MM = 7;
const SAYS_MM = 34;
const LINE = leading(9);

interface Entry {
  name: string;
  detail: string;
  cell: ShownCell;
}

/** Rules about a pair, bench, table or way, in three columns; what was not asked closes as one sentence each. */
export function drawPieces(flow: Flow, input: FitSheetPaper): void {
  const spoken = input.sheet.piecesAndWays.filter(({ outcome }) => !isSilent(outcome.kind));
  const silent = silentSentences(input);
  if (spoken.length === 0 && silent.length === 0) return;
  flow.need(24);
  flow.sheet.line(flow.left, flow.y, flow.right, flow.y, { pen: PEN.edge });
  flow.y += LINE + 1.6;
  flow.sheet.text('Pieces and ways', flow.left, flow.y, { size: 11, weight: 600 });
  flow.y += 2.2;
  const width = (flow.width - GUTTER_MM * (COLUMNS - 1)) / COLUMNS;
  const entries = spoken.map((cell) => entryOf(input, cell));
  for (let from = 0; from < entries.length; from += COLUMNS) {
    drawLine(flow, input, entries.slice(from, from + COLUMNS), width);
  }
  for (const sentence of silent) {
    flow.need(linesNeeded(flow.sheet, sentence, flow.width) * LINE + 2);
    flow.y = paragraph(flow.sheet, sentence, flow.left, flow.y + LINE + 0.6, flow.width) - LINE;
  }
  flow.y += 5;
}

const isSilent = (kind: ShownCell['outcome']['kind']) => kind === 'doesNotApply' || kind === 'notAsked';

function drawLine(flow: Flow, input: FitSheetPaper, entries: Entry[], width: number): void {
  const words = width - SAYS_MM;
  const heights = entries.map(({ name, detail }) => {
    const lines = linesNeeded(flow.sheet, name, words, { weight: 600 });
    return (lines + (detail ? linesNeeded(flow.sheet, detail, words) : 0)) * LINE;
  });
  const height = Math.max(2 * LINE, ...heights) + 2.8;
  flow.need(height);
  const { sheet } = flow;
  const baseline = flow.y + 1.4 + LINE * 0.78;
  entries.forEach(({ name, detail, cell }, n) => {
    const x = flow.left + n * (width + GUTTER_MM);
    const after = paragraph(sheet, name, x, baseline, words - 2, { weight: 600 });
    if (detail) paragraph(sheet, detail, x, after, words - 2);
    drawSaid(flow, input, cell, x + words, baseline);
    sheet.line(x, flow.y + height, x + width, flow.y + height, { pen: PEN.hair });
  });
  flow.y += height;
}

function drawSaid(
  flow: Flow,
  { ruleBook, style }: FitSheetPaper,
  cell: ShownCell,
  x: number,
  y: number,
): void {
  const { outcome } = cell;
  const unit = ruleOf(ruleBook, cell)?.unit ?? 'mm';
  if (outcome.kind === 'verdict') {
    drawGapMark(flow.sheet, outcome.verdict, x, y, { estimated: outcome.estimated });
    const words = VERDICT_WORDS[outcome.verdict] + (outcome.estimated ? ', est.' : '');
    flow.sheet.text(marginWords(outcome, unit, style), x + GAP_MARK_MM + 1, y, {
      weight: outcome.estimated ? 400 : 600,
    });
    flow.sheet.text(words, x + GAP_MARK_MM + 1, y + LINE);
  } else if (outcome.kind === 'clause') {
    const words = `${outcome.inside ? 'inside' : 'outside'} clause ${outcome.clause}`;
    paragraph(flow.sheet, words, x, y, SAYS_MM, { weight: 600 });
  } else if (outcome.kind === 'information') {
    paragraph(flow.sheet, outcome.words, x, y, SAYS_MM);
  }
}

function entryOf({ ruleBook, style }: FitSheetPaper, cell: ShownCell): Entry {
  const unit = ruleOf(ruleBook, cell)?.unit ?? 'mm';
  const marks = [...new Set(cell.marks)].join(', ');
  return { name: `${checkName(ruleBook, cell)} ${marks}`.trim(), detail: detailOf(cell, unit, style), cell };
}

/** "22″; pass 24″, fail 21″", where the reader may see the numbers. */
function detailOf({ outcome }: ShownCell, unit: RuleUnit, style: LengthStyle): string {
  if (outcome.kind === 'clause') {
    const outside = outcome.parts.filter(({ inside }) => !inside).map(({ label }) => label);
    return outside.length > 0
      ? `outside: ${outside.join('; ')}`
      : limitWords('', outcome.limits, unit, style);
  }
  if (outcome.kind !== 'verdict' || !('value' in outcome)) return '';
  const parts = [
    limitWords('pass', outcome.pass, unit, style),
    limitWords('fail', outcome.fail, unit, style),
  ];
  const value = typeof outcome.value === 'number' ? valueWords(outcome.value, unit, style) : '';
  return [value, parts.filter((part) => part !== '').join(', ')].filter((part) => part !== '').join('; ');
}

function limitWords(name: string, { lower, upper }: LimitLines, unit: RuleUnit, style: LengthStyle): string {
  const ends = [lower, upper].filter((end) => end !== undefined).map((end) => valueWords(end, unit, style));
  return ends.length === 0 ? '' : `${name} ${ends.join(' to ')}`.trim();
}

/** "No inside corner: First place at the corner." */
function silentSentences({ ruleBook, sheet }: FitSheetPaper): string[] {
  const byReason = new Map<string, Set<string>>();
  for (const cell of sheet.piecesAndWays) {
    const { outcome } = cell;
    if (outcome.kind !== 'doesNotApply' && outcome.kind !== 'notAsked') continue;
    const names = byReason.get(outcome.reason) ?? new Set();
    byReason.set(outcome.reason, names.add(checkName(ruleBook, cell)));
  }
  if (byReason.size === 0) return [];
  const parts = [...byReason].map(([reason, names]) => `${[...names].join(', ')} (${reason})`);
  return [`Not asked here: ${parts.join('; ')}.`];
}

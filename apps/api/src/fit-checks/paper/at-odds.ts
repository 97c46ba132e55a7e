import {
  type ConflictFound,
  conflictNote,
  conflictsIn,
  type SideSaid,
  SOURCE_MARK_WORDS,
} from '@settlewright/anthropometry';
import { formatLength } from '@settlewright/geometry';
import { linesNeeded, paragraph, type Prose } from '../../paper/paragraph';
import { leading, PEN } from '../../paper/sheet';
import { checkName, ruleOf, type ShownCell, VERDICT_WORDS } from '../shown-sheet';
import type { FitSheetPaper } from './fit-sheet-paper';
import type { Flow } from './flow';
import { marginWords } from './margin-words';
import { drawSectionHeading } from './section-heading';

const GUTTER_MM = 7;
const LINE = leading(9);
const LEAD =
  'Meeting one of these makes it harder to meet the other. Both are shown; which one gives way is for the workshop to decide.';

/** Rules that pull against each other in this set: both sides with their purpose, and what their numbers rest on. */
export function drawAtOdds(flow: Flow, input: FitSheetPaper): void {
  const found = conflictsIn<ShownCell>(input.sheet, input.ruleBook);
  if (found.length === 0) return;
  drawSectionHeading(flow, 'Rules at odds');
  flow.y = paragraph(flow.sheet, LEAD, flow.left, flow.y + LINE * 0.78, flow.width) - LINE * 0.78 + 1;
  for (const conflict of found) drawConflict(flow, input, conflict);
  flow.y += 4;
}

function drawConflict(flow: Flow, input: FitSheetPaper, found: ConflictFound<ShownCell>): void {
  const name: Prose = [{ text: headWords(found), weight: 600 }];
  const width = (flow.width - GUTTER_MM) / 2;
  const sides = found.sides.map((side) => sideLines(input, side));
  const note = noteWords(input, found);
  const rows = (lines: readonly Prose[]) =>
    lines.reduce((sum, line) => sum + linesNeeded(flow.sheet, line, width), 0);
  const head = linesNeeded(flow.sheet, name, flow.width);
  const tail = linesNeeded(flow.sheet, note, flow.width);
  const height = (head + Math.max(...sides.map(rows)) + tail) * LINE + 2;
  flow.need(height);
  const { sheet } = flow;
  const baseline = flow.y + LINE * 0.78;
  const below = paragraph(sheet, name, flow.left, baseline, flow.width);
  const ends = sides.map((lines, n) =>
    lines.reduce((y, line) => paragraph(sheet, line, flow.left + n * (width + GUTTER_MM), y, width), below),
  );
  paragraph(sheet, note, flow.left, Math.max(...ends), flow.width);
  flow.y += height;
  sheet.line(flow.left, flow.y - 1, flow.right, flow.y - 1, { pen: PEN.hair });
}

/** "B1. A bench kept accessible is also sat on by short people." */
export const headWords = ({ marks, conflict }: ConflictFound<ShownCell>): string =>
  `${marks.join(', ')}. ${conflict.when}`;

/** The purpose of a side, then the worst that each of its rules says here. */
export function sideLines(input: FitSheetPaper, { purpose, cells }: SideSaid<ShownCell>): Prose[] {
  const said = cells.map((cell): Prose => [
    { text: `${checkName(input.ruleBook, cell)}, ${cell.ruleId}: ` },
    { text: saidWords(input, cell), weight: 600 },
  ]);
  return [[{ text: purpose }], ...said];
}

function saidWords({ ruleBook, style }: FitSheetPaper, cell: ShownCell): string {
  const { outcome } = cell;
  if (outcome.kind === 'clause') return `${outcome.inside ? 'inside' : 'outside'} clause ${outcome.clause}`;
  if (outcome.kind !== 'verdict') return '';
  const margin = marginWords(outcome, ruleOf(ruleBook, cell)?.unit ?? 'mm', style);
  return `${margin} ${VERDICT_WORDS[outcome.verdict]}${outcome.estimated ? ', est.' : ''}`.trim();
}

/** The note with its numbers in the sheet's units, and the sources of those numbers as read. */
export function noteWords({ style }: FitSheetPaper, { conflict }: ConflictFound<ShownCell>): string {
  const sources = conflict.sources.map(({ cite, mark }) => `${cite} (${SOURCE_MARK_WORDS[mark]})`);
  return `${conflictNote(conflict, (mm) => formatLength(mm, style))} ${sources.join('; ')}.`;
}

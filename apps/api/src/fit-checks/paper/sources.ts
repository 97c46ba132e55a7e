import { type Rule, SOURCE_MARK_WORDS } from '@settlewright/anthropometry';
import { linesNeeded, paragraph, type Prose } from '../../paper/paragraph';
import { leading } from '../../paper/sheet';
import { ruleOf, type ShownCell } from '../shown-sheet';
import type { FitSheetPaper } from './fit-sheet-paper';
import type { Flow } from './flow';
import { drawSectionHeading } from './section-heading';

const GUTTER_MM = 7;
const NUMBER_MM = 6.5;
const LINE = leading(9);

/** What the rules of the sheet rest on: the rules with the numbers of their sources, then the sources as read. */
export function drawSources(flow: Flow, input: FitSheetPaper): void {
  const rules = rulesUsed(input);
  if (rules.length === 0) return;
  const sources = [...new Set(rules.flatMap(({ sources: cited }) => cited.map(sourceWords)))].sort();
  const number = new Map(sources.map((words, index) => [words, index + 1]));
  const ruleLines = rules.map((rule): Prose => {
    const numbers = rule.sources.map((source) => number.get(sourceWords(source)) ?? 0).sort((a, b) => a - b);
    return [
      { text: `${rule.columnName} `, weight: 600 },
      { text: `${rule.id}, ${rule.sourceWord}: ${numbers.join(', ')}` },
    ];
  });
  drawSectionHeading(flow, `Rules, version ${input.sheet.ruleVersion}, and the numbers of their sources`);
  drawColumns(flow, 3, ruleLines, 0);
  flow.y += 4;
  drawSectionHeading(flow, 'Sources');
  drawColumns(flow, 2, sources, NUMBER_MM);
}

const sourceWords = ({ cite, mark }: Rule['sources'][number]) => `${cite} (${SOURCE_MARK_WORDS[mark]})`;

/** Entries in rows of so many columns; with room for a number before each where asked. */
function drawColumns(flow: Flow, columns: number, entries: readonly Prose[], numberMm: number): void {
  const width = (flow.width - GUTTER_MM * (columns - 1)) / columns;
  const textMm = width - numberMm;
  for (let from = 0; from < entries.length; from += columns) {
    const row = entries.slice(from, from + columns);
    const height = Math.max(...row.map((entry) => linesNeeded(flow.sheet, entry, textMm))) * LINE + 1.1;
    flow.need(height);
    row.forEach((entry, n) => {
      const x = flow.left + n * (width + GUTTER_MM);
      const baseline = flow.y + LINE * 0.78;
      if (numberMm > 0) flow.sheet.text(String(from + n + 1), x, baseline, { weight: 600 });
      paragraph(flow.sheet, entry, x + numberMm, baseline, textMm);
    });
    flow.y += height;
  }
}

function rulesUsed({ sheet, ruleBook }: FitSheetPaper): Rule[] {
  const cells: ShownCell[] = [
    ...sheet.rows.flatMap((row): readonly ShownCell[] => row.cells),
    ...sheet.publicRow.cells,
    ...sheet.piecesAndWays,
  ];
  const speaking = cells.filter(({ outcome }) => outcome.kind === 'verdict' || outcome.kind === 'clause');
  const rules = speaking.flatMap((cell) => ruleOf(ruleBook, cell) ?? []);
  return [...new Set(rules)].sort((a, b) => ruleBook.rules.indexOf(a) - ruleBook.rules.indexOf(b));
}

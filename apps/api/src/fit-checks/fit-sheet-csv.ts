import type { LimitLines, RuleBook } from '@settlewright/anthropometry';
import { type Cell, csvText } from '../common/spreadsheet-cell';
import { CAUTION, checkName, ruleOf, type ShownCell, type ShownSheet, VERDICT_WORDS } from './shown-sheet';

const HEAD = ['section', 'sitter', 'mark', 'place', 'side', 'check', 'rule', 'says', 'margin', 'margin_low'];
const MORE_HEAD = [
  'margin_high',
  'unit',
  'estimated',
  'value',
  'pass_from',
  'pass_to',
  'fail_from',
  'fail_to',
];

/** One line for each check. Numbers are plain, in the unit of their line; a margin below zero is missing room. */
export function fitSheetCsv(sheet: ShownSheet, ruleBook: RuleBook, confidence: string): string {
  const line = (
    section: string,
    sitter: string,
    mark: string,
    place: number | string,
    cell: ShownCell,
  ): Cell[] => [
    section,
    sitter,
    mark,
    place,
    cell.side ?? '',
    checkName(ruleBook, cell),
    cell.ruleId,
    ...outcomeCells(cell, ruleOf(ruleBook, cell)?.unit ?? ''),
  ];
  return csvText([
    [...HEAD, ...MORE_HEAD],
    ...sheet.rows.flatMap((row) =>
      row.cells.map((cell) => line('sitter', row.name, row.mark, row.place, cell)),
    ),
    ...sheet.publicRow.cells.map((cell) => line('public', cell.readAs, cell.marks.join(' '), '', cell)),
    ...sheet.piecesAndWays.map((cell) => line('pieces and ways', '', cell.marks.join(' '), '', cell)),
    ['note', confidence],
    ['note', CAUTION],
  ]);
}

function outcomeCells({ outcome }: ShownCell, unit: string): Cell[] {
  switch (outcome.kind) {
    case 'verdict':
      return [
        VERDICT_WORDS[outcome.verdict],
        rounded(outcome.margin),
        rounded(outcome.marginRange?.low),
        rounded(outcome.marginRange?.high),
        unit,
        outcome.estimated,
        ...('value' in outcome
          ? [rounded(outcome.value), ...lines(outcome.pass), ...lines(outcome.fail)]
          : []),
      ];
    case 'clause':
      return [
        `${outcome.inside ? 'inside' : 'outside'} clause ${outcome.clause}`,
        ...['', '', ''],
        unit,
        '',
        rounded(outcome.value),
        ...lines(outcome.limits),
      ];
    case 'information':
      return [outcome.words, '', '', '', unit, '', rounded(outcome.value)];
    default:
      return [`${outcome.kind === 'notAsked' ? 'not asked' : 'does not apply'}: ${outcome.reason}`];
  }
}

const lines = ({ lower, upper }: LimitLines) => [rounded(lower), rounded(upper)];

/** Tenths are finer than anybody builds; erased numbers stay empty. */
function rounded(value: number | null | undefined): number | null {
  return typeof value === 'number' ? Math.round(value * 10) / 10 : null;
}

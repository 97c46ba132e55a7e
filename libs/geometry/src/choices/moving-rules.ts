import type { FitCell, FitSheet } from '@settlewright/anthropometry';

/**
 * Rules of which some cell's number or line differs from the present one, or is there only in some of the sheets.
 *
 * @param present - sheet of the present set
 * @param sheets - sheets of the sets that are tried
 * @returns ids of rules of a person
 */
export function movingRules(present: FitSheet | undefined, sheets: readonly FitSheet[]): Set<string> {
  const saidIn = (sheet: FitSheet) =>
    new Map(sheet.rows.flatMap(({ cells }) => cells.map((cell) => [cell.id, cell] as const)));
  const moving = new Set<string>();
  if (present === undefined) return moving;
  const start = saidIn(present);
  for (const now of sheets.map(saidIn)) {
    for (const [id, { ruleId }] of [...start, ...now]) {
      const [before, after] = [start.get(id), now.get(id)];
      if (!before || !after || said(before) !== said(after)) moving.add(ruleId);
    }
  }
  return moving;
}

const said = ({ outcome }: FitCell): string =>
  outcome.kind === 'verdict' ? `${outcome.margin.toFixed(6)} ${outcome.value.toFixed(6)}` : outcome.kind;

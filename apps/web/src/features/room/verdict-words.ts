import type { FitCell, FitSheet, RuleBook, Verdict } from '@settlewright/anthropometry';
import type { SetDocument } from '@settlewright/geometry';
import { verdictWord } from '@/components/verdict.tsx';
import { shortName } from '@/lib/short-name.ts';

const RANK: Record<Verdict, number> = { fits: 0, tight: 1, notKnown: 2, wontFit: 3 };

export const verdictOf = (cell: FitCell): Verdict | undefined =>
  cell.outcome.kind === 'verdict' ? cell.outcome.verdict : undefined;

/** The worst cell of a sheet that has a gap to show. */
export function worstCell(sheet: FitSheet): FitCell | undefined {
  let worst: FitCell | undefined;
  for (const cell of sheet.rows.flatMap((row) => row.cells)) {
    if (cell.outcome.kind !== 'verdict' || cell.outcome.verdict === 'fits') continue;
    if (!worst || worst.outcome.kind !== 'verdict') {
      worst = cell;
      continue;
    }
    const [a, b] = [cell.outcome, worst.outcome];
    const rank = RANK[a.verdict] - RANK[b.verdict];
    if (rank > 0 || (rank === 0 && a.margin < b.margin)) worst = cell;
  }
  return worst;
}

/** Only the verdicts that changed, in words: "Imre, seat height, fits." */
export function changedVerdicts(before: FitSheet, after: FitSheet, ruleBook: RuleBook): string[] {
  const was = new Map(
    before.rows.flatMap((row) =>
      row.cells.map((cell) => [`${row.sitterId} ${cell.ruleId}`, verdictOf(cell)]),
    ),
  );
  return after.rows.flatMap((row) =>
    row.cells.flatMap((cell) => {
      const now = verdictOf(cell);
      const old = was.get(`${row.sitterId} ${cell.ruleId}`);
      if (now === undefined || old === undefined || now === old) return [];
      const check = ruleBook.rule(cell.ruleId).columnName.toLowerCase();
      return [`${shortName(row.name)}, ${check}, ${verdictWord(now)}`];
    }),
  );
}

export interface Wishes {
  lower: string[];
  higher: string[];
  /** True when some check reads the number at all. */
  read: boolean;
}

function joinNames(names: readonly string[]): string {
  const unique = [...new Set(names)];
  const last = unique.pop();
  if (last === undefined) return '';
  return unique.length === 0 ? last : `${unique.join(', ')} and ${last}`;
}

/** Who would sit better if a number went down or up: tried out, not guessed. */
export function wishesFor(
  check: (document: SetDocument) => FitSheet,
  now: SetDocument,
  down: SetDocument | undefined,
  up: SetDocument | undefined,
): Wishes {
  const wishes: Wishes = { lower: [], higher: [], read: false };
  const margins = (document: SetDocument | undefined) =>
    new Map(
      document === undefined
        ? []
        : check(document).rows.flatMap((row) =>
            row.cells.flatMap((cell): [string, number][] =>
              cell.outcome.kind === 'verdict'
                ? [[`${row.sitterId} ${cell.ruleId}`, cell.outcome.margin]]
                : [],
            ),
          ),
    );
  const [lower, higher] = [margins(down), margins(up)];
  for (const row of check(now).rows) {
    for (const cell of row.cells) {
      if (cell.outcome.kind !== 'verdict') continue;
      const key = `${row.sitterId} ${cell.ruleId}`;
      const { margin, verdict } = cell.outcome;
      const gainDown = (lower.get(key) ?? margin) - margin;
      const gainUp = (higher.get(key) ?? margin) - margin;
      if (Math.abs(gainDown) > 0.01 || Math.abs(gainUp) > 0.01) wishes.read = true;
      if (verdict !== 'wontFit') continue;
      if (gainDown > 0.01) wishes.lower.push(shortName(row.name));
      else if (gainUp > 0.01) wishes.higher.push(shortName(row.name));
    }
  }
  return wishes;
}

export function sayWishes({ lower, higher, read }: Wishes, low = 'lower', high = 'higher'): string {
  if (!read) return 'No check of the people seated here reads this number.';
  const say = (names: string[], way: string) => {
    const unique = [...new Set(names)];
    return unique.length === 0
      ? ''
      : `${joinNames(unique)} ${unique.length === 1 ? 'needs' : 'need'} it ${way}.`;
  };
  const words = [say(lower, low), say(higher, high)].filter(Boolean).join(' ');
  return words || 'Nobody seated here asks for another.';
}

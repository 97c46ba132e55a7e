import {
  conflictNote,
  conflictsIn,
  SOURCE_MARK_WORDS,
  type ConflictFound,
  type SideSaid,
} from '@settlewright/anthropometry';
import { useMemo } from 'react';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { amountText, checkName } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';
import { CellContent } from './fit-cell.tsx';

/** One side: what it is for, and the worst that its rules say here. */
function Side({ said }: { said: SideSaid }) {
  const { ruleBook } = useFitView();
  return (
    <div>
      <p>{said.purpose}</p>
      <ul className="mt-1">
        {said.cells.map((cell) => (
          <li key={cell.id} className="flex min-h-9 flex-wrap items-center justify-between gap-x-3">
            <span className="text-sm text-ink-2">
              {checkName(ruleBook, cell)}, rule {cell.ruleId}
            </span>
            <CellContent cell={cell} />
          </li>
        ))}
      </ul>
    </div>
  );
}

function Conflict({ found }: { found: ConflictFound }) {
  const { style } = useFitView();
  const { conflict, marks, sides } = found;
  return (
    <li className="border-b border-rule py-3">
      <h3 className="font-medium">
        {marks.join(', ')}. {conflict.when}
      </h3>
      <div className="mt-1 grid gap-x-10 gap-y-2 tablet:grid-cols-2">
        <Side said={sides[0]} />
        <Side said={sides[1]} />
      </div>
      <p className="mt-1 max-w-text text-sm text-ink-2">
        {conflictNote(conflict, (mm) => amountText(mm, 'mm', style))}{' '}
        {conflict.sources.map(({ cite, mark }) => `${cite} (${SOURCE_MARK_WORDS[mark]})`).join('; ')}.
      </p>
    </li>
  );
}

/** Rules that pull against each other in this set, side by side with the purpose of each. */
export function AtOdds() {
  const { sheet, ruleBook } = useFitView();
  const found = useMemo(() => conflictsIn(sheet, ruleBook), [sheet, ruleBook]);
  if (found.length === 0) return null;
  return (
    <section className="mt-10">
      <RuleHeading>Rules at odds</RuleHeading>
      <p className="max-w-text text-ink-2">
        Meeting one of these makes it harder to meet the other. Both are shown; which one gives way is yours
        to decide.
      </p>
      <ul>
        {found.map((one) => (
          <Conflict key={one.conflict.id} found={one} />
        ))}
      </ul>
    </section>
  );
}

import type { FitCell } from '@settlewright/anthropometry';
import { formatAngle, formatLength, type CellChange, type CellState, type Fix } from '@settlewright/geometry';
import { useId } from 'react';
import { verdictWord } from '@/components/verdict.tsx';
import { checkName } from '../amounts.ts';
import { useFitView, type FitView } from '../fit-view.ts';
import { useFixes } from '../use-fixes.ts';
import { shortName } from '@/lib/short-name.ts';

function stateWords(state: CellState): string {
  if (state === 'inside' || state === 'outside') return `${state} the clause`;
  return state === 'gone' ? 'no longer asked' : verdictWord(state);
}

function whoOf({ sheet }: FitView, change: CellChange): string {
  const row = sheet.rows.find(
    ({ sitterId, placeId }) => sitterId === change.sitterId && placeId === change.placeId,
  );
  return row === undefined ? change.marks.join(', ') : shortName(row.name);
}

/** "B1 seat height 18″ to 17″", in the reader's units. */
function fixWords(fix: Fix, { style }: FitView): string {
  const show = (value: number) => {
    if (fix.unit === 'deg') return formatAngle(value);
    return fix.unit === 'mm' ? formatLength(value, style) : String(value);
  };
  return `${fix.mark}, ${fix.label.toLowerCase()} ${show(fix.fromValue)} to ${show(fix.toValue)}`;
}

const MOST_NAMED = 6;

function ChangeWords({ changes, tone }: { changes: readonly CellChange[]; tone: string }) {
  const view = useFitView();
  if (changes.length === 0) return null;
  const words = changes
    .slice(0, MOST_NAMED)
    .map(
      (change) =>
        `${whoOf(view, change)}, ${checkName(view.ruleBook, change).toLowerCase()}: ${stateWords(change.to)}`,
    );
  const rest = changes.length - words.length;
  return (
    <p className={`text-sm ${tone}`}>
      {words.join('; ')}
      {rest > 0 && `; and ${rest} more`}.
    </p>
  );
}

function FixLine({ fix }: { fix: Fix }) {
  const view = useFitView();
  const words = fixWords(fix, view);
  return (
    <li className="flex gap-4 border-b border-rule py-2 last:border-0">
      <div className="min-w-0 flex-1">
        <p className="text-sm font-semibold">{words}</p>
        <ChangeWords changes={fix.gains} tone="text-ink-2" />
        <ChangeWords changes={fix.losses} tone="text-wont" />
        {fix.losses.length === 0 && <p className="text-sm text-ink-2">Nobody else changes for the worse.</p>}
      </div>
      {view.take !== undefined && (
        <button type="button" className="link min-h-8 self-start text-sm" onClick={() => view.take?.(fix)}>
          Try it<span className="sr-only">: {words}</span>
        </button>
      )}
    </li>
  );
}

/** What would change one verdict, with who gains and who loses by it. */
export function FixList({ cell }: { cell: FitCell }) {
  const fixes = useFixes(cell);
  const headed = useId();
  return (
    <div>
      <p id={headed} className="border-b border-rule pb-1 font-semibold">
        What would change it, and for whom
      </p>
      {fixes === undefined && <p className="late pt-2 text-sm text-ink-2">Working it out</p>}
      {fixes?.length === 0 && (
        <p className="pt-2 text-sm text-ink-2">No single number changes this without leaving its limits.</p>
      )}
      {fixes !== undefined && fixes.length > 0 && (
        <ul aria-labelledby={headed}>
          {fixes.map((fix) => (
            <FixLine key={`${fix.pieceId}|${fix.label}|${fix.toValue}`} fix={fix} />
          ))}
        </ul>
      )}
    </div>
  );
}

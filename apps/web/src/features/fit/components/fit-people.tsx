import { useState } from 'react';
import { SitterDot } from '@/components/sitter-dot.tsx';
import { verdictTone } from '@/components/verdict.tsx';
import { classNames } from '@/components/class-names.ts';
import { checkName } from '../amounts.ts';
import { useFitView } from '../fit-view.ts';
import { CellSlip } from './cell-slip.tsx';
import { CellContent } from './fit-cell.tsx';

const SEVERITY = { wontFit: 0, notKnown: 1, tight: 2, fits: 3 } as const;

/** The sheet on a phone: people as sections, trouble first, what fits folded away. */
export function FitPeople() {
  const { sheet, ruleBook, colourOf, openCellId, open } = useFitView();
  const [unfolded, setUnfolded] = useState<ReadonlySet<string>>(new Set());
  const rows = [...sheet.rows].sort((a, b) => SEVERITY[a.worst] - SEVERITY[b.worst]);
  return (
    <div className="grid gap-6">
      {rows.map((row) => {
        const judged = row.cells.filter(({ outcome }) => outcome.kind === 'verdict');
        const fitting = judged.filter(
          ({ outcome }) => outcome.kind === 'verdict' && outcome.verdict === 'fits',
        );
        const shown = unfolded.has(row.placeId) ? judged : judged.filter((cell) => !fitting.includes(cell));
        return (
          <section key={row.placeId} aria-label={row.name}>
            <h3 className="ruled flex items-center gap-2 pt-2 font-semibold">
              <SitterDot colour={colourOf(row.sitterId)} />
              <span className={classNames('flex-1', verdictTone(row.worst))}>
                <span className="text-ink">{row.name}</span>
              </span>
              <span className="text-sm font-normal text-ink-2">
                {row.mark}, place {row.place}
              </span>
            </h3>
            <ul>
              {shown.map((cell) => (
                <li key={cell.id} className="border-b border-rule">
                  <button
                    type="button"
                    className="grid min-h-12 w-full grid-cols-2 items-center text-left"
                    aria-expanded={openCellId === cell.id}
                    onClick={() => open(openCellId === cell.id ? null : cell.id)}
                  >
                    <span>{checkName(ruleBook, cell)}</span>
                    <CellContent cell={cell} />
                  </button>
                  {openCellId === cell.id && <CellSlip cell={cell} sitterName={row.name} />}
                </li>
              ))}
            </ul>
            {fitting.length > 0 && !unfolded.has(row.placeId) && (
              <button
                type="button"
                className="link min-h-11 text-sm"
                onClick={() => setUnfolded(new Set([...unfolded, row.placeId]))}
              >
                {fitting.length} {fitting.length === 1 ? 'check fits' : 'checks fit'}
              </button>
            )}
          </section>
        );
      })}
    </div>
  );
}

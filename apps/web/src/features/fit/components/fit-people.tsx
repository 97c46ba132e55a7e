import type { FitCell } from '@settlewright/anthropometry';
import { useState, type ReactNode } from 'react';
import { Measure } from '@/components/measure.tsx';
import { SitterDot } from '@/components/sitter-dot.tsx';
import { checkName } from '../amounts.ts';
import { troubleFirst } from '../columns.ts';
import { useFitView } from '../fit-view.ts';
import { CellSlip } from './cell-slip.tsx';
import { CellContent } from './fit-cell.tsx';

type ListedCell = FitCell & { readAs?: string };

const fits = ({ outcome }: FitCell) => outcome.kind === 'verdict' && outcome.verdict === 'fits';

interface SectionProps {
  name: string;
  /** Who it is in the sentence of a slip. */
  about: string;
  heading: ReactNode;
  place: string;
  cells: readonly ListedCell[];
}

/** One person: trouble in view, what fits folded away. */
function PersonSection({ name, about, heading, place, cells }: SectionProps) {
  const { ruleBook, openCellId, open } = useFitView();
  const [unfolded, setUnfolded] = useState(false);
  const judged = cells.filter(({ outcome }) => outcome.kind === 'verdict');
  const fitting = judged.filter(fits).length;
  const shown = unfolded ? judged : judged.filter((cell) => !fits(cell));
  return (
    <section aria-label={name}>
      <h2 className="ruled flex flex-wrap items-center gap-x-2 border-b border-b-rule py-2 font-semibold">
        {heading}
        <span className="ml-auto text-sm font-normal text-ink-2">{place}</span>
      </h2>
      <ul>
        {shown.map((cell) => (
          <li key={cell.id} className="border-b border-rule">
            <button
              type="button"
              className="grid min-h-12 w-full grid-cols-[1fr_9.5rem] items-center gap-2 py-1 text-left"
              aria-expanded={openCellId === cell.id}
              onClick={() => open(openCellId === cell.id ? null : cell.id)}
            >
              <span>{checkName(ruleBook, cell)}</span>
              <CellContent cell={cell} readAs={cell.readAs} />
            </button>
            {openCellId === cell.id && <CellSlip cell={cell} sitterName={about} />}
          </li>
        ))}
      </ul>
      {fitting > 0 && (
        <p className="grid grid-cols-[1fr_9.5rem] items-center gap-2">
          <span className="text-ink-2">
            {fitting} {fitting === 1 ? 'check fits' : 'checks fit'}
          </span>
          <button
            type="button"
            aria-expanded={unfolded}
            className="link min-h-11 justify-self-start"
            onClick={() => setUnfolded(!unfolded)}
          >
            {unfolded ? 'Hide' : 'Show'}
            <span className="sr-only"> what fits {name}</span>
          </button>
        </p>
      )}
    </section>
  );
}

/** The sheet on a phone: people as sections, those in trouble first. */
export function FitPeople({ showPublic = false }: { showPublic?: boolean }) {
  const { sheet, colourOf, aside } = useFitView();
  const publicCells = showPublic ? sheet.publicRow.cells : [];
  return (
    <div className="grid gap-6">
      {troubleFirst(sheet.rows).map((row) => (
        <PersonSection
          key={row.placeId}
          name={row.name}
          about={row.name}
          place={`${row.mark}, place ${row.place}`}
          cells={row.cells}
          heading={
            <>
              <SitterDot colour={colourOf(row.sitterId)} />
              <span>{row.name}</span>
              <span className="text-sm font-normal text-ink-2">
                <Measure text={aside(row.sitterId)} />
              </span>
            </>
          }
        />
      ))}
      {publicCells.length > 0 && (
        <PersonSection
          name="The public"
          about="somebody of the public"
          place="any place"
          cells={publicCells}
          heading={<span>The public</span>}
        />
      )}
    </div>
  );
}

import type { FitCell } from '@settlewright/anthropometry';
import { useEffect, useRef } from 'react';
import { useFitView } from '../fit-view.ts';
import { CellSlip } from './cell-slip.tsx';

interface SlipRowProps {
  cell: FitCell;
  /** Who the row is about, as the slip's sentence names them. */
  about: string;
  name: string;
  span: number;
}

/** The opened slip under its row, as wide as what is in view whatever the table's own width. */
export function SlipRow({ cell, about, name, span }: SlipRowProps) {
  const { ruleBook } = useFitView();
  const section = useRef<HTMLElement>(null);
  useEffect(() => {
    section.current?.scrollIntoView({ block: 'nearest' });
  }, [cell.id]);
  return (
    <tr>
      <td colSpan={span} className="p-0">
        <section
          ref={section}
          aria-label={`${name}, ${ruleBook.rule(cell.ruleId).columnName.toLowerCase()}`}
          className="sticky left-0 z-[6] w-[100cqi] scroll-mt-24"
        >
          <CellSlip cell={cell} sitterName={about} />
        </section>
      </td>
    </tr>
  );
}

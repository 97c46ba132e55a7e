import type { FitSheet, Verdict } from '@settlewright/anthropometry';
import { useEffect, useState } from 'react';

const SHOWN_FOR_MS = 2000;

function verdictsOf(sheet: FitSheet): Map<string, Verdict> {
  return new Map(
    sheet.rows.flatMap((row) =>
      row.cells.flatMap((cell): [string, Verdict][] =>
        cell.outcome.kind === 'verdict' ? [[cell.id, cell.outcome.verdict]] : [],
      ),
    ),
  );
}

/** Cells whose verdict was turned by the last change, for two seconds. */
export function useTurnedCells(sheet: FitSheet): ReadonlySet<string> {
  const [seen, setSeen] = useState(sheet);
  const [turned, setTurned] = useState<ReadonlySet<string>>(new Set());
  if (seen !== sheet) {
    setSeen(sheet);
    const before = verdictsOf(seen);
    const changed = [...verdictsOf(sheet)].filter(([id, verdict]) => {
      const old = before.get(id);
      return old !== undefined && old !== verdict;
    });
    if (changed.length > 0) setTurned(new Set(changed.map(([id]) => id)));
  }
  useEffect(() => {
    if (turned.size === 0) return;
    const timer = setTimeout(() => setTurned(new Set()), SHOWN_FOR_MS);
    return () => clearTimeout(timer);
  }, [turned]);
  return turned;
}

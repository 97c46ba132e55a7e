import type { FitCell } from '@settlewright/anthropometry';
import type { Fix } from '@settlewright/geometry';
import { useEffect, useRef, useState } from 'react';
import { useFitView } from './fit-view.ts';

/** The slip is painted first; while numbers are typed, the sum waits for a pause. */
const FIRST_WAIT_MS = 30;
const NEXT_WAIT_MS = 400;

/** A cell belongs to one sheet and thus to one state of the set, so what would change it stays the same. */
const known = new WeakMap<FitCell, Fix[]>();

/** What would change a cell; `undefined` while it is worked out, which runs the real check many times. */
export function useFixes(cell: FitCell): Fix[] | undefined {
  const { fixesFor } = useFitView();
  const [, setDone] = useState<FitCell>();
  const asked = useRef(fixesFor);
  const wait = useRef(FIRST_WAIT_MS);
  useEffect(() => {
    asked.current = fixesFor;
  }, [fixesFor]);
  useEffect(() => {
    if (known.has(cell)) return;
    const timer = setTimeout(() => {
      known.set(cell, asked.current?.(cell) ?? []);
      wait.current = NEXT_WAIT_MS;
      setDone(cell);
    }, wait.current);
    return () => clearTimeout(timer);
  }, [cell]);
  return known.get(cell);
}

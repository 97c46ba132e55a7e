import type { SetDocument } from '../room/document.ts';
import type { Handle } from './handle.ts';
import { boardValues, faceLines, type SnapLine } from './snap-lines.ts';

/** What a pulled number comes to, and why. */
export interface SnappedPull {
  value: number;
  /** Words such as "end of B2", "9 whole boards"; left out for a plain step. */
  snappedTo?: string;
  /** Set where the number can go no further. */
  limit?: 'most' | 'least';
}

/**
 * The number a pull comes to: in line with another piece, on a board joint, or else a whole step, within its limits.
 *
 * @param document - the set as it was before the pull
 * @param handle - the handle as it was before the pull
 * @param wanted - the number under the pointer, millimetres or degrees
 * @param step - distance of two neighbouring numbers, in the same unit, > 0
 * @param within - how near a line has to be to be taken; 0 takes whole steps alone
 * @returns the number to use
 */
export function snapPull(
  document: SetDocument,
  handle: Handle,
  wanted: number,
  { step, within }: { step: number; within: number },
): SnappedPull {
  const { min, max } = handle;
  if (wanted >= max) return { value: max, limit: 'most' };
  if (wanted <= min) return { value: min, limit: 'least' };
  const near = (lines: readonly SnapLine[]) =>
    lines
      .filter(({ value }) => value >= min && value <= max && Math.abs(value - wanted) <= within)
      .sort((a, b) => Math.abs(a.value - wanted) - Math.abs(b.value - wanted))[0];
  const line =
    within > 0
      ? (near(faceLines(document, handle)) ?? near(boardValues(document, handle, wanted)))
      : undefined;
  if (line) return { value: line.value, snappedTo: line.words };
  return { value: Math.min(max, Math.max(min, Math.round(wanted / step) * step)) };
}

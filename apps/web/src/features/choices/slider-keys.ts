import type { Stretch } from '@settlewright/geometry';
import type { TriedValues } from './tried-values.ts';

/** An inch, two degrees, twenty newtons. */
const PAGE = { mm: 25.4, deg: 2, N: 20 } as const;

/**
 * Where a key takes the plumb line.
 *
 * @param band - what all have in common; Home and End go to its ends, else to those of the tape
 * @returns the value; `undefined` for a key that moves nothing
 */
export function keyMoves(
  key: string,
  value: number,
  tried: TriedValues,
  band: Stretch | undefined,
): number | undefined {
  const { step, dimension, snap } = tried;
  const page = PAGE[dimension.unit];
  const near = step * 1e-3;
  switch (key) {
    case 'ArrowLeft':
    case 'ArrowDown':
      return snap((Math.ceil((value - near) / step) - 1) * step);
    case 'ArrowRight':
    case 'ArrowUp':
      return snap((Math.floor((value + near) / step) + 1) * step);
    case 'PageDown':
      return snap(value - page);
    case 'PageUp':
      return snap(value + page);
    case 'Home':
      return snap(band ? Math.ceil(band.from / step - 1e-3) * step : dimension.min);
    case 'End':
      return snap(band ? Math.floor(band.to / step + 1e-3) * step : dimension.max);
    default:
      return undefined;
  }
}

const FOOT_MM = 304.8;

export interface SectionRange {
  min: number;
  max: number;
  step: number;
}

/**
 * Where a key takes the cut.
 *
 * @returns millimetres in the room, within the range; `undefined` for a key that moves nothing
 */
export function keyMovesCut(key: string, atMm: number, { min, max, step }: SectionRange): number | undefined {
  const within = (mm: number) => Math.min(max, Math.max(min, mm));
  switch (key) {
    case 'ArrowLeft':
    case 'ArrowDown':
      return within(atMm - step);
    case 'ArrowRight':
    case 'ArrowUp':
      return within(atMm + step);
    case 'PageDown':
      return within(atMm - FOOT_MM);
    case 'PageUp':
      return within(atMm + FOOT_MM);
    case 'Home':
      return min;
    case 'End':
      return max;
    default:
      return undefined;
  }
}

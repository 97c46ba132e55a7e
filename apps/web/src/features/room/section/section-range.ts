import { lengthStep, type LengthStyle, type ViewDirection } from '@settlewright/geometry';
import { boundsOf } from '../scene/bounds.ts';
import type { RoomPicture } from '../picture.ts';
import type { SectionRange } from './section-keys.ts';
import { axisOf } from './section-plane.ts';

/** How far a cut goes: through the whole set, in steps of the display unit. */
export function sectionRange(
  { parts }: RoomPicture,
  direction: ViewDirection,
  style: LengthStyle,
): SectionRange {
  const axis = axisOf(direction);
  const { min, max } = boundsOf(parts) ?? { min: [-1000, 0, -1000], max: [1000, 1000, 1000] };
  const step = lengthStep(style);
  return {
    min: Math.floor(Math.min(min[axis], max[axis]) / step) * step,
    max: Math.ceil(max[axis] / step) * step,
    step,
  };
}

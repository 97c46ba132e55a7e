import { formatLength } from '../units/format-length.ts';
import type { LengthStyle } from '../units/length-style.ts';
import type { CushionSpec } from './cushion-spec.ts';

/**
 * What an order says of a curved back, as far as either size is asked.
 *
 * @param curve - apex over the pressed seat and how far the back gives way below it, millimetres; 0 where not asked
 * @param style - units in which lengths are shown
 * @returns words such as "fullest 7″ over the pressed seat; gives way 1″ for the pelvis below it"
 */
export function curveWords(
  { apexMm, recessMm }: NonNullable<CushionSpec['curve']>,
  style: LengthStyle,
): string {
  const show = (mm: number) => formatLength(mm, { ...style, feet: false });
  const apex = apexMm > 0 ? [`fullest ${show(apexMm)} over the pressed seat`] : [];
  const recess =
    recessMm > 0 ? [`gives way ${show(recessMm)} for the pelvis${apexMm > 0 ? ' below it' : ''}`] : [];
  return [...apex, ...recess].join('; ');
}

import { formatLength } from '../units/format-length.ts';
import type { LengthStyle } from '../units/length-style.ts';
import type { SetView, ViewDirection } from './set-view.ts';

const FROM: Record<ViewDirection, string> = {
  above: 'Plan',
  front: 'From the front',
  rear: 'From the rear',
  left: 'From the left',
  right: 'From the right',
};

/**
 * The title of a view.
 *
 * @param view - from where, cut where
 * @param style - how lengths are written
 * @returns words such as "Plan, cut 48″ above the floor"
 */
export function viewWords({ direction, sectionMm }: SetView, style: LengthStyle): string {
  if (sectionMm === undefined) return FROM[direction];
  const at = formatLength(sectionMm, { ...style, feet: true });
  if (direction === 'above') return `Plan, cut ${at} above the floor`;
  const words = FROM[direction];
  return `Section ${words.charAt(0).toLowerCase()}${words.slice(1)}, cut at ${at}`;
}

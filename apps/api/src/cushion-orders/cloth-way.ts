import {
  DIRECTION_WORDS,
  napWords,
  type OrderCover,
  type OrderModel,
  type ScheduleRow,
} from '@settlewright/geometry';
import type { ClothWay } from '../paper/plan-place';

/** The pile on the page: a cushion is drawn with its back edge up, so the sitter's left is at the right. */
const NAP: Record<OrderCover['nap'], ClothWay['nap']> = {
  none: 'none',
  'to-the-front': 'down',
  'to-the-back': 'up',
  'to-the-left': 'right',
  'to-the-right': 'left',
};

/** How the cloth of the faces lies on cushions that are made alike. */
export function clothWay(
  { marks, covers, spec }: ScheduleRow,
  { cloths }: OrderModel,
  assumed: readonly string[],
): ClothWay | null {
  const own = cloths.find(
    ({ cover, marks: covered }) =>
      covers.includes(cover.name) &&
      covered.includes(marks[0] ?? '') &&
      (cover.parts?.includes('faces') ?? true),
  );
  if (!own || assumed.includes(own.cover.name)) {
    return { direction: 'either', nap: 'none', words: 'cloth direction not said: ask before cutting' };
  }
  const { direction, nap } = own.cover;
  const words = [
    `cloth ${DIRECTION_WORDS[direction]}`,
    nap === 'none' ? '' : napWords(nap, spec.kind),
  ].filter(Boolean);
  return { direction, nap: NAP[nap], words: words.join(', ') };
}

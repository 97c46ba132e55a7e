import {
  footprint,
  type LengthStyle,
  type SetDocument,
  type SetView,
  type ViewDirection,
} from '@settlewright/geometry';

export const VIEW_CHOICES: readonly { value: ViewDirection; words: string }[] = [
  { value: 'above', words: 'Plan, from above' },
  { value: 'front', words: 'From the front' },
  { value: 'rear', words: 'From the rear' },
  { value: 'left', words: 'From the left' },
  { value: 'right', words: 'From the right' },
];

/** What the place of a cut is measured from. */
export const CUT_WORDS: Record<ViewDirection, string> = {
  above: 'Height of the cut above the floor',
  front: 'Place of the cut, from the middle of the room to the front',
  rear: 'Place of the cut, from the middle of the room to the front',
  left: 'Place of the cut, from the middle of the room to the right',
  right: 'Place of the cut, from the middle of the room to the right',
};

const EYE_OF_PLAN_MM = 1219.2;

/** Where a set is cut when nothing was said: a plan at four feet, an elevation through the middle of its pieces. */
export function usualCut(document: SetDocument, direction: ViewDirection): number {
  if (direction === 'above') return EYE_OF_PLAN_MM;
  const axis = direction === 'front' || direction === 'rear' ? 1 : 0;
  const pieces = document.pieces.filter(({ kind }) => kind !== 'bulkhead' && kind !== 'sill');
  const places = pieces.flatMap((piece) => footprint(piece).corners.map((corner) => corner[axis]));
  if (places.length === 0) return 0;
  return Math.round((Math.min(...places) + Math.max(...places)) / 2);
}

/** A scale to start from: one that shows a room on a sheet or two. */
export const usualScale = (system: LengthStyle['system']): number => (system === 'millimetres' ? 20 : 24);

/** "plan", "front section": how a view is called in the name of its file. */
export function viewName({ direction, sectionMm }: Pick<SetView, 'direction' | 'sectionMm'>): string {
  const from = direction === 'above' ? 'plan' : direction;
  return sectionMm === undefined ? from : `${from} section`;
}

/** The name of a file: the set and what is shown of it, nothing that a disk would refuse. */
export function fileName(words: readonly string[], ending: string): string {
  const plain = words
    .join(' ')
    .normalize('NFKD')
    .replace(/[^\p{L}\p{N} -]/gu, '')
    .trim()
    .replace(/\s+/g, '-')
    .toLowerCase();
  return `${plain || 'drawing'}.${ending}`;
}

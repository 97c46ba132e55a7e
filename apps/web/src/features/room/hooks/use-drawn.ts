import { useMemo } from 'react';
import { drawnPicture, type DrawnPicture } from '../drawn-picture.ts';
import type { RoomPicture } from '../picture.ts';
import { drawnDocument, useRoom } from '../store.ts';

/**
 * The set as the hand has it, over what was counted last. The drawing may hear of a hand that rests before the page has
 * counted: until then it stays where the hand left it.
 */
export function useDrawn(picture: RoomPicture): DrawnPicture {
  const document = useRoom(drawnDocument);
  return useMemo(() => drawnPicture(document, picture), [document, picture]);
}

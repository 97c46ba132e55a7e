import { useMemo } from 'react';
import { carriedIn } from '../drawn-picture.ts';
import type { RoomPicture, SeatedBody } from '../picture.ts';
import { useRoom } from '../store.ts';

/** Without whoever is carried along with a piece: their names would stay behind. */
export function useStill(bodies: readonly SeatedBody[], picture: RoomPicture): readonly SeatedBody[] {
  const carried = useRoom(({ moving }) => {
    const found = moving && carriedIn(moving, picture.document);
    return found ? [...found.before.keys()].join(' ') : '';
  });
  return useMemo(() => {
    const ids = new Set(carried.split(' '));
    return bodies.filter(({ pieceId }) => !ids.has(pieceId));
  }, [carried, bodies]);
}

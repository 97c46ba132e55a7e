import { lazy, useMemo } from 'react';
import { carriedIn, drawnPicture } from '../drawn-picture.ts';
import type { RoomPicture, SeatedBody } from '../picture.ts';
import type { SceneProps } from '../scene/scene-canvas.tsx';
import { useRoom } from '../store.ts';

const SceneCanvas = lazy(() => import('../scene/scene-canvas.tsx'));

/** The picture, and what moves as the hand has it: the one part of the page that follows every frame. */
export function DrawnScene({ picture, ...props }: SceneProps) {
  const moving = useRoom((state) => state.moving);
  const drawn = useMemo(() => (moving ? drawnPicture(moving, picture) : picture), [moving, picture]);
  return <SceneCanvas {...props} picture={drawn} />;
}

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

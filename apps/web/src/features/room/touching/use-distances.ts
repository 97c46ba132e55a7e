import type { SitterDistances } from '@settlewright/geometry';
import { useEffect, useState } from 'react';
import { createAsker, faultWords } from '@/lib/ask-worker.ts';
import type { RoomPicture } from '../picture.ts';
import type { DistancesQuestion } from './distances.worker.ts';

/** After the last change by this long, so that nothing is measured while something is dragged. */
const SETTLE_MS = 150;

const ask = createAsker(
  () => new Worker(new URL('./distances.worker.ts', import.meta.url), { type: 'module', name: 'room-round' }),
  'The measuring stopped.',
);

interface Distances {
  /** Of this very picture; undefined while it is measured. */
  distances: readonly SitterDistances[] | undefined;
  fault: string | undefined;
}

/** Room round every sitter of a picture, found by a worker when the hand rests. */
export function useDistances(picture: RoomPicture): Distances {
  const [answer, setAnswer] = useState<{ to: RoomPicture; found?: SitterDistances[]; fault?: string }>();
  useEffect(() => {
    let wanted = true;
    const timer = setTimeout(() => {
      const { parts } = picture;
      const bodies = picture.bodies.map(({ placeId, pieceId, pose }) => {
        const { means, stance, placement, segments } = pose;
        return { placeId, pieceId, pose: { means, stance, placement, segments } };
      });
      ask<SitterDistances[]>((id): DistancesQuestion => ({ id, bodies, parts })).then(
        (found) => wanted && setAnswer({ to: picture, found }),
        (fault: unknown) => wanted && setAnswer({ to: picture, fault: faultWords(fault) }),
      );
    }, SETTLE_MS);
    return () => {
      wanted = false;
      clearTimeout(timer);
    };
  }, [picture]);
  const current = answer?.to === picture ? answer : undefined;
  return { distances: current?.found, fault: current?.fault };
}

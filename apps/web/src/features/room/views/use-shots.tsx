import { useCallback, useRef, useState, type ReactNode } from 'react';
import type { RoomPicture } from '../picture.ts';
import { ViewShot, type Shot } from './view-shot.tsx';

const PATIENCE_MS = 120_000;

interface Job extends Shot {
  number: number;
  taken: (picture: HTMLCanvasElement | null) => void;
}

/** Takes pictures of named views one after another; `stage` has to stand somewhere on the page meanwhile. */
export function useShots(picture: RoomPicture): {
  shoot: (shot: Shot) => Promise<HTMLCanvasElement>;
  stage: ReactNode;
} {
  const [job, setJob] = useState<Job | null>(null);
  const count = useRef(0);
  const shoot = useCallback(
    (shot: Shot) =>
      new Promise<HTMLCanvasElement>((resolve, reject) => {
        const refuse = () => reject(new Error(`“${shot.view.name}” could not be drawn.`));
        const timer = setTimeout(() => {
          setJob(null);
          refuse();
        }, PATIENCE_MS);
        count.current += 1;
        setJob({
          ...shot,
          number: count.current,
          taken: (canvas) => {
            clearTimeout(timer);
            setJob(null);
            if (canvas) resolve(canvas);
            else refuse();
          },
        });
      }),
    [],
  );
  return {
    shoot,
    stage: job && <ViewShot key={job.number} {...job} picture={picture} onTaken={job.taken} />,
  };
}

import type { WayIn } from '@settlewright/geometry';
import { useEffect, useState } from 'react';

type Pose = WayIn['steps'][number]['poses'][number];

/** A calm walk. */
const MM_A_SECOND = 700;

/** Poses with the seconds at which each is reached; turning on the spot takes time as well. */
function timed(poses: readonly Pose[]): number[] {
  let at = 0;
  return poses.map((pose, i) => {
    const last = poses[i - 1];
    if (last) {
      const turned = Math.abs(pose.headingRad - last.headingRad);
      at += (Math.hypot(pose.xMm - last.xMm, pose.zMm - last.zMm) + 150 * turned) / MM_A_SECOND;
    }
    return at;
  });
}

export interface Walk {
  /** Where the walker is; undefined while nobody walks. */
  pose: Pose | undefined;
  start: () => void;
  stop: () => void;
}

/** Somebody who walks along a way when asked to, and stops at the seat or when told. */
export function useWalk(poses: readonly Pose[]): Walk {
  const [walk, setWalk] = useState<{ of: readonly Pose[]; index: number }>();
  const walking = walk?.of === poses;
  useEffect(() => {
    if (!walking) return undefined;
    const times = timed(poses);
    const began = performance.now();
    const step = (now: number) => {
      const index = times.findIndex((at) => at > (now - began) / 1000);
      setWalk(index < 0 ? undefined : { of: poses, index });
      if (index >= 0) request = requestAnimationFrame(step);
    };
    let request = requestAnimationFrame(step);
    return () => cancelAnimationFrame(request);
  }, [walking, poses]);
  return {
    pose: walking ? poses[walk.index] : undefined,
    start: () => setWalk({ of: poses, index: 0 }),
    stop: () => setWalk(undefined),
  };
}

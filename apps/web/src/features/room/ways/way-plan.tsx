import {
  bandOutline,
  planOf,
  standing,
  type FloorShape,
  type SetDocument,
  type WayIn,
} from '@settlewright/geometry';
import { useMemo } from 'react';
import { commonScale, DrawingSvg } from '@/components/drawing-svg.tsx';
import type { NamedComer } from './use-ways-in.ts';

type Pose = WayIn['steps'][number]['poses'][number];

const ROOM_PX = { width: 240, height: 300 };
const AROUND_MM = 850;

const list = (points: readonly (readonly [number, number])[]) =>
  points.map(([x, z]) => `${x},${z}`).join(' ');
const spots = (poses: readonly Pose[]) => list(poses.map(({ xMm, zMm }) => [xMm, zMm] as const));

interface Props {
  document: SetDocument;
  way: WayIn | undefined;
  comer: NamedComer | undefined;
  heightsMm: readonly [number, number];
  floor: readonly FloorShape[];
  walker: Pose | undefined;
}

/** The plan with one way in: the line that is walked, the body where it is tightest, floor for a wheelchair dashed. */
export function WayPlan({ document, way, comer, heightsMm, floor, walker }: Props) {
  // Made once for a document: while somebody walks, the plan is shown anew with every step.
  const drawing = useMemo(() => planOf(document, { marks: 'none', marginMm: AROUND_MM }), [document]);
  const bands = comer ? standing(comer, heightsMm) : [];
  const tight = way?.tightest;
  const body = (pose: Pose) =>
    bands.map((band) => <polygon key={band.name} points={list(bandOutline(band, pose))} />);
  const pen = { fill: 'none', vectorEffect: 'non-scaling-stroke' as const };
  return (
    <DrawingSvg
      drawing={drawing}
      pxPerMm={commonScale([drawing], ROOM_PX)}
      className="tape max-w-full h-auto"
    >
      {floor.map(({ kind, outline }, n) => (
        <polygon
          key={`${kind}-${n}`}
          points={list(outline)}
          stroke="var(--color-ink-2)"
          strokeDasharray="5 3"
          {...pen}
        />
      ))}
      {way?.steps.map(({ move, poses }, n) => (
        <polyline
          key={n}
          points={spots(poses)}
          stroke="var(--color-chalk)"
          strokeWidth={2}
          strokeDasharray={move === 'walk' ? undefined : '6 3'}
          {...pen}
        />
      ))}
      {tight && (
        <g stroke={way.passes ? 'var(--color-ink)' : 'var(--color-wont)'} strokeWidth={1.5} {...pen}>
          {tight.move === 'stand' && body(tight.at)}
          {tight.between.map(({ at }, n) => (
            <polyline
              key={n}
              points={list([at, [tight.at.xMm, tight.at.zMm]])}
              strokeWidth={3}
              vectorEffect="non-scaling-stroke"
            />
          ))}
        </g>
      )}
      {walker && (
        <g
          fill="var(--color-chalk)"
          fillOpacity={0.35}
          stroke="var(--color-ink)"
          vectorEffect="non-scaling-stroke"
        >
          {body(walker)}
        </g>
      )}
    </DrawingSvg>
  );
}

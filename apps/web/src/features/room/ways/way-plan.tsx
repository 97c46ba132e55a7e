import {
  bandOutline,
  planOf,
  standing,
  type FloorShape,
  type SetDocument,
  type Spot,
  type WayIn,
} from '@settlewright/geometry';
import { useMemo, type MouseEvent } from 'react';
import { commonScale, DrawingSvg } from '@/components/drawing-svg.tsx';
import type { NamedComer } from './use-ways-in.ts';

type Pose = WayIn['steps'][number]['poses'][number];

const ROOM_PX = { width: 240, height: 300 };
const AROUND_MM = 850;
/** A press is no finer than this. */
const ENTRANCE_STEP_MM = 10;
/** What the drawing keeps free at its edge. */
const EDGE_PX = 2;

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
  /** Left out where the entrance cannot be set. */
  onEntrance?: (spot: Spot) => void;
}

/** The plan with one way in: the line that is walked, the body where it is tightest, floor for a wheelchair dashed. */
export function WayPlan({ document, way, comer, heightsMm, floor, walker, onEntrance }: Props) {
  // Made once for a document: while somebody walks, the plan is shown anew with every step.
  const drawing = useMemo(() => planOf(document, { marks: 'none', marginMm: AROUND_MM }), [document]);
  const bands = comer ? standing(comer, heightsMm) : [];
  const tight = way?.tightest;
  const body = (pose: Pose) =>
    bands.map((band) => <polygon key={band.name} points={list(bandOutline(band, pose))} />);
  const pen = { fill: 'none', vectorEffect: 'non-scaling-stroke' as const };
  const pxPerMm = commonScale([drawing], ROOM_PX);
  const { entrance } = document.asked;
  const press = (event: MouseEvent<HTMLElement>) => {
    const box = event.currentTarget.querySelector('svg')?.getBoundingClientRect();
    if (!box || !onEntrance) return;
    const pad = EDGE_PX / pxPerMm;
    const { x, y, width, height } = drawing.boundsMm;
    const toStep = (mm: number) => Math.round(mm / ENTRANCE_STEP_MM) * ENTRANCE_STEP_MM;
    onEntrance({
      xMm: toStep(x - pad + ((event.clientX - box.left) / box.width) * (width + 2 * pad)),
      zMm: toStep(y - pad + ((event.clientY - box.top) / box.height) * (height + 2 * pad)),
    });
  };
  const plan = (
    <DrawingSvg drawing={drawing} pxPerMm={pxPerMm} className="tape max-w-full h-auto">
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
      {entrance && (
        <g stroke="var(--color-chalk)" data-entrance="" {...pen}>
          <circle cx={entrance.xMm} cy={entrance.zMm} r={90} strokeWidth={2} {...pen} />
          <path d={`M${entrance.xMm - 150} ${entrance.zMm}h300m-150 -150v300`} strokeWidth={1.5} {...pen} />
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
  if (!onEntrance) return plan;
  return (
    // Decoration for the keyboard: the fields below say and change the same.
    <div role="presentation" data-ways-plan="" className="cursor-crosshair" onClick={press}>
      {plan}
    </div>
  );
}

import { lengthStep } from '@settlewright/geometry';
import { useCallback, useEffect, useLayoutEffect, useRef, type PointerEvent } from 'react';
import type { RoomPicture } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import { boundsOf } from '../scene/bounds.ts';
import type { ViewController } from '../scene/view-controller.ts';
import { pixelsPerMm, project } from '../scene/view-frame.ts';
import { axisOf } from './section-plane.ts';
import { sectionRange } from './section-range.ts';
import { cutAt, sectionPlaneNow, useSectionPlane } from './section-store.ts';

const BEYOND_MM = 150;
const EDGE_PX = 18;
const PROBE_MM = 100;
/** A plane that is seen nearly square on cannot be pushed on the screen. */
const LEAST_SHARE = 0.25;

interface Props {
  picture: RoomPicture;
  controller: ViewController;
}

/** The edge of the cut in the drawing, and what a hand takes hold of; the slider does the same by key. */
export function SectionOnScene({ picture, controller }: Props) {
  const { path, style } = useSurroundings();
  const plane = useSectionPlane(path.setId);
  const line = useRef<SVGPathElement>(null);
  const handle = useRef<HTMLDivElement>(null);
  /** Pixels on the screen for a millimetre along the axis, across and down. */
  const run = useRef<readonly [number, number]>([0, 0]);
  const held = useRef<{ x: number; y: number; atMm: number } | null>(null);

  const layOut = useCallback(() => {
    const frame = controller.frame();
    const bounds = boundsOf(picture.parts);
    if (!frame || !plane || !bounds || !line.current || !handle.current) return;
    const viewport = controller.viewport();
    const axis = axisOf(plane.direction);
    const [u, v] = ([0, 1, 2] as const).filter((n) => n !== axis) as [0 | 1 | 2, 0 | 1 | 2];
    const at = (a: number, b: number, along = 0) => {
      const point: [number, number, number] = [0, 0, 0];
      point[axis] = plane.atMm + along;
      point[u] = a;
      point[v] = b;
      return project(frame, viewport, point);
    };
    const reach = (n: 0 | 1 | 2): [number, number] => [
      n === 1 ? 0 : bounds.min[n] - BEYOND_MM,
      bounds.max[n] + BEYOND_MM,
    ];
    const [[u0, u1], [v0, v1]] = [reach(u), reach(v)];
    const spots = (
      [
        [u0, v0],
        [u1, v0],
        [u1, v1],
        [u0, v1],
      ] as const
    ).map(([a, b]) => ({
      ...at(a, b),
      probe: at(a, b, PROBE_MM),
    }));
    const d = spots.map(({ x, y }) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L');
    line.current.setAttribute('d', `M${d}Z`);
    const grip = spots.reduce((best, spot) => (spot.x - spot.y > best.x - best.y ? spot : best));
    run.current = [(grip.probe.x - grip.x) / PROBE_MM, (grip.probe.y - grip.y) / PROBE_MM];
    const [x, y] = [
      Math.min(viewport.width - EDGE_PX, Math.max(EDGE_PX, grip.x)),
      Math.min(viewport.height - EDGE_PX, Math.max(EDGE_PX, grip.y)),
    ];
    handle.current.style.transform = `translate(${x}px, ${y}px) translate(-50%, -50%)`;
    handle.current.hidden = Math.hypot(...run.current) < pixelsPerMm(frame, viewport) * LEAST_SHARE;
  }, [controller, picture, plane]);
  useLayoutEffect(layOut);
  useEffect(() => {
    layOut();
    return controller.subscribe(layOut);
  }, [controller, layOut]);

  if (!plane) return null;

  function drag(event: PointerEvent) {
    const now = sectionPlaneNow(path.setId);
    if (!held.current || !now) return;
    event.stopPropagation();
    const [dx, dy] = run.current;
    const moved =
      ((event.clientX - held.current.x) * dx + (event.clientY - held.current.y) * dy) / (dx * dx + dy * dy);
    const { min, max } = sectionRange(picture, now.direction, style);
    const step = lengthStep(style);
    const atMm = Math.round((held.current.atMm + moved) / step) * step;
    cutAt(path.setId, { ...now, atMm: Math.min(max, Math.max(min, atMm)) });
  }

  const release = (event: PointerEvent) => {
    event.stopPropagation();
    held.current = null;
  };
  return (
    <div className="pointer-events-none absolute inset-0 overflow-hidden" aria-hidden="true">
      <svg className="absolute inset-0 size-full">
        <path ref={line} className="fill-none stroke-ink" strokeWidth="1" />
      </svg>
      <div
        ref={handle}
        data-section-handle
        className="pointer-events-auto absolute top-0 left-0 size-6 cursor-move touch-none rounded-full border-2 border-ink bg-sheet before:absolute before:-inset-2.5"
        onPointerDown={(event) => {
          if (event.button !== 0) return;
          event.stopPropagation();
          event.currentTarget.setPointerCapture(event.pointerId);
          held.current = { x: event.clientX, y: event.clientY, atMm: plane.atMm };
        }}
        onPointerMove={drag}
        onPointerUp={release}
        onPointerCancel={release}
      />
    </div>
  );
}

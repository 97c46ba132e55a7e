import { formatLength, type LengthStyle, type Vec3 } from '@settlewright/geometry';
import { useCallback, useEffect, useLayoutEffect, useRef } from 'react';
import { Measure } from '@/components/measure.tsx';
import type { LabelBoxes } from '../overlay/box.ts';
import type { ViewController } from '../scene/view-controller.ts';
import { project } from '../scene/view-frame.ts';
import { FloorOnScene } from './floor-on-scene.tsx';
import { useShownWay } from './shown-way.ts';

/** Just off the floor, where feet go. */
const FLOOR_MM = 5;

interface Props {
  controller: ViewController;
  /** Where names and flags stand just now. */
  labels: LabelBoxes;
  style: LengthStyle;
}

/** The chosen way in over the drawing: its line on the floor, and a flag where it is tightest. */
export function WayOnScene({ controller, labels, style }: Props) {
  const { way, floor } = useShownWay();
  const line = useRef<SVGPathElement>(null);
  const flag = useRef<HTMLDivElement>(null);
  const layOut = useCallback(() => {
    const frame = controller.frame();
    if (!frame || !way) return;
    const at = (x: number, z: number) => {
      const point: Vec3 = [x, FLOOR_MM, z];
      return project(frame, controller.viewport(), point);
    };
    const points = way.steps.flatMap(({ poses }) => poses).map(({ xMm, zMm }) => at(xMm, zMm));
    line.current?.setAttribute(
      'd',
      points.map(({ x, y }, n) => `${n === 0 ? 'M' : 'L'}${x.toFixed(1)} ${y.toFixed(1)}`).join(''),
    );
    if (!way.tightest) return;
    const { x, y } = at(way.tightest.at.xMm, way.tightest.at.zMm);
    flag.current?.style.setProperty('transform', `translate(${x}px, ${y}px) translate(-50%, -130%)`);
  }, [controller, way]);
  useLayoutEffect(layOut);
  useEffect(() => controller.subscribe(layOut), [controller, layOut]);
  if (!way && floor.length === 0) return null;
  return (
    <div
      aria-hidden="true"
      className="pointer-events-none absolute inset-0 overflow-hidden"
      data-way-in={way ? '' : undefined}
    >
      {floor.length > 0 && <FloorOnScene controller={controller} floor={floor} labels={labels} />}
      <svg className="absolute inset-0 size-full" fill="none">
        <path ref={line} className="stroke-chalk" strokeWidth="2.5" strokeDasharray="7 4" />
      </svg>
      {way?.tightest && (
        <div
          ref={flag}
          className={`absolute top-0 left-0 rounded-sm border bg-sheet px-1.5 text-sm leading-6 whitespace-nowrap ${way.passes ? 'border-ink' : 'border-wont text-wont'}`}
        >
          {way.passes ? 'Tightest ' : 'Stuck '}
          <Measure text={formatLength(way.tightest.widthMm, style)} />
        </div>
      )}
    </div>
  );
}

import type { FloorShape, Vec3 } from '@settlewright/geometry';
import { useCallback, useEffect, useLayoutEffect, useRef } from 'react';
import type { ViewController } from '../scene/view-controller.ts';
import { project } from '../scene/view-frame.ts';
import { FLOOR_WORDS } from './floor-words.ts';

/** Names that would lie on one another are left to the list. */
const NAMED: readonly FloorShape['kind'][] = ['floor', 'approach', 'knee-space', 'turning-circle'];

interface Props {
  controller: ViewController;
  floor: readonly FloorShape[];
}

/** Floor for a wheelchair over the drawing: dashed where it lies, knee space at its height, each with its clause. */
export function FloorOnScene({ controller, floor }: Props) {
  const drawn = useRef<SVGGElement>(null);
  const layOut = useCallback(() => {
    const frame = controller.frame();
    if (!frame || !drawn.current) return;
    floor.forEach(({ outline, heightsMm, kind }, n) => {
      const heightMm = kind === 'knee-space' ? heightsMm[0] : 0;
      const points = outline.map(([x, z]) => {
        const point: Vec3 = [x, heightMm, z];
        return project(frame, controller.viewport(), point);
      });
      const group = drawn.current?.children[n];
      const [polygon, text] = group ? [...group.children] : [];
      polygon?.setAttribute('points', points.map(({ x, y }) => `${x.toFixed(1)},${y.toFixed(1)}`).join(' '));
      const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
      text?.setAttribute('x', mean(points.map(({ x }) => x)).toFixed(1));
      text?.setAttribute('y', mean(points.map(({ y }) => y)).toFixed(1));
    });
  }, [controller, floor]);
  useLayoutEffect(layOut);
  useEffect(() => controller.subscribe(layOut), [controller, layOut]);
  return (
    <svg
      aria-hidden="true"
      data-floor-shapes={floor.length}
      className="absolute inset-0 size-full"
      fill="none"
    >
      <g ref={drawn}>
        {floor.map(({ kind, clause, blockedBy }, n) => (
          <g key={`${kind}-${n}`} className={blockedBy.length > 0 ? 'text-wont' : 'text-ink-2'}>
            <polygon stroke="currentColor" strokeWidth="1.25" strokeDasharray="5 3" />
            {NAMED.includes(kind) && (
              <text
                textAnchor="middle"
                fill="currentColor"
                stroke="var(--color-paper)"
                strokeWidth="3"
                paintOrder="stroke"
                fontSize="11"
              >
                {FLOOR_WORDS[kind]} {clause}
              </text>
            )}
          </g>
        ))}
      </g>
    </svg>
  );
}

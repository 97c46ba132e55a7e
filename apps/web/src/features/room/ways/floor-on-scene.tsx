import type { FloorShape, Vec3 } from '@settlewright/geometry';
import { useCallback, useEffect, useLayoutEffect, useRef } from 'react';
import type { LabelBoxes } from '../overlay/box.ts';
import type { ViewController } from '../scene/view-controller.ts';
import { project } from '../scene/view-frame.ts';
import { FLOOR_WORDS } from './floor-words.ts';
import { clearOfEachOther, type PlacedName } from './floor-names.ts';

/** Kinds that are named in the drawing; the list names all. */
const NAMED: readonly FloorShape['kind'][] = ['floor', 'approach', 'knee-space', 'turning-circle'];

interface Props {
  controller: ViewController;
  floor: readonly FloorShape[];
  /** Where names and flags stand just now. */
  labels: LabelBoxes;
}

/** Floor for a wheelchair over the drawing: dashed where it lies, knee space at its height, each with its clause. */
export function FloorOnScene({ controller, floor, labels }: Props) {
  const drawn = useRef<SVGGElement>(null);
  const layOut = useCallback(() => {
    const frame = controller.frame();
    if (!frame || !drawn.current) return;
    const named: (PlacedName & { text: Element })[] = [];
    floor.forEach(({ outline, heightsMm, kind, blockedBy }, n) => {
      const heightMm = kind === 'knee-space' ? heightsMm[0] : 0;
      const points = outline.map(([x, z]) => {
        const point: Vec3 = [x, heightMm, z];
        return project(frame, controller.viewport(), point);
      });
      const group = drawn.current?.children[n];
      const [polygon, text] = group ? [...group.children] : [];
      polygon?.setAttribute('points', points.map(({ x, y }) => `${x.toFixed(1)},${y.toFixed(1)}`).join(' '));
      const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
      if (!text) return;
      const [x, y] = [mean(points.map((point) => point.x)), mean(points.map((point) => point.y))];
      text.setAttribute('x', x.toFixed(1));
      text.setAttribute('y', y.toFixed(1));
      named.push({ text, x, y, letters: text.textContent.length, first: blockedBy.length > 0 });
    });
    const kept = clearOfEachOther(named, labels.now());
    for (const one of named) one.text.setAttribute('visibility', kept.has(one) ? 'visible' : 'hidden');
  }, [controller, floor, labels]);
  useLayoutEffect(layOut);
  // Anew after each render, as the labels do: names keep clear of where those have just gone.
  useEffect(() => controller.subscribe(layOut));
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

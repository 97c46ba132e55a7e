import {
  CONTACT_MM,
  formatLength,
  type LengthStyle,
  type SitterGap,
  type Vec3,
} from '@settlewright/geometry';
import { useCallback, useEffect, useLayoutEffect, useMemo, useRef } from 'react';
import { classNames } from '@/components/class-names.ts';
import { GapMark } from '@/components/verdict.tsx';
import { Measure } from '@/components/measure.tsx';
import type { ViewController } from '../scene/view-controller.ts';
import { project } from '../scene/view-frame.ts';
import { isBehind, type Cut } from '../scene/views.ts';
import { outlineOf } from './outline.ts';
import { useShownGaps } from './shown-gaps.ts';

const middle = ({ fromMm, toMm }: SitterGap): Vec3 => [
  (fromMm[0] + toMm[0]) / 2,
  (fromMm[1] + toMm[1]) / 2,
  (fromMm[2] + toMm[2]) / 2,
];

interface Props {
  controller: ViewController;
  cut: Cut | undefined;
  style: LengthStyle;
}

/** Over the drawing: a mark and its size where something overlaps, and a tape along the gap that is pointed at. */
export function GapsOnScene({ controller, cut, style }: Props) {
  const shown = useShownGaps();
  const { envelopes } = shown;
  // What was cut away would be marked in the void.
  const overlaps = useMemo(
    () => shown.overlaps.filter((gap) => isBehind(middle(gap), cut)),
    [shown.overlaps, cut],
  );
  const lit = shown.lit && isBehind(middle(shown.lit), cut) ? shown.lit : undefined;
  const layer = useRef<HTMLDivElement>(null);
  const marked = useMemo(
    () => (lit && !overlaps.includes(lit) ? [...overlaps, lit] : overlaps),
    [lit, overlaps],
  );
  const layOut = useCallback(() => {
    const frame = controller.frame();
    const root = layer.current;
    if (!frame || !root) return;
    const at = (point: Vec3) => project(frame, controller.viewport(), point);
    root.querySelectorAll<HTMLElement>('[data-gap]').forEach((flag, n) => {
      const gap = marked[n];
      if (!gap) return;
      const { x, y } = at(middle(gap));
      flag.style.setProperty('transform', `translate(${x}px, ${y}px) translate(-50%, -130%)`);
    });
    const line = root.querySelector('[data-gap-line]');
    if (line && lit) {
      const [from, to] = [at(lit.fromMm), at(lit.toMm)];
      line.setAttribute('d', `M${from.x} ${from.y}L${to.x} ${to.y}`);
    }
    root.querySelectorAll('[data-envelope]').forEach((path, n) => {
      const envelope = envelopes[n];
      if (!envelope) return;
      const balls = envelope.centresMm.map((centre) => {
        const { x, y } = at(centre);
        const up = at([centre[0], centre[1] + envelope.radiusMm, centre[2]]);
        const aside = at([centre[0] + envelope.radiusMm, centre[1], centre[2]]);
        return { x, y, r: Math.max(Math.hypot(up.x - x, up.y - y), Math.hypot(aside.x - x, aside.y - y)) };
      });
      path.setAttribute('d', outlineOf(balls));
    });
  }, [controller, marked, lit, envelopes]);
  useLayoutEffect(layOut);
  useEffect(() => controller.subscribe(layOut), [controller, layOut]);
  if (marked.length === 0 && envelopes.length === 0) return null;
  return (
    <div
      ref={layer}
      aria-hidden="true"
      className="pointer-events-none absolute inset-0 overflow-hidden"
      data-gaps
    >
      <svg className="absolute inset-0 size-full" fill="none">
        {envelopes.map(({ joint, side }) => (
          <path
            key={`${side} ${joint}`}
            data-envelope
            className="fill-chalk/10 stroke-chalk"
            strokeDasharray="5 4"
          />
        ))}
        {lit && (
          <path
            data-gap-line
            className={lit.distanceMm < -CONTACT_MM ? 'stroke-wont' : 'stroke-ink'}
            strokeWidth="3"
          />
        )}
      </svg>
      {marked.map((gap, n) => (
        <GapFlag key={n} gap={gap} lit={gap === lit} style={style} />
      ))}
    </div>
  );
}

function GapFlag({ gap, lit, style }: { gap: SitterGap; lit: boolean; style: LengthStyle }) {
  const inside = gap.distanceMm < -CONTACT_MM;
  const overlapping = lit ? 'border-wont bg-wont text-paper' : 'border-wont bg-sheet text-wont';
  return (
    <div
      data-gap
      className={classNames(
        'absolute top-0 left-0 flex items-center gap-1.5 rounded-sm border-[1.25px] px-1.5 text-[0.84rem] leading-[1.35rem] whitespace-nowrap',
        inside ? overlapping : 'border-ink bg-sheet text-ink',
      )}
    >
      {inside && <GapMark verdict="wontFit" />}
      {Math.abs(gap.distanceMm) <= CONTACT_MM ? (
        'touches'
      ) : (
        <>
          {inside ? 'overlap ' : 'gap '}
          <Measure text={formatLength(Math.abs(gap.distanceMm), style)} />
        </>
      )}
    </div>
  );
}

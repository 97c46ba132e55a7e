import { formatLength, type LengthStyle } from '@settlewright/geometry';
import { useEffect, useState } from 'react';
import { Measure } from '@/components/measure.tsx';
import type { ViewController } from '../scene/view-controller.ts';
import { pixelsPerMm } from '../scene/view-frame.ts';

const LENGTHS = {
  inches: [76.2, 152.4, 304.8, 609.6, 914.4, 1828.8, 3657.6],
  metric: [50, 100, 250, 500, 1000, 2000, 5000],
};

/** A bar of true length for the drawings that are to scale. */
export function ScaleBar({ controller, style }: { controller: ViewController; style: LengthStyle }) {
  const [scale, setScale] = useState(0);
  useEffect(() => {
    const read = () => {
      const frame = controller.frame();
      if (frame) setScale(Number(pixelsPerMm(frame, controller.viewport()).toFixed(4)));
    };
    read();
    return controller.subscribe(read);
  }, [controller]);
  if (scale === 0) return null;
  const lengths = style.system === 'millimetres' ? LENGTHS.metric : LENGTHS.inches;
  const length = lengths.find((mm) => mm * scale > 60) ?? lengths.at(-1) ?? 1000;
  const width = length * scale;
  return (
    <div className="pointer-events-none absolute bottom-2 left-2 flex items-end gap-2 text-xs text-ink-2">
      <svg width={width + 2} height="9" aria-hidden="true" className="tape">
        <path
          d={`M1 1v7h${width}v-7M${1 + width / 2} 4v4`}
          fill="none"
          stroke="currentColor"
          strokeWidth="1.25"
        />
      </svg>
      <Measure text={formatLength(length, { ...style, feet: true })} />
    </div>
  );
}

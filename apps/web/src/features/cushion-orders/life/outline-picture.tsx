import { outlinePoints } from '@settlewright/geometry';
import type { OrderLife } from '@/lib/contract.ts';

type Outlines = NonNullable<OrderLife['changes'][number]['outlines']>;
type Outline = Outlines['before'];

const asCorners = (outline: Outline) =>
  outline.map(({ at: [x = 0, y = 0], radiusMm, edge }) => ({ at: [x, y] as const, radiusMm, edge }));

/** An outline, back edge up, at the scale of the one that it stands beside; its words follow it. */
export function OutlinePicture({ outline, beside }: { outline: Outline; beside: Outlines | undefined }) {
  const points = outlinePoints(asCorners(outline), 1);
  const all = beside ? [...beside.before, ...beside.after] : outline;
  const [xs, ys] = [all.map(({ at }) => at[0] ?? 0), all.map(({ at }) => at[1] ?? 0)];
  const [x0, x1, y0, y1] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const margin = 0.02 * (x1 - x0);
  return (
    <svg
      aria-hidden
      viewBox={`${x0 - margin} ${-y1 - margin} ${x1 - x0 + 2 * margin} ${y1 - y0 + 2 * margin}`}
      className="mb-1 block h-auto w-full max-w-52"
    >
      <polygon
        points={points.map(([x, y]) => `${x},${-y}`).join(' ')}
        fill="var(--color-sheet)"
        stroke="var(--color-ink)"
        strokeWidth={1.3}
        vectorEffect="non-scaling-stroke"
      />
    </svg>
  );
}

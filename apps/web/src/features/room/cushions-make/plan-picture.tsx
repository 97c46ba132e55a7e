import {
  buttonSpots,
  closurePath,
  outlinePoints,
  outlineStretches,
  wearHatch,
  wearMark,
  wearRectangle,
  type CushionSpec,
  type Point2,
} from '@settlewright/geometry';
import { useFormat } from '@/lib/format.ts';

const TEXT_SHARE = 0.034;

/** The plan of a cushion with its closure, buttons, camera sides and the length of every edge. */
export function PlanPicture({ spec }: { spec: CushionSpec }) {
  const format = useFormat();
  const { outline, making, make, cameraSides, finishedMm } = spec;
  const points = outlinePoints(outline, 0.5);
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  const [x0, x1, y0, y1] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const size = Math.max(x1 - x0, 1.6 * (y1 - y0)) * TEXT_SHARE;
  const margin = 3.4 * size;
  const page = ([x, y]: Point2) => `${x},${-y}`;
  const line = { fill: 'none', stroke: 'var(--color-ink)', vectorEffect: 'non-scaling-stroke' } as const;
  const lines = outlineStretches(outline).flatMap((one) => (one.kind === 'line' ? [one] : []));
  const [back, front] = spec.kind === 'seat' ? ['back', 'front'] : ['top', 'bottom'];
  return (
    <svg
      viewBox={`${x0 - margin} ${-y1 - margin} ${x1 - x0 + 2 * margin} ${y1 - y0 + 2 * margin}`}
      className="max-h-80 w-full"
      role="img"
      aria-label={`Plan of ${spec.mark}, ${format.length(finishedMm.widthMm)} by ${format.length(finishedMm.depthMm)}, ${back} edge up`}
    >
      <polygon points={points.map(page).join(' ')} {...line} fill="var(--color-sheet)" strokeWidth={1.3} />
      {(spec.wear ?? []).map((area, i) => {
        const { x0, y1 } = wearRectangle(spec, area);
        return (
          <g key={i}>
            <path
              d={wearHatch(spec, area, 0.5 * size)
                .map((ends) => `M${ends.map(page).join('L')}`)
                .join('')}
              {...line}
              stroke="var(--color-ink-3)"
              strokeWidth={0.8}
            />
            <text x={x0 + 0.4 * size} y={-y1 + 1.1 * size} fontSize={size} fill="var(--color-ink)">
              {wearMark(i)}
            </text>
          </g>
        );
      })}
      {lines.map(
        ({ from, to, edge }, i) =>
          cameraSides.some((side) => side === edge) && (
            <polyline
              key={i}
              points={[from, to].map(page).join(' ')}
              {...line}
              strokeWidth={5}
              strokeDasharray="2 5"
            />
          ),
      )}
      {making && making.closure.edgeMm > 0 && (
        <polyline
          points={closurePath(outline, make.closureEdge, making.closure.wrapMm).map(page).join(' ')}
          {...line}
          strokeWidth={3}
        />
      )}
      {buttonSpots(spec).map(([x, y], i) => (
        <circle key={i} cx={x} cy={-y} r={0.34 * size} {...line} strokeWidth={1} />
      ))}
      {lines.map(({ from, to }, i) => {
        const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
        const out: Point2 = [(to[1] - from[1]) / length, -(to[0] - from[0]) / length];
        const upright = Math.abs(out[0]) > 0.7;
        // In a notch there is no room for two numbers: the upright one of a short edge stands within the cushion.
        const aside = !upright ? 1.4 : length < 3 * size ? -1 : 1;
        const [x, y] = [
          (from[0] + to[0]) / 2 + out[0] * aside * size,
          (from[1] + to[1]) / 2 + out[1] * 1.4 * size,
        ];
        return (
          <text
            key={i}
            x={x}
            y={-y}
            fontSize={size}
            textAnchor="middle"
            dominantBaseline="central"
            fill="var(--color-ink)"
            transform={upright ? `rotate(${out[0] > 0 ? 90 : -90} ${x} ${-y})` : undefined}
          >
            {format.length(length)}
          </text>
        );
      })}
      <text
        x={(x0 + x1) / 2}
        y={-y1 + 1.5 * size}
        fontSize={0.9 * size}
        textAnchor="middle"
        fill="var(--color-ink-2)"
      >
        {back}
      </text>
      <text
        x={(x0 + x1) / 2}
        y={-y0 - 0.9 * size}
        fontSize={0.9 * size}
        textAnchor="middle"
        fill="var(--color-ink-2)"
      >
        {front}, sitter’s left at the right
      </text>
    </svg>
  );
}

import type { Dimension } from '@settlewright/geometry';
import { tapeTicks } from '../board-layout.ts';

/** One side of the map: its dimension's values and name. */
export function MapAxis({
  dimension,
  from,
  to,
  min,
  max,
  at,
  upright = false,
}: {
  dimension: Dimension;
  from: number;
  to: number;
  min: number;
  max: number;
  at: number;
  upright?: boolean;
}) {
  const length = Math.abs(to - from);
  const { upper } = tapeTicks(dimension.unit, {
    left: 0,
    right: length,
    valueAt: (px) => min + (px / length) * (max - min),
  });
  const place = (value: number) => from + ((value - min) / (max - min)) * (to - from);
  const mark = dimension.unit === 'mm' ? '″' : '';
  return (
    <g fontSize={12} fill="var(--color-ink-2)">
      {upper.map(({ value, label }) =>
        label === undefined ? null : upright ? (
          <g key={value}>
            <path d={`M${at} ${place(value)}h-5`} stroke="var(--color-ink)" />
            <text x={at - 8} y={place(value) + 4} textAnchor="end">
              {label}
              {mark}
            </text>
          </g>
        ) : (
          <g key={value}>
            <path d={`M${place(value)} ${at}v5`} stroke="var(--color-ink)" />
            <text x={place(value)} y={at + 18} textAnchor="middle">
              {label}
              {mark}
            </text>
          </g>
        ),
      )}
      {upright ? (
        <text x={0} y={11} fontWeight={600}>
          {dimension.label}
        </text>
      ) : (
        <text x={to} y={at + 38} textAnchor="end" fontWeight={600}>
          {dimension.label}
        </text>
      )}
    </g>
  );
}

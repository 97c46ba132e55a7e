import type { Dimension } from '@settlewright/geometry';
import { tapeTicks, type BoardLayout, type Tick } from '../board-layout.ts';

const SIZES = { long: 15, middle: 10, short: 6 };

/** The tape at the foot: inches on the upper edge, millimetres on the lower. */
export function TapeRuler({ unit, layout }: { unit: Dimension['unit']; layout: BoardLayout }) {
  const { left, right, tapeTop, tapeBottom, x } = layout;
  const { upper, lower } = tapeTicks(unit, layout);
  const path = (list: readonly Tick[], y: number, sign: 1 | -1) =>
    list.map(({ value, size }) => `M${x(value)} ${y}v${sign * SIZES[size] * (sign < 0 ? 0.6 : 1)}`).join('');
  const inside = (value: number, room: number) => x(value) + room < right;
  return (
    <g>
      <rect
        x={left}
        y={tapeTop}
        width={right - left}
        height={tapeBottom - tapeTop}
        fill="var(--color-oak-1)"
        stroke="var(--color-pen)"
        strokeWidth={1.3}
      />
      <path d={path(upper, tapeTop, 1)} stroke="var(--color-pen)" strokeWidth={1} />
      <path d={path(lower, tapeBottom, -1)} stroke="var(--color-pen)" strokeWidth={0.9} />
      <g fill="var(--color-on-timber)">
        {upper.map(
          ({ value, label }) =>
            label &&
            inside(value, 22) && (
              <text key={value} x={x(value) + 5} y={tapeTop + 27} fontSize={14} fontWeight={600}>
                {label}
              </text>
            ),
        )}
        {lower.map(
          ({ value, label }) =>
            label &&
            inside(value, 50) && (
              <text key={value} x={x(value) + 4} y={tapeBottom - 5} fontSize={12}>
                {label}
              </text>
            ),
        )}
      </g>
    </g>
  );
}

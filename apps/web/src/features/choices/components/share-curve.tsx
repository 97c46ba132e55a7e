import type { CurveShare } from '@/lib/crowd/crowd-tasks.ts';
import type { BoardLayout } from '../board-layout.ts';

const LINES = [25, 50, 75];

/** Where a share stands over the foot of the curve. */
export const shareY = ({ curveTop, rowsTop }: BoardLayout, share: number): number =>
  rowsTop - share * (rowsTop - curveTop);

function pathOf(points: readonly CurveShare[], layout: BoardLayout): string {
  return points
    .filter(({ fits }) => fits !== undefined)
    .map(
      ({ value, fits = 0 }, n) =>
        `${n === 0 ? 'M' : 'L'}${layout.x(value).toFixed(1)} ${shareY(layout, fits).toFixed(1)}`,
    )
    .join('');
}

/** How many of a hundred fit along the dimension: by the shown rule, and by every check at once. */
export function ShareCurve({
  points,
  joint,
  layout,
}: {
  points: readonly CurveShare[] | undefined;
  joint: readonly CurveShare[] | undefined;
  layout: BoardLayout;
}) {
  const { left, right, rowsTop, narrow } = layout;
  const known = points?.filter(({ fits }) => fits !== undefined) ?? [];
  const [first, last] = [known[0], known.at(-1)];
  return (
    <g>
      <g stroke="var(--color-rule)" strokeWidth={1}>
        {LINES.map((line) => (
          <path key={line} d={`M${left} ${shareY(layout, line / 100)}H${right}`} />
        ))}
      </g>
      {first && last && (
        <>
          <path
            d={`${pathOf(known, layout)}L${layout.x(last.value)} ${rowsTop}L${layout.x(first.value)} ${rowsTop}Z`}
            fill="var(--color-sunk)"
          />
          <path d={pathOf(known, layout)} fill="none" stroke="var(--color-ink)" strokeWidth={1.5} />
        </>
      )}
      {joint && (
        <path
          d={pathOf(joint, layout)}
          fill="none"
          stroke="var(--color-ink-2)"
          strokeWidth={1.2}
          strokeDasharray="5 3"
        />
      )}
      <path d={`M${left} ${rowsTop}H${right}`} stroke="var(--color-ink)" strokeWidth={1.5} />
      <g fontSize={narrow ? 12 : 13} fill="var(--color-ink-3)">
        {LINES.map((line) => (
          <text
            key={line}
            x={narrow ? right : right + 10}
            y={shareY(layout, line / 100) + (narrow ? -4 : 4)}
            textAnchor={narrow ? 'end' : 'start'}
          >
            {line} in 100
          </text>
        ))}
      </g>
    </g>
  );
}

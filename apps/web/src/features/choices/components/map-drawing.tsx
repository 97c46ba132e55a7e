import type { Dimension } from '@settlewright/geometry';
import { memo } from 'react';
import { tapeTicks } from '../board-layout.ts';
import type { CastMap, MapRegion } from '@settlewright/geometry';
import { useChoices } from '../choices-view.ts';
import { contours } from '../contours.ts';
import { inHundred } from '../words.ts';
import { shortName } from '@/lib/short-name.ts';

interface MapDrawingProps {
  map: CastMap;
  shares: readonly (readonly (number | null)[])[] | undefined;
  first: Dimension;
  second: Dimension;
  present: { across: number; up: number };
  width: number;
}

const LEFT = 52;
const TOP = 18;
const FOOT = 46;
const LINES = [0.25, 0.5, 0.75];
const APART = 44;

/** Shaded by how many of the public fit; each sitter's region is outlined and named. */
export const MapDrawing = memo(function MapDrawing({
  map,
  shares,
  first,
  second,
  present,
  width,
}: MapDrawingProps) {
  const { colourOf } = useChoices();
  const { across, up, regions } = map;
  const right = width - 12;
  const bottom = TOP + Math.min(420, Math.max(240, (right - LEFT) * 0.62));
  const [minX = 0, maxX = 1] = [across[0], across.at(-1)];
  const [minY = 0, maxY = 1] = [up[0], up.at(-1)];
  const [cellX, cellY] = [
    (right - LEFT) / Math.max(across.length - 1, 1),
    (bottom - TOP) / Math.max(up.length - 1, 1),
  ];
  const x = (value: number) => LEFT + ((value - minX) / (maxX - minX)) * (right - LEFT);
  const y = (value: number) => bottom - ((value - minY) / (maxY - minY)) * (bottom - TOP);
  const path = (grid: readonly (readonly number[])[], level: number) =>
    contours(grid, level)
      .map(
        ([[a, b], [c, d]]) =>
          `M${px(LEFT + a * cellX)} ${px(bottom - b * cellY)}L${px(LEFT + c * cellX)} ${px(bottom - d * cellY)}`,
      )
      .join('');
  const known = shares?.map((row) => row.map((share) => share ?? NaN));
  const named = placeNames(regions, (i, j) => [LEFT + j * cellX, bottom - i * cellY], { right, bottom });
  const corners = [
    [0, 0, 'start', -6],
    [0, across.length - 1, 'end', -6],
    [up.length - 1, 0, 'start', 15],
    [up.length - 1, across.length - 1, 'end', 15],
  ] as const;
  return (
    <svg
      aria-hidden="true"
      width={width}
      height={bottom + FOOT}
      viewBox={`0 0 ${width} ${bottom + FOOT}`}
      className="block"
    >
      {shares?.map((row, i) =>
        row.map((share, j) => {
          if (!share) return null;
          const [cx, cy] = [LEFT + (j - 0.5) * cellX, bottom - (i + 0.5) * cellY];
          const [a, b] = [Math.max(cx, LEFT), Math.max(cy, TOP)];
          return (
            <rect
              key={`${i} ${j}`}
              x={a}
              y={b}
              width={Math.min(cx + cellX, right) - a}
              height={Math.min(cy + cellY, bottom) - b}
              fill="var(--color-oak-3)"
              opacity={Math.round(share * 75) / 100}
              shapeRendering="crispEdges"
            />
          );
        }),
      )}
      {known &&
        LINES.map((line) => (
          <path
            key={line}
            d={path(known, line)}
            stroke="var(--color-ink-3)"
            strokeWidth={0.9}
            strokeDasharray="2 3"
            fill="none"
          />
        ))}
      {regions.map((region) => {
        const line = path(region.rooms, 0);
        return (
          <g key={region.placeId} fill="none" strokeLinecap="round">
            <path d={line} stroke="var(--color-ink)" strokeWidth={4.2} />
            <path
              d={line}
              stroke={`var(--color-sitter-${((colourOf(region.sitterId) - 1) % 6) + 1})`}
              strokeWidth={2.6}
            />
          </g>
        );
      })}
      <rect
        x={LEFT}
        y={TOP}
        width={right - LEFT}
        height={bottom - TOP}
        fill="none"
        stroke="var(--color-ink)"
        strokeWidth={1.3}
      />
      <path
        d={`M${x(present.across)} ${TOP}V${bottom}M${LEFT} ${y(present.up)}H${right}`}
        stroke="var(--color-ink)"
        strokeWidth={1.4}
      />
      <circle
        cx={x(present.across)}
        cy={y(present.up)}
        r={6}
        fill="var(--color-paper)"
        stroke="var(--color-ink)"
        strokeWidth={2.2}
      />
      {named.map(({ name, at: [cx, cy] }) => (
        <g key={name} fontSize={13} fontWeight={600} textAnchor="middle">
          <text
            x={cx}
            y={cy}
            stroke="var(--color-paper)"
            strokeWidth={4}
            strokeLinejoin="round"
            fill="var(--color-paper)"
          >
            {name}
          </text>
          <text x={cx} y={cy} fill="var(--color-ink)">
            {name}
          </text>
        </g>
      ))}
      {shares &&
        corners.map(([i, j, anchor, by]) => {
          const share = shares[i]?.[j];
          if (share === null || share === undefined) return null;
          const cx = LEFT + j * cellX + (anchor === 'start' ? 6 : -6);
          return (
            <text
              key={`${i} ${j}`}
              x={cx}
              y={bottom - i * cellY + by}
              fontSize={12}
              textAnchor={anchor}
              fill="var(--color-ink)"
            >
              {inHundred(share)}
            </text>
          );
        })}
      <Axis dimension={first} from={LEFT} to={right} min={minX} max={maxX} at={bottom} />
      <Axis dimension={second} from={bottom} to={TOP} min={minY} max={maxY} at={LEFT} upright />
    </svg>
  );
});

const px = (value: number): string => value.toFixed(1);

function Axis({
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

/** Each name inside its own region, away from the names before it. */
function placeNames(
  regions: readonly MapRegion[],
  placeOf: (i: number, j: number) => [number, number],
  { right, bottom }: { right: number; bottom: number },
): { name: string; at: [number, number] }[] {
  const taken: [number, number][] = [];
  return regions.flatMap(({ name, rooms }) => {
    let best: { at: [number, number]; score: number } | undefined;
    for (const [i, row] of rooms.entries()) {
      for (const [j, room] of row.entries()) {
        if (room < 0) continue;
        const [cx, cy] = placeOf(i, j);
        if (cx < LEFT + 36 || cx > right - 36 || cy < TOP + 30 || cy > bottom - 26) continue;
        const gap = Math.min(APART * 2, ...taken.map(([a, b]) => Math.hypot((a - cx) / 2, b - cy)));
        const score = (gap < APART / 2 ? -1000 : 0) + gap + Math.min(room, 40);
        if (!best || score > best.score) best = { at: [cx, cy], score };
      }
    }
    if (!best) return [];
    taken.push(best.at);
    return [{ name: shortName(name), at: best.at }];
  });
}

import type { Dimension } from '@settlewright/geometry';
import { memo } from 'react';
import type { CastMap } from '@settlewright/geometry';
import { sitterFill } from '@/lib/sitter-colours.ts';
import { useChoices } from '../choices-view.ts';
import { contours } from '../contours.ts';
import { mapNames, outlineOf } from '../map-names.ts';
import { inHundred } from '../words.ts';
import { MapAxis } from './map-axis.tsx';

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
  const place = (along: number, high: number): [number, number] => [
    LEFT + along * cellX,
    bottom - high * cellY,
  ];
  const pathOf = (lines: ReturnType<typeof contours>) =>
    lines
      .map(
        ([from, to]) =>
          `M${place(...from)
            .map(px)
            .join(' ')}L${place(...to)
            .map(px)
            .join(' ')}`,
      )
      .join('');
  const known = shares?.map((row) => row.map((share) => share ?? NaN));
  const frame = { left: LEFT, right, top: TOP, bottom };
  const written = [
    [LEFT, TOP],
    [right, TOP],
    [LEFT, bottom],
    [right, bottom],
    [x(present.across), y(present.up)],
  ] satisfies [number, number][];
  const named = mapNames(regions, place, frame, written);
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
            d={pathOf(contours(known, line))}
            stroke="var(--color-ink-3)"
            strokeWidth={0.9}
            strokeDasharray="2 3"
            fill="none"
          />
        ))}
      {regions.map((region) => {
        const line = pathOf(outlineOf(region));
        return (
          <g key={region.placeId} fill="none" strokeLinecap="round">
            <path d={line} stroke="var(--color-ink)" strokeWidth={4.2} />
            <path d={line} stroke={sitterFill(colourOf(region.sitterId))} strokeWidth={2.6} />
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
      {named.map(({ placeId, name, at: [cx, cy] }) => (
        <g key={placeId} fontSize={13} fontWeight={600} textAnchor="middle">
          <text
            x={cx}
            y={cy + 4}
            stroke="var(--color-paper)"
            strokeWidth={4}
            strokeLinejoin="round"
            fill="var(--color-paper)"
          >
            {name}
          </text>
          <text x={cx} y={cy + 4} fill="var(--color-ink)">
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
      <MapAxis dimension={first} from={LEFT} to={right} min={minX} max={maxX} at={bottom} />
      <MapAxis dimension={second} from={bottom} to={TOP} min={minY} max={maxY} at={LEFT} upright />
    </svg>
  );
});

const px = (value: number): string => value.toFixed(1);

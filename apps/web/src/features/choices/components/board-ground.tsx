import type { StickRow, StoryStick } from '@settlewright/geometry';
import { memo } from 'react';
import { SitterDot } from '@/components/sitter-dot.tsx';
import { BAND_HEIGHT, fittingName, tapeTicks, type BoardLayout } from '../board-layout.ts';
import { useChoices } from '../choices-view.ts';
import type { StickBand } from '@settlewright/geometry';
import type { ShareCurves } from '../use-share-curve.ts';
import { Lath } from './lath.tsx';
import { ShareCurve } from './share-curve.tsx';
import { SvgWords } from './svg-words.tsx';
import { TapeRuler } from './tape-ruler.tsx';
import { shortName } from '@/lib/short-name.ts';

interface GroundProps {
  layout: BoardLayout;
  stick: StoryStick;
  rows: readonly StickRow[];
  bands: readonly StickBand[];
  curves: ShareCurves | undefined;
  /** How often the verdict of each row has turned since the stick was shown. */
  turns: readonly number[];
}

/** Middle of a row's lath. */
export const lathY = ({ rowsTop, rowHeight, narrow }: BoardLayout, row: number): number =>
  rowsTop + row * rowHeight + (narrow ? 42 : rowHeight / 2);

/** What does not move with the plumb line. */
export const BoardGround = memo(function BoardGround({
  layout,
  stick,
  rows,
  bands,
  curves,
  turns,
}: GroundProps) {
  const { left, right, rowsTop, rowHeight, bandsTop, narrow, width, x } = layout;
  const { unit } = stick.dimension;
  const marks = tapeTicks(unit, layout).upper.filter(({ size }) => size === 'long');
  return (
    <g>
      <path
        d={marks.map(({ value }) => `M${x(value)} ${rowsTop}V${bandsTop - 8}`).join('')}
        stroke="var(--color-rule)"
        strokeWidth={1}
      />
      <ShareCurve points={curves?.points} joint={curves?.joint} layout={layout} />
      {rows.map((row, n) => (
        <g key={row.placeId}>
          <g key={turns[n]} className={turns[n] ? 'lath-settles' : undefined}>
            <Lath row={row} x={x} y={lathY(layout, n)} />
          </g>
          <path
            d={`M${narrow ? left : 0} ${rowsTop + (n + 1) * rowHeight}H${width}`}
            stroke="var(--color-rule)"
            strokeWidth={1}
          />
        </g>
      ))}
      {bands.map((band, n) => {
        // Where it is narrow the name stands over its range.
        const y = bandsTop + n * BAND_HEIGHT + (narrow ? BAND_HEIGHT - 6 : BAND_HEIGHT / 2);
        return (
          <g key={n}>
            <path
              d={band.stretches
                .map(
                  ({ from, to }) => `M${x(from)} ${y - 5}v10M${x(from)} ${y}H${x(to)}M${x(to)} ${y - 5}v10`,
                )
                .join('')}
              stroke="var(--color-ink-2)"
              strokeWidth={1.5}
              fill="none"
            />
            <text
              x={narrow ? left : 0}
              y={y + (narrow ? -10 : 4)}
              fontSize={narrow ? 11.5 : 13}
              fill="var(--color-ink-2)"
            >
              {band.name}
            </text>
          </g>
        );
      })}
      <TapeRuler unit={unit} layout={layout} />
      <path d={`M${left} ${rowsTop}H${right}`} stroke="var(--color-ink)" strokeWidth={1.5} />
    </g>
  );
});

/** Names beside the laths, or over them where it is narrow. */
export const BoardNames = memo(function BoardNames({
  layout,
  rows,
  room,
}: Pick<GroundProps, 'layout' | 'rows'> & {
  /** Pixels from the start of a name to what stands behind it. */
  room: number;
}) {
  const { aside, colourOf } = useChoices();
  const { rowsTop, rowHeight, narrow, width } = layout;
  return rows.map(({ sitterId, placeId, name }, n) => {
    const top = rowsTop + n * rowHeight;
    const { first, rest } = fittingName(shortName(name), aside(sitterId), room);
    const y = narrow ? top + 20 : top + rowHeight / 2 + 5;
    return (
      <g key={placeId}>
        {narrow && <rect x={0} y={top + 2} width={width} height={25} fill="var(--color-paper)" />}
        {!narrow && (
          <g transform={`translate(0 ${top + rowHeight / 2 - 7})`}>
            <SitterDot colour={colourOf(sitterId)} size={14} />
          </g>
        )}
        <text x={narrow ? 0 : 24} y={y} fontSize={narrow ? 14 : 15} fontWeight={500} fill="var(--color-ink)">
          {first}{' '}
          <tspan fontWeight={400} fill="var(--color-ink-2)">
            <SvgWords text={rest} />
          </tspan>
        </text>
      </g>
    );
  });
});

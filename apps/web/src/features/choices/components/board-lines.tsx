import type { StickRow } from '@settlewright/geometry';
import type { ReactNode } from 'react';
import { exactValue } from '@/lib/dimension-words.ts';
import type { Answer } from '../answers.ts';
import type { BoardLayout } from '../board-layout.ts';
import { useChoices } from '../choices-view.ts';
import { shareAt, type ShareCurves } from '../use-share-curve.ts';
import { inHundred } from '../words.ts';
import { lathY } from './board-ground.tsx';
import { shareY } from './share-curve.tsx';
import { SvgWords } from './svg-words.tsx';

interface LinesProps {
  layout: BoardLayout;
  unit: 'mm' | 'deg' | 'N';
  rows: readonly StickRow[];
  answers: readonly (Answer | undefined)[];
  shown: number;
  /** The shown value is the one that is built now. */
  settled: boolean;
  suggested: number | undefined;
  curves: ShareCurves | undefined;
}

/** From a tongue's end to the plumb line, where something is missing. */
function missing({ tight }: StickRow, value: number): number | undefined {
  const ends = tight.flatMap(({ from, to }) => [from, to]);
  return ends.sort((a, b) => Math.abs(a - value) - Math.abs(b - value))[0];
}

/** The plumb line at the shown value, the chalk line at the suggestion, and what is missing. */
export function BoardLines({ layout, unit, rows, answers, shown, settled, suggested, curves }: LinesProps) {
  const { style } = useChoices();
  const { x, tapeBottom } = layout;
  const at = x(shown);
  const share = curves && shareAt(curves.points, shown);
  const wanted = suggested !== undefined && Math.abs(suggested - shown) > 1e-6 ? suggested : undefined;
  const wantedShare = curves && wanted !== undefined ? shareAt(curves.points, wanted) : undefined;
  const left = wanted === undefined || wanted <= shown;
  const counted = (of: number | undefined) => (of === undefined ? '' : `, ${inHundred(of)}`);
  return (
    <g>
      {rows.map((row, n) => {
        const end = answers[n]?.outcome.verdict === 'wontFit' ? missing(row, shown) : undefined;
        if (end === undefined) return null;
        return (
          <path
            key={row.placeId}
            d={`M${x(end)} ${lathY(layout, n)}H${at}M${x(end)} ${lathY(layout, n) - 6}v12`}
            stroke="var(--color-wont)"
            strokeWidth={1.8}
          />
        );
      })}
      {wanted !== undefined && (
        <>
          <path
            d={`M${x(wanted)} 24V${tapeBottom}`}
            stroke="var(--color-chalk)"
            strokeWidth={2.2}
            strokeDasharray="2.5 3"
          />
          {wantedShare !== undefined && (
            <circle
              cx={x(wanted)}
              cy={shareY(layout, wantedShare)}
              r={5}
              fill="var(--color-paper)"
              stroke="var(--color-chalk)"
              strokeWidth={2}
            />
          )}
          <LineWords x={x(wanted)} before={left} layout={layout} colour="var(--color-chalk)">
            <SvgWords text={`${exactValue(wanted, unit, style)}${counted(wantedShare)}`} />
          </LineWords>
        </>
      )}
      <path d={`M${at} 24V${tapeBottom + 4}`} stroke="var(--color-ink)" strokeWidth={1.8} />
      {share !== undefined && (
        <circle
          cx={at}
          cy={shareY(layout, share)}
          r={5}
          fill="var(--color-paper)"
          stroke="var(--color-ink)"
          strokeWidth={2}
        />
      )}
      <path
        d={`M${at - 3.5} ${tapeBottom + 4}h7l3.5 9 -7 20 -7 -20z`}
        fill="var(--color-sitter-5)"
        stroke="var(--color-pen)"
        strokeWidth={1.4}
      />
      <LineWords x={at} before={!left} layout={layout} colour="var(--color-ink)">
        <SvgWords text={`${exactValue(shown, unit, style)}${settled ? ' now' : ''}${counted(share)}`} />
      </LineWords>
    </g>
  );
}

const WORDS_ROOM = 150;

/** Words at the head of a line, on the side where the other line is not, inside the drawing. */
function LineWords({
  x,
  before,
  layout,
  colour,
  children,
}: {
  x: number;
  before: boolean;
  layout: BoardLayout;
  colour: string;
  children: ReactNode;
}) {
  const edge = layout.narrow ? layout.width : layout.width - 40;
  const atLeft = before ? x - WORDS_ROOM > 0 : x + WORDS_ROOM > edge;
  return (
    <text
      x={atLeft ? x - 6 : x + 6}
      y={15}
      textAnchor={atLeft ? 'end' : 'start'}
      fontSize={14}
      fontWeight={600}
      fill={colour}
    >
      {children}
    </text>
  );
}

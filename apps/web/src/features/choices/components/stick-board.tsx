import type { StickRow, StoryStick } from '@settlewright/geometry';
import type { Ref } from 'react';
import { exactValue } from '@/lib/dimension-words.ts';
import type { Answer } from '../answers.ts';
import type { BoardLayout } from '../board-layout.ts';
import { useChoices } from '../choices-view.ts';
import type { StickBand } from '@settlewright/geometry';
import type { ShareCurves } from '../use-share-curve.ts';
import { BoardGround, BoardNames } from './board-ground.tsx';
import { BoardLines } from './board-lines.tsx';
import { BoardVerdicts } from './board-verdicts.tsx';
import { SvgWords } from './svg-words.tsx';

interface StickBoardProps {
  ref: Ref<SVGSVGElement>;
  layout: BoardLayout;
  stick: StoryStick;
  rows: readonly StickRow[];
  bands: readonly StickBand[];
  curves: ShareCurves | undefined;
  crowd: readonly string[];
  shown: number;
  settled: boolean;
  answers: readonly (Answer | undefined)[];
  suggested: number | undefined;
  suggestedAnswers: readonly (Answer | undefined)[];
}

/** The drawing: curve, laths, tape and lines. Its words stand in the table and in the slider. */
export function StickBoard({
  ref,
  layout,
  stick,
  rows,
  bands,
  curves,
  crowd,
  shown,
  settled,
  answers,
  suggested,
  suggestedAnswers,
}: StickBoardProps) {
  const { style } = useChoices();
  const { unit } = stick.dimension;
  const { width, height, narrow, rowsTop, nowX, thenX } = layout;
  const inNarrow = Math.min(Math.max(width * 0.52, 150), width - 168);
  return (
    <svg
      ref={ref}
      aria-hidden="true"
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      className="block select-none"
      fontFamily="'Work Sans', system-ui, sans-serif"
    >
      <BoardGround layout={layout} stick={stick} rows={rows} bands={bands} curves={curves} />
      {!narrow && (
        <g fontSize={13} fill="var(--color-ink-2)">
          <text x={0} y={rowsTop - 62} fontSize={14} fontWeight={600} fill="var(--color-ink)">
            Share who fit
          </text>
          {crowd.map((words, n) => (
            <text key={n} x={0} y={rowsTop - 43 + n * 17}>
              {words}
            </text>
          ))}
        </g>
      )}
      <BoardLines
        layout={layout}
        unit={unit}
        rows={rows}
        answers={answers}
        shown={shown}
        settled={settled}
        suggested={suggested}
        curves={curves}
      />
      <BoardNames layout={layout} rows={rows} />
      {narrow ? (
        <BoardVerdicts layout={layout} x={inNarrow} answers={answers} />
      ) : (
        <>
          <text x={nowX} y={rowsTop - 6} fontSize={13} fontWeight={600} fill="var(--color-ink)">
            at <SvgWords text={exactValue(shown, unit, style)} />
          </text>
          <BoardVerdicts layout={layout} x={nowX} answers={answers} />
          {suggested !== undefined && (
            <>
              <text x={thenX} y={rowsTop - 6} fontSize={13} fontWeight={600} fill="var(--color-chalk)">
                at <SvgWords text={exactValue(suggested, unit, style)} />
              </text>
              <BoardVerdicts layout={layout} x={thenX} answers={suggestedAnswers} />
            </>
          )}
        </>
      )}
    </svg>
  );
}

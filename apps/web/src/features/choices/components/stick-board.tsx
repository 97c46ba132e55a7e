import type { StickRow, StoryStick } from '@settlewright/geometry';
import type { Ref } from 'react';
import { exactValue } from '@/lib/dimension-words.ts';
import { verdictLine, type Answer } from '../answers.ts';
import { verdictsX, type BoardLayout } from '../board-layout.ts';
import { useChoices } from '../choices-view.ts';
import type { StickBand } from '@settlewright/geometry';
import { useTurns } from '../use-turns.ts';
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
  /** Where the set stands while another value is tried. */
  start: number | undefined;
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
  start,
  answers,
  suggested,
  suggestedAnswers,
}: StickBoardProps) {
  const { ruleBook, style } = useChoices();
  const { unit } = stick.dimension;
  const { width, height, narrow, rowsTop, nowX, thenX } = layout;
  const turns = useTurns(answers);
  const longest = Math.max(
    0,
    ...answers.map((answer) => (answer ? verdictLine(answer, ruleBook, style).length : 0)),
  );
  const inNarrow = verdictsX(width, longest);
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
      <BoardGround layout={layout} stick={stick} rows={rows} bands={bands} curves={curves} turns={turns} />
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
        start={start}
        suggested={suggested}
        curves={curves}
      />
      <BoardNames layout={layout} rows={rows} room={narrow ? inNarrow - 6 : layout.left - 34} />
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

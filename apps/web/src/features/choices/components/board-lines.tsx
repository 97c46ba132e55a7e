import type { StickRow } from '@settlewright/geometry';
import { exactValue } from '@/lib/dimension-words.ts';
import type { Answer } from '../answers.ts';
import { LETTER, type BoardLayout } from '../board-layout.ts';
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
  /** Where the set stands while another value is tried. */
  start: number | undefined;
  suggested: number | undefined;
  curves: ShareCurves | undefined;
}

/** From a tongue's end to the plumb line, where something is missing. */
function missing({ tight }: StickRow, value: number): number | undefined {
  const ends = tight.flatMap(({ from, to }) => [from, to]);
  return ends.sort((a, b) => Math.abs(a - value) - Math.abs(b - value))[0];
}

/** The plumb line at the shown value, the chalk line at the suggestion, where the set stands, and what is missing. */
export function BoardLines({ layout, unit, rows, answers, shown, start, suggested, curves }: LinesProps) {
  const { style } = useChoices();
  const { x, tapeBottom } = layout;
  const head = linesTop(layout);
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
            d={`M${x(wanted)} ${head - (layout.narrow ? LINE : 0)}V${tapeBottom}`}
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
          <LineWords
            x={x(wanted)}
            before={left}
            layout={layout}
            colour="var(--color-chalk)"
            line={0}
            text={`${exactValue(wanted, unit, style)}${counted(wantedShare)}`}
          />
        </>
      )}
      {start !== undefined && <StartMark layout={layout} unit={unit} start={start} shown={shown} />}
      <path d={`M${at} ${head}V${tapeBottom + 4}`} stroke="var(--color-ink)" strokeWidth={1.8} />
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
      <LineWords
        x={at}
        before={!left}
        layout={layout}
        colour="var(--color-ink)"
        line={1}
        text={`${exactValue(shown, unit, style)}${start === undefined ? ' now' : ''}${counted(share)}`}
      />
    </g>
  );
}

/** Where the set stands while another value is tried: a dashed line, and its value under the tape. */
function StartMark({
  layout,
  unit,
  start,
  shown,
}: Pick<LinesProps, 'layout' | 'unit' | 'shown'> & { start: number }) {
  const { style } = useChoices();
  const { x, rowsTop, tapeBottom } = layout;
  const at = x(start);
  const before = start < shown;
  // The bob and its ring cover what is close to it.
  const beside = before ? Math.min(at - 8, x(shown) - BESIDE_BOB) : Math.max(at + 8, x(shown) + BESIDE_BOB);
  return (
    <g>
      <path
        d={`M${at} ${rowsTop}V${tapeBottom + 8}`}
        stroke="var(--color-ink-2)"
        strokeWidth={1.4}
        strokeDasharray="7 4"
      />
      <path d={`M${at - 4} ${tapeBottom + 8}h8`} stroke="var(--color-ink-2)" strokeWidth={1.4} />
      <Held
        x={beside}
        y={tapeBottom + 24}
        before={before}
        layout={layout}
        colour="var(--color-ink-2)"
        text={`${exactValue(start, unit, style)} now`}
      />
    </g>
  );
}

const BESIDE_BOB = 28;
const LINE = 17;
const FIRST_LINE = 15;

/** Top of the plumb line: under the words at the head, which take two lines where it is narrow. */
const linesTop = ({ narrow }: BoardLayout): number => FIRST_LINE + 9 + (narrow ? LINE : 0);

interface WordsProps {
  x: number;
  before: boolean;
  layout: BoardLayout;
  colour: string;
  text: string;
}

/** Words at the head of a line, on the side where the other line is not; one under the other where it is narrow. */
function LineWords({ x, before, line, ...words }: WordsProps & { line: 0 | 1 }) {
  const y = FIRST_LINE + (words.layout.narrow ? line * LINE : 0);
  return <Held x={before ? x - 6 : x + 6} y={y} before={before} {...words} />;
}

/** Words beside a line, moved along where they would leave the drawing. */
function Held({ x, y, before, layout, colour, text }: WordsProps & { y: number }) {
  const wide = text.length * LETTER;
  const most = layout.narrow ? layout.width : layout.width - 40;
  const from = Math.max(0, Math.min(before ? x - wide : x, most - wide));
  return (
    <text
      x={before ? from + wide : from}
      y={y}
      textAnchor={before ? 'end' : 'start'}
      fontSize={14}
      fontWeight={600}
      fill={colour}
      stroke="var(--color-paper)"
      strokeWidth={4}
      strokeLinejoin="round"
      paintOrder="stroke"
    >
      <SvgWords text={text} />
    </text>
  );
}

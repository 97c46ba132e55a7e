import { GapMark, verdictWord } from '@/components/verdict.tsx';
import { marginOf, type Answer } from '../answers.ts';
import { MARK, type BoardLayout } from '../board-layout.ts';
import { useChoices } from '../choices-view.ts';
import { SvgWords } from './svg-words.tsx';

const COLOURS = {
  fits: 'var(--color-fits)',
  tight: 'var(--color-tight)',
  wontFit: 'var(--color-wont)',
  notKnown: 'var(--color-unknown)',
};

interface VerdictsProps {
  layout: BoardLayout;
  x: number;
  answers: readonly (Answer | undefined)[];
}

/** A column of verdicts at one value, beside the laths; over them where it is narrow. */
export function BoardVerdicts({ layout, x, answers }: VerdictsProps) {
  const { ruleBook, style } = useChoices();
  const { rowsTop, rowHeight, narrow } = layout;
  return answers.map((answer, n) => {
    const top = rowsTop + n * rowHeight;
    if (!answer) return null;
    const { verdict, estimated } = answer.outcome;
    const { margin, range } = marginOf(answer, ruleBook, style);
    const word = verdictWord(verdict);
    const amount = `${margin}${range ? ` ${range}` : ''}`;
    const y = narrow ? top + 15 : top + rowHeight / 2;
    return (
      <g key={n} style={{ color: COLOURS[verdict] }} fill={COLOURS[verdict]}>
        <g transform={`translate(${x} ${y - 7})`}>
          <GapMark verdict={verdict} estimated={estimated} />
        </g>
        {narrow ? (
          <text x={x + MARK} y={y + 5} fontSize={14} fontWeight={500}>
            <SvgWords text={amount} /> {word}
          </text>
        ) : (
          <>
            <text x={x + 34} y={y - 1} fontSize={14.5} fontWeight={estimated ? 400 : 600}>
              <SvgWords text={amount} />
            </text>
            <text x={x + 34} y={y + 14} fontSize={12}>
              {word}
              {estimated && ', est.'}
            </text>
          </>
        )}
      </g>
    );
  });
}

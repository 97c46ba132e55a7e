import { Radio, RadioGroup } from '@headlessui/react';
import type { FitSheet } from '@settlewright/anthropometry';
import { formatLength, type DocumentDifference } from '@settlewright/geometry';
import { Measure } from '@/components/measure.tsx';
import { VerdictCell } from '@/components/verdict.tsx';
import { useSurroundings } from '../room-context.tsx';
import { affectedVerdicts, nameOf, sayValue, type Side, type WordsOf } from './conflict-words.ts';

interface Props {
  difference: DocumentDifference;
  theirName: string;
  value: Side | undefined;
  words: WordsOf;
  /** The sheet with either choice, for the verdicts each one brings. */
  sheets: Record<Side, FitSheet | undefined>;
  onChoose: (side: Side) => void;
}

const MOST_VERDICTS = 3;

/** One thing that both changed, with what each value means for those who sit there. */
export function ConflictChoice({ difference, theirName, value, words, sheets, onChoose }: Props) {
  const name = nameOf(difference);
  return (
    <RadioGroup
      value={value ?? null}
      onChange={(side: Side | null) => side && onChoose(side)}
      aria-label={name}
      className="grid items-center gap-x-8 gap-y-2 border-b border-rule py-2 tablet:grid-cols-[13rem_8rem_1fr_1fr]"
    >
      <span className="font-medium">{name}</span>
      <span className="text-ink-2">
        <span className="tablet:sr-only">When you began </span>
        <Measure text={sayValue(difference, 'base', words)} />
      </span>
      {(['mine', 'theirs'] as const).map((side) => (
        <Radio
          key={side}
          value={side}
          aria-label={`${side === 'mine' ? 'Yours' : `${theirName}’s`}: ${sayValue(difference, side, words)}`}
          className="quick group flex min-h-16 cursor-pointer flex-wrap items-center gap-x-5 gap-y-1 border-b-[3px] border-transparent px-4 py-2 hover:bg-sunk data-checked:border-chalk data-checked:bg-chalk-wash data-focus:shadow-(--focus-ring)"
        >
          <span
            aria-hidden="true"
            style={{ borderRadius: '50%' }}
            className="size-[18px] shrink-0 border-[1.5px] border-rule-strong bg-sheet group-data-checked:border-[6px] group-data-checked:border-chalk"
          />
          <span className="text-2xl group-data-checked:text-chalk">
            <span className="text-sm text-ink-2 tablet:hidden">
              {side === 'mine' ? 'Yours ' : `${theirName}’s `}
            </span>
            <Measure text={sayValue(difference, side, words)} />
          </span>
          <Verdicts here={sheets[side]} there={sheets[side === 'mine' ? 'theirs' : 'mine']} />
        </Radio>
      ))}
    </RadioGroup>
  );
}

function Verdicts({ here, there }: { here: FitSheet | undefined; there: FitSheet | undefined }) {
  const { style, engine } = useSurroundings();
  if (!here || !there) return null;
  const affected = affectedVerdicts(here, there, engine.ruleBook, MOST_VERDICTS);
  if (affected.length === 0) return <span className="text-sm text-ink-3">no verdict depends on it</span>;
  return (
    <span className="flex flex-wrap gap-x-5 gap-y-1 text-sm">
      {affected.map(({ key, who, check, outcome }) => (
        <span key={key}>
          <span className="block text-xs text-ink-2">
            {who}, {check}
          </span>
          <VerdictCell
            verdict={outcome.verdict}
            estimated={outcome.estimated}
            margin={
              <Measure text={`${outcome.margin >= 0 ? '+' : ''}${formatLength(outcome.margin, style)}`} />
            }
          />
        </span>
      ))}
    </span>
  );
}

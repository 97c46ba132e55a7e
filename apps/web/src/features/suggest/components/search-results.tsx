import type { Dimension, FreeDimension } from '@settlewright/geometry';
import { useMemo } from 'react';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { dimensionValue, sentence } from '@/lib/dimension-words.ts';
import { sharesDiffer } from '@/lib/crowd/counted-words.ts';
import { checkWords, effectsOf } from '../effects.ts';
import type { SearchTold } from '../search.ts';
import { useSuggestView } from '../suggest-view.ts';
import { blameWords, publicWords, stepWords } from '../words.ts';
import { AnswerSection } from './answer-section.tsx';
import { KeepLook } from './keep-look.tsx';

interface SearchResultsProps {
  told: SearchTold;
  dimensions: readonly Dimension[];
  free: readonly FreeDimension[];
  /** Ids of everybody the search was to serve. */
  toServe: ReadonlySet<string>;
  /** "US adults 2015–16, men and women equally". */
  crowdName: string;
  /** True once it has ended or was stopped. */
  isOver: boolean;
  /** Hears the name of the step that was taken. */
  onTaken: (step: string) => void;
}

/** What the search found: up to three answers, who stands in the way, and keeping the look. */
export function SearchResults({
  told,
  dimensions,
  free,
  toServe,
  crowdName,
  isOver,
  onTaken,
}: SearchResultsProps) {
  const { document, check, ruleBook, style, replace, sitters } = useSuggestView();
  const { suggestion, people } = told;
  const { answers, present, blame } = suggestion;
  // The same choices come with every message: only new ones are worked out.
  const key = answers.map(({ tried }) => tried.values.join(' ')).join('|');
  const found = useMemo(
    () => {
      const people = new Set(sitters.map(({ id }) => id));
      const ground = { document, dimensions, free, check, ruleBook, people, toServe };
      return answers.map(({ tried }) => effectsOf(tried, ground));
    },
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [key, document, dimensions, free, check, ruleBook, sitters, toServe],
  );
  const [best] = found;
  const said =
    blame && best
      ? blameWords(blame, {
          sheet: best.sheet,
          ruleBook,
          show: (mm) => dimensionValue(mm, 'mm', style),
        })
      : undefined;
  return (
    <section aria-labelledby="found-heading">
      <h2 id="found-heading" className="sr-only">
        Answers
      </h2>
      {said && (
        <Notice className="mb-6" title="No choice of these dimensions serves everyone">
          <p>{said.what}</p>
          <ul className="mt-2 list-disc pl-5">
            {said.help.map((words) => (
              <li key={words}>{words}</li>
            ))}
          </ul>
        </Notice>
      )}
      <div className="grid gap-x-8 gap-y-10 tablet:grid-cols-2 desk:grid-cols-3">
        {answers.map(({ kind, tried }, n) => {
          const effects = found[n];
          if (!effects) return null;
          const take = () => {
            const step = stepWords(effects.moves, style);
            replace?.(effects.document, step);
            onTaken(step);
          };
          return (
            <AnswerSection
              key={kind}
              kind={kind}
              effects={effects}
              share={tried.share}
              shareNow={present?.share}
              {...(isOver && replace ? { onTake: take } : {})}
            />
          );
        })}
      </div>
      {people && (
        <section aria-labelledby="public-heading" className="mt-8 max-w-text">
          <RuleHeading id="public-heading" level={3}>
            The public
          </RuleHeading>
          <p className="text-sm text-ink-2">
            {publicWords(told, (id) => checkWords(ruleBook, id))} {sharesDiffer('suggest')}{' '}
            {[crowdName, people.source, ...people.cautions].map(sentence).join(' ')}
          </p>
        </section>
      )}
      {isOver && best && best.moves.length > 0 && <KeepLook moves={best.moves} />}
    </section>
  );
}

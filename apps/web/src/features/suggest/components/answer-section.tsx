import type { AnswerKind } from '@settlewright/geometry';
import { useId, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Measure } from '@/components/measure.tsx';
import { aboutInHundred } from '@/lib/dimension-words.ts';
import type { Effects, PersonEffect } from '../effects.ts';
import { useSuggestView } from '../suggest-view.ts';
import { isWorthTaking, moveWords, personWords, servedWords, shareWords, staysWords } from '../words.ts';

interface AnswerSectionProps {
  kind: AnswerKind;
  effects: Effects;
  share: number | undefined;
  shareNow: number | undefined;
  /** Absent while the search still runs, or where nothing can be changed. */
  onTake?: () => void;
}

const TITLES: Record<AnswerKind, string> = {
  best: 'Best found',
  nearest: 'Nearest to now',
  another: 'Another way',
};

/** One answer: its numbers as a sentence, who gains and who loses by name, and the share. */
export function AnswerSection({ kind, effects, share, shareNow, onTake }: AnswerSectionProps) {
  const { style } = useSuggestView();
  const id = useId();
  const [open, setOpen] = useState(false);
  const { moves, stays, better, worse, short, piecesBetter, piecesWorse } = effects;
  const shares = shareWords(share, shareNow);
  const isWorth = isWorthTaking(effects, share, shareNow);
  const servesNone = effects.of > 0 && effects.served === 0;
  return (
    <section aria-labelledby={id} className="ruled flex min-w-0 flex-col pt-3">
      <h3 id={id} className="text-sm font-medium text-ink-2">
        {TITLES[kind]}
        {servesNone && ', serves nobody in full'}
      </h3>
      {moves.length === 0 ? (
        <p className="mt-1 text-xl font-light tracking-hero">Everything stays as it is.</p>
      ) : (
        <ul className="mt-1 grid gap-2">
          {moves.map((move) => {
            const { id: of, subject, from, to } = moveWords(move, style);
            return (
              <li key={of}>
                <span className="block text-sm text-ink-2 first-letter:uppercase">{subject}</span>
                <span className="text-2xl leading-9 font-light tracking-hero">
                  <span className="text-ink-2">
                    <Measure text={from} />
                  </span>{' '}
                  <span aria-hidden="true" className="text-ink-3">
                    →
                  </span>
                  <span className="sr-only"> to </span>{' '}
                  <span className="font-normal text-chalk">
                    <Measure text={to} />
                  </span>
                </span>
              </li>
            );
          })}
        </ul>
      )}
      {stays.length > 0 && <p className="mt-2 text-sm text-ink-2">{staysWords(stays)}</p>}
      <p className="mt-3 font-medium">{servedWords(effects)}</p>
      <dl className="mt-1 mb-3 grid grid-cols-[4.5rem_minmax(0,1fr)] gap-x-3 text-sm [&>dd]:border-t [&>dd]:border-rule [&>dd]:py-1.5 [&>dt]:border-t [&>dt]:border-rule [&>dt]:py-1.5 [&>dt]:text-ink-2">
        <dt>Better</dt>
        <dd>
          <People people={better} more={piecesBetter} />
        </dd>
        <dt>Worse</dt>
        <dd className={worse.length + piecesWorse.length > 0 ? 'font-medium' : undefined}>
          <People people={worse} more={piecesWorse} />
        </dd>
        <dt>Tight</dt>
        <dd>
          {effects.tight} {effects.tight === 1 ? 'check' : 'checks'} in all
        </dd>
        {shares && (
          <>
            <dt>Public</dt>
            <dd>
              {shares}, at least tight
              {share !== undefined && shareNow !== undefined && share < shareNow - 0.005 && (
                <span className="block font-medium">{aboutInHundred(shareNow - share)} fewer</span>
              )}
            </dd>
          </>
        )}
      </dl>
      <div className="mt-auto flex flex-wrap items-center gap-3">
        {onTake && moves.length > 0 && (
          <Button look={kind === 'best' && isWorth ? 'main' : 'ruled'} onClick={onTake}>
            {isWorth ? 'Take it' : 'Take it all the same'}
            <span className="sr-only">, {TITLES[kind].toLowerCase()}</span>
          </Button>
        )}
        <Button look="word" aria-expanded={open} onClick={() => setOpen(!open)}>
          {open ? 'Close' : 'Compare'}
          <span className="sr-only">, {TITLES[kind].toLowerCase()}</span>
        </Button>
      </div>
      {open && (
        <div className="mt-3 text-sm">
          <p className="font-medium">Still missed or not known</p>
          <People people={short} />
        </div>
      )}
    </section>
  );
}

function People({ people, more = [] }: { people: readonly PersonEffect[]; more?: readonly string[] }) {
  if (people.length + more.length === 0) return 'nobody';
  return (
    <ul className="grid gap-0.5">
      {people.map((person) => (
        <li key={person.sitterId}>{personWords(person)}</li>
      ))}
      {more.map((words) => (
        <li key={words} className="first-letter:uppercase">
          {words}
        </li>
      ))}
    </ul>
  );
}

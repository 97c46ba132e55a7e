import { diffDocuments, formatLength, mergeDocuments, type DocumentDifference } from '@settlewright/geometry';
import { useMemo, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '@/components/button.tsx';
import { Measure } from '@/components/measure.tsx';
import { Notice } from '@/components/notice.tsx';
import { sayProblem } from '@/lib/problem.ts';
import { copyAsSet } from '../api.ts';
import { useAutosave, useSurroundings } from '../room-context.tsx';
import { timeWords } from '@/lib/dates.ts';
import type { DraftConflict } from '../save/autosave.ts';
import { useRoom } from '../store.ts';
import { changedVerdicts } from '../verdict-words.ts';
import { ConflictChoice } from './conflict-choice.tsx';
import { nameOf, sayValue, type Side, type WordsOf } from './conflict-words.ts';
import { shortName } from '@/lib/short-name.ts';

/** Two people edited: what only one changed is kept, what both changed is chosen, nothing by itself. */
export function ConflictScreen({ conflict }: { conflict: DraftConflict }) {
  const { path, setName, style, cast, maker, engine } = useSurroundings();
  const autosave = useAutosave();
  const mine = useRoom((state) => state.document);
  const navigate = useNavigate();
  const [choices, setChoices] = useState<Record<string, Side>>({});
  const [copyProblem, setCopyProblem] = useState<string>();
  const { current } = conflict;
  const theirs = current.document;
  // The server forgets old drafts; this device knows what its own work began from.
  const began = autosave.state.getState().base;
  const base = conflict.base?.document ?? began.document;
  const differences = useMemo(() => diffDocuments(base, mine, theirs), [base, mine, theirs]);
  const open = differences.filter((difference) => difference.conflict);
  const settled = differences.filter((difference) => !difference.conflict);
  const missing = open.filter((difference) => choices[difference.id] === undefined);
  const who = shortName(current.savedBy.name || 'Somebody');
  const words: WordsOf = { style, cast, documents: { mine, theirs, base } };

  const merged = useMemo(() => mergeDocuments(base, mine, theirs, choices), [base, mine, theirs, choices]);
  /** The merge with one open difference taken from either side, the others as chosen or as they were. */
  const withChoice = (difference: DocumentDifference, side: Side) => {
    const rest = Object.fromEntries(open.map(({ id }) => [id, choices[id] ?? 'theirs']));
    const tried = mergeDocuments(base, mine, theirs, { ...rest, [difference.id]: side });
    return tried.ok ? maker.check(tried.value.document) : undefined;
  };

  const effects = merged.ok
    ? changedVerdicts(maker.check(theirs), maker.check(merged.value.document), engine.ruleBook)
    : [];

  return (
    <div className="page max-w-[72rem]!">
      <h1
        tabIndex={-1}
        data-page-heading
        className="text-3xl font-light tracking-hero text-balance max-tablet:text-2xl"
      >
        {setName} changed while you were working.
      </h1>
      <p className="mt-2 max-w-text text-lg text-ink-2">
        {current.savedBy.name || 'Somebody'} saved draft {current.number} at {timeWords(current.savedAt)},
        after you opened draft {began.number}. Nothing is lost: both versions are kept.{' '}
        {open.length === 0
          ? 'No number differs on both sides.'
          : open.length === 1
            ? 'One thing differs on both sides; choose.'
            : `${open.length} things differ on both sides; choose one of each.`}
      </p>

      <div className="mt-8 grid gap-x-8 border-b-[1.25px] border-ink pb-2 text-sm text-ink-2 max-tablet:hidden tablet:grid-cols-[13rem_8rem_1fr_1fr]">
        <span />
        <span className="self-end font-medium">When you began</span>
        <span>
          <strong className="block text-lg font-semibold text-ink">Yours</strong>not saved yet
        </span>
        <span>
          <strong className="block text-lg font-semibold text-ink">{who}’s</strong>saved at{' '}
          {timeWords(current.savedAt)}
        </span>
      </div>
      {open.map((difference) => (
        <ConflictChoice
          key={difference.id}
          difference={difference}
          theirName={who}
          value={choices[difference.id]}
          words={words}
          sheets={{ mine: withChoice(difference, 'mine'), theirs: withChoice(difference, 'theirs') }}
          onChoose={(side) => setChoices((before) => ({ ...before, [difference.id]: side }))}
        />
      ))}
      <ul>
        {settled.map((difference) => (
          <li
            key={difference.id}
            className="grid gap-x-8 border-b border-rule py-2.5 tablet:grid-cols-[13rem_8rem_1fr]"
          >
            <span className="font-medium">{nameOf(difference)}</span>
            <span className="text-ink-2">
              <Measure text={sayValue(difference, 'base', words)} />
            </span>
            <span className="text-ink-2">
              <strong className="font-semibold text-ink">
                <Measure
                  text={sayValue(difference, difference.changedBy === 'theirs' ? 'theirs' : 'mine', words)}
                />
              </strong>{' '}
              {difference.changedBy === 'mine'
                ? 'changed by you only, kept'
                : difference.changedBy === 'theirs'
                  ? `changed by ${who} only, kept`
                  : 'added on both sides, both kept'}
            </span>
          </li>
        ))}
      </ul>

      <div className="mt-5 max-w-text text-sm text-ink-2" aria-live="polite">
        {merged.ok ? (
          <>
            <p>
              {effects.length === 0
                ? `With these choices no verdict differs from ${who}’s draft.`
                : `With these choices, against ${who}’s draft: ${effects.join('; ')}.`}
            </p>
            {merged.value.unseated.length > 0 && (
              <p className="font-medium text-wont">
                {merged.value.unseated.length === 1
                  ? 'One person loses'
                  : `${merged.value.unseated.length} people lose`}{' '}
                their place.
              </p>
            )}
            {merged.value.remarked.map(({ from, to }) => (
              <p key={from}>
                Both added a {from}; yours becomes {to}.
              </p>
            ))}
          </>
        ) : (
          merged.error.code === 'invalid' && <p className="text-wont">{merged.error.message}</p>
        )}
      </div>
      {copyProblem && (
        <Notice tone="wont" className="mt-4">
          {copyProblem}
        </Notice>
      )}
      <div className="mt-6 flex flex-wrap items-center gap-3">
        <Button
          look="main"
          disabled={!merged.ok}
          onClick={() => {
            if (merged.ok) autosave.resolve(current, merged.value.document);
          }}
        >
          Save these choices
        </Button>
        <Button
          onClick={() => {
            copyAsSet(path, `${setName}, my copy`, mine).then(
              (copy) => {
                autosave.resolve(current, theirs);
                void navigate(`/w/${path.workshopId}/p/${path.productionId}/sets/${copy.id}`);
              },
              (error: unknown) => setCopyProblem(sayProblem(error)),
            );
          }}
        >
          Keep mine as a copy
        </Button>
        <span className="ml-auto text-sm text-ink-2">
          {missing.length > 0
            ? `${missing.length} still to choose.`
            : `Saving makes draft ${current.number + 1}; issued revisions stay as they are. You can undo it.`}
        </span>
      </div>
      <p className="mt-3 text-xs text-ink-3">
        + room left, − short. Lengths are shown to <Measure text={formatLength(3.175, style)} />.
      </p>
    </div>
  );
}

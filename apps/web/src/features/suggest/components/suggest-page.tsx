import { dimensionsOf } from '@settlewright/geometry';
import { useEffect, useMemo, useRef, useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '@/components/button.tsx';
import { EmptyState } from '@/components/empty-state.tsx';
import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { announce } from '@/lib/announce.ts';
import { CROWDS, crowdWords } from '@/lib/crowd/crowds.ts';
import { useOwnCrowd, useOwnCrowds } from '@/lib/crowd/own-crowds.ts';
import { usePageTitle } from '@/lib/page-title.ts';
import { useSession } from '@/lib/session.ts';
import { readSearch } from '../kept-search.ts';
import { freeOf, questionOf, startForm } from '../search-form.ts';
import { useSuggestView } from '../suggest-view.ts';
import { useSearch } from '../use-search.ts';
import { triedWords } from '../words.ts';
import { FreeDimensions } from './free-dimensions.tsx';
import { SearchProgress } from './search-progress.tsx';
import { SearchResults } from './search-results.tsx';
import { WhomToServe } from './whom-to-serve.tsx';

interface SuggestPageProps {
  roomTo: string;
}

/** Dimensions suggested for everyone named, and then for most of a population. */
export function SuggestPage({ roomTo }: SuggestPageProps) {
  const { setName, replace } = useSuggestView();
  usePageTitle(`Suggest dimensions, ${setName}`);
  const back = (
    <Link className="link self-center" to={roomTo}>
      Back to the room
    </Link>
  );
  return (
    <div className="page">
      <PageHeading
        title="Suggest dimensions"
        below="Say what may move and how far. The search serves everyone named first, then as many of a population as it can."
        actions={back}
      />
      {replace ? (
        <Searching />
      ) : (
        <EmptyState title="For those who decide the dimensions">
          The owner and the designers of the workshop search for dimensions. Everybody can see who fits.
        </EmptyState>
      )}
    </div>
  );
}

function Searching() {
  const { setId, document, sheet, sitters, style } = useSuggestView();
  const userId = useSession((state) => state.user?.id ?? '');
  const [kept] = useState(() => readSearch(userId, setId));
  const [form, setForm] = useState(() => kept?.form ?? startForm(document));
  const own = useOwnCrowds();
  const ownCrowd = useOwnCrowd(form.crowd?.populationId ?? '');
  const { run, start, stop } = useSearch(userId, setId);
  const [taken, setTaken] = useState<string>();
  const found = useRef<HTMLDivElement>(null);

  const dimensions = useMemo(() => dimensionsOf(document), [document]);
  const free = useMemo(() => freeOf(form, dimensions, style), [form, dimensions, style]);
  const served = sitters.filter(({ id }) => !form.leftOut.includes(id));
  const crowd = form.crowd ? { ...form.crowd, ...(ownCrowd.own ? { own: ownCrowd.own } : {}) } : undefined;
  const asked = {
    document,
    free,
    sitters: served,
    confidence: sheet.confidence,
    ...(crowd ? { crowd } : {}),
  };
  // A note in the known differences, or a new name, changes nothing that the search looks at.
  const { pieces, asked: setAsks } = document;
  const question = questionOf([
    pieces,
    setAsks,
    free,
    served,
    sheet.confidence,
    sheet.ruleVersion,
    form.crowd,
  ]);

  useEffect(() => {
    // What was kept in this tab goes on once, when the page opens.
    const waits = form.crowd !== null && (ownCrowd.isPending || ownCrowd.error !== null);
    if (!run && kept && kept.state !== 'stopped' && kept.question === question && !waits) {
      start({ form, question, asked, known: kept.tried });
    }
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [ownCrowd.isPending]);

  const searched = run?.asked.sitters;
  const toServe = useMemo(() => new Set(searched?.map(({ id }) => id)), [searched]);
  const state = run?.state;
  useEffect(() => {
    if (state === 'done' || state === 'stopped') announce('The answers are there.');
  }, [state]);

  const isRunning = state === 'running';
  const isStale = run !== undefined && run.question !== question;
  const nothing = free.length === 0 || (served.length === 0 && !crowd);
  const begin = () => {
    setTaken(undefined);
    start({ form, question, asked, ...knownOf(kept, question) });
    found.current?.scrollIntoView({ block: 'start' });
  };
  return (
    <>
      <div className="grid gap-x-12 gap-y-8 tablet:grid-cols-2">
        <FreeDimensions dimensions={dimensions} form={form} onChange={setForm} />
        <div>
          <WhomToServe form={form} own={own} onChange={setForm} />
          {ownCrowd.error && (
            <Notice tone="wont" className="mt-4">
              {ownCrowd.error.message}
            </Notice>
          )}
          <div className="mt-6 flex flex-wrap items-center gap-4">
            <Button
              look="main"
              disabled={nothing || ownCrowd.isPending || ownCrowd.error !== null}
              busy={isRunning && !isStale}
              busyWords="Searching"
              onClick={begin}
            >
              {run ? 'Search again' : 'Search'}
            </Button>
            <p className="text-sm text-ink-2">
              {nothing
                ? 'Tick something that may move, and somebody to serve.'
                : ownCrowd.error
                  ? 'Choose another population, or untick it, to search.'
                  : 'A few seconds. The set stays as it is until you take an answer.'}
            </p>
          </div>
        </div>
      </div>
      <div ref={found} className="mt-10 min-h-16 scroll-mt-20">
        {run?.state === 'failed' && (
          <Notice tone="wont" title="The search failed">
            {run.fault}
          </Notice>
        )}
        {run && isRunning && <SearchProgress run={run} onStop={stop} />}
        {isStale && !isRunning && (
          <Notice className="mb-6" title={taken && 'Taken'}>
            {taken
              ? `${taken}. Undo puts it back.`
              : 'The set or what was asked has changed since: these answers are for what it was. Search again.'}
          </Notice>
        )}
        {(state === 'stopped' || state === 'done') && run?.told && !isStale && (
          <p className="mb-4 text-sm text-ink-2">{triedWords(state, run.told.suggestion)}</p>
        )}
      </div>
      {run?.told && !isStale && (
        <SearchResults
          told={run.told}
          dimensions={dimensions}
          free={run.asked.free}
          toServe={toServe}
          isOver={!isRunning}
          crowdName={form.crowd ? crowdWords(form.crowd, [...own, ...CROWDS]) : ''}
          onTaken={setTaken}
        />
      )}
    </>
  );
}

const knownOf = (kept: ReturnType<typeof readSearch>, question: string) =>
  kept?.question === question ? { known: kept.tried } : {};

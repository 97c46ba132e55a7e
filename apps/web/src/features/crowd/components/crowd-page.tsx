import { useEffect, useState } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { Button } from '@/components/button.tsx';
import { EmptyState } from '@/components/empty-state.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { PopulationFields } from '@/components/population-fields.tsx';
import { announce } from '@/lib/announce.ts';
import { CROWDS, crowdWords, DEFAULT_CROWD, type CrowdChoice } from '@/lib/crowd/crowds.ts';
import { countedWords, EVERY_PLACE, sharesDiffer } from '@/lib/crowd/counted-words.ts';
import { useOwnCrowd, useOwnCrowds } from '@/lib/crowd/own-crowds.ts';
import { usePageTitle } from '@/lib/page-title.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useCrowdView } from '../crowd-view.ts';
import { AddSurvey } from '../survey/add-survey.tsx';
import { OwnSurveys } from '../survey/own-surveys.tsx';
import { useShares, type Shares } from '../use-shares.ts';
import { isAbout, ofHundred, rejectionWords } from '../words.ts';
import { AllAtOnce } from './all-at-once.tsx';
import { CheckShares } from './check-shares.tsx';
import { CountMillion } from './count-million.tsx';
import { CrowdCaution } from './crowd-caution.tsx';
import { PlaceShares } from './place-shares.tsx';

/** What share of a population a set fits, check by check and all at once. */
export function CrowdPage({ roomTo, fitTo }: { roomTo: string; fitTo: string }) {
  const { setName, document } = useCrowdView();
  usePageTitle(`Who fits, ${setName}`);
  const hasPlaces = document.pieces.some(({ kind }) => kind === 'bench' || kind === 'loose-seat');
  return (
    <div className="page">
      <PageHeading
        title="Who fits"
        below="How many of a population can sit at every place of this set, wherever they sit down."
        actions={
          <>
            <Link className="link self-center" to={fitTo}>
              Fit sheet
            </Link>
            <Link className="link self-center" to={roomTo}>
              Back to the room
            </Link>
          </>
        }
      />
      {hasPlaces ? (
        <Counted />
      ) : (
        <EmptyState title="No place to sit">Add a bench or a loose seat in the room first.</EmptyState>
      )}
    </div>
  );
}

/** The choice stands in the address, so that others see the same people. */
function useCrowdAddress(): [CrowdChoice, (crowd: CrowdChoice) => void] {
  const [params, setParams] = useSearchParams();
  const women = Number(params.get('women') ?? DEFAULT_CROWD.women);
  const crowd = {
    populationId: params.get('people') ?? DEFAULT_CROWD.populationId,
    women: women >= 0 && women <= 100 ? women : DEFAULT_CROWD.women,
  };
  const choose = (next: CrowdChoice) =>
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        after.set('people', next.populationId);
        after.set('women', String(next.women));
        return after;
      },
      { replace: true, preventScrollReset: true },
    );
  return [crowd, choose];
}

function Counted() {
  const { ruleBook } = useCrowdView();
  const nameOf = (ruleId: string) => ruleBook.rule(ruleId).columnName.toLowerCase();
  const { canEdit } = useWorkshop();
  const [crowd, choose] = useCrowdAddress();
  const [unticked, setUnticked] = useState<ReadonlySet<string>>(new Set());
  const own = useOwnCrowds();
  const ownCrowd = useOwnCrowd(crowd.populationId);
  const request = ownCrowd.isPending
    ? undefined
    : { ...crowd, ...(ownCrowd.own ? { own: ownCrowd.own } : {}) };
  // The rows show every check; what counts at once is asked beside them.
  const every = useShares({ crowd: request, ruleIds: undefined });
  const all = every.shares?.checks.map(({ ruleId }) => ruleId) ?? [];
  const ticked = new Set(all.filter((id) => !unticked.has(id)));
  const isPart = all.length > 0 && ticked.size < all.length;
  const part = useShares({ crowd: isPart ? request : undefined, ruleIds: isPart ? [...ticked] : undefined });
  // Until the part is counted the whole stays in view, faint.
  const joint = isPart ? { ...part, shares: part.shares ?? every.shares } : every;
  const fault = ownCrowd.error?.message ?? every.fault ?? part.fault;
  const worst = joint.isCounting ? undefined : joint.shares?.rejectsMost?.ruleId;
  useSaid(joint);
  return (
    <>
      <div className="mb-8 max-w-text">
        <PopulationFields crowd={crowd} own={own} onChange={choose} />
        {canEdit && (
          <div className="mt-2 grid justify-items-start gap-1">
            <AddSurvey onAdded={(populationId) => choose({ ...crowd, populationId })} />
            <OwnSurveys onRemoved={(id) => id === crowd.populationId && choose(DEFAULT_CROWD)} />
          </div>
        )}
      </div>
      {fault !== undefined && (
        <Notice tone="wont" title="The people could not be counted">
          {fault}
        </Notice>
      )}
      {fault !== undefined && !every.shares && <CountMillion />}
      {!every.shares && fault === undefined && <LoadingLine words="Drawing the people" />}
      {every.shares && joint.shares && (
        <div className={joint.isCounting ? 'quick opacity-60' : 'quick'} aria-busy={joint.isCounting}>
          <div className="ruled mb-8 pt-4">
            {ticked.size === 0 ? (
              <p className="text-xl font-light tracking-hero">Tick a check to count it.</p>
            ) : (
              <>
                <AllAtOnce outcome={joint.shares.all} checks={ticked.size} of={all.length} />
                <p className="mt-2 max-w-text text-sm text-ink-2">
                  {countedWords({
                    passes: 'fit',
                    checks: isPart ? [...ticked].map(nameOf) : all.length,
                    places: EVERY_PLACE,
                  })}{' '}
                  {sharesDiffer('whoFits')}
                </p>
                <p className="mt-2">
                  {rejectionWords(joint.shares.rejectsMost, joint.shares.rejectsNext, ruleBook)}{' '}
                  {worst !== undefined && ticked.size > 1 && (
                    <Button look="word" onClick={() => setUnticked(new Set([...unticked, worst]))}>
                      Count without {nameOf(worst)}
                    </Button>
                  )}
                </p>
              </>
            )}
          </div>
          <CheckShares
            checks={every.shares.checks}
            ticked={ticked}
            onTick={(ids) => setUnticked(new Set(all.filter((id) => !ids.includes(id))))}
          />
          <PlaceShares places={joint.shares.places} />
          {ticked.size > 0 && <CountMillion crowd={crowd} ruleIds={isPart ? [...ticked] : undefined} />}
          <CrowdCaution name={crowdWords(crowd, [...own, ...CROWDS])} shares={every.shares} />
        </div>
      )}
    </>
  );
}

/** Says the new share when it has been counted. */
function useSaid({ shares, isCounting }: { shares?: Shares; isCounting: boolean }): void {
  useEffect(() => {
    if (!isCounting && shares?.all.kind === 'shares') {
      const { mixed } = shares.all.fits;
      announce(`${isAbout(mixed) ? 'About ' : ''}${ofHundred(mixed)} in 100 fit.`);
    }
  }, [shares, isCounting]);
}

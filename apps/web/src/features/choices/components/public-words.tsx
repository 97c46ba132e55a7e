import type { Rejection } from '@settlewright/anthropometry';
import { memo } from 'react';
import { Disclosure } from '@/components/disclosure.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { Measure } from '@/components/measure.tsx';
import { countedWords, sharesDiffer } from '@/lib/crowd/counted-words.ts';
import { aboutInHundred, exactValue } from '@/lib/dimension-words.ts';
import { useChoices } from '../choices-view.ts';
import { shareAt, type ShareCurves } from '../use-share-curve.ts';

interface PublicWordsProps {
  curves: ShareCurves | undefined;
  /** Rules of the solid curve. */
  ruleIds: ReadonlySet<string>;
  /** The check that turns most away at the present value. */
  rejection: Rejection | undefined;
  present: number;
  suggested: number | undefined;
  unit: 'mm' | 'deg' | 'N';
  whole: string;
  wear: string;
}

const told = (share: number | undefined) => (share === undefined ? 'not known' : aboutInHundred(share));

/** The share of the public in words: by the shown checks, and by every check at once. */
export const PublicWords = memo(function PublicWords({
  curves,
  ruleIds,
  rejection,
  present,
  suggested,
  unit,
  whole,
  wear,
}: PublicWordsProps) {
  const { ruleBook, style } = useChoices();
  if (!curves) {
    return (
      <div>
        <LoadingLine words="Counting people" />
      </div>
    );
  }
  const values = suggested === undefined ? [present] : [present, suggested];
  const { told: from, points, joint, placeIds } = curves;
  const counted = countedWords({
    passes: 'fit',
    checks: [...ruleIds].map((id) => ruleBook.rule(id).columnName.toLowerCase()),
    places: placeIds.length === 1 ? 'the 1 place that moves' : `all ${placeIds.length} places that move`,
  });
  return (
    <div className="text-sm">
      <p>
        <span className="font-semibold">Share who fit</span> of {whole}, with {wear}.
      </p>
      <dl className="mt-1 grid w-fit gap-x-6 gap-y-1 tablet:grid-cols-[auto_auto_auto]">
        {values.map((value) => (
          <div key={value} className="tablet:col-span-3 tablet:grid tablet:grid-cols-subgrid">
            <dt className="text-ink-3">
              at <Measure text={exactValue(value, unit, style)} />
            </dt>
            <dd>{told(shareAt(points, value))} by the checks shown</dd>
            <dd className="text-ink-2">
              {told(shareAt(joint, value))} by every check of a person at once (dashed)
            </dd>
          </div>
        ))}
      </dl>
      <p className="mt-1 max-w-text text-ink-2">
        {counted} Dashed, every check of a person at the same places. {sharesDiffer('stick')}
      </p>
      <p className="mt-1 max-w-text text-ink-2">
        {rejection && (
          <>
            As it stands, {ruleBook.rule(rejection.ruleId).columnName.toLowerCase()} turns most away,{' '}
            {aboutInHundred(rejection.lost)}.{' '}
          </>
        )}
        All else is held as it is drawn. Ten thousand people are drawn from the survey’s statistics, so a
        share is good to about one in 100 of those surveyed, and less for anybody else.
      </p>
      <Disclosure words="Who these people are">
        <ul className="max-w-text list-disc pl-5 text-ink-2">
          {from.cautions.map((caution) => (
            <li key={caution}>{caution}</li>
          ))}
          <li>Source: {from.source}.</li>
        </ul>
      </Disclosure>
    </div>
  );
});

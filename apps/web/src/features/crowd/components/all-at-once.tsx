import type { ShareOutcome } from '@settlewright/anthropometry';
import { isAbout, ofHundred, overDropWords, rangeWords, sexWords } from '../words.ts';

interface AllAtOnceProps {
  outcome: ShareOutcome;
  checks: number;
  of: number;
}

/** The number this page is for: how many of 100 fit all ticked checks at once. */
export function AllAtOnce({ outcome, checks, of }: AllAtOnceProps) {
  if (outcome.kind !== 'shares') {
    return (
      <p className="text-xl font-light tracking-hero">
        {outcome.kind === 'silent'
          ? outcome.reason
          : 'Not known: a measure that is read is not known of these people.'}
      </p>
    );
  }
  const { fits, atLeastTight, overDrop } = outcome;
  const drop = overDropWords(overDrop?.fits);
  const sexes = sexWords(fits);
  const value = ofHundred(fits.mixed);
  const counted = checks === of ? 'all checks at once' : `${checks} of ${of} checks at once`;
  return (
    <div>
      <p className="tracking-hero">
        {isAbout(fits.mixed) && <span className="text-xl font-light">about </span>}
        <span className={/^\d/.test(value) ? 'text-4xl font-light' : 'text-2xl font-light'}>{value}</span>
        <span className="text-xl font-light"> in 100 fit {counted}</span>
      </p>
      <p className="mt-1 text-ink-2">
        {rangeWords(fits.mixed)}
        {drop && `, ${drop}`}
        {sexes && `; ${sexes}`}. At least tight: {ofHundred(atLeastTight.mixed)} in 100.
      </p>
    </div>
  );
}

import { PERSON_CHECKS, type DropSpan, type Lost } from '@settlewright/anthropometry';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { Button } from '@/components/button.tsx';
import { useCrowdView } from '../crowd-view.ts';
import type { Shares } from '../use-shares.ts';
import { ofHundred, overDropWords, sexWords } from '../words.ts';
import { ShareBar } from './share-bar.tsx';

interface CheckSharesProps {
  /** Of every check, whatever is ticked. */
  checks: Shares['checks'];
  ticked: ReadonlySet<string>;
  onTick: (ruleIds: string[]) => void;
}

/** A row for each check: how many fit it at every place, who is lost, and a tick for whether it counts. */
export function CheckShares({ checks, ticked, onTick }: CheckSharesProps) {
  const { ruleBook } = useCrowdView();
  const all = checks.map(({ ruleId }) => ruleId);
  const change = (ruleId: string) =>
    onTick(all.filter((id) => (id === ruleId ? !ticked.has(id) : ticked.has(id))));
  return (
    <section aria-labelledby="checks-heading">
      <RuleHeading
        id="checks-heading"
        aside={
          ticked.size < all.length && (
            <Button look="word" onClick={() => onTick(all)}>
              Count all checks
            </Button>
          )
        }
      >
        Check by check
      </RuleHeading>
      <p className="mb-2 text-sm text-ink-2">
        Each at every place of the set. The full bar fits, the hatched one is tight. Ticked checks count at
        once.
      </p>
      <ul>
        {checks.map(({ ruleId, outcome, lost }) => (
          <li
            key={ruleId}
            className="grid items-center gap-x-4 gap-y-1 border-t border-rule py-2 tablet:grid-cols-[11rem_minmax(6rem,1fr)_12.5rem_minmax(0,1.4fr)]"
          >
            <label className="flex min-h-8 items-center gap-3 font-medium">
              <input
                type="checkbox"
                className="size-4 shrink-0 accent-(--color-chalk)"
                checked={ticked.has(ruleId)}
                onChange={() => change(ruleId)}
              />
              {ruleBook.rule(ruleId).columnName}
            </label>
            {outcome.kind === 'shares' ? (
              <>
                <ShareBar fits={outcome.fits.mixed} atLeastTight={outcome.atLeastTight.mixed} />
                <p className="text-sm">
                  <strong className="font-semibold">{ofHundred(outcome.fits.mixed)} fit</strong>,{' '}
                  {ofHundred(outcome.atLeastTight.mixed)} at least tight
                  <OverDrop span={outcome.overDrop?.fits} />
                </p>
                <p className="text-sm text-ink-2">
                  {lostWords(lost)}
                  {sexWords(outcome.fits) && <span className="text-ink-3"> ({sexWords(outcome.fits)})</span>}
                </p>
              </>
            ) : (
              <p className="text-sm text-ink-2 tablet:col-span-3">
                {outcome.kind === 'silent'
                  ? outcome.reason
                  : 'Not known: a measure that is read is not known of these people.'}
              </p>
            )}
          </li>
        ))}
      </ul>
      <Silent told={all} />
    </section>
  );
}

function OverDrop({ span }: { span: DropSpan | undefined }) {
  const words = overDropWords(span);
  return words && <span className="block text-ink-2">{words}</span>;
}

const lostWords = (lost: Lost | undefined): string =>
  lost === undefined ? 'Nobody is lost' : lost.share === 1 ? 'Lost: everybody' : `Lost: ${lost.words}`;

/** Checks of a person that have nothing to say of this set. */
function Silent({ told }: { told: readonly string[] }) {
  const { ruleBook } = useCrowdView();
  const silent = PERSON_CHECKS.filter(({ id }) => !told.includes(id));
  if (silent.length === 0) return null;
  const names = silent.map(({ id }) => ruleBook.rule(id).columnName.toLowerCase());
  return (
    <p className="border-t border-rule pt-2 text-sm text-ink-2">Nothing to ask of: {names.join(', ')}.</p>
  );
}

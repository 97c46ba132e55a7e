import { RuleHeading } from '@/components/rule-heading.tsx';
import { useCrowdView } from '../crowd-view.ts';
import type { Shares } from '../use-shares.ts';
import { ofHundred, overDropWords } from '../words.ts';
import { ShareBar } from './share-bar.tsx';

/** Ticked checks at once, place by place. */
export function PlaceShares({ places }: { places: Shares['places'] }) {
  const { document } = useCrowdView();
  const markOf = (pieceId: string | undefined) =>
    document.pieces.find(({ id }) => id === pieceId)?.mark ?? '';
  return (
    <section aria-labelledby="places-heading" className="mt-10">
      <RuleHeading id="places-heading">Place by place</RuleHeading>
      <ul className="grid gap-x-10 tablet:grid-cols-2">
        {places.map(({ placeId, outcome }) => {
          const [pieceId, place] = placeId.split(':');
          const drop = outcome.kind === 'shares' ? overDropWords(outcome.overDrop?.fits) : undefined;
          return (
            <li
              key={placeId}
              className="grid min-h-10 grid-cols-[6rem_minmax(0,1fr)] items-center gap-x-4 phone:grid-cols-[6rem_minmax(0,1fr)_12.5rem] border-t border-rule py-1.5"
            >
              <span className="font-medium">
                {markOf(pieceId)}, place {place}
              </span>
              {outcome.kind === 'shares' ? (
                <>
                  <ShareBar fits={outcome.fits.mixed} atLeastTight={outcome.atLeastTight.mixed} />
                  <span className="text-sm max-phone:col-start-2">
                    {ofHundred(outcome.fits.mixed)} fit, {ofHundred(outcome.atLeastTight.mixed)} at least
                    tight
                    {drop && <span className="block text-ink-2">{drop}</span>}
                  </span>
                </>
              ) : (
                <span className="text-sm phone:col-span-2 text-ink-2">
                  {outcome.kind === 'silent' ? outcome.reason : 'not known'}
                </span>
              )}
            </li>
          );
        })}
      </ul>
    </section>
  );
}

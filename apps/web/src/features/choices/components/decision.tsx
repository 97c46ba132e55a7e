import { type StoryStick, type Dimension } from '@settlewright/geometry';
import { memo, useMemo, useState, type KeyboardEvent } from 'react';
import { Button } from '@/components/button.tsx';
import { Measure } from '@/components/measure.tsx';
import { footRails } from '@/lib/foot-rails.ts';
import { withKnownDifference } from '@/lib/known-difference.ts';
import { useSession } from '@/lib/session.ts';
import { shortName } from '@/lib/short-name.ts';
import { exactValue, joinWords, markWords } from '@/lib/dimension-words.ts';
import { useChoices } from '../choices-view.ts';
import { effectsOf, lostIn } from '../effects.ts';
import type { Offer } from '../offer.ts';
import { railHeights, servesWords } from '../offer-words.ts';
import type { TriedValues } from '../tried-values.ts';
import { moreWords, shareAt, type ShareCurves } from '../use-share-curve.ts';
import { movingWords } from '../words.ts';
import { KeepChoice } from './keep-choice.tsx';
import { focusLine, goesBack, staysNear, TRIAL_MARK } from './plumb-slider.tsx';
import { NothingBetter } from './nothing-better.tsx';
import { RailOffer } from './rail-offer.tsx';
import { TakeChoice } from './take-choice.tsx';

interface DecisionProps {
  tried: TriedValues;
  stick: StoryStick;
  ruleIds: ReadonlySet<string>;
  present: number;
  /** The value under the hand, once it rests there. */
  trying: number | undefined;
  /** Absent when nobody's verdict follows the dimension. */
  offer: Offer | undefined;
  /** Absent when the present value serves as many as any. */
  suggested: number | undefined;
  curves: ShareCurves | undefined;
  onTake: () => void;
  onLeave: () => void;
}

const alongWords = ({ tableMarks }: Dimension): string =>
  tableMarks.length === 0
    ? ''
    : `${tableMarks.length === 1 ? 'table' : 'tables'} ${markWords(tableMarks)} along with it`;

/** The choice in plain words: take another value, give somebody a rail, or keep what is and say why. */
export const Decision = memo(function Decision({
  tried,
  stick,
  ruleIds,
  present,
  trying,
  offer,
  suggested,
  curves,
  onTake,
  onLeave,
}: DecisionProps) {
  const { document, check, replace, ruleBook, style } = useChoices();
  const by = useSession((state) => state.user?.name);
  const [railNoted, setRailNoted] = useState(false);
  const { dimension } = tried;
  const show = (value: number) => exactValue(value, dimension.unit, style);
  const now = show(present);
  const target = trying ?? suggested;
  const next = target === undefined ? undefined : dimension.at(target);
  const moving = useMemo(() => new Set(stick.ruleIds), [stick]);
  const effects = useMemo(
    () =>
      next && effectsOf({ before: check(document), after: check(next), ruleIds, moving, ruleBook, style }),
    [document, next, check, ruleIds, moving, ruleBook, style],
  );
  const lost = useMemo(
    () => lostIn(check(document), moving, ruleBook, style),
    [document, check, moving, ruleBook, style],
  );
  const rails = useMemo(
    () => (moving.has(dimension.ruleId) && dimension.unit === 'mm' ? footRails(check(document)) : []),
    [document, check, moving, dimension],
  );
  const share = (value: number) => curves && shareAt(curves.points, value);
  const served = target === undefined ? undefined : share(target);
  const names = (list: readonly string[]) => joinWords(list.map((line) => line.replace(/, .*$/, '')));
  const losing = lost.length === 0 ? '' : `; ${names(lost)} won’t fit`;
  const railing =
    railNoted && rails.length > 0
      ? `; with a foot rail for ${joinWords(rails.map((rail) => `${shortName(rail.name)} (${railHeights(rail, tried.step, style)})`))}`
      : '';
  const difference = `${dimension.label} kept at ${now} (${movingWords(dimension)})${losing}${railing}.`;
  const keep = (reason: string) => {
    replace?.(
      withKnownDifference(document, { text: difference, reason, by }),
      `${dimension.label} kept at ${now}`,
    );
  };
  const leave = () => {
    onLeave();
    focusLine();
  };
  const take = () => {
    if (trying !== undefined) {
      onTake();
      focusLine();
    } else if (next && target !== undefined) replace?.(next, `${dimension.label} ${now} to ${show(target)}`);
  };
  const back = (event: KeyboardEvent) => {
    if (trying === undefined || !goesBack(event)) return;
    event.preventDefault();
    leave();
  };
  return (
    <aside aria-label="The choice" className="min-w-0 desk:row-span-2">
      <p className="mb-3 flex flex-wrap items-baseline gap-x-3 text-4xl font-light tracking-hero">
        <Measure text={now} />
        {target !== undefined && (
          <span className="flex items-baseline gap-3">
            <span className="text-base font-normal tracking-normal text-ink-3">to</span>
            <span className="font-normal text-chalk">
              <Measure text={show(target)} />
            </span>
          </span>
        )}
      </p>
      {target !== undefined && next && effects ? (
        // Escape in here ends the trial, as it does on the line.
        <div
          onKeyDown={back}
          onBlur={(event) => trying !== undefined && !staysNear(event) && onTake()}
          {...(trying !== undefined && TRIAL_MARK)}
        >
          <TakeChoice
            value={show(target)}
            along={alongWords(dimension)}
            serves={trying === undefined && offer ? servesWords(offer, stick.sitters.length) : undefined}
            effects={effects}
            publicWords={moreWords(share(present), served)}
            onTake={replace && take}
          >
            {trying !== undefined && (
              <Button onMouseDown={(event) => event.preventDefault()} onClick={leave}>
                <span>
                  Back to <Measure text={now} />
                </span>
              </Button>
            )}
          </TakeChoice>
        </div>
      ) : (
        <NothingBetter now={now} stick={stick} present={present} />
      )}
      {rails.length > 0 && (
        <RailOffer
          rails={rails.map((rail) => ({
            name: shortName(rail.name),
            says: railHeights(rail, tried.step, style),
          }))}
          isNoted={railNoted}
          onNote={replace && setRailNoted}
        />
      )}
      <KeepChoice
        value={now}
        lost={lost}
        publicWords={
          target === undefined ? undefined : moreWords(served, share(present), ` than at ${show(target)}`)
        }
        difference={difference}
        onKeep={replace && keep}
      />
    </aside>
  );
});

import { type StoryStick, type Dimension } from '@settlewright/geometry';
import { memo, useMemo } from 'react';
import { Measure } from '@/components/measure.tsx';
import { withKnownDifference } from '@/lib/known-difference.ts';
import { useSession } from '@/lib/session.ts';
import { exactValue, joinWords, markWords } from '@/lib/dimension-words.ts';
import { useChoices } from '../choices-view.ts';
import { effectsOf, lostIn } from '../effects.ts';
import type { TriedValues } from '../tried-values.ts';
import { shareAt, type ShareCurves } from '../use-share-curve.ts';
import { movingWords } from '../words.ts';
import { KeepChoice } from './keep-choice.tsx';
import { TakeChoice } from './take-choice.tsx';

interface DecisionProps {
  tried: TriedValues;
  stick: StoryStick;
  ruleIds: ReadonlySet<string>;
  present: number;
  /** Absent when the present value serves as many as any. */
  suggested: number | undefined;
  curves: ShareCurves | undefined;
}

const SAME = 0.005;

/** "25 more in 100", never "fewer people, 25 in 100". */
function publicWords(from: number | undefined, to: number | undefined, than = ''): string | undefined {
  if (from === undefined || to === undefined) return undefined;
  const by = Math.round(to * 100) - Math.round(from * 100);
  if (Math.abs(to - from) < SAME || by === 0) return `about as many${than.replace(/^ than/, ' as')}`;
  return `about ${Math.abs(by)} ${by > 0 ? 'more' : 'fewer'} in 100${than}`;
}

const alongWords = ({ tableMarks }: Dimension): string =>
  tableMarks.length === 0
    ? ''
    : `${tableMarks.length === 1 ? 'table' : 'tables'} ${markWords(tableMarks)} along with it`;

/** The choice in plain words: take the suggestion, or keep what is and say so. */
export const Decision = memo(function Decision({
  tried,
  stick,
  ruleIds,
  present,
  suggested,
  curves,
}: DecisionProps) {
  const { document, check, replace, ruleBook, style } = useChoices();
  const by = useSession((state) => state.user?.name);
  const { dimension } = tried;
  const show = (value: number) => exactValue(value, dimension.unit, style);
  const now = show(present);
  const next = suggested === undefined ? undefined : dimension.at(suggested);
  const effects = useMemo(
    () => next && effectsOf({ before: check(document), after: check(next), ruleIds, ruleBook, style }),
    [document, next, check, ruleIds, ruleBook, style],
  );
  const lost = useMemo(
    () => lostIn(check(document), ruleIds, ruleBook, style),
    [document, check, ruleIds, ruleBook, style],
  );
  const share = (value: number) => curves && shareAt(curves.points, value);
  const served = suggested === undefined ? undefined : share(suggested);
  const losing =
    lost.length === 0 ? '' : `; ${joinWords(lost.map((line) => line.replace(/, .*$/, '')))} won’t fit`;
  const difference = `${dimension.label} kept at ${now} (${movingWords(dimension)})${losing}.`;
  const keep = (reason: string) => {
    replace?.(
      withKnownDifference(document, { text: difference, reason, by }),
      `${dimension.label} kept at ${now}`,
    );
  };
  return (
    <aside aria-label="The choice" className="min-w-0 desk:row-span-2">
      <p className="mb-3 flex items-baseline gap-3 text-4xl font-light tracking-hero">
        <Measure text={now} />
        {suggested !== undefined && (
          <>
            <span className="text-base font-normal tracking-normal text-ink-3">to</span>
            <span className="font-normal text-chalk">
              <Measure text={show(suggested)} />
            </span>
          </>
        )}
      </p>
      {suggested !== undefined && next && effects ? (
        <TakeChoice
          value={show(suggested)}
          along={alongWords(dimension)}
          effects={effects}
          publicWords={publicWords(share(present), served)}
          onTake={replace && (() => replace(next, `${dimension.label} ${now} to ${show(suggested)}`))}
        />
      ) : (
        <section className="ruled pt-3 pb-4">
          <h2 className="mb-1 text-lg font-semibold">
            {stick.rows.length === 0 ? 'Nobody’s verdict follows it' : <>No other value serves more</>}
          </h2>
          <p className="text-sm text-ink-2">
            {stick.rows.length === 0 ? (
              'No check of the people seated here reads this number by the rule that is shown.'
            ) : (
              <>
                <Measure text={now} /> serves as many of the people seated here as any value between the ends
                of the tape.
              </>
            )}
          </p>
        </section>
      )}
      <KeepChoice
        value={now}
        lost={lost}
        publicWords={
          suggested === undefined
            ? undefined
            : publicWords(served, share(present), ` than at ${show(suggested)}`)
        }
        difference={difference}
        onKeep={replace && keep}
      />
    </aside>
  );
});

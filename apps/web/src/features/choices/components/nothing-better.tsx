import type { StoryStick } from '@settlewright/geometry';
import { Measure } from '@/components/measure.tsx';
import { exactValue } from '@/lib/dimension-words.ts';
import { useChoices } from '../choices-view.ts';
import { offerAt } from '../offer.ts';
import { servesWords } from '../offer-words.ts';
import { bestValue } from '../suggestion.ts';
import { Sentence } from './sentence.tsx';

interface NothingBetterProps {
  now: string;
  stick: StoryStick;
  present: number;
}

/** No other value is worth an offer, and why; one that only the shown check prefers is named. */
export function NothingBetter({ now, stick, present }: NothingBetterProps) {
  const { style } = useChoices();
  if (stick.sitters.length === 0) {
    return (
      <section className="ruled pt-3 pb-4">
        <h2 className="mb-1 text-lg font-semibold">Nobody’s verdict follows it</h2>
        <p className="text-sm text-ink-2">No check of the people seated here reads this number.</p>
      </section>
    );
  }
  const serves = offerAt(stick, present);
  const alone = bestValue(stick, present);
  const isElsewhere = alone && Math.abs(alone.value - present) > 1e-6;
  return (
    <section className="ruled pt-3 pb-4">
      <h2 className="mb-1 text-lg font-semibold">No other value serves more</h2>
      <p className="text-sm text-ink-2">
        <Measure text={now} /> serves as many of the people seated here as any value between the ends of the
        tape. {serves && servesWords(serves, stick.sitters.length)}
      </p>
      {isElsewhere && (
        <p className="mt-1 text-sm text-ink-2">
          <Sentence
            text={`By the check shown alone ${exactValue(alone.value, stick.dimension.unit, style)} would serve more. Move the line there to see whom it costs.`}
          />
        </p>
      )}
    </section>
  );
}

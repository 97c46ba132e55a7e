import { CAUTION } from '@/lib/caution.ts';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { sentence } from '@/lib/dimension-words.ts';
import type { Shares } from '../use-shares.ts';
import { OVER_DROP_WORDS, WEAR_WORDS } from '../words.ts';

interface CrowdCautionProps {
  /** "US adults 2015–16, men and women equally". */
  name: string;
  shares: Shares;
}

/** Who these people are, what is left out, and where it comes from: always in view under the shares. */
export function CrowdCaution({ name, shares: { told, people, caution } }: CrowdCautionProps) {
  return (
    <section aria-labelledby="people-heading" className="mt-10 max-w-text text-sm">
      <RuleHeading id="people-heading">About these people</RuleHeading>
      <div className="grid gap-2 text-ink-2">
        <p>
          <strong className="font-semibold text-ink">{name}.</strong> {sentence(told.source)}
        </p>
        {told.cautions.map((words) => (
          <p key={words}>{words}</p>
        ))}
        <p>
          {(people.women + people.men).toLocaleString('en-GB')} people were drawn,{' '}
          {people.women.toLocaleString('en-GB')} of them women. {WEAR_WORDS}
        </p>
        <p>{OVER_DROP_WORDS}</p>
        <p>{sentence(caution.words)}</p>
        <p className="text-ink-3">Source: {sentence(caution.source)}</p>
        <p>{CAUTION}</p>
      </div>
    </section>
  );
}

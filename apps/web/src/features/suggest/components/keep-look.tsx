import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { ReasonField, useReason } from '@/components/reason-field.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { TextArea } from '@/components/text-field.tsx';
import { withKnownDifference } from '@/lib/known-difference.ts';
import { useSession } from '@/lib/session.ts';
import type { Move } from '../effects.ts';
import { useSuggestView } from '../suggest-view.ts';
import { differenceWords } from '../words.ts';

/** Keep the look knowingly: what was not taken, and why, stands in the known differences. */
export function KeepLook({ moves }: { moves: readonly Move[] }) {
  const { document, replace, style } = useSuggestView();
  const by = useSession((state) => state.user?.name);
  const offered = differenceWords(moves, style);
  const [typed, setTyped] = useState<string>();
  const { field, take } = useReason();
  const [kept, setKept] = useState(false);
  const text = (typed ?? offered).trim();
  if (!replace) return null;
  return (
    <section aria-labelledby="keep-heading" className="mt-10 max-w-text">
      <RuleHeading id="keep-heading">Keep it as it is</RuleHeading>
      <form
        className="grid gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          if (text === '') return;
          const reason = take();
          if (reason === undefined) return;
          replace(withKnownDifference(document, { text, reason, by }), 'Known difference added');
          setKept(true);
        }}
      >
        <TextArea
          label="What is kept"
          value={typed ?? offered}
          maxLength={1000}
          rows={2}
          onChange={(event) => setTyped(event.target.value)}
        />
        <ReasonField {...field} />
        <div className="flex flex-wrap items-center gap-4">
          <Button type="submit">Keep as it is, with a note</Button>
          {kept && (
            <span role="status" className="text-sm text-ink-2">
              Written into the known differences.
            </span>
          )}
        </div>
      </form>
    </section>
  );
}

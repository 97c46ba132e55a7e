import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Measure } from '@/components/measure.tsx';
import { ReasonField, useReason } from '@/components/reason-field.tsx';
import { ChoiceLines } from './choice-lines.tsx';

interface KeepChoiceProps {
  value: string;
  lost: readonly string[];
  publicWords: string | undefined;
  /** What will stand in the known differences. */
  difference: string;
  onKeep: ((reason: string) => void) | undefined;
}

/** Keep the present value for the look, and say in the known differences why. */
export function KeepChoice({ value, lost, publicWords, difference, onKeep }: KeepChoiceProps) {
  const { field, take } = useReason();
  const [kept, setKept] = useState<string>();
  return (
    <section aria-labelledby="keep-heading" className="border-t border-rule pt-3">
      <h2 id="keep-heading" className="mb-1 text-lg font-semibold">
        <Measure text={`Keep ${value}`} /> for the look
      </h2>
      <ChoiceLines
        lines={[
          ['Lost', lost.length > 0 ? lost : ['nobody'], lost.length > 0],
          ['Public', publicWords ? [publicWords] : []],
        ]}
      />
      {onKeep && (
        <form
          noValidate
          onSubmit={(event) => {
            event.preventDefault();
            const reason = take();
            if (reason === undefined) return;
            onKeep(reason);
            setKept(difference);
          }}
        >
          <ReasonField behind={difference} {...field} />
          <div className="mt-3 flex flex-wrap items-center gap-x-4 gap-y-2">
            <Button type="submit">
              <span>
                Keep <Measure text={value} /> with this note
              </span>
            </Button>
            {kept === difference && (
              <span role="status" className="text-sm text-ink-2">
                Written into the known differences.
              </span>
            )}
          </div>
        </form>
      )}
    </section>
  );
}

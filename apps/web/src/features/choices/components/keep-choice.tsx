import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Measure } from '@/components/measure.tsx';
import { TextArea } from '@/components/text-field.tsx';
import { ChoiceLines } from './choice-lines.tsx';

interface KeepChoiceProps {
  value: string;
  lost: readonly string[];
  publicWords: string | undefined;
  /** What will stand in the known differences. */
  difference: string;
  onKeep: ((reason: string) => void) | undefined;
}

/** Keep the present value for the look, and say so in the known differences. */
export function KeepChoice({ value, lost, publicWords, difference, onKeep }: KeepChoiceProps) {
  const [reason, setReason] = useState('');
  const [kept, setKept] = useState<string>();
  return (
    <section aria-labelledby="keep-heading" className="border-t border-rule pt-3">
      <h2 id="keep-heading" className="mb-1 text-lg font-semibold">
        <Measure text={`Keep ${value}`} /> for the look
      </h2>
      <ChoiceLines
        lines={[
          ['Lost', lost.length > 0 ? [lost.join('; ')] : ['nobody'], lost.length > 0],
          ['Public', publicWords ? [publicWords] : []],
        ]}
      />
      {onKeep && (
        <form
          onSubmit={(event) => {
            event.preventDefault();
            onKeep(reason.trim());
            setKept(difference);
            setReason('');
          }}
        >
          <TextArea
            label="Note for the known differences"
            description={`Stands behind “${difference}”, with your name and today’s date.`}
            placeholder="For example: the photograph shows it, and the camera sees it."
            value={reason}
            maxLength={1000}
            rows={2}
            onChange={(event) => setReason(event.target.value)}
          />
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

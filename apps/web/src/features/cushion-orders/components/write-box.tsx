import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextArea } from '@/components/text-field.tsx';
import { announce } from '@/lib/announce.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useKeptText } from '../use-kept-text.ts';

interface WriteBoxProps {
  /** Names the text kept on this device. */
  keptAs: string;
  label: string;
  verb: string;
  placeholder: string;
  busy: boolean;
  send: (text: string) => Promise<unknown>;
}

/** One message at a time; what is typed is kept on this device until it is sent. */
export function WriteBox({ keptAs, label, verb, placeholder, busy, send }: WriteBoxProps) {
  const [text, keep] = useKeptText(keptAs);
  const [error, setError] = useState<string | undefined>();
  const [problem, setProblem] = useState<string | null>(null);
  return (
    <form
      noValidate
      className="mt-4 rounded-md bg-sheet p-4 shadow-slip"
      onSubmit={(event) => {
        event.preventDefault();
        if (text.trim() === '') {
          setError('Nothing was written. Write a sentence first.');
          return;
        }
        setProblem(null);
        send(text.trim()).then(
          () => {
            keep('');
            announce('Sent.');
          },
          (refusal: unknown) => setProblem(sayProblem(refusal)),
        );
      }}
    >
      {problem && (
        <Notice tone="wont" className="mb-4">
          {problem}
        </Notice>
      )}
      <TextArea
        label={label}
        placeholder={placeholder}
        value={text}
        maxLength={4000}
        error={error}
        onChange={(event) => {
          setError(undefined);
          keep(event.target.value);
        }}
      />
      <div className="mt-3 flex flex-wrap items-center gap-3">
        <Button type="submit" busy={busy} busyWords="Sending">
          {verb}
        </Button>
        <span className="text-xs text-ink-2">Kept on this device until sent</span>
      </div>
    </form>
  );
}

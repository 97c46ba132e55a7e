import { type ReactNode, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextArea } from '@/components/text-field.tsx';
import { announce } from '@/lib/announce.ts';
import { useKeptText } from '../use-kept-text.ts';
import { type Desk, useLifeStep } from './desk.ts';
import { refusalOf } from './refusal.ts';

interface StepFormProps {
  desk: Desk;
  /** Names the text kept on this device. */
  keptAs: string;
  label: string;
  verb: string;
  step: string;
  /** The body that goes with what was written. */
  body: (text: string) => object;
  children?: ReactNode;
}

/** One thing to write and one button; what is typed is kept on this device until it is sent. */
export function StepForm({ desk, keptAs, label, verb, step, body, children }: StepFormProps) {
  const send = useLifeStep(desk);
  const [text, keep] = useKeptText(keptAs);
  const [error, setError] = useState<string | undefined>();
  const refused = refusalOf(send.error, (path) => path === 'text' || path === 'answer');
  return (
    <form
      noValidate
      className="grid gap-3 print:hidden"
      onSubmit={(event) => {
        event.preventDefault();
        if (text.trim() === '') {
          setError('Nothing was written. Write a sentence first.');
          return;
        }
        send.mutate(
          { step, body: body(text.trim()) },
          {
            onSuccess: () => {
              keep('');
              announce('Sent.');
            },
          },
        );
      }}
    >
      {children}
      <TextArea
        label={label}
        value={text}
        rows={2}
        maxLength={2000}
        error={error ?? Object.values(refused.at)[0]}
        onChange={(event) => {
          setError(undefined);
          send.reset();
          keep(event.target.value);
        }}
      />
      {refused.whole && <Notice tone="wont">{refused.whole}</Notice>}
      <div>
        <Button type="submit" size="small" busy={send.isPending} busyWords="Sending">
          {verb}
        </Button>
      </div>
    </form>
  );
}

import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextField } from '@/components/text-field.tsx';
import { announce } from '@/lib/announce.ts';
import { dayWords } from '@/lib/dates.ts';
import { Problem, sayProblem } from '@/lib/problem.ts';
import { publicKey, useAcknowledge } from '../api.ts';
import type { PublicOrder } from '../order.ts';
import { useKeptText } from '../use-kept-text.ts';

const SENT_AGAIN =
  'The workshop sent this order again while you were reading. The page now shows what it sent last: read it, then say so.';

/** "I can make this as drawn", with a typed name, for exactly what stands on the page. */
export function Acknowledge({ token, order }: { token: string; order: PublicOrder }) {
  const client = useQueryClient();
  const acknowledge = useAcknowledge(token);
  const [name, keepName] = useKeptText(`link.${order.workshop.name}.${order.number}.name`);
  const [error, setError] = useState<string | undefined>();
  const [problem, setProblem] = useState<string | null>(null);
  if (order.acknowledgement) {
    return (
      <Notice>
        {order.acknowledgement.name} can make revision {order.acknowledgement.revisionLetter} as drawn, said
        on {dayWords(order.acknowledgement.at)}.
      </Notice>
    );
  }
  const refused = (refusal: unknown) => {
    if (refusal instanceof Problem && refusal.code === 'order-sent-again') {
      setProblem(SENT_AGAIN);
      void client.invalidateQueries({ queryKey: publicKey(token) });
      return;
    }
    const onName =
      refusal instanceof Problem ? refusal.fields.find(({ path }) => path === 'name') : undefined;
    if (onName) setError(onName.message);
    else setProblem(sayProblem(refusal));
  };
  return (
    <form
      noValidate
      className="grid gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        setProblem(null);
        if (name.trim() === '') {
          setError('No name was typed. Type your name, so that the workshop knows who says so.');
          return;
        }
        acknowledge.mutateAsync({ name: name.trim(), sentAt: order.sentAt }).then(() => {
          keepName('');
          announce('The workshop has been told.');
        }, refused);
      }}
    >
      {problem && <Notice tone="wont">{problem}</Notice>}
      <TextField
        label="Your name, typed"
        autoComplete="name"
        maxLength={120}
        value={name}
        error={error}
        onChange={(event) => {
          setError(undefined);
          keepName(event.target.value);
        }}
      />
      <Button type="submit" look="main" busy={acknowledge.isPending} busyWords="Saying so">
        I can make this as drawn
      </Button>
      <p className="text-sm text-ink-2">
        Tells {order.workshop.name} that you can make revision {order.revisionLetter} as it is drawn here.
        Name, time and revision are kept.
      </p>
    </form>
  );
}

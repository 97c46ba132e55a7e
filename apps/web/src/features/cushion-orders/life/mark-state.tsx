import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { TextField } from '@/components/text-field.tsx';
import { announce } from '@/lib/announce.ts';
import type { OrderLife } from '@/lib/contract.ts';
import { useKeptText } from '../use-kept-text.ts';
import { type Desk, useLifeStep } from './desk.ts';
import { refusalOf } from './refusal.ts';

const VERBS = {
  'first-article': 'The first article is ready',
  'in-work': 'The batch is in work',
  shipped: 'It is shipped',
} as const;

interface MarkStateProps {
  desk: Desk;
  life: OrderLife;
  /** Where the typed name is kept on this device. */
  nameKeptAs: string;
}

/** How far the work has come, said by the upholsterer with a typed name. */
export function MarkState({ desk, life, nameKeptAs }: MarkStateProps) {
  const step = useLifeStep(desk);
  const [name, keepName] = useKeptText(nameKeptAs);
  const [note, setNote] = useState('');
  const [error, setError] = useState<string | undefined>();
  const refused = refusalOf(step.error, (path) => path === 'name' || path === 'note');
  const [to] = life.upholstererMayMark;
  if (to === undefined) {
    return life.firstArticle === 'waiting' ? (
      <Notice className="mb-8">The workshop looks at the first article. The batch waits for its word.</Notice>
    ) : null;
  }
  const again = life.firstArticle === 'rejected' && to === 'first-article';
  return (
    <section aria-label="How far the work is" className="mb-8 print:hidden">
      <RuleHeading>How far the work is</RuleHeading>
      {again && (
        <Notice tone="wont" className="my-3">
          The workshop rejected the first article. Its sheet says why; make it anew and say so here.
        </Notice>
      )}
      {life.firstArticle === 'accepted' && (
        <p className="py-2 text-sm">The workshop accepted the first article: the batch can begin.</p>
      )}
      <form
        noValidate
        className="grid gap-3 pt-3"
        onSubmit={(event) => {
          event.preventDefault();
          if (name.trim() === '') {
            setError('No name was typed. It is kept with the time.');
            return;
          }
          step.mutate(
            { step: 'state', body: { to, name: name.trim(), note } },
            {
              onSuccess: () => {
                setNote('');
                announce('Said to the workshop.');
              },
            },
          );
        }}
      >
        <TextField
          label="Who says so, typed"
          autoComplete="name"
          maxLength={120}
          value={name}
          error={error ?? refused.at.name}
          onChange={(event) => {
            setError(undefined);
            keepName(event.target.value);
          }}
        />
        <TextField
          label={to === 'shipped' ? 'Carrier and number' : 'Note'}
          optional
          maxLength={1000}
          value={note}
          error={refused.at.note}
          onChange={(event) => setNote(event.target.value)}
        />
        {refused.whole && <Notice tone="wont">{refused.whole}</Notice>}
        <div>
          <Button type="submit" look="main" busy={step.isPending} busyWords="Saying so">
            {again ? 'The first article is ready again' : VERBS[to]}
          </Button>
        </div>
      </form>
    </section>
  );
}
